package org.seamwatch.processors.series;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.seamwatch.processors.alarms.AlarmState;
import org.seamwatch.processors.alarms.EpisodeState;
import org.seamwatch.processors.charts.ChartState;
import org.seamwatch.processors.flow.Cases;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.flow.SeriesMessage.Watermark;
import org.seamwatch.processors.learning.Lags;
import org.seamwatch.processors.learning.LearningState;
import org.seamwatch.processors.learning.Regression;
import org.seamwatch.processors.learning.WaitingDay;
import org.seamwatch.processors.state.MemoryShelf;
import org.seamwatch.processors.state.OldRows;
import org.seamwatch.processors.state.VersionedJson;
import org.seamwatch.processors.statistics.BoardState;
import org.seamwatch.processors.statistics.ChartPlace;
import org.seamwatch.schemas.record.AlarmResponse;
import org.seamwatch.schemas.record.ChartDay;
import org.seamwatch.schemas.record.Cluster;
import org.seamwatch.schemas.record.ClusterRegion;
import org.seamwatch.schemas.record.Evidence;
import org.seamwatch.schemas.record.EvidenceChart;
import org.seamwatch.schemas.record.EvidenceHistory;
import org.seamwatch.schemas.record.Grade;
import org.seamwatch.schemas.record.HistoryDay;
import org.seamwatch.schemas.record.LearningDay;
import org.seamwatch.schemas.record.Limits;
import org.seamwatch.schemas.record.Method;
import org.seamwatch.schemas.record.MoranDay;
import org.seamwatch.schemas.record.Period;
import org.seamwatch.schemas.record.Quality;
import org.seamwatch.schemas.record.Repeat;
import org.seamwatch.schemas.record.SeriesDay;
import org.seamwatch.schemas.record.StatisticStatus;
import org.seamwatch.schemas.record.Verdict;

/** Rows of the series stores: read back as written, and as earlier builds wrote them. */
class SeriesRowsTest {

    private static final LocalDate DAY = LocalDate.of(2024, 2, 3);
    private static final Limits UPPER = new Limits(null, 0.1 + 0.2);

    @Test
    void shouldReadDayCounts() {
        DayCounts counts = new DayCounts();
        counts.add(new TreeMap<>(Map.of("R1", new Cases(4, 1), "R2", new Cases(7, 0))), false);
        counts.emitted(0);
        counts.add(new TreeMap<>(Map.of("R1", new Cases(-4, -1), "R3", new Cases(200, 200))), true);
        OldRows.assertKept("day-counts-1", counts.row());

        DayCounts old = DayCounts.from(OldRows.row("day-counts-1"));
        assertThat(old.cells()).isEqualTo(counts.cells());
        assertThat(old.stale()).containsExactly("R1", "R3");
        assertThat(List.of(old.late(), old.preliminary(), old.count("R2"))).containsExactly(196L, 200L, 7L);
        assertThat(old.revision()).isZero();
    }

    @Test
    void shouldReadProgress() {
        MemoryShelf shelf = new MemoryShelf();
        Progress progress = new Progress(shelf);
        InputSizes sizes = new InputSizes(1, 1);
        progress.take(new Watermark("case-reports", 0, 474_040, 1_706_530_000_123L, sizes));
        progress.take(new Watermark("alarm-responses", 0, 474_038, 1_706_531_000_123L, sizes));
        progress.applied(474_037);
        progress.save();
        byte[] row = shelf.get("progress");
        assertThat(row).isNotNull();
        OldRows.assertKept("progress-1", row);

        shelf.put("progress", OldRows.row("progress-1"));
        Progress old = new Progress(shelf);
        assertThat(old.hasBegun()).isTrue();
        assertThat(List.of(old.applied(), old.passed(), old.logStart()))
                .containsExactly(474_037L, 474_038L, 1_706_530_000_123L);
    }

    @Test
    void shouldReadBooks() {
        SeriesBook book = new SeriesBook(
                "ab12",
                DAY.minusDays(28),
                DAY.minusDays(20),
                DAY,
                DAY.minusDays(3),
                new TreeSet<>(List.of(DAY.minusDays(3), DAY.minusDays(9))),
                new TreeSet<>(List.of(DAY.minusDays(40))),
                2);
        assertJson("series-book-1", book, SeriesBook.class);
        assertJson("series-book-start-1", SeriesBook.start("ab12", DAY), SeriesBook.class);
    }

    @Test
    void shouldReadDayStates() {
        MoranDay moran = new MoranDay(
                StatisticStatus.USABLE,
                "share-residual",
                0.31,
                -1.0 / 62,
                0.0068,
                1e-17,
                3.98,
                999,
                0.001,
                new LearningDay(157, 2.41),
                List.of(new ChartDay("ewma", 1.02, UPPER, UPPER, Grade.ACTION)));
        SeriesDay day = new SeriesDay(
                1,
                "northmarch/influenza",
                DAY,
                3,
                Instant.parse("2024-02-05T00:00:00Z"),
                412,
                64,
                1,
                List.of("R1"),
                moran);
        Lags lags = new Lags(new double[] {0.1}, new double[] {-0.0});
        LearningState learning = new LearningState(
                157,
                new Regression(155, new double[] {12.4, 1e-3, 0.30000000000000004}, new double[] {4.9e-324, 2}, 0.7),
                lags,
                DAY,
                List.of(new WaitingDay(DAY, 0.31, lags)));
        BoardState board = new BoardState(
                learning, List.of(new ChartPlace(new ChartState(new double[] {1.02}, 4), DAY.minusDays(3))));
        EpisodeState episode = new EpisodeState(DAY.minusDays(2), DAY, null, List.of("moran"), 0);
        assertJson("day-state-1", new DayState(day, new TreeMap<>(Map.of("moran", board)), episode), DayState.class);

        LearningState young = new LearningState(0, Regression.empty(2), Lags.NONE, null, List.of());
        MoranDay thin =
                new MoranDay(StatisticStatus.THIN, "count", null, null, null, null, null, null, null, null, List.of());
        BoardState start = new BoardState(young, List.of(new ChartPlace(new ChartState(new double[] {0}, 0), null)));
        assertJson(
                "day-state-thin-1",
                new DayState(
                        day.at(0, Instant.EPOCH).withMoran(thin),
                        new TreeMap<>(Map.of("moran", start)),
                        EpisodeState.NONE),
                DayState.class);
    }

    @Test
    void shouldReadAlarms() {
        Evidence evidence = new Evidence(
                "One sentence.",
                new Period(DAY.minusDays(6), DAY, "event"),
                List.of(new EvidenceChart("moran", "ewma", 1.02, UPPER, UPPER, Grade.ACTION, null)),
                List.of(new EvidenceHistory(
                        "moran",
                        List.of(new HistoryDay(DAY, 412, StatisticStatus.USABLE, 0.31, null, Grade.LEARNING)))),
                List.of(new Cluster(
                        71, 12.5, 1, List.of(new ClusterRegion("R1", "Holm", 71, 12.5, 3, 4.25, null, null)))),
                new Quality(412, 30, -4, 3, 1),
                new Method(List.of("words"), 6, 3, 157, false),
                new Repeat("0.1.0", "ab12", "2024a"),
                "Caution.");
        AlarmResponse response = new AlarmResponse(
                1,
                "northmarch/influenza/2024-02-01",
                Verdict.OUTBREAK,
                null,
                null,
                "M. Holm",
                Instant.parse("2024-02-05T10:00:00Z"),
                null);
        AlarmState state = new AlarmState(
                "northmarch/influenza/2024-02-01",
                DAY.minusDays(2),
                DAY.minusDays(2),
                DAY,
                null,
                false,
                4,
                List.of("moran"),
                true,
                response);
        assertJson("alarm-1", new AlarmShelf.Kept(state, evidence), AlarmShelf.Kept.class);
        AlarmState over =
                new AlarmState(state.id(), DAY, DAY, DAY, DAY.plusDays(7), true, 2, List.of("moran"), false, null);
        assertJson("alarm-over-1", new AlarmShelf.Kept(over, evidence), AlarmShelf.Kept.class);
    }

    private static <T> void assertJson(String name, T value, Class<T> type) {
        byte[] row = VersionedJson.row(1, value);
        assertThat(VersionedJson.read(row, 1, type)).isEqualTo(value);
        OldRows.assertKept(name, row);
        assertThat(VersionedJson.read(OldRows.row(name), 1, type)).isEqualTo(value);
    }
}
