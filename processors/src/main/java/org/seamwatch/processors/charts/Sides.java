package org.seamwatch.processors.charts;

/** On which sides of its centre a chart has limits. */
public enum Sides {
    UPPER,
    BOTH
}
