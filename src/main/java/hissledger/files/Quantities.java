package hissledger.files;

import hissledger.physics.Constants;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Physical values as text: {@code "4.7 kohm"}, {@code "4k7"}, {@code "5 nV/rtHz"} in, engineering notation out. */
public final class Quantities {
    /**
     * A value with the unit it was written in.
     *
     * @param value in the unit without its prefix, with temperatures in K and levels as written
     * @param unit the spelling of the unit, without prefix
     */
    record Parsed(double value, String unit) {}

    /** A text is no value of the wanted kind; the message says why and how to write one. */
    static final class NotAQuantity extends Exception {
        private static final long serialVersionUID = 1L;

        private final String why;

        NotAQuantity(String why) {
            super(why);
            this.why = why;
        }

        /** What is wrong and what would be right. */
        String why() {
            return why;
        }
    }

    private static final Pattern NUMBER_AND_UNIT =
            Pattern.compile("([+-]?(?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][+-]?\\d+)?)\\s*(.*)");
    private static final Pattern DECIMAL_COMMA = Pattern.compile("[+-]?\\d+,\\d+.*");
    private static final Pattern LETTER_CODE = Pattern.compile("(\\d*)([A-Za-zµμ])(\\d*)");
    private static final Map<String, Integer> PREFIXES = Map.ofEntries(
            Map.entry("", 0),
            Map.entry("f", -15),
            Map.entry("p", -12),
            Map.entry("n", -9),
            Map.entry("u", -6),
            Map.entry("µ", -6),
            Map.entry("μ", -6),
            Map.entry("m", -3),
            Map.entry("k", 3),
            Map.entry("M", 6),
            Map.entry("G", 9),
            Map.entry("T", 12));
    private static final Map<String, Integer> RESISTANCE_LETTERS =
            Map.of("R", 0, "r", 0, "k", 3, "K", 3, "M", 6, "G", 9, "T", 12, "L", -3);
    private static final Map<String, Integer> CAPACITANCE_LETTERS =
            Map.of("p", -12, "n", -9, "u", -6, "µ", -6, "μ", -6, "m", -3, "F", 0);
    private static final Map<String, Integer> INDUCTANCE_LETTERS =
            Map.of("n", -9, "u", -6, "µ", -6, "μ", -6, "m", -3, "H", 0);
    private static final String PRINTED_PREFIXES = "fpnµm kMGT";
    private static final int LEAST_EXPONENT = -15;
    private static final int GREATEST_EXPONENT = 12;

    /** Longer than any number worth writing; digits without end would take long to convert. */
    private static final int LONGEST = 100;

    /** Stands for a unit that takes a prefix and is then cut off. */
    private static final String PLACEHOLDER = "x";

    private Quantities() {}

    /**
     * Prints a value in engineering notation: {@code format(4700, "Ω", 3)} is {@code "4.70 kΩ"}.
     *
     * @param siValue the value in the unit; finite
     * @param unit the unit without prefix; units that take no prefix (dB, %, K) are printed plain
     * @param digits significant figures, at least 1
     */
    public static String format(double siValue, String unit, int digits) {
        if (siValue == 0.0) {
            return unit.isEmpty() ? "0" : "0 " + unit;
        }
        if (!Double.isFinite(siValue)) {
            return String.valueOf(siValue);
        }
        BigDecimal rounded = new BigDecimal(siValue).round(new MathContext(digits, RoundingMode.HALF_EVEN));
        int magnitude = rounded.precision() - rounded.scale() - 1;
        int exponent = takesNoPrefix(unit) ? 0 : Math.floorDiv(magnitude, 3) * 3;
        exponent = Math.max(LEAST_EXPONENT, Math.min(GREATEST_EXPONENT, exponent));
        BigDecimal mantissa = rounded.movePointLeft(exponent);
        int decimals = Math.max(0, digits - 1 - (magnitude - exponent));
        String number = mantissa.setScale(decimals, RoundingMode.HALF_EVEN).toPlainString();
        char prefix = PRINTED_PREFIXES.charAt((exponent - LEAST_EXPONENT) / 3);
        return (number + " " + (prefix == ' ' ? "" : String.valueOf(prefix)) + unit).stripTrailing();
    }

    /** {@link #format} without the zeros that end a decimal fraction: {@code "4.7 kΩ"}. */
    public static String brief(double siValue, String unit, int digits) {
        String text = format(siValue, unit, digits);
        int space = text.indexOf(' ');
        String number = space < 0 ? text : text.substring(0, space);
        if (!number.contains(".")) {
            return text;
        }
        return number.replaceAll("0+$", "").replaceAll("\\.$", "") + (space < 0 ? "" : text.substring(space));
    }

    /** A bare number with its prefix alone, as axes are labelled: {@code 20000} is {@code "20 k"}. */
    public static String prefixed(double value, int digits) {
        String text = brief(value, PLACEHOLDER, digits);
        return text.substring(0, text.length() - PLACEHOLDER.length()).strip();
    }

    /** Whether a unit stands without prefix. */
    static boolean takesNoPrefix(String unit) {
        return unit.isEmpty()
                || unit.startsWith("dB")
                || unit.equals("%")
                || unit.equals("K")
                || unit.equals("°C")
                || unit.equals("degC")
                || unit.equals("1/V");
    }

    /** A resistance as written on a command line, Ω; {@link IllegalArgumentException} says what is wrong. */
    public static double ohms(String text) {
        return orIllegal(text, Dimension.RESISTANCE);
    }

    /** A current as written on a command line, A; {@link IllegalArgumentException} says what is wrong. */
    public static double amps(String text) {
        return orIllegal(text, Dimension.CURRENT);
    }

    /** A transconductance as written on a command line, S; {@link IllegalArgumentException} says what is wrong. */
    public static double siemens(String text) {
        return orIllegal(text, Dimension.CONDUCTANCE);
    }

    /** A voltage as written on a command line, V; {@link IllegalArgumentException} says what is wrong. */
    public static double volts(String text) {
        return orIllegal(text, Dimension.VOLTAGE);
    }

    /** A frequency as written on a command line, Hz; {@link IllegalArgumentException} says what is wrong. */
    public static double hertz(String text) {
        return orIllegal(text, Dimension.FREQUENCY);
    }

    /** A ratio in decibels as written on a command line, dB; {@link IllegalArgumentException} says what is wrong. */
    public static double decibels(String text) {
        return orIllegal(text, Dimension.DECIBELS);
    }

    /** A part of the whole as written on a command line, 0.05 for "5 %"; {@link IllegalArgumentException} says what is wrong. */
    public static double part(String text) {
        return orIllegal(text, Dimension.PERCENT);
    }

    private static double orIllegal(String text, Dimension dimension) {
        try {
            double value = parse(text, dimension).value();
            if (!(value > 0.0) || Double.isInfinite(value)) {
                throw new IllegalArgumentException("must be finite and > 0, was \"" + text + "\"");
            }
            return value;
        } catch (NotAQuantity fault) {
            throw new IllegalArgumentException(fault.why(), fault);
        }
    }

    /** Reads a value of a dimension, in the base unit of that dimension (levels: as written, see {@link Parsed}). */
    static Parsed parse(String text, Dimension dimension) throws NotAQuantity {
        String trimmed = text.strip();
        String example = "write it like \"" + dimension.example() + "\"";
        if (trimmed.isEmpty()) {
            throw new NotAQuantity("must not be empty; " + example);
        }
        if (trimmed.length() > LONGEST) {
            throw new NotAQuantity("must be " + dimension.words() + ", was " + Node.quote(text) + "; " + example);
        }
        if (DECIMAL_COMMA.matcher(trimmed).matches()) {
            throw new NotAQuantity("has a decimal comma in " + Node.quote(text) + "; write a decimal point, as in "
                    + Node.quote(trimmed.replaceFirst(",", ".")));
        }
        if (dimension.hasLetterCode()) {
            Matcher code = LETTER_CODE.matcher(trimmed);
            if (code.matches() && (!code.group(1).isEmpty() || !code.group(3).isEmpty())) {
                Integer exponent = letters(dimension).get(code.group(2));
                if (exponent != null) {
                    String digits = (code.group(1).isEmpty() ? "0" : code.group(1))
                            + (code.group(3).isEmpty() ? "" : "." + code.group(3));
                    return new Parsed(
                            scaled(digits, exponent), dimension.spellings().get(0));
                }
            }
        }
        Matcher matcher = NUMBER_AND_UNIT.matcher(trimmed);
        if (!matcher.matches()) {
            throw new NotAQuantity("must be " + dimension.words() + ", was " + Node.quote(text) + "; " + example);
        }
        String unit = matcher.group(2);
        if (unit.isEmpty()) {
            throw new NotAQuantity("has no unit in " + Node.quote(text) + "; " + example);
        }
        Parsed parsed = withUnit(matcher.group(1), unit, dimension);
        if (parsed != null) {
            return parsed;
        }
        for (Dimension other : Dimension.values()) {
            if (withUnit(matcher.group(1), unit, other) != null) {
                throw new NotAQuantity("must be " + dimension.words() + ", but " + Node.quote(unit) + " in "
                        + Node.quote(text) + " is the unit of " + other.words() + "; " + example);
            }
        }
        throw new NotAQuantity("has an unknown unit " + Node.quote(unit) + " in " + Node.quote(text) + "; " + example);
    }

    /** The letters that stand for the decimal point in a letter code, with their powers of ten. */
    static Map<String, Integer> letters(Dimension dimension) {
        return switch (dimension) {
            case RESISTANCE -> RESISTANCE_LETTERS;
            case CAPACITANCE -> CAPACITANCE_LETTERS;
            default -> INDUCTANCE_LETTERS;
        };
    }

    private static @org.jspecify.annotations.Nullable Parsed withUnit(String number, String unit, Dimension dimension) {
        for (String spelling : dimension.spellings()) {
            if (!unit.endsWith(spelling)) {
                continue;
            }
            String prefix = unit.substring(0, unit.length() - spelling.length());
            Integer exponent = PREFIXES.get(prefix);
            if (exponent == null || (!prefix.isEmpty() && takesNoPrefix(spelling))) {
                continue;
            }
            double value = scaled(number, exponent);
            boolean celsius = spelling.equals("degC") || spelling.equals("°C");
            if (spelling.equals("%")) {
                return new Parsed(scaled(number, -2), spelling);
            }
            return new Parsed(celsius ? value + Constants.ZERO_CELSIUS_KELVIN : value, spelling);
        }
        return null;
    }

    /** The double nearest to {@code digits · 10^exponent}; infinite where it is too large. */
    private static double scaled(String digits, int exponent) {
        try {
            return new BigDecimal(digits).scaleByPowerOfTen(exponent).doubleValue();
        } catch (NumberFormatException | ArithmeticException tooLarge) {
            return Double.POSITIVE_INFINITY;
        }
    }
}
