package org.seamwatch.schemas.record;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class ClockRecordTest {

    @Test
    void shouldKnowItsOwn() {
        assertThat(ClockRecord.is(ClockRecord.key(), ClockRecord.value())).isTrue();
        assertThat(new String(ClockRecord.key(), java.nio.charset.StandardCharsets.UTF_8))
                .isEqualTo("clock");
        assertThat(new String(ClockRecord.value(), java.nio.charset.StandardCharsets.UTF_8))
                .isEqualTo("{\"clock\": true}");
    }

    @ParameterizedTest
    @ValueSource(strings = {"{\"clock\":true}", " { \"clock\"\n:\ttrue\r}  "})
    void shouldNotMindWhiteSpace(String value) {
        assertThat(ClockRecord.is(ClockRecord.key(), Reports.utf8(value))).isTrue();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "{}",
                "{\"clock\":true",
                "{\"clock\":true}x",
                "{\"clock\":false}",
                "{\"clock\":1}",
                "{\"clock\":true,\"x\":1}",
                "{\"clo ck\":true}",
                "{\"clock\":tr ue}"
            })
    void shouldTakeNothingElse(String value) {
        assertThat(ClockRecord.is(ClockRecord.key(), Reports.utf8(value))).isFalse();
    }

    @Test
    void shouldWantItsKey() {
        assertThat(ClockRecord.is(null, ClockRecord.value())).isFalse();
        assertThat(ClockRecord.is(ClockRecord.key(), null)).isFalse();
        assertThat(ClockRecord.is(Reports.utf8("clocks"), ClockRecord.value())).isFalse();
    }

    @Test
    void shouldNotBeChangedThroughItsCopies() {
        ClockRecord.key()[0] = 'x';
        ClockRecord.value()[0] = 'x';
        assertThat(ClockRecord.is(ClockRecord.key(), ClockRecord.value())).isTrue();
    }
}
