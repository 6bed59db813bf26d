package org.seamwatch.schemas.plan;

import java.io.IOException;
import java.io.StringReader;
import java.nio.charset.CharacterCodingException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Set;
import java.util.TreeSet;
import org.seamwatch.schemas.InputException;
import org.yaml.snakeyaml.LoaderOptions;
import org.yaml.snakeyaml.Yaml;
import org.yaml.snakeyaml.error.Mark;
import org.yaml.snakeyaml.error.MarkedYAMLException;
import org.yaml.snakeyaml.error.YAMLException;
import org.yaml.snakeyaml.nodes.Node;

/** One YAML file while it is read: where it lies, and which keys were given. */
final class YamlFile {

    private final Path path;
    private final Set<String> given = new TreeSet<>();

    YamlFile(Path path) {
        this.path = path;
    }

    Path path() {
        return path;
    }

    /** Paths of the keys that have a value, such as {@code series[0].closeAfter}. */
    Set<String> given() {
        return given;
    }

    void give(String key) {
        given.add(key);
    }

    /** The one document, with lines. Tags are not resolved into objects, so a plan can create nothing. */
    YamlMap root() {
        Node root;
        try {
            root = new Yaml(new LoaderOptions()).compose(new StringReader(text()));
        } catch (MarkedYAMLException e) {
            Mark mark = e.getProblemMark();
            throw new InputException(
                    path + ":" + (mark == null ? 1 : mark.getLine() + 1) + ": not YAML: " + oneLine(e.getProblem()));
        } catch (YAMLException e) {
            throw new InputException(path + ": not YAML: " + oneLine(String.valueOf(e.getMessage())));
        }
        if (root == null) {
            throw new InputException(path + ": is empty, must have geographies and series");
        }
        return new YamlValue(this, "", root).map();
    }

    private String text() {
        try {
            return Files.readString(path);
        } catch (NoSuchFileException e) {
            throw new InputException(path + ": no such file");
        } catch (CharacterCodingException e) {
            throw new InputException(path + ": must be UTF-8, has bytes that are not");
        } catch (IOException e) {
            throw new InputException(
                    path + ": " + (Files.isDirectory(path) ? "is a folder, must be a file" : "cannot be read"));
        }
    }

    private static String oneLine(String message) {
        return message.lines().findFirst().orElse("");
    }

    InputException error(Node node, String message) {
        return new InputException(path + ":" + (node.getStartMark().getLine() + 1) + ": " + message);
    }
}
