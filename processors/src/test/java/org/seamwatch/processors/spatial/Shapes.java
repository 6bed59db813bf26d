package org.seamwatch.processors.spatial;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.io.ParseException;
import org.locationtech.jts.io.WKTReader;
import org.locationtech.jts.triangulate.VoronoiDiagramBuilder;

/** Polygons for tests. */
final class Shapes {

    private static final GeometryFactory FACTORY = new GeometryFactory();

    private Shapes() {}

    static Geometry wkt(String text) {
        try {
            return new WKTReader().read(text);
        } catch (ParseException e) {
            throw new IllegalArgumentException(text, e);
        }
    }

    static Polygon box(double west, double south, double east, double north) {
        return polygon(west, south, east, south, east, north, west, north);
    }

    /** A polygon from x, y, x, y and so on; closed by itself. */
    static Polygon polygon(double... xy) {
        Coordinate[] ring = new Coordinate[xy.length / 2 + 1];
        for (int k = 0; k < ring.length - 1; k++) {
            ring[k] = new Coordinate(xy[2 * k], xy[2 * k + 1]);
        }
        ring[ring.length - 1] = ring[0].copy();
        return FACTORY.createPolygon(ring);
    }

    /** Unit squares, row by row from the south west. */
    static List<Geometry> grid(int columns, int rows) {
        List<Geometry> squares = new ArrayList<>();
        for (int y = 0; y < rows; y++) {
            for (int x = 0; x < columns; x++) {
                squares.add(box(x, y, x + 1, y + 1));
            }
        }
        return squares;
    }

    /** Voronoi cells of random sites in a box of 10 by 10. */
    static List<Geometry> voronoi(int sites, long seed) {
        Random random = new Random(seed);
        Coordinate[] points = new Coordinate[sites];
        Arrays.setAll(points, k -> new Coordinate(10 * random.nextDouble(), 10 * random.nextDouble()));
        VoronoiDiagramBuilder builder = new VoronoiDiagramBuilder();
        builder.setSites(Arrays.asList(points));
        Geometry cells = builder.getDiagram(FACTORY);
        List<Geometry> regions = new ArrayList<>();
        for (int k = 0; k < cells.getNumGeometries(); k++) {
            regions.add(cells.getGeometryN(k));
        }
        return regions;
    }
}
