package org.seamwatch.processors.charts;

/** Which limit a chart is beyond. */
public enum Grade {
    NONE,
    WARNING,
    ACTION
}
