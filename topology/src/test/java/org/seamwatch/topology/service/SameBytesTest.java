package org.seamwatch.topology.service;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seamwatch.fixtures.broker.Brokers;
import org.seamwatch.fixtures.broker.EmbeddedBroker;
import org.seamwatch.fixtures.broker.TopicTool;
import org.seamwatch.fixtures.scenario.Scenario;
import org.seamwatch.fixtures.scenario.ScenarioOptions;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.topology.TestPlan;

/**
 * The same log gives the same bytes, however it is run: more threads, more instances, restarts with and without the
 * local state, other partitions of series. The plain steps over memory say what the bytes are.
 */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class SameBytesTest {

    private static final int PARTITIONS = 3;
    private static final ScenarioOptions OPTIONS =
            ScenarioOptions.defaults().withDays(75).withScale(0.7);

    private final EmbeddedBroker broker = Brokers.embedded();
    private final TopicTool tool = TopicTool.of(broker.bootstrapServers());
    private final List<LogLine> log;
    private final Outputs expected;

    SameBytesTest(@TempDir Path folder) {
        Watch watch = plan(folder, 1, 1).watch();
        List<LogLine> reports = ScenarioLog.of(Scenario.of(OPTIONS), PARTITIONS);
        log = Responses.in(reports, PlainRun.of(watch, reports).alarms(), PARTITIONS);
        expected = PlainRun.of(watch, log).outputs();
    }

    @AfterAll
    void close() {
        tool.close();
        broker.close();
    }

    private static TestPlan plan(Path folder, int threads, int seriesPartitions) {
        return TestPlan.in(folder)
                .falseAlarmsPerYear(80)
                .partitions(PARTITIONS)
                .threads(threads)
                .seriesPartitions(seriesPartitions);
    }

    private TopologyRun run(String name, Path folder, int threads, int seriesPartitions) {
        return TopologyRun.of(broker, tool, folder, name, plan(folder, threads, seriesPartitions));
    }

    @BeforeAll
    void shouldCompareSomethingOfEachKind() {
        assertThat(expected.seriesDays()).contains("\"status\":\"usable\"", "\"revision\":2");
        assertThat(expected.alarms())
                .contains("\"change\":\"raised\"", "\"change\":\"responded\"", "\"change\":\"ended\"");
        assertThat(expected.regionDays().lines()).hasSizeGreaterThan(1_000);
        assertThat(expected.rejected().lines()).hasSizeGreaterThan(40);
    }

    @ParameterizedTest(name = "{0} threads, {1} series partitions")
    @CsvSource({"1, 2", "2, 2", "4, 2", "2, 5"})
    void shouldNotDependOnThreadsAndSeriesPartitions(int threads, int seriesPartitions, @TempDir Path folder) {
        String name = "threads" + threads + "of" + seriesPartitions;
        try (TopologyRun run = run(name, folder, threads, seriesPartitions).load(log)) {
            run.start("a");
            assertThat(run.awaitEnd().outputs()).isEqualTo(expected);
        }
    }

    @Test
    void shouldNotDependOnASecondInstanceThatComesAndGoes(@TempDir Path folder) {
        try (TopologyRun run = run("instances", folder, 1, 2).load(firstHalf())) {
            run.start("a");
            StreamsService second = run.start("b");
            run.awaitRead(log.size() / 4);
            run.stop(second);
            run.load(secondHalf());
            run.awaitRead(log.size() / 2 + log.size() / 8);
            run.start("b");
            assertThat(run.awaitEnd().outputs()).isEqualTo(expected);
        }
    }

    @ParameterizedTest(name = "state kept: {0}")
    @CsvSource({"true", "false"})
    void shouldGoOnAfterARestart(boolean kept, @TempDir Path folder) {
        try (TopologyRun run = run("kept-" + kept, folder, 2, 2).load(firstHalf())) {
            StreamsService first = run.start("a");
            run.awaitRead(log.size() / 4);
            run.stop(first);
            run.load(secondHalf());
            // An instance of another name has a folder of its own, empty as after a wipe.
            run.start(kept ? "a" : "b");
            assertThat(run.awaitEnd().outputs()).isEqualTo(expected);
        }
    }

    private List<LogLine> firstHalf() {
        return log.subList(0, log.size() / 2);
    }

    private List<LogLine> secondHalf() {
        return log.subList(log.size() / 2, log.size());
    }
}
