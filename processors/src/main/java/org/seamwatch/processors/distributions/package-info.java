/**
 * The few distributions the scores of this project pass through, accurate far out in the tails. Start from
 * {@link org.seamwatch.processors.distributions.StudentScore}, which turns a Student-t value into a normal score.
 */
@NullMarked
package org.seamwatch.processors.distributions;

import org.jspecify.annotations.NullMarked;
