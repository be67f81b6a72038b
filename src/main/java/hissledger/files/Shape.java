package hissledger.files;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The keys of one kind of object. Unknown, doubled and missing keys are found here, for every object of every file.
 *
 * @param words the object in words, for messages
 * @param keys its keys
 */
record Shape(String words, List<Key<?>> keys) {
    Shape {
        keys = List.copyOf(keys);
    }

    /** A shape of the given keys. */
    static Shape of(String words, Key<?>... keys) {
        return new Shape(words, List.of(keys));
    }

    /** This shape with further keys. */
    Shape with(Key<?>... more) {
        List<Key<?>> all = new ArrayList<>(keys);
        all.addAll(List.of(more));
        return new Shape(words, all);
    }

    /** Reads an object; empty where it is none. */
    Optional<Fields> read(Node node, Faults faults) {
        if (node.kind() != Node.Kind.OBJECT) {
            faults.at(node, "must be " + words + ", an object { }, was " + node.quoted());
            return Optional.empty();
        }
        Map<String, Key<?>> byName = new HashMap<>();
        List<String> names = new ArrayList<>();
        for (Key<?> key : keys) {
            byName.put(key.name(), key);
            names.add(key.name());
        }
        Map<String, Node.Member> seen = new HashMap<>();
        Map<Key<?>, Located<?>> values = new HashMap<>();
        for (Node.Member member : node.members()) {
            String path = member.value().path();
            Node.Member first = seen.putIfAbsent(member.name(), member);
            if (first != null) {
                faults.at(
                        member,
                        path,
                        "stands twice in " + words + ", first at line " + first.line() + ", column " + first.column()
                                + "; keep one");
                continue;
            }
            Key<?> key = byName.get(member.name());
            if (key == null) {
                faults.at(member, path, unknown(member.name(), names));
            } else {
                read(key, member.value(), faults, values);
            }
        }
        for (Key<?> key : keys) {
            if (key.required() && !seen.containsKey(key.name())) {
                faults.at(
                        node,
                        (node.path().isEmpty() ? words + " " : "") + "has no " + key.name() + ": " + key.description());
            }
        }
        return Optional.of(new Fields(node, values));
    }

    private static <T> void read(Key<T> key, Node node, Faults faults, Map<Key<?>, Located<?>> values) {
        key.value().read(node, faults).ifPresent(value -> values.put(key, new Located<>(node, value)));
    }

    private String unknown(String name, List<String> names) {
        List<String> near = Nearest.of(name, names);
        return "is not a key of " + words + (near.isEmpty() ? "" : "; did you mean " + String.join(" or ", near) + "?")
                + (near.isEmpty() ? "; use " : " Known are ") + String.join(", ", names);
    }
}
