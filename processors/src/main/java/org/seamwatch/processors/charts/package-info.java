/**
 * Control charts of normal scores, and their limits solved from a budget of false alarms. Start from
 * {@link org.seamwatch.processors.charts.Chart}; limits come from
 * {@link org.seamwatch.processors.charts.LimitSolver}.
 */
@NullMarked
package org.seamwatch.processors.charts;

import org.jspecify.annotations.NullMarked;
