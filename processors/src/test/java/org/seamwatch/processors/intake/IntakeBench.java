package org.seamwatch.processors.intake;

import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.Cases;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.flow.SeriesMessage;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.state.MemoryShelf;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.record.ClockRecord;

/** One partition of {@code case-reports} with its stores, and all it sends. */
final class IntakeBench implements IntakeOutput {

    final MemoryShelf ledger = new MemoryShelf();
    final MemoryShelf tally = new MemoryShelf();
    final MemoryShelf accounts = new MemoryShelf();
    final List<SeriesMessage> sent = new ArrayList<>();
    final List<Rejection> rejected = new ArrayList<>();
    private final Watch watch;
    private ReportIntake intake;
    private long offset;

    IntakeBench(Watch watch) {
        this.watch = watch;
        this.intake = open();
    }

    private ReportIntake open() {
        return new ReportIntake(watch, 3, new InputSizes(6, 2), ledger, tally, accounts, this);
    }

    /** Goes on with what the stores hold, as after a restart. */
    void restart() {
        intake = open();
    }

    void take(String time, Say say) {
        take(time, say.key(), say.value());
    }

    void take(String time, byte @Nullable [] key, byte @Nullable [] value) {
        intake.accept(new LogRecord(
                Topics.CASE_REPORTS, 3, offset++, Instant.parse(time).toEpochMilli(), key, value));
    }

    void clock(String time) {
        take(time, ClockRecord.key(), ClockRecord.value());
    }

    Account account() {
        byte[] row = accounts.get("case-reports|3");
        if (row == null) {
            throw new IllegalStateException("nothing was read");
        }
        return Account.from(row);
    }

    /** Sums of all changes sent so far by series, day and region; none that is zero. */
    SortedMap<String, Cases> sums() {
        SortedMap<String, Cases> sums = new TreeMap<>();
        for (SeriesMessage.DayChange change : changes()) {
            change.cells()
                    .forEach((region, cases) ->
                            sums.merge(change.series() + "|" + change.day() + "|" + region, cases, Cases::plus));
        }
        sums.values().removeIf(Cases::isNone);
        return sums;
    }

    List<SeriesMessage.DayChange> changes() {
        return sent.stream()
                .filter(SeriesMessage.DayChange.class::isInstance)
                .map(SeriesMessage.DayChange.class::cast)
                .toList();
    }

    List<SeriesMessage.Watermark> marks() {
        return sent.stream()
                .filter(SeriesMessage.Watermark.class::isInstance)
                .map(SeriesMessage.Watermark.class::cast)
                .toList();
    }

    /** Everything in the stores as one text, to look for what must not be there. */
    String stored() {
        StringBuilder all = new StringBuilder();
        for (MemoryShelf shelf : List.of(ledger, tally, accounts)) {
            shelf.visit((key, row) -> all.append(key).append(new String(row, StandardCharsets.ISO_8859_1)));
        }
        return all.toString();
    }

    static String cell(LocalDate day, String region) {
        return "gridland/influenza|" + day + "|" + region;
    }

    @Override
    public void toSeries(String series, SeriesMessage message) {
        sent.add(message);
    }

    @Override
    public void toAll(SeriesMessage.Watermark watermark) {
        sent.add(watermark);
    }

    @Override
    public void reject(Rejection rejection) {
        rejected.add(rejection);
    }
}
