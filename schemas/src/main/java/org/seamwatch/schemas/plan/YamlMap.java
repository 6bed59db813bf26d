package org.seamwatch.schemas.plan;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.InputException;
import org.yaml.snakeyaml.nodes.MappingNode;
import org.yaml.snakeyaml.nodes.Node;
import org.yaml.snakeyaml.nodes.NodeTuple;
import org.yaml.snakeyaml.nodes.ScalarNode;
import org.yaml.snakeyaml.nodes.Tag;

/** A mapping of the plan. A key without a value counts as absent. */
final class YamlMap {

    private final YamlFile file;
    private final String path;
    private final Node node;
    private final Map<String, YamlValue> values = new LinkedHashMap<>();
    private final Map<String, Node> keys = new LinkedHashMap<>();

    YamlMap(YamlFile file, String path, MappingNode node) {
        this.file = file;
        this.path = path;
        this.node = node;
        for (NodeTuple tuple : node.getValue()) {
            add(tuple);
        }
    }

    private YamlMap(YamlFile file, String path, Node node) {
        this.file = file;
        this.path = path;
        this.node = node;
    }

    /** A mapping without keys, for a key without a value. */
    static YamlMap empty(YamlFile file, String path, Node node) {
        return new YamlMap(file, path, node);
    }

    private void add(NodeTuple tuple) {
        if (!(tuple.getKeyNode() instanceof ScalarNode scalar)) {
            throw file.error(tuple.getKeyNode(), at("") + "a key must be a word");
        }
        String key = scalar.getValue();
        Node first = keys.putIfAbsent(key, scalar);
        if (first != null) {
            throw file.error(
                    scalar,
                    child(key) + ": must be there once, is on line "
                            + (first.getStartMark().getLine() + 1) + " already");
        }
        if (!Tag.NULL.equals(tuple.getValueNode().getTag())) {
            values.put(key, new YamlValue(file, child(key), tuple.getValueNode()));
            file.give(child(key));
        }
    }

    /** Refuses any other key than these. */
    YamlMap only(List<String> known) {
        keys.forEach((key, keyNode) -> {
            if (!known.contains(key)) {
                String near = Nearest.suggestion(key, known);
                throw file.error(
                        keyNode, child(key) + ": unknown key" + (near.isEmpty() ? Nearest.known(key, known) : near));
            }
        });
        return this;
    }

    @Nullable
    YamlValue get(String key) {
        return values.get(key);
    }

    YamlValue required(String key) {
        YamlValue value = values.get(key);
        if (value == null) {
            throw file.error(keys.getOrDefault(key, node), child(key) + ": must be there, was missing");
        }
        return value;
    }

    /** The values by key, in the order of the file. */
    Map<String, YamlValue> values() {
        return values;
    }

    /** The keys with the nodes they stand on, those without a value included. */
    Map<String, Node> keys() {
        return keys;
    }

    String text(String key, String otherwise) {
        YamlValue value = values.get(key);
        return value == null ? otherwise : value.text();
    }

    /** Patterns of region ids; all regions where the key is absent. */
    String patterns(String key) {
        YamlValue value = values.get(key);
        return value == null ? "*" : value.patterns();
    }

    int integer(String key, int lowest, int highest, int otherwise) {
        YamlValue value = values.get(key);
        return value == null ? otherwise : value.integer(lowest, highest);
    }

    int days(String key, int lowest, int highest, int otherwise) {
        YamlValue value = values.get(key);
        return value == null ? otherwise : value.days(lowest, highest);
    }

    double above0(String key, double otherwise) {
        YamlValue value = values.get(key);
        return value == null ? otherwise : value.above0();
    }

    /** The mapping under the key; one without keys where it is absent. */
    YamlMap map(String key, List<String> known) {
        YamlValue value = values.get(key);
        return value == null ? empty(file, child(key), node) : value.map().only(known);
    }

    InputException error(String message) {
        return file.error(node, at("") + message);
    }

    private String child(String key) {
        return path.isEmpty() ? key : path + "." + key;
    }

    private String at(String rest) {
        return path.isEmpty() ? rest : path + ": " + rest;
    }
}
