package org.seamwatch.schemas.plan;

/** On which sides a chart has limits. */
public enum Sides {
    UPPER("upper"),
    BOTH("both");

    private final String word;

    Sides(String word) {
        this.word = word;
    }

    /** The word in the plan. */
    public String word() {
        return word;
    }
}
