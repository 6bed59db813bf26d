package org.seamwatch.ops;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import org.seamwatch.processors.spatial.Weights;

/**
 * How regions hang together.
 *
 * @param links pairs of neighbours
 * @param pieces groups of regions joined by links, those with neighbours only
 * @param isolated places of the regions without neighbours
 */
record Ties(int links, int pieces, List<Integer> isolated) {

    Ties {
        isolated = List.copyOf(isolated);
    }

    static Ties of(Weights weights) {
        boolean[] seen = new boolean[weights.size()];
        List<Integer> isolated = new ArrayList<>();
        int pieces = 0;
        for (int i = 0; i < weights.size(); i++) {
            if (weights.isolated(i)) {
                isolated.add(i);
            } else if (!seen[i]) {
                pieces++;
                reach(weights, i, seen);
            }
        }
        return new Ties(weights.links() / 2, pieces, isolated);
    }

    private static void reach(Weights weights, int from, boolean[] seen) {
        Deque<Integer> next = new ArrayDeque<>();
        seen[from] = true;
        next.add(from);
        while (!next.isEmpty()) {
            int i = next.remove();
            for (int k = weights.begin(i); k < weights.end(i); k++) {
                int j = weights.column(k);
                if (!seen[j]) {
                    seen[j] = true;
                    next.add(j);
                }
            }
        }
    }
}
