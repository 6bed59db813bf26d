package org.seamwatch.topology;

/** Names of processors, stores and internal topics. Stores and internal topics outlive a release: do not rename them. */
public final class Names {

    /** Sources. */
    public static final String REPORTS = "case-reports";

    public static final String RESPONSES = "alarm-responses";

    /** Processors. */
    public static final String REPORT_INTAKE = "report-intake";

    public static final String RESPONSE_INTAKE = "response-intake";
    public static final String SERIES = "series";

    /** What intake sends to the series, as the engine is told; it appends {@code -repartition}. */
    public static final String REPORT_CHANGES = "report-changes";

    public static final String RESPONSE_CHANGES = "response-changes";
    public static final String SERIES_INPUT = "series-input";

    /** Sinks. */
    public static final String REJECTED_REPORTS_SINK = "rejected-reports-sink";

    public static final String REJECTED_RESPONSES_SINK = "rejected-responses-sink";
    public static final String REGION_DAYS_SINK = "region-days-sink";
    public static final String SERIES_DAYS_SINK = "series-days-sink";
    public static final String ALARMS_SINK = "alarms-sink";

    /** Stores. */
    public static final String LEDGER = "report-ledger";

    public static final String TALLY = "report-tally";
    public static final String REPORT_ACCOUNTS = "report-accounts";
    public static final String RESPONSE_ACCOUNTS = "response-accounts";
    public static final String PROGRESS = "series-progress";
    public static final String PENDING = "series-pending";
    public static final String COUNTS = "series-counts";
    public static final String DAYS = "series-closed-days";
    public static final String BOOKS = "series-books";

    private static final String REPARTITION = "-repartition";

    private Names() {}

    /** The internal topic behind one of the two changes streams, without the application's id. */
    public static String repartitionTopic(String changes) {
        return changes + REPARTITION;
    }

    /** The node through which a changes stream is entered; its name is the engine's. */
    static String repartitionEntry(String changes) {
        return changes + REPARTITION + "-filter";
    }
}
