package org.seamwatch.ops.bench;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.time.Duration;
import java.util.Arrays;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import org.apache.kafka.common.TopicPartition;
import org.apache.kafka.streams.KafkaStreams;
import org.seamwatch.fixtures.broker.Drain;
import org.seamwatch.fixtures.broker.TopicTool;

/**
 * Times a job from the moment its engine runs to the end of the log. The end is when the group has committed the end of
 * each input and nothing is left between the stages; it is looked for every 50 ms, with one request to the broker.
 */
final class Stopwatch {

    private static final long START_LOOK_MILLIS = 2;
    private static final long END_LOOK_MILLIS = 50;
    private static final long LIMIT_NANOS = Duration.ofMinutes(10).toNanos();

    private final TopicTool tool;
    private final String bootstrap;

    Stopwatch(TopicTool tool, String bootstrap) {
        this.tool = tool;
        this.bootstrap = bootstrap;
    }

    /**
     * Starts a job and waits for its end.
     *
     * @param application the job's application id, by which its stream thread is found
     */
    Measured time(String name, String application, long cacheBytes, Job job) throws InterruptedException {
        Drain drain = new Drain(tool, bootstrap, application, job.inputs(), job.between());
        long inputs = job.inputs().stream()
                .map(tool::endOffsets)
                .flatMap(ends -> ends.values().stream())
                .mapToLong(Long::longValue)
                .sum();
        long limit = System.nanoTime() + LIMIT_NANOS;
        job.start();
        while (job.streams().state() != KafkaStreams.State.RUNNING) {
            look(START_LOOK_MILLIS, limit, application, job);
        }
        long start = System.nanoTime();
        long cpu = cpu(application);
        long end = start;
        boolean done = false;
        while (!done) {
            look(END_LOOK_MILLIS, limit, application, job);
            end = System.nanoTime();
            done = committed(application, job) >= inputs && drain.isEmpty();
        }
        return new Measured(name, cacheBytes, (end - start) * 1e-9, (cpu(application) - cpu) * 1e-9);
    }

    private long committed(String application, Job job) {
        return tool.committed(application).entrySet().stream()
                .filter(e -> job.inputs().contains(topic(e)))
                .mapToLong(Map.Entry::getValue)
                .sum();
    }

    private static String topic(Map.Entry<TopicPartition, Long> committed) {
        return committed.getKey().topic();
    }

    private static void look(long millis, long limit, String application, Job job) throws InterruptedException {
        if (job.streams().state() == KafkaStreams.State.ERROR || System.nanoTime() - limit > 0) {
            throw new IllegalStateException(application + " did not reach the end of the log, its engine is "
                    + job.streams().state());
        }
        TimeUnit.MILLISECONDS.sleep(millis);
    }

    /** Processor time of the application's stream threads, nanoseconds. */
    private static long cpu(String application) {
        ThreadMXBean threads = ManagementFactory.getThreadMXBean();
        return Arrays.stream(threads.getThreadInfo(threads.getAllThreadIds()))
                .filter(thread -> thread != null
                        && thread.getThreadName().startsWith(application)
                        && thread.getThreadName().contains("StreamThread"))
                .mapToLong(thread -> threads.getThreadCpuTime(thread.getThreadId()))
                .sum();
    }
}
