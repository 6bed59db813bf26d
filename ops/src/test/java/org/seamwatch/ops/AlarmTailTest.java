package org.seamwatch.ops;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.time.Clock;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Map;
import org.apache.kafka.clients.consumer.ConsumerRecord;
import org.apache.kafka.clients.consumer.MockConsumer;
import org.apache.kafka.common.TopicPartition;
import org.junit.jupiter.api.Test;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.Change;
import org.seamwatch.schemas.record.Evidence;
import org.seamwatch.schemas.record.Method;
import org.seamwatch.schemas.record.Period;
import org.seamwatch.schemas.record.Quality;
import org.seamwatch.schemas.record.Repeat;

class AlarmTailTest {

    private static final TopicPartition ALARMS = new TopicPartition("alarms", 0);
    private static final LocalDate DAY = LocalDate.of(2024, 6, 16);

    private final StringWriter out = new StringWriter();
    private final MockConsumer<byte[], byte[]> consumer = new MockConsumer<>("latest");

    private static byte[] alarm() {
        Evidence evidence = new Evidence(
                "Influenza, Northmarch: 71 cases.",
                new Period(DAY.minusDays(6), DAY, "report"),
                List.of(),
                List.of(),
                List.of(),
                new Quality(1412, 30, -2, 0, 3),
                new Method(List.of("Moran's I"), 6, 3, 57, true),
                new Repeat("0.1.0", "ab", "2024a"),
                "A statistical signal is not a confirmed outbreak.");
        return Json.bytes(new AlarmChange(
                1, "land/flu/2024-06-16", "land/flu", "land", "flu", Change.RAISED, 1, DAY, List.of(), null, evidence));
    }

    private void add(long offset, byte[] value) {
        consumer.addRecord(new ConsumerRecord<>("alarms", 0, offset, new byte[0], value));
    }

    @Test
    void shouldSayWhatComesAfterItsStartAndGoOnAfterRubbish() {
        consumer.updateEndOffsets(Map.of(ALARMS, 5L));
        Clock clock = Clock.fixed(Instant.parse("2024-06-18T00:00:00Z"), ZoneOffset.UTC);
        Console console = new Console(new PrintWriter(out), new PrintWriter(out), false);
        try (AlarmTail tail = new AlarmTail(new RunLog(console, clock), consumer, List.of(ALARMS))) {
            add(5, "rubbish".getBytes(StandardCharsets.UTF_8));
            add(6, alarm());
            tail.read();
        }
        assertThat(out.toString().lines())
                .startsWith(
                        "2024-06-18T00:00:00Z  alarm",
                        "offset 5 of alarms partition 0 is no change of an alarm",
                        "2024-06-18T00:00:00Z  alarm",
                        "ALARM raised  land/flu/2024-06-16  #1, day 2024-06-16");
        assertThat(consumer.closed()).isTrue();
    }
}
