package org.seamwatch.topology;

import java.nio.charset.StandardCharsets;
import org.apache.kafka.streams.processor.api.ProcessorContext;
import org.apache.kafka.streams.processor.api.Record;
import org.seamwatch.processors.series.SeriesOutput;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.RegionDay;
import org.seamwatch.schemas.record.SeriesDay;

/** Forwards results as JSON to the three sinks of the series stage. */
final class SeriesForwarder implements SeriesOutput {

    private final ProcessorContext<byte[], byte[]> context;

    SeriesForwarder(ProcessorContext<byte[], byte[]> context) {
        this.context = context;
    }

    @Override
    public void regionDay(RegionDay day, long timestamp) {
        forward(day.series() + "|" + day.region() + "|" + day.day(), day, timestamp, Names.REGION_DAYS_SINK);
    }

    @Override
    public void seriesDay(SeriesDay day, long timestamp) {
        forward(day.series(), day, timestamp, Names.SERIES_DAYS_SINK);
    }

    @Override
    public void alarm(AlarmChange change, long timestamp) {
        forward(change.series(), change, timestamp, Names.ALARMS_SINK);
    }

    private void forward(String key, Object value, long timestamp, String sink) {
        context.forward(new Record<>(key.getBytes(StandardCharsets.UTF_8), Json.bytes(value), timestamp), sink);
    }
}
