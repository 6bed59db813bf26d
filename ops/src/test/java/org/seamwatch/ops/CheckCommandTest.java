package org.seamwatch.ops;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class CheckCommandTest {

    private final PlanFiles files;

    CheckCommandTest(@TempDir Path folder) {
        files = new PlanFiles(folder);
    }

    private Run check() {
        return Run.of("check", "--plan", files.plan());
    }

    /** One line on standard error, nothing on standard output, exit code 2. */
    private void assertRefused(String start, String... parts) {
        Run run = check();
        assertThat(run.errLines())
                .singleElement()
                .asString()
                .startsWith("seamwatch: " + start)
                .satisfies(line -> assertThat(parts).allMatch(line::contains));
        assertThat(run.out()).isEmpty();
        assertThat(run.code()).isEqualTo(2);
    }

    @Test
    void shouldShowWhatAPlanComesTo() {
        Run run = check();
        assertThat(run.code()).isZero();
        assertThat(run.err()).isEmpty();
        assertThat(run.out().lines())
                .contains(
                        "  topics.partitions: 2",
                        "  topics.prefix: \"seamwatch.\" (default)",
                        "  series[0].closeAfter: 1d (default)",
                        "  desk.falseAlarmsPerYear: 4",
                        "Geography land: 4 regions, 6,400 people",
                        "Series land/flu, by report date",
                        "  neighbours (edge): 2 links, one piece, 1 isolated: I Isle",
                        "  false alarms intended: 4.000 a year of the desk's 4.000");
        assertThat(run.out())
                .containsPattern("moran, ewma chart: action limit 0\\.\\d+, warning limit 0\\.\\d+; 4\\.000");
    }

    @Test
    void shouldCountPieces() {
        files.land(PlanFiles.LAND.replace(
                "[8,8],[9,8],[9,9],[8,9],[8,8]",
                "[8,8],[9,8],[9,9],[8,9],[8,8]]]}},"
                        + "{\"type\":\"Feature\",\"properties\":{\"id\":\"J\",\"name\":\"Jetty\",\"population\":10},"
                        + "\"geometry\":{\"type\":\"Polygon\",\"coordinates\":[[[9,8],[10,8],[10,9],[9,9],[9,8]"));
        assertThat(check().out()).contains("neighbours (edge): 3 links, 2 pieces, no isolated region");
    }

    @Test
    void shouldNameAMisspeltKey() {
        files.plan(PlanFiles.PLAN.replace("thinBelow", "thinBellow"));
        assertRefused(files.plan() + ":8: ", "thinBellow", "thinBelow");
    }

    @Test
    void shouldNameAMissingPlan() throws IOException {
        Files.delete(files.plan());
        assertRefused(files.plan() + ": no such file");
    }

    @Test
    void shouldNameAMissingGeography() throws IOException {
        Files.delete(files.land());
        assertRefused(files.land() + ": no such file");
    }

    @Test
    void shouldNameASelfCrossingPolygon() {
        files.land(PlanFiles.LAND.replace("[2,0],[3,0],[3,1],[2,1],[2,0]", "[2,0],[3,1],[3,0],[2,1],[2,0]"));
        assertRefused(files.land() + ":4: ", "\"C\"", "geometry");
    }

    @Test
    void shouldNameADuplicateRegion() {
        files.land(PlanFiles.LAND.replace("\"id\":\"B\"", "\"id\":\"A\""));
        assertRefused(files.land() + ":3: ", "\"A\"", "once");
    }

    @Test
    void shouldNameAPopulationOfZero() {
        files.land(PlanFiles.LAND.replace("\"population\":3000", "\"population\":0"));
        assertRefused(files.land() + ":4: ", "\"C\"", "population", "above 0");
    }

    @Test
    void shouldNameANegativeBudget() {
        files.plan(PlanFiles.PLAN.replace("falseAlarmsPerYear: 4", "falseAlarmsPerYear: -4"));
        assertRefused(files.plan() + ":4: ", "falseAlarmsPerYear", "above 0", "-4");
    }

    @Test
    void shouldNameAnUnknownTimeZone() {
        files.plan(PlanFiles.PLAN.replace("Europe/Vienna", "Europe/Viena"));
        assertRefused(files.plan() + ":3: ", "timeZone", "Europe/Viena", "Europe/Vienna");
    }

    @Test
    void shouldWarnOfAGeographyThatNoSeriesUses() {
        files.plan(PlanFiles.PLAN.replace("desk:", "  - { file: land.geojson, id: idle }\ndesk:"));
        Run run = check();
        assertThat(run.code()).isZero();
        assertThat(run.errLines())
                .singleElement()
                .asString()
                .startsWith("seamwatch: warning: " + files.plan() + ":4: ")
                .contains("idle");
        assertThat(run.out()).contains("Geography idle: 4 regions");
    }

    @Test
    void shouldWarnWhereNobodyCanVerifyAChartsShare() {
        files.plan(PlanFiles.PLAN.replace("falseAlarmsPerYear: 4", "falseAlarmsPerYear: 0.05"));
        Run run = check();
        assertThat(run.code()).isZero();
        assertThat(run.errLines())
                .containsExactly("seamwatch: warning: series land/flu: each chart of moran has a share of 0.050 false"
                        + " alarms a year, under 0.1: nobody can verify such a tail; raise desk.falseAlarmsPerYear or"
                        + " watch less");
    }

    @Test
    void shouldWarnWhereCompletenessIsNotKnown() {
        files.plan(PlanFiles.PLAN + "    dayOf: event\n");
        Run run = check();
        assertThat(run.code()).isZero();
        assertThat(run.errLines()).singleElement().asString().contains("[flu]: dayOf: event", "days close before late");
    }
}
