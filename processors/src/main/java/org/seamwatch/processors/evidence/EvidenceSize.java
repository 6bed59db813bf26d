package org.seamwatch.processors.evidence;

import java.util.List;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.record.Evidence;
import org.seamwatch.schemas.record.EvidenceHistory;

/** Holds evidence to 16 KiB: first the weakest clusters go, then the oldest days. */
final class EvidenceSize {

    private static final int MOST_BYTES = 16 * 1024;

    private EvidenceSize() {}

    static Evidence fitted(Evidence evidence) {
        Evidence fitted = evidence;
        while (Json.bytes(fitted).length > MOST_BYTES && fitted.clusters().size() > 1) {
            fitted = with(fitted, fitted.clusters().size() - 1, 0);
        }
        while (Json.bytes(fitted).length > MOST_BYTES && longest(fitted) > 1) {
            fitted = with(fitted, fitted.clusters().size(), longest(fitted) / 2);
        }
        return fitted;
    }

    private static int longest(Evidence e) {
        return e.history().stream().mapToInt(h -> h.days().size()).max().orElse(0);
    }

    private static Evidence with(Evidence e, int clusters, int droppedDays) {
        List<EvidenceHistory> history = e.history().stream()
                .map(h -> new EvidenceHistory(
                        h.statistic(),
                        h.days()
                                .subList(
                                        Math.min(droppedDays, h.days().size()),
                                        h.days().size())))
                .toList();
        return new Evidence(
                e.summary(),
                e.period(),
                e.charts(),
                history,
                e.clusters().subList(0, clusters),
                e.quality(),
                e.method(),
                e.repeat(),
                e.caution());
    }
}
