package hissledger.physics;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/**
 * Nodes and weights that integrate a density over a frequency band: {@code ∫ g(f) df ≈ Σ w_k g(f_k)}.
 *
 * <p>The integral runs over ln f, {@code ∫ g f d(ln f)}, in panels of Gauss-Legendre points. A panel is halved until an
 * 8-point and a 12-point rule agree in it for every quantity asked, to a part in 10⁸ of that quantity's whole integral.
 * The 12-point nodes of the final panels are kept, so that everything else that is integrated over the same circuit (the
 * entries of an account, other designs near this one) reuses them without a new search.
 *
 * <p>A smooth density cannot hide from the first panels; a resonance can. The caller who knows of one names its
 * frequency as a break point: panels then end there and the halving closes in on it however narrow it is.
 */
public final class LogQuadrature {
    /** The quantities whose integrals must converge together. */
    @FunctionalInterface
    public interface Densities {
        /**
         * Evaluates every quantity at every frequency.
         *
         * @param hertz frequencies, Hz, not sorted
         * @return one row a quantity, one column a frequency; each value finite and ≥ 0, per Hz
         */
        double[][] at(double[] hertz);
    }

    private static final int LOW_ORDER = 8;
    private static final int HIGH_ORDER = 12;
    private static final Rule LOW = Rule.legendre(LOW_ORDER);
    private static final Rule HIGH = Rule.legendre(HIGH_ORDER);
    /** Widest first panel in ln f: the poles of the weightings are π/2 away from the real axis, so this is smooth. */
    private static final double WIDEST_PANEL = 1.75;
    /** Disagreement allowed in one panel, as a part of the whole integral: ten panels stay within 1e-7. */
    private static final double PANEL_TOLERANCE = 1e-8;
    /** Sixty halvings exhaust the double; a search that asks for more is not looking at a density. */
    private static final int MOST_ROUNDS = 60;
    /** More panels than any passive network asks for: each resonance costs about two a halving. */
    private static final int MOST_PANELS = 20_000;

    private final double[] hertz;
    private final double[] weights;

    private LogQuadrature(double[] hertz, double[] weights) {
        this.hertz = hertz;
        this.weights = weights;
    }

    /**
     * Finds nodes and weights for the band.
     *
     * @param band the band
     * @param breakHertz frequencies at which panels must end, Hz; those outside the band are passed over
     * @param densities the quantities that decide where panels are halved
     * @return the nodes and weights
     * @throws ArithmeticException if a quantity is not finite or the halving does not converge
     */
    public static LogQuadrature refine(Band band, double[] breakHertz, Densities densities) {
        List<Panel> accepted = new ArrayList<>();
        List<Panel> open = firstPanels(band, breakHertz);
        double[] whole = new double[0];
        for (int round = 0; !open.isEmpty(); round++) {
            if (round == MOST_ROUNDS || accepted.size() + open.size() > MOST_PANELS) {
                throw new ArithmeticException("the integral over " + band.fromHertz() + " Hz to " + band.toHertz()
                        + " Hz did not converge after " + round + " halvings");
            }
            evaluate(open, densities);
            whole = total(accepted, open);
            List<Panel> next = new ArrayList<>();
            for (Panel panel : open) {
                if (panel.agrees(whole)) {
                    accepted.add(panel);
                } else {
                    double middle = 0.5 * (panel.from + panel.to);
                    next.add(new Panel(panel.from, middle));
                    next.add(new Panel(middle, panel.to));
                }
            }
            open = next;
        }
        accepted.sort((p, q) -> Double.compare(p.from, q.from));
        double[] hertz = new double[accepted.size() * HIGH_ORDER];
        double[] weights = new double[hertz.length];
        for (int p = 0; p < accepted.size(); p++) {
            accepted.get(p).nodes(HIGH, hertz, weights, p * HIGH_ORDER);
        }
        return new LogQuadrature(hertz, weights);
    }

    /** How many nodes there are. */
    public int size() {
        return hertz.length;
    }

    /** A copy of the nodes, Hz, ascending. */
    public double[] hertz() {
        return hertz.clone();
    }

    /** A copy of the weights, Hz. */
    public double[] weights() {
        return weights.clone();
    }

    /**
     * Sums a density over the band.
     *
     * @param density values at {@link #hertz()}, per Hz; longer arrays are read up to {@link #size()}
     * @return the integral
     */
    public double integrate(double[] density) {
        double sum = 0.0;
        for (int k = 0; k < weights.length; k++) {
            sum += weights[k] * density[k];
        }
        return sum;
    }

    /**
     * Sums a density times a gain over the band.
     *
     * @param density values at {@link #hertz()}, per Hz
     * @param gain dimensionless gain at {@link #hertz()}
     * @return the integral
     */
    public double integrate(double[] density, double[] gain) {
        double sum = 0.0;
        for (int k = 0; k < weights.length; k++) {
            sum += weights[k] * density[k] * gain[k];
        }
        return sum;
    }

    private static List<Panel> firstPanels(Band band, double[] breakHertz) {
        double from = Math.log(band.fromHertz());
        double to = Math.log(band.toHertz());
        double[] edges = new double[breakHertz.length + 2];
        int count = 0;
        edges[count++] = from;
        for (double hertz : breakHertz) {
            double edge = Math.log(hertz);
            if (edge > from && edge < to) {
                edges[count++] = edge;
            }
        }
        edges[count++] = to;
        Arrays.sort(edges, 0, count);
        List<Panel> panels = new ArrayList<>();
        for (int e = 1; e < count; e++) {
            double width = edges[e] - edges[e - 1];
            if (width <= 0.0) {
                continue;
            }
            int pieces = (int) Math.ceil(width / WIDEST_PANEL);
            for (int p = 0; p < pieces; p++) {
                panels.add(new Panel(edges[e - 1] + width * p / pieces, edges[e - 1] + width * (p + 1) / pieces));
            }
        }
        return panels;
    }

    private static void evaluate(List<Panel> panels, Densities densities) {
        int each = LOW_ORDER + HIGH_ORDER;
        double[] hertz = new double[panels.size() * each];
        double[] weights = new double[hertz.length];
        for (int p = 0; p < panels.size(); p++) {
            panels.get(p).nodes(LOW, hertz, weights, p * each);
            panels.get(p).nodes(HIGH, hertz, weights, p * each + LOW_ORDER);
        }
        double[][] values = densities.at(hertz);
        for (int p = 0; p < panels.size(); p++) {
            Panel panel = panels.get(p);
            panel.low = sums(values, weights, p * each, LOW_ORDER);
            panel.high = sums(values, weights, p * each + LOW_ORDER, HIGH_ORDER);
        }
    }

    private static double[] sums(double[][] values, double[] weights, int from, int count) {
        double[] sums = new double[values.length];
        for (int q = 0; q < values.length; q++) {
            for (int k = from; k < from + count; k++) {
                sums[q] += weights[k] * values[q][k];
            }
            if (!Double.isFinite(sums[q])) {
                throw new ArithmeticException("a density to be integrated is not finite");
            }
        }
        return sums;
    }

    private static double[] total(List<Panel> accepted, List<Panel> open) {
        double[] total = new double[open.get(0).high.length];
        for (List<Panel> panels : List.of(accepted, open)) {
            for (Panel panel : panels) {
                for (int q = 0; q < total.length; q++) {
                    total[q] += panel.high[q];
                }
            }
        }
        return total;
    }

    /** A stretch of ln f with its two estimates of each integral. */
    private static final class Panel {
        private final double from;
        private final double to;
        private double[] low = new double[0];
        private double[] high = new double[0];

        Panel(double from, double to) {
            this.from = from;
            this.to = to;
        }

        /** Writes the nodes f, Hz, and the weights for an integral over f: w · half-width · f. */
        void nodes(Rule rule, double[] hertz, double[] weights, int at) {
            double middle = 0.5 * (from + to);
            double half = 0.5 * (to - from);
            for (int k = 0; k < rule.points.length; k++) {
                double f = Math.exp(middle + half * rule.points[k]);
                hertz[at + k] = f;
                weights[at + k] = rule.weights[k] * half * f;
            }
        }

        boolean agrees(double[] whole) {
            for (int q = 0; q < whole.length; q++) {
                if (Math.abs(high[q] - low[q]) > PANEL_TOLERANCE * whole[q]) {
                    return false;
                }
            }
            return true;
        }
    }

    /** Gauss-Legendre points and weights on [−1, 1]. */
    private static final class Rule {
        private final double[] points;
        private final double[] weights;

        private Rule(double[] points, double[] weights) {
            this.points = points;
            this.weights = weights;
        }

        static Rule legendre(int order) {
            GaussIntegrator integrator = new GaussIntegratorFactory().legendre(order);
            double[] points = new double[order];
            double[] weights = new double[order];
            for (int k = 0; k < order; k++) {
                points[k] = integrator.getPoint(k);
                weights[k] = integrator.getWeight(k);
            }
            return new Rule(points, weights);
        }
    }
}
