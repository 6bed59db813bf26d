package org.seamwatch.processors.evidence;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.Deque;
import java.util.List;
import org.seamwatch.processors.spatial.Shares;
import org.seamwatch.processors.spatial.Subset;
import org.seamwatch.processors.spatial.Weights;
import org.seamwatch.processors.watch.Ground;
import org.seamwatch.schemas.geography.Geography;
import org.seamwatch.schemas.geography.Region;
import org.seamwatch.schemas.record.Cluster;
import org.seamwatch.schemas.record.ClusterRegion;

/**
 * Contiguous sets of regions that are high together. A region is high where its cases exceed what its usual share of the
 * total would be by at least one standard deviation on the square-root scale, r = 2(sqrt(y + 3/8) - sqrt(E + 3/8))
 * (Anscombe 1948); high neighbours join. Sets are ranked by the same r of their summed cases. A description, not a test.
 */
final class ClusterFinder {

    private static final double HIGH = 1;
    private static final double WORTH_NAMING = 2;
    private static final int MOST_CLUSTERS = 5;
    private static final int MOST_REGIONS = 8;

    private final Geography geography;
    private final Weights weights;
    private final Subset connected;
    private final double[] cases;
    private final double[] expected;
    private final double[] excess;

    ClusterFinder(Geography geography, Ground ground, double[] allCases, double[] history) {
        this.geography = geography;
        this.connected = ground.weights().connected();
        this.weights = connected.weights();
        this.cases = connected.pick(allCases);
        double total = 0;
        for (double y : cases) {
            total += y;
        }
        double[] people = ground.populations();
        this.expected = Shares.expected(total, connected.pick(history), people == null ? null : connected.pick(people));
        this.excess = new double[cases.length];
        for (int i = 0; i < excess.length; i++) {
            excess[i] = residual(cases[i], expected[i]);
        }
    }

    private record Found(List<Integer> members, double cases, double expected) {

        double strength() {
            return residual(cases, expected);
        }
    }

    private static double residual(double y, double e) {
        return 2 * (StrictMath.sqrt(y + 0.375) - StrictMath.sqrt(e + 0.375));
    }

    /** The strongest clusters, strongest first. */
    List<Cluster> clusters() {
        List<Found> found = new ArrayList<>();
        boolean[] seen = new boolean[cases.length];
        for (int i = 0; i < seen.length; i++) {
            if (!seen[i] && excess[i] >= HIGH) {
                found.add(grow(i, seen));
            }
        }
        return found.stream()
                .filter(f -> f.strength() >= WORTH_NAMING)
                .sorted(Comparator.comparingDouble(Found::strength).reversed())
                .limit(MOST_CLUSTERS)
                .map(this::cluster)
                .toList();
    }

    private Found grow(int seed, boolean[] seen) {
        List<Integer> members = new ArrayList<>();
        Deque<Integer> edge = new ArrayDeque<>(List.of(seed));
        seen[seed] = true;
        double y = 0;
        double e = 0;
        while (!edge.isEmpty()) {
            int i = edge.remove();
            members.add(i);
            y += cases[i];
            e += expected[i];
            for (int k = weights.begin(i); k < weights.end(i); k++) {
                int j = weights.column(k);
                if (!seen[j] && excess[j] >= HIGH) {
                    seen[j] = true;
                    edge.add(j);
                }
            }
        }
        return new Found(members, y, e);
    }

    private Cluster cluster(Found found) {
        List<ClusterRegion> regions = found.members().stream()
                .sorted(Comparator.<Integer>comparingDouble(i -> excess[i])
                        .reversed()
                        .thenComparing(Comparator.naturalOrder()))
                .limit(MOST_REGIONS)
                .map(this::region)
                .toList();
        return new Cluster(
                (long) found.cases(),
                Rounding.hundredths(found.expected()),
                found.members().size(),
                regions);
    }

    private ClusterRegion region(int i) {
        Region region = geography.regions().get(connected.index(i));
        double near = 0;
        double nearExpected = 0;
        for (int k = weights.begin(i); k < weights.end(i); k++) {
            near += cases[weights.column(k)];
            nearExpected += expected[weights.column(k)];
        }
        Double people = region.population();
        return new ClusterRegion(
                region.id(),
                Wording.cut(region.name()),
                (long) cases[i],
                Rounding.hundredths(expected[i]),
                (long) near,
                Rounding.hundredths(nearExpected),
                people == null ? null : Rounding.hundredths(cases[i] / people * 100_000),
                people == null ? null : geography.plan().populationYear());
    }
}
