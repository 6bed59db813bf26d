package org.seamwatch.ops.bench;

import java.util.List;
import java.util.stream.Stream;
import org.apache.kafka.streams.KafkaStreams;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.schemas.record.AccountingLine;
import org.seamwatch.topology.Names;
import org.seamwatch.topology.service.StreamsService;

/** The live flow as {@code run} starts it, without its clock: the log has clock records of its own. */
final class FlowJob implements Job {

    private final Plan plan;
    private final StreamsService service;
    private final long records;

    /** @param records all records of the log, clock records included */
    FlowJob(Watch watch, long records) {
        this.plan = watch.plan();
        this.service = new StreamsService(watch);
        this.records = records;
    }

    @Override
    public KafkaStreams streams() {
        return service.streams();
    }

    @Override
    public void start() {
        service.start();
    }

    @Override
    public List<String> inputs() {
        return Stream.of(Topics.CASE_REPORTS, Topics.ALARM_RESPONSES)
                .map(topic -> plan.topics().prefix() + topic)
                .toList();
    }

    @Override
    public List<String> between() {
        return Stream.of(Names.REPORT_CHANGES, Names.RESPONSE_CHANGES)
                .map(changes -> service.applicationId() + "-" + Names.repartitionTopic(changes))
                .toList();
    }

    /** The books must balance and hold every record of the log. */
    @Override
    public void check() {
        long read = 0;
        for (AccountingLine line : service.accounting()) {
            long known = line.accepted() + line.duplicate() + line.superseded() + line.rejected() + line.control();
            if (known != line.read()) {
                throw new IllegalStateException("the books must balance, were " + line);
            }
            read += line.read();
        }
        if (read != records) {
            throw new IllegalStateException("records read must be " + records + ", were " + read);
        }
    }

    @Override
    public void close() {
        service.close();
    }
}
