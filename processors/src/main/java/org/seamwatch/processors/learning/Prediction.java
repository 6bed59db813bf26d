package org.seamwatch.processors.learning;

import org.seamwatch.processors.distributions.StudentScore;

/**
 * What a regression expects of the next value: it is t-distributed about the centre.
 *
 * @param centre expected value, x'b
 * @param spread standard error of the prediction, s sqrt(1 + x'(X'X)^-1 x), above 0
 * @param df residual degrees of freedom, from 1
 */
record Prediction(double centre, double spread, int df) {

    /** Normal score of a value. */
    double score(double y) {
        return StudentScore.of((y - centre) / spread, df);
    }

    /** The value that has this score. */
    double value(double score) {
        return centre + spread * StudentScore.inverse(score, df);
    }

    /** The value that lies as many standard errors from this centre as y does from the other. */
    double alike(double y, Prediction other) {
        return centre + (y - other.centre) / other.spread * spread;
    }
}
