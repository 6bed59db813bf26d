package org.seamwatch.schemas.geography;

import java.nio.file.Path;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.InputException;

/**
 * Where a feature lies, for messages.
 *
 * @param file the file
 * @param line line of the file on which the feature starts
 * @param index its place in {@code features}, from 0
 * @param id its region id, once it is known
 */
record FeaturePlace(
        Path file, int line, int index, @Nullable String id) {

    FeaturePlace named(String regionId) {
        return new FeaturePlace(file, line, index, regionId);
    }

    /** An error in one field: {@code f.geojson:3: features[2] "NM-03": population must be above 0, was 0}. */
    InputException error(String message) {
        String region = id == null ? "" : " \"" + id + "\"";
        return new InputException(file + ":" + line + ": features[" + index + "]" + region + ": " + message);
    }
}
