package org.seamwatch.schemas.record;

import java.util.List;

/**
 * What an alarm carries: enough to decide what to do next, at most 16 KiB as JSON.
 *
 * @param summary one plain sentence
 * @param period the days that the cluster counts speak of
 * @param charts each chart's value and limits
 * @param history the last 28 days of each statistic
 * @param clusters up to five clusters of regions that drive the signal, strongest first
 * @param quality how good the data are
 * @param method how it was found, and how often such a limit alarms for nothing
 * @param repeat what repeating it needs
 * @param caution what the alarm is not
 */
public record Evidence(
        String summary,
        Period period,
        List<EvidenceChart> charts,
        List<EvidenceHistory> history,
        List<Cluster> clusters,
        Quality quality,
        Method method,
        Repeat repeat,
        String caution) {

    public Evidence {
        charts = List.copyOf(charts);
        history = List.copyOf(history);
        clusters = List.copyOf(clusters);
    }
}
