package org.seamwatch.ops;

import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.List;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.seamwatch.fixtures.scenario.Scenario;
import org.seamwatch.fixtures.scenario.ScenarioOptions;
import org.seamwatch.fixtures.scenario.ScenarioWriter;
import org.seamwatch.schemas.record.AccountingLine;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.topology.replay.ResultFiles;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** The whole of it in one process: an embedded broker, the made-up territory and its feed, and the live service. */
@Command(
        name = "demo",
        description = {
            "Runs the live service on an embedded Kafka broker, on the made-up feed of Northmarch.",
            "The history runs through at full speed, then the last 60 days play at one day",
            "every two seconds, then it stays up until Ctrl-C."
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
                "folder to keep plan, geography and planted outbreaks in, and with --once the",
                "input log and all results; by default nothing is kept"
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
        // The stop is closed last: a signal ends the process as soon as it is.
        try (DemoStop stop = new DemoStop(console)) {
            if (out != null) {
                ResultFiles.prepare(out);
                return demo(out, stop);
            }
            try (DemoState folder = DemoState.make("seamwatch-demo")) {
                return demo(folder.folder(), stop);
            }
        }
    }

    private int demo(Path folder, DemoStop stop) throws Exception {
        console.say("Northmarch is made up, and so is everything in it.");
        Scenario scenario = Scenario.of(ScenarioOptions.defaults().withSeed(seed));
        new ScenarioWriter(scenario).write(folder);
        Plans plans = Plans.read(folder.resolve(ScenarioWriter.PLAN));
        try (DemoRun run = DemoRun.start(console, scenario, plans, stop)) {
            try {
                if (once) {
                    run.everything();
                    results(run, scenario, folder);
                } else {
                    LocalDate playFrom = ScenarioOptions.LAST_DAY.minusDays(PLAYED_DAYS - 1L);
                    run.history(playFrom.atStartOfDay(ZoneOffset.UTC).toInstant());
                    run.play();
                    stop.allPlayed();
                    planted(scenario, run, run.results().alarms());
                    run.stayUp();
                }
            } catch (InterruptedException e) {
                console.say("The demo ends.");
                return stop.code();
            }
        }
        return Failures.DONE;
    }

    private void results(DemoRun run, Scenario scenario, Path folder) {
        DemoResults results = run.results();
        results.alarms().forEach(alarm -> console.say(AlarmText.of(alarm)));
        planted(scenario, run, results.alarms());
        console.say("");
        List<AccountingLine> accounts = run.accounts();
        if (out != null) {
            results.write(folder, accounts);
            console.say("Plan, geography, planted outbreaks, input log and results are in " + folder);
        }
    }

    private void planted(Scenario scenario, DemoRun run, List<AlarmChange> alarms) {
        PlantedText.of(scenario, run.falseAlarmsPerYear(), alarms).forEach(console::say);
    }
}
