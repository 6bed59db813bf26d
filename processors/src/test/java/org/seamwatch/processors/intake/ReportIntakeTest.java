package org.seamwatch.processors.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.seamwatch.processors.intake.IntakeBench.cell;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.seamwatch.processors.flow.Cases;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.flow.SeriesMessage;
import org.seamwatch.processors.watch.TestDesk;
import org.seamwatch.schemas.plan.DayOf;

class ReportIntakeTest {

    private static final LocalDate DAY = LocalDate.of(2024, 2, 3);
    private static final String NOON = "2024-02-03T12:00:00Z";
    private static final String NEXT_HOUR = "2024-02-03T13:00:00Z";

    private final IntakeBench bench = new IntakeBench(TestDesk.small().watch());
    private final Say one = Say.of("r-1", "R0000", "2024-02-03");

    @Test
    void shouldSendTheDifferencesOfAnHourWhenItHasPassed() {
        bench.take(NOON, one.count(4));
        assertThat(bench.changes()).isEmpty();

        bench.clock(NEXT_HOUR);

        long hour = java.time.Instant.parse(NOON).getEpochSecond() / 3600;
        assertThat(bench.changes())
                .containsExactly(new SeriesMessage.DayChange(
                        "gridland/influenza", hour, 3, DAY, new java.util.TreeMap<>(Map.of("R0000", new Cases(4, 0)))));
        assertThat(bench.account().accepted()).isEqualTo(1);
        assertThat(bench.account().controls()).isEqualTo(1);
    }

    @Test
    void shouldCountADuplicateOnceWhateverItsSendingTime() {
        bench.take(NOON, one);
        bench.take(NOON, one.with("reportedAt", "2024-02-03T11:00:00+01:00"));
        bench.take(NOON, one.with("version", 1));
        bench.take(NOON, one.with("unknown", "x"));
        bench.clock(NEXT_HOUR);

        assertThat(bench.sums()).containsExactly(Map.entry(cell(DAY, "R0000"), new Cases(1, 0)));
        assertThat(bench.account().duplicates()).isEqualTo(3);
    }

    @Test
    void shouldLetTheHigherRevisionWinInAnyOrder() {
        bench.take(NOON, one.revision(2).count(7));
        bench.take(NOON, one.revision(1).count(5));
        bench.take(NOON, one.count(3));
        bench.clock(NEXT_HOUR);

        assertThat(bench.sums()).containsExactly(Map.entry(cell(DAY, "R0000"), new Cases(7, 0)));
        assertThat(bench.account().superseded()).isEqualTo(2);
        assertThat(bench.account().accepted()).isEqualTo(1);
    }

    @Test
    void shouldLetTheLaterWinWhenAnEqualRevisionHasOtherContent() {
        bench.take(NOON, one.count(3));
        bench.take(NOON, one.count(2));
        bench.take(NOON, one.count(2).with("source", "lab-2"));
        bench.clock(NEXT_HOUR);

        assertThat(bench.sums()).containsExactly(Map.entry(cell(DAY, "R0000"), new Cases(2, 0)));
        assertThat(bench.account().accepted()).isEqualTo(3);
        assertThat(bench.account().duplicates()).isZero();
    }

    @Test
    void shouldTakeAWithdrawnReportOutAndCountItWhenReportedAgain() {
        bench.take(NOON, one.count(3));
        bench.clock("2024-02-03T13:00:00Z");
        bench.take("2024-02-03T13:10:00Z", one.count(3).revision(1).status("withdrawn"));
        bench.clock("2024-02-03T14:00:00Z");
        assertThat(bench.sums()).isEmpty();

        bench.take("2024-02-03T14:10:00Z", one.count(4).revision(2).status("corrected"));
        bench.clock("2024-02-03T15:00:00Z");

        assertThat(bench.sums()).containsExactly(Map.entry(cell(DAY, "R0000"), new Cases(4, 0)));
    }

    @Test
    void shouldMoveAReportToItsCorrectedRegionAndDay() {
        bench.take(NOON, one.count(3));
        bench.clock(NEXT_HOUR);
        bench.take(NEXT_HOUR, one.count(3).revision(1).with("region", "R0101").day(DAY.minusDays(2)));
        bench.clock("2024-02-03T14:00:00Z");

        assertThat(bench.sums()).containsExactly(Map.entry(cell(DAY.minusDays(2), "R0101"), new Cases(3, 0)));
        assertThat(bench.changes()).hasSize(3);
    }

    @Test
    void shouldMoveOnlyThePreliminaryPartWhenAReportBecomesFinal() {
        bench.take(NOON, one.count(3).status("preliminary"));
        bench.clock(NEXT_HOUR);
        bench.take(NEXT_HOUR, one.count(3).revision(1).status("final"));
        bench.clock("2024-02-03T14:00:00Z");

        assertThat(bench.changes().get(0).cells()).containsExactly(Map.entry("R0000", new Cases(3, 3)));
        assertThat(bench.changes().get(1).cells()).containsExactly(Map.entry("R0000", new Cases(0, -3)));
    }

    @Test
    void shouldSendNothingWhenTheSumOfAnHourIsZero() {
        bench.take(NOON, one.count(3));
        bench.take(NOON, one.count(3).revision(1).status("withdrawn"));
        bench.take(NOON, Say.of("r-2", "R0001", "2024-02-03").count(0));
        bench.clock(NEXT_HOUR);

        assertThat(bench.changes()).isEmpty();
        assertThat(bench.tally.size()).isZero();
        assertThat(bench.account().accepted()).isEqualTo(3);
    }

    @Test
    void shouldPlaceAPositionInItsRegion() {
        bench.take(NOON, one.without("region").with("position", "{\"lon\":2.5,\"lat\":3.5}"));
        bench.take(NOON, one.without("region").with("position", "{\"lon\":2.5,\"lat\":3.5}"));
        bench.clock(NEXT_HOUR);

        assertThat(bench.sums()).containsExactly(Map.entry(cell(DAY, "R0203"), new Cases(1, 0)));
        assertThat(bench.account().duplicates()).isEqualTo(1);
    }

    @Test
    void shouldTakeTheDayOfTheReportInTheZoneOfTheGeography() {
        IntakeBench berlin = new IntakeBench(
                TestDesk.small().zone("Europe/Berlin").dayOf(DayOf.REPORT).watch());
        berlin.take("2024-02-03T23:30:00Z", one.with("reportedAt", "2024-02-03T23:30:00Z"));
        berlin.take("2024-02-03T23:30:00Z", Say.of("r-2", "R0001", "2024-02-03").with("reportDate", "2024-02-02"));
        berlin.clock("2024-02-04T00:00:00Z");

        assertThat(berlin.sums().keySet())
                .isEqualTo(Set.of(cell(LocalDate.of(2024, 2, 4), "R0000"), cell(LocalDate.of(2024, 2, 2), "R0001")));
    }

    @Test
    void shouldGoOnAfterARestartAsIfNothingHadHappened() {
        bench.take(NOON, one.count(3));
        bench.restart();
        bench.take(NOON, one.count(3));
        bench.take(NOON, one.count(5).revision(1));
        bench.restart();
        bench.clock(NEXT_HOUR);

        assertThat(bench.sums()).containsExactly(Map.entry(cell(DAY, "R0000"), new Cases(5, 0)));
        assertThat(bench.account().read()).isEqualTo(4);
        assertThat(bench.marks()).hasSize(2);
    }

    @Test
    void shouldPromisePassedHoursWhenAnHourBeginsAndNeverGoBack() {
        bench.clock("2024-02-03T12:10:00Z");
        bench.clock("2024-02-03T12:59:59.999Z");
        bench.clock("2024-02-03T15:00:00Z");
        bench.clock("2024-02-03T13:00:00Z");
        bench.take("2024-02-03T11:00:00Z", one.with("reportedAt", "2024-02-03T10:00:00Z"));
        bench.clock("2024-02-03T16:30:00Z");

        long noon = java.time.Instant.parse(NOON).getEpochSecond() / 3600;
        long first = java.time.Instant.parse("2024-02-03T12:10:00Z").toEpochMilli();
        InputSizes sizes = new InputSizes(6, 2);
        assertThat(bench.marks())
                .containsExactly(
                        new SeriesMessage.Watermark("case-reports", 3, noon - 1, first, sizes),
                        new SeriesMessage.Watermark("case-reports", 3, noon + 2, first, sizes),
                        new SeriesMessage.Watermark("case-reports", 3, noon + 3, first, sizes));
        assertThat(bench.changes()).singleElement().extracting(c -> c.hour()).isEqualTo(noon + 3);
    }

    @Test
    void shouldSendTheChangesOfAnHourBeforeItsWatermark() {
        bench.take(NOON, one);
        bench.clock(NEXT_HOUR);

        assertThat(bench.sent)
                .extracting(m -> m.getClass().getSimpleName())
                .containsExactly("Watermark", "DayChange", "Watermark");
    }

    @Test
    void shouldAccountForEveryRecord() {
        bench.take(NOON, one);
        bench.take(NOON, one);
        bench.take(NOON, one.revision(1));
        bench.take(NOON, one);
        bench.take(NOON, null, one.value());
        bench.take(NOON, one.key(), new byte[] {'{'});
        bench.clock(NOON);

        Account a = bench.account();
        assertThat(List.of(a.read(), a.accepted(), a.duplicates(), a.superseded(), a.rejected(), a.controls()))
                .containsExactly(7L, 2L, 1L, 1L, 2L, 1L);
        assertThat(a.reasons()).containsExactly(Map.entry("not-json", 1L), Map.entry("null-key", 1L));
    }

    @Test
    void shouldStoreAndForwardNothingOfUnknownFields() {
        bench.take(NOON, one.with("patientName", "Mira Holm").with("address", "{\"street\":\"Weir Lane 4\"}"));
        bench.clock(NEXT_HOUR);

        assertThat(bench.account().accepted()).isEqualTo(1);
        assertThat(bench.stored() + bench.sent)
                .doesNotContain("Mira")
                .doesNotContain("Weir")
                .contains("lab-1");
        assertThat(bench.rejected).isEmpty();
    }
}
