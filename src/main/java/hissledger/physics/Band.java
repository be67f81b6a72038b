package hissledger.physics;

/**
 * A frequency band.
 *
 * @param fromHertz lower edge, Hz; &gt; 0
 * @param toHertz upper edge, Hz; above {@code fromHertz}
 */
public record Band(double fromHertz, double toHertz) {
    /** The audio band 20 Hz to 20 kHz. */
    public static final Band AUDIO = new Band(20.0, 20_000.0);

    public Band {
        Require.positive("fromHertz", fromHertz, "Hz");
        Require.positive("toHertz", toHertz, "Hz");
        if (!(toHertz > fromHertz)) {
            throw new IllegalArgumentException(
                    "toHertz must be above fromHertz, was " + toHertz + " Hz against " + fromHertz + " Hz");
        }
    }

    /** The width of the band, Hz. */
    public double widthHertz() {
        return toHertz - fromHertz;
    }

    /** Whether a frequency lies in the band, its edges included. */
    public boolean contains(double hertz) {
        return hertz >= fromHertz && hertz <= toHertz;
    }

    /**
     * Frequencies equally spaced in ln f, both edges included.
     *
     * @param count how many; at least 2
     * @return a new array, Hz, ascending
     */
    public double[] logarithmicHertz(int count) {
        Require.atLeast("count", count, 2);
        double[] hertz = new double[count];
        double step = Math.log(toHertz / fromHertz) / (count - 1);
        for (int k = 0; k < count; k++) {
            hertz[k] = fromHertz * Math.exp(step * k);
        }
        hertz[count - 1] = toHertz;
        return hertz;
    }
}
