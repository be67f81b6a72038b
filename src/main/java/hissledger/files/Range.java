package hissledger.files;

/**
 * The accepted range of a number.
 *
 * @param least lower bound
 * @param leastAllowed whether the lower bound itself is accepted
 * @param greatest upper bound, itself accepted; infinite for none
 */
record Range(double least, boolean leastAllowed, double greatest) {
    /** Above zero. */
    static final Range POSITIVE = new Range(0.0, false, Double.POSITIVE_INFINITY);

    /** Zero or above. */
    static final Range NOT_NEGATIVE = new Range(0.0, true, Double.POSITIVE_INFINITY);

    /** Any finite number. */
    static final Range ANY = new Range(Double.NEGATIVE_INFINITY, true, Double.POSITIVE_INFINITY);

    /** From one bound to another, both accepted. */
    static Range between(double least, double greatest) {
        return new Range(least, true, greatest);
    }

    /** Whether a number is accepted; NaN and infinities never are. */
    boolean accepts(double value) {
        return Double.isFinite(value) && (leastAllowed ? value >= least : value > least) && value <= greatest;
    }

    /** The range in words, bounds printed with a unit. */
    String words(String unit) {
        String bounds;
        if (!Double.isInfinite(greatest)) {
            bounds = "from " + bound(least, unit) + " to " + bound(greatest, unit);
        } else if (Double.isInfinite(least)) {
            return "finite";
        } else {
            bounds = (leastAllowed ? ">= " : "> ") + bound(least, unit);
        }
        return "finite and " + bounds;
    }

    private static String bound(double value, String unit) {
        return value == 0.0 ? (unit.isEmpty() ? "0" : "0 " + unit) : Quantities.brief(value, unit, 6);
    }
}
