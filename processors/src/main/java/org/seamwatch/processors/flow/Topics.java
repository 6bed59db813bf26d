package org.seamwatch.processors.flow;

/** Names of the topics, without prefix. */
public final class Topics {

    public static final String CASE_REPORTS = "case-reports";
    public static final String ALARM_RESPONSES = "alarm-responses";
    public static final String REJECTED_REPORTS = "rejected-reports";
    public static final String REGION_DAYS = "region-days";
    public static final String SERIES_DAYS = "series-days";
    public static final String ALARMS = "alarms";

    private Topics() {}
}
