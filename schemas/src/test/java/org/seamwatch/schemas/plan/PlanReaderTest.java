package org.seamwatch.schemas.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seamwatch.schemas.InputException;

class PlanReaderTest {

    private static final String SMALLEST = """
            geographies:
              - { file: northmarch.geojson, id: northmarch }
            series:
              - geography: northmarch
                conditions: [ influenza ]
            """;

    private final Path folder;

    PlanReaderTest(@TempDir Path folder) {
        this.folder = folder;
    }

    @Test
    void shouldFillInTheDefaults() {
        Plan plan = read(SMALLEST);

        assertThat(plan.kafka()).isEqualTo(Map.of("bootstrap.servers", "localhost:9092"));
        assertThat(plan.run()).isEqualTo(new RunPlan(2, 0));
        assertThat(plan.topics()).isEqualTo(new TopicsPlan("seamwatch.", 6, 6, 3, Duration.ofDays(30)));
        assertThat(plan.deskFalseAlarmsPerYear()).isEqualTo(6);
        assertThat(plan.geographies())
                .containsExactly(new GeographyPlan(
                        folder.resolve("northmarch.geojson"),
                        "northmarch",
                        ZoneId.of("UTC"),
                        "id",
                        "name",
                        null,
                        null,
                        "*",
                        0));
        assertThat(plan.series())
                .containsExactly(new SeriesPlan(
                        "northmarch",
                        List.of("influenza"),
                        null,
                        DayOf.REPORT,
                        1,
                        28,
                        1,
                        List.of(StatisticName.MORAN),
                        "share-residual",
                        999,
                        new ContiguityRule.Edge(),
                        WeightStyle.BINARY,
                        20,
                        1,
                        28,
                        Map.of(StatisticName.MORAN, List.of(new ChartPlan.Ewma(0.2, 1, Sides.UPPER))),
                        List.of()));
    }

    @Test
    void shouldReadEveryKey() {
        Plan plan = read("""
                kafka: { bootstrap.servers: "k1:9092,k2:9092", linger.ms: 5 }
                run: { threads: 4, standbys: 1 }
                topics: { prefix: "", partitions: 12, seriesPartitions: 3, replication: 1, rejectedRetention: 7d }
                geographies:
                  - { file: maps/a.geojson, id: 01, timeZone: Europe/Berlin, regionId: code, regionName: title,
                      population: people, populationYear: 2023, regions: "05*,NM-1", tolerance: 1e-4 }
                desk: { falseAlarmsPerYear: 0.5 }
                series:
                  - geography: "01"
                    conditions: [ a, b ]
                    from: 2024-01-01
                    dayOf: event
                    closeAfter: 0d
                    reviseFor: 365d
                    windowDays: 7
                    statistics: [ moran ]
                    measure: eb-rate
                    permutations: 0
                    contiguity: { nearest: 5 }
                    weights: row
                    thinBelow: 0
                    share: 2.5
                    learning: { warmUpDays: 60 }
                    charts:
                      moran: [ { individuals: }, { ewma: { weight: 1, order: 1, sides: both } } ]
                    holidays: [ 2024-12-25, { day: 2024-01-06, regions: "NM-0*" }, { day: 2024-05-01 } ]
                """);

        assertThat(plan.kafka()).isEqualTo(Map.of("bootstrap.servers", "k1:9092,k2:9092", "linger.ms", "5"));
        assertThat(plan.run()).isEqualTo(new RunPlan(4, 1));
        assertThat(plan.topics()).isEqualTo(new TopicsPlan("", 12, 3, 1, Duration.ofDays(7)));
        assertThat(plan.geographies())
                .containsExactly(new GeographyPlan(
                        folder.resolve("maps/a.geojson"),
                        "01",
                        ZoneId.of("Europe/Berlin"),
                        "code",
                        "title",
                        "people",
                        2023,
                        "05*,NM-1",
                        1e-4));
        assertThat(plan.deskFalseAlarmsPerYear()).isEqualTo(0.5);
        assertThat(plan.series())
                .containsExactly(new SeriesPlan(
                        "01",
                        List.of("a", "b"),
                        LocalDate.of(2024, 1, 1),
                        DayOf.EVENT,
                        0,
                        365,
                        7,
                        List.of(StatisticName.MORAN),
                        "eb-rate",
                        0,
                        new ContiguityRule.Nearest(5),
                        WeightStyle.ROW,
                        0,
                        2.5,
                        60,
                        Map.of(
                                StatisticName.MORAN,
                                List.of(
                                        new ChartPlan.Individuals(1, Sides.UPPER),
                                        new ChartPlan.Ewma(1, 1, Sides.BOTH))),
                        List.of(
                                new HolidayPlan(LocalDate.of(2024, 12, 25), "*"),
                                new HolidayPlan(LocalDate.of(2024, 1, 6), "NM-0*"),
                                new HolidayPlan(LocalDate.of(2024, 5, 1), "*"))));
    }

    @Test
    void shouldWarmUpLongerForLongerWindows() {
        assertThat(read(SMALLEST + "    windowDays: 2\n").series().get(0).warmUpDays())
                .isEqualTo(90);
    }

    @Test
    void shouldTakeAKeyWithoutValueForAbsent() {
        Plan plan = read(SMALLEST + "    from:   # a date\n    learning:\nkafka:\n");
        assertThat(plan).isEqualTo(read(SMALLEST));
    }

    /** What is put in place of a part of the smallest plan, and the message behind the name of the file. */
    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "id: northmarch; id: north march; ':2: geographies[0].id must have no /, | or white space, was \"north march\"'",
                "id: northmarch; id: a/b; ':2: geographies[0].id must have no /, | or white space, was \"a/b\"'",
                "', id: northmarch'; ''; ':2: geographies[0].id: must be there, was missing'",
                "'file: northmarch.geojson, '; ''; ':2: geographies[0].file: must be there, was missing'",
                "id: northmarch; 'id: northmarch, timeZone: Europe/Berln'; ':2: geographies[0].timeZone: unknown time zone \"Europe/Berln\"; did you mean \"Europe/Berlin\"?'",
                "id: northmarch; 'id: northmarch, tolerance: -1'; ':2: geographies[0].tolerance must be in 0 to 1 degrees, was -1'",
                "id: northmarch; 'id: northmarch, regions: \" , \"'; ':2: geographies[0].regions must have patterns like 05*, was \" , \"'",
                "id: northmarch; 'id: northmarch, populationYear: 23'; ':2: geographies[0].populationYear must be in 1900 to 2200, was 23'",
                "geography: northmarch; geography: northmarsh; ':4: series[0].geography: unknown geography \"northmarsh\", known: northmarch; did you mean \"northmarch\"?'",
                "influenza; 'influenza, influenza'; ':5: series[0].conditions[1] must be there once, is \"influenza\" again'",
                "influenza; a|b; ':5: series[0].conditions[0] must have no /, | or white space, was \"a|b\"'",
                "'[ influenza ]'; '[]'; ':5: series[0].conditions must have at least one item, was empty'",
                "'[ influenza ]'; ''; ':5: series[0].conditions: must be there, was missing'",
                "'[ influenza ]'; influenza; ':5: series[0].conditions must be a list, was \"influenza\"'",
                "'series:'; 'serie:'; ':3: serie: unknown key; did you mean \"series\"?'",
                "'series:'; 'desk:'; ':4: desk must have keys, was a list'",
                "'geographies:'; 'kafka: { a: [ 1 ] }\ngeographies:'; ':1: kafka.a must be one value, was a list'",
                "'geographies:'; 'desk: { falseAlarmsPerYear: -2 }\ngeographies:'; ':1: desk.falseAlarmsPerYear must be above 0, was -2'",
                "'geographies:'; 'topics: { partitions: 0 }\ngeographies:'; ':1: topics.partitions must be in 1 to 1000, was 0'",
                "'geographies:'; 'topics: { replication: 0 }\ngeographies:'; ':1: topics.replication must be in 1 to 32767, was 0'",
                "'geographies:'; 'topics: { prefix: a/b }\ngeographies:'; ':1: topics.prefix must have at most 100 letters, digits, dots, dashes and underscores, was \"a/b\"'",
                "'geographies:'; 'topics: { rejectedRetention: 0d }\ngeographies:'; ':1: topics.rejectedRetention must be in 1 to 36500, was 0d'",
                "'geographies:'; 'run: { thread: 2 }\ngeographies:'; ':1: run.thread: unknown key; did you mean \"threads\"?'",
            })
    void shouldNameLineKeyAndValueOfTheRest(String part, String instead, String message) {
        assertThatThrownBy(() -> read(SMALLEST.replace(part, instead.replace("\\n", "\n"))))
                .isInstanceOf(InputException.class)
                .hasMessage(file() + message);
    }

    @Test
    void shouldRefuseAGeographyTwice() {
        String twice = SMALLEST.replace("series:", "  - { file: b.geojson, id: northmarch }\nseries:");
        assertThatThrownBy(() -> read(twice))
                .hasMessage(
                        file() + ":3: geographies[1]: id \"northmarch\" must be there once, is geographies[0] already");
    }

    @Test
    void shouldRefuseASeriesTwice() {
        String twice = SMALLEST + "  - { geography: northmarch, conditions: [ norovirus, influenza ] }\n";
        assertThatThrownBy(() -> read(twice))
                .hasMessage(file()
                        + ":6: series[1]: series \"northmarch/influenza\" must be there once, is in series[0] already");
    }

    @Test
    void shouldSayThatThereIsNoPlan() throws IOException {
        assertThatThrownBy(() -> PlanReader.read(folder.resolve("none.yaml")))
                .isInstanceOf(InputException.class)
                .hasMessage(folder.resolve("none.yaml") + ": no such file");
        assertThatThrownBy(() -> PlanReader.read(folder)).hasMessage(folder + ": is a folder, must be a file");
        assertThatThrownBy(() -> read("# nothing\n"))
                .hasMessage(file() + ": is empty, must have geographies and series");
        assertThatThrownBy(() -> read("series: []")).hasMessage(file() + ":1: geographies: must be there, was missing");
        Files.write(file(), "a: \u00e9".getBytes(StandardCharsets.ISO_8859_1));
        assertThatThrownBy(() -> PlanReader.read(file()))
                .hasMessage(file() + ": must be UTF-8, has bytes that are not");
    }

    @Test
    void shouldSayWhereItIsNotYaml() {
        assertThatThrownBy(() -> read("a: 1\n\tb: 2\n"))
                .isInstanceOf(InputException.class)
                .hasMessageStartingWith(file() + ":2: not YAML: ")
                .hasMessageNotContaining("\n");
        assertThatThrownBy(() -> read("- a\n")).hasMessage(file() + ":1: the plan must have keys, was a list");
        assertThatThrownBy(() -> read(SMALLEST + "---\na: 1\n")).hasMessageContaining("not YAML: ");
        assertThatThrownBy(() -> read("? [ a ]\n: 1\n")).hasMessage(file() + ":1: a key must be a word");
        assertThatThrownBy(() -> read("a: \u0001\n"))
                .isInstanceOf(InputException.class)
                .hasMessageStartingWith(file() + ": not YAML: ");
    }

    @Test
    void shouldCreateNothingFromTags() {
        assertThatThrownBy(() -> read("geographies: !!java.net.URL [ \"x\" ]\nseries: []\n"))
                .isInstanceOf(InputException.class)
                .hasMessage(file() + ":1: not YAML: Global tag is not allowed: tag:yaml.org,2002:java.net.URL");
    }

    @Test
    void shouldWarnOfAGeographyThatNoSeriesUses() {
        String text = SMALLEST.replace("series:", "  - { file: b.geojson, id: south }\nseries:");
        write(text);
        ReadPlan read = PlanReader.readWithKeys(file());

        assertThat(read.warnings()).containsExactly(file() + ":3: geographies[1]: no series uses geography \"south\"");
        assertThat(read.given())
                .containsExactly(
                        "geographies",
                        "geographies[0].file",
                        "geographies[0].id",
                        "geographies[1].file",
                        "geographies[1].id",
                        "series",
                        "series[0].conditions",
                        "series[0].geography");
    }

    private Plan read(String text) {
        write(text);
        return PlanReader.read(file());
    }

    private void write(String text) {
        try {
            Files.writeString(file(), text);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private Path file() {
        return folder.resolve("plan.yaml");
    }
}
