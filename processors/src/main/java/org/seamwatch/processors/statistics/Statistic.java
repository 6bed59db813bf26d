package org.seamwatch.processors.statistics;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.record.SeriesDay;

/** What is charted for a series. A statistic is a function of counts; its board learns and charts. */
public interface Statistic {

    /** Name in plan and records, such as {@code moran}. */
    String name();

    /** The statistic and its charts in words, for people. */
    String words();

    /** Computes the statistic of a day. */
    Reading read(DayInput input);

    /** Whether the reading of a day depends on the counts of another. */
    boolean reads(LocalDate day, LocalDate other);

    /** The reading that an emitted day holds; null where the day does not have this statistic. */
    @Nullable
    Reading recall(SeriesDay day);

    /** What an emitted day says of it; null where the day does not have this statistic. */
    @Nullable
    StatisticDay said(SeriesDay day);

    /** Its learning and charts. */
    Board board();

    /** The day with what this statistic says of it. */
    SeriesDay on(SeriesDay day, Reading reading, @Nullable Judgement judgement);
}
