package org.seamwatch.processors.spatial;

import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/** Some of the regions, in their old order, with the weights between them; immutable. */
public final class Subset {

    /** Null when all regions are kept. */
    private final int @Nullable [] kept;

    private final Weights weights;

    Subset(int[] kept, Weights weights) {
        this.kept = kept;
        this.weights = weights;
    }

    private Subset(Weights weights) {
        this.kept = null;
        this.weights = weights;
    }

    static Subset all(Weights weights) {
        return new Subset(weights);
    }

    /** Number of regions kept. */
    public int size() {
        return weights.size();
    }

    /** The old index of the region that is now {@code i}. */
    public int index(int i) {
        return kept == null ? i : kept[i];
    }

    /** The old indices of the regions kept, ascending. */
    public int[] indices() {
        int[] result = new int[size()];
        Arrays.setAll(result, this::index);
        return result;
    }

    /** The weights between the regions kept. */
    public Weights weights() {
        return weights;
    }

    /**
     * The values of the regions kept, as a new array.
     *
     * @param values one value for each of the old regions
     */
    public double[] pick(double[] values) {
        if (kept == null) {
            return values.clone();
        }
        double[] result = new double[kept.length];
        for (int i = 0; i < result.length; i++) {
            result[i] = values[kept[i]];
        }
        return result;
    }
}
