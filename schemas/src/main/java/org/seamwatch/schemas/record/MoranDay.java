package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonInclude;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Global Moran's I of a series on a day. Where the status is not {@code usable}, the values are absent.
 *
 * @param status whether the day can be used
 * @param measure what I is computed on
 * @param i Moran's I
 * @param expected -1/(n-1)
 * @param varianceNormality variance under normality
 * @param varianceRandomisation variance under randomisation
 * @param z (i - expected) / sqrt(varianceRandomisation): tests "no structure at all", not the basis of an alarm
 * @param permutations how many random relabellings p rests on
 * @param pUpper share of relabellings with an I at least as large, the observed one counted in
 * @param learning what learning knew; absent where the value is not usable
 * @param charts where the charts stood; empty where the value is not usable
 */
@JsonInclude(JsonInclude.Include.NON_NULL)
public record MoranDay(
        StatisticStatus status,
        String measure,
        @Nullable Double i,
        @Nullable Double expected,
        @Nullable Double varianceNormality,
        @Nullable Double varianceRandomisation,
        @Nullable Double z,
        @Nullable Integer permutations,
        @Nullable Double pUpper,
        @Nullable LearningDay learning,
        List<ChartDay> charts) {

    public MoranDay {
        charts = List.copyOf(charts);
    }
}
