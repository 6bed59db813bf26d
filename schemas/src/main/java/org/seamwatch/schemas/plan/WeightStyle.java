package org.seamwatch.schemas.plan;

/** How much a neighbour weighs. */
public enum WeightStyle {
    /** Each neighbour 1. */
    BINARY("binary"),
    /** The neighbours of a region share 1. */
    ROW("row");

    private final String word;

    WeightStyle(String word) {
        this.word = word;
    }

    /** The word in the plan. */
    public String word() {
        return word;
    }
}
