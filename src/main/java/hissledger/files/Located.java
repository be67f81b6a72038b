package hissledger.files;

/**
 * A value with its place in the file.
 *
 * @param node the JSON value it was read from
 * @param value the value
 */
record Located<T>(Node node, T value) {}
