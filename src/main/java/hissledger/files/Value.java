package hissledger.files;

import java.util.Optional;

/**
 * What a key of a file may hold, and how it is read. One object serves the reader, its messages and whatever else describes
 * the files, so that they cannot differ.
 */
interface Value<T> {
    /** Reads a value; what is wrong with it goes to {@code faults}, and the result is then empty. */
    Optional<T> read(Node node, Faults faults);
}
