package org.seamwatch.schemas.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class PlanPrinterTest {

    private final Path folder;

    PlanPrinterTest(@TempDir Path folder) {
        this.folder = folder;
    }

    @Test
    void shouldPrintEveryKeyAndWhichAreDefaults() throws IOException {
        Path file = folder.resolve("plan.yaml");
        Files.writeString(file, """
                kafka: { bootstrap.servers: "k:1", ssl.keystore.password: hunter2, sasl.jaas.config: "x y" }
                geographies: [ { file: n.geojson, id: n, population: people } ]
                series:
                  - geography: n
                    conditions: [ a, b ]
                    closeAfter: 2d
                    charts: { moran: [ { ewma: { weight: 0.1 } } ] }
                    holidays: [ 2024-12-25, { day: 2024-01-06, regions: "N*" } ]
                """);

        assertThat(PlanPrinter.lines(PlanReader.readWithKeys(file)))
                .containsExactly(
                        "kafka.bootstrap.servers: k:1",
                        "kafka.sasl.jaas.config: (not shown)",
                        "kafka.ssl.keystore.password: (not shown)",
                        "run.threads: 2 (default)",
                        "run.standbys: 0 (default)",
                        "topics.prefix: \"seamwatch.\" (default)",
                        "topics.partitions: 6 (default)",
                        "topics.seriesPartitions: 6 (default)",
                        "topics.replication: 3 (default)",
                        "topics.rejectedRetention: 30d (default)",
                        "geographies[0].file: " + folder.resolve("n.geojson"),
                        "geographies[0].id: n",
                        "geographies[0].timeZone: UTC (default)",
                        "geographies[0].regionId: id (default)",
                        "geographies[0].regionName: name (default)",
                        "geographies[0].population: people",
                        "geographies[0].populationYear: not said (default)",
                        "geographies[0].regions: \"*\" (default)",
                        "geographies[0].tolerance: 0 (default)",
                        "desk.falseAlarmsPerYear: 6 (default)",
                        "series[0].geography: n",
                        "series[0].conditions: [a, b]",
                        "series[0].from: the log's first day less reviseFor (default)",
                        "series[0].dayOf: report (default)",
                        "series[0].closeAfter: 2d",
                        "series[0].reviseFor: 28d (default)",
                        "series[0].windowDays: 1 (default)",
                        "series[0].statistics: [moran] (default)",
                        "series[0].measure: share-residual (default)",
                        "series[0].permutations: 999 (default)",
                        "series[0].contiguity: edge (default)",
                        "series[0].weights: binary (default)",
                        "series[0].thinBelow: 20 (default)",
                        "series[0].share: 1 (default)",
                        "series[0].learning.warmUpDays: 28 (default)",
                        "series[0].charts.moran[0].ewma.weight: 0.1",
                        "series[0].charts.moran[0].ewma.order: 1 (default)",
                        "series[0].charts.moran[0].ewma.sides: upper (default)",
                        "series[0].holidays: [2024-12-25, 2024-01-06 in N*]");
    }

    @Test
    void shouldPrintDefaultsThatNoKeyGives() throws IOException {
        Path file = folder.resolve("plan.yaml");
        Files.writeString(
                file, "geographies: [ { file: f, id: n } ]\nseries: [ { geography: n, conditions: [ a ] } ]\n");
        List<String> lines = PlanPrinter.lines(PlanReader.readWithKeys(file));

        assertThat(lines)
                .contains(
                        "kafka.bootstrap.servers: localhost:9092 (default)",
                        "geographies[0].population: population, where there is one (default)",
                        "series[0].charts.moran[0].ewma.weight: 0.2 (default)",
                        "series[0].holidays: [] (default)");
    }
}
