package hissledger.chart;

/**
 * What an axis shows.
 *
 * @param title its quantity and unit
 * @param kind how it is ruled and labelled
 * @param from its lower end
 * @param to its upper end
 */
record Scale(String title, Kind kind, double from, double to) {
    /** How an axis is ruled and labelled. */
    enum Kind {
        /** Logarithmic, labels with a prefix: 10, 100, 1 k. */
        LOGARITHMIC_PREFIXED,
        /** Logarithmic, labels without a prefix. */
        LOGARITHMIC_PLAIN,
        /** Levels in decibels. */
        LEVEL
    }

    Scale {
        if (!(from < to) || Double.isInfinite(from) || Double.isInfinite(to)) {
            throw new IllegalArgumentException("an axis needs finite ends, was " + from + " to " + to);
        }
    }
}
