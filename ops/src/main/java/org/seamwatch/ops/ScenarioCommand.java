package org.seamwatch.ops;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Locale;
import java.util.concurrent.Callable;
import org.seamwatch.fixtures.scenario.Outbreak;
import org.seamwatch.fixtures.scenario.Scenario;
import org.seamwatch.fixtures.scenario.ScenarioOptions;
import org.seamwatch.fixtures.scenario.ScenarioWriter;
import org.seamwatch.fixtures.territory.Territory;
import org.seamwatch.schemas.InputException;
import org.seamwatch.topology.replay.ResultFiles;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Writes a made-up territory, a plan and a feed with planted outbreaks. */
@Command(
        name = "scenario",
        description = "Writes a made-up territory, a plan, a feed of reports and the outbreaks planted in it.",
        footer = {"", "The same seed and sizes give the same bytes."})
final class ScenarioCommand implements Callable<Integer> {

    private final Console console;

    @Option(names = "--out", required = true, paramLabel = "DIR", description = "folder for the files")
    private Path out = Path.of("scenario");

    @Option(names = "--seed", required = true, paramLabel = "N", description = "seed of all that is random")
    private long seed;

    @Option(
            names = "--days",
            paramLabel = "N",
            defaultValue = "400",
            description = "length of the feed (default: ${DEFAULT-VALUE})")
    private int days;

    @Option(
            names = "--regions",
            paramLabel = "N",
            defaultValue = "" + Territory.NORTHMARCH_REGIONS,
            description = "number of districts (default: ${DEFAULT-VALUE})")
    private int regions;

    @Option(
            names = "--scale",
            paramLabel = "X",
            defaultValue = "1",
            description = "factor on all volumes (default: ${DEFAULT-VALUE})")
    private double scale;

    ScenarioCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() {
        ScenarioOptions options = options();
        ResultFiles.prepare(out);
        Scenario scenario = Scenario.of(options);
        try {
            new ScenarioWriter(scenario).write(out);
        } catch (IOException e) {
            throw new CommandFailure(out + ": the scenario cannot be written: " + e.getMessage(), e);
        }
        console.say(String.format(
                Locale.ROOT,
                "%,d records over %d days in %d districts, written to %s",
                scenario.records().size(),
                days,
                regions,
                out));
        for (Outbreak outbreak : scenario.outbreaks()) {
            console.say(String.format(
                    Locale.ROOT,
                    "  planted %s: %s, %,d cases, %s to %s, %d districts around %s",
                    outbreak.id(),
                    outbreak.condition(),
                    outbreak.cases(),
                    outbreak.start(),
                    outbreak.end(),
                    outbreak.regions().size(),
                    outbreak.centre()));
        }
        return Failures.DONE;
    }

    private ScenarioOptions options() {
        try {
            return new ScenarioOptions(seed, days, regions, scale);
        } catch (IllegalArgumentException e) {
            throw new InputException("--" + e.getMessage());
        }
    }
}
