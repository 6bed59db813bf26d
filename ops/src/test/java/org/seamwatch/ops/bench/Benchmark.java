package org.seamwatch.ops.bench;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.seamwatch.fixtures.broker.BrokerSettings;
import org.seamwatch.fixtures.broker.Brokers;
import org.seamwatch.fixtures.broker.ProcessBroker;
import org.seamwatch.fixtures.broker.TopicTool;
import org.seamwatch.fixtures.scenario.Scenario;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.topology.service.TopicSetup;

/**
 * Reports per second through the live flow, against a bare Kafka Streams job on the same log in the same process, with
 * the record cache off and on. Prints a table.
 */
public final class Benchmark {

    private static final List<Long> CACHES = List.of(0L, 16L << 20);
    private static final int USAGE = 2;

    private Benchmark() {}

    /** Runs it; see {@link BenchOptions#USAGE}. */
    public static void main(String[] args) throws IOException, InterruptedException {
        if (List.of(args).contains("--help")) {
            System.out.print(BenchOptions.USAGE);
            return;
        }
        BenchOptions options;
        try {
            options = BenchOptions.parse(args);
        } catch (IllegalArgumentException e) {
            System.err.println("bench: " + e.getMessage());
            System.err.print(BenchOptions.USAGE);
            System.exit(USAGE);
            return;
        }
        String table = run(options, System.out);
        System.out.println();
        System.out.print(table);
        Path out = options.out();
        if (out != null) {
            Files.writeString(out, table);
        }
    }

    /** Runs it and returns the table, Markdown. */
    static String run(BenchOptions options, PrintStream say) throws IOException, InterruptedException {
        Path folder = Files.createTempDirectory("seamwatch-bench-");
        try (ProcessBroker broker = Brokers.process(BrokerSettings.defaults().madeForLoad());
                TopicTool tool = TopicTool.of(
                        broker.bootstrapServers(), Map.of("batch.size", 256 << 10, "compression.type", "lz4"))) {
            Scenario scenario = Scenario.of(options.scenario());
            BenchPlan plans = BenchPlan.in(folder, scenario, broker.bootstrapServers());
            Plan plan = plans.plan();
            TopicSetup.prepare(plan).forEach(say::println);
            BenchLog log = BenchLog.load(scenario, plan.topics(), tool);
            say.println(log.reports() + " reports loaded");
            Contest contest = new Contest(plans, log, tool, new Stopwatch(tool, broker.bootstrapServers()), say);
            Table table = new Table(options, log);
            for (long cache : CACHES) {
                table.add(cache, contest.run(options, cache));
            }
            return table.toString();
        } finally {
            delete(folder);
        }
    }

    private static void delete(Path folder) throws IOException {
        try (Stream<Path> files = Files.walk(folder)) {
            for (Path file : files.sorted(Comparator.reverseOrder()).toList()) {
                Files.delete(file);
            }
        }
    }
}
