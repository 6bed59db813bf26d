package org.seamwatch.processors.series;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.state.Shelf;
import org.seamwatch.processors.state.VersionedJson;

/** The closed days of a series. */
final class DayBook {

    private static final int VERSION = 1;

    private final String series;
    private final Shelf rows;

    DayBook(String series, Shelf rows) {
        this.series = series;
        this.rows = rows;
    }

    private String key(LocalDate day) {
        return series + "|" + day;
    }

    @Nullable
    DayState get(LocalDate day) {
        byte @Nullable [] row = rows.get(key(day));
        return row == null ? null : VersionedJson.read(row, VERSION, DayState.class);
    }

    void put(LocalDate day, DayState state) {
        rows.put(key(day), VersionedJson.row(VERSION, state));
    }

    void remove(LocalDate day) {
        rows.remove(key(day));
    }
}
