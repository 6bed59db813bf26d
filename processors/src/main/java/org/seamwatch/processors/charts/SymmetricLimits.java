package org.seamwatch.processors.charts;

import org.seamwatch.schemas.plan.Sides;
import org.seamwatch.schemas.record.Limits;

/** Limits on one side or both of a centre of zero. */
final class SymmetricLimits {

    private SymmetricLimits() {}

    static Limits at(Sides sides, double distance) {
        return new Limits(sides == Sides.BOTH ? -distance : null, distance);
    }
}
