package org.seamwatch.topology.replay;

import java.util.ArrayList;
import java.util.List;
import org.seamwatch.processors.intake.Rejection;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.RegionDay;
import org.seamwatch.schemas.record.SeriesDay;

/** Remembers what a replay gave, in its order. */
final class Results implements ReplayOutput {

    final List<RegionDay> regionDays = new ArrayList<>();
    final List<SeriesDay> seriesDays = new ArrayList<>();
    final List<Rejection> rejections = new ArrayList<>();
    final List<String> all = new ArrayList<>();

    @Override
    public void regionDay(RegionDay day, long timestamp) {
        regionDays.add(day);
        all.add(timestamp + " " + Json.line(day));
    }

    @Override
    public void seriesDay(SeriesDay day, long timestamp) {
        seriesDays.add(day);
        all.add(timestamp + " " + Json.line(day));
    }

    @Override
    public void alarm(AlarmChange change, long timestamp) {
        all.add(timestamp + " " + Json.line(change));
    }

    @Override
    public void rejected(Rejection rejection) {
        rejections.add(rejection);
        all.add(rejection.timestamp() + " " + rejection.why() + " "
                + Grid.text(rejection.key().bytes()) + " "
                + Grid.text(rejection.value().bytes()));
    }

    List<String> days() {
        return seriesDays.stream().map(day -> day.day() + "#" + day.revision()).toList();
    }

    List<String> reasons() {
        return rejections.stream().map(r -> r.why().reason().code()).toList();
    }
}
