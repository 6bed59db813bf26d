package org.seamwatch.ops.bench;

import java.util.List;
import org.apache.kafka.streams.KafkaStreams;

/** A Streams application that is measured: one run of it, from an empty state to the end of the log. */
interface Job extends AutoCloseable {

    /** The engine, not started before {@link #start}. */
    KafkaStreams streams();

    /** Starts its threads and returns. */
    void start();

    /** Topics of the log that it reads, as the broker knows them. */
    List<String> inputs();

    /** Its own topics between its stages, as the broker knows them. */
    List<String> between();

    /** Fails unless the job has done all its work; asked at the end of a run, while it is up. */
    void check();

    @Override
    void close();
}
