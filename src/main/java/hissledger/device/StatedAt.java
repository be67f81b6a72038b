package hissledger.device;

/** A companion value that a parameter is stated with: where it holds, or how it moves away from there. */
public enum StatedAt {
    /** Collector or drain current, A. */
    CURRENT("current"),
    /** Temperature, K. */
    TEMPERATURE("temperature"),
    /** Rise of temperature that doubles it, K. */
    DOUBLING_STEP("doublingStep"),
    /** Frequency, Hz. */
    FREQUENCY("frequency"),
    /** Exponent of its law, dimensionless. */
    EXPONENT("exponent"),
    /** Correlation with the channel noise, dimensionless. */
    CORRELATION("correlation");

    private final String key;

    StatedAt(String key) {
        this.key = key;
    }

    /** The key in a device file. */
    public String key() {
        return key;
    }
}
