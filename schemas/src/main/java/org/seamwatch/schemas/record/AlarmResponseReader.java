package org.seamwatch.schemas.record;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/** Reads {@code alarm-response/1} from bytes of any origin. Unknown fields are skipped; nothing makes it throw. */
public final class AlarmResponseReader {

    private static final KnownFields KNOWN =
            KnownFields.of("version", "alarm", "verdict", "from", "to", "by", "at", "note");
    private static final FieldReader.Words<Verdict> VERDICTS = new FieldReader.Words<>(Verdict.class);

    private AlarmResponseReader() {}

    /** The response, or why the bytes are none. */
    public static ReadResult<AlarmResponse> read(byte @Nullable [] value) {
        try {
            return new ReadResult.Parsed<>(response(new FieldReader(UntrustedJson.read(value, KNOWN))));
        } catch (Refused e) {
            return e.result();
        }
    }

    private static AlarmResponse response(FieldReader fields) throws Refused {
        fields.version();
        String alarm = fields.id("alarm");
        Verdict verdict = fields.word("verdict", VERDICTS);
        LocalDate from = fields.optionalDate("from");
        LocalDate to = fields.optionalDate("to");
        if (from != null && to != null && to.isBefore(from)) {
            throw new Refused(RejectReason.BAD_VALUE, "to", "to must not be before from " + from + ", was " + to);
        }
        return new AlarmResponse(
                1, alarm, verdict, from, to, fields.id("by"), fields.instant("at"), fields.note("note"));
    }
}
