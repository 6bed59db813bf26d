package org.seamwatch.topology.service;

import static org.assertj.core.api.Assertions.assertThat;

import org.apache.kafka.common.TopicPartition;
import org.junit.jupiter.api.Test;

class RestoreCountTest {

    @Test
    void shouldCountWhatIsLeftOverAllStores() {
        RestoreCount count = new RestoreCount();
        TopicPartition a = new TopicPartition("a", 0);
        TopicPartition b = new TopicPartition("b", 0);
        count.onRestoreStart(a, "a", 10, 110);
        count.onRestoreStart(b, "b", 0, 50);
        assertThat(count.left()).isEqualTo(150);
        count.onBatchRestored(a, "a", 40, 30);
        assertThat(count.left()).isEqualTo(120);
        assertThat(count.restored()).isEqualTo(30);
        count.onRestoreEnd(b, "b", 50);
        assertThat(count.left()).isEqualTo(70);
        count.onRestoreSuspended(a, "a", 30);
        assertThat(count.left()).isZero();
    }
}
