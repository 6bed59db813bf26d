package org.seamwatch.schemas.geography;

import org.jspecify.annotations.Nullable;
import org.locationtech.jts.geom.Geometry;

/**
 * A feature of the file as read.
 *
 * @param place where it lies
 * @param id region id
 * @param name region name
 * @param population its population, or null where it has none
 * @param shape its checked shape
 */
record Feature(
        FeaturePlace place,
        String id,
        String name,
        @Nullable Double population,
        Geometry shape) {

    Region region() {
        return new Region(id, name, population, shape);
    }
}
