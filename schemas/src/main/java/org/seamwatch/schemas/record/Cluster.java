package org.seamwatch.schemas.record;

import java.util.List;

/**
 * A contiguous set of regions that are high together.
 *
 * @param cases cases of all its regions in the period
 * @param expected expected cases of all its regions in the period, from their usual shares
 * @param regionCount how many regions it has
 * @param regions its regions with the largest excess, at most eight
 */
public record Cluster(long cases, double expected, int regionCount, List<ClusterRegion> regions) {

    public Cluster {
        regions = List.copyOf(regions);
    }
}
