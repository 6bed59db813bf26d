package org.seamwatch.processors.spatial;

import org.locationtech.jts.geom.Coordinate;

/**
 * The part of one segment that lies within a distance of another: a capsule (a strip with two half discs) is convex, so
 * the part is one interval. A scratch object, to be used by one thread.
 */
final class SegmentReach {

    private final double distance;
    private double from;
    private double to;

    SegmentReach(double distance) {
        this.distance = distance;
    }

    /** Start of the interval found last, as a fraction of the segment in 0..1. */
    double from() {
        return from;
    }

    /** End of the interval found last. */
    double to() {
        return to;
    }

    /** Whether any of the segment {@code p0 p1} lies within the distance of the segment {@code q0 q1}. */
    boolean find(Coordinate p0, Coordinate p1, Coordinate q0, Coordinate q1) {
        from = Double.POSITIVE_INFINITY;
        to = Double.NEGATIVE_INFINITY;
        double dx = p1.x - p0.x;
        double dy = p1.y - p0.y;
        double length = Math.sqrt(dx * dx + dy * dy);
        addDisc(p0.x - q0.x, p0.y - q0.y, dx, dy, length);
        addDisc(p0.x - q1.x, p0.y - q1.y, dx, dy, length);
        addStrip(p0.x - q0.x, p0.y - q0.y, dx, dy, q1.x - q0.x, q1.y - q0.y);
        from = Math.max(from, 0);
        to = Math.min(to, 1);
        return from <= to;
    }

    /** The chord in a disc, by the distance of its centre from the line: differences of squares would cancel. */
    private void addDisc(double fx, double fy, double dx, double dy, double length) {
        double height = (fx * dy - fy * dx) / length;
        double square = distance * distance - height * height;
        if (square >= 0) {
            double middle = -(fx * dx + fy * dy) / (length * length);
            double half = Math.sqrt(square) / length;
            add(middle - half, middle + half);
        }
    }

    private void addStrip(double fx, double fy, double dx, double dy, double ex, double ey) {
        double width = Math.sqrt(ex * ex + ey * ey);
        double ux = ex / width;
        double uy = ey / width;
        double[] interval = {Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY};
        clip(interval, fx * ux + fy * uy, dx * ux + dy * uy, 0, width);
        clip(interval, fy * ux - fx * uy, dy * ux - dx * uy, -distance, distance);
        if (interval[0] <= interval[1]) {
            add(interval[0], interval[1]);
        }
    }

    /** Narrows an interval of u to where {@code low <= start + u slope <= high}. */
    private static void clip(double[] interval, double start, double slope, double low, double high) {
        if (slope == 0) {
            if (start < low || start > high) {
                interval[1] = Double.NEGATIVE_INFINITY;
            }
            return;
        }
        double a = (low - start) / slope;
        double b = (high - start) / slope;
        interval[0] = Math.max(interval[0], Math.min(a, b));
        interval[1] = Math.min(interval[1], Math.max(a, b));
    }

    private void add(double start, double end) {
        from = Math.min(from, start);
        to = Math.max(to, end);
    }
}
