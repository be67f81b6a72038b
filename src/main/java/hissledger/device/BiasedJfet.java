package hissledger.device;

import hissledger.physics.Require;
import hissledger.physics.ShotNoise;
import hissledger.physics.Thermal;
import hissledger.twoport.ChainPass;
import hissledger.twoport.SmallSignal;
import hissledger.twoport.Spectrum;

/**
 * A JFET at one quiescent point.
 *
 * <p>Generators between its terminals: channel noise {@code 4kTγgm} drawn into the drain; channel flicker, the gate-referred
 * density times gm², drawn into the drain; gate leakage shot {@code 2q IG} drawn into the gate; induced gate noise, of which
 * the part correlated with the channel rides on the channel's generator and the rest, {@code (1 − c²)}, is a generator of
 * its own drawn into the gate.
 *
 * <p>Sources: A. van der Ziel, Proc. IRE 50 (1962) 1808 and Proc. IEEE 51 (1963) 461.
 *
 * @param model the JFET
 * @param currentAmps drain current ID, A; &gt; 0, not above IDSS
 * @param temperatureKelvin channel temperature, K; &gt; 0
 */
public record BiasedJfet(JfetModel model, double currentAmps, double temperatureKelvin) implements Transistor {
    private static final NoiseSource CHANNEL = NoiseSource.of(NoiseKind.CHANNEL);
    private static final NoiseSource CHANNEL_FLICKER = NoiseSource.of(NoiseKind.CHANNEL_FLICKER);
    private static final NoiseSource GATE_LEAKAGE = NoiseSource.of(NoiseKind.GATE_LEAKAGE);
    private static final NoiseSource INDUCED_GATE = NoiseSource.of(NoiseKind.INDUCED_GATE);
    /** Rounding of an IDSS that was computed rather than read. */
    private static final double SATURATION_ROUNDING = 1.0 + 1e-12;
    /** The induced spectrum is stated at this frequency and grows as f². */
    private static final double REFERENCE_HERTZ = 1.0;

    private static final double AS_FREQUENCY_SQUARED = -2.0;

    public BiasedJfet {
        Require.positive("currentAmps", currentAmps, "A");
        Require.positive("temperatureKelvin", temperatureKelvin, "K");
        if (currentAmps > model.law().saturationAmps() * SATURATION_ROUNDING) {
            throw new IllegalArgumentException(
                    "currentAmps must not exceed IDSS, " + model.law().saturationAmps() + " A, was " + currentAmps);
        }
    }

    @Override
    public SmallSignal smallSignal() {
        return model.smallSignal(currentAmps, temperatureKelvin);
    }

    @Override
    public double inputResistanceOhms() {
        return 0.0;
    }

    @Override
    public double leadResistanceOhms() {
        return 0.0;
    }

    @Override
    public double inputCurrentAmps() {
        return model.leakage().at(temperatureKelvin);
    }

    /** Overdrive {@code |VGS − VGS(off)| = 2 ID/gm} of the square law, V. */
    @Override
    public double lawVolts() {
        return 2.0 * currentAmps / smallSignal().transconductanceSiemens();
    }

    @Override
    public void enterGenerators(ChainPass pass, int devices) {
        double gm = smallSignal().transconductanceSiemens();
        double fourKt = Thermal.fourKt(temperatureKelvin);
        double channel = fourKt * model.channelNoiseFactor() * gm;
        if (model.induced().isPresent()) {
            InducedGateNoise induced = model.induced().get();
            double gateSeconds = model.gateSourceFarads() / gm;
            // j1/j2 = jc √(S_induced/S_channel) = jω c (Cgs/gm) √(δ/γ)
            double inducedSeconds =
                    induced.correlation() * gateSeconds * Math.sqrt(induced.delta() / model.channelNoiseFactor());
            pass.correlatedCurrents(CHANNEL, Spectrum.white(devices * channel), inducedSeconds);
            double omegaC = 2.0 * Math.PI * REFERENCE_HERTZ * model.gateSourceFarads();
            double rest = fourKt
                    * induced.delta()
                    * (1.0 - induced.correlation() * induced.correlation())
                    * omegaC
                    * omegaC
                    / gm;
            pass.inputCurrent(INDUCED_GATE, Spectrum.powerLaw(devices * rest, REFERENCE_HERTZ, AS_FREQUENCY_SQUARED));
        } else {
            pass.outputCurrent(CHANNEL, Spectrum.white(devices * channel));
        }
        if (model.flicker().isPresent()) {
            ChannelFlicker flicker = model.flicker().get();
            double drainReferred = gm * flicker.voltsPerRootHertz();
            pass.outputCurrent(
                    CHANNEL_FLICKER,
                    Spectrum.powerLaw(devices * drainReferred * drainReferred, flicker.hertz(), flicker.exponent()));
        }
        pass.inputCurrent(GATE_LEAKAGE, Spectrum.white(devices * ShotNoise.ampsSquaredPerHertz(inputCurrentAmps())));
    }
}
