package org.seamwatch.schemas.plan;

import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.InputException;

/** Reads a plan. What it refuses is one {@link InputException} that names file, line, key, rule and value. */
public final class PlanReader {

    /** Where Kafka is looked for when the plan does not say. */
    static final String DEFAULT_BOOTSTRAP = "localhost:9092";

    /** What the desk accepts when the plan does not say. */
    static final double DEFAULT_FALSE_ALARMS = 6;

    private static final List<String> ROOT_KEYS = List.of("kafka", "run", "topics", "geographies", "desk", "series");
    private static final Pattern TOPIC_PREFIX = Pattern.compile("[a-zA-Z0-9._-]{0,100}");

    private PlanReader() {}

    /** The plan in a file. */
    public static Plan read(Path file) {
        return readWithKeys(file).plan();
    }

    /** The plan in a file, with the keys that were given and the warnings. */
    public static ReadPlan readWithKeys(Path file) {
        YamlFile yaml = new YamlFile(file);
        YamlMap root = yaml.root().only(ROOT_KEYS);
        YamlMap desk = root.map("desk", List.of("falseAlarmsPerYear"));
        List<GeographyPlan> geographies = geographies(file, root.required("geographies"));
        YamlValue series = root.required("series");
        Plan plan = new Plan(
                file,
                kafka(root.get("kafka")),
                run(root.map("run", List.of("threads", "standbys"))),
                topics(root.map(
                        "topics",
                        List.of("prefix", "partitions", "seriesPartitions", "replication", "rejectedRetention"))),
                geographies,
                desk.above0("falseAlarmsPerYear", DEFAULT_FALSE_ALARMS),
                series(series, geographies));
        return new ReadPlan(plan, new TreeSet<>(yaml.given()), unused(root.required("geographies"), plan));
    }

    private static Map<String, String> kafka(@Nullable YamlValue value) {
        Map<String, String> properties = new TreeMap<>();
        properties.put("bootstrap.servers", DEFAULT_BOOTSTRAP);
        if (value != null) {
            value.map().values().forEach((key, property) -> properties.put(key, property.text()));
        }
        return properties;
    }

    private static RunPlan run(YamlMap map) {
        RunPlan defaults = RunPlan.defaults();
        return new RunPlan(
                map.integer("threads", 1, 1000, defaults.threads()),
                map.integer("standbys", 0, 100, defaults.standbys()));
    }

    private static TopicsPlan topics(YamlMap map) {
        TopicsPlan defaults = TopicsPlan.defaults();
        int retention = (int) defaults.rejectedRetention().toDays();
        return new TopicsPlan(
                prefix(map.get("prefix"), defaults.prefix()),
                map.integer("partitions", 1, 1000, defaults.partitions()),
                map.integer("seriesPartitions", 1, 1000, defaults.seriesPartitions()),
                map.integer("replication", 1, Short.MAX_VALUE, defaults.replication()),
                Duration.ofDays(map.days("rejectedRetention", 1, 36_500, retention)));
    }

    private static String prefix(@Nullable YamlValue value, String otherwise) {
        if (value == null) {
            return otherwise;
        }
        if (!TOPIC_PREFIX.matcher(value.text()).matches()) {
            throw value.rule("must have at most 100 letters, digits, dots, dashes and underscores, was \""
                    + value.text() + "\"");
        }
        return value.text();
    }

    private static List<GeographyPlan> geographies(Path file, YamlValue value) {
        List<GeographyPlan> geographies = new ArrayList<>();
        Map<String, String> paths = new HashMap<>();
        for (YamlValue item : value.filledList()) {
            GeographyPlan geography = GeographyPlanReader.read(file, item);
            String earlier = paths.putIfAbsent(geography.id(), item.path());
            if (earlier != null) {
                throw item.error("id \"" + geography.id() + "\" must be there once, is " + earlier + " already");
            }
            geographies.add(geography);
        }
        return geographies;
    }

    private static List<SeriesPlan> series(YamlValue value, List<GeographyPlan> geographies) {
        List<String> ids = geographies.stream().map(GeographyPlan::id).toList();
        Map<String, String> paths = new HashMap<>();
        List<SeriesPlan> all = new ArrayList<>();
        for (YamlValue item : value.filledList()) {
            SeriesPlan series = SeriesPlanReader.read(item, ids);
            for (String condition : series.conditions()) {
                String id = series.geography() + "/" + condition;
                String earlier = paths.putIfAbsent(id, item.path());
                if (earlier != null) {
                    throw item.error("series \"" + id + "\" must be there once, is in " + earlier + " already");
                }
            }
            all.add(series);
        }
        return all;
    }

    private static List<String> unused(YamlValue value, Plan plan) {
        Set<String> used = new HashSet<>();
        plan.series().forEach(series -> used.add(series.geography()));
        List<String> warnings = new ArrayList<>();
        List<YamlValue> items = value.list();
        for (int i = 0; i < items.size(); i++) {
            String id = plan.geographies().get(i).id();
            if (!used.contains(id)) {
                InputException text = items.get(i).error("no series uses geography \"" + id + "\"");
                warnings.add(String.valueOf(text.getMessage()));
            }
        }
        return warnings;
    }
}
