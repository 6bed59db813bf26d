package org.seamwatch.ops;

import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;

/**
 * Where a command writes to.
 *
 * @param out results
 * @param err progress, warnings and errors
 * @param terminal whether a person watches {@code err}
 */
record Console(PrintWriter out, PrintWriter err, boolean terminal) {

    /** Set by the launch script, which knows what its streams are. */
    static final String TERMINAL_PROPERTY = "seamwatch.terminal";

    /** The streams of this process, in UTF-8. */
    static Console system() {
        return new Console(
                new PrintWriter(new OutputStreamWriter(System.out, StandardCharsets.UTF_8), true),
                new PrintWriter(new OutputStreamWriter(System.err, StandardCharsets.UTF_8), true),
                Boolean.getBoolean(TERMINAL_PROPERTY));
    }

    /** A line of results. */
    void say(String line) {
        out.println(line);
    }

    /** A warning, one line. */
    void warn(String line) {
        err.println("seamwatch: warning: " + line);
    }

    void flush() {
        out.flush();
        err.flush();
    }
}
