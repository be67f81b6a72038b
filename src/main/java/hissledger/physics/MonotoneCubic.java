package hissledger.physics;

/**
 * A smooth curve through given points that never overshoots them: monotone wherever the points are.
 *
 * <p>Between points a cubic with tangents that keep it monotone. Source: F. N. Fritsch and R. E. Carlson, <cite>Monotone
 * piecewise cubic interpolation</cite>, SIAM J. Numer. Anal. 17 (1980) 238-246; the tangents are those of F. N. Fritsch and
 * J. Butland, SIAM J. Sci. Stat. Comput. 5 (1984) 300-304 (weighted harmonic mean of the neighbouring slopes), one-sided at
 * the ends.
 */
public final class MonotoneCubic {
    private final double[] x;
    private final double[] y;
    private final double[] tangent;

    private MonotoneCubic(double[] x, double[] y) {
        this.x = x;
        this.y = y;
        this.tangent = tangents(x, y);
    }

    /**
     * The curve through the points.
     *
     * @param x abscissas, finite and strictly rising; at least one
     * @param y ordinates, finite, as many
     */
    public static MonotoneCubic through(double[] x, double[] y) {
        if (x.length == 0 || x.length != y.length) {
            throw new IllegalArgumentException("a curve needs as many ordinates as abscissas, and at least one; had "
                    + y.length + " and " + x.length);
        }
        for (int k = 0; k < x.length; k++) {
            Require.finite("x", x[k], "");
            Require.finite("y", y[k], "");
            if (k > 0 && !(x[k] > x[k - 1])) {
                throw new IllegalArgumentException("abscissas must rise, but " + x[k] + " follows " + x[k - 1]);
            }
        }
        return new MonotoneCubic(x.clone(), y.clone());
    }

    /** How many points there are. */
    public int size() {
        return x.length;
    }

    /** The first abscissa. */
    public double first() {
        return x[0];
    }

    /** The last abscissa. */
    public double last() {
        return x[x.length - 1];
    }

    /** The ordinate at {@code at}; beyond the points that of the nearest. */
    public double at(double at) {
        int last = x.length - 1;
        if (at <= x[0]) {
            return y[0];
        }
        if (at >= x[last]) {
            return y[last];
        }
        int k = 0;
        int above = last;
        while (above - k > 1) {
            int middle = (k + above) >>> 1;
            if (at < x[middle]) {
                above = middle;
            } else {
                k = middle;
            }
        }
        double h = x[k + 1] - x[k];
        double t = (at - x[k]) / h;
        // cubic Hermite basis
        double h00 = (1.0 + 2.0 * t) * (1.0 - t) * (1.0 - t);
        double h10 = t * (1.0 - t) * (1.0 - t);
        double h01 = t * t * (3.0 - 2.0 * t);
        double h11 = t * t * (t - 1.0);
        return h00 * y[k] + h10 * h * tangent[k] + h01 * y[k + 1] + h11 * h * tangent[k + 1];
    }

    /** The slope of the straight line between points k and k + 1. */
    public double segmentSlope(int k) {
        return (y[k + 1] - y[k]) / (x[k + 1] - x[k]);
    }

    /** The curve moved up by {@code shift}. */
    public MonotoneCubic plus(double shift) {
        double[] moved = y.clone();
        for (int k = 0; k < moved.length; k++) {
            moved[k] += shift;
        }
        return new MonotoneCubic(x, moved);
    }

    private static double[] tangents(double[] x, double[] y) {
        int n = x.length;
        double[] tangents = new double[n];
        if (n < 2) {
            return tangents;
        }
        double[] secant = new double[n - 1];
        for (int k = 0; k < n - 1; k++) {
            secant[k] = (y[k + 1] - y[k]) / (x[k + 1] - x[k]);
        }
        tangents[0] = secant[0];
        tangents[n - 1] = secant[n - 2];
        for (int k = 1; k < n - 1; k++) {
            if (secant[k - 1] * secant[k] > 0.0) {
                double left = x[k] - x[k - 1];
                double right = x[k + 1] - x[k];
                double w1 = 2.0 * right + left;
                double w2 = right + 2.0 * left;
                tangents[k] = (w1 + w2) / (w1 / secant[k - 1] + w2 / secant[k]);
            }
        }
        return tangents;
    }
}
