package org.seamwatch.topology.replay;

import org.seamwatch.processors.intake.Rejection;
import org.seamwatch.processors.series.SeriesOutput;

/** Where a replay sends what the live service would write to its topics, in the order it is made. */
public interface ReplayOutput extends SeriesOutput {

    /** A record that could not be used. */
    void rejected(Rejection rejection);
}
