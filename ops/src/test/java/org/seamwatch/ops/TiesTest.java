package org.seamwatch.ops;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.seamwatch.processors.spatial.Weights;

class TiesTest {

    @Test
    void shouldTellPiecesFromIsolatedRegions() {
        int[][] neighbours = {{1, 2}, {0}, {0}, {}, {5}, {4}, {}};
        assertThat(Ties.of(Weights.binary(neighbours))).isEqualTo(new Ties(3, 2, List.of(3, 6)));
    }

    @Test
    void shouldFindNoPieceWhereAllAreIsolated() {
        assertThat(Ties.of(Weights.binary(new int[][] {{}, {}}))).isEqualTo(new Ties(0, 0, List.of(0, 1)));
    }
}
