/**
 * The second stage: counts, closed days, revisions. Start from {@link
 * org.seamwatch.processors.series.SeriesStage}.
 */
@NullMarked
package org.seamwatch.processors.series;

import org.jspecify.annotations.NullMarked;
