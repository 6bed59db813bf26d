package org.seamwatch.topology.service;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class OpenMarkTest {

    @Test
    void shouldTellAProcessThatWasKilledFromOneThatClosed(@TempDir Path folder) {
        OpenMark first = OpenMark.in(folder.resolve("state"), "app");
        assertThat(first.wasSet()).isFalse();
        first.set();
        OpenMark afterKill = OpenMark.in(folder.resolve("state"), "app");
        assertThat(afterKill.wasSet()).isTrue();
        afterKill.clear();
        assertThat(OpenMark.in(folder.resolve("state"), "app").wasSet())
                .as("one that never opened the state has not closed it")
                .isTrue();
        afterKill.set();
        afterKill.clear();
        assertThat(OpenMark.in(folder.resolve("state"), "app").wasSet()).isFalse();
    }
}
