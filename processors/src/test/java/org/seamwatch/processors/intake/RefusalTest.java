package org.seamwatch.processors.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seamwatch.processors.flow.Cases;
import org.seamwatch.processors.watch.TestDesk;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.geography.Geography;
import org.seamwatch.schemas.plan.DayOf;
import org.seamwatch.schemas.plan.SeriesPlan;

class RefusalTest {

    private static final String NOON = "2024-06-01T12:00:00Z";

    private final IntakeBench bench = new IntakeBench(TestDesk.small().watch());
    private final Say one = Say.of("r-1", "R0000", "2024-06-01");

    private void assertRefused(String reason, String field, String detail) {
        assertThat(bench.rejected).hasSize(1);
        Refusal why = bench.rejected.get(0).why();
        assertThat(List.of(why.reason().code(), why.field(), why.detail())).containsExactly(reason, field, detail);
        assertThat(bench.account().rejected()).isEqualTo(1);
        assertThat(bench.ledger.size() + bench.tally.size()).isZero();
    }

    @Test
    void shouldRefuseANullKey() {
        bench.take(NOON, null, one.value());
        assertRefused("null-key", "reportId", "the record's key must be the report id, was null");
    }

    @Test
    void shouldRefuseANullValue() {
        bench.take(NOON, one.key(), null);
        assertRefused("null-value", "", "the record's value must be a report, was null");
    }

    @Test
    void shouldRefuseAKeyThatIsNotTheReportId() {
        bench.take(NOON, "r-2".getBytes(StandardCharsets.UTF_8), one.value());
        assertRefused("key-mismatch", "reportId", "the record's key must be the report id, was another");
    }

    @Test
    void shouldRefuseAnUnknownCondition() {
        bench.take(NOON, one.with("condition", "mumps"));
        assertRefused("unknown-condition", "condition", "condition must be one of the plan's, was mumps");
    }

    @Test
    void shouldRefuseAnUnknownRegion() {
        bench.take(NOON, one.with("region", "R9999"));
        assertRefused("unknown-region", "region", "region must be one of the plan's, was R9999");
    }

    @Test
    void shouldRefuseAPositionOutsideEveryRegion() {
        bench.take(NOON, one.without("region").with("position", "{\"lon\":-1,\"lat\":0}"));
        assertRefused("outside-every-region", "position", "position must lie in a region of the plan");
    }

    @Test
    void shouldRefuseASourceWhoseClockIsMoreThanTenMinutesAhead() {
        bench.take(NOON, one.with("reportedAt", "2024-06-01T12:10:00.001Z"));
        assertRefused(
                "clock-ahead",
                "reportedAt",
                "reportedAt must be at most 10 minutes ahead of the log's 2024-06-01T12:00:00Z,"
                        + " was 2024-06-01T12:10:00.001Z");
    }

    @Test
    void shouldTakeASourceWhoseClockIsTenMinutesAhead() {
        bench.take(NOON, one.with("reportedAt", "2024-06-01T12:10:00Z"));
        assertThat(bench.account().accepted()).isEqualTo(1);
    }

    @Test
    void shouldRefuseADayMoreThanOneDayAfterTheLog() {
        bench.take(NOON, one.with("eventDate", "2024-06-03"));
        assertRefused(
                "future-day",
                "eventDate",
                "the report's day must be at most one day after the log's date, was 2024-06-03");
    }

    @Test
    void shouldTakeTomorrow() {
        bench.take(NOON, one.with("eventDate", "2024-06-02"));
        assertThat(bench.account().accepted()).isEqualTo(1);
    }

    /** The horizon is reviseFor and 30 days: 58 days here, and 1 June less 58 days is 4 April. */
    @ParameterizedTest
    @CsvSource({"2024-04-04, 1, 0", "2024-04-03, 0, 1"})
    void shouldRefuseADayBeyondTheHorizon(String day, int accepted, int rejected) {
        bench.take(NOON, one.with("eventDate", day));

        assertThat(bench.account().accepted()).isEqualTo(accepted);
        assertThat(bench.account().rejected()).isEqualTo(rejected);
        if (rejected > 0) {
            assertRefused(
                    "too-old", "eventDate", "the report's day must lie within the ledger's horizon, was 2024-04-03");
        }
    }

    @Test
    void shouldRefuseATooOldReportEvenWhenItIsKnown() {
        bench.take("2024-06-01T12:00:00Z", one);
        bench.take("2024-08-01T12:00:00Z", one);
        bench.take("2024-08-01T12:00:00Z", one.revision(1).count(9));

        assertThat(bench.rejected).extracting(r -> r.why().reason().code()).containsExactly("too-old", "too-old");
    }

    @Test
    void shouldHoldTooOldAgainstThePartitionsTimeNotTheRecords() {
        bench.clock("2024-08-01T12:00:00Z");
        bench.take("2024-06-01T12:00:00Z", one);

        assertThat(bench.rejected).extracting(r -> r.why().reason().code()).containsExactly("too-old");
    }

    @Test
    void shouldForgetWhatLiesBeyondTheHorizon() {
        bench.take("2024-06-01T12:00:00Z", one);
        assertThat(bench.ledger.size()).isEqualTo(1);

        bench.clock("2024-08-20T00:00:00Z");
        assertThat(bench.ledger.size()).isZero();
    }

    @Test
    void shouldNeitherMakeNorTakeBackAContributionBeyondTheHorizon() {
        Geography geography = TestDesk.small().geography();
        SeriesPlan byEvent = TestDesk.small().seriesPlan();
        Geography other = TestDesk.small().geography("otherland", "Square ");
        SeriesPlan p = TestDesk.small().dayOf(DayOf.REPORT).seriesPlan();
        SeriesPlan byReport = new SeriesPlan(
                "otherland",
                p.conditions(),
                p.from(),
                p.dayOf(),
                p.closeAfterDays(),
                p.reviseForDays(),
                p.windowDays(),
                p.statistics(),
                p.measure(),
                p.permutations(),
                p.contiguity(),
                p.weights(),
                p.thinBelow(),
                p.share(),
                p.warmUpDays(),
                p.charts(),
                p.holidays());
        List<Geography> both = List.of(geography, other);
        IntakeBench two = new IntakeBench(Watch.of(TestDesk.plan(both, 6, byEvent, byReport), both));

        Say say = one.with("eventDate", "2024-04-04").with("reportDate", "2024-06-01");
        two.take("2024-06-01T12:00:00Z", say.count(5));
        two.take("2024-06-02T12:00:00Z", say.revision(1).count(3));
        two.clock("2024-06-02T13:00:00Z");

        assertThat(two.account().accepted()).isEqualTo(2);
        assertThat(two.sums())
                .containsEntry("gridland/influenza|2024-04-04|R0000", new Cases(5, 0))
                .containsEntry("otherland/influenza|2024-06-01|R0000", new Cases(3, 0))
                .hasSize(2);
    }

    @Test
    void shouldKeepTheBytesAndPlaceOfARejectedRecord() {
        bench.clock(NOON);
        bench.take("2024-06-01T12:20:00Z", one.key(), new byte[] {'{', (byte) 0xFF});

        Rejection r = bench.rejected.get(0);
        assertThat(r.topic()).isEqualTo("case-reports");
        assertThat(r.partition()).isEqualTo(3);
        assertThat(r.offset()).isEqualTo(1);
        assertThat(Instant.ofEpochMilli(r.timestamp())).isEqualTo("2024-06-01T13:00:00Z");
        assertThat(r.key().bytes()).isEqualTo(one.key());
        assertThat(r.value().bytes()).containsExactly('{', 0xFF);
        assertThat(r.value().length()).isNull();
        assertThat(r.why().reason().code()).isEqualTo("not-utf8");
    }

    /** SHA-256 of 300,000 letters a, from coreutils sha256sum 9.1. */
    @Test
    void shouldCutALargeRecordAndSayItsLengthAndHash() {
        byte[] large = new byte[300_000];
        Arrays.fill(large, (byte) 'a');
        bench.take(NOON, one.key(), large);

        Rejection.Cut cut = bench.rejected.get(0).value();
        assertThat(cut.bytes()).hasSize(256 * 1024);
        assertThat(cut.length()).isEqualTo(300_000);
        assertThat(cut.sha256()).isEqualTo("12e1b9b179b29a4f7e5889b185d7ac71bff0ad1f49a7b391d0911b737a0f5381");
    }
}
