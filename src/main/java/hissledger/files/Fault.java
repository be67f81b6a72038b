package hissledger.files;

/**
 * One thing that is wrong with an input.
 *
 * @param file the file, as the user named it
 * @param line line, from 1; 0 where no place in the file can be named
 * @param column column, from 1; 0 likewise
 * @param path dotted path of the value or key, such as {@code candidates[1].load.resistor}; may be empty
 * @param message what is wrong and what would be right
 */
public record Fault(String file, int line, int column, String path, String message) {
    /** A fault of a file as a whole. */
    public static Fault of(String file, String message) {
        return new Fault(file, 0, 0, "", message);
    }

    /** The sentence that the user reads: {@code file:line:column: path message}. */
    public String sentence() {
        String place = line > 0 ? ":" + line + ":" + column : "";
        return file + place + ": " + (path.isEmpty() ? "" : path + " ") + message;
    }
}
