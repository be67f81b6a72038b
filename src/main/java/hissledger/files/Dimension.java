package hissledger.files;

import java.util.List;

/** What a physical value measures, and how its unit may be written. */
enum Dimension {
    RESISTANCE("a resistance", "Ω", "150 ohm", "ohm", "Ω", "\u2126", "R"),
    CAPACITANCE("a capacitance", "F", "22 uF", "F"),
    INDUCTANCE("an inductance", "H", "0.6 mH", "H"),
    CURRENT("a current", "A", "1.2 mA", "A"),
    VOLTAGE("a voltage", "V", "48 V", "V"),
    POWER("a power", "W", "350 mW", "W"),
    FREQUENCY("a frequency", "Hz", "20 kHz", "Hz"),
    TEMPERATURE("a temperature", "K", "27 degC", "K", "degC", "°C"),
    TEMPERATURE_STEP("a temperature step", "K", "10 K", "K"),
    CONDUCTANCE("a transconductance", "S", "14 mS", "S"),
    INVERSE_VOLTAGE("an output conductance factor", "1/V", "0.01 1/V", "1/V"),
    VOLTAGE_DENSITY("a voltage noise density", "V/√Hz", "5 nV/rtHz", "V/rtHz", "V/√Hz"),
    CURRENT_DENSITY("a current noise density", "A/√Hz", "0.5 pA/rtHz", "A/rtHz", "A/√Hz"),
    LEVEL("a voltage level", "V", "-128 dBu", "V", "dBu", "dBV"),
    REFERENCE_LEVEL("a reference level", "V", "5 mV", "V", "dBu", "dBV", "dB SPL", "Pa", "m/s"),
    DECIBELS("a level", "dB", "-20 dB", "dB"),
    PERCENT("a part", "%", "1 %", "%"),
    LENGTH("a length", "m", "4.5 m", "m"),
    CAPACITANCE_PER_LENGTH("a capacitance per length", "F/m", "100 pF/m", "F/m"),
    SENSITIVITY("a sensitivity", "V/Pa", "1.8 mV/Pa", "V/Pa", "V/(m/s)", "V/(m/s2)", "V/(m/s²)", "V/N");

    private final String words;
    private final String printed;
    private final String example;
    /** Divided by bars. */
    private final String spellings;

    Dimension(String words, String printed, String example, String... spellings) {
        this.words = words;
        this.printed = printed;
        this.example = example;
        this.spellings = String.join("|", spellings);
    }

    /** What it measures, in words, with its article. */
    String words() {
        return words;
    }

    /** The unit in which values are printed back. */
    String printed() {
        return printed;
    }

    /** A value as it should be written. */
    String example() {
        return example;
    }

    /** The accepted spellings of its unit, without prefix. */
    List<String> spellings() {
        return List.of(spellings.split("\\|", -1));
    }

    /** Whether a value may be written with a letter code of IEC 60062 in place of the decimal point. */
    boolean hasLetterCode() {
        return this == RESISTANCE || this == CAPACITANCE || this == INDUCTANCE;
    }
}
