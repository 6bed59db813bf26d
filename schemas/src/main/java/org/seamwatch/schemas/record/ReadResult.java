package org.seamwatch.schemas.record;

/**
 * What reading untrusted bytes gave.
 *
 * @param <T> the record that was wanted
 */
public sealed interface ReadResult<T> {

    /**
     * The bytes are a record of the contract.
     *
     * @param value the record
     */
    record Parsed<T>(T value) implements ReadResult<T> {}

    /**
     * The bytes cannot be used.
     *
     * @param reason the kind of fault
     * @param field the field at fault, such as {@code position.lat}; empty where no single one is
     * @param detail the rule and the value, in one sentence; may hold personal data, so it goes to
     *     {@code rejected-reports} only
     */
    record Unusable<T>(RejectReason reason, String field, String detail) implements ReadResult<T> {}
}
