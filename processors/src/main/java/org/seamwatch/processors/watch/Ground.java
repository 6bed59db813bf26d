package org.seamwatch.processors.watch;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.locationtech.jts.geom.Geometry;
import org.seamwatch.processors.spatial.Contiguity;
import org.seamwatch.processors.spatial.Weights;
import org.seamwatch.schemas.geography.Geography;
import org.seamwatch.schemas.geography.Region;
import org.seamwatch.schemas.plan.ContiguityRule;
import org.seamwatch.schemas.plan.WeightStyle;

/** Contiguity and populations of a geography's regions, under one rule and style; shared by the series that use them. */
public final class Ground {

    private final Map<String, Integer> index = new HashMap<>();
    private final Weights weights;
    private final double @Nullable [] populations;

    private Ground(List<Region> regions, Weights weights) {
        for (Region region : regions) {
            index.put(region.id(), index.size());
        }
        this.weights = weights;
        this.populations = populations(regions);
    }

    static Ground of(Geography geography, ContiguityRule rule, WeightStyle style) {
        List<Geometry> shapes = geography.regions().stream().map(Region::shape).toList();
        double tolerance = geography.plan().tolerance();
        int[][] neighbours;
        if (rule instanceof ContiguityRule.Nearest nearest) {
            neighbours = Contiguity.nearest(shapes, nearest.count());
        } else if (rule instanceof ContiguityRule.Within within) {
            neighbours = Contiguity.within(shapes, within.kilometres());
        } else if (rule instanceof ContiguityRule.Corner) {
            neighbours = Contiguity.corner(shapes, tolerance);
        } else {
            neighbours = Contiguity.edge(shapes, tolerance);
        }
        Weights weights = style == WeightStyle.ROW ? Weights.rowStandardised(neighbours) : Weights.binary(neighbours);
        return new Ground(geography.regions(), weights);
    }

    private static double @Nullable [] populations(List<Region> regions) {
        double[] people = new double[regions.size()];
        for (int i = 0; i < people.length; i++) {
            Double population = regions.get(i).population();
            if (population == null) {
                return null;
            }
            people[i] = population;
        }
        return people;
    }

    /** Place of a region in the order of the geography, or -1. */
    public int index(String region) {
        return index.getOrDefault(region, -1);
    }

    /** Over all regions, those without neighbours included. */
    public Weights weights() {
        return weights;
    }

    /** People of each region in the order of the geography, or null. */
    public double @Nullable [] populations() {
        return populations == null ? null : populations.clone();
    }
}
