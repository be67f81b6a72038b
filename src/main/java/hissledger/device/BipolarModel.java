package hissledger.device;

import hissledger.physics.Require;
import hissledger.physics.Thermal;
import hissledger.twoport.SmallSignal;
import java.util.Optional;

/**
 * The numbers of one bipolar transistor, resolved for a calculation.
 *
 * @param currentGain hFE against collector current
 * @param baseResistanceOhms base spreading resistance rbb', Ω; ≥ 0
 * @param emitterResistanceOhms bulk emitter resistance, Ω; ≥ 0
 * @param earlyVolts Early voltage VA, V; &gt; 0, infinite for none
 * @param transitionHertz transition frequency fT, Hz; &gt; 0, infinite for none
 * @param collectorBaseFarads C_µ, F; ≥ 0
 * @param emitterBaseFarads emitter junction capacitance, F; ≥ 0
 * @param flicker flicker noise of the base current; empty for none
 */
public record BipolarModel(
        GainCurve currentGain,
        double baseResistanceOhms,
        double emitterResistanceOhms,
        double earlyVolts,
        double transitionHertz,
        double collectorBaseFarads,
        double emitterBaseFarads,
        Optional<BaseFlicker> flicker) {
    public BipolarModel {
        Require.notNegative("baseResistanceOhms", baseResistanceOhms, "Ω");
        Require.notNegative("emitterResistanceOhms", emitterResistanceOhms, "Ω");
        if (!(earlyVolts > 0.0)) {
            throw new IllegalArgumentException("earlyVolts must be > 0 V, was " + earlyVolts);
        }
        if (!(transitionHertz > 0.0)) {
            throw new IllegalArgumentException("transitionHertz must be > 0 Hz, was " + transitionHertz);
        }
        Require.notNegative("collectorBaseFarads", collectorBaseFarads, "F");
        Require.notNegative("emitterBaseFarads", emitterBaseFarads, "F");
    }

    /** A transistor with rbb' and a flat gain alone: no capacitances, no Early effect, no flicker, no bulk emitter. */
    public static BipolarModel ideal(double currentGain, double baseResistanceOhms) {
        return new BipolarModel(
                GainCurve.flat(currentGain),
                baseResistanceOhms,
                0.0,
                Double.POSITIVE_INFINITY,
                Double.POSITIVE_INFINITY,
                0.0,
                0.0,
                Optional.empty());
    }

    /** This transistor with another rbb', Ω. */
    public BipolarModel withBaseResistance(double ohms) {
        return new BipolarModel(
                currentGain,
                ohms,
                emitterResistanceOhms,
                earlyVolts,
                transitionHertz,
                collectorBaseFarads,
                emitterBaseFarads,
                flicker);
    }

    /** This transistor with another gain curve. */
    public BipolarModel withCurrentGain(GainCurve curve) {
        return new BipolarModel(
                curve,
                baseResistanceOhms,
                emitterResistanceOhms,
                earlyVolts,
                transitionHertz,
                collectorBaseFarads,
                emitterBaseFarads,
                flicker);
    }

    /**
     * Admittances at a quiescent point: {@code gm = IC/VT}, {@code y11 = gm/hFE + jω(Cπ + Cµ)}, {@code y12 = −jωCµ},
     * {@code y21 = gm − jωCµ}, {@code y22 = IC/VA + jωCµ}, with {@code Cπ = gm/(2π fT) − Cµ}, not less than the emitter
     * junction capacitance.
     *
     * @param collectorAmps IC, A; &gt; 0
     * @param temperatureKelvin junction temperature, K; &gt; 0
     */
    public SmallSignal smallSignal(double collectorAmps, double temperatureKelvin) {
        double gm = Require.positive("collectorAmps", collectorAmps, "A") / Thermal.voltageVolts(temperatureKelvin);
        double diffusionFarads = gm / (2.0 * Math.PI * transitionHertz) - collectorBaseFarads;
        return SmallSignal.of(
                gm / currentGain.at(collectorAmps),
                gm,
                collectorAmps / earlyVolts,
                Math.max(diffusionFarads, emitterBaseFarads),
                collectorBaseFarads);
    }
}
