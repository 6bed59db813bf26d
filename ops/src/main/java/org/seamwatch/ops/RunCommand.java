package org.seamwatch.ops;

import java.time.Clock;
import java.util.concurrent.Callable;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.TimeUnit;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.topology.service.BrokerProbe;
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
            "Makes the topics that are missing, and says what it does, one line with the time each: what it has read,"
                    + " and every change of an alarm. Ctrl-C or a stop by the system ends it cleanly: what was read is"
                    + " committed, and other instances take over at once."
        })
final class RunCommand implements Callable<Integer> {

    private final Console console;
    private final RunLog log;

    @Mixin
    private PlanOption plan = new PlanOption();

    @Option(names = "--no-clock", description = "write no clock records; time then stands still in quiet partitions")
    private boolean noClock;

    RunCommand(Console console) {
        this.console = console;
        this.log = new RunLog(console, Clock.systemUTC());
    }

    @Override
    public Integer call() throws InterruptedException {
        RunStop stop = new RunStop(log, Thread.currentThread());
        CleanStop clean = CleanStop.with(console, stop::stop);
        try {
            return run(stop);
        } catch (RuntimeException e) {
            if (!stop.isAsked()) {
                throw e;
            }
            return stopped();
        } finally {
            clean.finished();
        }
    }

    private int run(RunStop stop) throws InterruptedException {
        Plans plans = plan.read(console);
        Plan read = plans.read().plan();
        TopicSetup.prepare(read).forEach(console::warn);
        try (StreamsService service = new StreamsService(plans.watch());
                AlarmTail alarms = new AlarmTail(log, service.resultReader(), service.alarmPartitions());
                BrokerProbe probe = service.brokerProbe()) {
            if (!stop.mayStart(service)) {
                return stopped();
            }
            alarms.start();
            service.start();
            return runUntilStopped(service, read, new RunReport(log, RunReport.Subject.of(service), probe::answers));
        }
    }

    private int runUntilStopped(StreamsService service, Plan read, RunReport report) throws InterruptedException {
        Clockmaker clock = clock(service);
        ScheduledExecutorService timer = Executors.newSingleThreadScheduledExecutor(RunCommand::daemon);
        try {
            log.say("Seamwatch runs as " + service.applicationId() + " at "
                    + read.kafka().get("bootstrap.servers") + (noClock ? ", without clock records" : "")
                    + "; Ctrl-C ends it");
            if (service.isStateLeftOpen()) {
                log.say("local state was not closed cleanly; it is rebuilt from Kafka");
            }
            Future<?> unused =
                    timer.scheduleWithFixedDelay(report::look, 0, RunReport.LOOK.toMillis(), TimeUnit.MILLISECONDS);
            if (service.awaitEnd()) {
                throw new CommandFailure("the service stopped after a fault; the log names it", null);
            }
            return stopped();
        } finally {
            timer.shutdownNow();
            if (clock != null) {
                clock.close();
            }
        }
    }

    private int stopped() {
        log.say("Seamwatch has stopped");
        return Failures.DONE;
    }

    private @Nullable Clockmaker clock(StreamsService service) {
        if (noClock) {
            return null;
        }
        Clockmaker clock = service.clockmaker(Clock.systemUTC());
        clock.start();
        return clock;
    }

    private static Thread daemon(Runnable task) {
        Thread thread = new Thread(task, "run-report");
        thread.setDaemon(true);
        return thread;
    }
}
