package org.seamwatch.topology.replay;

import com.fasterxml.jackson.core.JacksonException;
import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import org.apache.kafka.common.utils.Utils;

/** The record key of a bare report, and the partition a producer would choose for it. */
public final class ReportKey {

    private static final JsonFactory JSON = new JsonFactory();
    private static final byte[] NONE = new byte[0];

    private ReportKey() {}

    /** The partition that Kafka's producers choose for a key: murmur2, as its default partitioner has it. */
    public static int partition(byte[] key, int partitions) {
        return Utils.toPositive(Utils.murmur2(key)) % partitions;
    }

    /**
     * The report id of a line that is no readable report, where one can be found in it. Otherwise the key is empty
     * rather than null, so that intake gives the fault of the line itself as the reason.
     */
    static byte[] ofUnreadable(byte[] line) {
        try (JsonParser parser = JSON.createParser(line)) {
            if (parser.nextToken() != JsonToken.START_OBJECT) {
                return NONE;
            }
            while (parser.nextToken() == JsonToken.FIELD_NAME) {
                boolean wanted = parser.currentName().equals("reportId");
                JsonToken value = parser.nextToken();
                if (wanted) {
                    return value == JsonToken.VALUE_STRING ? parser.getText().getBytes(StandardCharsets.UTF_8) : NONE;
                }
                parser.skipChildren();
            }
            return NONE;
        } catch (JacksonException e) {
            return NONE;
        } catch (IOException e) {
            throw new UncheckedIOException("bytes in memory can be read", e);
        }
    }
}
