package hissledger.device;

import hissledger.physics.Require;

/**
 * Flicker noise of a JFET's channel, referred to its gate: {@code S_v = e² (f₀/f)^α}, the flicker part alone.
 *
 * @param voltsPerRootHertz e at f₀, V/√Hz; ≥ 0
 * @param hertz f₀, Hz; &gt; 0
 * @param exponent α, dimensionless; &gt; 0, 1 unless stated
 */
public record ChannelFlicker(double voltsPerRootHertz, double hertz, double exponent) {
    public ChannelFlicker {
        Require.notNegative("voltsPerRootHertz", voltsPerRootHertz, "V/√Hz");
        Require.positive("hertz", hertz, "Hz");
        Require.positive("exponent", exponent, "");
    }
}
