package org.seamwatch.topology;

/** Headers of {@code rejected-reports}, all UTF-8 text. */
public final class RejectedHeaders {

    /** Code of the reason. */
    public static final String REASON = "reason";

    /** The rule and the value in one sentence. */
    public static final String DETAIL = "detail";

    /** The field at fault; empty where no single one is. */
    public static final String FIELD = "field";

    /** Input topic, without prefix. */
    public static final String TOPIC = "topic";

    /** Its partition. */
    public static final String PARTITION = "partition";

    /** The record's offset there. */
    public static final String OFFSET = "offset";

    /** Bytes of the whole value; only where it was cut. */
    public static final String LENGTH = "length";

    /** SHA-256 of the whole value, hexadecimal; only where it was cut. */
    public static final String SHA256 = "sha256";

    /** Bytes of the whole key; only where it was cut. */
    public static final String KEY_LENGTH = "keyLength";

    /** SHA-256 of the whole key, hexadecimal; only where it was cut. */
    public static final String KEY_SHA256 = "keySha256";

    private RejectedHeaders() {}
}
