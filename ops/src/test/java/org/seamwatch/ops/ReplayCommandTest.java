package org.seamwatch.ops;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.zip.GZIPOutputStream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.record.AccountingLine;
import org.seamwatch.schemas.record.RegionDay;
import org.seamwatch.schemas.record.RejectedLine;
import org.seamwatch.schemas.record.SeriesDay;
import org.seamwatch.topology.Accounting;

/** Replays a small made-up scenario, the same for all tests. */
class ReplayCommandTest {

    private static final List<String> FILES =
            List.of("region-days.ndjson", "series-days.ndjson", "alarms.ndjson", "rejected.ndjson", "accounting.json");

    @TempDir
    private static Path shared = Path.of("");

    private static Path scenario = Path.of("");
    private static Path first = Path.of("");
    private static String printed = "";

    private final Path folder;

    ReplayCommandTest(@TempDir Path folder) {
        this.folder = folder;
    }

    @BeforeAll
    static void replayOnce() {
        scenario = shared.resolve("scenario");
        first = shared.resolve("first");
        Run made = Run.of("scenario", "--out", scenario, "--seed", 7, "--days", 60, "--regions", 30);
        assertThat(made.code()).as(made.err()).isZero();
        assertThat(made.out()).contains("records over 60 days in 30 districts", "planted ");
        Run run = Run.of("replay", "--plan", plan(), "--reports", reports(), "--out", first, "--log", log());
        assertThat(run.code()).as(run.err()).isZero();
        printed = run.out();
    }

    private static Path plan() {
        return scenario.resolve("plan.yaml");
    }

    private static Path reports() {
        return scenario.resolve("reports.ndjson");
    }

    private static Path log() {
        return shared.resolve("log.ndjson.gz");
    }

    private static void assertSameFiles(Path one, Path other) throws IOException {
        for (String name : FILES) {
            assertThat(other.resolve(name)).hasSameBinaryContentAs(one.resolve(name));
        }
    }

    private static <T> List<T> read(Path folder, String name, Class<T> type) throws IOException {
        List<T> records = new ArrayList<>();
        for (String line : Files.readAllLines(folder.resolve(name))) {
            records.add(Json.read(line.getBytes(StandardCharsets.UTF_8), type));
        }
        return records;
    }

    private static List<AccountingLine> accounts(Path folder) throws IOException {
        return Arrays.asList(Json.read(Files.readAllBytes(folder.resolve("accounting.json")), AccountingLine[].class));
    }

    @Test
    void shouldAccountForEveryLine() throws IOException {
        List<AccountingLine> accounts = accounts(first);
        assertThat(accounts).hasSize(6).allMatch(Accounting::balances);
        long lines = Files.readAllLines(reports()).size();
        assertThat(accounts.stream().mapToLong(AccountingLine::read).sum()).isEqualTo(lines);
        List<RejectedLine> rejected = read(first, "rejected.ndjson", RejectedLine.class);
        assertThat(accounts.stream().mapToLong(AccountingLine::rejected).sum())
                .isEqualTo(rejected.size())
                .isPositive();
        assertThat(printed).contains(String.format("%,d records read: ", lines), "  rejected as clock-ahead: ");
    }

    @Test
    void shouldWriteRecordsInOrder() throws IOException {
        List<String> regionDays = read(first, "region-days.ndjson", RegionDay.class).stream()
                .map(day -> String.format("%s %s %s %04d", day.series(), day.region(), day.day(), day.revision()))
                .toList();
        List<String> seriesDays = read(first, "series-days.ndjson", SeriesDay.class).stream()
                .map(day -> String.format("%s %s %04d", day.series(), day.day(), day.revision()))
                .toList();
        assertThat(regionDays).hasSizeGreaterThan(1000).isSorted().doesNotHaveDuplicates();
        assertThat(seriesDays).hasSizeGreaterThan(100).isSorted().doesNotHaveDuplicates();
    }

    @Test
    void shouldGiveTheSameBytesAgainOverOldFiles() throws IOException {
        Path again = Files.createDirectory(folder.resolve("again"));
        Files.writeString(again.resolve("alarms.ndjson"), "of an earlier run\n");
        assertThat(Run.of("replay", "--plan", plan(), "--reports", reports(), "--out", again)
                        .code())
                .isZero();
        assertSameFiles(first, again);
    }

    @Test
    void shouldGiveTheSameFromTheLogAsFromTheReports() throws IOException {
        Path fromLog = folder.resolve("from-log");
        assertThat(Run.of("replay", "--plan", plan(), "--reports", log(), "--out", fromLog)
                        .code())
                .isZero();
        assertSameFiles(first, fromLog);
    }

    @Test
    void shouldReadPackedPartsInTheirOrder() throws IOException {
        List<String> lines = Files.readAllLines(reports());
        Path head = Files.write(folder.resolve("head.ndjson"), lines.subList(0, lines.size() / 3));
        Path tail = folder.resolve("tail.ndjson.gz");
        try (GZIPOutputStream out = new GZIPOutputStream(Files.newOutputStream(tail))) {
            for (String line : lines.subList(lines.size() / 3, lines.size())) {
                out.write((line + "\n").getBytes(StandardCharsets.UTF_8));
            }
        }
        Path parts = folder.resolve("parts");
        assertThat(Run.of("replay", "--plan", plan(), "--reports", head, tail, "--out", parts)
                        .code())
                .isZero();
        assertSameFiles(first, parts);
    }

    @Test
    void shouldEndWhereItIsTold() throws IOException {
        Path early = folder.resolve("early");
        Run run = Run.of("replay", "--plan", plan(), "--reports", reports(), "--until", "2025-09-10", "--out", early);
        assertThat(run.code()).as(run.err()).isZero();
        assertThat(run.out()).contains(" more lie beyond --until");
        List<SeriesDay> days = read(early, "series-days.ndjson", SeriesDay.class);
        // The hour that ends as 11 September begins closes the day two days before.
        assertThat(days.stream().map(SeriesDay::day).max(LocalDate::compareTo)).contains(LocalDate.of(2025, 9, 9));
        assertThat(days).allMatch(day -> !day.closedAt().isAfter(Instant.parse("2025-09-11T00:00:00Z")));
        List<SeriesDay> whole = read(first, "series-days.ndjson", SeriesDay.class);
        assertThat(whole.stream()
                        .filter(day -> !day.closedAt().isAfter(Instant.parse("2025-09-11T00:00:00Z")))
                        .toList())
                .isEqualTo(days);
    }

    @Test
    void shouldNameAnEndThatIsNone() {
        Run run = Run.of("replay", "--plan", plan(), "--reports", reports(), "--out", folder, "--until", "Tuesday");
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.errLines())
                .containsExactly("seamwatch: invalid value for option '--until': must be an instant such as"
                        + " 2024-02-03T06:00:00Z or a date such as 2024-02-03, was \"Tuesday\" (see seamwatch replay"
                        + " --help)");
    }

    @Test
    void shouldNameReportsThatAreNotThere() {
        Path missing = folder.resolve("missing.ndjson");
        Run run = Run.of("replay", "--plan", plan(), "--reports", missing, "--out", folder.resolve("out"));
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.errLines()).containsExactly("seamwatch: " + missing + ": no such file");
        assertThat(folder.resolve("out")).doesNotExist();
    }

    @Test
    void shouldNameAnEndBeforeAllRecords() {
        Run run = Run.of("replay", "--plan", plan(), "--reports", reports(), "--until", "2001-01-01", "--out", folder);
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.errLines()).containsExactly("seamwatch: no record lies before --until");
    }

    @Test
    void shouldNameAnOutputFolderThatIsAFile() throws IOException {
        Path file = Files.writeString(folder.resolve("file"), "");
        Run run = Run.of("replay", "--plan", plan(), "--reports", reports(), "--out", file);
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.errLines())
                .containsExactly("seamwatch: " + file + ": the folder cannot be made, a file has its name");
    }

    @Test
    void shouldRefuseAGapUnderOneDay() {
        Run run = Run.of("replay", "--plan", plan(), "--reports", reports(), "--out", folder, "--max-gap", 0);
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.errLines()).containsExactly("seamwatch: --max-gap must be at least 1 day, was 0");
    }

    @Test
    void shouldRefuseScenarioSizesOutOfRange() {
        Run run = Run.of("scenario", "--out", folder, "--seed", 1, "--days", 3);
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.errLines()).containsExactly("seamwatch: --days must be in [40, 4000], was 3");
    }
}
