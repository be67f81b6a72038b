package hissledger.physics;

/** Equivalent noise bandwidths of filters, for checking a bench against a calculation. */
public final class NoiseBandwidth {
    private NoiseBandwidth() {}

    /**
     * Equivalent noise bandwidth of a Butterworth low-pass, {@code B = (π/2n) / sin(π/2n) · f_c}.
     *
     * <p>The width of the ideal rectangle that passes the same white-noise power.
     *
     * <p>Source: <cite>Analog and Digital Filter Design</cite>, appendix "Design Equations", p. 423, and its Table A.3.
     *
     * @param order the number of poles n; at least 1
     * @param cornerHertz the −3 dB frequency f_c, Hz; finite, &gt; 0
     * @return the equivalent noise bandwidth, Hz; never below {@code cornerHertz}
     * @throws IllegalArgumentException if an argument is outside its range
     */
    public static double butterworthHertz(int order, double cornerHertz) {
        Require.atLeast("order", order, 1);
        Require.positive("cornerHertz", cornerHertz, "Hz");
        double halfAngle = Math.PI / (2.0 * order);
        return cornerHertz * halfAngle / Math.sin(halfAngle);
    }
}
