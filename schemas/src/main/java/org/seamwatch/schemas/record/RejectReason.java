package org.seamwatch.schemas.record;

/** Why a record of an input topic cannot be used; the header {@code reason} of {@code rejected-reports}. */
public enum RejectReason {
    /** The record has no value. */
    NULL_VALUE("null-value"),
    /** The record has no key. */
    NULL_KEY("null-key"),
    /** The value is not UTF-8. */
    NOT_UTF8("not-utf8"),
    /** The value is not one JSON document. */
    NOT_JSON("not-json"),
    /** The value is JSON, but not an object. */
    NOT_AN_OBJECT("not-an-object"),
    /** Objects and arrays are nested too deeply. */
    TOO_DEEP("too-deep"),
    /** A field occurs twice in one object. */
    DUPLICATE_FIELD("duplicate-field"),
    /** A required field is absent. */
    MISSING_FIELD("missing-field"),
    /** A field has another JSON type than the contract says. */
    WRONG_TYPE("wrong-type"),
    /** A field has the right type, but not a form or word that the contract allows. */
    BAD_VALUE("bad-value"),
    /** A number or date lies outside the contract's range. */
    OUT_OF_RANGE("out-of-range"),
    /** Region and position are both given. */
    REGION_AND_POSITION("region-and-position"),
    /** Neither region nor position is given. */
    NO_PLACE("no-place"),
    /** The record's key is not what its value says it must be. */
    KEY_MISMATCH("key-mismatch"),
    /** No series of the plan watches the condition. */
    UNKNOWN_CONDITION("unknown-condition"),
    /** No geography of the plan has the region. */
    UNKNOWN_REGION("unknown-region"),
    /** The position lies in no region. */
    OUTSIDE_EVERY_REGION("outside-every-region"),
    /** The condition is watched and the region is known, but not together. */
    NO_SERIES_TAKES_IT("no-series-takes-it"),
    /** The source's clock is ahead of the log. */
    CLOCK_AHEAD("clock-ahead"),
    /** The day lies beyond the ledger's horizon. */
    TOO_OLD("too-old"),
    /** The day has not begun yet. */
    FUTURE_DAY("future-day"),
    /** The record, or a text in it, is too large. */
    TOO_LARGE("too-large"),
    /** The contract's version is not one this program reads. */
    UNSUPPORTED_VERSION("unsupported-version");

    private final String code;

    RejectReason(String code) {
        this.code = code;
    }

    /** The word in headers, metrics and files. */
    public String code() {
        return code;
    }

    /** The reason with this code. */
    public static RejectReason named(String code) {
        for (RejectReason reason : values()) {
            if (reason.code.equals(code)) {
                return reason;
            }
        }
        throw new IllegalArgumentException("reason must be one of RejectReason's codes, was " + code);
    }
}
