package org.seamwatch.ops;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seamwatch.fixtures.scenario.Scenario;
import org.seamwatch.fixtures.scenario.ScenarioOptions;
import org.seamwatch.fixtures.scenario.ScenarioWriter;
import org.seamwatch.schemas.record.AlarmResponseReader;
import org.seamwatch.schemas.record.CaseReportReader;
import org.seamwatch.schemas.record.ReadResult;

/** What the README shows, done. */
class ReadmeTest {

    private static final Pattern BLOCK = Pattern.compile("(?m)^( *)```(\\w+)\\n(.*?)^ *```", Pattern.DOTALL);
    private static final Pattern SPACE = Pattern.compile(" +");
    private static final String COMMAND = "ops/seamwatch ";

    @Test
    void shouldRunTheDemoReplayItsLogAndGetTheSameBytes(@TempDir Path folder) throws IOException {
        List<String> lines = new ArrayList<>();
        blocks("sh").forEach(block -> lines.addAll(block.lines().toList()));
        int compared = 0;
        for (String line : lines) {
            List<String> words = SPACE.splitAsStream(line.strip()).toList();
            if (line.startsWith(COMMAND)) {
                Run run = Run.of((Object[]) inFolder(folder, words.subList(1, words.size())));
                assertThat(run.code()).as(line + "\n" + run.err()).isZero();
            } else if (words.get(0).equals("cmp")) {
                assertThat(folder.resolve(words.get(2))).hasSameBinaryContentAs(folder.resolve(words.get(1)));
                compared++;
            }
        }
        assertThat(compared).isPositive();
        for (String name : List.of("region-days", "alarms", "rejected")) {
            assertThat(folder.resolve("again").resolve(name + ".ndjson"))
                    .hasSameBinaryContentAs(folder.resolve("demo-out").resolve(name + ".ndjson"));
        }
        assertThat(folder.resolve("again/accounting.json"))
                .hasSameBinaryContentAs(folder.resolve("demo-out/accounting.json"));
    }

    private static String[] inFolder(Path folder, List<String> words) {
        return words.stream()
                .map(word -> word.startsWith("demo-out") || word.equals("again")
                        ? folder.resolve(word).toString()
                        : word)
                .toArray(String[]::new);
    }

    @Test
    void shouldCheckThePlan(@TempDir Path folder) throws IOException {
        String plan = blocks("yaml").get(0);
        Files.writeString(folder.resolve("plan.yaml"), plan);
        new ScenarioWriter(Scenario.of(ScenarioOptions.defaults().withDays(40))).write(folder.resolve("made-up"));
        Files.copy(folder.resolve("made-up").resolve(ScenarioWriter.GEOGRAPHY), folder.resolve("districts.geojson"));

        Run run = Run.of("check", "--plan", folder.resolve("plan.yaml").toString());

        assertThat(run.code()).as(run.err()).isZero();
    }

    @Test
    void shouldReadTheReportAndTheResponse() throws IOException {
        List<byte[]> records = blocks("json").stream()
                .map(text -> text.strip().getBytes(StandardCharsets.UTF_8))
                .toList();

        assertThat(CaseReportReader.read(records.get(0))).isInstanceOf(ReadResult.Parsed.class);
        assertThat(AlarmResponseReader.read(records.get(1))).isInstanceOf(ReadResult.Parsed.class);
    }

    /** Blocks of a language, the indentation of the first line taken from all. */
    private static List<String> blocks(String language) throws IOException {
        List<String> blocks = new ArrayList<>();
        Matcher block = BLOCK.matcher(Files.readString(Path.of("..", "README.md")));
        while (block.find()) {
            if (block.group(2).equals(language)) {
                blocks.add(block.group(3).replaceAll("(?m)^" + block.group(1), ""));
            }
        }
        return blocks;
    }
}
