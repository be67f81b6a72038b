package hissledger.physics;

import java.math.BigDecimal;

/** What the digits of a printed number promise. */
public final class Printed {
    private Printed() {}

    /** Room for the rounding of the comparison itself where a value lies on the edge, 2518.5 against 2518. */
    private static final double EDGE = 1.0 + 1e-9;

    /** Half a unit in the last digit printed; a lone ".0" is not a digit but how a table writes a whole number. */
    public static double halfUnit(String printed) {
        String digits = printed.endsWith(".0") ? printed.substring(0, printed.length() - 2) : printed;
        return 0.5 * new BigDecimal(digits).ulp().doubleValue() * EDGE;
    }

    /** Half a unit in the given significant digit of a value, for tables that leave trailing zeros out. */
    public static double halfUnit(double value, int significantDigits) {
        if (value == 0.0) {
            return 0.5 * Math.pow(10.0, -significantDigits);
        }
        int exponent = (int) Math.floor(Math.log10(Math.abs(value)));
        return 0.5 * Math.pow(10.0, exponent - significantDigits + 1) * EDGE;
    }
}
