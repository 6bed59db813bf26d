package org.seamwatch.ops;

import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.function.IntSupplier;

/**
 * Lets Ctrl-C, or a stop by the system, end a command that runs until it is stopped as a success: what runs is closed,
 * the command finishes, and the exit code is 0 instead of the signal's.
 */
final class CleanStop {

    private static final long PATIENCE_SECONDS = 40;

    private final CountDownLatch finished = new CountDownLatch(1);
    private final Console console;
    private final Runnable stop;
    private final IntSupplier code;
    private final Thread hook;

    private CleanStop(Console console, Runnable stop, IntSupplier code) {
        this.console = console;
        this.stop = stop;
        this.code = code;
        this.hook = new Thread(this::end, "clean-stop");
    }

    /**
     * From now on a signal ends the command so.
     *
     * @param stop makes the command finish
     */
    static CleanStop with(Console console, Runnable stop) {
        return with(console, stop, () -> Failures.DONE);
    }

    /** The same with another exit code, asked for once the command has finished. */
    static CleanStop with(Console console, Runnable stop, IntSupplier code) {
        CleanStop clean = new CleanStop(console, stop, code);
        Runtime.getRuntime().addShutdownHook(clean.hook);
        return clean;
    }

    private void end() {
        stop.run();
        boolean done = false;
        try {
            done = finished.await(PATIENCE_SECONDS, TimeUnit.SECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
        console.flush();
        Runtime.getRuntime().halt(done ? code.getAsInt() : Failures.FAILED);
    }

    /** The command has finished, by a signal or by itself. */
    void finished() {
        try {
            Runtime.getRuntime().removeShutdownHook(hook);
        } catch (IllegalStateException e) {
            // A signal has come: the hook is running and waits for this.
            finished.countDown();
        }
    }
}
