package org.seamwatch.topology.replay;

import org.seamwatch.processors.intake.LogRecord;

/** Takes a log, record by record; the records of one partition come in the order of their offsets. */
public interface LogSink {

    /** The next record. */
    void record(LogRecord record);

    /** A promise that no later record of any partition is older than this, milliseconds since 1970-01-01T00Z. */
    void reached(long timestamp);
}
