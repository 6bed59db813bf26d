package org.seamwatch.processors.charts;

/** Range checks shared by the charts. */
final class Checks {

    /** With less weight on the newest day the mean age of what is averaged, (1 - w) / w, is beyond 99 days. */
    static final double SMALLEST_WEIGHT = 0.01;

    private Checks() {}

    static double score(double score) {
        if (!Double.isFinite(score)) {
            throw new IllegalArgumentException("score must be finite, was " + score);
        }
        return score;
    }

    static double limit(double limit) {
        if (!(limit > 0 && limit < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("limit must be finite and above 0, was " + limit);
        }
        return limit;
    }

    static double weight(double weight) {
        if (!(weight >= SMALLEST_WEIGHT && weight <= 1)) {
            throw new IllegalArgumentException("weight must be in [" + SMALLEST_WEIGHT + ", 1], was " + weight);
        }
        return weight;
    }

    static double shift(double shift) {
        if (!(StrictMath.abs(shift) <= 30)) {
            throw new IllegalArgumentException("shift must be in [-30, 30], was " + shift);
        }
        return shift;
    }
}
