package hissledger.circuit;

import hissledger.device.NoiseKind;
import hissledger.device.NoiseSource;
import hissledger.physics.Require;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Impedance;

/**
 * A transformer as a chain of its parts: primary resistance, primary inductance and core-loss resistance across it, the
 * ideal step-up, secondary resistance, leakage inductance, winding capacitance across the secondary.
 *
 * @param name the beginning of the names of its entries
 * @param ratio secondary over primary turns; &gt; 0
 * @param primaryOhms resistance of the primary, Ω; ≥ 0
 * @param secondaryOhms resistance of the secondary, Ω; ≥ 0
 * @param primaryHenries inductance of the primary, H; infinite for none
 * @param leakageHenries leakage inductance referred to the secondary, H; ≥ 0
 * @param coreLossOhms core-loss resistance across the primary, Ω; infinite for none
 * @param windingFarads winding capacitance across the secondary, F; ≥ 0
 * @param temperatureKelvin temperature, K; &gt; 0
 */
public record Transformer(
        String name,
        double ratio,
        double primaryOhms,
        double secondaryOhms,
        double primaryHenries,
        double leakageHenries,
        double coreLossOhms,
        double windingFarads,
        double temperatureKelvin)
        implements PathElement {
    public Transformer {
        Require.positive("ratio", ratio, "");
        Require.notNegative("primaryOhms", primaryOhms, "Ω");
        Require.notNegative("secondaryOhms", secondaryOhms, "Ω");
        if (!(primaryHenries > 0.0)) {
            throw new IllegalArgumentException("primaryHenries must be > 0 H, was " + primaryHenries);
        }
        Require.notNegative("leakageHenries", leakageHenries, "H");
        if (!(coreLossOhms > 0.0)) {
            throw new IllegalArgumentException("coreLossOhms must be > 0 Ω, was " + coreLossOhms);
        }
        Require.notNegative("windingFarads", windingFarads, "F");
        Require.positive("temperatureKelvin", temperatureKelvin, "K");
    }

    @Override
    public void walk(ChainPass pass) {
        pass.series(Impedance.resistance(primaryOhms), part("primary resistance"), temperatureKelvin);
        if (!Double.isInfinite(primaryHenries)) {
            pass.shunt(
                    Impedance.resistanceAndInductance(0.0, primaryHenries),
                    part("primary inductance"),
                    temperatureKelvin);
        }
        if (!Double.isInfinite(coreLossOhms)) {
            pass.shunt(Impedance.resistance(coreLossOhms), part("core loss"), temperatureKelvin);
        }
        pass.stepUp(ratio);
        pass.series(
                Impedance.resistanceAndInductance(secondaryOhms, leakageHenries),
                part("secondary resistance"),
                temperatureKelvin);
        if (windingFarads > 0.0) {
            pass.shunt(Impedance.capacitance(windingFarads, 0.0, 0.0), part("winding capacitance"), temperatureKelvin);
        }
    }

    private NoiseSource part(String part) {
        return new NoiseSource(name + ", " + part, NoiseKind.PATH_THERMAL);
    }
}
