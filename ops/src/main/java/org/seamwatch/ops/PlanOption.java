package org.seamwatch.ops;

import java.nio.file.Path;
import picocli.CommandLine.Option;

/** The plan, which most commands need. */
final class PlanOption {

    @Option(
            names = "--plan",
            required = true,
            paramLabel = "FILE",
            description = "the plan (YAML): what is watched, and how")
    private Path file = Path.of("plan.yaml");

    Path file() {
        return file;
    }

    /** Reads the plan and its geographies, and warns of what is odd in it. */
    Plans read(Console console) {
        Plans plans = Plans.read(file);
        plans.read().warnings().forEach(console::warn);
        return plans;
    }
}
