package org.seamwatch.schemas.record;

/** Carries the first fault found from a check up to its reader. Has no stack trace: rubbish may come by the million. */
final class Refused extends Exception {

    private static final long serialVersionUID = 1L;

    private final RejectReason reason;
    private final String field;

    Refused(RejectReason reason, String field, String detail) {
        super(detail, null, false, false);
        this.reason = reason;
        this.field = field;
    }

    <T> ReadResult<T> result() {
        return new ReadResult.Unusable<>(reason, field, String.valueOf(getMessage()));
    }
}
