package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonInclude;
import org.jspecify.annotations.Nullable;

/**
 * What learning knew when a day was judged.
 *
 * @param days days that had taught before this one
 * @param score standard score of the day's value against what was learned; absent while there is none
 */
@JsonInclude(JsonInclude.Include.NON_NULL)
public record LearningDay(int days, @Nullable Double score) {}
