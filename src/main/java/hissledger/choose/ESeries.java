package hissledger.choose;

import hissledger.physics.Require;
import java.util.ArrayList;
import java.util.List;

/**
 * Preferred values of resistors and capacitors, IEC 60063 (by secondary texts). E48 and E96 are {@code 100·10^(n/N)} rounded
 * to three digits; E6, E12 and E24 are older than that rule, depart from it in places and are listed.
 */
public enum ESeries {
    E6(0.20, 10, 15, 22, 33, 47, 68),
    E12(0.10, 10, 12, 15, 18, 22, 27, 33, 39, 47, 56, 68, 82),
    E24(0.05, 10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91),
    E48(0.02, rounded(48)),
    E96(0.01, rounded(96));

    private static final int LEAST_DECADE = -15;
    private static final int GREATEST_DECADE = 15;

    private final double tolerance;
    /** Never handed out nor changed. */
    @SuppressWarnings("ImmutableEnumChecker")
    private final int[] digits;

    ESeries(double tolerance, int... digits) {
        this.tolerance = tolerance;
        this.digits = digits;
    }

    private static int[] rounded(int count) {
        int[] digits = new int[count];
        for (int n = 0; n < count; n++) {
            digits[n] = (int) Math.round(100.0 * Math.pow(10.0, (double) n / count));
        }
        return digits;
    }

    /** The tolerance that the series was made for, a fraction: 0.05 for E24. */
    public double tolerance() {
        return tolerance;
    }

    /** The digits of one decade in rising order: two for E6 to E24, three for E48 and E96. */
    public List<Integer> digits() {
        List<Integer> list = new ArrayList<>();
        for (int each : digits) {
            list.add(each);
        }
        return list;
    }

    /**
     * The values of the series in a closed range, rising.
     *
     * @param from lower end, SI; &gt; 0
     * @param to upper end, SI
     */
    public List<Double> between(double from, double to) {
        Require.positive("from", from, "");
        Require.positive("to", to, "");
        List<Double> values = new ArrayList<>();
        int shift = digits[0] == 10 ? 1 : 2;
        int first = Math.max(LEAST_DECADE, (int) Math.floor(Math.log10(from)) - 1);
        int last = Math.min(GREATEST_DECADE, (int) Math.ceil(Math.log10(to)) + 1);
        for (int decade = first; decade <= last; decade++) {
            for (int each : digits) {
                // from its digits, so that 4.7 k is the double nearest to 4700
                double value = Double.parseDouble(each + "e" + (decade - shift));
                if (value >= from && value <= to) {
                    values.add(value);
                }
            }
        }
        return values;
    }

    /** The greatest value of the series that is not above {@code value}, SI; &gt; 0. */
    public double notAbove(double value) {
        List<Double> near = between(value / 10.0, value);
        return near.get(near.size() - 1);
    }

    /** The least value of the series that is not below {@code value}, SI; &gt; 0. */
    public double notBelow(double value) {
        return between(value, value * 10.0).get(0);
    }

    /** The value of the series nearest in ratio, the lower where two are equally near; {@code value} SI, &gt; 0. */
    public double nearest(double value) {
        double below = notAbove(value);
        double above = notBelow(value);
        return value / below <= above / value ? below : above;
    }
}
