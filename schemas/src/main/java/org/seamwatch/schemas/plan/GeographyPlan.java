package org.seamwatch.schemas.plan;

import java.nio.file.Path;
import java.time.ZoneId;
import org.jspecify.annotations.Nullable;

/**
 * A geography as the plan names it.
 *
 * @param file the GeoJSON FeatureCollection, resolved against the plan's folder
 * @param id id of the geography, without {@code /} and {@code |}
 * @param timeZone whose calendar days are counted
 * @param regionId property with a region's id
 * @param regionName property with a region's name
 * @param population property with a region's population, which every region must have; null where the plan names none:
 *     then it is {@code population}, which all regions or none must have
 * @param populationYear year of the populations
 * @param regions which regions of the file: ids with {@code *} for any characters, commas between patterns
 * @param tolerance gaps and overlaps up to this many coordinate units (degrees) are closed; from 0
 */
public record GeographyPlan(
        Path file,
        String id,
        ZoneId timeZone,
        String regionId,
        String regionName,
        @Nullable String population,
        @Nullable Integer populationYear,
        String regions,
        double tolerance) {}
