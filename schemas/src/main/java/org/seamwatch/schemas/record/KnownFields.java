package org.seamwatch.schemas.record;

import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/**
 * The field names of a contract.
 *
 * @param prefix what goes before a name in a message, such as {@code position.}
 * @param names all of them
 * @param objects those whose value is an object, with its fields
 */
record KnownFields(String prefix, Set<String> names, Map<String, KnownFields> objects) {

    static KnownFields of(String... names) {
        return new KnownFields("", Set.of(names), Map.of());
    }

    /** The same names, one of which holds an object with these members. */
    KnownFields withObject(String name, String... members) {
        KnownFields inner = new KnownFields(prefix + name + ".", Set.of(members), Map.of());
        return new KnownFields(prefix, names, Map.of(name, inner));
    }

    boolean contains(String name) {
        return names.contains(name);
    }

    String path(String name) {
        return prefix + name;
    }

    @Nullable
    KnownFields membersOf(String name) {
        return objects.get(name);
    }

    int size() {
        return names.size();
    }
}
