package org.seamwatch.topology;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Instant;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.apache.kafka.common.header.Headers;
import org.apache.kafka.common.header.internals.RecordHeaders;
import org.apache.kafka.streams.test.TestRecord;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seamwatch.processors.flow.Topics;

/** The processors over one partition: 1 February 2024 is a Thursday; it closes at the start of 3 February. */
class FlowProcessorsTest {

    private static final String SERIES = "northmarch/influenza";

    private final FlowDriver flow;

    FlowProcessorsTest(@TempDir Path folder) {
        this.flow = new FlowDriver(folder);
    }

    @BeforeEach
    void begin() {
        flow.clock("2024-02-01T00:00:00Z");
    }

    @AfterEach
    void close() {
        flow.close();
    }

    @Test
    void shouldCountOnceWhateverTheOrderAndHoweverOftenSent() {
        flow.report("a", "2024-02-01T10:00:00Z", "2024-02-01", 1, 3);
        flow.report("a", "2024-02-01T09:59:00Z", "2024-02-01", 0, 1);
        flow.report("a", "2024-02-01T10:00:00Z", "2024-02-01", 1, 3);
        flow.report("b", "2024-02-01T12:00:00Z", "2024-02-01", 0, 2);
        assertThat(flow.regionDays()).isEmpty();
        flow.clock("2024-02-03T00:00:00Z");
        assertThat(flow.regionDays()).containsExactly("NM-001 2024-02-01 5 0");
    }

    @Test
    void shouldReviseAClosedDayWithTheNextClose() {
        flow.report("a", "2024-02-01T10:00:00Z", "2024-02-01", 0, 3);
        flow.clock("2024-02-03T00:00:00Z");
        assertThat(flow.regionDays()).containsExactly("NM-001 2024-02-01 3 0");
        flow.report("a", "2024-02-03T10:00:00Z", "2024-02-01", 1, 1);
        flow.clock("2024-02-03T23:00:00Z");
        assertThat(flow.regionDays()).isEmpty();
        flow.clock("2024-02-04T00:00:00Z");
        assertThat(flow.regionDays()).containsExactly("NM-001 2024-02-01 1 1");
    }

    @Test
    void shouldStandStillWhereOneInputStandsStill() {
        flow.report("a", "2024-02-01T10:00:00Z", "2024-02-01", 0, 3);
        // Reports pass time by themselves; responses have had no record since the first of February.
        flow.report("b", "2024-02-05T10:00:00Z", "2024-02-05", 0, 1);
        assertThat(flow.regionDays()).isEmpty();
        assertThat(flow.read(Topics.SERIES_DAYS)).isEmpty();
        flow.clock("2024-02-05T11:00:00Z");
        assertThat(flow.regionDays()).containsExactly("NM-001 2024-02-01 3 0");
    }

    @Test
    void shouldTimeResultsByTheHourApplied() {
        flow.report("a", "2024-02-01T10:00:00Z", "2024-02-01", 0, 3);
        flow.clock("2024-02-03T00:00:00Z");
        Instant closed = Instant.parse("2024-02-03T00:00:00Z");
        List<TestRecord<String, String>> days = flow.read(Topics.SERIES_DAYS);
        TestRecord<String, String> last = days.get(days.size() - 1);
        assertThat(last.getRecordTime()).isEqualTo(closed);
        assertThat(last.value()).contains("\"closedAt\":\"2024-02-03T00:00:00Z\"");
        assertThat(flow.read(Topics.REGION_DAYS)).allSatisfy(record -> {
            assertThat(record.key()).isEqualTo(SERIES + "|NM-001|2024-02-01");
            assertThat(record.getRecordTime()).isEqualTo(closed);
        });
    }

    @Test
    void shouldRejectWithReasonAndPlaceAndGoOn() {
        flow.report(null, FlowDriver.json("a", "2024-02-01T10:00:00Z", "2024-02-01", 0, 3), "2024-02-01T10:00:00Z");
        flow.report("b", null, "2024-02-01T10:01:00Z");
        flow.report("c", "{", "2024-02-01T10:02:00Z", new RecordHeaders().add("patient", bytes("Ada")));
        flow.response("northmarch/influenza", "[]", "2024-02-01T10:03:00Z");
        flow.report("d", "2024-02-01T10:04:00Z", "2024-02-01", 0, 1);

        List<TestRecord<byte[], byte[]>> rejected = flow.rejected();
        assertThat(rejected)
                .extracting(r -> headers(r).get("reason"))
                .containsExactly("null-key", "null-value", "not-json", "not-an-object");
        assertThat(rejected)
                .extracting(r -> headers(r).get("topic")
                        + headers(r).get("partition")
                        + headers(r).get("offset"))
                .containsExactly("case-reports01", "case-reports02", "case-reports03", "alarm-responses01");
        assertThat(headers(rejected.get(2)))
                .containsOnlyKeys("reason", "detail", "field", "topic", "partition", "offset");
        assertThat(rejected)
                .allSatisfy(r -> assertThat(r.getRecordTime()).isEqualTo(Instant.parse("2024-02-01T11:00:00Z")));
        assertThat(rejected.get(0).key()).isNull();
        assertThat(rejected.get(1).value()).isNull();
        assertThat(rejected.get(2).value()).isEqualTo(bytes("{"));
        flow.clock("2024-02-03T00:00:00Z");
        assertThat(flow.regionDays()).containsExactly("NM-001 2024-02-01 1 0");
    }

    @Test
    void shouldCutWhatIsTooLongAndSayHowLongItWas() {
        String longText = "x".repeat(300_000);
        flow.report("k" + longText, longText, "2024-02-01T10:00:00Z");
        TestRecord<byte[], byte[]> rejected = flow.rejected().get(0);
        assertThat(rejected.key()).hasSize(256 * 1024);
        assertThat(rejected.value()).hasSize(256 * 1024);
        assertThat(headers(rejected)).containsEntry("length", "300000").containsEntry("keyLength", "300001");
        // sha256sum (GNU coreutils) of 300,000 times x.
        assertThat(headers(rejected)).containsEntry("sha256", SHA256_OF_300000_X);
        assertThat(headers(rejected).get("keySha256")).hasSize(64);
    }

    private static final String SHA256_OF_300000_X = "29927e273accc68286005017f7fa6e4f27bddb4db3083ff8b8d4c3667905b7fa";

    @Test
    void shouldForwardNothingPersonal() {
        String secret = "Ada Lovelace";
        String json = FlowDriver.json("a", "2024-02-01T10:00:00Z", "2024-02-01", 0, 3);
        String withMore = json.substring(0, json.length() - 1) + ",\"patient\":{\"name\":\"" + secret + "\"},\""
                + secret + "\":1}";
        flow.report(
                "a",
                withMore,
                "2024-02-01T10:00:00Z",
                new RecordHeaders().add("patient", bytes(secret)).add(secret, bytes("x")));
        flow.clock("2024-02-03T00:00:00Z");
        List<FlowDriver.ProducedRecord> produced = flow.produced();
        assertThat(produced)
                .extracting(FlowDriver.ProducedRecord::topic)
                .contains("seamwatch.region-days", "seamwatch.series-days", "flow-report-ledger-changelog");
        assertThat(produced).allSatisfy(each -> {
            assertThat(each.record().headers()).isEmpty();
            assertThat(each.text()).doesNotContain(secret);
        });
    }

    private static Map<String, String> headers(TestRecord<?, ?> record) {
        Map<String, String> texts = new TreeMap<>();
        Headers headers = record.headers();
        headers.forEach(h -> texts.put(h.key(), new String(h.value(), StandardCharsets.UTF_8)));
        return texts;
    }

    private static byte[] bytes(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }
}
