package org.seamwatch.ops;

import java.time.Duration;
import java.util.Collection;
import org.apache.kafka.clients.consumer.Consumer;
import org.apache.kafka.clients.consumer.ConsumerRecord;
import org.apache.kafka.common.TopicPartition;
import org.apache.kafka.common.errors.WakeupException;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.record.AlarmChange;

/** Says each change of an alarm that is committed from now on, whichever instance made it. */
final class AlarmTail implements AutoCloseable {

    private static final Duration WAIT = Duration.ofSeconds(1);

    private final RunLog log;
    private final Consumer<byte[], byte[]> consumer;
    private final Thread thread = new Thread(this::run, "alarm-tail");
    private volatile boolean closed;

    /**
     * A tail that stands at the end of the topic; it owns and closes the consumer.
     *
     * @param consumer reads committed records only
     */
    AlarmTail(RunLog log, Consumer<byte[], byte[]> consumer, Collection<TopicPartition> partitions) {
        this.log = log;
        this.consumer = consumer;
        consumer.assign(partitions);
        consumer.seekToEnd(partitions);
        partitions.forEach(consumer::position);
        thread.setDaemon(true);
    }

    void start() {
        thread.start();
    }

    private void run() {
        try {
            while (!closed) {
                read();
            }
        } catch (WakeupException e) {
            // It is being closed.
        } catch (RuntimeException e) {
            log.say("alarms are no longer shown here; they are in their topic all the same: " + e.getMessage());
        } finally {
            consumer.close();
        }
    }

    /** Says what has come. */
    void read() {
        for (ConsumerRecord<byte[], byte[]> record : consumer.poll(WAIT)) {
            log.say("alarm" + System.lineSeparator() + text(record).stripTrailing());
        }
    }

    private static String text(ConsumerRecord<byte[], byte[]> record) {
        try {
            return AlarmText.of(Json.read(record.value(), AlarmChange.class));
        } catch (RuntimeException e) {
            return "offset " + record.offset() + " of " + record.topic() + " partition " + record.partition()
                    + " is no change of an alarm";
        }
    }

    @Override
    public void close() {
        closed = true;
        if (thread.getState() == Thread.State.NEW) {
            consumer.close();
            return;
        }
        consumer.wakeup();
        try {
            thread.join(WAIT.multipliedBy(5).toMillis());
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }
}
