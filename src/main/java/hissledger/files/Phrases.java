package hissledger.files;

import hissledger.choose.OpenValue;
import hissledger.circuit.CapacitorSource;
import hissledger.circuit.CoilSource;
import hissledger.circuit.ResistorSource;
import hissledger.circuit.Source;
import hissledger.circuit.TableSource;
import hissledger.physics.Band;
import hissledger.physics.Constants;
import hissledger.physics.Weighting;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** Values and conditions in words, the same in tables and on charts. */
public final class Phrases {
    /** Digits of a computed value that is not a level. */
    private static final int DIGITS = 3;

    /** Digits of a value that the user stated. */
    private static final int STATED_DIGITS = 4;

    private Phrases() {}

    /** A computed value in engineering notation. */
    public static String value(double value, String unit) {
        return Quantities.format(value, unit, DIGITS);
    }

    /** A stated value in engineering notation, without zeros at its end. */
    public static String brief(double value, String unit) {
        return Quantities.brief(value, unit, STATED_DIGITS);
    }

    /** A temperature in degrees Celsius, as near as its digits say. */
    public static String temperature(double kelvin) {
        String digits = String.format(Locale.ROOT, "%.2f", kelvin - Constants.ZERO_CELSIUS_KELVIN);
        return digits.replaceAll("0+$", "").replaceAll("\\.$", "") + " °C";
    }

    /** A band. */
    public static String band(Band band) {
        return brief(band.fromHertz(), "Hz") + " to " + brief(band.toHertz(), "Hz");
    }

    /** A weighting as it stands beside a figure. */
    public static String weighting(Weighting weighting) {
        return switch (weighting) {
            case FLAT -> "unweighted";
            case A -> "A-weighted";
            case ITU_468, PLAYBACK, PLAYBACK_A -> weighting.label();
        };
    }

    /** A value that a search has chosen: a count, a turns ratio or ohms. */
    public static String chosen(OpenValue open, double value) {
        if (open instanceof OpenValue.Count) {
            return String.format(Locale.ROOT, "%.0f", value);
        }
        return open instanceof OpenValue.Ratio ? String.format(Locale.ROOT, "1:%.1f", value) : value(value, "Ω");
    }

    /** A source with its values and temperature. */
    public static String source(Source source) {
        List<String> parts = new ArrayList<>();
        String kind;
        if (source instanceof ResistorSource resistor) {
            kind = "resistor";
            parts.add(brief(resistor.resistanceOhms(), "Ω"));
        } else if (source instanceof CoilSource coil) {
            kind = "coil";
            parts.add(brief(coil.resistanceOhms(), "Ω") + " + " + brief(coil.inductanceHenries(), "H"));
            across(parts, coil.parallelOhms(), coil.parallelFarads());
        } else if (source instanceof CapacitorSource capacitor) {
            kind = "capacitor";
            parts.add(brief(capacitor.capacitanceFarads(), "F"));
            if (capacitor.lossTangent() > 0.0) {
                parts.add("loss tangent "
                        + new BigDecimal(String.valueOf(capacitor.lossTangent()))
                                .stripTrailingZeros()
                                .toPlainString());
            }
            across(parts, capacitor.parallelOhms(), 0.0);
        } else if (source instanceof TableSource table) {
            kind = "measured impedance";
            parts.add(table.hertz().size() + " points from " + band(table.band()));
        } else {
            throw new IllegalStateException("a source without words: " + source);
        }
        return kind + " " + String.join(", ", parts) + ", at " + temperature(source.temperatureKelvin());
    }

    private static void across(List<String> parts, double ohms, double farads) {
        if (!Double.isInfinite(ohms)) {
            parts.add(brief(ohms, "Ω") + " across it");
        }
        if (farads > 0.0) {
            parts.add(brief(farads, "F") + " across it");
        }
    }
}
