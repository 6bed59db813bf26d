package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonInclude;
import org.jspecify.annotations.Nullable;

/**
 * The limits of one grade.
 *
 * @param lower absent where the chart is one-sided
 * @param upper absent where the chart has no upper side
 */
@JsonInclude(JsonInclude.Include.NON_NULL)
public record Limits(@Nullable Double lower, @Nullable Double upper) {}
