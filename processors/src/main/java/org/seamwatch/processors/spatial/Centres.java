package org.seamwatch.processors.spatial;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.index.strtree.STRtree;

/** The centroids of regions, indexed for questions of distance on the globe. */
final class Centres {

    private static final double HALF_CIRCUMFERENCE_KM = Math.PI * GreatCircle.EARTH_RADIUS_KM;

    /** Boxes are drawn a little larger than they must be, against rounding at their rims. */
    private static final double MARGIN = 1 + 1e-9;

    private final Coordinate[] points;
    private final STRtree index = new STRtree();
    private final double spread;

    Centres(List<? extends Geometry> regions) {
        points = new Coordinate[regions.size()];
        for (int i = 0; i < points.length; i++) {
            points[i] = regions.get(i).getCentroid().getCoordinate();
            check(i, points[i]);
            index.insert(new Envelope(points[i]), i);
        }
        index.build();
        spread = spread(points);
    }

    private static void check(int i, Coordinate point) {
        if (!(Math.abs(point.x) <= 180 && Math.abs(point.y) <= 90)) {
            throw new IllegalArgumentException(
                    "centre of region " + i + " must be a longitude in [-180, 180] and a latitude in [-90, 90], was "
                            + point.x + ", " + point.y);
        }
    }

    int size() {
        return points.length;
    }

    /** The other regions whose centres are at most so far from that of region {@code i}. */
    List<Near> within(int i, double kilometres) {
        List<Near> result = new ArrayList<>();
        for (Envelope box : boxes(points[i], kilometres)) {
            for (Object found : index.query(box)) {
                int j = (Integer) found;
                double distance = GreatCircle.kilometres(points[i], points[j]);
                if (j != i && distance <= kilometres) {
                    result.add(new Near(j, distance));
                }
            }
        }
        return result;
    }

    /** The {@code k} nearest others (all, if there are fewer), nearest first, ties by index. */
    List<Near> nearest(int i, int k) {
        double radius = firstRadius(k);
        List<Near> found = within(i, radius);
        while (found.size() < k && radius < HALF_CIRCUMFERENCE_KM) {
            radius *= 2;
            found = within(i, radius);
        }
        found.sort(null);
        return found.subList(0, Math.min(k, found.size()));
    }

    /** Half of the radius that would hold k centres if they were spread evenly over their box. */
    private double firstRadius(int k) {
        return Math.max(1, spread * Math.sqrt((double) k / points.length) / 2);
    }

    /** The diagonal of the box of all centres, in kilometres. */
    private static double spread(Coordinate[] points) {
        Envelope all = new Envelope();
        for (Coordinate point : points) {
            all.expandToInclude(point);
        }
        return all.isNull()
                ? 0
                : GreatCircle.kilometres(
                        new Coordinate(all.getMinX(), all.getMinY()), new Coordinate(all.getMaxX(), all.getMaxY()));
    }

    /** Boxes in degrees that hold the circle: one, or two where it crosses the 180th meridian. */
    private static List<Envelope> boxes(Coordinate centre, double kilometres) {
        double angle = kilometres / GreatCircle.EARTH_RADIUS_KM * MARGIN;
        double height = Math.toDegrees(angle) + 1e-9;
        double south = centre.y - height;
        double north = centre.y + height;
        if (south <= -90 || north >= 90) {
            return List.of(new Envelope(-180, 180, south, north));
        }
        double ratio = StrictMath.sin(angle) / StrictMath.cos(Math.toRadians(centre.y));
        double width = Math.toDegrees(StrictMath.asin(Math.min(1, ratio))) * MARGIN + 1e-9;
        double west = centre.x - width;
        double east = centre.x + width;
        if (west < -180) {
            return List.of(new Envelope(-180, east, south, north), new Envelope(west + 360, 180, south, north));
        }
        if (east > 180) {
            return List.of(new Envelope(west, 180, south, north), new Envelope(-180, east - 360, south, north));
        }
        return List.of(new Envelope(west, east, south, north));
    }

    /**
     * A region at a distance. Distances are compared to the millimetre, so that equal ones that rounding tells apart are
     * ties.
     */
    record Near(int region, double kilometres) implements Comparable<Near> {

        @Override
        public int compareTo(Near other) {
            int byDistance = Long.compare(millimetres(), other.millimetres());
            return byDistance != 0 ? byDistance : Integer.compare(region, other.region);
        }

        private long millimetres() {
            return Math.round(kilometres * 1e6);
        }
    }
}
