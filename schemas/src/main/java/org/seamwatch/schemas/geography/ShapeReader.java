package org.seamwatch.schemas.geography;

import com.fasterxml.jackson.databind.JsonNode;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.operation.valid.IsValidOp;
import org.locationtech.jts.operation.valid.TopologyValidationError;

/** Reads a geometry of RFC 7946, section 3.1: a Polygon or MultiPolygon, longitude before latitude, height ignored. */
final class ShapeReader {

    private static final GeometryFactory FACTORY = new GeometryFactory();
    private static final int FEWEST_POINTS = 4;

    private final FeaturePlace place;

    ShapeReader(FeaturePlace place) {
        this.place = place;
    }

    Geometry read(JsonNode geometry) {
        if (!geometry.isObject()) {
            throw place.error("geometry must be a Polygon or MultiPolygon, was " + FeatureReader.words(geometry));
        }
        JsonNode coordinates = geometry.path("coordinates");
        Geometry shape = switch (geometry.path("type").asText()) {
            case "Polygon" -> polygon(coordinates, "geometry.coordinates");
            case "MultiPolygon" -> multiPolygon(coordinates);
            default ->
                throw place.error("geometry must be a Polygon or MultiPolygon, was "
                        + (geometry.path("type").isTextual()
                                ? geometry.path("type").asText()
                                : "without a type"));
        };
        check(shape);
        return shape;
    }

    private Geometry multiPolygon(JsonNode coordinates) {
        filled(coordinates, "geometry.coordinates", "polygon");
        Polygon[] polygons = new Polygon[coordinates.size()];
        for (int i = 0; i < polygons.length; i++) {
            polygons[i] = polygon(coordinates.get(i), "geometry.coordinates[" + i + "]");
        }
        return FACTORY.createMultiPolygon(polygons);
    }

    private Polygon polygon(JsonNode rings, String path) {
        filled(rings, path, "ring");
        LinearRing shell = ring(rings.get(0), path + "[0]");
        LinearRing[] holes = new LinearRing[rings.size() - 1];
        for (int i = 0; i < holes.length; i++) {
            holes[i] = ring(rings.get(i + 1), path + "[" + (i + 1) + "]");
        }
        return FACTORY.createPolygon(shell, holes);
    }

    private LinearRing ring(JsonNode points, String path) {
        filled(points, path, "point");
        Coordinate[] coordinates = new Coordinate[points.size()];
        for (int i = 0; i < coordinates.length; i++) {
            coordinates[i] = point(points.get(i), path, i);
        }
        Coordinate first = coordinates[0];
        Coordinate last = coordinates[coordinates.length - 1];
        if (!first.equals2D(last)) {
            throw place.error(path + " must be closed, begins at " + text(first) + " and ends at " + text(last));
        }
        if (coordinates.length < FEWEST_POINTS) {
            throw place.error(path + " must have at least 4 points, was " + coordinates.length);
        }
        return FACTORY.createLinearRing(coordinates);
    }

    private Coordinate point(JsonNode point, String path, int index) {
        JsonNode lon = point.path(0);
        JsonNode lat = point.path(1);
        if (!lon.isNumber() || !lat.isNumber()) {
            throw place.error(path + "[" + index + "] must be a longitude and a latitude");
        }
        if (!(Math.abs(lon.doubleValue()) <= 180)) {
            throw place.error(
                    path + "[" + index + "] must have a longitude in -180 to 180 (WGS84), was " + lon.asText());
        }
        if (!(Math.abs(lat.doubleValue()) <= 90)) {
            throw place.error(path + "[" + index + "] must have a latitude in -90 to 90 (WGS84), was " + lat.asText());
        }
        // Minus zero and zero are one place.
        return new Coordinate(lon.doubleValue() + 0.0, lat.doubleValue() + 0.0);
    }

    private void filled(JsonNode array, String path, String what) {
        if (!array.isArray() || array.isEmpty()) {
            throw place.error(path + " must be an array with at least one " + what + ", was "
                    + (array.isArray() ? "empty" : FeatureReader.words(array)));
        }
    }

    private void check(Geometry shape) {
        TopologyValidationError error = new IsValidOp(shape).getValidationError();
        if (error != null) {
            throw place.error("geometry " + fault(error.getErrorType()) + " at " + text(error.getCoordinate()));
        }
    }

    private static String fault(int type) {
        return switch (type) {
            case TopologyValidationError.SELF_INTERSECTION -> "crosses itself";
            case TopologyValidationError.RING_SELF_INTERSECTION -> "touches itself along one ring";
            case TopologyValidationError.HOLE_OUTSIDE_SHELL -> "has a hole outside its outline";
            case TopologyValidationError.NESTED_HOLES -> "has a hole inside a hole";
            case TopologyValidationError.NESTED_SHELLS -> "has a part inside a part";
            case TopologyValidationError.DISCONNECTED_INTERIOR -> "is cut in two by its holes";
            case TopologyValidationError.TOO_FEW_POINTS -> "has a ring without an area";
            default -> "is not a valid polygon";
        };
    }

    private static String text(Coordinate point) {
        return point.x + " " + point.y;
    }
}
