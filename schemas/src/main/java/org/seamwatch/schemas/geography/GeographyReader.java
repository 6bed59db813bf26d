package org.seamwatch.schemas.geography;

import com.fasterxml.jackson.core.JacksonException;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.InputException;
import org.seamwatch.schemas.plan.GeographyPlan;

/**
 * Reads a geography from a GeoJSON FeatureCollection, one feature at a time. What it refuses is one
 * {@link InputException} that names file, line, feature, region and field.
 */
public final class GeographyReader {

    private static final JsonMapper MAPPER = JsonMapper.builder().build();

    private final Path file;
    private final FeatureReader reader;
    private final List<Feature> features = new ArrayList<>();
    private @Nullable String type;
    private boolean hasFeatures;

    private GeographyReader(GeographyPlan plan) {
        file = plan.file();
        reader = new FeatureReader(plan);
    }

    /** The geography that the plan names. */
    public static Geography read(GeographyPlan plan) {
        GeographyReader reader = new GeographyReader(plan);
        reader.readFile();
        return reader.geography(plan);
    }

    private void readFile() {
        if (!Files.exists(file)) {
            throw new InputException(file + ": no such file");
        }
        try (InputStream in = new BufferedInputStream(Files.newInputStream(file));
                JsonParser parser = MAPPER.createParser(in)) {
            readCollection(parser);
        } catch (JacksonException e) {
            throw new InputException(file + ":" + e.getLocation().getLineNr() + ": not JSON, breaks at column "
                    + e.getLocation().getColumnNr());
        } catch (IOException e) {
            throw new InputException(
                    file + ": " + (Files.isDirectory(file) ? "is a folder, must be a file" : "cannot be read"));
        }
    }

    private void readCollection(JsonParser parser) throws IOException {
        JsonToken first = parser.nextToken();
        if (first != JsonToken.START_OBJECT) {
            throw new InputException(file + (first == null ? ": is empty," : ":") + " must be a FeatureCollection");
        }
        while (parser.nextToken() == JsonToken.FIELD_NAME) {
            String name = parser.currentName();
            JsonToken value = parser.nextToken();
            if (name.equals("type")) {
                type = parser.getText();
            } else if (name.equals("features") && value == JsonToken.START_ARRAY) {
                hasFeatures = true;
                readFeatures(parser);
            }
            parser.skipChildren();
        }
        if (!"FeatureCollection".equals(type)) {
            throw new InputException(
                    file + ": type must be FeatureCollection, was " + (type == null ? "missing" : type));
        }
        if (!hasFeatures) {
            throw new InputException(file + ": features must be an array");
        }
        if (parser.nextToken() != null) {
            throw new InputException(file + ":" + parser.currentTokenLocation().getLineNr()
                    + ": must be one FeatureCollection, has more behind it");
        }
    }

    private void readFeatures(JsonParser parser) throws IOException {
        int index = 0;
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            int line = parser.currentTokenLocation().getLineNr();
            JsonNode node = MAPPER.readTree(parser);
            reader.read(node, new FeaturePlace(file, line, index, null)).ifPresent(features::add);
            index++;
        }
    }

    private Geography geography(GeographyPlan plan) {
        if (reader.count() == 0) {
            throw new InputException(file + ": features must have at least one region, was empty");
        }
        if (features.isEmpty()) {
            throw new InputException(file + ": regions \"" + plan.regions() + "\" of geography \"" + plan.id()
                    + "\" must match at least one region, match none of " + reader.count());
        }
        refuseSomePopulations();
        List<Region> regions = features.stream()
                .map(Feature::region)
                .sorted(Comparator.comparing(Region::id))
                .toList();
        return new Geography(plan, regions, GeographyHash.sha256(regions));
    }

    private void refuseSomePopulations() {
        boolean some = features.stream().anyMatch(feature -> feature.population() != null);
        for (Feature feature : features) {
            if (some && feature.population() == null) {
                throw feature.place()
                        .error("properties must have " + FeatureReader.DEFAULT_POPULATION
                                + " on every region or on none, was missing");
            }
        }
    }
}
