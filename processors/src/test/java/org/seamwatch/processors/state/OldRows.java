package org.seamwatch.processors.state;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.HexFormat;

/** Rows as earlier builds wrote them, kept in {@code src/test/resources/rows}, one file of hexadecimal digits each. */
public final class OldRows {

    private static final int WIDTH = 96;

    private OldRows() {}

    /** The row kept under a name. */
    public static byte[] row(String name) {
        try (InputStream in = OldRows.class.getResourceAsStream("/rows/" + name + ".hex")) {
            if (in == null) {
                throw new AssertionError("no row is kept as " + name);
            }
            String hex = new String(in.readAllBytes(), StandardCharsets.US_ASCII);
            return HexFormat.of().parseHex(hex.replaceAll("\\s", ""));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Asserts that a row is what is kept under a name: as long as the version stands, its bytes do. */
    public static void assertKept(String name, byte[] row) {
        assertThat(HexFormat.of().formatHex(row))
                .as(() -> "row " + name + ": " + Arrays.toString(lines(row)))
                .isEqualTo(HexFormat.of().formatHex(row(name)));
    }

    private static String[] lines(byte[] row) {
        return HexFormat.of().formatHex(row).split("(?<=\\G.{" + WIDTH + "})");
    }
}
