package org.seamwatch.topology.service;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * A file beside the local state for as long as a process has it open. One that is there before the start tells that the
 * last process was killed, and that the engine will not trust the state. Nothing but a message depends on it.
 */
final class OpenMark {

    private static final Logger LOG = LoggerFactory.getLogger(OpenMark.class);

    private final Path file;
    private final boolean before;
    private boolean ours;

    private OpenMark(Path file) {
        this.file = file;
        this.before = Files.exists(file);
    }

    static OpenMark in(Path stateDir, String application) {
        return new OpenMark(stateDir.resolve(application + ".open"));
    }

    boolean wasSet() {
        return before;
    }

    synchronized void set() {
        try {
            Files.createDirectories(file.toAbsolutePath().getParent());
            Files.write(file, new byte[0]);
            ours = true;
        } catch (IOException e) {
            LOG.warn("{} cannot be written: {}", file, e.toString());
        }
    }

    /** The state is closed as it should be. */
    synchronized void clear() {
        if (!ours) {
            return;
        }
        try {
            Files.deleteIfExists(file);
            ours = false;
        } catch (IOException e) {
            LOG.warn("{} cannot be removed: {}", file, e.toString());
        }
    }
}
