package org.seamwatch.topology.replay;

import org.seamwatch.processors.intake.Intake;

/** One input partition of a replay: the live intake behind it, and how far its log is. */
final class ReplayPartition {

    private final String topic;
    private final int number;
    private final Intake intake;
    private long time = -1;

    ReplayPartition(String topic, int number, Intake intake) {
        this.topic = topic;
        this.number = number;
        this.intake = intake;
    }

    String topic() {
        return topic;
    }

    int number() {
        return number;
    }

    Intake intake() {
        return intake;
    }

    /** The greatest timestamp so far, this one included, as live: also what is not fed any more moves it. */
    long moveTo(long timestamp) {
        time = Math.max(time, timestamp);
        return time;
    }
}
