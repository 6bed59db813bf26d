package org.seamwatch.processors.alarms;

import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.seamwatch.schemas.record.Change;

/**
 * Brings the alarms of a series into line with its episodes. An episode takes the earliest id of the alarms it overlaps;
 * alarms left without an episode are withdrawn; one raised again goes on with its sequence.
 */
public final class AlarmBook {

    private static final Comparator<AlarmState> BY_AGE =
            Comparator.comparing(AlarmState::raisedFor).thenComparing(AlarmState::id);

    private final String series;

    public AlarmBook(String series) {
        this.series = series;
    }

    /**
     * The changes that a close makes.
     *
     * @param alarms every alarm known
     * @param episodes the episodes that reach {@code from} or later, oldest first
     * @param from first day that was judged or judged again
     * @param closed the last closed day
     * @return changes in order; an alarm that changes twice stands twice
     */
    public List<AlarmMove> reconcile(
            Collection<AlarmState> alarms, List<Episode> episodes, LocalDate from, LocalDate closed) {
        List<AlarmState> known =
                alarms.stream().filter(a -> a.reaches(from)).sorted(BY_AGE).toList();
        Set<String> taken = new HashSet<>();
        Set<String> ids = new HashSet<>(alarms.stream().map(AlarmState::id).toList());
        List<AlarmMove> moves = new ArrayList<>();
        for (Episode episode : episodes) {
            Optional<AlarmState> mine = known.stream()
                    .filter(a -> !taken.contains(a.id()) && a.overlaps(episode))
                    .min(Comparator.comparing(AlarmState::withdrawn).thenComparing(BY_AGE));
            if (mine.isPresent()) {
                taken.add(mine.get().id());
                follow(mine.get(), episode, closed, moves);
            } else {
                AlarmState raised = AlarmState.raised(freeId(episode, ids), episode);
                ids.add(raised.id());
                moves.add(new AlarmMove(raised, Change.RAISED, episode.lastSignal()));
                finish(raised, episode, closed, moves);
            }
        }
        for (AlarmState alarm : known) {
            if (!taken.contains(alarm.id()) && !alarm.withdrawn()) {
                moves.add(new AlarmMove(alarm.withdraw().next(), Change.WITHDRAWN, closed));
            }
        }
        return moves;
    }

    private static void follow(AlarmState alarm, Episode episode, LocalDate closed, List<AlarmMove> moves) {
        boolean again = alarm.withdrawn() || (alarm.end() != null && episode.end() == null);
        boolean stronger = !alarm.statistics().containsAll(episode.statistics());
        AlarmState now = alarm.as(episode);
        if (again || stronger) {
            now = now.next();
            moves.add(new AlarmMove(now, again ? Change.RAISED : Change.STRENGTHENED, episode.lastSignal()));
            finish(now, episode, closed, moves);
        } else if (!alarm.isOpen() || !finish(now, episode, closed, moves)) {
            moves.add(new AlarmMove(now, null, episode.lastSignal()));
        }
    }

    /** Ends an open alarm whose episode has ended, or says that it is overdue; whether either was so. */
    private static boolean finish(AlarmState alarm, Episode episode, LocalDate closed, List<AlarmMove> moves) {
        if (episode.end() != null) {
            moves.add(new AlarmMove(alarm.as(episode).next(), Change.ENDED, episode.end()));
            return true;
        }
        if (!alarm.overdue()
                && alarm.isUnanswered()
                && ChronoUnit.DAYS.between(episode.start(), closed) >= AlarmState.OVERDUE_DAYS) {
            moves.add(new AlarmMove(alarm.asOverdue().next(), Change.OVERDUE, closed));
            return true;
        }
        return false;
    }

    private String freeId(Episode episode, Set<String> ids) {
        String id = series + "/" + episode.start();
        for (int n = 2; ids.contains(id); n++) {
            id = series + "/" + episode.start() + "-" + n;
        }
        return id;
    }
}
