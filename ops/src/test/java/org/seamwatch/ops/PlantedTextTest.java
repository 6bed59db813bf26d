package org.seamwatch.ops;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.seamwatch.fixtures.scenario.Outbreak;
import org.seamwatch.fixtures.scenario.Scenario;
import org.seamwatch.fixtures.scenario.ScenarioOptions;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.Change;
import org.seamwatch.schemas.record.Cluster;
import org.seamwatch.schemas.record.ClusterRegion;
import org.seamwatch.schemas.record.Evidence;
import org.seamwatch.schemas.record.Method;
import org.seamwatch.schemas.record.Period;
import org.seamwatch.schemas.record.Quality;
import org.seamwatch.schemas.record.Repeat;

class PlantedTextTest {

    private static final Scenario SCENARIO =
            Scenario.of(ScenarioOptions.defaults().withDays(60).withScale(0.2));
    private static final Outbreak PLANTED = SCENARIO.outbreaks().get(0);

    private static AlarmChange change(String condition, LocalDate day, Change change, String region) {
        ClusterRegion place = new ClusterRegion(region, region, 9, 3, 1, 1, null, null);
        Evidence evidence = new Evidence(
                "",
                new Period(day, day, "report"),
                List.of(),
                List.of(),
                List.of(new Cluster(9, 3, 1, List.of(place))),
                new Quality(9, 0, 0, 0, 0),
                new Method(List.of(), 6, 3, 99, true),
                new Repeat("", "", ""),
                "");
        return new AlarmChange(
                1,
                condition + "/" + day,
                "n/" + condition,
                "n",
                condition,
                change,
                1,
                day,
                List.of("moran"),
                null,
                evidence);
    }

    private static String text(AlarmChange... changes) {
        return String.join("\n", PlantedText.of(SCENARIO, 6, List.of(changes)));
    }

    @Test
    void shouldCallAnOutbreakFoundByAnAlarmOfItsConditionInItsTimeAndPlace() {
        LocalDate third = PLANTED.start().plusDays(2);

        assertThat(text(change(PLANTED.condition(), third, Change.RAISED, PLANTED.centre())))
                .contains("FOUND on its day 3: ")
                .contains("It alarmed on nothing else.")
                .doesNotContain("NOT FOUND");
    }

    @Test
    void shouldNotCallItFoundByAnotherPlaceTimeOrCondition() {
        String elsewhere = SCENARIO.territory().districts().stream()
                .map(d -> d.id())
                .filter(id -> !PLANTED.regions().contains(id))
                .findFirst()
                .orElseThrow();
        LocalDate early = PLANTED.start().minusDays(1);
        LocalDate late = PLANTED.end().plusDays(8);

        assertThat(text(
                        change(PLANTED.condition(), PLANTED.start(), Change.RAISED, elsewhere),
                        change(PLANTED.condition(), early, Change.RAISED, PLANTED.centre()),
                        change(PLANTED.condition(), late, Change.RAISED, PLANTED.centre()),
                        change("mumps", PLANTED.start(), Change.RAISED, PLANTED.centre())))
                .contains("NOT FOUND")
                .contains("What else it alarmed on: 4 in 60 days, where the plan accepts about 1");
    }

    @Test
    void shouldNotCallItFoundByAnAlarmThatWasWithdrawn() {
        LocalDate day = PLANTED.start();

        assertThat(text(
                        change(PLANTED.condition(), day, Change.RAISED, PLANTED.centre()),
                        change(PLANTED.condition(), day, Change.WITHDRAWN, PLANTED.centre())))
                .contains("NOT FOUND")
                .contains("also: ");
    }
}
