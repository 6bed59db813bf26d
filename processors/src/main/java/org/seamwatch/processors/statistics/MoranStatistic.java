package org.seamwatch.processors.statistics;

import java.time.LocalDate;
import java.util.Arrays;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.spatial.GlobalMoran;
import org.seamwatch.processors.spatial.Measure;
import org.seamwatch.processors.spatial.MeasureInput;
import org.seamwatch.processors.spatial.Moran;
import org.seamwatch.processors.spatial.PermutationTest;
import org.seamwatch.processors.spatial.Subset;
import org.seamwatch.processors.spatial.Weights;
import org.seamwatch.schemas.plan.SeriesPlan;
import org.seamwatch.schemas.plan.StatisticName;
import org.seamwatch.schemas.record.MoranDay;
import org.seamwatch.schemas.record.SeriesDay;
import org.seamwatch.schemas.record.StatisticStatus;

/**
 * Global Moran's I (Cliff and Ord 1981) of a measure over the regions that have neighbours and can be judged. Charted on
 * its upper side: a fall is no alarm.
 */
public final class MoranStatistic implements Statistic {

    /** Regions that cannot be judged may hold this part of the population at most. */
    private static final double MOST_UNJUDGED = 1.0 / 3;

    private static final String NEEDS_HISTORY = "share-residual";

    private final String series;
    private final SeriesPlan plan;
    private final Measure measure;
    private final Weights weights;
    private final Subset everywhere;
    private final double @Nullable [] populations;
    private final Board board;

    /**
     * Moran's I of a series.
     *
     * @param series id of the series; seeds the relabellings together with the day
     * @param weights over all regions, those without neighbours included
     * @param populations people of each region, or null
     */
    public MoranStatistic(
            String series,
            SeriesPlan plan,
            Measure measure,
            Weights weights,
            double @Nullable [] populations,
            Board board) {
        this.series = series;
        this.plan = plan;
        this.measure = measure;
        this.weights = weights;
        this.everywhere = weights.connected();
        this.populations = populations == null ? null : populations.clone();
        this.board = board;
    }

    @Override
    public String name() {
        return StatisticName.MORAN.word();
    }

    @Override
    public String words() {
        return "Moran's I of " + plan.measure() + " over " + plan.windowDays() + " day"
                + (plan.windowDays() == 1 ? "" : "s") + ", " + plan.contiguity().words() + " contiguity, "
                + plan.weights().word() + " weights, against the series' own past";
    }

    @Override
    public Board board() {
        return board;
    }

    @Override
    public boolean reads(LocalDate day, LocalDate other) {
        boolean window = !other.isAfter(day) && other.isAfter(day.minusDays(plan.windowDays()));
        boolean history = !other.isAfter(day.minusDays(DayInput.HISTORY_TO))
                && !other.isBefore(day.minusDays(DayInput.HISTORY_FROM));
        return window || history;
    }

    @Override
    public Reading read(DayInput input) {
        if (unjudgedPart(input.unjudged()) > MOST_UNJUDGED) {
            return MoranReading.without(StatisticStatus.INCOMPLETE);
        }
        Subset regions = anyTrue(input.unjudged()) ? weights.without(input.unjudged()) : everywhere;
        if (regions.size() == 0) {
            return MoranReading.without(StatisticStatus.FLAT);
        }
        double[] cases = regions.pick(input.cases());
        if (isYoung(input) || Arrays.stream(cases).sum() < plan.thinBelow()) {
            return MoranReading.without(StatisticStatus.THIN);
        }
        double[] values = measure.values(new MeasureInput(
                cases, populations == null ? null : regions.pick(populations), regions.pick(input.history())));
        return GlobalMoran.of(values, regions.weights())
                .map(moran -> reading(moran, values, regions, input.day()))
                .orElseGet(() -> MoranReading.without(StatisticStatus.FLAT));
    }

    private MoranReading reading(Moran moran, double[] values, Subset regions, LocalDate day) {
        if (plan.permutations() == 0) {
            return new MoranReading(StatisticStatus.USABLE, moran, null, null);
        }
        double p = PermutationTest.upper(values, regions.weights(), plan.permutations(), Seeds.of(series, day));
        return new MoranReading(StatisticStatus.USABLE, moran, plan.permutations(), p);
    }

    private boolean isYoung(DayInput input) {
        return measure.name().equals(NEEDS_HISTORY) && input.historyDays() < DayInput.LEAST_HISTORY;
    }

    private double unjudgedPart(boolean[] unjudged) {
        double all = 0;
        double left = 0;
        for (int i = 0; i < unjudged.length; i++) {
            double people = populations == null ? 1 : populations[i];
            all += people;
            left += unjudged[i] ? people : 0;
        }
        return left / all;
    }

    private static boolean anyTrue(boolean[] flags) {
        for (boolean flag : flags) {
            if (flag) {
                return true;
            }
        }
        return false;
    }

    @Override
    public @Nullable Reading recall(SeriesDay day) {
        MoranDay m = day.moran();
        if (m == null) {
            return null;
        }
        if (m.i() == null
                || m.expected() == null
                || m.varianceNormality() == null
                || m.varianceRandomisation() == null
                || m.z() == null) {
            return MoranReading.without(m.status());
        }
        // The number of regions used is not part of the record and nothing after the reading asks for it.
        Moran moran =
                new Moran(day.regions(), m.i(), m.expected(), m.varianceNormality(), m.varianceRandomisation(), m.z());
        return new MoranReading(m.status(), moran, m.permutations(), m.pUpper());
    }

    @Override
    public @Nullable StatisticDay said(SeriesDay day) {
        MoranDay m = day.moran();
        return m == null ? null : new StatisticDay(m.status(), m.i(), m.learning(), m.charts());
    }

    @Override
    public SeriesDay on(SeriesDay day, Reading reading, @Nullable Judgement judgement) {
        MoranReading r = (MoranReading) reading;
        Moran moran = r.moran();
        MoranDay m = new MoranDay(
                r.status(),
                plan.measure(),
                moran == null ? null : moran.i(),
                moran == null ? null : moran.expected(),
                moran == null ? null : moran.varianceNormality(),
                moran == null ? null : moran.varianceRandomisation(),
                moran == null ? null : moran.z(),
                r.permutations(),
                r.pUpper(),
                judgement == null ? null : judgement.learning(),
                judgement == null ? List.of() : judgement.charts());
        return day.withMoran(m);
    }
}
