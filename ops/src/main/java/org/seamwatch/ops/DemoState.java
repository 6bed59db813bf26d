package org.seamwatch.ops;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;

/**
 * A folder for what a demo needs while it runs, deleted with it.
 *
 * @param folder the folder
 */
record DemoState(Path folder) implements AutoCloseable {

    static DemoState make(String name) {
        try {
            return new DemoState(Files.createTempDirectory(name));
        } catch (IOException e) {
            throw new UncheckedIOException("no temporary folder can be made", e);
        }
    }

    @Override
    public void close() {
        try (Stream<Path> all = Files.walk(folder)) {
            List<Path> deepestFirst = all.sorted(Comparator.reverseOrder()).toList();
            for (Path path : deepestFirst) {
                Files.deleteIfExists(path);
            }
        } catch (IOException e) {
            throw new UncheckedIOException("the folder " + folder + " cannot be deleted", e);
        }
    }
}
