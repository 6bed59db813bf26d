package org.seamwatch.ops;

import org.jspecify.annotations.Nullable;

/** A command cannot go on for a reason that is known. The message is one clear line. */
final class CommandFailure extends RuntimeException {

    private static final long serialVersionUID = 1L;

    CommandFailure(String message, @Nullable Throwable cause) {
        super(message, cause);
    }
}
