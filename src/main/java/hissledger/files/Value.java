package hissledger.files;

import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;

/**
 * What a key of a file may hold: how it is read, and how it is described to an editor. One object serves both, so that they
 * cannot differ.
 *
 * @param schema its JSON Schema
 * @param reading how it is read
 */
record Value<T>(Supplier<Map<String, Object>> schema, Reading<T> reading) {
    /** How a value is read. */
    @FunctionalInterface
    interface Reading<T> {
        /** Reads a value; what is wrong with it goes to {@code faults}, and the result is then empty. */
        Optional<T> read(Node node, Faults faults);
    }

    /** Reads a value; what is wrong with it goes to {@code faults}, and the result is then empty. */
    Optional<T> read(Node node, Faults faults) {
        return reading.read(node, faults);
    }
}
