package org.seamwatch.schemas.record;

/**
 * Where one chart stood after a day.
 *
 * @param chart name of the chart, such as {@code ewma}
 * @param value what is plotted, in standard scores
 * @param warning the warning limits
 * @param action the action limits
 * @param grade the judgement
 */
public record ChartDay(String chart, double value, Limits warning, Limits action, Grade grade) {}
