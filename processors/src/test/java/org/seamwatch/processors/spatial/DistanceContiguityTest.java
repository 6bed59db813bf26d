package org.seamwatch.processors.spatial;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;

class DistanceContiguityTest {

    /** Absolute, in radians: half a unit of the last digit printed. */
    private static final double PRINTED = 5e-7;

    /** Absolute, in kilometres: rounding. */
    private static final double ROUNDING_KM = 1e-6;

    /** Los Angeles to New York in E. Williams, Aviation Formulary: 0.623585 radians (value from memory). */
    @Test
    void shouldEqualPublishedDistance() {
        Coordinate losAngeles = new Coordinate(-(118 + 24 / 60.0), 33 + 57 / 60.0);
        Coordinate newYork = new Coordinate(-(73 + 47 / 60.0), 40 + 38 / 60.0);
        assertThat(GreatCircle.kilometres(losAngeles, newYork) / GreatCircle.EARTH_RADIUS_KM)
                .isCloseTo(0.623585, within(PRINTED));
    }

    @Test
    void shouldMeasurePartsOfGreatCircles() {
        double radius = GreatCircle.EARTH_RADIUS_KM;
        assertThat(GreatCircle.kilometres(new Coordinate(10, 0), new Coordinate(11, 0)))
                .isCloseTo(radius * Math.PI / 180, within(ROUNDING_KM));
        assertThat(GreatCircle.kilometres(new Coordinate(33, 0), new Coordinate(77, 90)))
                .isCloseTo(radius * Math.PI / 2, within(ROUNDING_KM));
        assertThat(GreatCircle.kilometres(new Coordinate(-60, 30), new Coordinate(120, -30)))
                .isCloseTo(radius * Math.PI, within(ROUNDING_KM));
        assertThat(GreatCircle.kilometres(new Coordinate(179.5, 0), new Coordinate(-179.5, 0)))
                .isCloseTo(radius * Math.PI / 180, within(ROUNDING_KM));
    }

    /** West, south, east, north: a country, the 180th meridian, a pole, the whole globe. */
    @ParameterizedTest
    @CsvSource({"6,47,15,55", "-180,-30,180,-10", "-180,70,180,89", "-180,-89,180,89"})
    void shouldAgreeWithAllPairs(double west, double south, double east, double north) {
        List<Geometry> regions = scattered(120, west, south, east, north);
        for (int k : new int[] {1, 5, 119, 500}) {
            assertThat(Contiguity.nearest(regions, k)).isDeepEqualTo(nearestOfAll(regions, k));
        }
        for (double kilometres : new double[] {1, 90, 900, 9_000, 30_000}) {
            assertThat(Contiguity.within(regions, kilometres)).isDeepEqualTo(withinOfAll(regions, kilometres));
        }
    }

    @Test
    void shouldBreakTiesByIndexAndMakeListsSymmetric() {
        // On the equator, one degree apart: the middle region is as near to the second as to the fourth.
        List<Geometry> row = new ArrayList<>();
        for (int x = 0; x < 5; x++) {
            row.add(Shapes.box(x - 0.1, -0.1, x + 0.1, 0.1));
        }
        assertThat(Contiguity.nearest(row, 1)).isDeepEqualTo(new int[][] {{1}, {0, 2}, {1, 3}, {2, 4}, {3}});
    }

    @Test
    void shouldTakeDistancesThatDifferByRoundingForTies() {
        List<Geometry> row = new ArrayList<>();
        for (int x = 0; x < 60; x++) {
            row.add(Shapes.box(7 + 0.1 * x - 0.01, 50, 7 + 0.1 * x + 0.01, 50.1));
        }
        Centres centres = new Centres(row);
        for (int i = 1; i < row.size(); i++) {
            assertThat(centres.nearest(i, 1).get(0).region()).isEqualTo(i - 1);
        }
    }

    @Test
    void shouldIncludeTheDistanceItself() {
        List<Geometry> pair = List.of(Shapes.box(-0.5, -0.5, 0.5, 0.5), Shapes.box(0.5, -0.5, 1.5, 0.5));
        double apart = GreatCircle.kilometres(new Coordinate(0, 0), new Coordinate(1, 0));
        assertThat(Contiguity.within(pair, apart + ROUNDING_KM)).isDeepEqualTo(new int[][] {{1}, {0}});
        assertThat(Contiguity.within(pair, apart - ROUNDING_KM)).isDeepEqualTo(new int[][] {{}, {}});
    }

    @Test
    void shouldTakeNoRegionsAndOneRegion() {
        assertThat(Contiguity.nearest(List.of(), 3)).isEmpty();
        assertThat(Contiguity.nearest(Shapes.grid(1, 1), 3)).isDeepEqualTo(new int[][] {{}});
        assertThat(Contiguity.within(Shapes.grid(1, 1), 3)).isDeepEqualTo(new int[][] {{}});
    }

    @Test
    void shouldSayWhatIsWrong() {
        List<Geometry> squares = Shapes.grid(2, 2);
        assertThatThrownBy(() -> Contiguity.nearest(squares, 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("nearest must be at least 1, was 0");
        assertThatThrownBy(() -> Contiguity.within(squares, Double.NaN))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("within must be above 0 km, was NaN");
        assertThatThrownBy(() -> Contiguity.within(List.of(Shapes.box(499, 99, 501, 101)), 40))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("centre of region 0 must be a longitude in [-180, 180] and a latitude in [-90, 90],"
                        + " was 500.0, 100.0");
    }

    private static List<Geometry> scattered(int count, double west, double south, double east, double north) {
        Random random = new Random(11);
        List<Geometry> regions = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            double x = west + (east - west) * random.nextDouble();
            double y = south + (north - south) * random.nextDouble();
            regions.add(Shapes.box(x - 1e-4, y - 1e-4, x + 1e-4, y + 1e-4));
        }
        return regions;
    }

    private static double[][] distances(List<Geometry> regions) {
        int n = regions.size();
        double[][] distances = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                distances[i][j] = GreatCircle.kilometres(
                        regions.get(i).getCentroid().getCoordinate(),
                        regions.get(j).getCentroid().getCoordinate());
            }
        }
        return distances;
    }

    private static int[][] nearestOfAll(List<Geometry> regions, int k) {
        double[][] distances = distances(regions);
        int n = regions.size();
        boolean[][] linked = new boolean[n][n];
        for (int i = 0; i < n; i++) {
            int from = i;
            IntStream.range(0, n)
                    .filter(j -> j != from)
                    .boxed()
                    .sorted(Comparator.comparingDouble(j -> distances[from][j]))
                    .limit(k)
                    .forEach(j -> {
                        linked[from][j] = true;
                        linked[j][from] = true;
                    });
        }
        return lists(linked);
    }

    private static int[][] withinOfAll(List<Geometry> regions, double kilometres) {
        double[][] distances = distances(regions);
        boolean[][] linked = new boolean[distances.length][distances.length];
        for (int i = 0; i < linked.length; i++) {
            for (int j = 0; j < linked.length; j++) {
                linked[i][j] = i != j && distances[i][j] <= kilometres;
            }
        }
        return lists(linked);
    }

    private static int[][] lists(boolean[][] linked) {
        int[][] lists = new int[linked.length][];
        for (int i = 0; i < lists.length; i++) {
            boolean[] row = linked[i];
            lists[i] = IntStream.range(0, row.length).filter(j -> row[j]).toArray();
        }
        return lists;
    }
}
