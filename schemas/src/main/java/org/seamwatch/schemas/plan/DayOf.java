package org.seamwatch.schemas.plan;

/** Which date of a report makes its day. */
public enum DayOf {
    /** {@code reportDate}, else the local date of {@code reportedAt}. */
    REPORT("report"),
    /** {@code eventDate}. */
    EVENT("event");

    private final String word;

    DayOf(String word) {
        this.word = word;
    }

    /** The word in the plan. */
    public String word() {
        return word;
    }
}
