package org.seamwatch.ops;

import java.time.Clock;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.topology.service.Clockmaker;
import org.seamwatch.topology.service.StreamsService;
import org.seamwatch.topology.service.TopicSetup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The service, until it is stopped. */
@Command(
        name = "run",
        description = "Runs the service against the Kafka that the plan names, until it is stopped.",
        footer = {
            "",
            "Makes the topics that are missing. Ctrl-C or a stop by the system ends it cleanly: what was read is"
                    + " committed, and other instances take over at once."
        })
final class RunCommand implements Callable<Integer> {

    private final Console console;

    @Mixin
    private PlanOption plan = new PlanOption();

    @Option(names = "--no-clock", description = "write no clock records; time then stands still in quiet partitions")
    private boolean noClock;

    RunCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws InterruptedException {
        Plans plans = plan.read(console);
        Plan read = plans.read().plan();
        TopicSetup.prepare(read).forEach(console::warn);
        try (StreamsService service = new StreamsService(plans.watch())) {
            CleanStop stop = CleanStop.with(console, service::close);
            try {
                service.start();
                return runUntilStopped(service, read);
            } finally {
                stop.finished();
            }
        }
    }

    private int runUntilStopped(StreamsService service, Plan read) throws InterruptedException {
        Clockmaker clock = clock(service);
        try {
            console.say("Seamwatch runs as " + service.applicationId() + " at "
                    + read.kafka().get("bootstrap.servers") + (noClock ? ", without clock records" : "")
                    + "; Ctrl-C ends it");
            if (service.awaitEnd()) {
                throw new CommandFailure("the service stopped after a fault; the log names it", null);
            }
            console.say("Seamwatch has stopped");
            return Failures.DONE;
        } finally {
            if (clock != null) {
                clock.close();
            }
        }
    }

    private @Nullable Clockmaker clock(StreamsService service) {
        if (noClock) {
            return null;
        }
        Clockmaker clock = service.clockmaker(Clock.systemUTC());
        clock.start();
        return clock;
    }
}
