package org.seamwatch.topology;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.TreeMap;
import org.seamwatch.fixtures.territory.Territory;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.geography.Geography;
import org.seamwatch.schemas.geography.GeographyReader;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.schemas.plan.PlanReader;

/**
 * Plans over Northmarch, read from files as users' plans are. Rejected records are kept for a century: tests replay
 * times that lie years back, and a broker deletes by the record's time.
 */
public final class TestPlan {

    private final Path folder;
    private final TreeMap<String, String> kafka = new TreeMap<>();
    private String prefix = "seamwatch.";
    private int partitions = 1;
    private int seriesPartitions = 1;
    private int threads = 1;
    private double falseAlarmsPerYear = 6;

    private TestPlan(Path folder) {
        this.folder = folder;
    }

    /** A plan with one partition of everything, one thread. */
    public static TestPlan in(Path folder) {
        return new TestPlan(folder);
    }

    public TestPlan kafka(String key, Object value) {
        kafka.put(key, value.toString());
        return this;
    }

    public TestPlan prefix(String newPrefix) {
        prefix = newPrefix;
        return this;
    }

    public TestPlan partitions(int newPartitions) {
        partitions = newPartitions;
        return this;
    }

    public TestPlan seriesPartitions(int newPartitions) {
        seriesPartitions = newPartitions;
        return this;
    }

    public TestPlan threads(int newThreads) {
        threads = newThreads;
        return this;
    }

    /** Many, where a test needs alarms within weeks. */
    public TestPlan falseAlarmsPerYear(double number) {
        falseAlarmsPerYear = number;
        return this;
    }

    public Plan plan() {
        try {
            Files.createDirectories(folder);
            Path geography = folder.resolve("northmarch.geojson");
            if (!Files.exists(geography)) {
                Files.write(geography, Territory.northmarch(1).geoJson());
            }
            Path file = Files.createTempFile(folder, "plan", ".yaml");
            Files.writeString(file, text());
            return PlanReader.read(file);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    public Watch watch() {
        Plan plan = plan();
        List<Geography> geographies =
                plan.geographies().stream().map(GeographyReader::read).toList();
        return Watch.of(plan, geographies);
    }

    private String text() {
        StringBuilder text = new StringBuilder("kafka:\n  bootstrap.servers: \"localhost:9\"\n");
        if (kafka.containsKey("bootstrap.servers")) {
            text = new StringBuilder("kafka:\n");
        }
        for (var property : kafka.entrySet()) {
            text.append("  ").append(property.getKey()).append(": \"").append(property.getValue());
            text.append("\"\n");
        }
        return text + """
                run: { threads: %d }
                topics: { prefix: "%s", partitions: %d, seriesPartitions: %d, replication: 1, rejectedRetention: 36500d }
                geographies:
                  - { file: northmarch.geojson, id: northmarch, timeZone: UTC, regionId: id, regionName: name, population: population, populationYear: 2023 }
                desk: { falseAlarmsPerYear: %s }
                series:
                  - { geography: northmarch, conditions: [ influenza, norovirus ], closeAfter: 1d, reviseFor: 28d, permutations: 99 }
                """.formatted(threads, prefix, partitions, seriesPartitions, falseAlarmsPerYear);
    }
}
