package org.seamwatch.processors.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.flow.SeriesMessage;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.state.MemoryShelf;
import org.seamwatch.processors.watch.TestDesk;
import org.seamwatch.schemas.record.ClockRecord;
import org.seamwatch.schemas.record.Verdict;

class ResponseIntakeTest implements IntakeOutput {

    private static final String SERIES = "gridland/influenza";
    private static final String GOOD = "{\"alarm\":\"gridland/influenza/2024-02-03\",\"verdict\":\"outbreak\","
            + "\"by\":\"M. Holm\",\"at\":\"2024-02-05T10:00:00Z\",\"badge\":\"0815\"}";

    private final MemoryShelf accounts = new MemoryShelf();
    private final List<SeriesMessage> sent = new ArrayList<>();
    private final List<Rejection> rejected = new ArrayList<>();
    private final ResponseIntake intake =
            new ResponseIntake(TestDesk.small().watch(), 1, new InputSizes(6, 2), accounts, this);
    private long offset;

    private void take(String time, byte @Nullable [] key, byte @Nullable [] value) {
        intake.accept(new LogRecord(
                Topics.ALARM_RESPONSES, 1, offset++, Instant.parse(time).toEpochMilli(), key, value));
    }

    private void take(String key, String value) {
        take("2024-02-05T10:00:00Z", utf8(key), utf8(value));
    }

    private static byte[] utf8(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }

    private Account account() {
        byte[] row = accounts.get("alarm-responses|1");
        if (row == null) {
            throw new IllegalStateException("nothing was read");
        }
        return Account.from(row);
    }

    @Test
    void shouldForwardAResponseWithItsHourAndPlace() {
        take(SERIES, GOOD);

        long hour = Instant.parse("2024-02-05T10:00:00Z").getEpochSecond() / 3600;
        assertThat(sent.get(0))
                .isEqualTo(new SeriesMessage.Watermark(
                        "alarm-responses",
                        1,
                        hour - 1,
                        Instant.parse("2024-02-05T10:00:00Z").toEpochMilli(),
                        new InputSizes(6, 2)));
        SeriesMessage.Response response = (SeriesMessage.Response) sent.get(1);
        assertThat(List.of(response.series(), response.hour(), response.partition(), response.offset()))
                .containsExactly(SERIES, hour, 1, 0L);
        assertThat(response.response().verdict()).isEqualTo(Verdict.OUTBREAK);
        assertThat(sent.toString()).doesNotContain("0815");
        assertThat(account().accepted()).isEqualTo(1);
    }

    @Test
    void shouldTakeAResponseToAnAlarmItDoesNotKnow() {
        take(SERIES, GOOD.replace("2024-02-03", "1999-01-01"));

        assertThat(account().accepted()).isEqualTo(1);
    }

    @ParameterizedTest
    @CsvSource({
        "gridland/mumps, gridland/influenza/2024-02-03, key-mismatch",
        "gridland, gridland/influenza/2024-02-03, no-series-takes-it",
        "gridland/mumps, gridland/mumps/2024-02-03, no-series-takes-it",
    })
    void shouldRefuseAResponseThatBelongsToNoSeries(String key, String alarm, String reason) {
        take(key, GOOD.replace("gridland/influenza/2024-02-03", alarm));

        assertThat(rejected).extracting(r -> r.why().reason().code()).containsExactly(reason);
        assertThat(rejected).extracting(r -> r.why().field()).containsExactly("alarm");
    }

    @Test
    void shouldAccountForEveryRecord() {
        take(SERIES, GOOD);
        take(SERIES, "{");
        take("2024-02-05T10:00:00Z", null, utf8(GOOD));
        take("2024-02-05T10:00:00Z", utf8(SERIES), null);
        take("2024-02-05T11:00:00Z", ClockRecord.key(), ClockRecord.value());

        Account a = account();
        assertThat(List.of(a.read(), a.accepted(), a.rejected(), a.controls())).containsExactly(5L, 1L, 3L, 1L);
        assertThat(rejected)
                .extracting(r -> r.why().reason().code())
                .containsExactly("not-json", "null-key", "null-value");
    }

    @Override
    public void toSeries(String series, SeriesMessage message) {
        sent.add(message);
    }

    @Override
    public void toAll(SeriesMessage.Watermark watermark) {
        sent.add(watermark);
    }

    @Override
    public void reject(Rejection rejection) {
        rejected.add(rejection);
    }
}
