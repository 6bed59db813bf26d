package org.seamwatch.ops;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.BufferedReader;
import java.io.File;
import java.io.IOException;
import java.io.InputStreamReader;
import java.net.InetAddress;
import java.net.ServerSocket;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.concurrent.TimeUnit;
import java.util.stream.Collectors;
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
                assertThat(said(out.readLine()))
                        .isEqualTo("Seamwatch runs as seamwatch at " + broker.bootstrapServers() + "; Ctrl-C ends it");
                assertThat(topics.topics())
                        .contains("seamwatch.case-reports", "seamwatch.alarm-responses", "seamwatch.alarms");
                assertThat(said(out.readLine())).isEqualTo("running");
                Run second = Run.of("run", "--plan", files.plan());
                assertThat(second.code()).isEqualTo(2);
                assertThat(second.errLines())
                        .containsExactly("seamwatch: " + files.plan() + ": kafka.state.dir: the state folder "
                                + folder.resolve("state")
                                + " is in use by another process; for a second instance on one machine set"
                                + " kafka: { state.dir: ... } to another folder");
                // Asks it to end as the system does (SIGTERM).
                service.toHandle().destroy();
                assertThat(said(out.readLine())).isEqualTo("stopping");
                assertThat(said(out.readLine())).isEqualTo("Seamwatch has stopped");
                assertThat(service.waitFor(60, TimeUnit.SECONDS)).isTrue();
                assertThat(service.exitValue()).isZero();
            } finally {
                service.destroyForcibly();
            }
        }
    }

    /** A line without its time. */
    private static String said(String line) {
        assertThat(line).matches("\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d:\\d\\dZ  .*");
        return line.substring("2024-03-01T10:00:00Z  ".length());
    }

    @Test
    void shouldSayAfterAKillThatStateIsRebuiltAndNothingElse(@TempDir Path folder) throws Exception {
        try (KafkaBroker broker = Brokers.embedded()) {
            PlanFiles files = new PlanFiles(folder);
            files.plan("kafka: { bootstrap.servers: \"" + broker.bootstrapServers() + "\", state.dir: \""
                    + folder.resolve("state") + "\" }\n" + PlanFiles.PLAN);
            Process killed = start(folder, files.plan());
            lineWith(killed, "running");
            killed.destroyForcibly().waitFor();
            Process service = start(folder, files.plan());
            try {
                lineWith(service, "local state was not closed cleanly; it is rebuilt from Kafka");
                assertThat(lineWith(service, "running")).endsWith("running");
                service.toHandle().destroy();
                assertThat(service.waitFor(60, TimeUnit.SECONDS)).isTrue();
                assertThat(service.exitValue()).isZero();
                assertThat(folder.resolve("err.txt")).isEmptyFile();
            } finally {
                service.destroyForcibly();
            }
        }
    }

    /** The next line that ends so; fails where the output ends before. */
    private static String lineWith(Process service, String end) throws IOException {
        BufferedReader out = service.inputReader(StandardCharsets.UTF_8);
        for (String line = out.readLine(); line != null; line = out.readLine()) {
            if (line.endsWith(end)) {
                return line;
            }
        }
        throw new AssertionError("no line ends with " + end);
    }

    @Test
    void shouldEndCleanlyWhenStoppedWhileItWaitsForABroker(@TempDir Path folder) throws Exception {
        PlanFiles files = new PlanFiles(folder);
        try (ServerSocket deaf = new ServerSocket(0, 5, InetAddress.getLoopbackAddress())) {
            files.plan("kafka: { bootstrap.servers: \"localhost:" + deaf.getLocalPort() + "\" }\n" + PlanFiles.PLAN);
            Process service = start(folder, files.plan());
            try {
                // It connects: from here on it waits for an answer.
                deaf.accept();
                service.toHandle().destroy();
                assertThat(service.waitFor(60, TimeUnit.SECONDS)).isTrue();
                assertThat(service.exitValue()).isZero();
            } finally {
                service.destroyForcibly();
            }
        }
    }

    private static Process start(Path folder, Path plan) throws IOException {
        // Without what is there for tests only: it logs by other settings.
        String classes = Arrays.stream(System.getProperty("java.class.path").split(File.pathSeparator))
                .filter(entry -> !entry.endsWith("test-classes"))
                .collect(Collectors.joining(File.pathSeparator));
        return new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-cp",
                        classes,
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
        assertThat(run.code()).isEqualTo(1);
        assertThat(run.errLines())
                .containsExactly("seamwatch: " + files.plan() + ": kafka.bootstrap.servers: no broker answers at"
                        + " localhost:1 (listing topics)");
    }
}
