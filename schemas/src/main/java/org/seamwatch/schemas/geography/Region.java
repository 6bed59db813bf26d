package org.seamwatch.schemas.geography;

import org.jspecify.annotations.Nullable;
import org.locationtech.jts.geom.Geometry;

/**
 * The smallest area that has counts.
 *
 * @param id unique across a plan
 * @param name what people call it
 * @param population people, above 0; null where the geography has no populations
 * @param shape a valid polygon or multipolygon, longitude and latitude on WGS84
 */
public record Region(String id, String name, @Nullable Double population, Geometry shape) {}
