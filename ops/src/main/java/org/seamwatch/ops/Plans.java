package org.seamwatch.ops;

import java.nio.file.Path;
import java.util.List;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.geography.Geography;
import org.seamwatch.schemas.geography.GeographyReader;
import org.seamwatch.schemas.plan.PlanReader;
import org.seamwatch.schemas.plan.ReadPlan;

/**
 * A plan as commands use it.
 *
 * @param read the plan, with what only its reader knows
 * @param geographies those of the plan, in its order
 * @param watch the plan made ready
 */
record Plans(ReadPlan read, List<Geography> geographies, Watch watch) {

    Plans {
        geographies = List.copyOf(geographies);
    }

    /** Reads a plan and its geographies. */
    static Plans read(Path file) {
        ReadPlan read = PlanReader.readWithKeys(file);
        List<Geography> geographies =
                read.plan().geographies().stream().map(GeographyReader::read).toList();
        return new Plans(read, geographies, Watch.of(read.plan(), geographies));
    }
}
