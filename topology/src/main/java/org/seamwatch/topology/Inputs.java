package org.seamwatch.topology;

import org.apache.kafka.streams.processor.api.ProcessorContext;
import org.apache.kafka.streams.processor.api.Record;
import org.apache.kafka.streams.processor.api.RecordMetadata;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.intake.LogRecord;

/** What the processors of both inputs share. */
final class Inputs {

    private Inputs() {}

    /** The record as it lies in the log. */
    @SuppressWarnings("NullAway") // the engine's records may have no key and no value
    static LogRecord logRecord(String topic, ProcessorContext<?, ?> context, Record<byte[], byte[]> record) {
        RecordMetadata place = context.recordMetadata()
                .orElseThrow(() -> new IllegalStateException("a record of " + topic + " has no place in the log"));
        return new LogRecord(
                topic, place.partition(), place.offset(), record.timestamp(), record.key(), record.value());
    }

    /** What {@code init} has set. */
    static <T> T ready(@Nullable T part) {
        if (part == null) {
            throw new IllegalStateException("a processor must be initialised before its first record");
        }
        return part;
    }
}
