package org.seamwatch.schemas.geography;

import java.util.List;
import org.seamwatch.schemas.plan.GeographyPlan;

/**
 * A set of regions watched as one.
 *
 * @param plan how the plan names it
 * @param regions its regions, sorted by id; at least one
 * @param sha256 hash of ids, names, populations and shapes of the regions, in hexadecimal digits
 */
public record Geography(GeographyPlan plan, List<Region> regions, String sha256) {

    public Geography {
        regions = List.copyOf(regions);
    }

    public String id() {
        return plan.id();
    }
}
