package org.seamwatch.schemas.record;

import java.util.Collections;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * What became of the records of one input partition, an item of {@code accounting.json}. The books balance when read =
 * accepted + duplicate + superseded + rejected + control.
 *
 * @param topic name of the topic without the prefix
 * @param partition partition, from 0
 * @param read records read
 * @param accepted records that were used
 * @param duplicate records that said again what was known
 * @param superseded records with a lower revision than the known one
 * @param rejected records that could not be used
 * @param control clock records
 * @param reasons rejected records by {@link RejectReason} code, only codes that occurred
 */
public record AccountingLine(
        String topic,
        int partition,
        long read,
        long accepted,
        long duplicate,
        long superseded,
        long rejected,
        long control,
        SortedMap<String, Long> reasons) {

    public AccountingLine {
        reasons = Collections.unmodifiableSortedMap(new TreeMap<>(reasons));
    }
}
