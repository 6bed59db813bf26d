package org.seamwatch.ops.bench;

/**
 * One run.
 *
 * @param job whose
 * @param cacheBytes size of the record cache
 * @param seconds from the engine running to the whole log read, applied and committed
 * @param cpuSeconds processor time of the stream thread in that time
 */
record Measured(String job, long cacheBytes, double seconds, double cpuSeconds) {

    double perSecond(long reports) {
        return reports / seconds;
    }
}
