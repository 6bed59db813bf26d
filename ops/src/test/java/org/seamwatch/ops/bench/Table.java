package org.seamwatch.ops.bench;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;

/** The results as Markdown. */
final class Table {

    private final long reports;
    private final StringBuilder text = new StringBuilder();
    private final StringBuilder ratioLines = new StringBuilder();

    Table(BenchOptions options, BenchLog log) {
        this.reports = log.reports();
        line(
                "Reports: %,d of %d days in 64 districts, two conditions, with %,d clock records in all; %d partitions"
                        + " of each input topic.",
                log.reports(), options.days(), log.records() - log.reports(), BenchOptions.PARTITIONS);
        line(
                "Machine: %d cores, Java %s; broker in a JVM of its own on the same machine; both jobs in one JVM, one"
                        + " stream thread each, one after the other.",
                Runtime.getRuntime().availableProcessors(), Runtime.version().feature());
        line("Exactly-once, commit interval, RocksDB and client settings are those of `seamwatch run` for both jobs.");
        line("");
        line("| cache | job | reports/s, each run | median | reports per second of the stream thread, median |");
        line("| --- | --- | --- | --- | --- |");
    }

    /** Adds the runs of one cache size. */
    void add(long cacheBytes, List<Measured> runs) {
        String cache = cacheBytes == 0 ? "off" : (cacheBytes >> 20) + " MB";
        for (String job : List.of(Contest.BARE, Contest.FLOW)) {
            double[] speeds = speeds(runs, job);
            if (speeds.length > 0) {
                double perCpu = median(runs.stream()
                        .filter(run -> run.job().equals(job))
                        .mapToDouble(run -> reports / run.cpuSeconds())
                        .toArray());
                line("| %s | %s | %s | %,.0f | %,.0f |", cache, job, each(speeds, "%,.0f"), median(speeds), perCpu);
            }
        }
        addRatio(cacheBytes, runs);
    }

    private void addRatio(long cacheBytes, List<Measured> runs) {
        double[] bare = speeds(runs, Contest.BARE);
        double[] flow = speeds(runs, Contest.FLOW);
        if (bare.length == 0 || flow.length == 0) {
            return;
        }
        double[] ratios = new double[flow.length];
        Arrays.setAll(ratios, i -> flow[i] / bare[i]);
        ratioLines.append(String.format(
                Locale.ROOT,
                "%nRecord cache %s: the flow at **%.2f** of the bare job (medians); pairs %s, from %.2f to %.2f.%n",
                cacheBytes == 0 ? "off" : "on",
                median(flow) / median(bare),
                each(ratios, "%.2f"),
                Arrays.stream(ratios).min().orElseThrow(),
                Arrays.stream(ratios).max().orElseThrow()));
    }

    private double[] speeds(List<Measured> runs, String job) {
        return runs.stream()
                .filter(run -> run.job().equals(job))
                .mapToDouble(run -> run.perSecond(reports))
                .toArray();
    }

    private static String each(double[] values, String format) {
        List<String> texts = new ArrayList<>();
        for (double value : values) {
            texts.add(String.format(Locale.ROOT, format, value));
        }
        return String.join("; ", texts);
    }

    /** The middle one; of an even number, the mean of the two in the middle. */
    static double median(double... values) {
        double[] sorted = values.clone();
        Arrays.sort(sorted);
        return (sorted[(sorted.length - 1) / 2] + sorted[sorted.length / 2]) / 2;
    }

    private void line(String format, Object... values) {
        text.append(String.format(Locale.ROOT, format, values)).append('\n');
    }

    @Override
    public String toString() {
        return text.toString() + ratioLines;
    }
}
