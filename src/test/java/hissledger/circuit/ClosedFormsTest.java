package hissledger.circuit;

import static org.assertj.core.api.Assertions.assertThat;

import hissledger.device.BiasedBipolar;
import hissledger.device.BiasedJfet;
import hissledger.device.BipolarModel;
import hissledger.device.GateLeakage;
import hissledger.device.JfetModel;
import hissledger.physics.Band;
import hissledger.physics.Constants;
import hissledger.physics.Decibels;
import hissledger.physics.LogQuadrature;
import hissledger.physics.ShotNoise;
import hissledger.physics.Thermal;
import hissledger.physics.Weighting;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Frequencies;
import hissledger.twoport.Generator;
import hissledger.twoport.NoiseParameters;
import hissledger.twoport.Spectrum;
import hissledger.twoport.TwoPortNoise;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The engine against closed forms: the optima of a bipolar transistor at low frequency, a JFET's equivalent voltage, a
 * capsule with its bias resistor.
 *
 * <p>The numbers in the tables here were derived by us from the closed forms with another program, to ten significant
 * digits: they test the engine, not the physics.
 */
class ClosedFormsTest {
    /** A flat minimum is placed to the square root of the rounding over its curvature, some 1e-7. */
    private static final Percentage PLACED = Percentage.withPercentage(100.0 * 1e-6);
    /** Half a unit in the tenth significant digit, at worst. */
    private static final Percentage TEN_DIGITS = Percentage.withPercentage(100.0 * 5.1e-10);
    /** The tables print six significant digits here: half a unit in the sixth, at worst. */
    private static final Percentage SIX_DIGITS = Percentage.withPercentage(100.0 * 5.1e-6);
    /** The quadrature's promise, and ten significant digits. */
    private static final Percentage INTEGRATED = Percentage.withPercentage(100.0 * 1e-7);
    /** Two dozen roundings. */
    private static final Percentage ALGEBRA = Percentage.withPercentage(100.0 * 1e-12);

    /** Half a unit in the ninth digit of a number near 1.3. */
    private static final Percentage NINE_DIGITS = Percentage.withPercentage(100.0 * 4e-9);
    /** What is left of an imaginary part after two numbers of order one are subtracted. */
    private static final double CORRELATION_ROUNDING = 1e-14;

    private static final double ROOM_KELVIN = 300.0;
    private static final double CAPSULE_KELVIN = 293.15;

    // -------------------------------------------------------------------------------- bipolar, low frequency

    /** Best collector current and noise figure, dB: exact, then of the simpler textbook sum. */
    @ParameterizedTest
    @CsvSource({
        "150, 300, 30, 0.002483474159, 1.049639609, 0.002487609839, 1.035581323",
        "200, 500, 40, 0.002406212859, 0.9903087823, 0.00240861787, 0.9818172009",
        "1000, 200, 100, 0.0003315380856, 0.7315943972, 0.0003323658974, 0.7106481904",
        "10000, 400, 200, 5.062695147e-05, 0.3084804887, 5.069019566e-05, 0.2978947083",
        "50, 150, 10, 0.005259514766, 1.160448039, 0.005277017359, 1.132678634"
    })
    void theBestCurrentIsThatOfTheClosedForm(
            double sourceOhms,
            double gain,
            double baseOhms,
            double bestAmps,
            double bestDecibels,
            double simpleAmps,
            double simpleDecibels) {
        LowFrequencyBipolar transistor = new LowFrequencyBipolar(gain, baseOhms, ROOM_KELVIN);
        double amps = transistor.bestAmps(sourceOhms);
        assertThat(amps).isCloseTo(bestAmps, PLACED);
        assertThat(Decibels.ofPowerRatio(transistor.noiseFactor(sourceOhms, amps)))
                .isCloseTo(bestDecibels, TEN_DIGITS);
        // (VT/R) β/√(1+β) and (R/Rs) √(1+β)/(√(1+β) − 1), R = Rs + rbb'
        double whole = sourceOhms + baseOhms;
        double root = Math.sqrt(1.0 + gain);
        assertThat(amps).isCloseTo(Thermal.voltageVolts(ROOM_KELVIN) / whole * gain / root, PLACED);
        assertThat(transistor.noiseFactor(sourceOhms, amps))
                .isCloseTo(whole / sourceOhms * root / (root - 1.0), ALGEBRA);

        double simple = transistor.bestAmpsUncorrelated(sourceOhms);
        assertThat(simple).isCloseTo(simpleAmps, PLACED);
        assertThat(Decibels.ofPowerRatio(transistor.uncorrelatedNoiseFactor(sourceOhms, simple)))
                .isCloseTo(simpleDecibels, TEN_DIGITS);
        // the simpler sum is a little low in noise and a little high in current
        assertThat(simpleDecibels).isLessThan(bestDecibels);
        assertThat(simpleAmps).isGreaterThan(bestAmps);
    }

    /** Best source resistance and noise figure, dB: exact, then of the simpler textbook sum. */
    @ParameterizedTest
    @CsvSource({
        "0.001, 300, 30, 816.1296824, 0.4641562957, 815.9863749, 0.434458042",
        "0.0001, 400, 200, 8250.428441, 0.3519895638, 8252.044315, 0.3334365756",
        "0.003, 200, 10, 222.1421405, 0.5704515844, 222.0833617, 0.5263951506"
    })
    void theBestSourceResistanceIsThatOfTheClosedForm(
            double collectorAmps,
            double gain,
            double baseOhms,
            double bestOhms,
            double bestDecibels,
            double simpleOhms,
            double simpleDecibels) {
        LowFrequencyBipolar transistor = new LowFrequencyBipolar(gain, baseOhms, ROOM_KELVIN);
        double ohms = transistor.bestOhms(collectorAmps);
        assertThat(ohms).isCloseTo(bestOhms, PLACED);
        assertThat(Decibels.ofPowerRatio(transistor.noiseFactor(ohms, collectorAmps)))
                .isCloseTo(bestDecibels, TEN_DIGITS);
        NoiseParameters simple = transistor.separateGenerators(collectorAmps);
        assertThat(simple.optimumResistanceOhms()).isCloseTo(simpleOhms, TEN_DIGITS);
        assertThat(simple.minimumNoiseFigureDecibels()).isCloseTo(simpleDecibels, TEN_DIGITS);

        // the same optimum from the two-port's noise parameters, which need no search
        NoiseParameters noise = TwoPortNoise.of(
                1000.0,
                SingleStage.bare(new BiasedBipolar(BipolarModel.ideal(gain, baseOhms), collectorAmps, ROOM_KELVIN))
                        ::walk);
        assertThat(noise.optimumResistanceOhms()).isCloseTo(bestOhms, TEN_DIGITS);
    }

    @Test
    void theNoiseFactorIsThatOfNielsen() {
        // E. G. Nielsen, Proc. IRE 45 (1957) 957, from memory, at low frequency; checked value to nine digits
        LowFrequencyBipolar transistor = new LowFrequencyBipolar(100.0, 50.0, ROOM_KELVIN);
        double ours = transistor.noiseFactor(1000.0, 1e-3);
        assertThat(ours).isCloseTo(1.28879135, NINE_DIGITS);
        double alpha = 100.0 / 101.0;
        double re = Thermal.voltageVolts(ROOM_KELVIN) / (1e-3 / alpha);
        double sum = 1000.0 + 50.0 + re;
        double nielsen =
                1.0 + 50.0 / 1000.0 + re / (2.0 * 1000.0) + (1.0 - alpha) * sum * sum / (2.0 * alpha * re * 1000.0);
        assertThat(ours).isCloseTo(nielsen, ALGEBRA);
    }

    @ParameterizedTest
    @CsvSource({"0.001, 300, 30", "0.0001, 400, 200", "0.003, 200, 10", "1e-6, 100, 500"})
    void theEquivalentGeneratorsOfABipolarTransistorHaveTheirClosedForm(
            double collectorAmps, double gain, double baseOhms) {
        NoiseParameters noise = TwoPortNoise.of(
                1000.0,
                SingleStage.bare(new BiasedBipolar(BipolarModel.ideal(gain, baseOhms), collectorAmps, ROOM_KELVIN))
                        ::walk);
        double re = Thermal.voltageVolts(ROOM_KELVIN) / collectorAmps;
        double collector = ShotNoise.ampsSquaredPerHertz(collectorAmps);
        double base = ShotNoise.ampsSquaredPerHertz(collectorAmps / gain);
        double through = re + baseOhms / gain;
        double voltage = Thermal.voltsSquaredPerHertz(baseOhms, ROOM_KELVIN)
                + collector * through * through
                + base * baseOhms * baseOhms;
        double current = base * (1.0 + 1.0 / gain);
        double cross = collector * through / gain + base * baseOhms;
        assertThat(noise.voltsPerRootHertz()).isCloseTo(Math.sqrt(voltage), ALGEBRA);
        assertThat(noise.ampsPerRootHertz()).isCloseTo(Math.sqrt(current), ALGEBRA);
        assertThat(noise.correlationRe()).isPositive().isCloseTo(cross / Math.sqrt(voltage * current), ALGEBRA);
        assertThat(noise.correlationIm()).isBetween(-CORRELATION_ROUNDING, CORRELATION_ROUNDING);
    }

    @Test
    void noSurroundingsBringTheMinimumNoiseFactorBelowThatOfTheBareDevice() {
        // the property behind "Optimum Noise Performance of Transistor Input Circuits" (abstract)
        BiasedBipolar device = new BiasedBipolar(BipolarModel.ideal(200.0, 50.0), 1e-3, 290.0);
        double bare = TwoPortNoise.of(1000.0, SingleStage.bare(device)::walk).minimumNoiseFactor();
        for (double emitterOhms : new double[] {1.0, 10.0, 100.0, 1e3, 1e4}) {
            Surroundings around = new Surroundings(
                    CommonLead.of(emitterOhms), Optional.of(Passive.Resistor.of(4_700.0)), Optional.empty(), false);
            double degenerated = TwoPortNoise.of(1000.0, new SingleStage(device, 1, around)::walk)
                    .minimumNoiseFactor();
            assertThat(degenerated).isGreaterThan(bare);
        }
    }

    // ------------------------------------------------------------------------------------------------- JFET

    @ParameterizedTest
    @CsvSource({
        "0.01, 2, 0.002, 1.571553376e-09, 0.00447214, 1.10557",
        "0.006, 1, 0.006, 9.593918212e-10, 0.012, 0",
        "0.0026, 0.5, 0.001, 1.308619243e-09, 0.00644981, 0.189913"
    })
    void theChannelNoiseOfASquareLawJfetHasItsClosedForm(
            double saturationAmps,
            double pinchOffVolts,
            double drainAmps,
            double voltsPerRootHertz,
            double siemens,
            double gateSourceVolts) {
        JfetModel model = JfetModel.ideal(saturationAmps, pinchOffVolts);
        BiasedJfet device = new BiasedJfet(model, drainAmps, ROOM_KELVIN);
        assertThat(device.smallSignal().transconductanceSiemens()).isCloseTo(siemens, SIX_DIGITS);
        assertThat(model.law().gateSourceVolts(drainAmps)).isCloseTo(gateSourceVolts, SIX_DIGITS);
        NoiseParameters noise = TwoPortNoise.of(1000.0, SingleStage.bare(device)::walk);
        assertThat(noise.voltsPerRootHertz()).isCloseTo(voltsPerRootHertz, TEN_DIGITS);
        assertThat(noise.ampsPerRootHertz()).isZero();
    }

    // ---------------------------------------------------------------------------------------------- capsule

    /** A capsule biased through a resistor: all of kT/C, and the density at 1 kHz. */
    @ParameterizedTest
    @CsvSource({
        "1e9, 5e-11, 8.99708013e-06, 1.280750439e-08",
        "1e9, 2e-11, 1.422563275e-05, 3.201790942e-08",
        "1e10, 5e-11, 8.99708013e-06, 4.050108814e-09",
        "1.6e9, 2e-11, 1.422563275e-05, 2.53128683e-08"
    })
    void aBiasResistorOnACapsuleGivesKToverC(double ohms, double farads, double wholeVolts, double atOneKilohertz) {
        // from 1e-9 to 1e9 Hz: outside lies less than 1e-7 of it
        Band wide = new Band(1e-9, 1e9);
        double[] corner = {1.0 / (2.0 * Math.PI * ohms * farads)};
        Consumer<ChainPass> nothing = pass -> {};
        assertThat(rms(capsule(farads, ohms, nothing), wide, corner, "bias", Weighting.FLAT))
                .isCloseTo(wholeVolts, INTEGRATED);
        ChainPass spot = new ChainPass(Frequencies.of(1000.0));
        capsule(farads, ohms, nothing).accept(spot);
        assertThat(Math.sqrt(LowFrequencyBipolar.entry(spot, "bias"))).isCloseTo(atOneKilohertz, TEN_DIGITS);
    }

    /** Flat and A-weighted rms of every entry over 20 Hz to 20 kHz, and the level at 8 mV/Pa. */
    @ParameterizedTest
    @CsvSource({
        "5e-11, 1e9, 1e-12, 4e-9, 100, 2.850486489e-06, 6.57461e-07, 4.010260599e-07, 9.24962e-08, 5.750933911e-07,"
                + " 4.52987e-07, 2.93544e-06, 8.037464623e-07, 14.0200",
        "2e-11, 1.6e9, 5e-13, 5e-9, 200, 5.600791754e-06, 1.29933e-06, 7.047710029e-07, 1.63499e-07, 7.307795676e-07,"
                + " 5.74076e-07, 5.69207e-06, 1.429874269e-06, 19.0236",
        "5e-11, 1e10, 1e-13, 3e-9, 50, 9.051407318e-07, 2.07918e-07, 1.273414285e-07, 2.92514e-08, 4.277014027e-07,"
                + " 3.37364e-07, 1.00917e-06, 3.97366017e-07, 7.9014"
    })
    void aWholeCapsuleAmplifierHasItsKnownNoise(
            double farads,
            double ohms,
            double gateAmps,
            double voltsPerRootHertz,
            double cornerHertz,
            double biasFlat,
            double biasA,
            double gateFlat,
            double gateA,
            double voltageFlat,
            double voltageA,
            double totalFlat,
            double totalA,
            double levelDecibels) {
        Consumer<ChainPass> walk = capsule(farads, ohms, pass -> {
            pass.shuntCurrent(new Named("gate"), Spectrum.white(ShotNoise.ampsSquaredPerHertz(gateAmps)));
            pass.seriesVoltage(
                    new Named("voltage"), Spectrum.whiteWithCorner(voltsPerRootHertz * voltsPerRootHertz, cornerHertz));
        });
        double[] none = {};
        // these are at the gate; at the EMF of the unloaded capsule they are larger by |1 + 1/(jω R C)|², as further
        // below
        assertThat(rms(walk, Band.AUDIO, none, "bias", Weighting.FLAT)).isCloseTo(biasFlat, INTEGRATED);
        assertThat(rms(walk, Band.AUDIO, none, "bias", Weighting.A)).isCloseTo(biasA, SIX_DIGITS);
        assertThat(rms(walk, Band.AUDIO, none, "gate", Weighting.FLAT)).isCloseTo(gateFlat, INTEGRATED);
        assertThat(rms(walk, Band.AUDIO, none, "gate", Weighting.A)).isCloseTo(gateA, SIX_DIGITS);
        assertThat(rms(walk, Band.AUDIO, none, "voltage", Weighting.FLAT)).isCloseTo(voltageFlat, INTEGRATED);
        assertThat(rms(walk, Band.AUDIO, none, "voltage", Weighting.A)).isCloseTo(voltageA, SIX_DIGITS);
        double whole = Math.sqrt(square(rms(walk, Band.AUDIO, none, "bias", Weighting.A))
                + square(rms(walk, Band.AUDIO, none, "gate", Weighting.A))
                + square(rms(walk, Band.AUDIO, none, "voltage", Weighting.A)));
        assertThat(whole).isCloseTo(totalA, INTEGRATED);
        assertThat(Math.sqrt(square(rms(walk, Band.AUDIO, none, "bias", Weighting.FLAT))
                        + square(rms(walk, Band.AUDIO, none, "gate", Weighting.FLAT))
                        + square(rms(walk, Band.AUDIO, none, "voltage", Weighting.FLAT))))
                .isCloseTo(totalFlat, SIX_DIGITS);
        double pascals = whole / 8e-3;
        assertThat(Decibels.ofAmplitudeRatio(pascals / Constants.REFERENCE_SOUND_PRESSURE_PASCALS))
                .isCloseTo(levelDecibels, SIX_DIGITS);
    }

    private record Named(String name) implements Generator {}

    /** The capsule with its bias resistor across it, seen at the gate: the noise there, not re an EMF. */
    private static Consumer<ChainPass> capsule(double farads, double ohms, Consumer<ChainPass> amplifier) {
        CapacitorSource source = new CapacitorSource(farads, 0.0, ohms, CAPSULE_KELVIN, Signal.none());
        return pass -> {
            // the bias resistor across the capsule is the real part of what the source shows at the gate
            pass.beginBehind(source.impedance());
            pass.sourceNoise(new Named("bias"), CAPSULE_KELVIN);
            amplifier.accept(pass);
        };
    }

    private static double rms(Consumer<ChainPass> walk, Band band, double[] breaks, String entry, Weighting weighting) {
        LogQuadrature quadrature =
                LogQuadrature.refine(band, breaks, hertz -> new double[][] {weighted(walk, hertz, entry, weighting)});
        return Math.sqrt(quadrature.integrate(weighted(walk, quadrature.hertz(), entry, weighting)));
    }

    private static double[] weighted(Consumer<ChainPass> walk, double[] hertz, String entry, Weighting weighting) {
        ChainPass pass = new ChainPass(Frequencies.of(hertz));
        walk.accept(pass);
        double[] density = new double[hertz.length];
        for (int g = 0; g < pass.generatorCount(); g++) {
            if (pass.generators().get(g).name().equals(entry)) {
                for (int k = 0; k < hertz.length; k++) {
                    density[k] += pass.power(g)[k] * weighting.powerGain(hertz[k]);
                }
            }
        }
        return density;
    }

    @Test
    void theBiasResistorReferredToTheCapsulesOwnEmfIsItsCurrentInTheCapsulesReactance() {
        // 4kT/R · 1/(ωC)² at the EMF, against 4kTR/(1+(ωRC)²) at the gate: the difference is the gain
        double ohms = 1e9;
        double farads = 5e-11;
        ChainPass pass = new ChainPass(Frequencies.of(20.0, 1000.0));
        new FrontEnd(
                        new CapacitorSource(farads, 0.0, Double.POSITIVE_INFINITY, CAPSULE_KELVIN, Signal.none()),
                        List.of(new ShuntElement("bias", Passive.Resistor.of(ohms), 1, CAPSULE_KELVIN)),
                        SingleStage.bare(new BiasedJfet(
                                JfetModel.ideal(0.01, 2.0).withLeakage(new GateLeakage(1e-12, CAPSULE_KELVIN, 10.0)),
                                0.002,
                                CAPSULE_KELVIN)))
                .walk(pass);
        for (int k = 0; k < 2; k++) {
            double omega = pass.frequencies().omega()[k];
            double reactance = 1.0 / (omega * farads);
            double bias = Thermal.ampsSquaredPerHertz(1.0 / ohms, CAPSULE_KELVIN) * reactance * reactance;
            double leakage = ShotNoise.ampsSquaredPerHertz(1e-12) * reactance * reactance;
            double channel = 8.0
                    / 3.0
                    * Constants.BOLTZMANN_JOULES_PER_KELVIN
                    * CAPSULE_KELVIN
                    / 0.004472135955
                    * (1.0 + square(1.0 / (omega * ohms * farads)));
            assertThat(power(pass, "bias", k)).isCloseTo(bias, ALGEBRA);
            assertThat(power(pass, "gate leakage", k)).isCloseTo(leakage, ALGEBRA);
            assertThat(power(pass, "channel", k)).isCloseTo(channel, TEN_DIGITS);
        }
    }

    private static double power(ChainPass pass, String name, int k) {
        for (int g = 0; g < pass.generatorCount(); g++) {
            if (pass.generators().get(g).name().equals(name)) {
                return pass.power(g)[k];
            }
        }
        throw new AssertionError("no generator named " + name);
    }

    private static double square(double x) {
        return x * x;
    }
}
