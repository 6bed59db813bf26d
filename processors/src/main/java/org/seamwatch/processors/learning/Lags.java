package org.seamwatch.processors.learning;

import java.util.Arrays;

/**
 * The previous usable values, newest first: as they were, for scoring, and winsorised, for learning.
 *
 * @param raw values as observed, at most as many as the order
 * @param winsorised the same values, each held within the winsorising bounds of its day
 */
@SuppressWarnings("ArrayRecordComponent") // copied in and out, equal by value
public record Lags(double[] raw, double[] winsorised) {

    /** No previous value yet. */
    public static final Lags NONE = new Lags(new double[0], new double[0]);

    public Lags {
        if (raw.length != winsorised.length) {
            throw new IllegalArgumentException(
                    "raw and winsorised lags must be equally many, were " + raw.length + " and " + winsorised.length);
        }
        raw = raw.clone();
        winsorised = winsorised.clone();
    }

    @Override
    public double[] raw() {
        return raw.clone();
    }

    @Override
    public double[] winsorised() {
        return winsorised.clone();
    }

    public int size() {
        return raw.length;
    }

    /** These lags after one more value, the oldest dropped beyond the order. */
    Lags next(double rawValue, double winsorisedValue, int order) {
        int size = StrictMath.min(order, raw.length + 1);
        return new Lags(shifted(raw, rawValue, size), shifted(winsorised, winsorisedValue, size));
    }

    /** The regression row for scoring: 1 and the raw lags. */
    double[] scoringRow() {
        return shifted(raw, 1, raw.length + 1);
    }

    /** The regression row for learning: 1 and the winsorised lags. */
    double[] learningRow() {
        return shifted(winsorised, 1, winsorised.length + 1);
    }

    /** Whether a winsorised value is among them. */
    boolean altered() {
        return !Arrays.equals(raw, winsorised);
    }

    private static double[] shifted(double[] values, double first, int size) {
        double[] result = new double[size];
        if (size > 0) {
            result[0] = first;
            System.arraycopy(values, 0, result, 1, size - 1);
        }
        return result;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Lags that && Arrays.equals(raw, that.raw) && Arrays.equals(winsorised, that.winsorised);
    }

    @Override
    public int hashCode() {
        return 31 * Arrays.hashCode(raw) + Arrays.hashCode(winsorised);
    }

    @Override
    public String toString() {
        return "Lags[raw=" + Arrays.toString(raw) + ", winsorised=" + Arrays.toString(winsorised) + "]";
    }
}
