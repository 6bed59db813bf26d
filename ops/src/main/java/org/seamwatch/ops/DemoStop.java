package org.seamwatch.ops;

/** What Ctrl-C does to a demo: it ends cleanly, as a success once everything has played, else as interrupted half-way. */
final class DemoStop implements AutoCloseable {

    private final CleanStop stop;
    private volatile int code = Failures.INTERRUPTED;

    DemoStop(Console console, Thread demo) {
        stop = CleanStop.with(console, demo::interrupt, () -> code);
    }

    /** From here on Ctrl-C is the way to end it. */
    void allPlayed() {
        code = Failures.DONE;
    }

    /** The exit code of a demo that was stopped. */
    int code() {
        return code;
    }

    @Override
    public void close() {
        stop.finished();
    }
}
