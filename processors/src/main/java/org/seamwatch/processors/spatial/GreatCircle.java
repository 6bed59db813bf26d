package org.seamwatch.processors.spatial;

import org.locationtech.jts.geom.Coordinate;

/** Distances on a sphere with the mean radius of the earth, 6371.0088 km (IUGG); true ones differ by up to 0.6 %. */
final class GreatCircle {

    static final double EARTH_RADIUS_KM = 6371.0088;

    private GreatCircle() {}

    /** Distance in kilometres between two points given as lon, lat in degrees, by the haversine formula. */
    static double kilometres(Coordinate a, Coordinate b) {
        double lat = haversine(b.y - a.y);
        double lon = haversine(b.x - a.x);
        double h = lat + StrictMath.cos(Math.toRadians(a.y)) * StrictMath.cos(Math.toRadians(b.y)) * lon;
        return 2 * EARTH_RADIUS_KM * StrictMath.asin(Math.min(1, Math.sqrt(h)));
    }

    private static double haversine(double degrees) {
        double sine = StrictMath.sin(Math.toRadians(degrees) / 2);
        return sine * sine;
    }
}
