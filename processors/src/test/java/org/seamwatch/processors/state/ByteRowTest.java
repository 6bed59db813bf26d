package org.seamwatch.processors.state;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class ByteRowTest {

    @ParameterizedTest
    @ValueSource(longs = {0, 1, -1, 63, 64, -64, -65, 1_000_000, Long.MAX_VALUE, Long.MIN_VALUE})
    void shouldReadBackNumbers(long number) {
        byte[] row = new ByteWriter(7).number(number).bytes();
        assertThat(new ByteReader(row, 7).number()).isEqualTo(number);
    }

    @Test
    void shouldTakeOneByteForSmallNumbersOfEitherSign() {
        assertThat(new ByteWriter(1).number(63).number(-64).bytes()).hasSize(3);
        assertThat(new ByteWriter(1).number(64).bytes()).hasSize(3);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.0, -0.0, 0.1, -1e300, Double.MIN_VALUE, Double.NaN, Double.POSITIVE_INFINITY})
    void shouldReadBackRealNumbersBitForBit(double real) {
        double read = new ByteReader(new ByteWriter(1).real(real).bytes(), 1).real();
        assertThat(Double.doubleToRawLongBits(read)).isEqualTo(Double.doubleToRawLongBits(real));
    }

    @Test
    void shouldReadBackTexts() {
        String long1 = "\u00e4\ud83e\udda0".repeat(500);
        ByteReader in = new ByteReader(
                new ByteWriter(1)
                        .text("")
                        .textOrNull(null)
                        .text(long1)
                        .textOrNull("x")
                        .bytes(),
                1);
        assertThat(in.text()).isEmpty();
        assertThat(in.textOrNull()).isNull();
        assertThat(in.text()).isEqualTo(long1);
        assertThat(in.textOrNull()).isEqualTo("x");
    }

    @Test
    void shouldReadBackMixedRowsOfAnyLength() {
        Random random = new Random(1);
        for (int n = 0; n < 200; n++) {
            ByteWriter out = new ByteWriter(n % 128);
            Random written = new Random(n);
            for (int i = random.nextInt(60); i >= 0; i--) {
                out.number(written.nextLong() >> written.nextInt(64)).real(written.nextDouble());
                out.text("t".repeat(written.nextInt(40)));
            }
            byte[] row = out.bytes();
            ByteReader in = new ByteReader(row, n % 128);
            Random expected = new Random(n);
            int size = 1;
            while (size < row.length) {
                long number = expected.nextLong() >> expected.nextInt(64);
                assertThat(in.number()).isEqualTo(number);
                double real = expected.nextDouble();
                assertThat(in.real()).isEqualTo(real);
                String text = in.text();
                assertThat(text).hasSize(expected.nextInt(40));
                size += new ByteWriter(1).number(number).real(real).text(text).bytes().length - 1;
            }
        }
    }

    @Test
    void shouldRefuseARowOfAnotherVersion() {
        assertThatThrownBy(() -> new ByteReader(new byte[] {2}, 1)).hasMessage("row version must be 1, was 2");
        assertThatThrownBy(() -> new ByteReader(new byte[0], 1)).hasMessage("row version must be 1, was absent");
        assertThatThrownBy(() -> VersionedJson.read(new byte[] {3, '{', '}'}, 1, String.class))
                .hasMessage("row version of String must be 1, was 3");
    }
}
