package org.seamwatch.topology.service;

import java.util.concurrent.atomic.AtomicLong;
import org.apache.kafka.common.errors.ApplicationRecoverableException;
import org.apache.kafka.common.errors.RetriableException;
import org.apache.kafka.streams.errors.StreamsUncaughtExceptionHandler;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * What happens when a stream thread dies. Where the broker or the network was at fault, another takes its place; a
 * fault of ours would come back with the same record, so the service stops and says so, for its supervisor to see.
 */
final class FailureRule implements StreamsUncaughtExceptionHandler {

    private static final Logger LOG = LoggerFactory.getLogger(FailureRule.class);

    private final AtomicLong failures = new AtomicLong();
    private volatile boolean stops;

    @Override
    public StreamThreadExceptionResponse handle(Throwable error) {
        failures.incrementAndGet();
        boolean passing = isPassing(error);
        stops |= !passing;
        if (passing) {
            LOG.warn("a stream thread ended, another takes its place: {}", error.toString());
        } else {
            LOG.error("a stream thread ended, the service stops", error);
        }
        return passing ? StreamThreadExceptionResponse.REPLACE_THREAD : StreamThreadExceptionResponse.SHUTDOWN_CLIENT;
    }

    long failures() {
        return failures.get();
    }

    /** Whether a fault has ended the service. */
    boolean stops() {
        return stops;
    }

    private static boolean isPassing(Throwable error) {
        for (Throwable each = error; each != null; each = each.getCause()) {
            if (each instanceof RetriableException || each instanceof ApplicationRecoverableException) {
                return true;
            }
        }
        return false;
    }
}
