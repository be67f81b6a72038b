package hissledger.physics;

import static hissledger.Trials.forAll;
import static hissledger.Trials.logUniform;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** Decibels, thermal, shot and excess noise. */
class LawsTest {
    /** Two or three roundings. */
    private static final double ROUNDING = 1e-15;
    /** Half a unit in the fourth decimal. */
    private static final double PRINTED_TO_FOUR_DECIMALS = 5e-5;
    /** The rule of thumb has two digits: half a unit in the second, relative. */
    private static final double RULE_OF_THUMB = 0.0125;
    /** A power or logarithm and its inverse each round once, magnified by the logarithm of the ratio. */
    private static final double ROUND_TRIP = 1e-13;

    @Test
    void theConstantsAreThoseOfTheSystemOfUnits() {
        assertThat(Constants.BOLTZMANN_JOULES_PER_KELVIN).isEqualTo(1.380649e-23);
        assertThat(Constants.ELEMENTARY_CHARGE_COULOMBS).isEqualTo(1.602176634e-19);
        assertThat(Constants.STANDARD_NOISE_TEMPERATURE_KELVIN).isEqualTo(290.0);
        assertThat(Constants.ZERO_CELSIUS_KELVIN).isEqualTo(273.15);
        assertThat(Constants.REFERENCE_SOUND_PRESSURE_PASCALS).isEqualTo(20e-6);
        // 1 mW in 600 Ω
        assertThat(Constants.DBU_REFERENCE_VOLTS).isCloseTo(Math.sqrt(1e-3 * 600.0), within(ROUNDING));
    }

    @Test
    void decibelsAndRatiosAreInverse() {
        forAll(1_000, random -> {
            double ratio = logUniform(random, 1e-20, 1e20);
            assertThat(Decibels.toPowerRatio(Decibels.ofPowerRatio(ratio)) / ratio)
                    .isCloseTo(1.0, within(ROUND_TRIP));
            assertThat(Decibels.toAmplitudeRatio(Decibels.ofAmplitudeRatio(ratio)) / ratio)
                    .isCloseTo(1.0, within(ROUND_TRIP));
            assertThat(Decibels.dbuToVolts(Decibels.dbu(ratio)) / ratio).isCloseTo(1.0, within(ROUND_TRIP));
            assertThat(Decibels.ofPowerRatio(ratio * ratio))
                    .isCloseTo(Decibels.ofAmplitudeRatio(ratio), within(ROUND_TRIP * 400.0));
        });
    }

    @Test
    void knownLevels() {
        assertThat(Decibels.ofPowerRatio(2.0)).isCloseTo(3.0103, within(PRINTED_TO_FOUR_DECIMALS));
        assertThat(Decibels.ofAmplitudeRatio(10.0)).isEqualTo(20.0);
        assertThat(Decibels.dbv(1.0)).isEqualTo(0.0);
        assertThat(Decibels.dbv(1.0) - Decibels.dbu(1.0)).isCloseTo(-2.2185, within(PRINTED_TO_FOUR_DECIMALS));
        assertThat(Decibels.dbu(Constants.DBU_REFERENCE_VOLTS)).isEqualTo(0.0);
        assertThat(Decibels.ofPowerRatio(0.0)).isEqualTo(Double.NEGATIVE_INFINITY);
        assertThat(Decibels.ofAmplitudeRatio(0.0)).isEqualTo(Double.NEGATIVE_INFINITY);
        // 1 Pa, as every microphone sheet has it
        assertThat(Decibels.ofAmplitudeRatio(1.0 / Constants.REFERENCE_SOUND_PRESSURE_PASCALS))
                .isCloseTo(93.9794, within(PRINTED_TO_FOUR_DECIMALS));
    }

    @Test
    void thermalNoiseOfAKilohmAtRoomTemperatureIsFourNanovolts() {
        // 4 nV/√Hz and 4 pA/√Hz of 1 kΩ, the trade's rule of thumb
        assertThat(Math.sqrt(Thermal.voltsSquaredPerHertz(1000.0, 290.0)))
                .isCloseTo(4.0e-9, within(4.0e-9 * RULE_OF_THUMB));
        assertThat(Math.sqrt(Thermal.ampsSquaredPerHertz(1e-3, 290.0)))
                .isCloseTo(4.0e-12, within(4.0e-12 * RULE_OF_THUMB));
    }

    @Test
    void theTwoFormsOfThermalNoiseAreOne() {
        forAll(200, random -> {
            double ohms = logUniform(random, 1e-3, 1e12);
            double kelvin = logUniform(random, 1e-3, 1e4);
            double volts = Thermal.voltsSquaredPerHertz(ohms, kelvin);
            double amps = Thermal.ampsSquaredPerHertz(1.0 / ohms, kelvin);
            assertThat(amps * ohms * ohms / volts).isCloseTo(1.0, within(3.0 * ROUNDING));
            assertThat(volts / (4.0 * Constants.BOLTZMANN_JOULES_PER_KELVIN * kelvin * ohms))
                    .isCloseTo(1.0, within(3.0 * ROUNDING));
        });
    }

    @Test
    void theThermalVoltageTiesThermalAndShotNoise() {
        // 2q (2 VT/R) = 4kT/R: a resistor's thermal noise is the shot noise of twice the thermal voltage across it
        forAll(200, random -> {
            double ohms = logUniform(random, 1e-3, 1e12);
            double kelvin = logUniform(random, 1.0, 1e3);
            double shot = ShotNoise.ampsSquaredPerHertz(2.0 * Thermal.voltageVolts(kelvin) / ohms);
            assertThat(shot / Thermal.ampsSquaredPerHertz(1.0 / ohms, kelvin)).isCloseTo(1.0, within(5.0 * ROUNDING));
        });
    }

    @Test
    void excessNoiseSpreadsTheIndexOverEachDecade() {
        // 1 µV per volt and decade is 0 dB
        assertThat(ExcessNoise.indexFromDecibels(0.0)).isEqualTo(1e-6);
        assertThat(ExcessNoise.indexFromDecibels(-20.0)).isCloseTo(1e-7, within(ROUNDING * 1e-6));
        double atOneHertz = ExcessNoise.voltsSquaredPerHertzAtOneHertz(1e-6, -10.0);
        Band decade = new Band(70.0, 700.0);
        LogQuadrature quadrature =
                LogQuadrature.refine(decade, new double[0], hertz -> new double[][] {flicker(hertz, atOneHertz)});
        double volts = Math.sqrt(quadrature.integrate(flicker(quadrature.hertz(), atOneHertz)));
        assertThat(volts / 10e-6).isCloseTo(1.0, within(ROUND_TRIP));
    }

    private static double[] flicker(double[] hertz, double atOneHertz) {
        double[] density = new double[hertz.length];
        for (int k = 0; k < hertz.length; k++) {
            density[k] = atOneHertz / hertz[k];
        }
        return density;
    }

    @Test
    void refusesWhatIsNoResistanceCurrentTemperatureOrIndex() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Thermal.voltsSquaredPerHertz(-1.0, 290.0))
                .withMessage("resistanceOhms must be finite and >= 0 Ω, was -1.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Thermal.ampsSquaredPerHertz(Double.NaN, 290.0))
                .withMessage("conductanceSiemens must be finite and >= 0 S, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Thermal.fourKt(0.0))
                .withMessage("temperatureKelvin must be finite and > 0 K, was 0.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Thermal.voltageVolts(Double.NaN))
                .withMessage("temperatureKelvin must be finite and > 0 K, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> ShotNoise.ampsSquaredPerHertz(-1e-3))
                .withMessage("currentAmps must be finite and >= 0 A, was -0.001");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> ExcessNoise.indexFromDecibels(Double.NaN))
                .withMessage("indexDecibels must be finite (dB re 1 µV/V), was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> ExcessNoise.voltsSquaredPerHertzAtOneHertz(-1e-6, 1.0))
                .withMessage("index must be finite and >= 0 V/V, was -1.0E-6");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> ExcessNoise.voltsSquaredPerHertzAtOneHertz(1e-6, Double.POSITIVE_INFINITY))
                .withMessage("directVolts must be finite (V), was Infinity");
    }
}
