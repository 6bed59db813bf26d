package org.seamwatch.ops;

import java.time.Duration;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;

/**
 * What Ctrl-C does to a demo: it ends cleanly at the next look, as a success once everything has played, else as
 * interrupted half-way. Nothing is broken off in the middle: a broker that starts is let start, then ended.
 */
final class DemoStop implements AutoCloseable {

    private final CountDownLatch asked = new CountDownLatch(1);
    private final CleanStop stop;
    private volatile int code = Failures.INTERRUPTED;

    DemoStop(Console console) {
        stop = CleanStop.with(console, asked::countDown, () -> code);
    }

    /** From here on Ctrl-C is the way to end it. */
    void allPlayed() {
        code = Failures.DONE;
    }

    /** The exit code of a demo that was stopped. */
    int code() {
        return code;
    }

    /** Whether it is asked to end. */
    boolean isAsked() {
        return asked.getCount() == 0;
    }

    /** Waits, and ends the wait where it is asked to end. */
    void pause(Duration time) throws InterruptedException {
        if (asked.await(time.toMillis(), TimeUnit.MILLISECONDS)) {
            throw new InterruptedException("asked to end");
        }
    }

    /** Waits until it is asked to end. */
    void await() throws InterruptedException {
        asked.await();
    }

    @Override
    public void close() {
        stop.finished();
    }
}
