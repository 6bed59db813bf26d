package org.seamwatch.processors.evidence;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.seamwatch.processors.alarms.AlarmMove;
import org.seamwatch.processors.alarms.AlarmState;
import org.seamwatch.processors.charts.ChartState;
import org.seamwatch.processors.statistics.BoardState;
import org.seamwatch.processors.statistics.ChartPlace;
import org.seamwatch.processors.watch.SeriesSpec;
import org.seamwatch.processors.watch.TestDesk;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.geography.Geography;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.record.Change;
import org.seamwatch.schemas.record.ChartDay;
import org.seamwatch.schemas.record.Cluster;
import org.seamwatch.schemas.record.ClusterRegion;
import org.seamwatch.schemas.record.Evidence;
import org.seamwatch.schemas.record.Grade;
import org.seamwatch.schemas.record.LearningDay;
import org.seamwatch.schemas.record.Limits;
import org.seamwatch.schemas.record.MoranDay;
import org.seamwatch.schemas.record.SeriesDay;
import org.seamwatch.schemas.record.StatisticStatus;

class EvidenceMakerTest {

    private static final LocalDate DAY = LocalDate.of(2024, 6, 16);

    private static AlarmMove move(Change change, LocalDate start, LocalDate day) {
        AlarmState state = new AlarmState(
                "gridland/influenza/" + start,
                start,
                start,
                DAY,
                change == Change.ENDED ? day : null,
                change == Change.WITHDRAWN,
                2,
                List.of("moran"),
                false,
                null);
        return new AlarmMove(state, change, day);
    }

    private static HistoryRow row(SeriesSpec spec, LocalDate day, int revision, int learningDays, Grade grade) {
        MoranDay moran = new MoranDay(
                StatisticStatus.USABLE,
                "count",
                0.31,
                -0.04,
                0.006,
                0.007,
                3.9,
                null,
                null,
                new LearningDay(learningDays, 2.41),
                List.of(new ChartDay("ewma", 1.018, new Limits(null, 0.62), new Limits(null, 0.93), grade)));
        SeriesDay said = new SeriesDay(1, spec.id(), day, revision, Instant.EPOCH, 71, 25, 0, List.of(), moran);
        BoardState board = new BoardState(
                spec.statistics().get(0).board().start().learning(),
                List.of(new ChartPlace(new ChartState(new double[] {1.018}, 5), LocalDate.of(2024, 6, 12))));
        return new HistoryRow(said, new TreeMap<>(Map.of("moran", board)));
    }

    private static Evidence make(
            Watch watch,
            AlarmMove move,
            LocalDate day,
            double[] cases,
            double[] history,
            int revision,
            long preliminary) {
        SeriesSpec spec = watch.series().values().iterator().next();
        List<HistoryRow> rows = new ArrayList<>();
        for (int n = 27; n >= 0; n--) {
            rows.add(row(spec, day.minusDays(n), n == 0 ? revision : 0, 157 - n, n > 2 ? Grade.NONE : Grade.ACTION));
        }
        return new EvidenceMaker(watch, spec)
                .make(move, new EvidenceInput(day, cases, history, preliminary, 4, false, rows));
    }

    private static double[] cases(double each, Map<String, Integer> more) {
        double[] cases = new double[25];
        Arrays.fill(cases, each);
        more.forEach((region, count) -> cases[(region.charAt(2) - '0') * 5 + region.charAt(4) - '0'] = count);
        return cases;
    }

    private static double[] even() {
        return cases(40, Map.of());
    }

    private static @Nullable Integer none() {
        return null;
    }

    /**
     * Two corners are high on a background of 2. Without populations every region is expected to have a 25th of the
     * total of 20 + 17 + 15 + 13 + 20 * 2 + 12 = 117, or 4.68.
     */
    @Test
    void shouldNameTheClustersThatAreHighTogetherStrongestFirst() {
        Watch watch = TestDesk.small().unpopulated().watch();
        double[] cases = cases(2, Map.of("R0000", 20, "R0001", 17, "R0100", 15, "R0101", 13, "R0404", 12));
        Evidence evidence = make(watch, move(Change.RAISED, DAY, DAY), DAY, cases, even(), 0, 0);

        assertThat(evidence.clusters()).hasSize(2);
        Cluster first = evidence.clusters().get(0);
        assertThat(List.of(first.cases(), first.regionCount())).containsExactly(65L, 4);
        assertThat(first.expected()).isEqualTo(18.72);
        assertThat(first.regions())
                .extracting(ClusterRegion::region)
                .containsExactly("R0000", "R0001", "R0100", "R0101");
        ClusterRegion strongest = first.regions().get(0);
        assertThat(strongest).isEqualTo(new ClusterRegion("R0000", "Square 0 0", 20, 4.68, 32, 9.36, null, none()));
        assertThat(evidence.clusters().get(1).regions())
                .extracting(ClusterRegion::region)
                .containsExactly("R0404");
    }

    @Test
    void shouldGiveRatesWithTheYearOfThePopulation() {
        Watch watch = TestDesk.small().watch();
        Evidence evidence =
                make(watch, move(Change.RAISED, DAY, DAY), DAY, cases(1, Map.of("R0000", 30)), even(), 0, 0);

        ClusterRegion region = evidence.clusters().get(0).regions().get(0);
        assertThat(region.ratePer100000()).isEqualTo(300.0);
        assertThat(region.populationYear()).isEqualTo(2023);
    }

    @Test
    void shouldSayARaisedAlarmInOneSentence() {
        Watch watch = TestDesk.small().unpopulated().watch();
        double[] cases = cases(2, Map.of("R0000", 20, "R0001", 17, "R0100", 15, "R0101", 13, "R0404", 12));
        Evidence evidence = make(watch, move(Change.RAISED, DAY, DAY), DAY, cases, even(), 0, 9);

        assertThat(evidence.summary())
                .isEqualTo(
                        "Influenza, Gridland: 65 cases (19 expected by usual share) in Square 0 0, Square 0 1, Square 1 0 and 1 more"
                                + " in the 7 days to Sunday 16 June 2024 by event date, clustering (Moran's I) unusual for this"
                                + " series (chart at 1.02, action limit 0.93, above its centre since 12 June); first view, 8 % preliminary;"
                                + " a statistical signal, not a confirmed outbreak.");
    }

    @Test
    void shouldSayARevisedAlarmWithoutClusters() {
        Watch watch = TestDesk.small().unpopulated().watch();
        Evidence evidence = make(watch, move(Change.STRENGTHENED, DAY, DAY), DAY, cases(2, Map.of()), even(), 1, 0);

        assertThat(evidence.summary())
                .isEqualTo("Influenza, Gridland: 50 cases, no group of regions far above its usual share, in the 7 days"
                        + " to Sunday 16 June 2024 by event date, clustering (Moran's I) unusual for this series"
                        + " (chart at 1.02, action limit 0.93, above its centre since 12 June); revised once; a statistical signal, not a"
                        + " confirmed outbreak.");
    }

    @Test
    void shouldSayThatAnEndIsNoAllClear() {
        Watch watch = TestDesk.small().watch();
        LocalDate end = DAY.plusDays(7);
        Evidence evidence =
                make(watch, move(Change.ENDED, DAY.minusDays(2), end), end, cases(2, Map.of()), even(), 0, 0);

        assertThat(evidence.summary())
                .isEqualTo(
                        "Influenza, Gridland: back inside its limits on Sunday 23 June 2024, after signals from 14 June"
                                + " to 16 June; that does not say that anything is over; a statistical signal, not a confirmed"
                                + " outbreak.");
    }

    @Test
    void shouldSayThatAWithdrawalIsNoAllClear() {
        Watch watch = TestDesk.small().watch();
        Evidence evidence =
                make(watch, move(Change.WITHDRAWN, DAY.minusDays(2), DAY), DAY, cases(2, Map.of()), even(), 2, 0);

        assertThat(evidence.summary())
                .isEqualTo("Influenza, Gridland: withdrawn; with the reports as they now stand no signal is left from"
                        + " 14 June to 16 June; silence is not safety; what was raised was a statistical signal, not a"
                        + " confirmed outbreak.");
    }

    @Test
    void shouldSayHowLongAnAlarmHasWaitedForAVerdict() {
        Watch watch = TestDesk.small().unpopulated().watch();
        Evidence evidence = make(
                watch, move(Change.OVERDUE, DAY.minusDays(56), DAY), DAY, cases(2, Map.of("R0000", 20)), even(), 0, 0);

        assertThat(evidence.summary())
                .startsWith(
                        "Influenza, Gridland: open for 56 days without a verdict; 20 cases (2.72 expected by usual share) in Square"
                                + " 0 0 in the 7 days to Sunday 16 June 2024 by event date");
    }

    @Test
    void shouldSayHowItWasFoundAndHowGoodTheDataAre() {
        Watch watch =
                TestDesk.small().conditions("influenza", "norovirus", "mumps").watch();
        Evidence evidence = make(watch, move(Change.RAISED, DAY, DAY), DAY, cases(2, Map.of()), even(), 3, 5);

        assertThat(evidence.caution())
                .isEqualTo("A statistical signal is not a confirmed outbreak, and silence is not safety. Follow your"
                        + " jurisdiction's protocol and decide with licensed practitioners.");
        assertThat(evidence.method().deskFalseAlarmsPerYear()).isEqualTo(6);
        assertThat(evidence.method().seriesFalseAlarmsPerYear()).isEqualTo(2);
        assertThat(evidence.method().learningDays()).isEqualTo(157);
        assertThat(evidence.method().youngLearning()).isFalse();
        assertThat(evidence.quality().revision()).isEqualTo(3);
        assertThat(evidence.quality().preliminary()).isEqualTo(5);
        assertThat(evidence.quality().late()).isEqualTo(4);
        assertThat(evidence.repeat().plan()).isEqualTo(watch.hash()).hasSize(64);
        assertThat(evidence.period().from()).isEqualTo("2024-06-10");
        assertThat(evidence.history())
                .singleElement()
                .satisfies(h -> assertThat(h.days()).hasSize(28));
    }

    /** A checkerboard of far too long names: every square on its own is a cluster, all of them the largest there are. */
    @Test
    void shouldHoldEvidenceToSixteenKibibytes() {
        TestDesk desk = TestDesk.small().side(55);
        Geography geography = desk.geography("gridland", "\u00dcber-long name ".repeat(300));
        Watch watch = Watch.of(TestDesk.plan(List.of(geography), 6, desk.seriesPlan()), List.of(geography));
        double[] cases = new double[55 * 55];
        double[] history = new double[55 * 55];
        Arrays.fill(history, 7);
        for (int i = 0; i < cases.length; i++) {
            int column = i / 55;
            cases[i] = column % 11 < 5 ? 900 + i % 7 : 0;
        }
        Evidence evidence = make(watch, move(Change.RAISED, DAY, DAY), DAY, cases, history, 0, 0);

        assertThat(geography.regions()).hasSize(3025);
        assertThat(Json.bytes(evidence)).hasSizeLessThanOrEqualTo(16 * 1024);
        assertThat(evidence.clusters()).isNotEmpty();
        assertThat(evidence.clusters().get(0).regionCount()).isEqualTo(5 * 55);
        assertThat(evidence.clusters().get(0).regions()).hasSize(8);
        assertThat(evidence.caution()).isEqualTo(EvidenceMaker.CAUTION);
        assertThat(evidence.summary()).endsWith("a statistical signal, not a confirmed outbreak.");
    }
}
