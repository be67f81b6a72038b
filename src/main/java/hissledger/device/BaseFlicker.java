package hissledger.device;

import hissledger.physics.Require;

/**
 * Flicker noise of the base current, {@code S = 2 q IBref (fb/f) (IB/IBref)^a}, IBref being the base current at
 * {@code collectorCurrentAmps}.
 *
 * @param cornerHertz fb, where flicker and shot noise of the base current are equal, Hz; ≥ 0
 * @param collectorCurrentAmps the collector current at which fb holds, A; &gt; 0
 * @param exponent a, dimensionless; &gt; 0, 1 unless stated
 */
public record BaseFlicker(double cornerHertz, double collectorCurrentAmps, double exponent) {
    public BaseFlicker {
        Require.notNegative("cornerHertz", cornerHertz, "Hz");
        Require.positive("collectorCurrentAmps", collectorCurrentAmps, "A");
        Require.positive("exponent", exponent, "");
    }
}
