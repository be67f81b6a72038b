package hissledger.device;

/** Where a device value comes from. */
public enum Basis {
    /** Printed in the maker's sheet or application note. */
    MAKER("maker"),
    /** Measured on samples and published. */
    MEASURED("measured"),
    /** Computed from published values; the reference holds the derivation. */
    DERIVED("derived"),
    /** Common practice of the trade, no source. */
    PRACTICE("practice"),
    /** From memory, to be checked. */
    MEMORY("memory"),
    /** Invented, for demonstration only. */
    INVENTED("invented");

    private final String label;

    Basis(String label) {
        this.label = label;
    }

    /** The word used in files and results. */
    public String label() {
        return label;
    }

    /** Whether a value of this basis must be accompanied by its reference. */
    public boolean needsReference() {
        return this == MAKER || this == MEASURED || this == DERIVED;
    }
}
