package org.seamwatch.topology.replay;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.seamwatch.processors.intake.Rejection;
import org.seamwatch.schemas.InputException;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.record.AccountingLine;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.ReadResult;
import org.seamwatch.schemas.record.RegionDay;
import org.seamwatch.schemas.record.RejectedLine;
import org.seamwatch.schemas.record.SeriesDay;
import org.seamwatch.topology.Accounting;

/**
 * The results of a run as files, sorted, so that runs that agree are equal byte for byte: {@value #REGION_DAYS} by
 * series, region, day and revision; {@value #SERIES_DAYS} by series, day and revision; {@value #ALARMS} by series, alarm
 * and sequence; {@value #REJECTED} by topic, partition and offset; {@value #ACCOUNTING} by topic and partition. Files
 * appear under their names only when all of them are complete.
 */
public final class ResultFiles implements ReplayOutput {

    public static final String REGION_DAYS = "region-days.ndjson";
    public static final String SERIES_DAYS = "series-days.ndjson";
    public static final String ALARMS = "alarms.ndjson";
    public static final String REJECTED = "rejected.ndjson";
    public static final String ACCOUNTING = "accounting.json";

    private static final String UNFINISHED = ".part";

    private final List<RegionDay> regionDays = new ArrayList<>();
    private final List<SeriesDay> seriesDays = new ArrayList<>();
    private final List<AlarmChange> alarms = new ArrayList<>();
    private final List<RejectedLine> rejected = new ArrayList<>();

    @Override
    public void regionDay(RegionDay day, long timestamp) {
        regionDays.add(day);
    }

    @Override
    public void seriesDay(SeriesDay day, long timestamp) {
        seriesDays.add(day);
    }

    @Override
    public void alarm(AlarmChange change, long timestamp) {
        alarms.add(change);
    }

    @Override
    public void rejected(Rejection r) {
        rejected(RejectedLine.of(
                r.topic(),
                r.partition(),
                r.offset(),
                new ReadResult.Unusable<>(
                        r.why().reason(), r.why().field(), r.why().detail()),
                r.key().bytes(),
                r.value().bytes(),
                r.value().length() == null ? null : Long.valueOf(r.value().length()),
                r.value().sha256()));
    }

    /** A rejected record as it is to stand in the file. */
    public void rejected(RejectedLine line) {
        rejected.add(line);
    }

    /** All changes of alarms, by series, alarm and sequence. */
    public List<AlarmChange> alarms() {
        return alarms.stream().sorted(alarmOrder()).toList();
    }

    /** How many days of regions there are, all revisions counted. */
    public int regionDayCount() {
        return regionDays.size();
    }

    /** How many days of series there are, all revisions counted. */
    public int seriesDayCount() {
        return seriesDays.size();
    }

    /**
     * Makes a folder ready, where it is missing, before work begins.
     *
     * @throws InputException when it cannot be written to
     */
    public static void prepare(Path folder) {
        try {
            if (!Files.isDirectory(folder)) {
                Files.createDirectories(folder);
            }
        } catch (IOException e) {
            throw new InputException(folder + ": the folder cannot be made"
                    + (Files.exists(folder) ? ", a file has its name" : reason(e)));
        }
        if (!Files.isWritable(folder)) {
            throw new InputException(folder + ": the folder cannot be written to");
        }
    }

    /**
     * Writes all files into a folder that {@link #prepare} has made ready.
     *
     * @throws ResultFileException when one cannot be written; then none of them has changed
     */
    public void write(Path folder, List<AccountingLine> accounts) {
        regionDays.sort(regionDayOrder());
        seriesDays.sort(seriesDayOrder());
        alarms.sort(alarmOrder());
        rejected.sort(rejectedOrder());
        Map<String, List<?>> files = new LinkedHashMap<>();
        files.put(REGION_DAYS, regionDays);
        files.put(SERIES_DAYS, seriesDays);
        files.put(ALARMS, alarms);
        files.put(REJECTED, rejected);
        files.put(ACCOUNTING, accounts.stream().sorted(Accounting.ORDER).toList());
        try {
            files.forEach(
                    (name, records) -> write(folder.resolve(name + UNFINISHED), records, name.equals(ACCOUNTING)));
        } catch (ResultFileException e) {
            files.keySet().forEach(name -> discard(folder.resolve(name + UNFINISHED)));
            throw e;
        }
        files.keySet().forEach(name -> finish(folder, name));
    }

    private static void write(Path file, List<?> records, boolean array) {
        try (OutputStream out = new BufferedOutputStream(Files.newOutputStream(file))) {
            if (array) {
                out.write(array(records).getBytes(StandardCharsets.UTF_8));
            } else {
                for (Object record : records) {
                    out.write(Json.bytes(record));
                    out.write('\n');
                }
            }
        } catch (IOException e) {
            throw new ResultFileException(file + ": cannot be written" + reason(e), e);
        }
    }

    private static String array(List<?> records) {
        return records.stream().map(Json::line).collect(Collectors.joining(",\n", "[\n", "\n]\n"));
    }

    /** Gives back the room that half a file takes; the failure that led here is what counts. */
    private static void discard(Path file) {
        try {
            if (Files.isRegularFile(file)) {
                Files.delete(file);
            }
        } catch (IOException e) {
            file.toFile().deleteOnExit();
        }
    }

    private static void finish(Path folder, String name) {
        Path file = folder.resolve(name);
        try {
            Files.move(folder.resolve(name + UNFINISHED), file, StandardCopyOption.REPLACE_EXISTING);
        } catch (IOException e) {
            throw new ResultFileException(file + ": cannot be written" + reason(e), e);
        }
    }

    /** What the system says, such as "No space left on device", without the path again. */
    private static String reason(IOException e) {
        String said = e instanceof FileSystemException f ? f.getReason() : e.getMessage();
        return said == null ? "" : ": " + said;
    }

    private static Comparator<RegionDay> regionDayOrder() {
        return Comparator.comparing(RegionDay::series)
                .thenComparing(RegionDay::region)
                .thenComparing(RegionDay::day)
                .thenComparingInt(RegionDay::revision);
    }

    private static Comparator<SeriesDay> seriesDayOrder() {
        return Comparator.comparing(SeriesDay::series)
                .thenComparing(SeriesDay::day)
                .thenComparingInt(SeriesDay::revision);
    }

    private static Comparator<AlarmChange> alarmOrder() {
        return Comparator.comparing(AlarmChange::series)
                .thenComparing(AlarmChange::alarm)
                .thenComparingInt(AlarmChange::sequence);
    }

    private static Comparator<RejectedLine> rejectedOrder() {
        return Comparator.comparing(RejectedLine::topic)
                .thenComparingInt(RejectedLine::partition)
                .thenComparingLong(RejectedLine::offset);
    }
}
