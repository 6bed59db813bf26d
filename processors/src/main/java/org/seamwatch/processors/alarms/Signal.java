package org.seamwatch.processors.alarms;

/**
 * What a day of one statistic means for an episode.
 *
 * @param statistic name of the statistic
 * @param usable whether its value could be used
 * @param beyond whether one of its charts is beyond an action limit
 */
public record Signal(String statistic, boolean usable, boolean beyond) {}
