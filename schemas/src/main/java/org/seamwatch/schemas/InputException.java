package org.seamwatch.schemas;

/** The user's input is wrong. The message is one clear line that names file, line or feature, and field. */
public final class InputException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    public InputException(String message) {
        super(message);
    }
}
