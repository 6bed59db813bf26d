package org.seamwatch.ops;

import java.time.Clock;
import java.time.temporal.ChronoUnit;

/** What the service says of itself: lines on standard output, each with its time (UTC). */
record RunLog(Console console, Clock clock) {

    void say(String text) {
        console.say(clock.instant().truncatedTo(ChronoUnit.SECONDS) + "  " + text);
    }
}
