package org.seamwatch.topology;

import java.nio.charset.StandardCharsets;
import org.apache.kafka.common.header.Headers;
import org.apache.kafka.common.header.internals.RecordHeaders;
import org.apache.kafka.streams.processor.api.ProcessorContext;
import org.apache.kafka.streams.processor.api.Record;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.Hours;
import org.seamwatch.processors.flow.SeriesMessage;
import org.seamwatch.processors.flow.SeriesMessage.DayChange;
import org.seamwatch.processors.flow.SeriesMessage.Response;
import org.seamwatch.processors.flow.SeriesMessage.Watermark;
import org.seamwatch.processors.flow.SeriesMessageCodec;
import org.seamwatch.processors.intake.IntakeOutput;
import org.seamwatch.processors.intake.Rejection;

/** Forwards what intake says, with an explicit timestamp and none of a sender's headers. */
final class IntakeForwarder implements IntakeOutput {

    private static final byte[] TO_ALL = {};

    private final ProcessorContext<byte[], byte[]> context;
    private final String changes;
    private final String rejected;

    /**
     * A forwarder to two children of a processor.
     *
     * @param changes the node for messages to the series
     * @param rejected the node for rejected records
     */
    IntakeForwarder(ProcessorContext<byte[], byte[]> context, String changes, String rejected) {
        this.context = context;
        this.changes = changes;
        this.rejected = rejected;
    }

    @Override
    public void toSeries(String series, SeriesMessage message) {
        forward(series.getBytes(StandardCharsets.UTF_8), message);
    }

    @Override
    public void toAll(Watermark watermark) {
        forward(TO_ALL, watermark);
    }

    private void forward(byte[] key, SeriesMessage message) {
        context.forward(new Record<>(key, SeriesMessageCodec.write(message), endOf(message)), changes);
    }

    private static long endOf(SeriesMessage message) {
        if (message instanceof DayChange change) {
            return Hours.endMillis(change.hour());
        }
        if (message instanceof Response response) {
            return Hours.endMillis(response.hour());
        }
        return Hours.endMillis(((Watermark) message).passedHour());
    }

    @Override
    @SuppressWarnings("NullAway") // a rejected record's key and value may be absent, as they came
    public void reject(Rejection rejection) {
        Rejection.Cut key = rejection.key();
        Rejection.Cut value = rejection.value();
        context.forward(new Record<>(key.bytes(), value.bytes(), rejection.timestamp(), headers(rejection)), rejected);
    }

    private static Headers headers(Rejection rejection) {
        Headers headers = new RecordHeaders();
        add(headers, RejectedHeaders.REASON, rejection.why().reason().code());
        add(headers, RejectedHeaders.DETAIL, rejection.why().detail());
        add(headers, RejectedHeaders.FIELD, rejection.why().field());
        add(headers, RejectedHeaders.TOPIC, rejection.topic());
        add(headers, RejectedHeaders.PARTITION, Integer.toString(rejection.partition()));
        add(headers, RejectedHeaders.OFFSET, Long.toString(rejection.offset()));
        addCut(headers, rejection.key(), RejectedHeaders.KEY_LENGTH, RejectedHeaders.KEY_SHA256);
        addCut(headers, rejection.value(), RejectedHeaders.LENGTH, RejectedHeaders.SHA256);
        return headers;
    }

    private static void addCut(Headers headers, Rejection.Cut cut, String length, String sha256) {
        add(headers, length, cut.length() == null ? null : cut.length().toString());
        add(headers, sha256, cut.sha256());
    }

    private static void add(Headers headers, String name, @Nullable String text) {
        if (text != null) {
            headers.add(name, text.getBytes(StandardCharsets.UTF_8));
        }
    }
}
