package org.seamwatch.topology;

import org.apache.kafka.clients.consumer.ConsumerRecord;
import org.apache.kafka.streams.processor.TimestampExtractor;

/** The log's own timestamp; 0 for a record that carries none. Never stops the stream. */
public final class LogTime implements TimestampExtractor {

    @Override
    public long extract(ConsumerRecord<Object, Object> record, long partitionTime) {
        return Math.max(0, record.timestamp());
    }
}
