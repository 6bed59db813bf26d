package org.seamwatch.topology.replay;

import java.io.IOException;

/** A result cannot be written, as on a full disk. The message is one line that names the file and the system's reason. */
public final class ResultFileException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    ResultFileException(String message, IOException cause) {
        super(message, cause);
    }
}
