package org.seamwatch.processors.watch;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.geography.Geography;
import org.seamwatch.schemas.geography.Region;
import org.seamwatch.schemas.geography.RegionFinder;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.schemas.record.Position;

/** A plan made ready: immutable, shared by all tasks. */
public final class Watch {

    private final Plan plan;
    private final String hash;
    private final SortedMap<String, SeriesSpec> series = new TreeMap<>();
    private final Map<String, Map<String, List<SeriesSpec>>> routes = new HashMap<>();
    private final Set<String> regions = new HashSet<>();
    private final RegionFinder finder;

    private Watch(Plan plan, List<Geography> geographies, List<SeriesSpec> specs) {
        this.plan = plan;
        this.hash = PlanHash.of(plan, geographies);
        for (SeriesSpec spec : specs) {
            series.put(spec.id(), spec);
        }
        for (SeriesSpec spec : series.values()) {
            Map<String, List<SeriesSpec>> byRegion = routes.computeIfAbsent(spec.condition(), c -> new HashMap<>());
            for (Region region : spec.regions()) {
                byRegion.computeIfAbsent(region.id(), r -> new ArrayList<>()).add(spec);
            }
        }
        Map<String, Region> distinct = new TreeMap<>();
        geographies.forEach(g -> g.regions().forEach(r -> distinct.putIfAbsent(r.id(), r)));
        regions.addAll(distinct.keySet());
        finder = new RegionFinder(List.copyOf(distinct.values()));
    }

    /**
     * Makes a plan ready: contiguity, weights, limits.
     *
     * @param geographies those of the plan, in its order
     */
    public static Watch of(Plan plan, List<Geography> geographies) {
        return new Watch(plan, geographies, new SpecMaker(plan, geographies).specs());
    }

    public Plan plan() {
        return plan;
    }

    /** SHA-256 of the desk, the series and the geographies of the plan, in hexadecimal digits. */
    public String hash() {
        return hash;
    }

    /** All series by id. */
    public SortedMap<String, SeriesSpec> series() {
        return Collections.unmodifiableSortedMap(series);
    }

    /** The series that count a condition in a region, by id; empty where none does. */
    public List<SeriesSpec> route(String condition, String region) {
        return routes.getOrDefault(condition, Map.of()).getOrDefault(region, List.of());
    }

    public boolean knowsCondition(String condition) {
        return routes.containsKey(condition);
    }

    public boolean knowsRegion(String region) {
        return regions.contains(region);
    }

    /** The region at a place, or null. */
    public @Nullable String regionAt(Position position) {
        return finder.find(position).orElse(null);
    }
}
