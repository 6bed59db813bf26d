package org.seamwatch.processors.statistics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.LocalDate;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seamwatch.processors.watch.SeriesSpec;
import org.seamwatch.processors.watch.TestDesk;
import org.seamwatch.schemas.plan.HolidayPlan;
import org.seamwatch.schemas.record.SeriesDay;
import org.seamwatch.schemas.record.StatisticStatus;

class MoranStatisticTest {

    private static final LocalDate DAY = LocalDate.of(2024, 3, 1);

    private static SeriesSpec spec(TestDesk desk) {
        return desk.watch().series().values().iterator().next();
    }

    private static Reading read(TestDesk desk, double[] cases, double[] history, int historyDays) {
        SeriesSpec spec = spec(desk);
        return statistic(spec).read(new DayInput(DAY, cases, history, historyDays, spec.unjudged(DAY)));
    }

    private static Statistic statistic(SeriesSpec spec) {
        return spec.statistics().get(0);
    }

    private static double[] filled(double each) {
        double[] values = new double[25];
        Arrays.fill(values, each);
        return values;
    }

    /** Cases in the west column only. */
    private static double[] west(double each) {
        double[] cases = new double[25];
        Arrays.fill(cases, 0, 5, each);
        return cases;
    }

    /**
     * Five by five squares, edge contiguity (40 links), the west column 1, the rest 0. By hand: mean 0.2, sum z^2 = 4; of
     * the 40 links 4 join two ones (0.8^2 each), 5 a one and a zero (0.8 * -0.2), 31 two zeros (0.2^2): I = 25/40 *
     * (2.56 - 0.8 + 1.24) / 4 = 0.46875.
     */
    @Test
    void shouldReadMoransIOfTheCounts() {
        Reading reading = read(TestDesk.small(), west(1), filled(0), 56);

        assertThat(reading.status()).isEqualTo(StatisticStatus.USABLE);
        assertThat(reading.value()).isEqualTo(0.46875, org.assertj.core.data.Offset.offset(1e-12));
    }

    @ParameterizedTest
    @ValueSource(strings = {"count", "rate", "eb-rate", "share-residual"})
    void shouldBeFlatWithoutAnyCase(String measure) {
        TestDesk desk = TestDesk.small().measure(measure, 9).limits(0, 5, 6);

        Reading reading = read(desk, filled(0), filled(0), 56);
        assertThat(reading.status()).isEqualTo(StatisticStatus.FLAT);
        assertThatThrownBy(reading::value).hasMessage("Moran's I must be usable, was FLAT");
    }

    @Test
    void shouldBeFlatWhereAllRegionsAreAlike() {
        assertThat(read(TestDesk.small(), filled(3), filled(0), 56).status()).isEqualTo(StatisticStatus.FLAT);
    }

    @Test
    void shouldBeFlatWhereNobodyHasNeighbours() {
        Reading reading = read(TestDesk.small().side(1), new double[] {40}, new double[] {9}, 56);
        assertThat(reading.status()).isEqualTo(StatisticStatus.FLAT);
    }

    @Test
    void shouldBeThinBelowSoManyCases() {
        TestDesk desk = TestDesk.small().limits(20, 5, 6);
        double[] nineteen = west(4);
        nineteen[0] = 3;

        assertThat(read(desk, nineteen, filled(0), 56).status()).isEqualTo(StatisticStatus.THIN);
        assertThat(read(desk, west(4), filled(0), 56).status()).isEqualTo(StatisticStatus.USABLE);
    }

    @Test
    void shouldBeThinWhileSharesHaveTooShortAHistory() {
        TestDesk desk = TestDesk.small().measure("share-residual", 0);

        assertThat(read(desk, west(9), filled(1), 13).status()).isEqualTo(StatisticStatus.THIN);
        assertThat(read(desk, west(9), filled(1), 14).status()).isEqualTo(StatisticStatus.USABLE);
    }

    /** The west column holds a fifth of the regions and under a fifth of the people, two columns two fifths. */
    @Test
    void shouldBeIncompleteWhenAHolidayHoldsOverAThirdOfThePeople() {
        HolidayPlan west = new HolidayPlan(DAY.minusDays(2), "R00*");
        HolidayPlan both = new HolidayPlan(DAY, "R03*, R04*");
        double[] cases = west(9);
        cases[7] = 4;

        assertThat(read(TestDesk.small().holidays(west), cases, filled(0), 56).status())
                .isEqualTo(StatisticStatus.USABLE);
        assertThat(read(TestDesk.small().holidays(both), cases, filled(0), 56).status())
                .isEqualTo(StatisticStatus.INCOMPLETE);
    }

    @Test
    void shouldLeaveCasesOfUnjudgedRegionsOutOfTheThinRuleToo() {
        TestDesk desk = TestDesk.small().limits(20, 5, 6);
        double[] cases = west(9);
        cases[7] = 4;

        assertThat(read(desk, cases, filled(0), 56).status()).isEqualTo(StatisticStatus.USABLE);
        assertThat(read(desk.holidays(new HolidayPlan(DAY, "R00*")), cases, filled(0), 56)
                        .status())
                .isEqualTo(StatisticStatus.THIN);
    }

    @Test
    void shouldNotJudgeAHolidayAndTheTwoDaysAfter() {
        SeriesSpec spec = spec(TestDesk.small().holidays(new HolidayPlan(DAY, "R0000,R01*")));
        List<Integer> unjudged = List.of(-1, 0, 1, 2, 3).stream()
                .map(n -> {
                    int count = 0;
                    for (boolean flag : spec.unjudged(DAY.plusDays(n))) {
                        count += flag ? 1 : 0;
                    }
                    return count;
                })
                .toList();

        assertThat(unjudged).containsExactly(0, 6, 6, 6, 0);
    }

    @Test
    void shouldReadTheWindowAndTheDaysOfShares() {
        Statistic statistic = statistic(spec(TestDesk.small().days(1, 28, 3)));
        List<Integer> read = java.util.stream.IntStream.rangeClosed(-2, 100)
                .filter(before -> statistic.reads(DAY, DAY.minusDays(before)))
                .boxed()
                .toList();

        assertThat(read).startsWith(0, 1, 2, 14, 15).endsWith(68, 69).hasSize(3 + 56);
    }

    @Test
    void shouldRecallFromADayWhatItRead() {
        Random random = new Random(3);
        for (String measure : List.of("count", "rate", "eb-rate", "share-residual")) {
            Statistic statistic = statistic(spec(TestDesk.small().measure(measure, 19)));
            for (int n = 0; n < 50; n++) {
                double[] cases = random.doubles(25, 0, 4).map(Math::floor).toArray();
                DayInput input = new DayInput(DAY.plusDays(n), cases, filled(2), 56, new boolean[25]);
                Reading reading = statistic.read(input);
                SeriesDay day = statistic.on(blank(DAY.plusDays(n)), reading, null);
                Reading recalled = statistic.recall(day);
                assertThat(recalled).isNotNull();
                assertThat(recalled.status()).isEqualTo(reading.status());
                assertThat(recalled.value()).isEqualTo(reading.value());
                assertThat(statistic.on(blank(DAY.plusDays(n)), recalled, null)).isEqualTo(day);
            }
        }
    }

    private static SeriesDay blank(LocalDate day) {
        return new SeriesDay(1, "gridland/influenza", day, 0, java.time.Instant.EPOCH, 9, 25, 0, List.of(), null);
    }

    @Test
    void shouldRecallNothingFromADayWithoutIt() {
        assertThat(statistic(spec(TestDesk.small())).recall(blank(DAY))).isNull();
        assertThat(statistic(spec(TestDesk.small())).said(blank(DAY))).isNull();
    }

    @Test
    void shouldSayWhatItIsInWords() {
        assertThat(statistic(spec(TestDesk.small())).words())
                .isEqualTo(
                        "Moran's I of count over 1 day, edge contiguity, binary weights, against the series' own past");
    }

    @Test
    void shouldSeedByTheSeriesAndTheDay() {
        long seed = Seeds.of("gridland/influenza", DAY);
        assertThat(seed).isEqualTo(Seeds.of("gridland/influenza", DAY));
        assertThat(seed)
                .isNotEqualTo(Seeds.of("gridland/influenza", DAY.plusDays(1)))
                .isNotEqualTo(Seeds.of("gridland/norovirus", DAY));
    }
}
