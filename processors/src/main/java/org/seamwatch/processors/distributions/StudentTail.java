package org.seamwatch.processors.distributions;

import org.apache.commons.numbers.gamma.LogBeta;
import org.apache.commons.numbers.gamma.RegularizedBeta;

/**
 * Tails of Student's t through the regularised incomplete beta function: P(|T| &gt; t) = I_x(n/2, 1/2) with x = n / (n +
 * t^2) (Abramowitz and Stegun 1964, 26.7.1), by its continued fraction (26.5.8), all in logarithms.
 */
final class StudentTail {

    /** Beyond this |t| the square may overflow and x = n / t^2 to full precision. */
    private static final double LARGE = 1e100;

    private static final double TINY = 1e-300;
    private static final double PRECISION = 1e-15;

    private StudentTail() {}

    /** Whether the tail's continued fraction converges fast: x under its turning point (a + 1) / (a + b + 2). */
    static boolean isTail(double size, double df) {
        return size > LARGE || size * size * (df + 2) > 3 * df;
    }

    /** P(|T| &lt;= size), accurate for small size. */
    static double centre(double size, double df) {
        double square = size * size;
        return RegularizedBeta.value(square / (df + square), 0.5, df / 2);
    }

    /** log P(T &gt; size) where {@link #isTail}; finite for every finite size. */
    static double log(double size, double df) {
        double a = df / 2;
        double b = 0.5;
        boolean large = size > LARGE;
        double ratio = large ? 0 : size * size / df;
        // log x and log(1 - x)
        double logX = large ? StrictMath.log(df) - 2 * StrictMath.log(size) : -StrictMath.log1p(ratio);
        double logY = large ? 0 : -StrictMath.log1p(1 / ratio);
        double x = large ? 0 : 1 / (1 + ratio);
        double logFront = a * logX + b * logY - StrictMath.log(a) - LogBeta.value(a, b);
        return logFront + StrictMath.log(fraction(a, b, x)) - StrictMath.log(2);
    }

    /** The continued fraction of I_x(a, b) without its front factor, by the modified method of Lentz. */
    private static double fraction(double a, double b, double x) {
        double c = 1;
        double d = 1 / orTiny(1 - (a + b) * x / (a + 1));
        double value = d;
        double change;
        int m = 0;
        do {
            m++;
            double even = m * (b - m) * x / ((a + 2 * m - 1) * (a + 2 * m));
            d = 1 / orTiny(1 + even * d);
            c = orTiny(1 + even / c);
            value *= d * c;
            double odd = -(a + m) * (a + b + m) * x / ((a + 2 * m) * (a + 2 * m + 1));
            d = 1 / orTiny(1 + odd * d);
            c = orTiny(1 + odd / c);
            change = d * c;
            value *= change;
        } while (StrictMath.abs(change - 1) > PRECISION);
        return value;
    }

    private static double orTiny(double value) {
        return StrictMath.abs(value) < TINY ? TINY : value;
    }
}
