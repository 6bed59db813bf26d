package org.seamwatch.topology.replay;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seamwatch.schemas.InputException;
import org.seamwatch.schemas.record.AccountingLine;
import org.seamwatch.schemas.record.ReadResult;
import org.seamwatch.schemas.record.RegionDay;
import org.seamwatch.schemas.record.RejectReason;
import org.seamwatch.schemas.record.RejectedLine;

class ResultFilesTest {

    private final Path folder;

    ResultFilesTest(@TempDir Path folder) {
        this.folder = folder;
    }

    private static RegionDay day(String region, int day, int revision) {
        return new RegionDay(1, "grid/flu", region, LocalDate.of(2024, 3, day), 1, revision);
    }

    private static RejectedLine rejected(int partition, long offset) {
        return RejectedLine.of(
                "case-reports",
                partition,
                offset,
                new ReadResult.Unusable<>(RejectReason.NOT_JSON, "", "not JSON"),
                null,
                null,
                null,
                null);
    }

    private List<String> names() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(file -> file.getFileName().toString()).sorted().toList();
        }
    }

    @Test
    void shouldSortWhateverTheOrderTheRecordsCameIn() throws IOException {
        ResultFiles files = new ResultFiles();
        files.regionDay(day("R2", 1, 0), 9);
        files.regionDay(day("R1", 2, 1), 8);
        files.regionDay(day("R1", 2, 0), 7);
        files.regionDay(day("R1", 10, 0), 6);
        files.rejected(rejected(1, 0));
        files.rejected(rejected(0, 10));
        files.rejected(rejected(0, 9));
        files.write(folder, List.of(new AccountingLine("case-reports", 0, 0, 0, 0, 0, 0, 0, new TreeMap<>())));
        assertThat(Files.readAllLines(folder.resolve(ResultFiles.REGION_DAYS)))
                .extracting(line ->
                        line.replaceAll(".*\"region\":\"(..)\",\"day\":\"(.*?)\".*\"revision\":(.).*", "$1 $2 $3"))
                .containsExactly("R1 2024-03-02 0", "R1 2024-03-02 1", "R1 2024-03-10 0", "R2 2024-03-01 0");
        assertThat(Files.readAllLines(folder.resolve(ResultFiles.REJECTED)))
                .extracting(line -> line.replaceAll(".*\"partition\":(\\d+),\"offset\":(\\d+).*", "$1 $2"))
                .containsExactly("0 9", "0 10", "1 0");
        assertThat(Files.readString(folder.resolve(ResultFiles.ACCOUNTING))).isEqualTo("""
                        [
                        {"topic":"case-reports","partition":0,"read":0,"accepted":0,"duplicate":0,"superseded":0,\
                        "rejected":0,"control":0,"reasons":{}}
                        ]
                        """);
        assertThat(names())
                .containsExactly(
                        "accounting.json",
                        "alarms.ndjson",
                        "region-days.ndjson",
                        "rejected.ndjson",
                        "series-days.ndjson");
    }

    @Test
    void shouldChangeNoFileWhereOneCannotBeWritten() throws IOException {
        ResultFiles first = new ResultFiles();
        first.regionDay(day("R1", 1, 0), 0);
        first.write(folder, List.of());
        byte[] before = Files.readAllBytes(folder.resolve(ResultFiles.REGION_DAYS));
        Path inTheWay = Files.createDirectory(folder.resolve(ResultFiles.REJECTED + ".part"));
        ResultFiles second = new ResultFiles();
        assertThatThrownBy(() -> second.write(folder, List.of()))
                .isInstanceOf(ResultFileException.class)
                .hasMessageStartingWith(inTheWay + ": cannot be written");
        assertThat(Files.readAllBytes(folder.resolve(ResultFiles.REGION_DAYS))).isEqualTo(before);
        Files.delete(inTheWay);
        assertThat(names()).hasSize(5).noneMatch(name -> name.endsWith(".part"));
    }

    @Test
    void shouldNameAFolderThatCannotBeMade() throws IOException {
        Path file = Files.writeString(folder.resolve("taken"), "");
        assertThatThrownBy(() -> ResultFiles.prepare(file))
                .isInstanceOf(InputException.class)
                .hasMessage(file + ": the folder cannot be made, a file has its name");
        Path below = folder.resolve("new/deep");
        ResultFiles.prepare(below);
        assertThat(below).isDirectory();
    }
}
