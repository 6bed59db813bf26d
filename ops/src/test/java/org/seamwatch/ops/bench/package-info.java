/**
 * The benchmark: how many reports a second pass through the live flow, beside a bare Kafka Streams job on the same log.
 * Run it with {@code ops/bench}; start from {@link org.seamwatch.ops.bench.Benchmark}. The last result kept is in
 * {@code RESULTS.md}.
 */
@NullMarked
package org.seamwatch.ops.bench;

import org.jspecify.annotations.NullMarked;
