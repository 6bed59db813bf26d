package org.seamwatch.ops.bench;

import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.concurrent.ExecutionException;
import java.util.stream.Collectors;
import org.apache.kafka.clients.admin.ConfigEntry;
import org.apache.kafka.clients.admin.TopicDescription;
import org.apache.kafka.common.config.ConfigResource;
import org.seamwatch.fixtures.broker.TopicTool;

/**
 * The engine's own topics of a job, learned from its first run and made before each later one, with the same partitions
 * and settings. What a producer sends in the moment after a topic was made may be refused, and be retried for seconds:
 * that would be measured, too.
 */
final class InternalTopics {

    private record Topic(int partitions, Map<String, String> settings) {}

    private final TopicTool tool;
    private final SortedMap<String, Topic> topics = new TreeMap<>();

    InternalTopics(TopicTool tool) {
        this.tool = tool;
    }

    /** Makes the topics of an application; none before the first {@link #learn}. */
    void make(String application) {
        topics.forEach((name, topic) -> {
            tool.create(application + name, topic.partitions(), topic.settings());
            tool.endOffsets(application + name);
        });
    }

    /** Looks at the topics that an application has left, and deletes them. */
    void learn(String application) throws InterruptedException {
        topics.clear();
        for (String name : tool.topics()) {
            if (name.startsWith(application + "-")) {
                topics.put(name.substring(application.length()), topic(name));
            }
        }
        tool.delete(topics.keySet().stream().map(application::concat).toArray(String[]::new));
    }

    private Topic topic(String name) throws InterruptedException {
        ConfigResource resource = new ConfigResource(ConfigResource.Type.TOPIC, name);
        try {
            Map<String, TopicDescription> described =
                    tool.admin().describeTopics(List.of(name)).allTopicNames().get();
            int partitions = described.values().iterator().next().partitions().size();
            Map<String, String> settings = tool
                    .admin()
                    .describeConfigs(List.of(resource))
                    .all()
                    .get()
                    .values()
                    .iterator()
                    .next()
                    .entries()
                    .stream()
                    .filter(entry -> entry.source() == ConfigEntry.ConfigSource.DYNAMIC_TOPIC_CONFIG)
                    .collect(Collectors.toMap(ConfigEntry::name, ConfigEntry::value));
            return new Topic(partitions, settings);
        } catch (ExecutionException e) {
            throw new IllegalStateException("cannot look at topic " + name, e);
        }
    }
}
