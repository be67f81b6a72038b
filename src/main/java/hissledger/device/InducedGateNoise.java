package hissledger.device;

import hissledger.physics.Require;

/**
 * Induced gate noise, {@code S_i = 4kT δ (ω Cgs)²/gm}, with the correlation j c to the channel's noise current.
 *
 * <p>Source: A. van der Ziel, <cite>Gate noise in field effect transistors at moderately high frequencies</cite>, Proc. IEEE
 * 51 (1963) 461.
 *
 * @param delta δ, dimensionless; ≥ 0; 4/3 for a long channel
 * @param correlation c, dimensionless; −1 to 1; 0.395 for a long channel
 */
public record InducedGateNoise(double delta, double correlation) {
    public InducedGateNoise {
        Require.notNegative("delta", delta, "");
        if (!(Math.abs(correlation) <= 1.0)) {
            throw new IllegalArgumentException("correlation must lie between -1 and 1, was " + correlation);
        }
    }
}
