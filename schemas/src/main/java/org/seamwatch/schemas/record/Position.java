package org.seamwatch.schemas.record;

/**
 * A place on WGS84.
 *
 * @param lon degrees east, -180 to 180
 * @param lat degrees north, -90 to 90
 */
public record Position(double lon, double lat) {}
