package org.seamwatch.ops;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.AlarmResponse;
import org.seamwatch.schemas.record.Change;
import org.seamwatch.schemas.record.Cluster;
import org.seamwatch.schemas.record.ClusterRegion;
import org.seamwatch.schemas.record.Evidence;
import org.seamwatch.schemas.record.EvidenceChart;
import org.seamwatch.schemas.record.Grade;
import org.seamwatch.schemas.record.Limits;
import org.seamwatch.schemas.record.Method;
import org.seamwatch.schemas.record.Period;
import org.seamwatch.schemas.record.Quality;
import org.seamwatch.schemas.record.Repeat;
import org.seamwatch.schemas.record.Verdict;

class AlarmTextTest {

    private static final LocalDate DAY = LocalDate.of(2024, 6, 16);
    private static final String CAUTION = "A statistical signal is not a confirmed outbreak.";

    private static AlarmChange alarm(Change change, @Nullable AlarmResponse response) {
        List<ClusterRegion> regions = List.of(
                new ClusterRegion("NM-014", "Alder", 40, 6.5, 31, 6, 80.2, 2023),
                new ClusterRegion("NM-015", "Birch", 31, 6, 40, 6.5, null, null));
        Evidence evidence = new Evidence(
                "Influenza, Northmarch: 71 cases.",
                new Period(DAY.minusDays(6), DAY, "report"),
                List.of(new EvidenceChart(
                        "moran",
                        "ewma",
                        1.02,
                        new Limits(null, 0.62),
                        new Limits(null, 0.93),
                        Grade.ACTION,
                        DAY.minusDays(4))),
                List.of(),
                List.of(new Cluster(1071, 12.5, 5, regions)),
                new Quality(1412, 30, -2, 0, 3),
                new Method(List.of("Moran's I"), 6, 3, 57, true),
                new Repeat("0.1.0", "ab", "2024a"),
                CAUTION);
        return new AlarmChange(
                1,
                "northmarch/influenza/2024-06-16",
                "northmarch/influenza",
                "northmarch",
                "influenza",
                change,
                2,
                DAY,
                List.of("moran"),
                response,
                evidence);
    }

    @Test
    void shouldSayAllThatADecisionNeeds() {
        assertThat(AlarmText.of(alarm(Change.RAISED, null)).lines())
                .containsExactly(
                        "ALARM raised  northmarch/influenza/2024-06-16  #2, day 2024-06-16",
                        "  what      Influenza, Northmarch: 71 cases.",
                        "  where     1,071 cases, 12.5 expected: Alder (NM-014) 40, 6.5 expected, 80.2 per 100,000; Birch"
                                + " (NM-015) 31, 6.0 expected; and 3 more",
                        "            in 2024-06-10 to 2024-06-16 by report date; expected: by usual share of all cases of"
                                + " these days; named because they are high",
                        "  since     the ewma chart of moran has been above its centre since 2024-06-12",
                        "  how sure  the ewma chart of moran stands at 1.02, its action limit is 0.930",
                        "            limits are set so that this series alarms for nothing about 3 times a year (the desk:"
                                + " 6)",
                        "            learning is young: only 57 days have taught",
                        "  data      1,412 cases, 30 of them preliminary, -2 net after their day had closed; first view;"
                                + " regions not judged: 3",
                        "  next      look at the reports of these places, ask their sources whether anything changed in"
                                + " testing or reporting, then answer the alarm",
                        "            answers go to alarm-responses, key northmarch/influenza, with a verdict: acknowledged,"
                                + " under-investigation, outbreak, known-event, no-outbreak, data-fault,"
                                + " baseline-changed",
                        "  caution   " + CAUTION);
    }

    @ParameterizedTest
    @EnumSource(Change.class)
    void shouldCarryTheCautionAndANextStepWhateverHappened(Change change) {
        assertThat(AlarmText.of(alarm(change, null))).contains("  next      ", "  caution   " + CAUTION);
    }

    @Test
    void shouldNeverSayThatAnAlarmIsOver() {
        String text = AlarmText.of(alarm(Change.ENDED, null));
        assertThat(text)
                .startsWith("ALARM back inside its limits  ")
                .contains("does not say that it is over")
                .doesNotContain("ended", "where");
    }

    @Test
    void shouldShowTheLastAnswerWithoutItsNote() {
        AlarmResponse response = new AlarmResponse(
                1,
                "northmarch/influenza/2024-06-16",
                Verdict.UNDER_INVESTIGATION,
                null,
                null,
                "desk-2",
                Instant.parse("2024-06-17T08:00:00Z"),
                "a patient's name");
        assertThat(AlarmText.of(alarm(Change.RESPONDED, response)))
                .contains("  answer    under-investigation by desk-2 at 2024-06-17T08:00:00Z")
                .doesNotContain("patient");
    }
}
