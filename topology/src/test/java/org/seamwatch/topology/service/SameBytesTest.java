package org.seamwatch.topology.service;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seamwatch.fixtures.broker.Brokers;
import org.seamwatch.fixtures.broker.EmbeddedBroker;
import org.seamwatch.fixtures.broker.TopicTool;
import org.seamwatch.fixtures.scenario.Scenario;
import org.seamwatch.fixtures.scenario.ScenarioOptions;
import org.seamwatch.topology.TestPlan;

class SameBytesTest {

    @Test
    void shouldRun(@TempDir Path folder) {
        List<LogLine> log = ScenarioLog.of(
                Scenario.of(ScenarioOptions.defaults().withDays(60).withScale(0.3)), 4);
        System.out.println("lines " + log.size());
        try (EmbeddedBroker broker = Brokers.embedded();
                TopicTool tool = TopicTool.of(broker.bootstrapServers())) {
            for (int threads : new int[] {1, 2}) {
                long t0 = System.currentTimeMillis();
                try (TopologyRun run = TopologyRun.of(
                                broker,
                                tool,
                                folder,
                                "one" + threads,
                                TestPlan.in(folder)
                                        .partitions(4)
                                        .seriesPartitions(2)
                                        .threads(threads))
                        .load(log)) {
                    long t1 = System.currentTimeMillis();
                    StreamsService s = run.start("a");
                    run.awaitEnd();
                    System.out.println("load " + (t1 - t0) + " run " + (System.currentTimeMillis() - t1));
                    s.accounting().forEach(System.out::println);
                    long t2 = System.currentTimeMillis();
                    run.stop(s);
                    System.out.println("close " + (System.currentTimeMillis() - t2));
                    Outputs out = run.outputs();
                    System.out.println(out.regionDays().lines().count() + " "
                            + out.seriesDays().lines().count() + " "
                            + out.alarms().lines().count() + " "
                            + out.rejected().lines().count());
                    System.out.println(out.seriesDays().lines().skip(30).findFirst());
                    System.out.println(out.rejected().lines().findFirst());
                    assertThat(out.seriesDays()).isNotEmpty();
                }
            }
            System.out.println(tool.topics());
        }
    }
}
