package hissledger.twoport;

import static hissledger.Trials.forAll;
import static hissledger.Trials.logUniform;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.apache.commons.math3.complex.Complex;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** What the chain is made of: impedances, spectra, frequencies, small-signal devices. */
class ImpedanceAndSpectrumTest {
    /** A handful of roundings. */
    private static final double ROUNDING = 1e-14;

    private static final Percentage FEW_ROUNDINGS = Percentage.withPercentage(100.0 * ROUNDING);
    /** Off resonance, a parallel combination cancels up to three digits. */
    private static final double PARALLEL_ROUNDING = 1e-11;

    private static Complex at(Impedance impedance, double hertz) {
        double[] re = new double[1];
        double[] im = new double[1];
        impedance.fill(Frequencies.of(hertz), re, im);
        return new Complex(re[0], im[0]);
    }

    private static double at(Spectrum spectrum, double hertz) {
        double[] density = new double[1];
        spectrum.fill(Frequencies.of(hertz), density);
        return density[0];
    }

    @Test
    void partsHaveTheirTextbookImpedance() {
        double omega = 2.0 * Math.PI * 1000.0;
        assertThat(at(Impedance.none(), 1000.0)).isEqualTo(Complex.ZERO);
        assertThat(at(Impedance.resistance(47.0), 1000.0)).isEqualTo(new Complex(47.0));
        Complex coil = at(Impedance.resistanceAndInductance(10.0, 0.5), 1000.0);
        assertThat(coil.getReal()).isEqualTo(10.0);
        assertThat(coil.getImaginary()).isCloseTo(omega * 0.5, FEW_ROUNDINGS);
        Complex capacitor = at(Impedance.capacitance(1e-9, 0.02, 3.0), 1000.0);
        assertThat(capacitor.getImaginary()).isCloseTo(-1.0 / (omega * 1e-9), FEW_ROUNDINGS);
        assertThat(capacitor.getReal()).isCloseTo(3.0 + 0.02 / (omega * 1e-9), FEW_ROUNDINGS);
    }

    @Test
    void acrossIsTheSumOfAdmittances() {
        forAll(1_000, random -> {
            double hertz = logUniform(random, 1.0, 1e6);
            Impedance coil =
                    Impedance.resistanceAndInductance(logUniform(random, 0.1, 1e5), logUniform(random, 1e-7, 1.0));
            double ohms = random.nextInt(4) == 0 ? Double.POSITIVE_INFINITY : logUniform(random, 10.0, 1e9);
            double farads = random.nextInt(4) == 0 ? 0.0 : logUniform(random, 1e-13, 1e-7);
            Complex admittance =
                    at(coil, hertz).reciprocal().add(new Complex(1.0 / ohms, 2.0 * Math.PI * hertz * farads));
            Complex expected = admittance.reciprocal();
            Complex ours = at(coil.across(ohms, farads), hertz);
            // near resonance the reference itself loses what the susceptances cancel
            double allowed = PARALLEL_ROUNDING
                    * expected.abs()
                    * (1.0 + at(coil, hertz).reciprocal().abs() / admittance.abs());
            assertThat(ours.subtract(expected).abs()).isCloseTo(0.0, within(allowed));
            assertThat(ours.getReal()).isNotNegative();
        });
    }

    @Test
    void aPartInEachLegStandsTwice() {
        Complex once = at(Impedance.capacitance(1e-6, 0.01, 0.5), 100.0);
        Complex twice = at(Impedance.capacitance(1e-6, 0.01, 0.5).times(2), 100.0);
        assertThat(twice.getReal()).isCloseTo(2.0 * once.getReal(), FEW_ROUNDINGS);
        assertThat(twice.getImaginary()).isCloseTo(2.0 * once.getImaginary(), FEW_ROUNDINGS);
        assertThat(at(Impedance.resistance(5.0).times(1), 100.0)).isEqualTo(new Complex(5.0));
    }

    @Test
    void spectraHaveTheirLaws() {
        assertThat(at(Spectrum.white(3e-18), 12.0)).isEqualTo(3e-18);
        assertThat(at(Spectrum.powerLaw(4e-18, 10.0, 1.0), 100.0)).isCloseTo(4e-19, FEW_ROUNDINGS);
        assertThat(at(Spectrum.powerLaw(4e-18, 10.0, -2.0), 100.0)).isCloseTo(4e-16, FEW_ROUNDINGS);
        assertThat(at(Spectrum.powerLaw(4e-18, 10.0, 0.0), 100.0)).isEqualTo(4e-18);
        // at the corner flicker and white noise are equal
        assertThat(at(Spectrum.whiteWithCorner(1e-18, 250.0), 250.0)).isCloseTo(2e-18, FEW_ROUNDINGS);
        assertThat(at(Spectrum.whiteWithCorner(1e-18, 0.0), 250.0)).isEqualTo(1e-18);
    }

    @Test
    void everyFrequencyHasItsOmega() {
        Frequencies frequencies = Frequencies.of(1000.0, 20.0);
        assertThat(frequencies.count()).isEqualTo(2);
        assertThat(frequencies.hertz()).containsExactly(1000.0, 20.0);
        assertThat(frequencies.omega()[1]).isCloseTo(40.0 * Math.PI, FEW_ROUNDINGS);
        assertThat(frequencies.inverseOmega()[1] * frequencies.omega()[1]).isCloseTo(1.0, FEW_ROUNDINGS);
    }

    @Test
    void aDeviceInParallelWithItselfHasTwiceItsAdmittances() {
        SmallSignal one = new SmallSignal(1e-5, 0.04, 1e-6, 1e-10, 4e-12, 2e-12);
        assertThat(one.parallel(1)).isEqualTo(one);
        assertThat(one.parallel(2)).isEqualTo(new SmallSignal(2e-5, 0.08, 2e-6, 2e-10, 8e-12, 4e-12));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> one.parallel(0))
                .withMessage("devices must be >= 1, was 0");
    }

    @Test
    void aCascodeShieldsTheFeedbackCapacitanceAndTheOutputConductance() {
        SmallSignal cascoded = new SmallSignal(1e-5, 0.04, 1e-6, 1e-10, 4e-12, 2e-12).cascoded();
        assertThat(cascoded).isEqualTo(new SmallSignal(1e-5, 0.04, 0.0, 1e-10, 0.0, 6e-12));
    }

    @Test
    void refusesWhatIsNoPart() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Impedance.resistance(-1.0))
                .withMessage("ohms must be finite and >= 0 Ω, was -1.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Impedance.resistanceAndInductance(1.0, Double.NaN))
                .withMessage("henries must be finite and >= 0 H, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Impedance.capacitance(0.0, 0.0, 0.0))
                .withMessage("farads must be finite and > 0 F, was 0.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Impedance.capacitance(1e-9, -0.1, 0.0))
                .withMessage("lossTangent must be finite and >= 0, was -0.1");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Impedance.capacitance(1e-9, 0.0, Double.POSITIVE_INFINITY))
                .withMessage("seriesOhms must be finite and >= 0 Ω, was Infinity");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Impedance.none().across(0.0, 0.0))
                .withMessage("parallelOhms must be > 0 Ω, was 0.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Impedance.none().across(Double.NaN, 0.0))
                .withMessage("parallelOhms must be > 0 Ω, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Impedance.none().times(0))
                .withMessage("times must be >= 1, was 0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Spectrum.white(Double.NaN))
                .withMessage("density must be finite and >= 0 V²/Hz or A²/Hz, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Spectrum.powerLaw(1e-18, 0.0, 1.0))
                .withMessage("hertz must be finite and > 0 Hz, was 0.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Spectrum.powerLaw(1e-18, 1.0, Double.NaN))
                .withMessage("exponent must be finite, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Spectrum.whiteWithCorner(1e-18, -1.0))
                .withMessage("cornerHertz must be finite and >= 0 Hz, was -1.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Frequencies.of(1000.0, 0.0))
                .withMessage("hertz must be finite and > 0 Hz, was 0.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> SmallSignal.of(0.0, 0.0, 0.0, 0.0, 0.0))
                .withMessage("transconductanceSiemens must be finite and > 0 S, was 0.0");
    }
}
