package hissledger.files;

/**
 * A key that an object of a file may have.
 *
 * @param name the key
 * @param required whether it must be there
 * @param value what it holds
 * @param description one sentence with unit and range
 */
record Key<T>(String name, boolean required, Value<T> value, String description) {
    /** A key that must be there. */
    static <T> Key<T> required(String name, Value<T> value, String description) {
        return new Key<>(name, true, value, description);
    }

    /** A key that may be left out. */
    static <T> Key<T> optional(String name, Value<T> value, String description) {
        return new Key<>(name, false, value, description);
    }
}
