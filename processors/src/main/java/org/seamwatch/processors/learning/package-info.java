/**
 * Self-starting learning: centre, spread and serial dependence of a statistic are estimated from its own past, and each
 * new value gets a normal score. Start from {@link org.seamwatch.processors.learning.Learner}.
 */
@NullMarked
package org.seamwatch.processors.learning;

import org.jspecify.annotations.NullMarked;
