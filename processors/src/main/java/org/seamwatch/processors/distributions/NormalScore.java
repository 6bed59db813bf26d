package org.seamwatch.processors.distributions;

import org.apache.commons.numbers.gamma.Erfc;
import org.apache.commons.numbers.gamma.Erfcx;
import org.apache.commons.statistics.distribution.NormalDistribution;

/**
 * The standard normal distribution, with tails in logarithms for values whose tail probability underflows.
 *
 * <p>Log tail: log Q(x) = log(erfcx(x / sqrt 2) / 2) - x^2 / 2, with erfcx(u) = exp(u^2) erfc(u) (Abramowitz and Stegun
 * 1964, 7.1 and 26.2). Relative error of the tails below 1e-12 while they are normal numbers.
 */
public final class NormalScore {

    private static final NormalDistribution STANDARD = NormalDistribution.of(0, 1);
    private static final double SQRT_2 = StrictMath.sqrt(2);
    private static final double SQRT_2_OVER_PI = StrictMath.sqrt(2 / StrictMath.PI);
    private static final double LOG_2 = StrictMath.log(2);

    /** Logarithms below this belong to probabilities near or below the smallest normal number, exp(-708.4). */
    private static final double SMALLEST_LOG = -700;

    /** Newton steps; the start is within 1 % and each step doubles the digits. */
    private static final int NEWTON_STEPS = 5;

    private NormalScore() {}

    /** P(Z &lt;= x). NaN gives NaN. */
    public static double cdf(double x) {
        return STANDARD.cumulativeProbability(x);
    }

    /** P(Z &gt; x), accurate where it is small. NaN gives NaN. */
    public static double upperTail(double x) {
        return STANDARD.survivalProbability(x);
    }

    /** log P(Z &gt; x), finite for every finite x up to 1e154. NaN gives NaN. */
    public static double logUpperTail(double x) {
        if (x > 0) {
            return StrictMath.log(Erfcx.value(x / SQRT_2)) - LOG_2 - x * x / 2;
        }
        return StrictMath.log1p(-Erfc.value(-x / SQRT_2) / 2);
    }

    /** Density at x. */
    public static double density(double x) {
        return STANDARD.density(x);
    }

    /**
     * The x with P(Z &lt;= x) = p.
     *
     * @param p probability in [0, 1]; 0 and 1 give the infinities
     * @throws IllegalArgumentException when p is not a probability
     */
    public static double quantile(double p) {
        requireProbability(p);
        return STANDARD.inverseCumulativeProbability(p);
    }

    /**
     * The x with P(Z &gt; x) = p, accurate for small p.
     *
     * @param p probability in [0, 1]; 0 and 1 give the infinities
     * @throws IllegalArgumentException when p is not a probability
     */
    public static double upperQuantile(double p) {
        requireProbability(p);
        return STANDARD.inverseSurvivalProbability(p);
    }

    /**
     * The x with log P(Z &gt; x) = logTail; also where the probability itself underflows.
     *
     * @param logTail logarithm of an upper tail probability, at most 0
     * @throws IllegalArgumentException when logTail is above 0 or NaN
     */
    public static double fromLogUpperTail(double logTail) {
        if (!(logTail <= 0)) {
            throw new IllegalArgumentException("logarithm of a tail probability must be at most 0, was " + logTail);
        }
        if (logTail > SMALLEST_LOG) {
            return STANDARD.inverseSurvivalProbability(StrictMath.exp(logTail));
        }
        return farQuantile(logTail);
    }

    /** Newton on log Q, whose slope is the negative hazard sqrt(2/pi) / erfcx(x / sqrt 2). */
    private static double farQuantile(double logTail) {
        if (logTail == Double.NEGATIVE_INFINITY) {
            return Double.POSITIVE_INFINITY;
        }
        double x = StrictMath.sqrt(-2 * logTail - StrictMath.log(-4 * StrictMath.PI * logTail));
        for (int step = 0; step < NEWTON_STEPS; step++) {
            double hazard = SQRT_2_OVER_PI / Erfcx.value(x / SQRT_2);
            x += (logUpperTail(x) - logTail) / hazard;
        }
        return x;
    }

    private static void requireProbability(double p) {
        if (!(p >= 0 && p <= 1)) {
            throw new IllegalArgumentException("probability must be in [0, 1], was " + p);
        }
    }
}
