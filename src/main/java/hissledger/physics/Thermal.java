package hissledger.physics;

/**
 * Thermal noise and the thermal voltage.
 *
 * <p>Sources: J. B. Johnson, <cite>Thermal agitation of electricity in conductors</cite>, Phys. Rev. 32 (1928) 97;
 * H. Nyquist, <cite>Thermal agitation of electric charge in conductors</cite>, Phys. Rev. 32 (1928) 110. The
 * low-frequency form (hf ≪ kT) holds from DC to far above 1 GHz at room temperature. All densities are one-sided.
 */
public final class Thermal {
    private Thermal() {}

    /**
     * Open-circuit voltage noise of a resistance, {@code S_v = 4 k T R}.
     *
     * @param resistanceOhms R, or the real part of an impedance, Ω; ≥ 0
     * @param temperatureKelvin T, K; &gt; 0
     * @return V²/Hz
     */
    public static double voltsSquaredPerHertz(double resistanceOhms, double temperatureKelvin) {
        Require.notNegative("resistanceOhms", resistanceOhms, "Ω");
        return fourKt(temperatureKelvin) * resistanceOhms;
    }

    /**
     * Short-circuit current noise of a conductance, {@code S_i = 4 k T G}.
     *
     * @param conductanceSiemens G, or the real part of an admittance, S; ≥ 0
     * @param temperatureKelvin T, K; &gt; 0
     * @return A²/Hz
     */
    public static double ampsSquaredPerHertz(double conductanceSiemens, double temperatureKelvin) {
        Require.notNegative("conductanceSiemens", conductanceSiemens, "S");
        return fourKt(temperatureKelvin) * conductanceSiemens;
    }

    /** {@code 4 k T} in J (that is, V²/Hz per Ω and A²/Hz per S), for T &gt; 0 K. */
    public static double fourKt(double temperatureKelvin) {
        Require.positive("temperatureKelvin", temperatureKelvin, "K");
        return 4.0 * Constants.BOLTZMANN_JOULES_PER_KELVIN * temperatureKelvin;
    }

    /**
     * Thermal voltage {@code V_T = k T / q}.
     *
     * @param temperatureKelvin T, K; &gt; 0
     * @return V; 25.85 mV at 300 K
     */
    public static double voltageVolts(double temperatureKelvin) {
        Require.positive("temperatureKelvin", temperatureKelvin, "K");
        return Constants.BOLTZMANN_JOULES_PER_KELVIN * temperatureKelvin / Constants.ELEMENTARY_CHARGE_COULOMBS;
    }
}
