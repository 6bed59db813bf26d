package org.seamwatch.processors.series;

import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.UnaryOperator;
import org.seamwatch.processors.intake.Say;
import org.seamwatch.processors.watch.TestDesk;

/**
 * Random reports over a small grid: a report for most regions and days, a spell of many cases in a corner, then
 * duplicates, corrections, withdrawals, moved regions and days, late and in random order.
 */
final class RandomFeed {

    static final LocalDate FIRST = LocalDate.of(2024, 1, 15);

    /** One arrival. */
    record Arrival(Instant time, Say say) {}

    final List<Arrival> arrivals = new ArrayList<>();
    private final int days;
    private final int longestDelay;
    private final Random random;

    RandomFeed(long seed, int days, int longestDelay) {
        this.random = new Random(seed);
        this.days = days;
        this.longestDelay = longestDelay;
        int spell = days / 2 + random.nextInt(days / 4);
        for (int d = 0; d < days; d++) {
            for (int column = 0; column < 5; column++) {
                for (int row = 0; row < 5; row++) {
                    boolean high = column < 2 && row < 2 && d >= spell && d < spell + 5;
                    int count = random.nextInt(4) + (high ? 12 : 0);
                    if (count > 0 && random.nextInt(8) > 0) {
                        report(d, column, row, count, high);
                    }
                }
            }
        }
        arrivals.sort(Comparator.comparing(Arrival::time));
    }

    private void report(int d, int column, int row, int count, boolean high) {
        LocalDate day = FIRST.plusDays(d);
        Say say = Say.of("r-" + d + "-" + column + row, TestDesk.region(column, row), day.toString())
                .count(count);
        List<Say> revisions = new ArrayList<>(List.of(say));
        int changes = random.nextInt(high ? 4 : 10) == 0 ? 1 + random.nextInt(3) : 0;
        for (int revision = 1; revision <= changes; revision++) {
            say = changed(say, day, high && random.nextBoolean());
            revisions.add(random.nextInt(6) == 0 ? say : say.revision(revision));
        }
        for (Say each : revisions) {
            arrive(day, each);
            if (random.nextInt(20) == 0) {
                arrive(day, each);
            }
        }
    }

    private Say changed(Say say, LocalDate day, boolean withdraw) {
        if (withdraw) {
            return say.status("withdrawn");
        }
        return switch (random.nextInt(5)) {
            case 0 -> say.status("withdrawn");
            case 1 -> say.with("region", TestDesk.region(random.nextInt(5), random.nextInt(5)));
            case 2 -> say.day(day.minusDays(random.nextInt(3)));
            case 3 -> say.status("preliminary");
            default -> say.count(random.nextInt(9)).status("corrected");
        };
    }

    private void arrive(LocalDate day, Say say) {
        int delay = random.nextInt(4) > 0 ? random.nextInt(2) : random.nextInt(longestDelay + 1);
        Instant time = day.plusDays(delay)
                .atStartOfDay(ZoneOffset.UTC)
                .toInstant()
                .plusSeconds(12 * 3600 + random.nextInt(11 * 3600));
        arrivals.add(new Arrival(time, say));
    }

    /** The feed as it came. */
    TestLog log(int partitions) {
        return log(partitions, arrivals);
    }

    /** The feed as it came, each report said otherwise. */
    TestLog log(int partitions, UnaryOperator<Say> otherwise) {
        return log(
                partitions,
                arrivals.stream()
                        .map(a -> new Arrival(a.time(), otherwise.apply(a.say())))
                        .toList());
    }

    /** The final reports alone, each at noon of its day: what a cold start reads. */
    TestLog finals(int partitions) {
        List<Arrival> cold = new ArrayList<>();
        for (Say say : finalReports()) {
            LocalDate day = LocalDate.parse((String) say.fields().get("eventDate"));
            Instant noon = day.atTime(12, 0).toInstant(ZoneOffset.UTC);
            cold.add(new Arrival(noon, say.at(noon)));
        }
        cold.sort(Comparator.comparing(Arrival::time));
        return log(partitions, cold);
    }

    /** The highest revision of each report, the last to come among equals. */
    private Collection<Say> finalReports() {
        Map<String, Say> last = new LinkedHashMap<>();
        for (Arrival a : arrivals) {
            Say known = last.get(a.say().id());
            if (known == null || revision(a.say()) >= revision(known)) {
                last.put(a.say().id(), a.say());
            }
        }
        return last.values();
    }

    private static int revision(Say say) {
        return (int) number(say, "revision");
    }

    private static long number(Say say, String field) {
        return say.fields().get(field) instanceof Integer number ? number : 0;
    }

    /** Final counts by series, region and day; none that is zero. */
    SortedMap<String, Long> finalCounts() {
        SortedMap<String, Long> counts = new TreeMap<>();
        for (Say say : finalReports()) {
            if (!"withdrawn".equals(say.fields().get("status"))) {
                counts.merge(
                        "gridland/influenza|" + say.fields().get("region") + "|"
                                + say.fields().get("eventDate"),
                        number(say, "count"),
                        Long::sum);
            }
        }
        counts.values().removeIf(count -> count == 0);
        return counts;
    }

    private TestLog log(int partitions, List<Arrival> reports) {
        TestLog log = new TestLog(partitions);
        Instant clock = FIRST.atStartOfDay(ZoneOffset.UTC).toInstant();
        log.clock(clock);
        for (Arrival a : reports) {
            while (clock.plusSeconds(6 * 3600).isBefore(a.time())) {
                clock = clock.plusSeconds(6 * 3600);
                log.clock(clock);
            }
            log.say(a.time(), a.say());
        }
        Instant end = FIRST.plusDays(days + longestDelay + 3L)
                .atStartOfDay(ZoneOffset.UTC)
                .toInstant();
        while (clock.isBefore(end)) {
            clock = clock.plusSeconds(6 * 3600);
            log.clock(clock);
        }
        return log;
    }
}
