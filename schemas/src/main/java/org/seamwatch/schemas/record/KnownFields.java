package org.seamwatch.schemas.record;

import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/**
 * The field names of a contract.
 *
 * @param names all of them
 * @param objects those whose value is an object, with its fields
 */
record KnownFields(Set<String> names, Map<String, KnownFields> objects) {

    static KnownFields of(String... names) {
        return new KnownFields(Set.of(names), Map.of());
    }

    KnownFields withObject(String name, KnownFields members) {
        return new KnownFields(names, Map.of(name, members));
    }

    boolean contains(String name) {
        return names.contains(name);
    }

    @Nullable
    KnownFields membersOf(String name) {
        return objects.get(name);
    }

    int size() {
        return names.size();
    }
}
