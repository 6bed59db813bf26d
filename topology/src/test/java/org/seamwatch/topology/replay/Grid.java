package org.seamwatch.topology.replay;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.List;
import java.util.StringJoiner;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.intake.LogRecord;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.geography.GeographyReader;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.schemas.plan.PlanReader;
import org.seamwatch.schemas.record.ClockRecord;

/** A plan over a grid of three by three square regions R0 to R8, and reports in it. */
final class Grid {

    private static final int SIDE = 3;

    private Grid() {}

    static Watch watch(Path folder, int partitions) {
        StringJoiner features = new StringJoiner(",");
        for (int i = 0; i < SIDE * SIDE; i++) {
            features.add(feature(i, i % SIDE, i / SIDE));
        }
        try {
            Files.writeString(
                    folder.resolve("grid.geojson"), "{\"type\":\"FeatureCollection\",\"features\":[" + features + "]}");
            Files.writeString(folder.resolve("plan.yaml"), """
                    topics: { partitions: %d }
                    geographies: [ { file: grid.geojson, id: grid } ]
                    series: [ { geography: grid, conditions: [ flu ], reviseFor: 5d, thinBelow: 1, permutations: 9 } ]
                    """.formatted(partitions));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        Plan plan = PlanReader.read(folder.resolve("plan.yaml"));
        return Watch.of(plan, List.of(GeographyReader.read(plan.geographies().get(0))));
    }

    private static String feature(int id, int x, int y) {
        return """
                {"type":"Feature","properties":{"id":"R%d","name":"Region %d","population":1000},"geometry":
                {"type":"Polygon","coordinates":[[[%d,%d],[%d,%d],[%d,%d],[%d,%d],[%d,%d]]]}}""".formatted(id, id, x, y, x + 1, y, x + 1, y + 1, x, y + 1, x, y);
    }

    /** A report of one case, by report date. */
    static String report(String id, String region, String reportedAt) {
        return """
                {"reportId":"%s","source":"lab","status":"final","condition":"flu","region":"%s","eventDate":"%s",\
                "reportedAt":"%s"}""".formatted(id, region, reportedAt.substring(0, 10), reportedAt);
    }

    static LogRecord record(int partition, long offset, String timestamp, String key, String value) {
        return new LogRecord(Topics.CASE_REPORTS, partition, offset, millis(timestamp), bytes(key), bytes(value));
    }

    static LogRecord report(int partition, long offset, String timestamp, String id, String region) {
        return record(partition, offset, timestamp, id, report(id, region, timestamp));
    }

    static LogRecord clock(String topic, int partition, long offset, String timestamp) {
        return new LogRecord(topic, partition, offset, millis(timestamp), ClockRecord.key(), ClockRecord.value());
    }

    static long millis(String instant) {
        return Instant.parse(instant).toEpochMilli();
    }

    static byte[] bytes(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }

    static String text(byte @Nullable [] bytes) {
        return bytes == null ? "null" : new String(bytes, StandardCharsets.UTF_8);
    }
}
