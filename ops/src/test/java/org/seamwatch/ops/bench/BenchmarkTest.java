package org.seamwatch.ops.bench;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

/** The benchmark runs; how fast is no matter here. */
class BenchmarkTest {

    @Test
    void shouldRunBothJobsToTheEndOfTheLogWithTheCacheOffAndOn() throws IOException, InterruptedException {
        ByteArrayOutputStream said = new ByteArrayOutputStream();
        String table = Benchmark.run(
                BenchOptions.parse("--quick", "--scale", "0.5"), new PrintStream(said, true, StandardCharsets.UTF_8));
        assertThat(table.lines().filter(line -> line.startsWith("| off |") || line.startsWith("| 16 MB |")))
                .satisfiesExactly(
                        line -> assertThat(line).startsWith("| off | bare |"),
                        line -> assertThat(line).startsWith("| off | flow |"),
                        line -> assertThat(line).startsWith("| 16 MB | bare |"),
                        line -> assertThat(line).startsWith("| 16 MB | flow |"));
        assertThat(said.toString(StandardCharsets.UTF_8)).contains("bare, cache 0 MB: ", "flow, cache 16 MB: ");
    }

    @Test
    void shouldNameAnOptionThatIsWrong() {
        assertThatThrownBy(() -> BenchOptions.parse("--fast")).hasMessage("unknown option --fast");
        assertThatThrownBy(() -> BenchOptions.parse("--runs")).hasMessage("--runs must be followed by a value");
        assertThatThrownBy(() -> BenchOptions.parse("--runs", "0"))
                .hasMessage("--runs must be at least 1 and --warm-ups at least 0, were 0 and 3");
        assertThatThrownBy(() -> BenchOptions.parse("--only", "both"))
                .hasMessage("--only must be bare or flow, was both");
    }

    @Test
    void shouldTakeTheMedian() {
        assertThat(Table.median(3, 1, 2)).isEqualTo(2);
        assertThat(Table.median(4, 1, 2, 3)).isEqualTo(2.5);
    }
}
