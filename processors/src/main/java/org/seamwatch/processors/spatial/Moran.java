package org.seamwatch.processors.spatial;

/**
 * Global Moran's I of one set of values. These moments test "no structure at all": where districts always cluster a
 * little, z is large every day.
 *
 * @param regions number of regions that took part
 * @param i the index
 * @param expected its expectation without spatial structure, {@code -1/(n-1)}
 * @param varianceNormality its variance when values are independent normal
 * @param varianceRandomisation its variance over all arrangements of these values on the regions
 * @param z {@code (i - expected) / sqrt(varianceRandomisation)}
 */
public record Moran(
        int regions, double i, double expected, double varianceNormality, double varianceRandomisation, double z) {}
