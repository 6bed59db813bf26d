package org.seamwatch.topology.service;

import org.jspecify.annotations.Nullable;

/**
 * A line of a log: a record of an input topic in its partition, with its timestamp. A partition's lines are in order.
 *
 * @param topic input topic, without prefix
 */
@SuppressWarnings("ArrayRecordComponent") // handed over, never compared
public record LogLine(String topic, int partition, long timestamp, byte @Nullable [] key, byte @Nullable [] value) {}
