package org.seamwatch.ops;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.seamwatch.schemas.record.AccountingLine;

class RunCountsTest {

    static AccountingLine line(String topic, int partition, long accepted, Map<String, Long> reasons) {
        long rejected = reasons.values().stream().mapToLong(Long::longValue).sum();
        return new AccountingLine(
                topic, partition, accepted + rejected + 3 + 7, accepted, 2, 1, rejected, 7, new TreeMap<>(reasons));
    }

    @Test
    void shouldAddUpReportsOverPartitionsWithoutClocksAndResponses() {
        RunCounts counts = RunCounts.of(List.of(
                line("alarm-responses", 0, 50, Map.of()),
                line("case-reports", 0, 1_000, Map.of("too-old", 3L)),
                line("case-reports", 1, 500, Map.of("too-old", 4L, "not-json", 2L))));
        assertThat(counts)
                .hasToString("1,515 reports read so far: 1,500 accepted, 4 duplicate, 2 superseded, 9 rejected");
        assertThat(counts.isTooManyRejected()).isFalse();
        assertThat(counts.rejections()).isEqualTo("9 of 1,515 reports were rejected, most often as too-old (7)");
    }

    @Test
    void shouldSeeOnlyMoreThanOneInTenAsTooManyRejected() {
        assertThat(new RunCounts(9, 0, 0, new TreeMap<>(Map.of("too-old", 1L))).isTooManyRejected())
                .isFalse();
        assertThat(new RunCounts(8, 0, 0, new TreeMap<>(Map.of("too-old", 1L))).isTooManyRejected())
                .isTrue();
        assertThat(RunCounts.NONE.isTooManyRejected()).isFalse();
    }

    @Test
    void shouldCountNothingBelowZeroWherePartitionsHaveMovedAway() {
        RunCounts before = new RunCounts(100, 10, 5, new TreeMap<>(Map.of("too-old", 9L)));
        RunCounts now = new RunCounts(60, 12, 2, new TreeMap<>(Map.of("too-old", 4L, "not-json", 1L)));
        assertThat(now.since(before)).isEqualTo(new RunCounts(0, 2, 0, new TreeMap<>(Map.of("not-json", 1L))));
    }
}
