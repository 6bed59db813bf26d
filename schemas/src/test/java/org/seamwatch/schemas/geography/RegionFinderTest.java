package org.seamwatch.schemas.geography;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Point;
import org.locationtech.jts.io.ParseException;
import org.locationtech.jts.io.WKTReader;
import org.seamwatch.schemas.record.Position;

class RegionFinderTest {

    private static final GeometryFactory FACTORY = new GeometryFactory();

    @Test
    void shouldFindTheRegionOfAPlace() {
        RegionFinder finder = new RegionFinder(List.of(
                region("ring", "POLYGON((0 0,9 0,9 9,0 9,0 0),(3 3,6 3,6 6,3 6,3 3))"),
                region("inner", "POLYGON((4 4,5 4,5 5,4 5,4 4))"),
                region("parts", "MULTIPOLYGON(((20 0,21 0,21 1,20 0)),((30 0,31 0,31 1,30 0)))")));

        assertThat(finder.find(new Position(1, 1))).contains("ring");
        assertThat(finder.find(new Position(4.5, 4.5))).contains("inner");
        assertThat(finder.find(new Position(3.5, 3.5))).isEmpty();
        assertThat(finder.find(new Position(30.9, 0.1))).contains("parts");
        assertThat(finder.find(new Position(25, 0.5))).isEmpty();
        assertThat(finder.find(new Position(-170, -80))).isEmpty();
    }

    @Test
    void shouldGiveABorderToTheSmallestIdInWhateverOrder() {
        List<Region> regions = new ArrayList<>(
                List.of(region("b", "POLYGON((0 0,1 0,1 1,0 1,0 0))"), region("a", "POLYGON((1 0,2 0,2 1,1 1,1 0))")));
        for (int i = 0; i < 2; i++) {
            RegionFinder finder = new RegionFinder(regions);
            assertThat(finder.find(new Position(1, 0.5))).contains("a");
            assertThat(finder.find(new Position(0, 0))).contains("b");
            Collections.reverse(regions);
        }
    }

    @Test
    void shouldFindNothingWithoutRegions() {
        assertThat(new RegionFinder(List.of()).find(new Position(0, 0))).isEmpty();
    }

    @Test
    void shouldAgreeWithAskingEveryRegion() {
        SplittableRandom random = new SplittableRandom(7);
        List<Region> regions = new ArrayList<>();
        for (int i = 0; i < 60; i++) {
            Point centre = FACTORY.createPoint(new Coordinate(random.nextDouble(20), random.nextDouble(20)));
            regions.add(new Region("r" + i, "r", null, centre.buffer(0.5 + random.nextDouble(2))));
        }
        RegionFinder finder = new RegionFinder(regions);
        for (int i = 0; i < 3000; i++) {
            Position position = new Position(random.nextDouble(22), random.nextDouble(22));
            Point place = FACTORY.createPoint(new Coordinate(position.lon(), position.lat()));
            Optional<String> slow = regions.stream()
                    .filter(region -> region.shape().covers(place))
                    .map(Region::id)
                    .min(String::compareTo);
            assertThat(finder.find(position)).isEqualTo(slow);
        }
    }

    private static Region region(String id, String wkt) {
        try {
            Geometry shape = new WKTReader(FACTORY).read(wkt);
            return new Region(id, id, null, shape);
        } catch (ParseException e) {
            throw new IllegalArgumentException(e);
        }
    }
}
