package org.seamwatch.processors.intake;

import org.seamwatch.processors.flow.SeriesMessage;

/** Where intake sends what it makes of a record. Order matters: what is sent first arrives first. */
public interface IntakeOutput {

    /** To the task that keeps this series. */
    void toSeries(String series, SeriesMessage message);

    /** To every task of the series stage. */
    void toAll(SeriesMessage.Watermark watermark);

    /** To the topic of rejected reports. */
    void reject(Rejection rejection);
}
