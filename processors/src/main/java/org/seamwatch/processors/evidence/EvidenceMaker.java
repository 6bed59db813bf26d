package org.seamwatch.processors.evidence;

import java.time.LocalDate;
import java.time.zone.ZoneRulesProvider;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.alarms.AlarmMove;
import org.seamwatch.processors.statistics.BoardState;
import org.seamwatch.processors.statistics.Statistic;
import org.seamwatch.processors.statistics.StatisticDay;
import org.seamwatch.processors.watch.SeriesSpec;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.ProductVersion;
import org.seamwatch.schemas.record.ChartDay;
import org.seamwatch.schemas.record.Cluster;
import org.seamwatch.schemas.record.Evidence;
import org.seamwatch.schemas.record.EvidenceChart;
import org.seamwatch.schemas.record.EvidenceHistory;
import org.seamwatch.schemas.record.HistoryDay;
import org.seamwatch.schemas.record.LearningDay;
import org.seamwatch.schemas.record.Method;
import org.seamwatch.schemas.record.Period;
import org.seamwatch.schemas.record.Quality;
import org.seamwatch.schemas.record.Repeat;
import org.seamwatch.schemas.record.SeriesDay;

/** Makes the evidence of an alarm's change. */
public final class EvidenceMaker {

    /** Cases of clusters are counted over so many days. */
    public static final int PERIOD_DAYS = 7;

    /** So many days of each statistic are shown. */
    public static final int HISTORY_DAYS = 28;

    /** What every alarm, screen and report carries. */
    public static final String CAUTION = "A statistical signal is not a confirmed outbreak, and silence is not safety."
            + " Follow your jurisdiction's protocol and decide with licensed practitioners.";

    private static final int YOUNG_BELOW_DAYS = 120;

    private final Watch watch;
    private final SeriesSpec spec;
    private final Summary summary;

    public EvidenceMaker(Watch watch, SeriesSpec spec) {
        this.watch = watch;
        this.spec = spec;
        this.summary = new Summary(spec);
    }

    /** The evidence of a change, held to its size. */
    public Evidence make(AlarmMove move, EvidenceInput in) {
        List<Cluster> clusters =
                new ClusterFinder(spec.geography(), spec.ground(), in.cases(), in.history()).clusters();
        List<EvidenceChart> charts = charts(in);
        Quality quality = quality(in);
        Evidence evidence = new Evidence(
                summary.of(move, in, clusters, charts, quality),
                new Period(
                        in.day().minusDays(PERIOD_DAYS - 1L),
                        in.day(),
                        spec.plan().dayOf().word()),
                charts,
                history(in),
                clusters,
                quality,
                method(in),
                new Repeat(ProductVersion.CURRENT, watch.hash(), tzdata()),
                CAUTION);
        return EvidenceSize.fitted(evidence);
    }

    private static String tzdata() {
        return ZoneRulesProvider.getVersions("UTC").lastEntry().getKey();
    }

    private static @Nullable SeriesDay last(EvidenceInput in) {
        return in.days().isEmpty() ? null : in.days().get(in.days().size() - 1).day();
    }

    private List<EvidenceChart> charts(EvidenceInput in) {
        List<EvidenceChart> charts = new ArrayList<>();
        for (Statistic statistic : spec.statistics()) {
            for (int i = in.days().size() - 1; i >= 0; i--) {
                HistoryRow row = in.days().get(i);
                StatisticDay said = statistic.said(row.day());
                if (said != null && !said.charts().isEmpty()) {
                    addCharts(statistic, said, row.boards().get(statistic.name()), charts);
                    break;
                }
            }
        }
        return charts;
    }

    private static void addCharts(
            Statistic statistic, StatisticDay said, @Nullable BoardState board, List<EvidenceChart> charts) {
        for (int i = 0; i < said.charts().size(); i++) {
            ChartDay c = said.charts().get(i);
            LocalDate began = board == null ? null : board.charts().get(i).began();
            charts.add(new EvidenceChart(
                    statistic.name(), c.chart(), c.value(), c.warning(), c.action(), c.grade(), began));
        }
    }

    private List<EvidenceHistory> history(EvidenceInput in) {
        List<EvidenceHistory> histories = new ArrayList<>();
        for (Statistic statistic : spec.statistics()) {
            List<HistoryDay> days = new ArrayList<>();
            for (HistoryRow row : in.days()) {
                StatisticDay said = statistic.said(row.day());
                if (said != null) {
                    LearningDay learning = said.learning();
                    days.add(new HistoryDay(
                            row.day().day(),
                            row.day().cases(),
                            said.status(),
                            said.value(),
                            learning == null ? null : learning.score(),
                            said.grade()));
                }
            }
            histories.add(new EvidenceHistory(statistic.name(), days));
        }
        return histories;
    }

    private Quality quality(EvidenceInput in) {
        double cases = 0;
        for (double y : in.cases()) {
            cases += y;
        }
        SeriesDay last = last(in);
        return new Quality(
                (long) cases,
                in.preliminary(),
                in.late(),
                last == null ? 0 : last.revision(),
                last == null ? 0 : last.unjudged().size());
    }

    private Method method(EvidenceInput in) {
        int fewest = Integer.MAX_VALUE;
        for (Statistic statistic : spec.statistics()) {
            fewest = Math.min(fewest, learningDays(in, statistic));
        }
        return new Method(
                spec.statistics().stream().map(Statistic::words).toList(),
                spec.budget().desk(),
                spec.budget().series(),
                fewest,
                fewest < YOUNG_BELOW_DAYS);
    }

    /** Days that had taught when the newest usable day was judged. */
    private static int learningDays(EvidenceInput in, Statistic statistic) {
        for (int i = in.days().size() - 1; i >= 0; i--) {
            StatisticDay said = statistic.said(in.days().get(i).day());
            if (said != null && said.learning() != null) {
                return said.learning().days();
            }
        }
        return 0;
    }
}
