package org.seamwatch.schemas.plan;

import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.seamwatch.schemas.InputException;
import org.yaml.snakeyaml.nodes.MappingNode;
import org.yaml.snakeyaml.nodes.Node;
import org.yaml.snakeyaml.nodes.ScalarNode;
import org.yaml.snakeyaml.nodes.SequenceNode;
import org.yaml.snakeyaml.nodes.Tag;

/** A value of the plan, with its path and line. Scalars are taken as written, so an id 007 stays 007. */
final class YamlValue {

    private static final Pattern WHOLE = Pattern.compile("-?[0-9]{1,9}");
    private static final Pattern DAYS = Pattern.compile("(-?[0-9]{1,9})d");
    private static final Pattern DECIMAL = Pattern.compile("[-+]?([0-9]+(\\.[0-9]*)?|\\.[0-9]+)([eE][-+]?[0-9]{1,3})?");
    private static final Pattern KILOMETRES = Pattern.compile("(.*[0-9.]) ?km");

    private final YamlFile file;
    private final String path;
    private final Node node;

    YamlValue(YamlFile file, String path, Node node) {
        this.file = file;
        this.path = path;
        this.node = node;
    }

    String path() {
        return path;
    }

    boolean isScalar() {
        return node instanceof ScalarNode;
    }

    boolean isMap() {
        return node instanceof MappingNode;
    }

    /** The scalar as written. */
    String text() {
        if (!(node instanceof ScalarNode scalar)) {
            throw rule("must be one value, was " + kind());
        }
        return scalar.getValue();
    }

    YamlMap map() {
        if (node instanceof MappingNode mapping) {
            return new YamlMap(file, path, mapping);
        }
        if (node instanceof ScalarNode && Tag.NULL.equals(node.getTag())) {
            return YamlMap.empty(file, path, node);
        }
        throw rule("must have keys, was " + kind());
    }

    /** The items of a list. */
    List<YamlValue> list() {
        if (!(node instanceof SequenceNode sequence)) {
            throw rule("must be a list, was " + kind());
        }
        List<YamlValue> items = new ArrayList<>();
        for (Node item : sequence.getValue()) {
            YamlValue value = new YamlValue(file, path + "[" + items.size() + "]", item);
            if (Tag.NULL.equals(item.getTag())) {
                throw value.rule("must have a value, was empty");
            }
            items.add(value);
        }
        return items;
    }

    /** The items of a list that must have some. */
    List<YamlValue> filledList() {
        List<YamlValue> items = list();
        if (items.isEmpty()) {
            throw rule("must have at least one item, was empty");
        }
        return items;
    }

    int integer(int lowest, int highest) {
        String text = text();
        if (!WHOLE.matcher(text).matches()) {
            throw rule("must be a whole number, was " + quoted(text));
        }
        return inRange(Integer.parseInt(text), lowest, highest, text);
    }

    int days(int lowest, int highest) {
        String text = text();
        Matcher days = DAYS.matcher(text);
        if (!days.matches()) {
            throw rule("must be whole days like 28d, was " + quoted(text));
        }
        return inRange(Integer.parseInt(days.group(1)), lowest, highest, text);
    }

    private int inRange(int value, int lowest, int highest, String text) {
        if (value < lowest || value > highest) {
            throw rule("must be in " + lowest + " to " + highest + ", was " + text);
        }
        return value;
    }

    double decimal() {
        return decimal(text());
    }

    private double decimal(String text) {
        if (!DECIMAL.matcher(text).matches()) {
            throw rule("must be a number, was " + quoted(text));
        }
        return Double.parseDouble(text);
    }

    double above0() {
        double value = decimal();
        if (!(value > 0 && value < Double.POSITIVE_INFINITY)) {
            throw rule("must be above 0, was " + text());
        }
        return value;
    }

    double kilometres() {
        Matcher kilometres = KILOMETRES.matcher(text());
        if (!kilometres.matches()) {
            throw rule("must be a distance like 40km, was " + quoted(text()));
        }
        double value = decimal(kilometres.group(1));
        if (!(value > 0 && value <= 20_000)) {
            throw rule("must be above 0km, at most 20000km, was " + text());
        }
        return value;
    }

    LocalDate date() {
        try {
            return LocalDate.parse(text());
        } catch (DateTimeParseException e) {
            throw rule("must be a date like 2024-01-06, was " + quoted(text()));
        }
    }

    /** An id: not empty, at most 200 characters, without {@code /}, {@code |}, white space and control characters. */
    String id() {
        String id = text();
        if (id.isEmpty() || id.length() > 200) {
            throw rule("must have 1 to 200 characters, was " + quoted(id));
        }
        if (id.chars().anyMatch(c -> c == '/' || c == '|' || Character.isWhitespace(c) || Character.isISOControl(c))) {
            throw rule("must have no /, | or white space, was " + quoted(id));
        }
        return id;
    }

    /** Patterns of region ids: at least one, with {@code *} for any characters and commas between them. */
    String patterns() {
        String patterns = text();
        if (patterns.replace(",", "").isBlank()) {
            throw rule("must have patterns like 05*, was " + quoted(patterns));
        }
        return patterns;
    }

    /** One of some words. */
    String word(String what, List<String> known) {
        String word = text();
        if (!known.contains(word)) {
            throw error("unknown " + what + " " + quoted(word) + Nearest.known(word, known));
        }
        return word;
    }

    /** An error that names the path, then a rule of its value: {@code path must be ..., was ...}. */
    InputException rule(String rule) {
        return file.error(node, path.isEmpty() ? "the plan " + rule : path + " " + rule);
    }

    /** An error that names the path, then says what is wrong: {@code path: unknown ...}. */
    InputException error(String message) {
        return file.error(node, path + ": " + message);
    }

    private static String quoted(String text) {
        String shown = text.codePoints()
                .limit(80)
                .map(c -> Character.isISOControl(c) ? '?' : c)
                .collect(StringBuilder::new, StringBuilder::appendCodePoint, StringBuilder::append)
                .toString();
        return '"' + shown + '"';
    }

    private String kind() {
        if (node instanceof MappingNode) {
            return "a mapping";
        }
        return node instanceof SequenceNode ? "a list" : quoted(((ScalarNode) node).getValue());
    }
}
