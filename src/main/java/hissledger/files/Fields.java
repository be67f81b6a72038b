package hissledger.files;

import java.util.Map;
import java.util.Optional;

/** What was read of one object: the values of its keys, those that could be read. */
final class Fields {
    private final Node node;
    private final Map<Key<?>, Located<?>> values;

    Fields(Node node, Map<Key<?>, Located<?>> values) {
        this.node = node;
        this.values = Map.copyOf(values);
    }

    /** The object itself. */
    Node node() {
        return node;
    }

    /** A value with its place; empty where the key is absent or its value was refused. */
    <T> Optional<Located<T>> located(Key<T> key) {
        Located<?> found = values.get(key);
        if (found == null) {
            return Optional.empty();
        }
        // put there by Shape.read, which pairs each key with a value of its own type
        @SuppressWarnings("unchecked")
        Located<T> typed = (Located<T>) found;
        return Optional.of(typed);
    }

    /** A value; empty where the key is absent or its value was refused. */
    <T> Optional<T> get(Key<T> key) {
        return located(key).map(Located::value);
    }

    /** A value, or another where the key is absent. */
    <T> T get(Key<T> key, T otherwise) {
        return get(key).orElse(otherwise);
    }

    /** A value that is known to be there once the file was found free of faults. */
    <T> T need(Key<T> key) {
        return get(key).orElseThrow(() -> new IllegalStateException("no " + key.name() + " at " + node.path()));
    }
}
