package org.seamwatch.schemas.plan;

import java.nio.file.Path;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * A whole plan.
 *
 * @param file where it was read from
 * @param kafka client and Streams properties, as written
 * @param run how the service runs
 * @param topics names and sizes of the topics
 * @param geographies what is watched, where
 * @param deskFalseAlarmsPerYear false alarms a year that the whole desk accepts
 * @param series what is watched, and how
 */
public record Plan(
        Path file,
        Map<String, String> kafka,
        RunPlan run,
        TopicsPlan topics,
        List<GeographyPlan> geographies,
        double deskFalseAlarmsPerYear,
        List<SeriesPlan> series) {

    public Plan {
        // In the order of their names; the order of Map.copyOf differs from run to run.
        kafka = Collections.unmodifiableMap(new TreeMap<>(kafka));
        geographies = List.copyOf(geographies);
        series = List.copyOf(series);
    }
}
