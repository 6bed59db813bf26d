package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonInclude;
import org.jspecify.annotations.Nullable;

/**
 * The limits of one grade, in the chart's own unit.
 *
 * @param lower absent where the chart is one-sided
 * @param upper absent where the chart has no upper side
 */
@JsonInclude(JsonInclude.Include.NON_NULL)
public record Limits(@Nullable Double lower, @Nullable Double upper) {

    public Limits {
        if (lower != null && upper != null && !(lower <= upper)) {
            throw new IllegalArgumentException("lower limit must be at most the upper " + upper + ", was " + lower);
        }
    }

    /** Whether a value lies outside; on a limit is inside. */
    public boolean isBeyond(double value) {
        return (upper != null && value > upper) || (lower != null && value < lower);
    }
}
