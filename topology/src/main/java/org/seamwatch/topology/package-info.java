/**
 * The wiring on Kafka Streams: thin processors around the plain steps, their stores, and how records find their
 * partition. Start from {@link org.seamwatch.topology.FlowTopology}.
 */
@NullMarked
package org.seamwatch.topology;

import org.jspecify.annotations.NullMarked;
