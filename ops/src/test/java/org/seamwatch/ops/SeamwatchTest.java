package org.seamwatch.ops;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seamwatch.schemas.ProductVersion;

class SeamwatchTest {

    @Test
    void shouldPrintItsVersion() {
        Run run = Run.of("--version");
        assertThat(run.code()).isZero();
        assertThat(run.out().strip()).isEqualTo("seamwatch " + ProductVersion.CURRENT);
        assertThat(run.err()).isEmpty();
    }

    @Test
    void shouldListItsCommands() {
        Run run = Run.of("--help");
        assertThat(run.code()).isZero();
        assertThat(run.out())
                .contains("run ", "check ", "replay ", "send ", "scenario ", "0     done", "2     the input is wrong");
    }

    @ParameterizedTest
    @ValueSource(strings = {"run", "check", "replay", "send", "scenario"})
    void shouldHelpWithEachCommand(String command) {
        Run run = Run.of(command, "--help");
        assertThat(run.code()).isZero();
        assertThat(run.err()).isEmpty();
        assertThat(run.out())
                .startsWith("Usage: seamwatch " + command)
                .contains("Options:", "Exit codes:", "--verbose");
    }

    @Test
    void shouldSuggestTheCommandThatWasMeant() {
        Run run = Run.of("chek");
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.errLines())
                .containsExactly("seamwatch: unmatched argument at index 0: 'chek'; did you mean check? (see seamwatch"
                        + " --help)");
    }

    @Test
    void shouldAskForACommand() {
        Run run = Run.of();
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.errLines()).containsExactly("seamwatch: a command must be given (see seamwatch --help)");
    }

    @Test
    void shouldNameAMissingOptionInOneLine() {
        Run run = Run.of("check");
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.errLines())
                .containsExactly("seamwatch: missing required option: '--plan=FILE' (see seamwatch check --help)");
    }

    @Test
    void shouldNameAnOptionThatDoesNotExist() {
        Run run = Run.of("check", "--plan", "plan.yaml", "--fast");
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.errLines()).containsExactly("seamwatch: unknown option: '--fast' (see seamwatch check --help)");
    }
}
