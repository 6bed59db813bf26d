package org.seamwatch.schemas.geography;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Predicate;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.plan.GeographyPlan;

/** Reads the features of one file, one by one. */
final class FeatureReader {

    /** Property with the population where the plan names none. */
    static final String DEFAULT_POPULATION = "population";

    private static final int MAX_ID = 200;

    private final GeographyPlan plan;
    private final Predicate<String> wanted;
    private final String populationProperty;
    private final Map<String, FeaturePlace> places = new HashMap<>();

    FeatureReader(GeographyPlan plan) {
        this.plan = plan;
        wanted = Regions.pattern(plan.regions());
        populationProperty = plan.population() == null ? DEFAULT_POPULATION : plan.population();
    }

    /** How many features were read, wanted or not. */
    int count() {
        return places.size();
    }

    /** The feature, or nothing where the plan does not want its region. Ids are checked all the same. */
    Optional<Feature> read(JsonNode node, FeaturePlace unnamed) {
        if (!node.isObject() || !node.path("type").asText().equals("Feature")) {
            throw unnamed.error("type must be Feature");
        }
        JsonNode properties = node.path("properties");
        if (!properties.isObject()) {
            throw unnamed.error("properties must be an object, was " + words(properties));
        }
        String id = id(properties.path(plan.regionId()), unnamed);
        FeaturePlace place = unnamed.named(id);
        FeaturePlace earlier = places.putIfAbsent(id, place);
        if (earlier != null) {
            throw place.error(plan.regionId() + " must be there once, is the id of features[" + earlier.index()
                    + "] on line " + earlier.line() + " already");
        }
        if (!wanted.test(id)) {
            return Optional.empty();
        }
        return Optional.of(new Feature(
                place,
                id,
                name(properties.path(plan.regionName()), place),
                population(properties.path(populationProperty), place),
                new ShapeReader(place).read(node.path("geometry"))));
    }

    private String id(JsonNode value, FeaturePlace place) {
        String id = text(value, plan.regionId(), place);
        if (id.isEmpty() || id.length() > MAX_ID) {
            throw place.error(plan.regionId() + " must have 1 to " + MAX_ID + " characters, was " + quoted(id));
        }
        if (id.chars().anyMatch(c -> c == '/' || c == '|' || Character.isWhitespace(c) || Character.isISOControl(c))) {
            throw place.error(plan.regionId() + " must have no /, | or white space, was " + quoted(id));
        }
        return id;
    }

    private String name(JsonNode value, FeaturePlace place) {
        String name = text(value, plan.regionName(), place);
        if (name.isBlank() || name.chars().anyMatch(Character::isISOControl)) {
            throw place.error(plan.regionName() + " must be a text without control characters, was " + quoted(name));
        }
        return name;
    }

    /** A text, or a whole number as it is written. */
    private static String text(JsonNode value, String property, FeaturePlace place) {
        if (value.isMissingNode() || value.isNull()) {
            throw place.error("properties must have " + property + ", was " + words(value));
        }
        if (!value.isTextual() && !value.isIntegralNumber()) {
            throw place.error(property + " must be a string, was " + words(value));
        }
        return value.asText();
    }

    private @Nullable Double population(JsonNode value, FeaturePlace place) {
        if (value.isMissingNode() || value.isNull()) {
            if (plan.population() != null) {
                throw place.error("properties must have " + populationProperty + ", was " + words(value));
            }
            return null;
        }
        if (!value.isNumber()) {
            throw place.error(populationProperty + " must be a number, was "
                    + (value.isTextual() ? quoted(value.asText()) : words(value)));
        }
        double population = value.doubleValue();
        if (!(population > 0 && population < Double.POSITIVE_INFINITY)) {
            throw place.error(populationProperty + " must be above 0, was " + value.asText());
        }
        return population;
    }

    private static String quoted(String text) {
        StringBuilder shown = new StringBuilder();
        text.codePoints().limit(80).forEach(c -> shown.appendCodePoint(Character.isISOControl(c) ? '?' : c));
        return '"' + shown.toString() + '"';
    }

    static String words(JsonNode value) {
        return switch (value.getNodeType()) {
            case MISSING -> "missing";
            case NULL -> "null";
            case ARRAY -> "an array";
            case OBJECT -> "an object";
            case STRING -> "a string";
            case NUMBER -> "a number";
            default -> "true or false";
        };
    }
}
