package org.seamwatch.processors.spatial;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;

/** All arrangements of a few values (positions told apart, so n! of them). */
final class Permutations {

    private Permutations() {}

    static Stream<double[]> of(double[] values) {
        List<double[]> all = new ArrayList<>();
        extend(values.clone(), 0, all);
        return all.stream();
    }

    private static void extend(double[] values, int fixed, List<double[]> all) {
        if (fixed == values.length) {
            all.add(values.clone());
            return;
        }
        for (int k = fixed; k < values.length; k++) {
            swap(values, fixed, k);
            extend(values, fixed + 1, all);
            swap(values, fixed, k);
        }
    }

    private static void swap(double[] values, int a, int b) {
        double value = values[a];
        values[a] = values[b];
        values[b] = value;
    }
}
