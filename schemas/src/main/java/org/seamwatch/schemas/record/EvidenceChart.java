package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonInclude;
import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/**
 * One chart in the evidence.
 *
 * @param statistic name of the statistic
 * @param chart name of the chart
 * @param value what is plotted, in standard scores
 * @param warning the warning limits
 * @param action the action limits
 * @param grade the judgement
 * @param began estimated first day of the change: the day after the chart last stood at its centre
 */
@JsonInclude(JsonInclude.Include.NON_NULL)
public record EvidenceChart(
        String statistic,
        String chart,
        double value,
        Limits warning,
        Limits action,
        Grade grade,
        @Nullable LocalDate began) {}
