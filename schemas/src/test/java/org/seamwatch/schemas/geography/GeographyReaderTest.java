package org.seamwatch.schemas.geography;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.ZoneId;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seamwatch.schemas.InputException;
import org.seamwatch.schemas.plan.GeographyPlan;

class GeographyReaderTest {

    private static final String SQUARE = "{\"type\":\"Polygon\",\"coordinates\":[[[0,0],[1,0],[1,1],[0,1],[0,0]]]}";
    private static final String A = feature("NM-1", "Alder", "100", SQUARE);
    private static final String B = feature(
            "NM-2",
            "Birch",
            "2.5",
            "{\"type\":\"MultiPolygon\",\"coordinates\":[[[[2,0,9],[3,0,9],[3,1,9],[2,0,9]]],"
                    + "[[[5,5],[9,5],[9,9],[5,9],[5,5]],[[6,6],[7,6],[7,7],[6,6]]]]}");

    private final Path folder;

    GeographyReaderTest(@TempDir Path folder) {
        this.folder = folder;
    }

    @Test
    void shouldReadRegionsSortedById() {
        Geography geography = read(collection(B, A));

        assertThat(geography.id()).isEqualTo("northmarch");
        assertThat(geography.regions()).extracting(Region::id).containsExactly("NM-1", "NM-2");
        assertThat(geography.regions()).extracting(Region::name).containsExactly("Alder", "Birch");
        assertThat(geography.regions()).extracting(Region::population).containsExactly(100.0, 2.5);
        assertThat(geography.regions().get(0).shape().getArea()).isEqualTo(1);
        assertThat(geography.regions().get(1).shape().getArea()).isEqualTo(0.5 + 16 - 0.5);
        assertThat(geography.sha256()).matches("[0-9a-f]{64}");
    }

    @Test
    void shouldReadPropertiesByTheNamesOfThePlan() {
        String other = "{\"features\":[{\"geometry\":" + SQUARE
                + ",\"properties\":{\"code\":7,\"title\":\"T\",\"people\":3},\"type\":\"Feature\"}],"
                + "\"bbox\":[0,0,1,1],\"type\":\"FeatureCollection\"}";
        write(other);
        Region region = GeographyReader.read(plan("code", "title", "people", "*"))
                .regions()
                .get(0);

        assertThat(region.id()).isEqualTo("7");
        assertThat(region.name()).isEqualTo("T");
        assertThat(region.population()).isEqualTo(3);
    }

    @Test
    void shouldHaveNoPopulationsWhereNoRegionHasOne() {
        assertThat(read(collection(A, B).replaceAll(",\"population\":[0-9.]+", ""))
                        .regions())
                .extracting(Region::population)
                .containsOnlyNulls();
    }

    @Test
    void shouldTakeOnlyTheRegionsOfThePlan() {
        String broken = feature("X-1", "Broken", "0", "null");
        write(collection(A, broken, B));

        assertThat(GeographyReader.read(plan("id", "name", null, "NM-2, NM-1*")).regions())
                .extracting(Region::id)
                .containsExactly("NM-1", "NM-2");
        assertThatThrownBy(() -> GeographyReader.read(plan("id", "name", null, "05*")))
                .isInstanceOf(InputException.class)
                .hasMessage(
                        file()
                                + ": regions \"05*\" of geography \"northmarch\" must match at least one region, match none of 3");
    }

    @Test
    void shouldHashWhatARegionSaysAndNothingElse() {
        String hash = read(collection(A, B)).sha256();

        assertThat(read(collection(B, A.replace(",", ", ").replace("\"name\"", "\"colour\":\"red\",\"name\"")))
                        .sha256())
                .isEqualTo(hash);
        assertThat(read(collection(A.replace("[[0,0],[1,0],[1,1],[0,1],[0,0]]", "[[1,1],[1,0],[0,0],[0,1],[1,1]]"), B))
                        .sha256())
                .isEqualTo(hash);
        assertThat(read(collection(A.replace("100", "101"), B)).sha256()).isNotEqualTo(hash);
        assertThat(read(collection(A.replace("Alder", "Alders"), B)).sha256()).isNotEqualTo(hash);
        assertThat(read(collection(A.replace("NM-1", "NM-3"), B)).sha256()).isNotEqualTo(hash);
        assertThat(read(collection(A.replace("[1,1]", "[1,1.000001]"), B)).sha256())
                .isNotEqualTo(hash);
    }

    /** A part of the second feature, what stands in its place, and the message behind file, line and feature. */
    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "'\"id\":\"NM-1\"'; '\"id\":\"NM-0\"'; ' \"NM-0\": id must be there once, is the id of features[0] on line 2 already'",
                "'\"id\":\"NM-1\",'; ''; ': properties must have id, was missing'",
                "'\"id\":\"NM-1\"'; '\"id\":null'; ': properties must have id, was null'",
                "'\"id\":\"NM-1\"'; '\"id\":1.5'; ': id must be a string, was a number'",
                "NM-1; NM/1; ': id must have no /, | or white space, was \"NM/1\"'",
                "NM-1; NM|1; ': id must have no /, | or white space, was \"NM|1\"'",
                "NM-1; NM 1; ': id must have no /, | or white space, was \"NM 1\"'",
                "NM-1; ''; ': id must have 1 to 200 characters, was \"\"'",
                "'\"name\":\"Alder\",'; ''; ' \"NM-1\": properties must have name, was missing'",
                "Alder; ''; ' \"NM-1\": name must be a text without control characters, was \"\"'",
                "'\"population\":100'; '\"population\":0'; ' \"NM-1\": population must be above 0, was 0'",
                "'\"population\":100'; '\"population\":-5'; ' \"NM-1\": population must be above 0, was -5'",
                "'\"population\":100'; '\"population\":\"many\"'; ' \"NM-1\": population must be a number, was \"many\"'",
                "'\"population\":100'; '\"population\":1e999'; ' \"NM-1\": population must be above 0, was Infinity'",
                "'\"population\":100'; '\"population\":null'; ' \"NM-1\": properties must have population on every region or on none, was missing'",
                "'\"Feature\"'; '\"feature\"'; ': type must be Feature'",
                "'\"properties\":{'; '\"properties\":null,\"p\":{'; ': properties must be an object, was null'",
                "'\"Polygon\"'; '\"Point\"'; ' \"NM-1\": geometry must be a Polygon or MultiPolygon, was Point'",
                "'\"type\":\"Polygon\",'; ''; ' \"NM-1\": geometry must be a Polygon or MultiPolygon, was without a type'",
                "'\"geometry\":{'; '\"geometry\":null,\"g\":{'; ' \"NM-1\": geometry must be a Polygon or MultiPolygon, was null'",
                "'[[0,0],[1,0],[1,1],[0,1],[0,0]]'; ''; ' \"NM-1\": geometry.coordinates must be an array with at least one ring, was empty'",
                "'[[0,0],[1,0],[1,1],[0,1],[0,0]]'; '7'; ' \"NM-1\": geometry.coordinates[0] must be an array with at least one point, was a number'",
                "',[0,0]]'; ']'; ' \"NM-1\": geometry.coordinates[0] must be closed, begins at 0.0 0.0 and ends at 0.0 1.0'",
                "',[1,1],[0,1],'; ','; ' \"NM-1\": geometry.coordinates[0] must have at least 4 points, was 3'",
                "'[1,1]'; '[1]'; ' \"NM-1\": geometry.coordinates[0][2] must be a longitude and a latitude'",
                "'[1,1]'; '[1,\"1\"]'; ' \"NM-1\": geometry.coordinates[0][2] must be a longitude and a latitude'",
                "'[1,1]'; '[500000,1]'; ' \"NM-1\": geometry.coordinates[0][2] must have a longitude in -180 to 180 (WGS84), was 500000'",
                "'[1,1]'; '[1,90.5]'; ' \"NM-1\": geometry.coordinates[0][2] must have a latitude in -90 to 90 (WGS84), was 90.5'",
                "'[1,0],[1,1]'; '[1,1],[1,0]'; ' \"NM-1\": geometry crosses itself at 0.5 0.5'",
                "'[1,1],[0,1]'; '[2,0],[3,0]'; ' \"NM-1\": geometry crosses itself at 2.0 0.0'",
                "'[0,0]]]'; '[0,0]],[[5,5],[6,5],[6,6],[5,5]]]'; ' \"NM-1\": geometry has a hole outside its outline at 5.0 5.0'",
            })
    void shouldNameFeatureRegionAndField(String part, String instead, String message) {
        String second = A.replace(part, instead == null ? "" : instead);
        String first = feature("NM-0", "Zero", "1", SQUARE);
        assertThatThrownBy(() -> read(collection(first, second)))
                .isInstanceOf(InputException.class)
                .hasMessage(file() + ":3: features[1]" + message);
    }

    @Test
    void shouldWantAPopulationEverywhereWhereThePlanNamesIt() {
        write(collection(A.replace("\"population\":100", "\"people\":1"), B));
        assertThatThrownBy(() -> GeographyReader.read(plan("id", "name", "people", "*")))
                .hasMessage(file() + ":3: features[1] \"NM-2\": properties must have people, was missing");
    }

    @Test
    void shouldSayWhatIsWrongWithTheFile() {
        assertThatThrownBy(() -> GeographyReader.read(plan("id", "name", null, "*")))
                .isInstanceOf(InputException.class)
                .hasMessage(file() + ": no such file");
        assertFile("", ": is empty, must be a FeatureCollection");
        assertFile("[]", ": must be a FeatureCollection");
        assertFile("{\"type\":\"Feature\"}", ": type must be FeatureCollection, was Feature");
        assertFile("{\"features\":[]}", ": type must be FeatureCollection, was missing");
        assertFile("{\"type\":\"FeatureCollection\"}", ": features must be an array");
        assertFile("{\"type\":\"FeatureCollection\",\"features\":{}}", ": features must be an array");
        assertFile(collection(), ": features must have at least one region, was empty");
        assertFile("{\"type\":\n oops", ":2: not JSON, breaks at column 2");
        assertFile(collection(A, B) + "{}", ":4: must be one FeatureCollection, has more behind it");
        assertFile(collection(A, "[1]"), ":3: features[1]: type must be Feature");
    }

    private void assertFile(String text, String message) {
        assertThatThrownBy(() -> read(text)).isInstanceOf(InputException.class).hasMessage(file() + message);
    }

    private static String feature(String id, String name, String population, String geometry) {
        return "{\"type\":\"Feature\",\"properties\":{\"id\":\"" + id + "\",\"name\":\"" + name + "\",\"population\":"
                + population + "},\"geometry\":" + geometry + "}";
    }

    private static String collection(String... features) {
        return "{\"type\":\"FeatureCollection\",\"features\":[\n" + String.join(",\n", features) + "\n]}";
    }

    private Geography read(String text) {
        write(text);
        return GeographyReader.read(plan("id", "name", null, "*"));
    }

    private GeographyPlan plan(String id, String name, @Nullable String population, String regions) {
        return new GeographyPlan(file(), "northmarch", ZoneId.of("UTC"), id, name, population, null, regions, 0);
    }

    private void write(String text) {
        try {
            Files.writeString(file(), text);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private Path file() {
        return folder.resolve("map.geojson");
    }
}
