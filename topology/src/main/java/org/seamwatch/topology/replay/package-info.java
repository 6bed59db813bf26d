/**
 * The in-process runner: a log, or a file of bare reports, through the same steps as the live service, without a
 * broker or a clock. Start from {@link org.seamwatch.topology.replay.LogReplay}.
 */
@NullMarked
package org.seamwatch.topology.replay;

import org.jspecify.annotations.NullMarked;
