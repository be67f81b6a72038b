package hissledger.device;

import hissledger.physics.Require;

/**
 * Gate leakage current, doubling with every step of temperature.
 *
 * @param amps magnitude of IG at {@code temperatureKelvin}, A; ≥ 0
 * @param temperatureKelvin the temperature at which it holds, K; &gt; 0
 * @param doublingKelvin the rise of temperature that doubles it, K; &gt; 0
 */
public record GateLeakage(double amps, double temperatureKelvin, double doublingKelvin) {
    /** The step used where a sheet states none: published pairs lie between 8 and 13 K. */
    public static final double USUAL_DOUBLING_KELVIN = 10.0;

    private static final double SHEET_KELVIN = 298.15;

    public GateLeakage {
        Require.notNegative("amps", amps, "A");
        Require.positive("temperatureKelvin", temperatureKelvin, "K");
        Require.positive("doublingKelvin", doublingKelvin, "K");
    }

    /** No leakage at any temperature. */
    public static GateLeakage none() {
        return new GateLeakage(0.0, SHEET_KELVIN, USUAL_DOUBLING_KELVIN);
    }

    /** {@code IG(T) = IG₀ 2^((T − T₀)/step)}, A. */
    public double at(double kelvin) {
        return amps * Math.pow(2.0, (kelvin - temperatureKelvin) / doublingKelvin);
    }
}
