package org.seamwatch.ops;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** A good plan over four regions in a folder, to be spoilt one thing at a time. */
final class PlanFiles {

    static final String PLAN = """
            topics: { partitions: 2, replication: 1 }
            geographies:
              - { file: land.geojson, id: land, timeZone: Europe/Vienna, populationYear: 2023 }
            desk: { falseAlarmsPerYear: 4 }
            series:
              - geography: land
                conditions: [ flu ]
                thinBelow: 1
            """;

    static final String LAND = """
            {"type":"FeatureCollection","features":[
            {"type":"Feature","properties":{"id":"A","name":"Ash","population":1000},"geometry":{"type":"Polygon","coordinates":[[[0,0],[1,0],[1,1],[0,1],[0,0]]]}},
            {"type":"Feature","properties":{"id":"B","name":"Birch","population":2000},"geometry":{"type":"Polygon","coordinates":[[[1,0],[2,0],[2,1],[1,1],[1,0]]]}},
            {"type":"Feature","properties":{"id":"C","name":"Cedar","population":3000},"geometry":{"type":"Polygon","coordinates":[[[2,0],[3,0],[3,1],[2,1],[2,0]]]}},
            {"type":"Feature","properties":{"id":"I","name":"Isle","population":400},"geometry":{"type":"Polygon","coordinates":[[[8,8],[9,8],[9,9],[8,9],[8,8]]]}}
            ]}
            """;

    private final Path folder;

    PlanFiles(Path folder) {
        this.folder = folder;
        plan(PLAN);
        land(LAND);
    }

    Path plan() {
        return folder.resolve("plan.yaml");
    }

    Path land() {
        return folder.resolve("land.geojson");
    }

    PlanFiles plan(String text) {
        return write(plan(), text);
    }

    PlanFiles land(String text) {
        return write(land(), text);
    }

    private PlanFiles write(Path file, String text) {
        try {
            Files.writeString(file, text);
            return this;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
