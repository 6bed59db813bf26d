package org.seamwatch.processors.series;

import java.util.Collection;
import java.util.SortedMap;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.alarms.AlarmState;
import org.seamwatch.processors.state.Shelf;
import org.seamwatch.processors.state.VersionedJson;
import org.seamwatch.schemas.record.Evidence;

/** The alarms of a series, with the evidence each last carried. */
final class AlarmShelf {

    private static final int VERSION = 1;

    /**
     * An alarm and its evidence.
     *
     * @param state the alarm
     * @param evidence what it last carried
     */
    public record Kept(AlarmState state, Evidence evidence) {}

    private final String prefix;
    private final Shelf rows;
    private final SortedMap<String, Kept> alarms = new TreeMap<>();

    AlarmShelf(String series, Shelf rows) {
        this.prefix = series + "|alarm|";
        this.rows = rows;
        for (Shelf.Row row : rows.rows(prefix)) {
            Kept kept = VersionedJson.read(row.value(), VERSION, Kept.class);
            alarms.put(kept.state().id(), kept);
        }
    }

    @Nullable
    Kept get(String id) {
        return alarms.get(id);
    }

    Collection<AlarmState> states() {
        return alarms.values().stream().map(Kept::state).toList();
    }

    void put(AlarmState state, Evidence evidence) {
        Kept kept = new Kept(state, evidence);
        alarms.put(state.id(), kept);
        rows.put(prefix + state.id(), VersionedJson.row(VERSION, kept));
    }

    void remove(String id) {
        alarms.remove(id);
        rows.remove(prefix + id);
    }
}
