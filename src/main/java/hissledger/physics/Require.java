package hissledger.physics;

/**
 * Argument checks whose messages name the parameter, the accepted range, the unit and the value that was given.
 *
 * <p>Every check is written so that NaN fails it. Each method returns the value it accepted.
 */
public final class Require {
    private Require() {}

    /** Accepts a finite value greater than zero; otherwise throws {@link IllegalArgumentException}. */
    public static double positive(String name, double value, String unit) {
        if (!(value > 0.0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(name + " must be finite and > 0" + suffix(unit) + ", was " + value);
        }
        return value;
    }

    /** Accepts a finite value not below zero; otherwise throws {@link IllegalArgumentException}. */
    public static double notNegative(String name, double value, String unit) {
        if (!(value >= 0.0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(name + " must be finite and >= 0" + suffix(unit) + ", was " + value);
        }
        return value;
    }

    /** Accepts any finite value; otherwise throws {@link IllegalArgumentException}. */
    public static double finite(String name, double value, String unit) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException(
                    name + " must be finite" + (unit.isEmpty() ? "" : " (" + unit + ")") + ", was " + value);
        }
        return value;
    }

    /** Accepts a whole number of at least {@code least}; otherwise throws {@link IllegalArgumentException}. */
    public static int atLeast(String name, int value, int least) {
        if (value < least) {
            throw new IllegalArgumentException(name + " must be >= " + least + ", was " + value);
        }
        return value;
    }

    private static String suffix(String unit) {
        return unit.isEmpty() ? "" : " " + unit;
    }
}
