package hissledger.device;

import hissledger.physics.Constants;
import hissledger.physics.Require;
import hissledger.physics.ShotNoise;
import hissledger.physics.Thermal;
import hissledger.twoport.ChainPass;
import hissledger.twoport.SmallSignal;
import hissledger.twoport.Spectrum;

/**
 * A bipolar transistor at one quiescent point.
 *
 * <p>Generators between its terminals: base shot {@code 2q IB} and base flicker {@code 2q IBref (fb/f)(IB/IBref)^a} drawn
 * into the base, collector shot {@code 2q IC} drawn into the collector. rπ and ro are not resistors and have no thermal
 * noise. rbb' and the bulk emitter resistance, both with thermal noise, are elements of the circuit around.
 *
 * <p>Source: A. van der Ziel, <cite>Noise in solid-state devices and lasers</cite>, Proc. IEEE 58 (1970) 1178; low-frequency
 * form of E. G. Nielsen, Proc. IRE 45 (1957) 957 (page from memory).
 *
 * @param model the transistor
 * @param currentAmps collector current IC, A; &gt; 0
 * @param temperatureKelvin junction temperature, K; &gt; 0
 */
public record BiasedBipolar(BipolarModel model, double currentAmps, double temperatureKelvin) implements Transistor {
    private static final NoiseSource BASE_SHOT = NoiseSource.of(NoiseKind.BASE_SHOT);
    private static final NoiseSource BASE_FLICKER = NoiseSource.of(NoiseKind.BASE_FLICKER);
    private static final NoiseSource COLLECTOR_SHOT = NoiseSource.of(NoiseKind.COLLECTOR_SHOT);

    public BiasedBipolar {
        Require.positive("currentAmps", currentAmps, "A");
        Require.positive("temperatureKelvin", temperatureKelvin, "K");
    }

    @Override
    public SmallSignal smallSignal() {
        return model.smallSignal(currentAmps, temperatureKelvin);
    }

    @Override
    public double inputResistanceOhms() {
        return model.baseResistanceOhms();
    }

    @Override
    public double leadResistanceOhms() {
        return model.emitterResistanceOhms();
    }

    @Override
    public double inputCurrentAmps() {
        return currentAmps / model.currentGain().at(currentAmps);
    }

    @Override
    public double lawVolts() {
        return Thermal.voltageVolts(temperatureKelvin);
    }

    @Override
    public void enterGenerators(ChainPass pass, int devices) {
        double baseAmps = inputCurrentAmps();
        pass.inputCurrent(BASE_SHOT, Spectrum.white(devices * ShotNoise.ampsSquaredPerHertz(baseAmps)));
        if (model.flicker().isPresent()) {
            BaseFlicker flicker = model.flicker().get();
            pass.inputCurrent(
                    BASE_FLICKER,
                    Spectrum.powerLaw(
                            devices * flickerAtCornerAmpsSquaredPerHertz(flicker, baseAmps),
                            Math.max(flicker.cornerHertz(), Double.MIN_NORMAL),
                            1.0));
        }
        pass.outputCurrent(COLLECTOR_SHOT, Spectrum.white(devices * ShotNoise.ampsSquaredPerHertz(currentAmps)));
    }

    /** {@code 2q IBref (IB/IBref)^a}: the flicker density at f = fb, A²/Hz. */
    private double flickerAtCornerAmpsSquaredPerHertz(BaseFlicker flicker, double baseAmps) {
        double reference = flicker.collectorCurrentAmps() / model.currentGain().at(flicker.collectorCurrentAmps());
        return 2.0
                * Constants.ELEMENTARY_CHARGE_COULOMBS
                * reference
                * Math.pow(baseAmps / reference, flicker.exponent());
    }
}
