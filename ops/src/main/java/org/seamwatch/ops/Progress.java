package org.seamwatch.ops;

import java.util.Locale;
import java.util.function.LongSupplier;

/**
 * Shows how far a longer piece of work is, once it has taken two seconds: a bar with rates on a terminal, a plain line
 * every ten seconds elsewhere. Results never depend on it.
 */
final class Progress implements AutoCloseable {

    private static final long NANOS = 1_000_000_000L;
    private static final long QUIET = 2 * NANOS;
    private static final long BAR_EVERY = NANOS / 5;
    private static final long LINE_EVERY = 10 * NANOS;
    private static final int ASK_CLOCK_EVERY = 256;
    private static final int BAR = 24;

    private final Console console;
    private final String what;
    private final String unit;
    private final long total;
    private final LongSupplier nanos;
    private final long start;
    private long next;
    private long asked;
    private long units;
    private boolean drawn;
    private boolean stopped;

    Progress(Console console, String what, String unit, long total) {
        this(console, what, unit, total, System::nanoTime);
    }

    /**
     * A progress that begins now.
     *
     * @param what what is being done
     * @param unit what is counted, in the plural
     * @param total the whole of the work, in any measure; 0 where it is not known
     * @param nanos a clock that only moves on
     */
    Progress(Console console, String what, String unit, long total, LongSupplier nanos) {
        this.console = console;
        this.what = what;
        this.unit = unit;
        this.total = total;
        this.nanos = nanos;
        this.start = nanos.getAsLong();
        this.next = start + QUIET;
    }

    /**
     * Tells how far the work is. Cheap enough for each record.
     *
     * @param count units done
     * @param done how much of the total is done
     */
    void at(long count, long done) {
        units = count;
        if (asked++ % ASK_CLOCK_EVERY == 0) {
            now(count, done);
        }
    }

    /** The same for work that tells seldom. */
    void now(long count, long done) {
        units = count;
        long now = nanos.getAsLong();
        if (now - next >= 0) {
            draw(now, done);
            next = now + (console.terminal() ? BAR_EVERY : LINE_EVERY);
        }
    }

    private void draw(long now, long done) {
        String text = what + "  " + (total > 0 ? part(done) : "") + rate(now);
        if (console.terminal()) {
            console.err().print("\r\u001b[K" + text);
            console.err().flush();
            drawn = true;
        } else {
            console.err().println(text);
        }
    }

    private String part(long done) {
        double part = Math.min(1, (double) done / total);
        int filled = (int) (part * BAR);
        String percent = String.format(Locale.ROOT, "%3d %%  ", (int) (part * 100));
        return console.terminal() ? "[" + "#".repeat(filled) + ".".repeat(BAR - filled) + "] " + percent : percent;
    }

    private String rate(long now) {
        double seconds = Math.max(1e-3, (double) (now - start) / NANOS);
        return String.format(Locale.ROOT, "%,d %s, %,.0f a second", units, unit, units / seconds);
    }

    /** The work ends before it is done. */
    void stopped() {
        stopped = true;
    }

    /** Takes the bar away; work that took longer leaves one line behind. */
    @Override
    public void close() {
        if (drawn) {
            console.err().print("\r\u001b[K");
        }
        long now = nanos.getAsLong();
        if (now - start >= QUIET) {
            console.err()
                    .println(String.format(
                            Locale.ROOT,
                            "%s  %s %.1f s: %s",
                            what,
                            stopped ? "stopped after" : "done in",
                            (double) (now - start) / NANOS,
                            rate(now)));
        }
        console.err().flush();
    }
}
