package org.seamwatch.ops;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seamwatch.fixtures.broker.Brokers;
import org.seamwatch.fixtures.broker.KafkaBroker;
import org.seamwatch.fixtures.broker.TopicTool;

/** Runs the service in a JVM of its own, as the launch script does. */
class RunCommandTest {

    @Test
    void shouldMakeItsTopicsAndEndCleanlyWhenStopped(@TempDir Path folder) throws Exception {
        try (KafkaBroker broker = Brokers.embedded();
                TopicTool topics = TopicTool.of(broker.bootstrapServers())) {
            PlanFiles files = new PlanFiles(folder);
            files.plan("kafka: { bootstrap.servers: \"" + broker.bootstrapServers() + "\", state.dir: \""
                    + folder.resolve("state") + "\" }\n" + PlanFiles.PLAN);
            Process service = start(folder, files.plan());
            try {
                BufferedReader out =
                        new BufferedReader(new InputStreamReader(service.getInputStream(), StandardCharsets.UTF_8));
                assertThat(out.readLine())
                        .isEqualTo("Seamwatch runs as seamwatch at " + broker.bootstrapServers() + "; Ctrl-C ends it");
                assertThat(topics.topics())
                        .contains("seamwatch.case-reports", "seamwatch.alarm-responses", "seamwatch.alarms");
                // Asks it to end as the system does (SIGTERM).
                service.toHandle().destroy();
                assertThat(out.readLine()).isEqualTo("Seamwatch has stopped");
                assertThat(service.waitFor(60, TimeUnit.SECONDS)).isTrue();
                assertThat(service.exitValue()).isZero();
            } finally {
                service.destroyForcibly();
            }
        }
    }

    private static Process start(Path folder, Path plan) throws IOException {
        return new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-cp",
                        System.getProperty("java.class.path"),
                        Seamwatch.class.getName(),
                        "run",
                        "--plan",
                        plan.toString())
                .redirectError(folder.resolve("err.txt").toFile())
                .start();
    }

    @Test
    void shouldSayThatNoBrokerAnswers(@TempDir Path folder) {
        PlanFiles files = new PlanFiles(folder);
        files.plan("kafka: { bootstrap.servers: \"localhost:1\", default.api.timeout.ms: \"2000\","
                + " request.timeout.ms: \"1000\" }\n" + PlanFiles.PLAN);
        Run run = Run.of("run", "--plan", files.plan());
        assertThat(run.code()).isNotZero();
        assertThat(run.err()).contains("localhost:1").doesNotContain("Exception");
    }
}
