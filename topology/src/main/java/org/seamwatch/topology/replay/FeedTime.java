package org.seamwatch.topology.replay;

import java.time.Duration;
import java.time.Instant;

/**
 * The log's time in a file of bare reports: the greatest {@code reportedAt} so far. The first report sets the start; one
 * that lies further ahead than the largest gap does not move time, so that one source's wrong clock cannot close days
 * (intake then rejects it, as it is ahead of the log).
 */
public final class FeedTime {

    private final Duration maxGap;
    private long time = -1;

    public FeedTime(Duration maxGap) {
        if (maxGap.isNegative() || maxGap.isZero()) {
            throw new IllegalArgumentException("the largest gap must be above 0, was " + maxGap);
        }
        this.maxGap = maxGap;
    }

    /** Whether a report has set the start. */
    public boolean isBegun() {
        return time >= 0;
    }

    /** The log's time with one more report. */
    public long at(Instant reportedAt) {
        long sent = Math.max(0, reportedAt.toEpochMilli());
        if (!isBegun() || sent - time <= maxGap.toMillis()) {
            time = Math.max(time, sent);
        }
        return time;
    }

    /** The log's time now, milliseconds since 1970-01-01T00Z; -1 before the start. */
    public long now() {
        return time;
    }
}
