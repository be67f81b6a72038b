package hissledger.twoport;

import hissledger.physics.Require;

/**
 * A set of frequencies with what every element needs of them, laid out for loops.
 *
 * <p>The arrays are shared, not copied: they are read in the innermost loops and belong to whoever made the set.
 */
public final class Frequencies {
    private final double[] hertz;
    private final double[] omega;
    private final double[] inverseOmega;

    private Frequencies(double[] hertz) {
        this.hertz = hertz;
        this.omega = new double[hertz.length];
        this.inverseOmega = new double[hertz.length];
        for (int k = 0; k < hertz.length; k++) {
            omega[k] = 2.0 * Math.PI * Require.positive("hertz", hertz[k], "Hz");
            inverseOmega[k] = 1.0 / omega[k];
        }
    }

    /** The set of the given frequencies, Hz, each finite and &gt; 0, in any order. */
    public static Frequencies of(double... hertz) {
        return new Frequencies(hertz.clone());
    }

    /** How many there are. */
    public int count() {
        return hertz.length;
    }

    /** f, Hz. */
    public double[] hertz() {
        return hertz;
    }

    /** ω = 2πf, rad/s. */
    public double[] omega() {
        return omega;
    }

    /** 1/ω, s/rad. */
    public double[] inverseOmega() {
        return inverseOmega;
    }
}
