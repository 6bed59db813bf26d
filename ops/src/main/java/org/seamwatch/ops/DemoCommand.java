package org.seamwatch.ops;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.concurrent.Callable;
import org.apache.kafka.common.errors.InterruptException;
import org.jspecify.annotations.Nullable;
import org.seamwatch.fixtures.scenario.Scenario;
import org.seamwatch.fixtures.scenario.ScenarioOptions;
import org.seamwatch.fixtures.scenario.ScenarioWriter;
import org.seamwatch.topology.replay.ResultFiles;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** The whole of it in one process: an embedded broker, the made-up territory and its feed, and the live service. */
@Command(
        name = "demo",
        description = {
            "Runs the live service on an embedded Kafka broker, on the made-up feed of Northmarch.",
            "The history runs through at full speed, then the last 60 days play at one day every",
            "two seconds, then it stays up until Ctrl-C."
        })
final class DemoCommand implements Callable<Integer> {

    private static final int PLAYED_DAYS = 60;

    private final Console console;

    @Option(
            names = "--once",
            description = "run everything through at full speed, compare with what was planted, and exit")
    private boolean once;

    @Option(
            names = "--out",
            paramLabel = "DIR",
            description = {
                "folder for plan, geography, planted outbreaks, input log and results;",
                "by default a temporary one, results only with --once"
            })
    private @Nullable Path out;

    @Option(
            names = "--seed",
            paramLabel = "N",
            defaultValue = "1",
            description = "another seed, another territory and feed (default: ${DEFAULT-VALUE})")
    private long seed;

    DemoCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws Exception {
        Path folder = folder();
        console.say("Northmarch is made up, and so is everything in it.");
        Scenario scenario = Scenario.of(ScenarioOptions.defaults().withSeed(seed));
        new ScenarioWriter(scenario).write(folder);
        Plans plans = Plans.read(folder.resolve(ScenarioWriter.PLAN));
        try (DemoStop stop = new DemoStop(console, Thread.currentThread());
                DemoRun run = DemoRun.start(console, scenario, plans)) {
            try {
                if (once) {
                    run.everything();
                    results(run, scenario, folder);
                } else {
                    LocalDate playFrom = ScenarioOptions.LAST_DAY.minusDays(PLAYED_DAYS - 1L);
                    run.history(playFrom.atStartOfDay(ZoneOffset.UTC).toInstant());
                    run.play();
                    stop.allPlayed();
                    run.stayUp();
                }
            } catch (InterruptedException | InterruptException e) {
                boolean unused = Thread.interrupted();
                console.say("The demo ends.");
                return stop.code();
            }
        }
        return Failures.DONE;
    }

    private Path folder() {
        if (out != null) {
            ResultFiles.prepare(out);
            return out;
        }
        try {
            return Files.createTempDirectory("seamwatch-demo");
        } catch (IOException e) {
            throw new UncheckedIOException("no temporary folder can be made", e);
        }
    }

    private void results(DemoRun run, Scenario scenario, Path folder) {
        DemoResults results = run.results();
        results.alarms().forEach(alarm -> console.say(AlarmText.of(alarm)));
        PlantedText.of(scenario, results.alarms()).forEach(console::say);
        results.write(folder, run.accounts());
        console.say("");
        console.say("Plan, geography, planted outbreaks, input log and results are in " + folder);
    }
}
