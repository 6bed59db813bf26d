package org.seamwatch.processors.alarms;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;

/** Gathers the episodes of consecutive days. */
public final class Episodes {

    private Episodes() {}

    /** The episodes that the days end or have open, oldest first. */
    public static List<Episode> of(List<EpisodeState> days) {
        List<Episode> episodes = new ArrayList<>();
        for (int i = 0; i < days.size(); i++) {
            EpisodeState day = days.get(i);
            boolean last = i == days.size() - 1;
            if (day.hasEnded() || (last && day.isOpen())) {
                episodes.add(episode(day));
            }
        }
        return episodes;
    }

    private static Episode episode(EpisodeState day) {
        LocalDate start = day.start();
        LocalDate lastSignal = day.lastSignal();
        if (start == null || lastSignal == null) {
            throw new IllegalStateException("an episode must have a first and a last signal, was " + day);
        }
        return new Episode(start, lastSignal, day.end(), day.statistics());
    }
}
