package hissledger.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleFunction;
import java.util.function.DoubleUnaryOperator;
import java.util.function.Predicate;

/**
 * Where an axis is ruled and labelled: 1-2-5 steps, or 1 to 9 of every decade as on log paper.
 *
 * @param value where
 * @param strong whether the line there is strong
 * @param label its label; empty for a line alone
 */
record Ruling(double value, boolean strong, String label) {
    /** Ends that are equal but for rounding are on the axis. */
    private static final double ROUNDING = 1e-9;

    /** Fewer labels than this leave the reader to guess. */
    private static final int FEWEST_LABELS = 4;

    private static final int MOST_LEVELS = 11;
    private static final double[] LEVEL_STEPS = {0.1, 0.2, 0.5, 1.0, 2.0, 5.0, 10.0, 20.0, 50.0, 100.0};

    /** Labelled digits of a decade, in tenths, sparsest first. */
    private static final List<int[]> LABELLED = List.of(
            new int[] {10},
            new int[] {10, 20, 50},
            new int[] {10, 20, 30, 50, 70},
            steps(10),
            steps(5),
            steps(2),
            steps(1));

    private static final double WHOLE_DECADE = 1.0;
    private static final double THIRD_OF_A_DECADE = 1.0 / 3.0;

    private static int[] steps(int tenths) {
        int[] digits = new int[90 / tenths];
        for (int k = 0; k < digits.length; k++) {
            digits[k] = 10 + k * tenths;
        }
        return digits;
    }

    /**
     * The ruling of a logarithmic axis.
     *
     * @param label the label of a value
     * @param fits whether labels at these values can stand side by side
     */
    static List<Ruling> logarithmic(
            double from, double to, DoubleFunction<String> label, Predicate<List<Double>> fits) {
        double decades = Math.log10(to / from);
        List<Double> labelled = thinned(decadeValues(from, to, LABELLED.get(0)), fits);
        for (int[] digits : LABELLED) {
            List<Double> denser = decadeValues(from, to, digits);
            if (labelled.size() >= FEWEST_LABELS || !fits.test(denser)) {
                break;
            }
            labelled = denser;
        }
        int[] lines = decades >= WHOLE_DECADE ? steps(10) : decades >= THIRD_OF_A_DECADE ? steps(5) : steps(1);
        List<Ruling> rulings = new ArrayList<>();
        for (double value : decadeValues(from, to, lines)) {
            if (!labelled.contains(value)) {
                rulings.add(new Ruling(value, isDecade(value), ""));
            }
        }
        for (double value : labelled) {
            rulings.add(new Ruling(value, isDecade(value), label.apply(value)));
        }
        return rulings;
    }

    /** The ruling of a linear axis of levels, lines at fifths or halves of the labelled steps. */
    static List<Ruling> levels(double from, double to, DoubleFunction<String> label, Predicate<List<Double>> fits) {
        double step = LEVEL_STEPS[LEVEL_STEPS.length - 1];
        for (double tried : LEVEL_STEPS) {
            List<Double> values = multiples(from, to, tried);
            if (values.size() <= MOST_LEVELS && fits.test(values)) {
                step = tried;
                break;
            }
        }
        int parts = isTwo(step) ? 2 : 5;
        List<Double> labelled = multiples(from, to, step);
        List<Ruling> rulings = new ArrayList<>();
        long first = (long) Math.ceil(from / step * parts - ROUNDING);
        long last = (long) Math.floor(to / step * parts + ROUNDING);
        for (long k = first; k <= last; k++) {
            if (k % parts != 0) {
                rulings.add(new Ruling(k * step / parts, false, ""));
            }
        }
        labelled.forEach(value -> rulings.add(new Ruling(value, true, label.apply(value))));
        return rulings;
    }

    private static boolean isTwo(double step) {
        double digit = step / Math.pow(10.0, Math.floor(Math.log10(step)));
        return Math.round(digit) == 2L;
    }

    private static List<Double> multiples(double from, double to, double step) {
        List<Double> values = new ArrayList<>();
        long last = (long) Math.floor(to / step + ROUNDING);
        for (long k = (long) Math.ceil(from / step - ROUNDING); k <= last; k++) {
            values.add(k * step);
        }
        return values;
    }

    /** Every second, third ... value, until their labels fit. */
    private static List<Double> thinned(List<Double> values, Predicate<List<Double>> fits) {
        List<Double> kept = values;
        for (int every = 2; every < values.size() && !fits.test(kept); every++) {
            kept = new ArrayList<>();
            for (int k = 0; k < values.size(); k += every) {
                kept.add(values.get(k));
            }
        }
        return kept;
    }

    private static List<Double> decadeValues(double from, double to, int[] tenths) {
        List<Double> values = new ArrayList<>();
        int last = (int) Math.ceil(Math.log10(to));
        for (int decade = (int) Math.floor(Math.log10(from)); decade <= last; decade++) {
            for (int tenth : tenths) {
                // read as a decimal: exact digits give exact labels
                double value = Double.parseDouble(tenth + "e" + (decade - 1));
                if (value >= from * (1.0 - ROUNDING) && value <= to * (1.0 + ROUNDING)) {
                    values.add(value);
                }
            }
        }
        return values;
    }

    private static boolean isDecade(double value) {
        return Math.abs(Math.log10(value) - Math.rint(Math.log10(value))) < ROUNDING;
    }

    /**
     * A test whether labels can stand side by side.
     *
     * @param place the place of a value along the axis, pixels
     * @param extent the room that the label of a value takes along the axis, pixels
     */
    static Predicate<List<Double>> sideBySide(DoubleUnaryOperator place, DoubleUnaryOperator extent, double gap) {
        return values -> {
            for (int k = 1; k < values.size(); k++) {
                double between = Math.abs(place.applyAsDouble(values.get(k)) - place.applyAsDouble(values.get(k - 1)));
                double taken = (extent.applyAsDouble(values.get(k)) + extent.applyAsDouble(values.get(k - 1))) / 2.0;
                if (between < taken + gap) {
                    return false;
                }
            }
            return true;
        };
    }
}
