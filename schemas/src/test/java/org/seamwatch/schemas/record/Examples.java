package org.seamwatch.schemas.record;

import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** One record of each kind, with and without what may be absent. */
final class Examples {

    static final LocalDate DAY = LocalDate.of(2024, 2, 3);
    static final Instant AT = Instant.parse("2024-02-04T23:00:00Z");
    static final ChartDay CHART =
            new ChartDay("ewma", 1.02, new Limits(null, 0.62), new Limits(null, 0.93), Grade.ACTION);

    static final CaseReport REPORT_BY_REGION =
            new CaseReport(1, "r-1", "lab", 0, ReportStatus.PRELIMINARY, "influenza", "NM-014", null, DAY, null, AT, 1);
    static final CaseReport REPORT_BY_POSITION = new CaseReport(
            1, "r-1", "lab", 7, ReportStatus.FINAL, "influenza", null, new Position(-180, 5.25), DAY, DAY, AT, 0);

    static final AlarmResponse RESPONSE =
            new AlarmResponse(1, "northmarch/influenza/2024-02-03", Verdict.OUTBREAK, DAY, DAY, "desk", AT, "a\nb");

    static final RegionDay REGION_DAY = new RegionDay(1, "northmarch/influenza", "NM-014", DAY, 12, 0);

    static final MoranDay MORAN = new MoranDay(
            StatisticStatus.USABLE,
            "share-residual",
            0.31,
            -1 / 62.0,
            0.0068,
            0.0067,
            3.98,
            999,
            0.001,
            new LearningDay(157, 2.41),
            List.of(CHART));
    static final MoranDay THIN = new MoranDay(
            StatisticStatus.THIN, "share-residual", null, null, null, null, null, null, null, null, List.of());
    static final SeriesDay SERIES_DAY =
            new SeriesDay(1, "northmarch/influenza", DAY, 0, AT, 412, 64, 1, List.of("NM-001"), MORAN);

    private Examples() {}

    static AlarmChange alarm() {
        Evidence evidence = new Evidence(
                "Influenza, Northmarch: 71 cases (12 expected); a statistical signal, not a confirmed outbreak.",
                new Period(DAY.minusDays(6), DAY, "report"),
                List.of(new EvidenceChart(
                        "moran", "ewma", 1.02, CHART.warning(), CHART.action(), Grade.ACTION, DAY.minusDays(4))),
                List.of(new EvidenceHistory(
                        "moran",
                        List.of(
                                new HistoryDay(DAY.minusDays(1), 3, StatisticStatus.THIN, null, null, null),
                                new HistoryDay(DAY, 412, StatisticStatus.USABLE, 0.31, 2.41, Grade.ACTION)))),
                List.of(new Cluster(
                        71,
                        12.5,
                        3,
                        List.of(
                                new ClusterRegion("NM-014", "Alder", 40, 6.5, 31, 6, 80.2, 2023),
                                new ClusterRegion("NM-015", "Birch", 31, 6, 40, 6.5, null, null)))),
                new Quality(412, 30, -2, 0, 1),
                new Method(List.of("Moran's I"), 6, 3, 157, false),
                new Repeat("0.1.0", "ab".repeat(32), "2024a"),
                "A statistical signal is not a confirmed outbreak.");
        return new AlarmChange(
                1,
                "northmarch/influenza/2024-02-03",
                "northmarch/influenza",
                "northmarch",
                "influenza",
                Change.RESPONDED,
                2,
                DAY,
                List.of("moran"),
                RESPONSE,
                evidence);
    }

    static AccountingLine accounting() {
        return new AccountingLine("case-reports", 0, 10, 5, 1, 1, 2, 1, new TreeMap<>(Map.of("too-old", 2L)));
    }
}
