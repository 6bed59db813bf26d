package org.seamwatch.schemas.plan;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.time.DateTimeException;
import java.time.ZoneId;
import java.util.List;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;

/** Reads one item of {@code geographies}. */
final class GeographyPlanReader {

    private static final List<String> KEYS = List.of(
            "file", "id", "timeZone", "regionId", "regionName", "population", "populationYear", "regions", "tolerance");

    private GeographyPlanReader() {}

    static GeographyPlan read(Path plan, YamlValue item) {
        YamlMap map = item.map().only(KEYS);
        YamlValue population = map.get("population");
        YamlValue year = map.get("populationYear");
        return new GeographyPlan(
                file(plan, map.required("file")),
                map.required("id").id(),
                zone(map.get("timeZone")),
                map.text("regionId", "id"),
                map.text("regionName", "name"),
                population == null ? null : population.text(),
                year == null ? null : year.integer(1900, 2200),
                map.patterns("regions"),
                tolerance(map.get("tolerance")));
    }

    private static Path file(Path plan, YamlValue value) {
        try {
            return plan.resolveSibling(value.text());
        } catch (InvalidPathException e) {
            throw value.rule("must be the path of a file");
        }
    }

    private static ZoneId zone(@Nullable YamlValue value) {
        if (value == null) {
            return ZoneId.of("UTC");
        }
        try {
            return ZoneId.of(value.text());
        } catch (DateTimeException e) {
            String near = Nearest.suggestion(value.text(), new TreeSet<>(ZoneId.getAvailableZoneIds()));
            throw value.error("unknown time zone \"" + value.text() + "\"" + near);
        }
    }

    private static double tolerance(@Nullable YamlValue value) {
        if (value == null) {
            return 0;
        }
        double tolerance = value.decimal();
        if (!(tolerance >= 0 && tolerance <= 1)) {
            throw value.rule("must be in 0 to 1 degrees, was " + value.text());
        }
        return tolerance;
    }
}
