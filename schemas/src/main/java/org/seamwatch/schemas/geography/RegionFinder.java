package org.seamwatch.schemas.geography;

import java.util.Collection;
import java.util.List;
import java.util.Optional;
import org.locationtech.jts.algorithm.locate.IndexedPointInAreaLocator;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Location;
import org.locationtech.jts.index.strtree.STRtree;
import org.seamwatch.schemas.record.Position;

/**
 * Finds the region of a place. A place on a border belongs to the region with the smallest id, so that the answer does
 * not depend on the order of the regions. Safe for many threads.
 */
public final class RegionFinder {

    private final STRtree index = new STRtree();

    private record Area(String id, IndexedPointInAreaLocator locator) {

        boolean covers(Coordinate place) {
            return locator.locate(place) != Location.EXTERIOR;
        }
    }

    /** A finder over regions of any number of geographies. */
    public RegionFinder(Collection<Region> regions) {
        for (Region region : regions) {
            index.insert(
                    region.shape().getEnvelopeInternal(),
                    new Area(region.id(), new IndexedPointInAreaLocator(region.shape())));
        }
        // From here on the index only answers, which many threads may ask it to.
        index.build();
    }

    /** Id of the region that the place lies in or on the border of; empty where there is none. */
    public Optional<String> find(Position position) {
        Coordinate place = new Coordinate(position.lon(), position.lat());
        @SuppressWarnings("unchecked")
        List<Area> near = index.query(new Envelope(place));
        return near.stream().filter(area -> area.covers(place)).map(Area::id).min(String::compareTo);
    }
}
