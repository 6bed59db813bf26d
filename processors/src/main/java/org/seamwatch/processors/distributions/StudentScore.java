package org.seamwatch.processors.distributions;

import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.numbers.gamma.InverseErf;

/**
 * Maps a value of Student's t to the standard normal score with the same tail probability, q = Phi^-1(F_df(t)), through
 * the tail on its own side in logarithms, so that a far value keeps its digits (the Q statistic of Quesenberry 1991, J.
 * Qual. Technol. 23:213-224, needs this).
 *
 * <p>Odd and increasing in t up to rounding, finite for every t: an infinite t, as a ratio of finite numbers may
 * overflow to, scores like the largest finite one. Error below 1e-12, relative where |q| is above 1.
 */
public final class StudentScore {

    private static final double SQRT_2 = StrictMath.sqrt(2);

    /** Bisection-safe Brent steps: far more than a bracket of doubles needs. */
    private static final int MAX_STEPS = 500;

    /** More than any series has days; the continued fraction gets slow with it. */
    private static final double MOST_DEGREES = 1e9;

    private static final double RELATIVE = 1e-14;
    private static final double ABSOLUTE = 1e-14;

    private StudentScore() {}

    /**
     * The normal score of a t value.
     *
     * @param t value, not NaN
     * @param df degrees of freedom, in [1, 1e9], not necessarily whole
     * @throws IllegalArgumentException when t is NaN or df is out of range
     */
    public static double of(double t, double df) {
        requireDegrees(df);
        if (Double.isNaN(t)) {
            throw new IllegalArgumentException("t must be a number, was NaN");
        }
        double size = StrictMath.min(StrictMath.abs(t), Double.MAX_VALUE);
        double score = StudentTail.isTail(size, df)
                ? NormalScore.fromLogUpperTail(StudentTail.log(size, df))
                : SQRT_2 * InverseErf.value(StudentTail.centre(size, df));
        return StrictMath.copySign(score, t);
    }

    /**
     * The t value whose score is this one: the inverse of {@link #of}.
     *
     * @param score normal score, from -30 to 30
     * @param df degrees of freedom, in [1, 1e9]
     * @throws IllegalArgumentException when the score or df is out of range
     */
    public static double inverse(double score, double df) {
        requireDegrees(df);
        if (!(StrictMath.abs(score) <= 30)) {
            throw new IllegalArgumentException("score must be in [-30, 30], was " + score);
        }
        double size = StrictMath.abs(score);
        if (size == 0) {
            return 0;
        }
        // The tails of t are the heavier ones: |t| >= |score|.
        double low = size;
        double high = 2 * size;
        while (of(high, df) < size) {
            low = high;
            high *= 4;
        }
        if (of(low, df) >= size) {
            return StrictMath.copySign(low, score);
        }
        BrentSolver solver = new BrentSolver(RELATIVE, ABSOLUTE);
        double t = solver.solve(MAX_STEPS, x -> of(x, df) - size, low, high);
        return StrictMath.copySign(t, score);
    }

    private static void requireDegrees(double df) {
        if (!(df >= 1 && df <= MOST_DEGREES)) {
            throw new IllegalArgumentException("degrees of freedom must be in [1, " + MOST_DEGREES + "], were " + df);
        }
    }
}
