package org.seamwatch.processors.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.seamwatch.processors.flow.Cases;
import org.seamwatch.processors.flow.SeriesMessage;
import org.seamwatch.processors.state.MemoryShelf;
import org.seamwatch.processors.state.OldRows;
import org.seamwatch.processors.watch.TestDesk;
import org.seamwatch.schemas.record.CaseReport;
import org.seamwatch.schemas.record.Position;
import org.seamwatch.schemas.record.ReportStatus;

/** Rows of the intake stores: read back as written, and as earlier builds wrote them. */
class IntakeRowsTest {

    private static final LocalDate DAY = LocalDate.of(2024, 2, 3);
    private static final Contribution TALLIED = new Contribution("gridland/influenza", DAY);
    private static final String TALLY_KEY = "gridland/influenza|2024-02-03|R0000";

    static Stream<Arguments> entries() {
        CaseReport coded = new CaseReport(
                1,
                "r-1",
                "lab-1",
                (1L << 53) - 1,
                ReportStatus.PRELIMINARY,
                "influenza",
                "NM-001",
                null,
                DAY,
                DAY.plusDays(1),
                Instant.EPOCH,
                1_000_000);
        CaseReport placed = new CaseReport(
                1,
                "r-2",
                "l\u00e4b",
                0,
                ReportStatus.WITHDRAWN,
                "influenza",
                null,
                new Position(-0.0, 54.25),
                DAY,
                null,
                Instant.EPOCH,
                0);
        return Stream.of(
                Arguments.of(
                        "ledger-coded-1",
                        new LedgerEntry(
                                coded,
                                "NM-001",
                                List.of(
                                        new Contribution("northmarch/influenza", DAY),
                                        new Contribution("south/influenza", DAY.plusDays(1))))),
                Arguments.of(
                        "ledger-placed-1",
                        new LedgerEntry(placed, "NM-002", List.of(new Contribution("northmarch/influenza", DAY)))));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void shouldReadLedgerEntries(String name, LedgerEntry entry) {
        String id = entry.report().reportId();
        assertThat(LedgerEntry.from(id, entry.row())).isEqualTo(entry);
        assertThat(LedgerEntry.contributions(entry.row())).isEqualTo(entry.contributions());
        OldRows.assertKept(name, entry.row());
        assertThat(LedgerEntry.from(id, OldRows.row(name))).isEqualTo(entry);
    }

    @Test
    void shouldReadAccounts() {
        IntakeBench bench = new IntakeBench(TestDesk.small().watch());
        bench.take("2024-02-03T12:00:00Z", Say.of("r-1", "R0000", "2024-02-03"));
        bench.take("2024-02-03T12:00:00Z", Say.of("r-1", "R0000", "2024-02-03"));
        bench.take("2024-02-03T12:10:00Z", null, null);
        bench.clock("2024-02-03T12:20:00Z");

        OldRows.assertKept("account-1", bench.account().row());
        Account old = Account.from(OldRows.row("account-1"));
        assertThat(List.of(
                        old.read(), old.accepted(), old.duplicates(), old.superseded(), old.rejected(), old.controls()))
                .containsExactly(4L, 1L, 1L, 0L, 1L, 1L);
        assertThat(old.reasons()).containsExactly(Map.entry("null-key", 1L));
        assertThat(Instant.ofEpochMilli(old.firstTimestamp())).isEqualTo("2024-02-03T12:00:00Z");
        assertThat(Instant.ofEpochMilli(old.time())).isEqualTo("2024-02-03T12:20:00Z");
    }

    @Test
    void shouldReadTallies() {
        MemoryShelf shelf = new MemoryShelf();
        new HourTally(shelf, 7).add(7, TALLIED, "R0000", new Cases(300, -2));
        byte[] row = shelf.get(TALLY_KEY);
        assertThat(row).isNotNull();
        OldRows.assertKept("tally-2", row);

        shelf.put(TALLY_KEY, OldRows.row("tally-2"));
        HourTally tally = new HourTally(shelf, 7);
        tally.add(7, TALLIED, "R0000", new Cases(1, 2));
        assertThat(ended(tally)).containsExactly(change(new Cases(301, 0)));
    }

    @Test
    void shouldReadTalliesWithoutAnHourAndRemoveThem() {
        MemoryShelf shelf = new MemoryShelf();
        shelf.put(TALLY_KEY, OldRows.row("tally-1"));
        HourTally tally = new HourTally(shelf, 7);
        tally.add(7, TALLIED, "R0001", new Cases(1, 2));
        assertThat(ended(tally))
                .containsExactly(new SeriesMessage.DayChange(
                        "gridland/influenza",
                        7,
                        3,
                        DAY,
                        new TreeMap<>(Map.of("R0000", new Cases(300, -2), "R0001", new Cases(1, 2)))));
        assertThat(shelf.get(TALLY_KEY)).isNull();
    }

    @Test
    void shouldTakeUpTheTalliesOfThePresentHourOnly() {
        MemoryShelf shelf = new MemoryShelf();
        shelf.put(TALLY_KEY, OldRows.row("tally-2"));
        assertThat(ended(new HourTally(shelf, 8))).isEmpty();
        assertThat(ended(new HourTally(shelf, 7))).containsExactly(change(new Cases(300, -2)));
    }

    @Test
    void shouldSweepTalliesThatAreDaysOld() {
        MemoryShelf shelf = new MemoryShelf();
        shelf.put(TALLY_KEY, OldRows.row("tally-2"));
        HourTally tally = new HourTally(shelf, 8);
        IntakeBench out = new IntakeBench(TestDesk.small().watch());
        tally.end(7 + 72, 3, out);
        assertThat(shelf.size()).isOne();
        tally.end(7 + 144, 3, out);
        assertThat(shelf.size()).isZero();
    }

    private static List<Object> ended(HourTally tally) {
        IntakeBench out = new IntakeBench(TestDesk.small().watch());
        tally.end(7, 3, out);
        return List.copyOf(out.sent);
    }

    private static SeriesMessage.DayChange change(Cases cases) {
        return new SeriesMessage.DayChange("gridland/influenza", 7, 3, DAY, new TreeMap<>(Map.of("R0000", cases)));
    }
}
