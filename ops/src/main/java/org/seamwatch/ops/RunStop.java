package org.seamwatch.ops;

import org.jspecify.annotations.Nullable;
import org.seamwatch.topology.service.StreamsService;

/** The wish that {@code run} ends, whenever it comes: before there is a service, it interrupts what makes it. */
final class RunStop {

    private final RunLog log;
    private final Thread starter;
    private @Nullable StreamsService service;
    private boolean asked;

    RunStop(RunLog log, Thread starter) {
        this.log = log;
        this.starter = starter;
    }

    /** Ends the service, or its start. */
    void stop() {
        StreamsService running;
        synchronized (this) {
            asked = true;
            running = service;
            if (running == null) {
                starter.interrupt();
            }
        }
        log.say("stopping");
        if (running != null) {
            running.close();
        }
    }

    /** The service may start now, unless it is to stop already. */
    synchronized boolean mayStart(StreamsService made) {
        if (!asked) {
            service = made;
        }
        return !asked;
    }

    synchronized boolean isAsked() {
        return asked;
    }
}
