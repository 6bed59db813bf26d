package org.seamwatch.schemas.record;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.HexFormat;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class UntrustedJsonTest {

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "'' | not-json | the value must be one JSON object, was empty",
                "'  ' | not-json | the value must be one JSON object, was empty",
                "nonsense | not-json | the value must be one JSON object, breaks at line 1, column 1",
                "{\"a\":1 | not-json | the value must be one JSON object, breaks at line 1, column 7",
                "{'a':1} | not-json | the value must be one JSON object, breaks at line 1, column 2",
                "{\"a\":NaN} | not-json | the value must be one JSON object, breaks at line 1, column 9",
                "{\"a\":1,} | not-json | the value must be one JSON object, breaks at line 1, column 8",
                "{} {} | not-json | the value must be one JSON object, has more behind it at line 1, column 4",
                "[1,2] | not-an-object | the value must be a JSON object, was an array",
                "\"x\" | not-an-object | the value must be a JSON object, was a string",
                "null | not-an-object | the value must be a JSON object, was null",
                "-1e5 | not-an-object | the value must be a JSON object, was a number",
                "false | not-an-object | the value must be a JSON object, was true or false",
                "{\"secret\":1,\"secret\":2} | duplicate-field | each field must be there once, an unknown one was twice",
            })
    void shouldSayWhatIsWrongWithTheDocument(String text, String reason, String detail) {
        CaseReportReaderTest.assertUnusable(text, reason, "", detail);
    }

    @Test
    void shouldRefuseDuplicateKnownFields() {
        CaseReportReaderTest.assertUnusable(
                Reports.REPORT.replace("{\"version\"", "{\"count\": 3, \"version\""),
                "duplicate-field",
                "count",
                "count must be there once, was there twice");
    }

    @Test
    void shouldRefuseARecordWithoutValue() {
        CaseReportReaderTest.assertUnusable(null, "null-value", "", "a record must have a value, had none");
    }

    @Test
    void shouldRefuseDeepNestingAtAnyLength() {
        for (int depth : new int[] {32, 1000, 200_000}) {
            CaseReportReaderTest.assertUnusable(
                    "{\"x\":" + "[".repeat(depth), "too-deep", "", "objects and arrays must be nested at most 32 deep");
        }
        assertThat(read(Reports.utf8(Reports.REPORT.replace(
                        "{\"version\"", "{\"x\":" + "[".repeat(31) + "]".repeat(31) + ",\"version\""))))
                .isInstanceOf(ReadResult.Parsed.class);
    }

    @Test
    void shouldRefuseARecordLongerThanAnyReport() {
        byte[] padded = Reports.utf8(Reports.REPORT + " ".repeat(262_145 - Reports.utf8(Reports.REPORT).length));
        assertThat(read(Arrays.copyOf(padded, 262_144))).isInstanceOf(ReadResult.Parsed.class);
        assertThat(read(padded))
                .isEqualTo(new ReadResult.Unusable<>(
                        RejectReason.TOO_LARGE, "", "a record must have at most 262144 bytes, had 262145"));
    }

    @Test
    void shouldSkipLargeUnknownFieldsButNotTakeLargeTexts() {
        String large = "x".repeat(200_000);
        assertThat(read(Reports.utf8(Reports.report().put("scan", large).toString())))
                .isInstanceOf(ReadResult.Parsed.class);
        CaseReportReaderTest.assertUnusable(
                Reports.report().put("source", large).toString(),
                "too-large",
                "source",
                "source must have at most 65536 characters, has more");
        CaseReportReaderTest.assertUnusable(
                "{\"" + large + "\": 1}", "too-large", "", "names of fields must have at most 65536 characters");
        CaseReportReaderTest.assertUnusable(
                Reports.REPORT.replace("\"count\": 3", "\"count\": " + "9".repeat(60_000)),
                "out-of-range",
                "count",
                "count must be in 0 to 1000000, was " + "9".repeat(80) + "...");
    }

    @ParameterizedTest
    @ValueSource(strings = {"c3 28", "80", "c0 af", "ed a0 80", "f4 90 80 80", "e2 82", "ff fe 7b 00 7d 00"})
    void shouldRefuseBytesThatAreNotUtf8(String hex) {
        byte[] start = Reports.utf8("{\"x\":\"");
        byte[] wrong = HexFormat.ofDelimiter(" ").parseHex(hex);
        byte[] value = Arrays.copyOf(start, start.length + wrong.length);
        System.arraycopy(wrong, 0, value, start.length, wrong.length);

        assertThat(read(value))
                .isEqualTo(new ReadResult.Unusable<CaseReport>(
                        RejectReason.NOT_UTF8, "", "the value must be UTF-8, has bytes that are not"));
    }

    @Test
    void shouldNotGuessOtherEncodings() {
        byte[] utf16 = Reports.REPORT.getBytes(StandardCharsets.UTF_16BE);
        assertThat(reason(utf16)).isEqualTo(RejectReason.NOT_JSON);
        assertThat(reason(Reports.utf8("\ufeff" + Reports.REPORT))).isEqualTo(RejectReason.NOT_JSON);
    }

    @Test
    void shouldTakeTheReplacementCharacterItself() {
        assertThat(read(Reports.utf8(Reports.report().put("reportId", "\ufffd").toString())))
                .isInstanceOf(ReadResult.Parsed.class);
    }

    @Test
    void shouldNeverQuoteUnknownFields() {
        String text = "{\"patient\": \"Jane\", \"reportId\": 1, \"deep\": {\"name\": \"Jane\"}}";
        assertThat(read(Reports.utf8(text)).toString()).doesNotContain("Jane").doesNotContain("patient");
        assertThat(read(Reports.utf8("{\"patient\": \"Jane\" \"reportId\"")).toString())
                .doesNotContain("Jane");
    }

    @Test
    void shouldNeverThrowOnBrokenBytes() {
        SplittableRandom random = new SplittableRandom(4);
        byte[] good = Reports.utf8(Reports.REPORT);
        int unusable = 0;
        for (int i = 0; i < 30_000; i++) {
            byte[] broken = broken(good, random);
            unusable += read(broken) instanceof ReadResult.Unusable ? 1 : 0;
            AlarmResponseReader.read(broken);
        }
        assertThat(unusable).isBetween(15_000, 30_000);
    }

    private static byte[] broken(byte[] good, SplittableRandom random) {
        byte[] broken = Arrays.copyOf(good, random.nextInt(4) == 0 ? random.nextInt(good.length) : good.length);
        for (int i = random.nextInt(4); i >= 0 && broken.length > 0; i--) {
            int at = random.nextInt(broken.length);
            broken[at] = random.nextBoolean() ? good[random.nextInt(good.length)] : (byte) random.nextInt(256);
        }
        return broken;
    }

    private static RejectReason reason(byte[] value) {
        return ((ReadResult.Unusable<CaseReport>) read(value)).reason();
    }

    private static ReadResult<CaseReport> read(byte[] value) {
        return CaseReportReader.read(value);
    }
}
