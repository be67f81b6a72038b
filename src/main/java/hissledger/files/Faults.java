package hissledger.files;

import java.util.ArrayList;
import java.util.List;

/** Collects all that is wrong with one file. */
final class Faults {
    private final String file;
    private final List<Fault> list = new ArrayList<>();

    Faults(String file) {
        this.file = file;
    }

    /** The file whose faults these are. */
    String file() {
        return file;
    }

    /** Something is wrong with a value. */
    void at(Node node, String message) {
        list.add(new Fault(file, node.line(), node.column(), node.path(), message));
    }

    /** Something is wrong with a key. */
    void at(Node.Member member, String path, String message) {
        list.add(new Fault(file, member.line(), member.column(), path, message));
    }

    /** Something is wrong at a place. */
    void at(int line, int column, String message) {
        list.add(new Fault(file, line, column, "", message));
    }

    boolean isEmpty() {
        return list.isEmpty();
    }

    /** Throws what has been collected, if anything. */
    void throwIfAny() throws InputException {
        if (!list.isEmpty()) {
            throw new InputException(list);
        }
    }
}
