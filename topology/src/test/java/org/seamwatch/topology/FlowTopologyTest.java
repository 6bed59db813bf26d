package org.seamwatch.topology;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Objects;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class FlowTopologyTest {

    @Test
    void shouldKeepItsDescription(@TempDir Path folder) throws IOException {
        String description =
                FlowTopology.of(TestPlan.in(folder).watch()).describe().toString();
        assertThat(description).isEqualToNormalizingNewlines(pinned());
    }

    private static String pinned() throws IOException {
        try (InputStream in = FlowTopologyTest.class.getResourceAsStream("topology.txt")) {
            return new String(Objects.requireNonNull(in, "topology.txt").readAllBytes(), StandardCharsets.UTF_8);
        }
    }
}
