package org.seamwatch.ops;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.PrintWriter;
import java.io.StringWriter;
import org.apache.kafka.common.KafkaException;
import org.apache.kafka.common.config.ConfigException;
import org.junit.jupiter.api.Test;
import org.seamwatch.schemas.InputException;

class FailuresTest {

    private final StringWriter err = new StringWriter();

    private int fail(boolean verbose, Exception e) {
        return new Failures(new PrintWriter(err), () -> verbose).failed(e);
    }

    @Test
    void shouldSayInOneLineWhatIsWrongWithTheInput() {
        assertThat(fail(false, new InputException("plan.yaml:3: two\nlines"))).isEqualTo(2);
        assertThat(err.toString().lines()).containsExactly("seamwatch: plan.yaml:3: two lines");
    }

    @Test
    void shouldSayHowToSeeWhereAnUnexpectedFailureCameFrom() {
        assertThat(fail(false, new IllegalStateException("it broke"))).isEqualTo(1);
        assertThat(err.toString().lines())
                .containsExactly("seamwatch: unexpected IllegalStateException: it broke (--verbose shows where)");
    }

    @Test
    void shouldShowWhereWhenAsked() {
        assertThat(fail(true, new IllegalStateException("it broke"))).isEqualTo(1);
        assertThat(err.toString().lines())
                .startsWith("seamwatch: unexpected IllegalStateException: it broke")
                .anyMatch(line -> line.contains("FailuresTest"));
    }

    @Test
    void shouldSayWhatKafkasClientsWrapUp() {
        Exception wrapped =
                new KafkaException("Failed to create new KafkaAdminClient", new ConfigException("bad value"));
        assertThat(fail(false, wrapped)).isEqualTo(2);
        assertThat(fail(false, new KafkaException("Failed", new IllegalStateException("it broke"))))
                .isEqualTo(1);
        assertThat(err.toString().lines()).containsExactly("seamwatch: kafka: bad value", "seamwatch: kafka: it broke");
    }

    @Test
    void shouldNotTakeAKnownFailureForTheUsersInput() {
        assertThat(fail(false, new CommandFailure("no broker answers", null))).isEqualTo(1);
        assertThat(err.toString().lines()).containsExactly("seamwatch: no broker answers");
    }

    @Test
    void shouldSayOfAnOptionWhatItMustBe() {
        Run run = Run.of("demo", "--seed", "x");
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.errLines())
                .containsExactly("seamwatch: --seed must be a whole number, was 'x' (see seamwatch demo --help)");
    }
}
