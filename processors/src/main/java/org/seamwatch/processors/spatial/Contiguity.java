package org.seamwatch.processors.spatial;

import java.util.ArrayDeque;
import java.util.List;
import org.locationtech.jts.geom.Geometry;

/**
 * Which regions are neighbours. Every method gives, for each region, the indices of its neighbours in ascending order;
 * the lists are symmetric, and a region without neighbours has an empty one. Only regions whose envelopes come near each
 * other are compared.
 *
 * <p>Regions are polygons or multipolygons in one plane, longitude and latitude for geographic data. Borders on the two
 * sides of the 180th meridian are not joined.
 */
public final class Contiguity {

    private Contiguity() {}

    /**
     * Neighbours share a line ("rook"): their boundaries meet in dimension one (DE-9IM {@code ****1****}), or an unbroken
     * run along the boundary of one lies in the other or within the tolerance of it. With tolerance zero that closes
     * rounding only, so clean topology is judged exactly, and regions that overlap are neighbours. With a tolerance gaps
     * up to it are closed, and a run must be longer than six tolerances, so that a corner touch is no border, not even
     * one where corners stick into each other by the tolerance: choose it well below the length of real borders.
     *
     * @param regions polygons or multipolygons
     * @param tolerance width of gaps to close, in units of the coordinates, at least 0
     */
    public static int[][] edge(List<? extends Geometry> regions, double tolerance) {
        return new Borders(regions, tolerance).edges();
    }

    /**
     * Neighbours share a point at least ("queen"), or come within the tolerance of each other.
     *
     * @param regions polygons or multipolygons
     * @param tolerance width of gaps to close, in units of the coordinates, at least 0
     */
    public static int[][] corner(List<? extends Geometry> regions, double tolerance) {
        return new Borders(regions, tolerance).corners();
    }

    /**
     * Two regions are neighbours if one is among the k nearest of the other (so a region may have more than k): by
     * great-circle distance of centroids, ties (to the millimetre) by index.
     *
     * @param regions in longitude and latitude
     * @param k at least 1
     */
    public static int[][] nearest(List<? extends Geometry> regions, int k) {
        if (k < 1) {
            throw new IllegalArgumentException("nearest must be at least 1, was " + k);
        }
        Centres centres = new Centres(regions);
        NeighbourLists lists = new NeighbourLists(centres.size());
        for (int i = 0; i < centres.size(); i++) {
            for (Centres.Near near : centres.nearest(i, k)) {
                lists.link(i, near.region());
            }
        }
        return lists.toArrays();
    }

    /**
     * Two regions are neighbours if their centroids are at most so many kilometres apart, by great-circle distance.
     *
     * @param regions in longitude and latitude
     * @param kilometres above 0
     */
    public static int[][] within(List<? extends Geometry> regions, double kilometres) {
        if (!(kilometres > 0) || Double.isInfinite(kilometres)) {
            throw new IllegalArgumentException("within must be above 0 km, was " + kilometres);
        }
        Centres centres = new Centres(regions);
        NeighbourLists lists = new NeighbourLists(centres.size());
        for (int i = 0; i < centres.size(); i++) {
            for (Centres.Near near : centres.within(i, kilometres)) {
                lists.link(i, near.region());
            }
        }
        return lists.toArrays();
    }

    /**
     * Number of connected pieces; an isolated region is one.
     *
     * @param neighbours symmetric neighbour lists
     */
    public static int pieces(int[][] neighbours) {
        boolean[] seen = new boolean[neighbours.length];
        ArrayDeque<Integer> open = new ArrayDeque<>();
        int pieces = 0;
        for (int start = 0; start < neighbours.length; start++) {
            if (seen[start]) {
                continue;
            }
            pieces++;
            seen[start] = true;
            open.add(start);
            while (!open.isEmpty()) {
                for (int j : neighbours[open.remove()]) {
                    if (!seen[j]) {
                        seen[j] = true;
                        open.add(j);
                    }
                }
            }
        }
        return pieces;
    }
}
