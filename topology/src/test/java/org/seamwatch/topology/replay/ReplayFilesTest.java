package org.seamwatch.topology.replay;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.seamwatch.topology.replay.Grid.millis;
import static org.seamwatch.topology.replay.Grid.report;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalLong;
import java.util.zip.GZIPOutputStream;
import org.apache.kafka.clients.producer.internals.BuiltInPartitioner;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.intake.LogRecord;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.InputException;

class ReplayFilesTest {

    private static final int PARTITIONS = 3;

    private final Path folder;

    ReplayFilesTest(@TempDir Path folder) {
        this.folder = folder;
    }

    private static final class Kept implements LogSink {

        final List<LogRecord> records = new ArrayList<>();
        final List<Long> reached = new ArrayList<>();

        @Override
        public void record(LogRecord record) {
            records.add(record);
        }

        @Override
        public void reached(long timestamp) {
            reached.add(timestamp);
        }

        List<String> lines() {
            return records.stream()
                    .map(r -> r.topic() + " " + r.partition() + " " + r.offset() + " " + r.timestamp() + " "
                            + Grid.text(r.key()) + " " + Grid.text(r.value()))
                    .toList();
        }
    }

    private Path file(String name, String... lines) throws IOException {
        return Files.writeString(folder.resolve(name), String.join("\n", lines) + "\n");
    }

    private static Kept feed(Path... files) {
        Kept kept = new Kept();
        new ReplayFiles(PARTITIONS, ReplayFiles.DEFAULT_MAX_GAP, kept, (lines, bytes) -> {}).feed(List.of(files));
        return kept;
    }

    private Results replay(Path... files) {
        Watch watch = Grid.watch(folder, PARTITIONS);
        Results results = new Results();
        LogReplay replay = new LogReplay(watch, new InputSizes(PARTITIONS, PARTITIONS), OptionalLong.empty(), results);
        new ReplayFiles(PARTITIONS, ReplayFiles.DEFAULT_MAX_GAP, replay, (lines, bytes) -> {}).feed(List.of(files));
        replay.finish();
        return results;
    }

    @Test
    void shouldGiveABareReportTheGreatestReportedAtSoFar() throws IOException {
        Kept kept = feed(file(
                "a.ndjson",
                report("a", "R0", "2024-03-01T10:00:00Z"),
                report("b", "R0", "2024-03-02T10:00:00Z"),
                report("c", "R0", "2024-03-01T12:00:00Z")));
        assertThat(kept.records)
                .extracting(LogRecord::timestamp)
                .containsExactly(
                        millis("2024-03-01T10:00:00Z"), millis("2024-03-02T10:00:00Z"), millis("2024-03-02T10:00:00Z"));
        assertThat(kept.reached).isSorted().hasSize(3);
    }

    @Test
    void shouldChooseThePartitionsThatKafkasProducersChoose() throws IOException {
        String[] lines = new String[40];
        for (int i = 0; i < lines.length; i++) {
            lines[i] = report("report-" + i, "R0", "2024-03-01T10:00:00Z");
        }
        long[] next = new long[PARTITIONS];
        for (LogRecord record : feed(file("a.ndjson", lines)).records) {
            byte[] key = Grid.bytes(Grid.text(record.key()));
            assertThat(record.partition()).isEqualTo(BuiltInPartitioner.partitionForKey(key, PARTITIONS));
            assertThat(record.offset()).isEqualTo(next[record.partition()]++);
        }
        assertThat(next).doesNotContain(0);
    }

    @Test
    void shouldRejectAReportBeyondTheLargestGapAndKeepTime() throws IOException {
        Results results = replay(file(
                "a.ndjson",
                report("a", "R0", "2024-03-01T10:00:00Z"),
                report("wrong-clock", "R0", "2025-03-01T10:00:00Z"),
                report("b", "R1", "2024-03-31T10:00:00Z"),
                report("late", "R1", "2024-05-01T10:00:00Z")));
        assertThat(results.reasons()).containsExactly("clock-ahead", "clock-ahead");
        assertThat(results.days()).endsWith("2024-03-29#0");
    }

    @Test
    void shouldTakeAReportBeyondAGapWhereALargerOneIsAllowed() throws IOException {
        Path file =
                file("a.ndjson", report("a", "R0", "2024-03-01T10:00:00Z"), report("b", "R0", "2024-05-01T10:00:00Z"));
        Kept kept = new Kept();
        new ReplayFiles(PARTITIONS, Duration.ofDays(61), kept, (lines, bytes) -> {}).feed(List.of(file));
        assertThat(kept.records.get(1).timestamp()).isEqualTo(millis("2024-05-01T10:00:00Z"));
    }

    @Test
    void shouldRejectLinesThatAreNoReportsWithTheReadersReason() throws IOException {
        Results results = replay(file(
                "a.ndjson",
                "rubbish before the first report",
                report("a", "R0", "2024-03-01T10:00:00Z"),
                "[1, 2]",
                "{\"reportId\":\"x\",\"status\":\"final\"}",
                "{\"reportId\":"));
        assertThat(results.reasons())
                .containsExactlyInAnyOrder("not-json", "not-an-object", "missing-field", "not-json");
        assertThat(results.rejections).anySatisfy(r -> {
            assertThat(Grid.text(r.key().bytes())).isEqualTo("x");
            assertThat(Grid.text(r.value().bytes())).isEqualTo("{\"reportId\":\"x\",\"status\":\"final\"}");
        });
    }

    @Test
    void shouldKeepBytesThatAreNotText() throws IOException {
        Path file = folder.resolve("a.ndjson");
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        bytes.write(Grid.bytes(report("a", "R0", "2024-03-01T10:00:00Z") + "\r\n"));
        bytes.write(new byte[] {(byte) 0xff, (byte) 0xfe, 0, 'x', '\n'});
        Files.write(file, bytes.toByteArray());
        List<LogRecord> records = feed(file).records;
        assertThat(records.get(0).value()).isEqualTo(Grid.bytes(report("a", "R0", "2024-03-01T10:00:00Z")));
        assertThat(records.get(1).value()).containsExactly(0xff, 0xfe, 0, 'x');
        assertThat(replay(file).reasons()).containsExactly("not-utf8");
    }

    @Test
    void shouldNameTheFirstFaultOfAFileWithoutReports() throws IOException {
        Path file = file("a.csv", "", "id;region;date", "1;R0;2024-03-01");
        assertThatThrownBy(() -> feed(file))
                .isInstanceOf(InputException.class)
                .hasMessage(file + ":2: not-json; none of the first 2 lines is a report");
    }

    @Test
    void shouldStopAtAPreambleThatIsTooLong() throws IOException {
        String[] lines = new String[BareReports.LONGEST_PREAMBLE + 2];
        Arrays.fill(lines, "{}");
        lines[lines.length - 1] = report("a", "R0", "2024-03-01T10:00:00Z");
        Path file = file("a.ndjson", lines);
        assertThatThrownBy(() -> feed(file))
                .isInstanceOf(InputException.class)
                .hasMessageStartingWith(file + ":1: ")
                .hasMessageEndingWith("none of the first 1001 lines is a report");
    }

    @Test
    void shouldPassOverAByteOrderMark() throws IOException {
        String[] lines = {report("a", "R0", "2024-01-02T10:00:00Z"), report("b", "R0", "2024-01-02T11:00:00Z")};
        Path marked = file("marked.ndjson", "\uFEFF" + lines[0], lines[1]);

        assertThat(feed(marked).lines())
                .isEqualTo(feed(file("plain.ndjson", lines)).lines());
    }

    @Test
    void shouldReadPackedFilesAndFilesInTheirOrder() throws IOException {
        String first = report("a", "R0", "2024-03-01T10:00:00Z");
        String second = report("b", "R1", "2024-03-02T10:00:00Z");
        Path whole = file("whole.ndjson", first, second);
        Path plain = file("second.ndjson", second);
        Path packed = folder.resolve("first.ndjson.gz");
        try (GZIPOutputStream out = new GZIPOutputStream(Files.newOutputStream(packed))) {
            out.write(Grid.bytes(first + "\n"));
        }
        assertThat(feed(packed, plain).lines()).isEqualTo(feed(whole).lines()).hasSize(2);
    }

    @Test
    void shouldNameAPackedFileThatEndsTooEarly() throws IOException {
        Path packed = folder.resolve("cut.ndjson.gz");
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (GZIPOutputStream out = new GZIPOutputStream(bytes)) {
            out.write(Grid.bytes((report("a", "R0", "2024-03-01T10:00:00Z") + "\n").repeat(50)));
        }
        Files.write(packed, Arrays.copyOf(bytes.toByteArray(), bytes.size() / 2));
        assertThatThrownBy(() -> feed(packed))
                .isInstanceOf(InputException.class)
                .hasMessage(packed + ": the compressed data end too early");
        Path plain = file("plain.ndjson.gz", "text");
        assertThatThrownBy(() -> feed(plain))
                .isInstanceOf(InputException.class)
                .hasMessage(plain + ": not gzip data, as its name says");
    }

    @Test
    void shouldNameAMissingFileBeforeReadingOthers() throws IOException {
        Path there = file("there.ndjson", report("a", "R0", "2024-03-01T10:00:00Z"));
        Path missing = folder.resolve("missing.ndjson");
        Kept kept = new Kept();
        ReplayFiles files = new ReplayFiles(PARTITIONS, ReplayFiles.DEFAULT_MAX_GAP, kept, (lines, bytes) -> {});
        assertThatThrownBy(() -> files.feed(List.of(there, missing)))
                .isInstanceOf(InputException.class)
                .hasMessage(missing + ": no such file");
        assertThat(kept.records).isEmpty();
    }

    @Test
    void shouldGiveTheSameFromTheLogItWroteAsFromTheReports() throws IOException {
        Path reports = file(
                "a.ndjson",
                report("a", "R0", "2024-03-01T10:00:00Z"),
                "rubbish",
                report("b", "R1", "2024-03-02T10:00:00Z"),
                report("c", "R2", "2024-03-05T23:30:00Z"));
        Path log = folder.resolve("log.ndjson.gz");
        try (LogWriter writer = new LogWriter(log, new Kept())) {
            new ReplayFiles(PARTITIONS, ReplayFiles.DEFAULT_MAX_GAP, writer, (lines, bytes) -> {})
                    .feed(List.of(reports));
        }
        assertThat(feed(log).lines()).isEqualTo(feed(reports).lines());
        Results fromReports = replay(reports);
        Results fromLog = replay(log);
        assertThat(fromReports.seriesDays).hasSize(9);
        assertThat(fromLog.seriesDays).isEqualTo(fromReports.seriesDays);
        assertThat(fromLog.regionDays).isEqualTo(fromReports.regionDays);
        assertThat(fromLog.reasons()).isEqualTo(fromReports.reasons()).containsExactly("not-json");
    }

    @Test
    void shouldNameALineOfALogThatIsNone() throws IOException {
        String line = "{\"topic\":\"case-reports\",\"partition\":0,\"offset\":0,\"timestamp\":1,\"key\":\"a\"}";
        Path log = file("log.ndjson", line, "{\"topic\":\"case-reports\"}");
        assertThatThrownBy(() -> feed(log))
                .isInstanceOf(InputException.class)
                .hasMessage(
                        log + ":2: must be a line of a log with topic, partition, offset and timestamp, as the first"
                                + " line is");
        Path far = file("far.ndjson", line.replace("\"partition\":0", "\"partition\":7"));
        assertThatThrownBy(() -> replay(far))
                .isInstanceOf(InputException.class)
                .hasMessage(far + ":1: partition of case-reports must be in 0..2 (the plan's topics.partitions is 3),"
                        + " was 7");
    }

    @Test
    void shouldRefuseLogsAndBareReportsTogether() throws IOException {
        Path log = file("log.ndjson", "{\"topic\":\"case-reports\",\"partition\":0,\"offset\":0,\"timestamp\":1}");
        Path bare = file("bare.ndjson", report("a", "R0", "2024-03-01T10:00:00Z"));
        assertThatThrownBy(() -> feed(log, bare))
                .isInstanceOf(InputException.class)
                .hasMessage(bare + ": holds bare reports, the files before it a log; a replay must have one kind");
    }
}
