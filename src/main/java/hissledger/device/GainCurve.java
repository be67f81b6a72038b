package hissledger.device;

import hissledger.physics.MonotoneCubic;
import hissledger.physics.Require;

/**
 * Current gain hFE as a function of collector current, through given points.
 *
 * <p>Between points ln hFE is a monotone cubic in ln IC ({@link MonotoneCubic}): no overshoot between two published values,
 * and smooth enough for a minimum search. Outside the points the slope of the nearest segment continues for one decade;
 * beyond that decade the value is held. One point makes a flat curve.
 */
public final class GainCurve {
    private static final double DECADE = Math.log(10.0);

    private final MonotoneCubic lnGain;

    private GainCurve(MonotoneCubic lnGain) {
        this.lnGain = lnGain;
    }

    /**
     * The curve through the points.
     *
     * @param currentAmps collector currents, A; &gt; 0 and strictly rising
     * @param gain current gains at them, dimensionless; &gt; 0
     */
    public static GainCurve through(double[] currentAmps, double[] gain) {
        for (int k = 1; k < currentAmps.length; k++) {
            if (!(currentAmps[k] > currentAmps[k - 1])) {
                throw new IllegalArgumentException("the currents of a gain curve must rise, but " + currentAmps[k]
                        + " A follows " + currentAmps[k - 1] + " A");
            }
        }
        if (currentAmps.length == 0 || currentAmps.length != gain.length) {
            throw new IllegalArgumentException("a gain curve needs as many gains as currents, and at least one; had "
                    + gain.length + " and " + currentAmps.length);
        }
        double[] x = new double[currentAmps.length];
        double[] y = new double[gain.length];
        for (int k = 0; k < x.length; k++) {
            x[k] = Math.log(Require.positive("currentAmps", currentAmps[k], "A"));
        }
        for (int k = 0; k < y.length; k++) {
            y[k] = Math.log(Require.positive("gain", gain[k], ""));
        }
        return new GainCurve(MonotoneCubic.through(x, y));
    }

    /** The same gain at every current. */
    public static GainCurve flat(double gain) {
        return through(new double[] {1e-3}, new double[] {gain});
    }

    /** hFE at a collector current, A; &gt; 0. */
    public double at(double currentAmps) {
        double x = Math.log(currentAmps);
        double y = lnGain.at(x);
        int points = lnGain.size();
        if (points > 1 && x < lnGain.first()) {
            y += Math.max(x - lnGain.first(), -DECADE) * lnGain.segmentSlope(0);
        } else if (points > 1 && x > lnGain.last()) {
            y += Math.min(x - lnGain.last(), DECADE) * lnGain.segmentSlope(points - 2);
        }
        return Math.exp(y);
    }

    /** Whether a current lies outside the points, so that the value there is continued and not published. */
    public boolean isContinuedAt(double currentAmps) {
        double x = Math.log(currentAmps);
        return lnGain.size() > 1 && (x < lnGain.first() || x > lnGain.last());
    }

    /** The same curve with every gain multiplied by {@code factor}; &gt; 0. */
    public GainCurve scaled(double factor) {
        return new GainCurve(lnGain.plus(Math.log(Require.positive("factor", factor, ""))));
    }
}
