/**
 * What is charted for a series; one statistic is one class behind one interface. Start from {@link
 * org.seamwatch.processors.statistics.Statistic}.
 */
@NullMarked
package org.seamwatch.processors.statistics;

import org.jspecify.annotations.NullMarked;
