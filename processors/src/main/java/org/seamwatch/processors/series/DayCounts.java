package org.seamwatch.processors.series;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import org.seamwatch.processors.flow.Cases;
import org.seamwatch.processors.state.ByteReader;
import org.seamwatch.processors.state.ByteWriter;

/** Cases by region of one day of a series, and what was last emitted of them. */
final class DayCounts {

    private static final int VERSION = 1;
    private static final Cell EMPTY = new Cell(Cases.NONE, 0);

    /**
     * One region.
     *
     * @param cases what is known
     * @param emitted the count that the last region-day said; 0 where there was none
     */
    record Cell(Cases cases, long emitted) {

        /** The count; never negative, even where another plan has let rows go that a correction takes back. */
        long count() {
            return Math.max(0, cases.count());
        }

        boolean isStale() {
            return count() != emitted;
        }
    }

    private final SortedMap<String, Cell> cells = new TreeMap<>();
    private long late;
    private int revision = -1;

    DayCounts() {}

    static DayCounts from(byte[] row) {
        ByteReader in = new ByteReader(row, VERSION);
        DayCounts counts = new DayCounts();
        counts.late = in.number();
        counts.revision = in.integer();
        for (int n = in.integer(); n > 0; n--) {
            counts.cells.put(in.text(), new Cell(new Cases(in.number(), in.number()), in.number()));
        }
        return counts;
    }

    byte[] row() {
        ByteWriter out = new ByteWriter(VERSION).number(late).number(revision).number(cells.size());
        cells.forEach((region, cell) -> out.text(region)
                .number(cell.cases().count())
                .number(cell.cases().preliminary())
                .number(cell.emitted()));
        return out.bytes();
    }

    /** Adds a change; whether it changes any count. */
    boolean add(SortedMap<String, Cases> change, boolean closed) {
        boolean changed = false;
        for (Map.Entry<String, Cases> e : change.entrySet()) {
            Cell cell = cells.getOrDefault(e.getKey(), EMPTY);
            put(e.getKey(), new Cell(cell.cases().plus(e.getValue()), cell.emitted()));
            changed |= e.getValue().count() != 0;
            late += closed ? e.getValue().count() : 0;
        }
        return changed;
    }

    private void put(String region, Cell cell) {
        if (cell.cases().isNone() && cell.emitted() == 0) {
            cells.remove(region);
        } else {
            cells.put(region, cell);
        }
    }

    SortedMap<String, Cell> cells() {
        return cells;
    }

    /** Regions whose count is not what was last emitted, in order. */
    List<String> stale() {
        List<String> stale = new ArrayList<>();
        cells.forEach((region, cell) -> {
            if (cell.isStale()) {
                stale.add(region);
            }
        });
        return stale;
    }

    long count(String region) {
        return cells.getOrDefault(region, EMPTY).count();
    }

    /** Says that all stale regions are emitted now, as a revision. */
    void emitted(int newRevision) {
        revision = newRevision;
        for (String region : stale()) {
            Cell cell = cells.getOrDefault(region, EMPTY);
            put(region, new Cell(cell.cases(), cell.count()));
        }
    }

    /** Revision of the last region-days; -1 before the first. */
    int revision() {
        return revision;
    }

    /** Net cases that came after the day had closed. */
    long late() {
        return late;
    }

    long preliminary() {
        return cells.values().stream().mapToLong(c -> c.cases().preliminary()).sum();
    }
}
