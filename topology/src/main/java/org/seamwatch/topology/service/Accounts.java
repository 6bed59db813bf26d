package org.seamwatch.topology.service;

import java.util.ArrayList;
import java.util.List;
import org.apache.kafka.streams.KafkaStreams;
import org.apache.kafka.streams.KeyValue;
import org.apache.kafka.streams.StoreQueryParameters;
import org.apache.kafka.streams.state.KeyValueIterator;
import org.apache.kafka.streams.state.QueryableStoreTypes;
import org.apache.kafka.streams.state.ReadOnlyKeyValueStore;
import org.seamwatch.processors.intake.Account;
import org.seamwatch.schemas.record.AccountingLine;
import org.seamwatch.topology.Accounting;
import org.seamwatch.topology.Names;

/** What became of every record that the tasks of this instance have read. */
public final class Accounts {

    private Accounts() {}

    /** One line for each input partition of this instance, by topic and partition. The engine must be running. */
    public static List<AccountingLine> read(KafkaStreams streams) {
        List<AccountingLine> lines = new ArrayList<>();
        for (String store : List.of(Names.REPORT_ACCOUNTS, Names.RESPONSE_ACCOUNTS)) {
            ReadOnlyKeyValueStore<String, byte[]> rows =
                    streams.store(StoreQueryParameters.fromNameAndType(store, QueryableStoreTypes.keyValueStore()));
            try (KeyValueIterator<String, byte[]> each = rows.all()) {
                each.forEachRemaining(row -> lines.add(line(row)));
            }
        }
        lines.sort(Accounting.ORDER);
        return List.copyOf(lines);
    }

    private static AccountingLine line(KeyValue<String, byte[]> row) {
        int cut = row.key.lastIndexOf('|');
        return Accounting.line(
                row.key.substring(0, cut), Integer.parseInt(row.key.substring(cut + 1)), Account.from(row.value));
    }
}
