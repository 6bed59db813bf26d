package org.seamwatch.processors.evidence;

import java.time.LocalDate;
import java.util.List;

/**
 * What evidence is made from.
 *
 * @param day the day it speaks of, last of its period
 * @param cases cases of each region in the period, in the order of the geography
 * @param history cases of each region on the days that shares are taken from
 * @param preliminary preliminary cases in the period
 * @param late net cases of the period that came after their day had closed
 * @param planChanged whether the series learns under another plan since the alarm's last signal
 * @param days closed days up to the day, oldest first
 */
@SuppressWarnings("ArrayRecordComponent") // handed over, never compared
public record EvidenceInput(
        LocalDate day,
        double[] cases,
        double[] history,
        long preliminary,
        long late,
        boolean planChanged,
        List<HistoryRow> days) {

    public EvidenceInput {
        days = List.copyOf(days);
    }
}
