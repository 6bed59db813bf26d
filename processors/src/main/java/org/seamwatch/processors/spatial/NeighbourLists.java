package org.seamwatch.processors.spatial;

import java.util.Arrays;

/** Collects links in any order and gives them as sorted, symmetric neighbour lists without repetition. */
final class NeighbourLists {

    private final int[][] lists;
    private final int[] sizes;

    NeighbourLists(int regions) {
        this.lists = new int[regions][8];
        this.sizes = new int[regions];
    }

    /** Makes two regions each other's neighbour. */
    void link(int i, int j) {
        append(i, j);
        append(j, i);
    }

    private void append(int i, int j) {
        if (sizes[i] == lists[i].length) {
            lists[i] = Arrays.copyOf(lists[i], 2 * sizes[i]);
        }
        lists[i][sizes[i]++] = j;
    }

    int[][] toArrays() {
        int[][] result = new int[lists.length][];
        for (int i = 0; i < result.length; i++) {
            int[] list = Arrays.copyOf(lists[i], sizes[i]);
            result[i] = Arrays.stream(list).sorted().distinct().toArray();
        }
        return result;
    }
}
