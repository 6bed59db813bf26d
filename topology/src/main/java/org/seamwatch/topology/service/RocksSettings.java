package org.seamwatch.topology.service;

import java.util.Map;
import org.apache.kafka.streams.state.RocksDBConfigSetter;
import org.rocksdb.BlockBasedTableConfig;
import org.rocksdb.BloomFilter;
import org.rocksdb.Cache;
import org.rocksdb.LRUCache;
import org.rocksdb.Options;
import org.rocksdb.RocksDB;
import org.rocksdb.WriteBufferManager;

/**
 * All stores of a process share one block cache, which holds indexes, filters and write buffers too: memory outside
 * the heap is bounded whatever the number of partitions. Bloom filters spare the ledger a disk read for each new id.
 */
public final class RocksSettings implements RocksDBConfigSetter {

    private static final long CACHE_BYTES = 96L << 20;
    private static final long BUFFERS_BYTES = 48L << 20;
    private static final long BUFFER_BYTES = 4L << 20;
    private static final long BLOCK_BYTES = 8L << 10;
    private static final double BITS_PER_KEY = 10;

    static {
        RocksDB.loadLibrary();
    }

    private static final Cache CACHE = new LRUCache(CACHE_BYTES, -1, false, 0.1);
    private static final WriteBufferManager BUFFERS = new WriteBufferManager(BUFFERS_BYTES, CACHE);

    private final BloomFilter filter = new BloomFilter(BITS_PER_KEY);

    @Override
    public void setConfig(String store, Options options, Map<String, Object> configs) {
        BlockBasedTableConfig table = (BlockBasedTableConfig) options.tableFormatConfig();
        table.setBlockCache(CACHE);
        table.setCacheIndexAndFilterBlocks(true);
        table.setCacheIndexAndFilterBlocksWithHighPriority(true);
        table.setPinTopLevelIndexAndFilter(true);
        table.setFilterPolicy(filter);
        table.setBlockSize(BLOCK_BYTES);
        options.setTableFormatConfig(table);
        options.setWriteBufferManager(BUFFERS);
        options.setWriteBufferSize(BUFFER_BYTES);
        options.setMaxWriteBufferNumber(2);
    }

    @Override
    public void close(String store, Options options) {
        filter.close();
    }
}
