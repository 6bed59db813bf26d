package org.seamwatch.ops.bench;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.apache.kafka.streams.StreamsConfig;
import org.seamwatch.fixtures.scenario.Scenario;
import org.seamwatch.fixtures.scenario.ScenarioWriter;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.geography.Geography;
import org.seamwatch.schemas.geography.GeographyReader;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.schemas.plan.PlanReader;
import org.seamwatch.schemas.plan.RunPlan;
import org.seamwatch.schemas.plan.TopicsPlan;

/** The plan of the scenario, with few partitions and one thread, and an application id and state of its own for each run. */
final class BenchPlan {

    private static final int THREADS = 1;

    private final Plan plan;
    private final List<Geography> geographies;
    private final Path states;

    private BenchPlan(Plan plan, List<Geography> geographies, Path states) {
        this.plan = plan;
        this.geographies = geographies;
        this.states = states;
    }

    /** The plan against a broker; its files and the state of runs go into a folder. */
    static BenchPlan in(Path folder, Scenario scenario, String bootstrap) throws IOException {
        Files.write(
                folder.resolve(ScenarioWriter.GEOGRAPHY), scenario.territory().geoJson());
        Path file = Files.writeString(folder.resolve(ScenarioWriter.PLAN), ScenarioWriter.plan());
        Plan read = PlanReader.read(file);
        TopicsPlan topics = new TopicsPlan(
                "bench.",
                BenchOptions.PARTITIONS,
                BenchOptions.PARTITIONS,
                1,
                read.topics().rejectedRetention());
        Map<String, String> kafka = new HashMap<>(read.kafka());
        kafka.put("bootstrap.servers", bootstrap);
        RunPlan run = read.run();
        Plan plan = new Plan(
                read.file(),
                kafka,
                new RunPlan(THREADS, run.standbys()),
                topics,
                read.geographies(),
                read.deskFalseAlarmsPerYear(),
                read.series());
        return new BenchPlan(
                plan, plan.geographies().stream().map(GeographyReader::read).toList(), folder);
    }

    Plan plan() {
        return plan;
    }

    /** The folder that a run keeps its state in. */
    Path state(String application) {
        return states.resolve(application);
    }

    /** The plan for one run. */
    Plan plan(String application, long cacheBytes) {
        Map<String, String> kafka = new HashMap<>(plan.kafka());
        kafka.put(StreamsConfig.APPLICATION_ID_CONFIG, application);
        kafka.put(StreamsConfig.STATE_DIR_CONFIG, state(application).toString());
        kafka.put(StreamsConfig.STATESTORE_CACHE_MAX_BYTES_CONFIG, Long.toString(cacheBytes));
        return new Plan(
                plan.file(),
                kafka,
                plan.run(),
                plan.topics(),
                plan.geographies(),
                plan.deskFalseAlarmsPerYear(),
                plan.series());
    }

    Watch watch(Plan runs) {
        return Watch.of(runs, geographies);
    }
}
