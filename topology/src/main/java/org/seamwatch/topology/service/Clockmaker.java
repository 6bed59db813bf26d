package org.seamwatch.topology.service;

import java.time.Clock;
import java.time.Duration;
import java.util.List;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.atomic.AtomicLong;
import org.apache.kafka.clients.producer.Producer;
import org.apache.kafka.clients.producer.ProducerRecord;
import org.apache.kafka.common.KafkaException;
import org.apache.kafka.common.TopicPartition;
import org.seamwatch.schemas.record.ClockRecord;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * Writes clock records into every input partition at every full hour and every ten minutes, so that quiet partitions
 * pass time too. Any instance may; more of them change nothing.
 */
public final class Clockmaker implements AutoCloseable {

    /** The step of clock records; divides the hour. */
    public static final Duration STEP = Duration.ofMinutes(10);

    private static final Logger LOG = LoggerFactory.getLogger(Clockmaker.class);
    private static final Duration LOOK = Duration.ofSeconds(1);
    private static final Duration SEND_LIMIT = Duration.ofSeconds(30);

    private final Producer<byte[], byte[]> producer;
    private final List<TopicPartition> partitions;
    private final Clock clock;
    private final ScheduledExecutorService timer = Executors.newSingleThreadScheduledExecutor(Clockmaker::daemon);
    private final AtomicLong written = new AtomicLong(-1);
    private final AtomicLong failures = new AtomicLong();

    /**
     * A clockmaker; it owns and closes the producer.
     *
     * @param partitions every partition of the input topics
     */
    public Clockmaker(Producer<byte[], byte[]> producer, List<TopicPartition> partitions, Clock clock) {
        this.producer = producer;
        this.partitions = List.copyOf(partitions);
        this.clock = clock;
    }

    /** Looks at the clock every second from now on. */
    public void start() {
        Future<?> unused = timer.scheduleWithFixedDelay(this::tick, 0, LOOK.toMillis(), TimeUnit.MILLISECONDS);
    }

    /** Writes the newest step that has begun, unless it is written; after a failure the next look tries again. */
    public void tick() {
        long step = Math.floorDiv(clock.millis(), STEP.toMillis()) * STEP.toMillis();
        if (step <= written.get()) {
            return;
        }
        try {
            write(step);
            written.set(step);
        } catch (ExecutionException | TimeoutException | KafkaException e) {
            failures.incrementAndGet();
            LOG.warn("clock records of {} could not be written, tried again: {}", step, e.toString());
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    private void write(long step) throws ExecutionException, InterruptedException, TimeoutException {
        List<? extends Future<?>> sent = partitions.stream()
                .map(to -> producer.send(
                        new ProducerRecord<>(to.topic(), to.partition(), step, ClockRecord.key(), ClockRecord.value())))
                .toList();
        for (Future<?> each : sent) {
            each.get(SEND_LIMIT.toMillis(), TimeUnit.MILLISECONDS);
        }
    }

    /** Time of the last step written to every partition, milliseconds since 1970; -1 before the first. */
    public long written() {
        return written.get();
    }

    /** How often writing has failed. */
    public long failures() {
        return failures.get();
    }

    private static Thread daemon(Runnable task) {
        Thread thread = new Thread(task, "clockmaker");
        thread.setDaemon(true);
        return thread;
    }

    @Override
    public void close() {
        timer.shutdownNow();
        producer.close(SEND_LIMIT);
    }
}
