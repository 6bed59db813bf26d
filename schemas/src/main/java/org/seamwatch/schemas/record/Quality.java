package org.seamwatch.schemas.record;

/**
 * How good the data of the evidence's period are.
 *
 * @param cases cases in the geography in the period
 * @param preliminary of these, cases whose report is still preliminary
 * @param late of these, net cases that came after their day had closed
 * @param revision the revision of the day the evidence speaks of; 0 is a first view
 * @param unjudgedRegions regions that could not be judged on the day; the series-day names them
 */
public record Quality(long cases, long preliminary, long late, int revision, int unjudgedRegions) {}
