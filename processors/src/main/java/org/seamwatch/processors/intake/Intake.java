package org.seamwatch.processors.intake;

/** One partition of an input topic, whatever it carries. */
public interface Intake {

    /** Takes the next record of the partition, whatever its bytes. */
    void accept(LogRecord record);

    /**
     * Passes every hour up to one without a record: for a replay that knows that the log holds no more of them.
     *
     * @param hour the last hour to be passed
     * @param logStart first timestamp of the log, milliseconds since 1970-01-01T00Z; counts where the partition has
     *     had no record yet
     */
    void pass(long hour, long logStart);

    /** What became of the records so far. */
    Account account();
}
