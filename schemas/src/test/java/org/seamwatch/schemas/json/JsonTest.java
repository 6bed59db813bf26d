package org.seamwatch.schemas.json;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import com.fasterxml.jackson.annotation.JsonInclude;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import java.util.SplittableRandom;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seamwatch.schemas.record.Limits;
import org.seamwatch.schemas.record.Position;
import org.seamwatch.schemas.record.ReportStatus;

class JsonTest {

    @JsonInclude(JsonInclude.Include.NON_NULL)
    record Sample(
            String zebra,
            LocalDate day,
            Instant at,
            ReportStatus status,
            double value,
            @Nullable Double none,
            List<Limits> apes) {}

    @Test
    void shouldWriteFieldsInTheOrderOfTheRecord() {
        Sample sample = new Sample(
                "z\n\u00e9",
                LocalDate.of(2024, 2, 3),
                Instant.parse("2024-02-04T23:00:00Z"),
                ReportStatus.FINAL,
                -1 / 63.0,
                null,
                List.of(new Limits(null, 0.93)));

        assertThat(Json.line(sample))
                .isEqualTo("{\"zebra\":\"z\\n\u00e9\",\"day\":\"2024-02-03\",\"at\":\"2024-02-04T23:00:00Z\","
                        + "\"status\":\"final\",\"value\":-0.015873015873015872,\"apes\":[{\"upper\":0.93}]}");
        assertThat(Json.read(Json.bytes(sample), Sample.class)).isEqualTo(sample);
    }

    @Test
    void shouldGiveEveryDoubleBackExactly() {
        SplittableRandom random = new SplittableRandom(20240203);
        for (int i = 0; i < 20_000; i++) {
            double value = Double.longBitsToDouble(random.nextLong());
            if (Double.isFinite(value)) {
                Position back = Json.read(Json.bytes(new Position(value, 0)), Position.class);
                assertThat(Double.doubleToLongBits(back.lon())).isEqualTo(Double.doubleToLongBits(value));
            }
        }
    }

    /** Java before 19 writes 2.0E-3 as 0.0020 by itself (JDK-4511638, from memory). */
    @Test
    void shouldWriteTheShortestDigits() {
        assertThat(Json.line(new Position(2.0E-3, 1.0E22))).isEqualTo("{\"lon\":0.002,\"lat\":1.0E22}");
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void shouldRefuseToWriteNumbersThatAreNotFinite(double value) {
        assertThatThrownBy(() -> Json.bytes(new Position(1, value)))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("Position cannot be written: lat: a number must be finite, was " + value);
        assertThatThrownBy(() -> Json.line(List.of(new Limits(value, null))))
                .hasMessageContaining("[0].lower: a number must be finite, was " + value);
    }

    @Test
    void shouldIgnoreUnknownFieldsOfOurOwnRecords() {
        assertThat(read("{\"lat\":1,\"later\":{\"x\":[1]},\"lon\":2}")).isEqualTo(new Position(2, 1));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"", "null", "{\"lon\":1}x", "{\"lon\":1,\"lat\":2}{}", "{\"lon\":null,\"lat\":2}", "[]", "{"})
    void shouldRefuseWhatIsNotOneRecord(String text) {
        assertThatThrownBy(() -> read(text))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageStartingWith("Position cannot be read: ");
    }

    private static Position read(String text) {
        return Json.read(text.getBytes(StandardCharsets.UTF_8), Position.class);
    }
}
