package hissledger.choose;

import hissledger.ledger.BandWalk;
import hissledger.physics.Band;
import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.apache.commons.math3.optim.univariate.UnivariatePointValuePair;

/**
 * The quiescent current at which a design is quietest.
 *
 * <p>EIN² over the band is scanned on a grid in ln I; every grid point that is not above its neighbours brackets a local
 * minimum, which Brent's method then closes in on; the least of all wins. The scan is what tells several minima apart.
 * Source: R. P. Brent, <cite>Algorithms for Minimization without Derivatives</cite>, Prentice-Hall 1973, chapter 5.
 */
public final class BestCurrent {
    /** The zone around the best current that costs no more than this is called flat, dB. */
    public static final double FLAT_DECIBELS = 0.1;

    private static final int POINTS_PER_DECADE = 8;
    /** EIN² near its minimum is flat: its rounding of 1e-16 hides changes of ln I below about 1e-8. */
    private static final double RELATIVE_TOLERANCE = 1e-9;

    private static final double ABSOLUTE_TOLERANCE = 1e-9;
    private static final int MOST_EVALUATIONS = 200;
    /** Edges of the flat zone are printed to three digits. */
    private static final double EDGE_TOLERANCE = 1e-6;
    /** Two minima whose levels differ by less are the same to anyone who measures, dB. */
    private static final double WORTH_TELLING_DECIBELS = 1.0;

    private BestCurrent() {}

    /**
     * The outcome of a search.
     *
     * @param amps the best current of each device, A
     * @param flatFromAmps lower end of the zone within {@link #FLAT_DECIBELS} of the best, A
     * @param flatToAmps upper end of that zone, A
     * @param bound what held the current back; empty where the optimum is inside the range
     * @param otherMinimaAmps other local minima less than 1 dB above the best, A
     */
    public record Optimum(
            double amps, double flatFromAmps, double flatToAmps, Optional<String> bound, List<Double> otherMinimaAmps) {
        public Optimum {
            otherMinimaAmps = List.copyOf(otherMinimaAmps);
        }
    }

    /** Searches the range of a design for the least EIN under a weighting. */
    public static Optimum of(Design design, Band band, Weighting weighting) {
        CurrentRange range = design.range();
        double from = Math.log(range.fromAmps());
        double to = Math.log(range.toAmps());
        if (to - from < EDGE_TOLERANCE) {
            return new Optimum(
                    range.toAmps(), range.toAmps(), range.toAmps(), Optional.of(range.toReason()), List.of());
        }
        BandWalk walk = BandWalk.over(design.at(Math.exp(0.5 * (from + to))), band);
        DoubleUnaryOperator power = logAmps -> {
            walk.walk(design.at(clamped(logAmps, range)));
            return walk.einVoltsSquared(weighting);
        };

        int points = 2 + (int) Math.ceil((to - from) / Math.log(10.0) * POINTS_PER_DECADE);
        double[] x = new double[points];
        double[] y = new double[points];
        double scale = Double.POSITIVE_INFINITY;
        for (int k = 0; k < points; k++) {
            x[k] = k == points - 1 ? to : from + (to - from) * k / (points - 1);
            y[k] = power.applyAsDouble(x[k]);
            scale = Math.min(scale, y[k]);
        }
        List<double[]> minima = minima(x, y, scale, power);
        double[] best = minima.get(0);
        for (double[] minimum : minima) {
            if (minimum[1] < best[1]) {
                best = minimum;
            }
        }
        double limit = best[1] * Decibels.toPowerRatio(FLAT_DECIBELS);
        List<Double> others = new ArrayList<>();
        for (double[] minimum : minima) {
            boolean near = minimum[1] < best[1] * Decibels.toPowerRatio(WORTH_TELLING_DECIBELS);
            if (minimum != best && near) {
                others.add(Math.exp(minimum[0]));
            }
        }
        return new Optimum(
                clamped(best[0], range),
                clamped(edge(x, y, best[0], limit, power, -1), range),
                clamped(edge(x, y, best[0], limit, power, +1), range),
                bound(best[0], from, to, range),
                others);
    }

    private static double clamped(double logAmps, CurrentRange range) {
        if (logAmps <= Math.log(range.fromAmps())) {
            return range.fromAmps();
        }
        return logAmps >= Math.log(range.toAmps()) ? range.toAmps() : Math.exp(logAmps);
    }

    private static Optional<String> bound(double best, double from, double to, CurrentRange range) {
        if (best <= from) {
            return Optional.of(range.fromReason());
        }
        return best >= to ? Optional.of(range.toReason()) : Optional.empty();
    }

    /** Every local minimum as (ln I, EIN²), ends of the range included. */
    private static List<double[]> minima(double[] x, double[] y, double scale, DoubleUnaryOperator power) {
        List<double[]> minima = new ArrayList<>();
        int last = x.length - 1;
        for (int k = 0; k <= last; k++) {
            boolean notAboveLeft = k == 0 || y[k] <= y[k - 1];
            boolean notAboveRight = k == last || y[k] < y[k + 1];
            if (!notAboveLeft || !notAboveRight) {
                continue;
            }
            double left = x[Math.max(0, k - 1)];
            double right = x[Math.min(last, k + 1)];
            UnivariatePointValuePair found = new BrentOptimizer(RELATIVE_TOLERANCE, ABSOLUTE_TOLERANCE)
                    .optimize(
                            new MaxEval(MOST_EVALUATIONS),
                            new UnivariateObjectiveFunction(logAmps -> power.applyAsDouble(logAmps) / scale),
                            GoalType.MINIMIZE,
                            new SearchInterval(left, right, x[k]));
            double level = found.getValue() * scale;
            minima.add(level < y[k] ? new double[] {found.getPoint(), level} : new double[] {x[k], y[k]});
        }
        return minima;
    }

    /** Where EIN² first reaches {@code limit} on one side of the best current, or the end of the range. */
    private static double edge(
            double[] x, double[] y, double best, double limit, DoubleUnaryOperator power, int direction) {
        double inside = best;
        int k = direction > 0 ? 0 : x.length - 1;
        for (; k >= 0 && k < x.length; k += direction) {
            boolean beyondBest = direction > 0 ? x[k] > best : x[k] < best;
            if (!beyondBest) {
                continue;
            }
            if (y[k] > limit) {
                return new BrentSolver(EDGE_TOLERANCE)
                        .solve(
                                MOST_EVALUATIONS,
                                logAmps -> power.applyAsDouble(logAmps) / limit - 1.0,
                                Math.min(inside, x[k]),
                                Math.max(inside, x[k]));
            }
            inside = x[k];
        }
        return inside;
    }
}
