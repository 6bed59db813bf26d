package org.seamwatch.processors.spatial;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.seamwatch.processors.spatial.Shapes.box;
import static org.seamwatch.processors.spatial.Shapes.polygon;
import static org.seamwatch.processors.spatial.Shapes.wkt;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.locationtech.jts.geom.Geometry;

class ContiguityTest {

    private static final double TOLERANCE = 0.01;

    private static final int[][] APART = {{}, {}};
    private static final int[][] TOGETHER = {{1}, {0}};

    /** DE-9IM patterns for clean topology. */
    private static final String ROOK = "F***1****";

    private static final String QUEEN = "F***T****";

    @Test
    void shouldCountNeighboursOnAGrid() {
        List<Geometry> grid = Shapes.grid(30, 30);
        // 30 * 29 joins in each of two directions, and 29 * 29 on each of two diagonals, both ways.
        assertThat(Weights.binary(Contiguity.edge(grid, 0)).links()).isEqualTo(2 * 2 * 30 * 29);
        assertThat(Weights.binary(Contiguity.corner(grid, 0)).links()).isEqualTo(2 * 2 * 30 * 29 + 2 * 2 * 29 * 29);
        assertThat(Contiguity.edge(grid, TOLERANCE)).isDeepEqualTo(Contiguity.edge(grid, 0));
        assertThat(Contiguity.corner(grid, TOLERANCE)).isDeepEqualTo(Contiguity.corner(grid, 0));
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4})
    void shouldAgreeWithAllPairsOnVoronoiCells(long seed) {
        List<Geometry> cells = Shapes.voronoi(80, seed);
        assertThat(Contiguity.edge(cells, 0)).isDeepEqualTo(allPairs(cells, ROOK));
        assertThat(Contiguity.corner(cells, 0)).isDeepEqualTo(allPairs(cells, QUEEN));
    }

    /** Squares taken out at random and the rest joined in pairs give holes, islands and parts that touch in corners. */
    @ParameterizedTest
    @ValueSource(longs = {5, 6, 7})
    void shouldAgreeWithAllPairsOnMultipartRegionsOfAGrid(long seed) {
        List<Geometry> squares = Shapes.grid(12, 12);
        Collections.shuffle(squares, new Random(seed));
        List<Geometry> regions = new ArrayList<>();
        for (int k = 0; k < 100; k += 2) {
            regions.add(squares.get(k).union(squares.get(k + 1)));
        }
        assertThat(Contiguity.edge(regions, 0)).isDeepEqualTo(allPairs(regions, ROOK));
        assertThat(Contiguity.edge(regions, TOLERANCE)).isDeepEqualTo(allPairs(regions, ROOK));
        assertThat(Contiguity.corner(regions, 0)).isDeepEqualTo(allPairs(regions, QUEEN));
        assertThat(Contiguity.corner(regions, TOLERANCE)).isDeepEqualTo(allPairs(regions, QUEEN));
    }

    @Test
    void shouldCloseGapsUpToTheTolerance() {
        List<Geometry> gap = List.of(box(0, 0, 1, 1), box(1.01, 0, 2, 1));
        assertThat(Contiguity.edge(gap, 0)).isDeepEqualTo(APART);
        assertThat(Contiguity.edge(gap, 0.009)).isDeepEqualTo(APART);
        assertThat(Contiguity.edge(gap, 0.01)).isDeepEqualTo(TOGETHER);
        assertThat(Contiguity.corner(gap, 0)).isDeepEqualTo(APART);
        assertThat(Contiguity.corner(gap, 0.01)).isDeepEqualTo(TOGETHER);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 0.001, 0.01})
    void shouldTakeOverlappingRegionsForNeighbours(double tolerance) {
        List<Geometry> overlap = List.of(box(0, 0, 1, 1), box(0.99, 0.2, 2, 0.8));
        assertThat(Contiguity.edge(overlap, tolerance)).isDeepEqualTo(TOGETHER);
        assertThat(Contiguity.corner(overlap, tolerance)).isDeepEqualTo(TOGETHER);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 0.001, 0.01})
    void shouldTakeARegionDrawnOnTopOfAnotherForItsNeighbour(double tolerance) {
        List<Geometry> nested = List.of(box(0, 0, 3, 3), box(1, 1, 2, 2));
        assertThat(Contiguity.edge(nested, tolerance)).isDeepEqualTo(TOGETHER);
        assertThat(Contiguity.corner(nested, tolerance)).isDeepEqualTo(TOGETHER);
    }

    @Test
    void shouldFindAnEnclaveInAHoleThatIsATouchTooWide() {
        Geometry ring = wkt("POLYGON ((0 0, 3 0, 3 3, 0 3, 0 0), (0.995 0.995, 0.995 2.005, 2.005 2.005, 2.005 0.995,"
                + " 0.995 0.995))");
        List<Geometry> enclave = List.of(ring, box(1, 1, 2, 2));
        assertThat(Contiguity.edge(enclave, 0)).isDeepEqualTo(APART);
        assertThat(Contiguity.edge(enclave, TOLERANCE)).isDeepEqualTo(TOGETHER);
    }

    @Test
    void shouldLeaveAnIslandWithoutNeighbours() {
        List<Geometry> island = List.of(box(0, 0, 1, 1), box(1, 0, 2, 1), box(5, 5, 6, 6));
        int[][] expected = {{1}, {0}, {}};
        assertThat(Contiguity.edge(island, TOLERANCE)).isDeepEqualTo(expected);
        assertThat(Contiguity.corner(island, TOLERANCE)).isDeepEqualTo(expected);
        assertThat(Contiguity.pieces(expected)).isEqualTo(2);
    }

    @Test
    void shouldJoinRegionsThroughAnyOfTheirParts() {
        Geometry parts = wkt("MULTIPOLYGON (((0 0, 1 0, 1 1, 0 1, 0 0)), ((5 5, 6 5, 6 6, 5 6, 5 5)))");
        List<Geometry> regions = List.of(parts, box(1, 0, 2, 1), box(6.005, 5, 7, 6));
        assertThat(Contiguity.edge(regions, 0)).isDeepEqualTo(new int[][] {{1}, {0}, {}});
        assertThat(Contiguity.edge(regions, TOLERANCE)).isDeepEqualTo(new int[][] {{1, 2}, {0}, {0}});
    }

    @Test
    void shouldNotTakeACornerForABorderWhateverTheTolerance() {
        List<Geometry> clean = List.of(box(0, 0, 1, 1), box(1, 1, 2, 2));
        List<Geometry> apart = List.of(box(0, 0, 1, 1), box(1.005, 1.005, 2, 2));
        List<Geometry> intruding = List.of(box(0, 0, 1, 1), box(0.99, 0.99, 2, 2));
        for (List<Geometry> corner : List.of(clean, apart, intruding)) {
            assertThat(Contiguity.edge(corner, TOLERANCE)).isDeepEqualTo(APART);
            assertThat(Contiguity.corner(corner, TOLERANCE)).isDeepEqualTo(TOGETHER);
        }
        assertThat(Contiguity.edge(clean, 0)).isDeepEqualTo(APART);
        assertThat(Contiguity.edge(clean, 0.1)).isDeepEqualTo(APART);
        assertThat(Contiguity.corner(apart, 0)).isDeepEqualTo(APART);
    }

    /** The corner's sides part from the other region's at this angle. */
    @ParameterizedTest
    @ValueSource(doubles = {21, 30, 45, 60})
    void shouldNotTakeAnObliqueCornerForABorder(double degrees) {
        double slope = Math.tan(Math.toRadians(degrees));
        List<Geometry> corner = List.of(box(-3, -1, 3, 0), polygon(0, 0, 3, 3 * slope, -3, 3));
        assertThat(Contiguity.edge(corner, 0)).isDeepEqualTo(APART);
        assertThat(Contiguity.edge(corner, TOLERANCE)).isDeepEqualTo(APART);
        assertThat(Contiguity.corner(corner, 0)).isDeepEqualTo(TOGETHER);
    }

    @Test
    void shouldJudgeCleanNarrowCornersExactlyWithoutTolerance() {
        List<Geometry> corner = List.of(box(-3, -1, 3, 0), polygon(0, 0, 3, 0.01, 3, 3));
        assertThat(Contiguity.edge(corner, 0)).isDeepEqualTo(APART);
        assertThat(Contiguity.corner(corner, 0)).isDeepEqualTo(TOGETHER);
    }

    @Test
    void shouldNotAddUpSeparateTouches() {
        // Teeth whose tips come within the tolerance of a straight side, 15 times over.
        double[] xy = new double[2 * 33];
        for (int k = 0; k < 31; k++) {
            xy[2 * k] = k;
            xy[2 * k + 1] = k % 2 == 0 ? 1 : 0.001;
        }
        xy[62] = 30;
        xy[63] = 2;
        xy[64] = 0;
        xy[65] = 2;
        List<Geometry> comb = List.of(box(0, -1, 30, 0), polygon(xy));
        assertThat(Contiguity.edge(comb, TOLERANCE)).isDeepEqualTo(APART);
        assertThat(Contiguity.corner(comb, TOLERANCE)).isDeepEqualTo(TOGETHER);
    }

    @Test
    void shouldFollowABorderAcrossTheStartOfARing() {
        // The shared side is 0.08 long, more than six tolerances, but less on either side of where both rings start.
        Geometry large = polygon(1, 0.5, 1, 1, 0, 1, 0, 0, 1, 0);
        Geometry small = polygon(1.005, 0.5, 1.005, 0.46, 1.2, 0.46, 1.2, 0.54, 1.005, 0.54);
        List<Geometry> regions = List.of(large, small);
        assertThat(Contiguity.edge(regions, TOLERANCE)).isDeepEqualTo(TOGETHER);
    }

    @Test
    void shouldKeepCleanBordersThatAreShorterThanTheTolerance() {
        List<Geometry> regions = List.of(box(0, 0, 1, 1), box(1, 0.999, 2, 2));
        assertThat(Contiguity.edge(regions, 0)).isDeepEqualTo(TOGETHER);
        assertThat(Contiguity.edge(regions, TOLERANCE)).isDeepEqualTo(TOGETHER);
    }

    /** A vertex on an oblique line is off it by rounding, to either side: JTS sees a gap, an overlap or a touch. */
    @Test
    void shouldSeeThroughRoundingAtObliqueTJunctions() {
        Random random = new Random(20);
        for (int run = 0; run < 200; run++) {
            double x = 100 * random.nextDouble();
            double y = 50 * random.nextDouble();
            double dx = 0.3 + random.nextDouble();
            double dy = random.nextDouble();
            double t = 0.2 + 0.6 * random.nextDouble();
            double mx = x + t * dx;
            double my = y + t * dy;
            Geometry side = polygon(x, y, x + dx, y + dy, x + dx, y - 1);
            Geometry first = polygon(x, y, mx, my, x, y + 3);
            Geometry second = polygon(mx, my, x + dx, y + dy, x, y + 3);
            int[][] expected = {{1, 2}, {0, 2}, {0, 1}};
            assertThat(Contiguity.edge(List.of(side, first, second), 0)).isDeepEqualTo(expected);
            assertThat(Contiguity.corner(List.of(side, first, second), 0)).isDeepEqualTo(expected);
        }
    }

    @Test
    void shouldNotDependOnTheOrderOfRegions() {
        List<Geometry> cells = Shapes.voronoi(60, 9);
        int n = cells.size();
        List<Geometry> reversed = new ArrayList<>(cells);
        Collections.reverse(reversed);
        int[][] forward = Contiguity.edge(cells, TOLERANCE);
        int[][] backward = Contiguity.edge(reversed, TOLERANCE);
        for (int i = 0; i < n; i++) {
            int[] mirrored = Arrays.stream(backward[n - 1 - i])
                    .map(j -> n - 1 - j)
                    .sorted()
                    .toArray();
            assertThat(forward[i]).isEqualTo(mirrored);
        }
    }

    @Test
    void shouldCountPieces() {
        assertThat(Contiguity.pieces(new int[][] {})).isZero();
        assertThat(Contiguity.pieces(new int[][] {{2}, {3}, {0, 4}, {1}, {2}, {}}))
                .isEqualTo(3);
        assertThat(Contiguity.pieces(Contiguity.edge(Shapes.grid(7, 5), 0))).isEqualTo(1);
    }

    @Test
    void shouldTakeNoRegionsForNoNeighbours() {
        assertThat(Contiguity.edge(List.of(), 0)).isEmpty();
        assertThat(Contiguity.corner(List.of(), TOLERANCE)).isEmpty();
    }

    @Test
    void shouldSayWhatIsWrong() {
        List<Geometry> squares = Shapes.grid(2, 2);
        assertThatThrownBy(() -> Contiguity.edge(squares, -0.5))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("tolerance must be at least 0, was -0.5");
        assertThatThrownBy(() -> Contiguity.corner(squares, Double.NaN))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("tolerance must be at least 0, was NaN");
        assertThatThrownBy(() -> Contiguity.edge(List.of(wkt("POINT (1 2)")), 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("a region must be a Polygon or MultiPolygon, was Point");
    }

    private static int[][] allPairs(List<Geometry> regions, String pattern) {
        int[][] lists = new int[regions.size()][];
        for (int i = 0; i < lists.length; i++) {
            Geometry region = regions.get(i);
            int self = i;
            lists[i] = IntStream.range(0, lists.length)
                    .filter(j -> j != self && region.relate(regions.get(j), pattern))
                    .toArray();
        }
        return lists;
    }
}
