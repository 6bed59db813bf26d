package org.seamwatch.processors.flow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.Instant;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class HoursTest {

    @ParameterizedTest
    @CsvSource({
        "2024-02-03T12:00:00Z, 2024-02-03T13:00:00Z",
        "2024-02-03T12:59:59.999Z, 2024-02-03T13:00:00Z",
        "1970-01-01T00:00:00Z, 1970-01-01T01:00:00Z",
    })
    void shouldEndAfterTheTimestamp(Instant time, Instant end) {
        assertThat(Hours.end(Hours.of(time.toEpochMilli()))).isEqualTo(end);
    }

    @ParameterizedTest
    @CsvSource({
        "2024-02-03T12:00:00Z, 2024-02-03T12:00:00Z",
        "2024-02-03T12:00:00.001Z, 2024-02-03T13:00:00Z",
        "2024-02-03T12:30:00Z, 2024-02-03T13:00:00Z",
    })
    void shouldFindTheFirstHourEndingAtOrAfterAnInstant(Instant instant, Instant end) {
        assertThat(Hours.end(Hours.endingAtOrAfter(instant))).isEqualTo(end);
    }

    @Test
    void shouldRefuseInputTopicsWithoutPartitions() {
        assertThatThrownBy(() -> new InputSizes(0, 1)).hasMessage("input partitions must be at least 1, were 0 and 1");
    }
}
