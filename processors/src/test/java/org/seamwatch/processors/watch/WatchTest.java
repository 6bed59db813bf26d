package org.seamwatch.processors.watch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.seamwatch.processors.spatial.Weights;
import org.seamwatch.schemas.geography.Geography;
import org.seamwatch.schemas.plan.DayOf;
import org.seamwatch.schemas.plan.HolidayPlan;
import org.seamwatch.schemas.plan.SeriesPlan;
import org.seamwatch.schemas.plan.StatisticName;
import org.seamwatch.schemas.record.Position;

class WatchTest {

    private static SeriesSpec first(Watch watch) {
        return watch.series().values().iterator().next();
    }

    @Test
    void shouldRouteAReportToEverySeriesThatCountsIt() {
        Watch watch = TestDesk.small().conditions("influenza", "norovirus").watch();

        assertThat(watch.series().keySet()).containsExactly("gridland/influenza", "gridland/norovirus");
        assertThat(watch.route("norovirus", "R0304")).extracting(SeriesSpec::id).containsExactly("gridland/norovirus");
        assertThat(watch.route("mumps", "R0304")).isEmpty();
        assertThat(watch.route("norovirus", "R0909")).isEmpty();
        assertThat(List.of(watch.knowsCondition("mumps"), watch.knowsRegion("R0909")))
                .containsOnly(false);
        assertThat(watch.regionAt(new Position(4.5, 0.5))).isEqualTo("R0400");
        assertThat(watch.regionAt(new Position(5.5, 0.5))).isNull();
    }

    @Test
    void shouldSplitTheBudgetOverSeries() {
        TestDesk desk = TestDesk.small();
        List<Geography> geographies = List.of(desk.geography());
        SeriesPlan two = desk.conditions("influenza", "norovirus").seriesPlan();
        Watch watch = Watch.of(TestDesk.plan(geographies, 9, two), geographies);

        for (SeriesSpec spec : watch.series().values()) {
            assertThat(spec.budget()).isEqualTo(new Budget(9, 4.5));
            assertThat(spec.budget().chart(two, StatisticName.MORAN)).isEqualTo(4.5);
        }
    }

    @Test
    void shouldJoinTheSquaresOfAGridByTheirEdges() {
        Weights weights = first(TestDesk.small().watch()).ground().weights();

        assertThat(weights.size()).isEqualTo(25);
        assertThat(weights.s0()).isEqualTo(80);
        assertThat(weights.isolatedCount()).isZero();
    }

    @Test
    void shouldHaveNoPopulationsUnlessEveryRegionHasOne() {
        assertThat(first(TestDesk.small().unpopulated().watch()).ground().populations())
                .isNull();
        assertThat(first(TestDesk.small().watch()).ground().populations())
                .hasSize(25)
                .startsWith(10_000, 10_100);
    }

    @Test
    void shouldHashAllThatResultsDependOn() {
        TestDesk desk = TestDesk.small();
        assertThat(TestDesk.small().watch().hash())
                .isEqualTo(desk.watch().hash())
                .hasSize(64);
        List<TestDesk> others = List.of(
                desk.zone("Europe/Berlin"),
                desk.from("2024-01-01"),
                desk.dayOf(DayOf.REPORT),
                desk.days(2, 28, 1),
                desk.days(1, 27, 1),
                desk.days(1, 28, 2),
                desk.measure("rate", 9),
                desk.measure("count", 99),
                desk.limits(2, 5, 6),
                desk.limits(1, 6, 6),
                desk.limits(1, 5, 7),
                desk.conditions("influenza", "norovirus"),
                desk.holidays(new HolidayPlan(java.time.LocalDate.of(2024, 1, 6), "R0*")));
        assertThat(others.stream().map(d -> d.watch().hash()).toList())
                .doesNotHaveDuplicates()
                .doesNotContain(desk.watch().hash());
    }

    @Test
    void shouldLearnAfreshOnlyWhereWhatIsLearnedFromHasChanged() {
        TestDesk desk = TestDesk.small();
        String hash = first(desk.watch()).hash();
        List<TestDesk> learningAfresh = List.of(
                desk.zone("Europe/Berlin"),
                desk.dayOf(DayOf.REPORT),
                desk.measure("rate", 99),
                desk.holidays(new HolidayPlan(java.time.LocalDate.of(2024, 1, 6), "R0*")));
        List<TestDesk> learningOn =
                List.of(desk.conditions("influenza", "norovirus"), desk.measure("count", 9), desk.days(1, 27, 1));

        assertThat(learningAfresh.stream().map(d -> first(d.watch()).hash()).toList())
                .doesNotHaveDuplicates()
                .doesNotContain(hash);
        assertThat(learningOn.stream().map(d -> first(d.watch()).hash()).toList())
                .containsOnly(hash);
    }

    @Test
    void shouldKeepDaysAsLongAsAnyLateReportMayReadThem() {
        assertThat(first(TestDesk.small().watch()).keepDays()).isEqualTo(28 + 69 + 1 + 7);
        assertThat(first(TestDesk.small().days(1, 365, 7).watch()).keepDays()).isEqualTo(365 + 69 + 7 + 7);
    }

    @Test
    void shouldRefuseASeriesWithoutItsGeography() {
        TestDesk desk = TestDesk.small();
        List<Geography> none = List.of();
        assertThatThrownBy(() -> Watch.of(TestDesk.plan(none, 6, desk.seriesPlan()), none))
                .hasMessage("geography of a series must be one of those given, was gridland");
    }

    @Test
    void shouldSetLimitsFromTheBudget() {
        double few = limit(TestDesk.small().limits(1, 5, 1));
        double many = limit(TestDesk.small().limits(1, 5, 10));

        assertThat(few).isGreaterThan(many).isPositive();
    }

    private static double limit(TestDesk desk) {
        Double upper = first(desk.watch())
                .statistics()
                .get(0)
                .board()
                .charts()
                .get(0)
                .action()
                .upper();
        return upper == null ? Double.NaN : upper;
    }
}
