package org.seamwatch.schemas.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seamwatch.schemas.InputException;

class SeriesPlanReaderTest {

    private static final String SMALLEST = """
            geographies:
              - { file: northmarch.geojson, id: northmarch }
            series:
              - geography: northmarch
                conditions: [ influenza ]
            """;

    private final Path folder;

    SeriesPlanReaderTest(@TempDir Path folder) {
        this.folder = folder;
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "edge; edge",
                "corner; corner",
                "{ nearest: 3 }; nearest 3",
                "{ within: 40km }; within 40.0 km",
                "{ within: 2.5 km }; within 2.5 km"
            })
    void shouldReadEveryContiguity(String written, String words) {
        assertThat(read(SMALLEST + "    contiguity: " + written + "\n")
                        .series()
                        .get(0)
                        .contiguity()
                        .words())
                .isEqualTo(words);
    }

    /** What is added to the smallest plan's series, on line 6, and the message behind the name of the file. */
    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "measure: ebrate; 'series[0].measure: unknown measure \"ebrate\", known: count, rate, eb-rate, share-residual; did you mean \"eb-rate\"?'",
                "closeafter: 1d; 'series[0].closeafter: unknown key; did you mean \"closeAfter\"?'",
                "history: x; 'series[0].history: unknown key, known: geography, conditions, from, dayOf, closeAfter, reviseFor, windowDays, statistics, measure, permutations, contiguity, weights, thinBelow, share, learning, charts, holidays'",
                "learning: { history: f }; series[0].learning.history: unknown key, known: warmUpDays",
                "geography: northmarch; 'series[0].geography: must be there once, is on line 4 already'",
                "closeAfter: 1; series[0].closeAfter must be whole days like 28d, was \"1\"",
                "closeAfter: 366d; series[0].closeAfter must be in 0 to 365, was 366d",
                "reviseFor: 1.5d; series[0].reviseFor must be whole days like 28d, was \"1.5d\"",
                "windowDays: 0; series[0].windowDays must be in 1 to 90, was 0",
                "windowDays: seven; series[0].windowDays must be a whole number, was \"seven\"",
                "permutations: 100000; series[0].permutations must be in 0 to 99999, was 100000",
                "share: 0; series[0].share must be above 0, was 0",
                "share: .nan; series[0].share must be a number, was \".nan\"",
                "from: 2024-02-30; series[0].from must be a date like 2024-01-06, was \"2024-02-30\"",
                "dayOf: reported; 'series[0].dayOf: unknown date \"reported\", known: report, event; did you mean \"report\"?'",
                "weights: raw; 'series[0].weights: unknown weights \"raw\", known: binary, row; did you mean \"row\"?'",
                "statistics: []; series[0].statistics must have at least one item, was empty",
                "statistics: [ morans ]; 'series[0].statistics[0]: unknown statistic \"morans\", known: moran; did you mean \"moran\"?'",
                "statistics: [ moran, moran ]; 'series[0].statistics[1] must be there once, is \"moran\" again'",
                "statistics: moran; series[0].statistics must be a list, was \"moran\"",
                "contiguity: rook; 'series[0].contiguity: unknown contiguity \"rook\", known: edge, corner'",
                "contiguity: { nearest: 0 }; series[0].contiguity.nearest must be in 1 to 1000, was 0",
                "contiguity: { within: 40 }; series[0].contiguity.within must be a distance like 40km, was \"40\"",
                "contiguity: { within: 0km }; 'series[0].contiguity.within must be above 0km, at most 20000km, was 0km'",
                "contiguity: {}; 'series[0].contiguity must be edge, corner, { nearest: 5 } or { within: 40km }, has 0 rules'",
                "charts: { moran: [ { ewma: { weight: 1.5 } } ] }; 'series[0].charts.moran[0].ewma.weight must be in (0, 1], was 1.5'",
                "charts: { moran: [ { ewma: { order: 4 } } ] }; series[0].charts.moran[0].ewma.order must be in 0 to 3, was 4",
                "charts: { moran: [ { ewma: { sides: lower } } ] }; 'series[0].charts.moran[0].ewma.sides: unknown sides \"lower\", known: upper, both'",
                "charts: { moran: [ { ewma: }, { individuals: { order: 0 } } ] }; 'series[0].charts.moran[1] must have the order of the other charts of moran, 1, was 0'",
                "charts: { moran: [ { ewma: }, { ewma: { weight: 0.1 } } ] }; 'series[0].charts.moran[1] must be another chart, is \"ewma\" again'",
                "charts: { moran: [ ewma ] }; series[0].charts.moran[0] must have keys, was \"ewma\"",
                "charts: { moran: [] }; series[0].charts.moran must have at least one item, was empty",
                "charts: { moran: [ { cusum: {} } ] }; 'series[0].charts.moran[0].cusum: unknown key, known: individuals, ewma'",
                "holidays: [ easter ]; series[0].holidays[0] must be a date like 2024-01-06, was \"easter\"",
                "holidays: [ { regions: a } ]; 'series[0].holidays[0].day: must be there, was missing'",
                "learning: 28d; series[0].learning must have keys, was \"28d\"",
                "learning: { warmUpDays: 4 }; series[0].learning.warmUpDays must be in 5 to 3650, was 4",
            })
    void shouldNameLineKeyAndValueOfASeries(String line, String message) {
        assertThatThrownBy(() -> read(SMALLEST + "    " + line + "\n"))
                .isInstanceOf(InputException.class)
                .hasMessage(file() + ":6: " + message);
    }

    private Plan read(String text) {
        try {
            Files.writeString(file(), text);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return PlanReader.read(file());
    }

    private Path file() {
        return folder.resolve("plan.yaml");
    }
}
