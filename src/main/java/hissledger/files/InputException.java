package hissledger.files;

import java.util.Comparator;
import java.util.List;

/** An input cannot be used: all that is wrong with it, in the order of the file. */
public final class InputException extends Exception {
    private static final long serialVersionUID = 1L;

    private final transient List<Fault> faults;

    /** Carries the faults, sorted by file and position. */
    public InputException(List<Fault> faults) {
        super(faults.isEmpty() ? "input refused" : faults.get(0).sentence());
        this.faults = faults.stream()
                .sorted(Comparator.comparing(Fault::file)
                        .thenComparingInt(Fault::line)
                        .thenComparingInt(Fault::column))
                .toList();
    }

    /** Carries one fault of a file as a whole. */
    public static InputException of(String file, String message) {
        return new InputException(List.of(Fault.of(file, message)));
    }

    /** The faults. */
    public List<Fault> faults() {
        return faults;
    }
}
