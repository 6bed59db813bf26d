package org.seamwatch.ops;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.PrintWriter;
import java.io.StringWriter;
import org.junit.jupiter.api.Test;

class ProgressTest {

    private static final long SECOND = 1_000_000_000L;

    private final StringWriter err = new StringWriter();
    private long now = 5 * SECOND;

    private Progress progress(boolean terminal) {
        Console console = new Console(new PrintWriter(new StringWriter()), new PrintWriter(err), terminal);
        return new Progress(console, "replay", "records", 1000, () -> now);
    }

    /** Enough calls for the clock to be asked. */
    private static void tell(Progress progress, long count, long done) {
        for (int i = 0; i < 256; i++) {
            progress.at(count, done);
        }
    }

    @Test
    void shouldBeSilentWhereWorkIsShort() {
        try (Progress progress = progress(true)) {
            now += SECOND;
            tell(progress, 10, 500);
        }
        assertThat(err.toString()).isEmpty();
    }

    @Test
    void shouldPrintPlainLinesWithRatesWhereNobodyWatches() {
        try (Progress progress = progress(false)) {
            now += 4 * SECOND;
            tell(progress, 2000, 250);
            now += SECOND;
            tell(progress, 2500, 300);
            now += 10 * SECOND;
            tell(progress, 9000, 900);
            now += 5 * SECOND;
        }
        assertThat(err.toString().lines())
                .containsExactly(
                        "replay   25 %  2,000 records, 500 a second",
                        "replay   90 %  9,000 records, 600 a second",
                        "replay  done in 20.0 s: 9,000 records, 450 a second");
    }

    @Test
    void shouldDrawABarOnATerminalAndTakeItAway() {
        try (Progress progress = progress(true)) {
            now += 4 * SECOND;
            tell(progress, 2000, 250);
            assertThat(err.toString())
                    .isEqualTo("\r\u001b[Kreplay  [######..................]  25 %  2,000 records, 500 a second");
        }
        assertThat(err.toString())
                .endsWith("\r\u001b[Kreplay  done in 4.0 s: 2,000 records, 500 a second" + System.lineSeparator());
    }
}
