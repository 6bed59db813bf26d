/**
 * A plan made ready: series with their regions, weights, statistics and limits, and the routes of reports. Start
 * from {@link org.seamwatch.processors.watch.Watch}.
 */
@NullMarked
package org.seamwatch.processors.watch;

import org.jspecify.annotations.NullMarked;
