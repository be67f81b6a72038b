package hissledger.device;

import static hissledger.Trials.forAll;
import static hissledger.Trials.logUniform;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import hissledger.physics.Constants;
import hissledger.physics.ShotNoise;
import hissledger.physics.Thermal;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Frequencies;
import hissledger.twoport.Impedance;
import hissledger.twoport.SmallSignal;
import java.util.Optional;
import java.util.OptionalDouble;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What bias current does to a device: admittances and generators. */
class BiasedDeviceTest {
    /** A dozen roundings. */
    private static final Percentage ROUNDED = Percentage.withPercentage(100.0 * 1e-13);
    /** A pinch-off of order one, less its rounding. */
    private static final double ROUNDING = 1e-14;

    private static final double ROOM_KELVIN = 300.0;
    private static final double ROOM_VOLTS =
            Constants.BOLTZMANN_JOULES_PER_KELVIN * ROOM_KELVIN / Constants.ELEMENTARY_CHARGE_COULOMBS;

    // ------------------------------------------------------------------------------------------------------ bipolar

    private static BipolarModel bipolar(double transitionHertz, double cmu, double cje) {
        return new BipolarModel(GainCurve.flat(250.0), 30.0, 0.4, 100.0, transitionHertz, cmu, cje, Optional.empty());
    }

    @Test
    void aBipolarTransistorHasTheAdmittancesOfItsCurrent() {
        SmallSignal small = bipolar(1e8, 3e-12, 8e-12).smallSignal(1e-3, ROOM_KELVIN);
        double gm = 1e-3 / ROOM_VOLTS;
        assertThat(small.transconductanceSiemens()).isCloseTo(gm, ROUNDED);
        assertThat(small.inputSiemens()).isCloseTo(gm / 250.0, ROUNDED);
        assertThat(small.outputSiemens()).isCloseTo(1e-3 / 100.0, ROUNDED);
        assertThat(small.inputFarads()).isCloseTo(gm / (2.0 * Math.PI * 1e8) - 3e-12, ROUNDED);
        assertThat(small.feedbackFarads()).isEqualTo(3e-12);
        assertThat(small.shieldedFarads()).isZero();
    }

    @Test
    void atSmallCurrentsTheEmitterJunctionRemains() {
        // 1 µA: gm/(2π fT) is 0.06 pF, less than Cµ
        assertThat(bipolar(1e8, 3e-12, 8e-12).smallSignal(1e-6, ROOM_KELVIN).inputFarads())
                .isEqualTo(8e-12);
        assertThat(bipolar(Double.POSITIVE_INFINITY, 3e-12, 0.0)
                        .smallSignal(1e-3, ROOM_KELVIN)
                        .inputFarads())
                .isZero();
    }

    @Test
    void aBipolarTransistorMakesShotAndFlickerNoiseOfItsCurrents() {
        double fb = 2_000.0;
        double exponent = 1.4;
        BipolarModel model = new BipolarModel(
                GainCurve.through(new double[] {1e-4, 1e-2}, new double[] {100.0, 400.0}),
                30.0,
                0.4,
                100.0,
                1e8,
                3e-12,
                8e-12,
                Optional.of(new BaseFlicker(fb, 1e-2, exponent)));
        BiasedBipolar device = new BiasedBipolar(model, 1e-4, ROOM_KELVIN);
        assertThat(device.inputCurrentAmps()).isCloseTo(1e-6, ROUNDED);
        assertThat(device.inputResistanceOhms()).isEqualTo(30.0);
        assertThat(device.leadResistanceOhms()).isEqualTo(0.4);
        assertThat(device.lawVolts()).isCloseTo(ROOM_VOLTS, ROUNDED);
        ChainPass pass = atTheTerminals(device, 3, 500.0);
        double[] currents = shortCircuitCurrents(pass);
        assertThat(pass.generators().stream().map(generator -> generator.name()))
                .containsExactly("base shot", "base flicker", "collector shot");
        assertThat(currents[0]).isCloseTo(3.0 * ShotNoise.ampsSquaredPerHertz(1e-6), ROUNDED);
        // IBref is 10 mA/400 = 25 µA, IB a twenty-fifth of it
        double flicker = ShotNoise.ampsSquaredPerHertz(25e-6) * fb / 500.0 * Math.pow(1.0 / 25.0, exponent);
        assertThat(currents[1]).isCloseTo(3.0 * flicker, ROUNDED);
    }

    @Test
    void atTheStatedCurrentFlickerAndShotNoiseMeetAtTheCorner() {
        forAll(100, random -> {
            double amps = logUniform(random, 1e-5, 1e-2);
            double corner = logUniform(random, 1.0, 1e4);
            BipolarModel model = new BipolarModel(
                    GainCurve.flat(200.0),
                    0.0,
                    0.0,
                    100.0,
                    1e8,
                    0.0,
                    0.0,
                    Optional.of(new BaseFlicker(corner, amps, random.nextDouble(0.5, 2.0))));
            double[] currents =
                    shortCircuitCurrents(atTheTerminals(new BiasedBipolar(model, amps, ROOM_KELVIN), 1, corner));
            assertThat(currents[1]).isCloseTo(currents[0], ROUNDED);
        });
    }

    /** The generators entered at one frequency with the row (0, 1): currents into the input terminal count as they are. */
    private static ChainPass atTheTerminals(Transistor device, int devices, double hertz) {
        ChainPass pass = new ChainPass(Frequencies.of(hertz));
        pass.beginWith(0.0, 1.0, 0.0);
        pass.device(device.smallSignal().parallel(devices));
        pass.commonLead(Impedance.none());
        device.enterGenerators(pass, devices);
        return pass;
    }

    private static double[] shortCircuitCurrents(ChainPass pass) {
        double[] currents = new double[pass.generatorCount()];
        for (int g = 0; g < currents.length; g++) {
            currents[g] = pass.power(g)[0];
        }
        return currents;
    }

    @Test
    void changedTransistorsKeepTheRest() {
        BipolarModel model = bipolar(1e8, 3e-12, 8e-12);
        BipolarModel other = model.withBaseResistance(77.0).withCurrentGain(GainCurve.flat(90.0));
        assertThat(other.baseResistanceOhms()).isEqualTo(77.0);
        assertThat(other.currentGain().at(1e-3)).isCloseTo(90.0, ROUNDED);
        assertThat(other.emitterResistanceOhms()).isEqualTo(model.emitterResistanceOhms());
        assertThat(other.earlyVolts()).isEqualTo(model.earlyVolts());
        assertThat(other.transitionHertz()).isEqualTo(model.transitionHertz());
        assertThat(other.collectorBaseFarads()).isEqualTo(model.collectorBaseFarads());
        assertThat(other.emitterBaseFarads()).isEqualTo(model.emitterBaseFarads());
    }

    // --------------------------------------------------------------------------------------------------------- JFET

    @Test
    void theSquareLawHasItsThreeForms() {
        // gm = (2/|Vp|) √(IDSS ID) = 2 ID/(|Vp| − |VGS|) = (2 IDSS/|Vp|)(1 − |VGS|/|Vp|)
        forAll(500, random -> {
            double saturation = logUniform(random, 1e-4, 0.1);
            double pinchOff = logUniform(random, 0.2, 10.0);
            // above the currents at which the barrier's own law takes over
            double amps = saturation * random.nextDouble(0.2, 1.0);
            SquareLaw law = SquareLaw.of(saturation, pinchOff);
            double gm = law.transconductanceSiemens(amps, ROOM_VOLTS);
            double vgs = law.gateSourceVolts(amps);
            assertThat(gm).isCloseTo(2.0 * amps / (pinchOff - vgs), ROUNDED);
            assertThat(gm).isCloseTo(2.0 * saturation / pinchOff * (1.0 - vgs / pinchOff), ROUNDED);
            assertThat(amps).isCloseTo(saturation * Math.pow(1.0 - vgs / pinchOff, 2.0), ROUNDED);
        });
        assertThat(SquareLaw.of(5e-3, 1.0).gateSourceVolts(5e-3)).isCloseTo(0.0, within(ROUNDING));
    }

    @Test
    void aPublishedTransconductanceScalesWithTheRootOfTheCurrent() {
        SquareLaw law = new SquareLaw(10e-3, 1.0, OptionalDouble.of(15e-3), 4e-3);
        assertThat(law.transconductanceSiemens(4e-3, ROOM_VOLTS)).isCloseTo(15e-3, ROUNDED);
        assertThat(law.transconductanceSiemens(1e-3, ROOM_VOLTS)).isCloseTo(7.5e-3, ROUNDED);
    }

    @Test
    void atVeryLowCurrentTheBarrierLimitsTheTransconductance() {
        // the square law passes ID/VT where ID = IDSS (2VT/Vp)²
        SquareLaw law = SquareLaw.of(10e-3, 1.0);
        double crossing = 10e-3 * 4.0 * ROOM_VOLTS * ROOM_VOLTS;
        assertThat(law.transconductanceSiemens(crossing / 100.0, ROOM_VOLTS))
                .isCloseTo(crossing / 100.0 / ROOM_VOLTS, ROUNDED);
        assertThat(law.transconductanceSiemens(crossing * 4.0, ROOM_VOLTS))
                .isCloseTo(2.0 * Math.sqrt(10e-3 * crossing * 4.0), ROUNDED);
    }

    /** Leakage re its value at 25 °C, after the doubling steps between the two temperatures. */
    @ParameterizedTest
    @CsvSource({"298.15, 1", "308.15, 2", "318.15, 4", "288.15, 0.5", "303.15, 1.4142135623730951"})
    void leakageDoublesWithEveryStep(double kelvin, double ratio) {
        assertThat(new GateLeakage(3e-12, 298.15, GateLeakage.USUAL_DOUBLING_KELVIN).at(kelvin))
                .isCloseTo(3e-12 * ratio, ROUNDED);
    }

    @Test
    void noLeakageIsNoneAtAnyTemperature() {
        assertThat(GateLeakage.none().at(400.0)).isZero();
    }

    @Test
    void aJfetHasTheAdmittancesAndGeneratorsOfItsCurrent() {
        JfetModel model = new JfetModel(
                SquareLaw.of(10e-3, 2.0),
                0.8,
                0.03,
                new GateLeakage(5e-12, ROOM_KELVIN, 10.0),
                20e-12,
                4e-12,
                Optional.of(new ChannelFlicker(5e-9, 10.0, 1.0)),
                Optional.of(new InducedGateNoise(1.2, 0.4)));
        BiasedJfet device = new BiasedJfet(model, 2.5e-3, ROOM_KELVIN);
        double gm = 5e-3;
        SmallSignal small = device.smallSignal();
        assertThat(small.transconductanceSiemens()).isCloseTo(gm, ROUNDED);
        assertThat(small.inputSiemens()).isZero();
        assertThat(small.outputSiemens()).isCloseTo(0.03 * 2.5e-3, ROUNDED);
        assertThat(small.inputFarads()).isEqualTo(20e-12);
        assertThat(small.feedbackFarads()).isEqualTo(4e-12);
        assertThat(device.lawVolts()).isCloseTo(1.0, ROUNDED);
        assertThat(device.inputCurrentAmps()).isEqualTo(5e-12);
        assertThat(device.inputResistanceOhms()).isZero();
        assertThat(device.leadResistanceOhms()).isZero();

        double hertz = 1e5;
        ChainPass pass = atTheTerminals(device, 2, hertz);
        assertThat(pass.generators().stream().map(generator -> generator.name()))
                .containsExactly("channel", "induced gate", "channel flicker", "gate leakage");
        double omegaC = 2.0 * Math.PI * hertz * 20e-12;
        double induced = 2.0 * Thermal.fourKt(ROOM_KELVIN) * 1.2 * omegaC * omegaC / gm;
        assertThat(pass.power(1)[0]).isCloseTo((1.0 - 0.4 * 0.4) * induced, ROUNDED);
        assertThat(pass.power(3)[0]).isCloseTo(2.0 * ShotNoise.ampsSquaredPerHertz(5e-12), ROUNDED);
    }

    @Test
    void correlatedAndUncorrelatedInducedNoiseAddUpToAllOfIt() {
        // with the drain shorted the gate sees both parts, whatever c; Cgd = 0, so the channel adds -y11/y21 of its own
        double hertz = 1e5;
        for (double c : new double[] {-1.0, -0.4, 0.0, 0.4, 1.0}) {
            JfetModel model =
                    JfetModel.ideal(10e-3, 2.0).withCapacitances(20e-12, 0.0).withInduced(new InducedGateNoise(1.2, c));
            ChainPass pass = atTheTerminals(new BiasedJfet(model, 2.5e-3, ROOM_KELVIN), 1, hertz);
            double omegaC = 2.0 * Math.PI * hertz * 20e-12;
            double gm = 5e-3;
            double fourKt = Thermal.fourKt(ROOM_KELVIN);
            double gamma = 2.0 / 3.0;
            // i = j1 − (jωC/gm) j2 with j1 = jωC (c/gm) √(δ/γ) j2
            double channel = fourKt * gamma * gm * Math.pow(omegaC / gm * (c * Math.sqrt(1.2 / gamma) - 1.0), 2.0);
            assertThat(pass.power(0)[0]).isCloseTo(channel, ROUNDED);
            assertThat(pass.power(1)[0]).isCloseTo(fourKt * 1.2 * (1.0 - c * c) * omegaC * omegaC / gm, ROUNDED);
        }
    }

    @Test
    void changedJfetsKeepTheRest() {
        JfetModel model = JfetModel.ideal(10e-3, 2.0)
                .withCapacitances(20e-12, 4e-12)
                .withLeakage(new GateLeakage(1e-12, 298.15, 10.0))
                .withFlicker(new ChannelFlicker(5e-9, 10.0, 1.0))
                .withInduced(new InducedGateNoise(1.2, 0.4));
        assertThat(model)
                .isEqualTo(new JfetModel(
                        SquareLaw.of(10e-3, 2.0),
                        JfetModel.LONG_CHANNEL_NOISE_FACTOR,
                        0.0,
                        new GateLeakage(1e-12, 298.15, 10.0),
                        20e-12,
                        4e-12,
                        Optional.of(new ChannelFlicker(5e-9, 10.0, 1.0)),
                        Optional.of(new InducedGateNoise(1.2, 0.4))));
    }

    @Test
    void aJfetCarriesNoMoreThanItsSaturationCurrent() {
        JfetModel model = JfetModel.ideal(10e-3, 2.0);
        assertThat(new BiasedJfet(model, 10e-3, ROOM_KELVIN).currentAmps()).isEqualTo(10e-3);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new BiasedJfet(model, 10.1e-3, ROOM_KELVIN))
                .withMessage("currentAmps must not exceed IDSS, 0.01 A, was 0.0101");
    }

    // -------------------------------------------------------------------------------------------------------- edges

    @Test
    void refusesWhatIsNoDevice() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new BiasedBipolar(BipolarModel.ideal(100.0, 10.0), 0.0, ROOM_KELVIN))
                .withMessage("currentAmps must be finite and > 0 A, was 0.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new BiasedBipolar(BipolarModel.ideal(100.0, 10.0), 1e-3, Double.NaN))
                .withMessage("temperatureKelvin must be finite and > 0 K, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> BipolarModel.ideal(100.0, -10.0))
                .withMessage("baseResistanceOhms must be finite and >= 0 Ω, was -10.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() ->
                        new BipolarModel(GainCurve.flat(100.0), 0.0, 0.0, Double.NaN, 1e8, 0.0, 0.0, Optional.empty()))
                .withMessage("earlyVolts must be > 0 V, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(
                        () -> new BipolarModel(GainCurve.flat(100.0), 0.0, 0.0, 100.0, 0.0, 0.0, 0.0, Optional.empty()))
                .withMessage("transitionHertz must be > 0 Hz, was 0.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new InducedGateNoise(1.0, 1.1))
                .withMessage("correlation must lie between -1 and 1, was 1.1");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new GateLeakage(1e-12, 298.15, 0.0))
                .withMessage("doublingKelvin must be finite and > 0 K, was 0.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new AmplifierModel(1e-9, 0.0, 1e-12, 0.0, Double.NaN, 0.0))
                .withMessage("inputOhms must be > 0 Ω, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> SquareLaw.of(0.0, 1.0))
                .withMessage("saturationAmps must be finite and > 0 A, was 0.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new BaseFlicker(1.0, 1e-3, 0.0))
                .withMessage("exponent must be finite and > 0, was 0.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new ChannelFlicker(1e-9, 0.0, 1.0))
                .withMessage("hertz must be finite and > 0 Hz, was 0.0");
    }
}
