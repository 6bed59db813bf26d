package org.seamwatch.schemas.plan;

import java.time.LocalDate;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;

/**
 * Series of one geography that are watched alike.
 *
 * @param geography id of the geography
 * @param conditions the conditions; each makes a series
 * @param from first day; by default the local date of the log's first timestamp less reviseForDays
 * @param dayOf which date of a report makes its day
 * @param closeAfterDays calendar days a day waits for reports after it has ended
 * @param reviseForDays days for which late reports revise a closed day
 * @param windowDays days whose cases are added for a statistic
 * @param statistics what is computed
 * @param measure what Moran's I is computed on: count, rate, eb-rate, share-residual
 * @param permutations random relabellings for p, from 0 (none)
 * @param contiguity which regions are neighbours
 * @param weights how much a neighbour weighs
 * @param thinBelow fewer cases in the window than this: the day is thin
 * @param share share of the desk's budget, relative to other series
 * @param warmUpDays days that teach before a chart is judged
 * @param charts charts of each statistic in {@code statistics}, never empty
 * @param holidays days whose regions are not judged
 */
public record SeriesPlan(
        String geography,
        List<String> conditions,
        @Nullable LocalDate from,
        DayOf dayOf,
        int closeAfterDays,
        int reviseForDays,
        int windowDays,
        List<StatisticName> statistics,
        String measure,
        int permutations,
        ContiguityRule contiguity,
        WeightStyle weights,
        int thinBelow,
        double share,
        int warmUpDays,
        Map<StatisticName, List<ChartPlan>> charts,
        List<HolidayPlan> holidays) {

    public SeriesPlan {
        conditions = List.copyOf(conditions);
        statistics = List.copyOf(statistics);
        // In the order of the statistics; the order of Map.copyOf differs from run to run.
        charts = Collections.unmodifiableMap(new TreeMap<>(charts));
        holidays = List.copyOf(holidays);
    }
}
