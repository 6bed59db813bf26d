package org.seamwatch.processors.flow;

import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import java.util.SortedMap;
import java.util.TreeMap;
import org.seamwatch.processors.flow.SeriesMessage.DayChange;
import org.seamwatch.processors.flow.SeriesMessage.Response;
import org.seamwatch.processors.flow.SeriesMessage.Watermark;
import org.seamwatch.processors.state.ByteReader;
import org.seamwatch.processors.state.ByteWriter;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.record.AlarmResponse;

/** Byte form of {@link SeriesMessage}: version 1, a kind, then the fields. */
public final class SeriesMessageCodec {

    private static final int VERSION = 1;
    private static final int DAY_CHANGE = 0;
    private static final int RESPONSE = 1;
    private static final int WATERMARK = 2;

    private SeriesMessageCodec() {}

    public static byte[] write(SeriesMessage message) {
        ByteWriter out = new ByteWriter(VERSION);
        if (message instanceof DayChange change) {
            writeChange(out, change);
        } else if (message instanceof Response r) {
            out.number(RESPONSE).text(r.series()).number(r.hour()).number(r.partition());
            out.number(r.offset()).text(Json.line(r.response()));
        } else if (message instanceof Watermark w) {
            out.number(WATERMARK).text(w.topic()).number(w.partition()).number(w.passedHour());
            out.number(w.firstTimestamp());
            out.number(w.sizes().caseReports()).number(w.sizes().alarmResponses());
        }
        return out.bytes();
    }

    private static void writeChange(ByteWriter out, DayChange change) {
        out.number(DAY_CHANGE).text(change.series()).number(change.hour()).number(change.partition());
        out.number(change.day().toEpochDay()).number(change.cells().size());
        change.cells()
                .forEach((region, cases) ->
                        out.text(region).number(cases.count()).number(cases.preliminary()));
    }

    public static SeriesMessage read(byte[] bytes) {
        ByteReader in = new ByteReader(bytes, VERSION);
        int kind = in.integer();
        return switch (kind) {
            case DAY_CHANGE -> readChange(in);
            case RESPONSE ->
                new Response(
                        in.text(),
                        in.number(),
                        in.integer(),
                        in.number(),
                        Json.read(in.text().getBytes(StandardCharsets.UTF_8), AlarmResponse.class));
            case WATERMARK ->
                new Watermark(
                        in.text(), in.integer(), in.number(), in.number(), new InputSizes(in.integer(), in.integer()));
            default -> throw new IllegalArgumentException("message kind must be 0 to 2, was " + kind);
        };
    }

    private static DayChange readChange(ByteReader in) {
        String series = in.text();
        long hour = in.number();
        int partition = in.integer();
        LocalDate day = LocalDate.ofEpochDay(in.number());
        int size = in.integer();
        SortedMap<String, Cases> cells = new TreeMap<>();
        for (int i = 0; i < size; i++) {
            cells.put(in.text(), new Cases(in.number(), in.number()));
        }
        return new DayChange(series, hour, partition, day, cells);
    }
}
