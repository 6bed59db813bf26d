package org.seamwatch.processors.spatial;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.LineSegment;

/**
 * Whether an outline follows another region for long enough: looks for an unbroken run along a ring of which every point
 * lies in the other region or within a distance of it. Runs are judged one by one, so that many separate touches do not
 * add up to a border.
 */
final class SharedRun {

    private final double distance;
    private final double wanted;
    private final SegmentReach reach;

    /** Lengths along the ring being walked: of the run the walk is in, the longest so far, and the one at its start. */
    private double run;

    private double longest;
    private double firstRun;
    private boolean broken;

    SharedRun(double distance, double wanted) {
        this.distance = distance;
        this.wanted = wanted;
        this.reach = new SegmentReach(distance);
    }

    /** Whether {@code walker} has a run longer than wanted along {@code other}. */
    boolean found(Outline walker, Outline other) {
        Envelope near = new Envelope(other.envelope());
        near.expandBy(distance);
        for (Coordinate[] ring : walker.rings()) {
            if (foundOnRing(ring, other, near)) {
                return true;
            }
        }
        return false;
    }

    private boolean foundOnRing(Coordinate[] ring, Outline other, Envelope near) {
        run = 0;
        longest = 0;
        firstRun = 0;
        broken = false;
        for (int k = 1; k < ring.length && longest <= wanted; k++) {
            walk(ring[k - 1], ring[k], other, near);
        }
        // The run that reaches the end of the ring goes on where the ring begins.
        return longest > wanted || (broken && run + firstRun > wanted);
    }

    private void walk(Coordinate p0, Coordinate p1, Outline other, Envelope near) {
        double length = p0.distance(p1);
        if (length == 0) {
            return;
        }
        if (!near.intersects(p0, p1)) {
            stop();
            return;
        }
        double at = 0;
        for (double[] interval : reached(p0, p1, other)) {
            cross(at, interval[0], p0, p1, other, length);
            if (interval[1] > at) {
                go((interval[1] - Math.max(at, interval[0])) * length);
                at = interval[1];
            }
        }
        cross(at, 1, p0, p1, other, length);
    }

    /** The parts of a segment within the distance of the other outline, by where they begin. */
    private List<double[]> reached(Coordinate p0, Coordinate p1, Outline other) {
        Envelope search = new Envelope(p0, p1);
        search.expandBy(distance);
        List<double[]> intervals = new ArrayList<>();
        for (LineSegment segment : other.segmentsNear(search)) {
            if (reach.find(p0, p1, segment.p0, segment.p1)) {
                intervals.add(new double[] {reach.from(), reach.to()});
            }
        }
        intervals.sort(Comparator.comparingDouble(interval -> interval[0]));
        return intervals;
    }

    /** A part beyond the distance of the other outline lies wholly inside or wholly outside the other region. */
    private void cross(double from, double to, Coordinate p0, Coordinate p1, Outline other, double length) {
        if (!(to > from)) {
            return;
        }
        double middle = (from + to) / 2;
        if (other.contains(p0.x + middle * (p1.x - p0.x), p0.y + middle * (p1.y - p0.y))) {
            go((to - from) * length);
        } else {
            stop();
        }
    }

    private void go(double length) {
        run += length;
        longest = Math.max(longest, run);
    }

    private void stop() {
        if (!broken) {
            firstRun = run;
            broken = true;
        }
        run = 0;
    }
}
