package org.seamwatch.processors.spatial;

import java.util.List;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.index.strtree.STRtree;

/** Compares the outlines of regions whose envelopes come near each other. */
final class Borders {

    /**
     * Rounding of coordinates, relative to the largest: a point computed to lie on a line is off by some 1e-16 of it. Far
     * below any real gap.
     */
    private static final double ROUNDING = 1e-12;

    /** The shortest border seen by closeness at rounding alone (0.02 m on the globe); see {@link #shortestRun}. */
    private static final double SHORTEST = 1e-9;

    /**
     * A corner touch at an angle t leaves a run of {@code (1 + 1 / sin t)} tolerances or less along two sides at right
     * angles and t, twice as much if one corner sticks into the other by the tolerance: 2 and 4 at right angles. Six lets
     * corners down to 20 degrees be corners.
     */
    private static final double RUN_IN_TOLERANCES = 6;

    private final List<Outline> outlines;
    private final STRtree index = new STRtree();
    private final double tolerance;
    private final double scale;

    Borders(List<? extends Geometry> regions, double tolerance) {
        if (!(tolerance >= 0) || Double.isInfinite(tolerance)) {
            throw new IllegalArgumentException("tolerance must be at least 0, was " + tolerance);
        }
        this.outlines = regions.stream().map(Outline::new).toList();
        double largest = 0;
        for (int i = 0; i < outlines.size(); i++) {
            Envelope envelope = outlines.get(i).envelope();
            index.insert(envelope, i);
            largest = Math.max(largest, largestCoordinate(envelope));
        }
        index.build();
        this.scale = largest;
        this.tolerance = tolerance + ROUNDING * largest;
    }

    private static double largestCoordinate(Envelope envelope) {
        double x = Math.max(Math.abs(envelope.getMinX()), Math.abs(envelope.getMaxX()));
        double y = Math.max(Math.abs(envelope.getMinY()), Math.abs(envelope.getMaxY()));
        return Math.max(x, y);
    }

    int[][] edges() {
        SharedRun run = new SharedRun(tolerance, shortestRun());
        return neighbours((a, b) -> a.sharesLineWith(b) || run.found(a, b) || run.found(b, a));
    }

    int[][] corners() {
        SharedRun touch = new SharedRun(tolerance, 0);
        return neighbours((a, b) -> a.meets(b) || touch.found(a, b));
    }

    /** At rounding alone a long run is asked for, so that clean corners with angles of 0.1 degrees stay corners. */
    private double shortestRun() {
        return Math.max(RUN_IN_TOLERANCES * tolerance, SHORTEST * scale);
    }

    private int[][] neighbours(Test test) {
        NeighbourLists lists = new NeighbourLists(outlines.size());
        for (int i = 0; i < outlines.size(); i++) {
            Outline region = outlines.get(i);
            Envelope near = new Envelope(region.envelope());
            near.expandBy(tolerance);
            for (Object candidate : index.query(near)) {
                int j = (Integer) candidate;
                if (j > i && test.holds(region, outlines.get(j))) {
                    lists.link(i, j);
                }
            }
        }
        return lists.toArrays();
    }

    /** What makes two regions neighbours. */
    private interface Test {
        boolean holds(Outline a, Outline b);
    }
}
