package org.seamwatch.ops;

import java.time.LocalDate;
import java.time.format.DateTimeFormatter;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.seamwatch.fixtures.scenario.Outbreak;
import org.seamwatch.fixtures.scenario.Scenario;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.Change;
import org.seamwatch.schemas.record.Cluster;
import org.seamwatch.schemas.record.ClusterRegion;

/**
 * Planted outbreaks beside the alarms. An outbreak counts as found by the first alarm of its condition that was raised
 * between its first day and a week after its last, was not withdrawn, and whose strongest cluster holds one of its
 * regions.
 */
final class PlantedText {

    private static final int DAYS_AFTER = 7;
    private static final int NAMED = 3;
    private static final double DAYS_PER_YEAR = 365.25;
    private static final DateTimeFormatter DAY = DateTimeFormatter.ofPattern("d MMM yyyy", Locale.ENGLISH);

    private final Scenario scenario;
    private final long accepted;
    private final Map<String, String> names = new HashMap<>();
    private final List<Outbreak> outbreaks;
    private final Map<String, List<AlarmChange>> alarms;
    private final List<String> lines = new ArrayList<>();

    private PlantedText(Scenario scenario, double falseAlarmsPerYear, List<AlarmChange> changes) {
        this.scenario = scenario;
        this.accepted = Math.round(falseAlarmsPerYear * scenario.options().days() / DAYS_PER_YEAR);
        scenario.territory().districts().forEach(d -> names.put(d.id(), d.name()));
        outbreaks = scenario.outbreaks();
        alarms = changes.stream()
                .collect(Collectors.groupingBy(AlarmChange::alarm, LinkedHashMap::new, Collectors.toList()));
    }

    /**
     * The comparison, line by line.
     *
     * @param falseAlarmsPerYear what the plan accepts for the whole desk
     * @param changes all changes of alarms, each alarm's in order
     */
    static List<String> of(Scenario scenario, double falseAlarmsPerYear, List<AlarmChange> changes) {
        PlantedText text = new PlantedText(scenario, falseAlarmsPerYear, changes);
        text.write();
        return text.lines;
    }

    private void write() {
        lines.add("Planted outbreaks");
        Set<String> used = new LinkedHashSet<>();
        for (Outbreak outbreak : outbreaks) {
            outbreak(outbreak, used);
        }
        List<List<AlarmChange>> others = alarms.values().stream()
                .filter(changes -> !used.contains(changes.get(0).alarm()))
                .toList();
        lines.add("");
        lines.add(
                others.isEmpty()
                        ? "It alarmed on nothing else."
                        : "What else it alarmed on: " + others.size() + " in "
                                + scenario.options().days() + " days, where the plan accepts about " + accepted);
        others.forEach(changes -> lines.add("  " + told(changes)));
    }

    private void outbreak(Outbreak outbreak, Set<String> used) {
        List<String> places = outbreak.regions().stream()
                .sorted(Comparator.comparing(r -> !r.equals(outbreak.centre())))
                .limit(NAMED)
                .map(r -> names.getOrDefault(r, r))
                .toList();
        int more = outbreak.regions().size() - places.size();
        lines.add("  " + outbreak.id() + "  " + outbreak.condition() + ", " + String.join(", ", places)
                + (more > 0 ? " and " + more + " more" : "") + ", "
                + outbreak.start().format(DAY) + " to "
                + outbreak.end().format(DAY) + ", " + outbreak.cases() + " cases (" + outbreak.shape() + ")");
        lines.add("      expected: " + outbreak.expectation());
        List<List<AlarmChange>> near = alarms.values().stream()
                .filter(changes -> isNear(changes.get(0), outbreak))
                .toList();
        near.forEach(changes -> used.add(changes.get(0).alarm()));
        Optional<List<AlarmChange>> found = near.stream()
                .filter(changes -> last(changes).change() != Change.WITHDRAWN)
                .findFirst();
        if (found.isEmpty()) {
            lines.add("      NOT FOUND");
        }
        for (List<AlarmChange> changes : near) {
            long day = ChronoUnit.DAYS.between(outbreak.start(), changes.get(0).day()) + 1;
            lines.add("      "
                    + (found.isPresent() && found.get() == changes ? "FOUND on its day " + day + ": " : "also: ")
                    + told(changes));
        }
    }

    private static boolean isNear(AlarmChange raised, Outbreak outbreak) {
        LocalDate day = raised.day();
        return raised.condition().equals(outbreak.condition())
                && !day.isBefore(outbreak.start())
                && !day.isAfter(outbreak.end().plusDays(DAYS_AFTER))
                && raised.evidence().clusters().stream()
                        .limit(1)
                        .map(Cluster::regions)
                        .flatMap(List::stream)
                        .map(ClusterRegion::region)
                        .anyMatch(outbreak.regions()::contains);
    }

    private static String told(List<AlarmChange> changes) {
        return changes.get(0).alarm() + ": "
                + changes.stream()
                        .map(c -> word(c.change()) + " for " + c.day().format(DAY))
                        .collect(Collectors.joining(", "));
    }

    private static String word(Change change) {
        return change == Change.ENDED ? "back inside its limits" : change.name().toLowerCase(Locale.ROOT);
    }

    private static AlarmChange last(List<AlarmChange> changes) {
        return changes.get(changes.size() - 1);
    }
}
