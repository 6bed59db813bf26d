package org.seamwatch.ops.bench;

import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.NoSuchElementException;
import org.jspecify.annotations.Nullable;
import org.seamwatch.fixtures.scenario.ScenarioOptions;

/**
 * What is run.
 *
 * @param days days of the scenario
 * @param scale factor on its volumes
 * @param runs runs that count, of each job and cache size; as many are paired
 * @param warmUps runs of each job before, which do not count
 * @param out file for the table, or null
 * @param only a job's name: run that job alone, for a profiler; null for both
 */
record BenchOptions(
        int days,
        double scale,
        int runs,
        int warmUps,
        @Nullable Path out,
        @Nullable String only) {

    static final int PARTITIONS = 2;

    static final String USAGE = """
            usage: ops/bench [--days N] [--scale X] [--runs N] [--warm-ups N] [--out FILE] [--only bare|flow] [--quick]
              --days N      length of the scenario (default: 60)
              --scale X     factor on its volumes (default: 40)
              --runs N      runs of each job that count (default: 5)
              --warm-ups N  runs of each job before them (default: 3)
              --out FILE    writes the table as Markdown, too
              --only JOB    runs one job alone, for a profiler
              --quick       one short run of each job, no warm-up
            """;

    private static final List<String> NAMES = List.of("--days", "--scale", "--runs", "--warm-ups", "--out", "--only");
    private static final BenchOptions DEFAULTS = new BenchOptions(60, 40, 5, 3, null, null);
    private static final BenchOptions QUICK = new BenchOptions(40, 1, 1, 0, null, null);

    BenchOptions {
        if (runs < 1 || warmUps < 0) {
            throw new IllegalArgumentException(
                    "--runs must be at least 1 and --warm-ups at least 0, were " + runs + " and " + warmUps);
        }
        if (only != null && !List.of(Contest.BARE, Contest.FLOW).contains(only)) {
            throw new IllegalArgumentException("--only must be bare or flow, was " + only);
        }
    }

    static BenchOptions parse(String... args) {
        Deque<String> left = new ArrayDeque<>(List.of(args));
        BenchOptions options = left.remove("--quick") ? QUICK : DEFAULTS;
        while (!left.isEmpty()) {
            String name = left.remove();
            if (!NAMES.contains(name)) {
                throw new IllegalArgumentException("unknown option " + name);
            }
            try {
                options = options.with(name, left.remove());
            } catch (NoSuchElementException e) {
                throw new IllegalArgumentException(name + " must be followed by a value", e);
            }
        }
        return options;
    }

    private BenchOptions with(String name, String value) {
        return switch (name) {
            case "--days" -> new BenchOptions(Integer.parseInt(value), scale, runs, warmUps, out, only);
            case "--scale" -> new BenchOptions(days, Double.parseDouble(value), runs, warmUps, out, only);
            case "--runs" -> new BenchOptions(days, scale, Integer.parseInt(value), warmUps, out, only);
            case "--warm-ups" -> new BenchOptions(days, scale, runs, Integer.parseInt(value), out, only);
            case "--out" -> new BenchOptions(days, scale, runs, warmUps, Path.of(value), only);
            default -> new BenchOptions(days, scale, runs, warmUps, out, value);
        };
    }

    ScenarioOptions scenario() {
        return ScenarioOptions.defaults().withDays(days).withScale(scale);
    }
}
