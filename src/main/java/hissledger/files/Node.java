package hissledger.files;

import java.util.List;
import java.util.Optional;

/**
 * A JSON value with its place in the file.
 *
 * @param kind what it is
 * @param text the text of a string, number or literal; empty for objects and lists
 * @param path dotted path from the top
 * @param line line of its first character, from 1
 * @param column column of its first character, from 1
 * @param members of an object, in the order of the file, duplicates included
 * @param items of a list
 */
record Node(Kind kind, String text, String path, int line, int column, List<Member> members, List<Node> items) {
    /** What a JSON value is. */
    enum Kind {
        OBJECT("an object { }"),
        LIST("a list [ ]"),
        TEXT("a text in quotes"),
        NUMBER("a number"),
        FLAG("true or false"),
        NOTHING("null");

        private final String words;

        Kind(String words) {
            this.words = words;
        }

        String words() {
            return words;
        }
    }

    /**
     * A member of an object.
     *
     * @param name its key
     * @param line line of the key
     * @param column column of the key
     * @param value its value
     */
    record Member(String name, int line, int column, Node value) {}

    private static final int LONGEST_QUOTE = 60;

    Node {
        members = List.copyOf(members);
        items = List.copyOf(items);
    }

    /** The value of a member, the last one where the key stands twice. */
    Optional<Node> member(String name) {
        Optional<Node> found = Optional.empty();
        for (Member member : members) {
            if (member.name().equals(name)) {
                found = Optional.of(member.value());
            }
        }
        return found;
    }

    /** A text in quotes for a message: on one line, and not longer than a reader wants to see. */
    static String quote(String text) {
        StringBuilder quoted = new StringBuilder("\"");
        int end = Math.min(text.length(), LONGEST_QUOTE);
        for (int k = 0; k < end; k++) {
            char c = text.charAt(k);
            quoted.append(Character.isISOControl(c) ? ' ' : c);
        }
        return quoted.append(text.length() > LONGEST_QUOTE ? "..." : "")
                .append('"')
                .toString();
    }

    /** The value as a reader would quote it. */
    String quoted() {
        return switch (kind) {
            case TEXT -> quote(text);
            case OBJECT, LIST -> kind.words();
            default -> text;
        };
    }
}
