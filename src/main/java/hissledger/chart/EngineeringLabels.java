package hissledger.chart;

import hissledger.files.Quantities;

/** Labels of ticks: {@code 10}, {@code 100}, {@code 1 k}; levels with a true minus sign. */
final class EngineeringLabels {
    /** More than a tick ever has. */
    private static final int DIGITS = 4;

    private static final String SOME_UNIT = "Ω";

    private EngineeringLabels() {}

    /** A number with its prefix: the unit itself stands in the title of the axis. */
    static String prefixed(double value) {
        String text = Quantities.brief(value, SOME_UNIT, DIGITS);
        return text.substring(0, text.length() - SOME_UNIT.length()).stripTrailing();
    }

    /** A number without prefix. */
    static String plain(double value) {
        return Quantities.brief(value, "", DIGITS).replace('-', '−');
    }
}
