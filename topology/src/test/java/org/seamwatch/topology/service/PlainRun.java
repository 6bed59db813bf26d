package org.seamwatch.topology.service;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.flow.SeriesMessage;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.intake.IntakeOutput;
import org.seamwatch.processors.intake.LogRecord;
import org.seamwatch.processors.intake.Rejection;
import org.seamwatch.processors.intake.ReportIntake;
import org.seamwatch.processors.intake.ResponseIntake;
import org.seamwatch.processors.series.SeriesOutput;
import org.seamwatch.processors.series.SeriesShelves;
import org.seamwatch.processors.series.SeriesStage;
import org.seamwatch.processors.state.MemoryShelf;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.RegionDay;
import org.seamwatch.schemas.record.SeriesDay;

/** The plain steps over memory, one after the other: what any run of the topology must say too. */
final class PlainRun implements IntakeOutput, SeriesOutput {

    private final Watch watch;
    private final InputSizes sizes;
    private final SeriesStage stage;
    private final Map<String, Consumer<LogRecord>> intakes = new HashMap<>();
    private final Map<String, Long> offsets = new HashMap<>();
    private final List<Outputs.Said> regionDays = new ArrayList<>();
    private final List<Outputs.Said> seriesDays = new ArrayList<>();
    private final List<Outputs.Said> alarms = new ArrayList<>();
    private final List<AlarmChange> changes = new ArrayList<>();
    private final List<String> rejected = new ArrayList<>();

    private PlainRun(Watch watch) {
        this.watch = watch;
        int partitions = watch.plan().topics().partitions();
        this.sizes = new InputSizes(partitions, partitions);
        this.stage = new SeriesStage(
                watch,
                series -> true,
                new SeriesShelves(
                        new MemoryShelf(), new MemoryShelf(), new MemoryShelf(), new MemoryShelf(), new MemoryShelf()),
                this);
    }

    static PlainRun of(Watch watch, List<LogLine> log) {
        PlainRun run = new PlainRun(watch);
        log.forEach(run::take);
        return run;
    }

    Outputs outputs() {
        return Outputs.of(regionDays, seriesDays, alarms, rejected);
    }

    List<AlarmChange> alarms() {
        return List.copyOf(changes);
    }

    @SuppressWarnings("NullAway") // it does not see the nullness of arrays in compiled records
    private void take(LogLine line) {
        String place = line.topic() + "|" + line.partition();
        long offset = offsets.merge(place, 1L, Long::sum) - 1;
        intakes.computeIfAbsent(place, p -> intake(line))
                .accept(new LogRecord(
                        line.topic(), line.partition(), offset, line.timestamp(), line.key(), line.value()));
    }

    private Consumer<LogRecord> intake(LogLine line) {
        if (line.topic().equals(Topics.ALARM_RESPONSES)) {
            return new ResponseIntake(watch, line.partition(), sizes, new MemoryShelf(), this)::accept;
        }
        return new ReportIntake(
                watch, line.partition(), sizes, new MemoryShelf(), new MemoryShelf(), new MemoryShelf(), this)::accept;
    }

    @Override
    public void toSeries(String series, SeriesMessage message) {
        stage.accept(message);
    }

    @Override
    public void toAll(SeriesMessage.Watermark watermark) {
        stage.accept(watermark);
    }

    @Override
    public void reject(Rejection r) {
        Map<String, String> headers = new TreeMap<>();
        headers.put("reason", r.why().reason().code());
        headers.put("detail", r.why().detail());
        headers.put("field", r.why().field());
        headers.put("topic", r.topic());
        headers.put("partition", String.valueOf(r.partition()));
        headers.put("offset", String.valueOf(r.offset()));
        put(headers, "length", r.value().length());
        put(headers, "sha256", r.value().sha256());
        put(headers, "keyLength", r.key().length());
        put(headers, "keySha256", r.key().sha256());
        rejected.add(Outputs.rejectedLine(
                r.topic(),
                r.partition(),
                r.offset(),
                headers,
                r.timestamp(),
                r.key().bytes(),
                r.value().bytes()));
    }

    private static void put(Map<String, String> headers, String name, @Nullable Object value) {
        if (value != null) {
            headers.put(name, value.toString());
        }
    }

    @Override
    public void regionDay(RegionDay day, long timestamp) {
        regionDays.add(said(day.series() + "|" + day.region() + "|" + day.day(), timestamp, day));
    }

    @Override
    public void seriesDay(SeriesDay day, long timestamp) {
        seriesDays.add(said(day.series(), timestamp, day));
    }

    @Override
    public void alarm(AlarmChange change, long timestamp) {
        changes.add(change);
        alarms.add(said(change.series(), timestamp, change));
    }

    private static Outputs.Said said(String key, long timestamp, Object value) {
        return new Outputs.Said(key, timestamp, new String(Json.bytes(value), StandardCharsets.UTF_8));
    }
}
