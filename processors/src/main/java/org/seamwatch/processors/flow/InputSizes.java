package org.seamwatch.processors.flow;

/**
 * How many partitions each input topic has; part of the log, fixed for its life.
 *
 * @param caseReports partitions of {@code case-reports}
 * @param alarmResponses partitions of {@code alarm-responses}
 */
public record InputSizes(int caseReports, int alarmResponses) {

    public InputSizes {
        if (caseReports < 1 || alarmResponses < 1) {
            throw new IllegalArgumentException(
                    "input partitions must be at least 1, were " + caseReports + " and " + alarmResponses);
        }
    }
}
