package org.seamwatch.processors.spatial;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.algorithm.locate.IndexedPointInAreaLocator;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineSegment;
import org.locationtech.jts.geom.Location;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.geom.Polygonal;
import org.locationtech.jts.index.strtree.STRtree;
import org.locationtech.jts.operation.relateng.RelateNG;
import org.locationtech.jts.operation.relateng.RelatePredicate;

/** The outline of one region, all rings of all parts, indexed for comparing it with others. Used by one thread. */
final class Outline {

    /** Boundaries meet in a line, whatever else they do. */
    private static final String SHARED_LINE = "****1****";

    private final Geometry region;
    private final List<Coordinate[]> rings = new ArrayList<>();
    private final STRtree segments = new STRtree();
    private final IndexedPointInAreaLocator locator;
    private final RelateNG relation;

    Outline(Geometry region) {
        if (!(region instanceof Polygonal)) {
            throw new IllegalArgumentException(
                    "a region must be a Polygon or MultiPolygon, was " + region.getGeometryType());
        }
        this.region = region;
        this.locator = new IndexedPointInAreaLocator(region);
        this.relation = RelateNG.prepare(region);
        for (int part = 0; part < region.getNumGeometries(); part++) {
            Polygon polygon = (Polygon) region.getGeometryN(part);
            addRing(polygon.getExteriorRing().getCoordinates());
            for (int hole = 0; hole < polygon.getNumInteriorRing(); hole++) {
                addRing(polygon.getInteriorRingN(hole).getCoordinates());
            }
        }
        segments.build();
    }

    private void addRing(Coordinate[] ring) {
        rings.add(ring);
        for (int k = 1; k < ring.length; k++) {
            if (!ring[k].equals2D(ring[k - 1])) {
                segments.insert(new Envelope(ring[k - 1], ring[k]), new LineSegment(ring[k - 1], ring[k]));
            }
        }
    }

    Envelope envelope() {
        return region.getEnvelopeInternal();
    }

    List<Coordinate[]> rings() {
        return rings;
    }

    boolean sharesLineWith(Outline other) {
        return relation.evaluate(other.region, RelatePredicate.matches(SHARED_LINE));
    }

    boolean meets(Outline other) {
        return relation.evaluate(other.region, RelatePredicate.intersects());
    }

    boolean contains(double x, double y) {
        return locator.locate(new Coordinate(x, y)) != Location.EXTERIOR;
    }

    /** The segments whose envelopes meet this one. */
    @SuppressWarnings("unchecked")
    List<LineSegment> segmentsNear(Envelope envelope) {
        return segments.query(envelope);
    }
}
