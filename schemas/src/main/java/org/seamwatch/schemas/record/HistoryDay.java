package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonInclude;
import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/**
 * One day of a statistic in the evidence.
 *
 * @param day the day
 * @param cases cases in the geography
 * @param status whether the statistic was usable
 * @param value the statistic; absent where it is not usable
 * @param score its standard score; absent while learning gives none
 * @param grade the highest grade of its charts; absent where it is not usable
 */
@JsonInclude(JsonInclude.Include.NON_NULL)
public record HistoryDay(
        LocalDate day,
        long cases,
        StatisticStatus status,
        @Nullable Double value,
        @Nullable Double score,
        @Nullable Grade grade) {}
