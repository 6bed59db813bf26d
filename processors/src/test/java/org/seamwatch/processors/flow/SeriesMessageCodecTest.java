package org.seamwatch.processors.flow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.Instant;
import java.time.LocalDate;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.seamwatch.processors.state.OldRows;
import org.seamwatch.schemas.record.AlarmResponse;
import org.seamwatch.schemas.record.Verdict;

class SeriesMessageCodecTest {

    static Stream<Arguments> messages() {
        return Stream.of(
                Arguments.of(
                        "message-day-change-1",
                        new SeriesMessage.DayChange(
                                "northmarch/influenza",
                                474_036,
                                5,
                                LocalDate.of(2024, 2, 3),
                                new TreeMap<>(
                                        Map.of("NM-001", new Cases(3, 1), "NM-0\u00f8", new Cases(-1_000_000, -2))))),
                Arguments.of(
                        "message-response-1",
                        new SeriesMessage.Response(
                                "northmarch/influenza",
                                474_036,
                                1,
                                9_000_000_000L,
                                new AlarmResponse(
                                        1,
                                        "northmarch/influenza/2024-02-03",
                                        Verdict.KNOWN_EVENT,
                                        LocalDate.of(2024, 2, 1),
                                        null,
                                        "M. Holm",
                                        Instant.parse("2024-02-05T10:00:00.123Z"),
                                        "a fair"))),
                Arguments.of(
                        "message-watermark-1",
                        new SeriesMessage.Watermark(
                                "alarm-responses", 1, 474_035, 1_706_530_000_123L, new InputSizes(6, 2))));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("messages")
    void shouldReadWhatItWroteAndWhatEarlierBuildsWrote(String name, SeriesMessage message) {
        assertThat(SeriesMessageCodec.read(SeriesMessageCodec.write(message))).isEqualTo(message);
        OldRows.assertKept(name, SeriesMessageCodec.write(message));
        assertThat(SeriesMessageCodec.read(OldRows.row(name))).isEqualTo(message);
    }

    @Test
    void shouldRefuseAKindItDoesNotKnow() {
        assertThatThrownBy(() -> SeriesMessageCodec.read(new byte[] {1, 18}))
                .hasMessage("message kind must be 0 to 2, was 9");
    }
}
