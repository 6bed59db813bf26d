package org.seamwatch.processors.series;

import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.RegionDay;
import org.seamwatch.schemas.record.SeriesDay;

/** Where the series stage sends its results. Timestamps are the end of the hour applied, milliseconds since 1970. */
public interface SeriesOutput {

    void regionDay(RegionDay day, long timestamp);

    void seriesDay(SeriesDay day, long timestamp);

    void alarm(AlarmChange change, long timestamp);
}
