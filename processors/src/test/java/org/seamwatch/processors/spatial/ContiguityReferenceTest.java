package org.seamwatch.processors.spatial;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.io.ParseException;
import org.locationtech.jts.io.geojson.GeoJsonReader;
import org.seamwatch.fixtures.reference.ReferenceEntry;

/**
 * The entries of {@code reference-values/contiguity.json}: hand-made cases by the DE-9IM definitions of rook and queen
 * (OGC Simple Features; Cliff and Ord 1973).
 */
class ContiguityReferenceTest {

    /** In units of the squares' sides: small enough to change nothing about clean topology. */
    private static final double SMALL_TOLERANCE = 0.01;

    static Stream<ReferenceEntry> entries() {
        return Reference.entries("contiguity", entry -> true);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void shouldEqualReference(ReferenceEntry entry) throws ParseException {
        int[][] edge = Contiguity.edge(regions(entry), entry.tolerance());
        int[][] corner = Contiguity.corner(regions(entry), entry.tolerance());
        assertThat(edge).as(entry.source()).isDeepEqualTo(lists(entry, "rook_neighbours_1based"));
        assertThat(corner).isDeepEqualTo(lists(entry, "queen_neighbours_1based"));
        assertThat(Weights.binary(edge).links()).isEqualTo((int) entry.expected("rook_links_directed"));
        assertThat(Weights.binary(corner).links()).isEqualTo((int) entry.expected("queen_links_directed"));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void shouldEqualReferenceWithSmallTolerance(ReferenceEntry entry) throws ParseException {
        assertThat(Contiguity.edge(regions(entry), SMALL_TOLERANCE))
                .as(entry.source())
                .isDeepEqualTo(lists(entry, "rook_neighbours_1based"));
        assertThat(Contiguity.corner(regions(entry), SMALL_TOLERANCE))
                .isDeepEqualTo(lists(entry, "queen_neighbours_1based"));
    }

    @Test
    void shouldFindAllEntries() {
        assertThat(entries()).hasSize(5);
    }

    private static List<Geometry> regions(ReferenceEntry entry) throws ParseException {
        List<Geometry> regions = new ArrayList<>();
        for (JsonNode polygon : entry.input().path("polygons")) {
            regions.add(new GeoJsonReader().read(polygon.toString()));
        }
        return regions;
    }

    private static int[][] lists(ReferenceEntry entry, String field) {
        JsonNode lists = entry.expected().path(field);
        int[][] result = new int[lists.size()][];
        for (int i = 0; i < result.length; i++) {
            result[i] = new int[lists.get(i).size()];
            for (int k = 0; k < result[i].length; k++) {
                result[i][k] = lists.get(i).get(k).asInt() - 1;
            }
        }
        return result;
    }
}
