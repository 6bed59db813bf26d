package org.seamwatch.processors.state;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class MemoryShelfTest {

    private final MemoryShelf shelf = new MemoryShelf();

    private static byte[] utf8(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }

    @Test
    void shouldGiveRowsOfAPrefixInOrder() {
        List.of("a|2", "b|1", "a|10", "a", "a|1").forEach(key -> shelf.put(key, utf8(key)));

        assertThat(shelf.rows("a|")).extracting(Shelf.Row::key).containsExactly("a|1", "a|10", "a|2");
        assertThat(shelf.rows("c")).isEmpty();
    }

    @Test
    void shouldVisitEveryRowOnceThoughRowsAreRemovedMeanwhile() {
        for (int i = 0; i < 200; i++) {
            shelf.put("k" + (i * 37) % 200, utf8("v" + (i * 37) % 200));
        }
        List<String> seen = new ArrayList<>();
        shelf.visit((key, row) -> {
            assertThat(new String(row, StandardCharsets.UTF_8)).isEqualTo("v" + key.substring(1));
            seen.add(key);
            if (seen.size() % 3 != 0) {
                shelf.remove(key);
            }
        });

        assertThat(seen).hasSize(200).doesNotHaveDuplicates();
        assertThat(shelf.size()).isEqualTo(66);
    }

    @Test
    void shouldForgetARemovedRow() {
        shelf.put("a", utf8("1"));
        shelf.remove("a");
        shelf.remove("b");

        assertThat(shelf.get("a")).isNull();
    }
}
