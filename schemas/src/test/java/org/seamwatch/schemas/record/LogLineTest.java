package org.seamwatch.schemas.record;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.seamwatch.schemas.json.Json;

class LogLineTest {

    @Test
    void shouldKeepTextAsText() {
        LogLine line = LogLine.of(
                "case-reports", 3, 17, 1706925600000L, Reports.utf8("r"), Reports.utf8("{\"a\": \"\u00e9\"}"));
        assertThat(Json.line(line))
                .isEqualTo("{\"topic\":\"case-reports\",\"partition\":3,\"offset\":17,\"timestamp\":1706925600000,"
                        + "\"key\":\"r\",\"value\":\"{\\\"a\\\": \\\"\u00e9\\\"}\"}");
    }

    @Test
    void shouldLeaveOutWhatIsNull() {
        LogLine line = LogLine.of("case-reports", 0, 0, -1, null, null);
        assertThat(Json.line(line))
                .isEqualTo("{\"topic\":\"case-reports\",\"partition\":0,\"offset\":0,\"timestamp\":-1}");
        assertThat(line.keyBytes()).isNull();
        assertThat(line.valueBytes()).isNull();
    }

    @Test
    void shouldGiveAnyBytesBackExactly() {
        SplittableRandom random = new SplittableRandom(64);
        int base64 = 0;
        for (int i = 0; i < 3000; i++) {
            byte[] key = bytes(random, 128);
            byte[] value = bytes(random, random.nextBoolean() ? 128 : 256);
            LogLine line = LogLine.of("t", 0, i, i, key, value);
            LogLine back = Json.read(Json.bytes(line), LogLine.class);
            assertThat(back.keyBytes()).isEqualTo(key);
            assertThat(back.valueBytes()).isEqualTo(value);
            base64 += line.valueBase64() == null ? 0 : 1;
        }
        assertThat(base64).isBetween(1000, 2000);
    }

    @Test
    void shouldWriteWhyARecordWasRejected() {
        byte[] latin1 = "caf\u00e9".getBytes(StandardCharsets.ISO_8859_1);
        RejectedLine line = RejectedLine.of(
                "case-reports",
                1,
                2,
                new ReadResult.Unusable<CaseReport>(RejectReason.NOT_UTF8, "", "the value must be UTF-8"),
                null,
                latin1,
                null,
                null);
        assertThat(Json.line(line))
                .isEqualTo(
                        "{\"topic\":\"case-reports\",\"partition\":1,\"offset\":2,\"reason\":\"not-utf8\",\"field\":\"\","
                                + "\"detail\":\"the value must be UTF-8\",\"valueBase64\":\"Y2Fm6Q==\"}");
    }

    private static byte[] bytes(SplittableRandom random, int bound) {
        byte[] bytes = new byte[random.nextInt(12)];
        for (int i = 0; i < bytes.length; i++) {
            bytes[i] = (byte) random.nextInt(bound);
        }
        return bytes;
    }
}
