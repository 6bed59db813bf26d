package org.seamwatch.ops.bench;

import java.io.IOException;
import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Stream;
import org.seamwatch.fixtures.broker.TopicTool;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.topology.service.StreamsSettings;

/** Runs the two jobs in turn, each time from an empty state under a new application id. */
final class Contest {

    static final String BARE = "bare";
    static final String FLOW = "flow";

    private final BenchPlan plans;
    private final BenchLog log;
    private final TopicTool tool;
    private final Stopwatch stopwatch;
    private final PrintStream say;
    private final Map<String, InternalTopics> internal = new HashMap<>();
    private int runs;

    Contest(BenchPlan plans, BenchLog log, TopicTool tool, Stopwatch stopwatch, PrintStream say) {
        this.plans = plans;
        this.log = log;
        this.tool = tool;
        this.stopwatch = stopwatch;
        this.say = say;
    }

    /** All runs of one cache size that count, in their order: bare, flow, bare, flow ... */
    List<Measured> run(BenchOptions options, long cacheBytes) throws InterruptedException {
        List<String> jobs = options.only() == null ? List.of(BARE, FLOW) : List.of(options.only());
        List<Measured> counted = new ArrayList<>();
        for (int round = -options.warmUps(); round < options.runs(); round++) {
            for (String job : jobs) {
                Measured run = run(job, cacheBytes);
                say.println(String.format(
                        Locale.ROOT,
                        "%s, cache %d MB: %,.0f reports/s (%.2f s, stream thread %.2f s)%s",
                        job,
                        cacheBytes >> 20,
                        run.perSecond(log.reports()),
                        run.seconds(),
                        run.cpuSeconds(),
                        round < 0 ? ", warm-up" : ""));
                if (round >= 0) {
                    counted.add(run);
                }
            }
        }
        return counted;
    }

    private Measured run(String name, long cacheBytes) throws InterruptedException {
        String application = "bench-" + name + "-" + ++runs;
        Plan plan = plans.plan(application, cacheBytes);
        InternalTopics topics = internal.computeIfAbsent(name, n -> new InternalTopics(tool));
        topics.make(application);
        try (Job job = job(name, plan)) {
            Measured run = stopwatch.time(name, application, cacheBytes, job);
            job.check();
            return run;
        } finally {
            topics.learn(application);
            clear(application);
        }
    }

    private Job job(String name, Plan plan) {
        if (name.equals(FLOW)) {
            return new FlowJob(plans.watch(plan), log.records());
        }
        return new BareJob(plan.topics().prefix() + Topics.CASE_REPORTS, StreamsSettings.of(plan), log.countable());
    }

    /** Removes a run's state. */
    private void clear(String application) {
        Path state = plans.state(application);
        try (Stream<Path> files = Files.walk(state)) {
            for (Path file : files.sorted(Comparator.reverseOrder()).toList()) {
                Files.delete(file);
            }
        } catch (IOException e) {
            throw new UncheckedIOException("cannot delete the state in " + state, e);
        }
    }
}
