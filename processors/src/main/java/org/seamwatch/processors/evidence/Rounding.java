package org.seamwatch.processors.evidence;

/** Numbers for people. */
final class Rounding {

    private Rounding() {}

    static double hundredths(double value) {
        return StrictMath.round(value * 100) / 100.0;
    }
}
