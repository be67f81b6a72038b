package hissledger.physics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.EnumSource;

class WeightingTest {
    /** Half a unit in the last digit of the A table, 0.1 dB. */
    private static final double A_TABLE_ROUNDING = 0.05;
    /** The table's frequencies are rounded to six decimals. */
    private static final double FREQUENCY_ROUNDING = 1e-6;
    /** Nominal third-octave frequencies are rounded to a preferred number, at most 1 % off. */
    private static final double NOMINAL_ROUNDING = 0.02;
    /** The network's poles against the table's 0.1 dB: its worst point is 100 Hz. */
    private static final double ITU_WORST_DECIBELS = 0.067;
    /** The worst point, 0.0670 dB, is printed to three decimals. */
    private static final double ITU_WORST_ROUNDING = 5e-4;
    /** The reference point is met by construction, up to some ten roundings. */
    private static final double REFERENCE_ROUNDING = 1e-12;
    /** The reading at 1 kHz is stated as -0.0167 dB. */
    private static final double ITU_ONE_KILOHERTZ_ROUNDING = 5e-5;
    /** Products and quotients of about ten terms. */
    private static final double ALGEBRA_ROUNDING = 1e-14;
    /** The poles are written to 1e-6 Hz: at the lowest, 20.6 Hz, a part in 2e7. */
    private static final double POLE_ROUNDING = 1e-7;
    /** IEC 60098 tables, from memory, print 0.1 dB; the values below are the time constants' own to 0.001 dB. */
    private static final double PLAYBACK_ROUNDING = 5e-4;

    @ParameterizedTest
    @CsvFileSource(resources = "a-weighting.csv", useHeadersInDisplayName = true)
    void aFollowsItsTableAtTheExactBandCentres(double nominalHertz, double exactHertz, double decibels) {
        double index = Math.round(10.0 * Math.log10(exactHertz / 1000.0));
        assertThat(1000.0 * Math.pow(10.0, index / 10.0)).isCloseTo(exactHertz, within(FREQUENCY_ROUNDING));
        assertThat(Math.abs(nominalHertz / exactHertz - 1.0)).isLessThan(NOMINAL_ROUNDING);
        assertThat(Decibels.ofPowerRatio(Weighting.A.powerGain(exactHertz)))
                .isCloseTo(decibels, within(A_TABLE_ROUNDING));
    }

    @ParameterizedTest
    @CsvFileSource(resources = "bs468-weighting.csv", useHeadersInDisplayName = true)
    void itu468MeetsEveryToleranceOfItsTable(double hertz, double decibels, double plus, double minus) {
        double ours = Decibels.ofPowerRatio(Weighting.ITU_468.powerGain(hertz));
        assertThat(ours - decibels).isBetween(minus - REFERENCE_ROUNDING, plus + REFERENCE_ROUNDING);
        assertThat(ours).isCloseTo(decibels, within(ITU_WORST_DECIBELS + ITU_WORST_ROUNDING));
    }

    @Test
    void itu468ReadsItsReferenceAtSixPointThreeKilohertzAndALittleUnderZeroAtOne() {
        assertThat(Decibels.ofPowerRatio(Weighting.ITU_468.powerGain(6300.0)))
                .isCloseTo(12.2, within(REFERENCE_ROUNDING));
        assertThat(Decibels.ofPowerRatio(Weighting.ITU_468.powerGain(1000.0)))
                .isCloseTo(-0.0167, within(ITU_ONE_KILOHERTZ_ROUNDING));
        assertThat(Decibels.ofPowerRatio(Weighting.ITU_468.powerGain(100.0)) + 19.8)
                .isCloseTo(-ITU_WORST_DECIBELS, within(ITU_WORST_ROUNDING));
    }

    @ParameterizedTest
    @EnumSource(
            value = Weighting.class,
            names = {"FLAT", "A", "PLAYBACK", "PLAYBACK_A"})
    void isOneAtOneKilohertz(Weighting weighting) {
        assertThat(weighting.powerGain(1000.0)).isEqualTo(1.0);
    }

    @Test
    void aHasThePolesThatItsStandardConstructs() {
        // IEC 61672-1: fr = 1000, fL = 10^1.5, fH = 10^3.9, fA = 10^2.45 Hz, D² = 1/2; exact poles, written out again
        double square = 1000.0 * 1000.0;
        double low = Math.pow(10.0, 3.0);
        double high = Math.pow(10.0, 7.8);
        double half = Math.sqrt(0.5);
        double b = (square + low * high / square - half * (low + high)) / (1.0 - half);
        double c = low * high;
        double f1 = Math.sqrt((-b - Math.sqrt(b * b - 4.0 * c)) / 2.0);
        double f4 = Math.sqrt((-b + Math.sqrt(b * b - 4.0 * c)) / 2.0);
        double fa = Math.pow(10.0, 2.45);
        double f2 = (3.0 - Math.sqrt(5.0)) / 2.0 * fa;
        double f3 = (3.0 + Math.sqrt(5.0)) / 2.0 * fa;
        for (double hertz : Band.AUDIO.logarithmicHertz(200)) {
            double expected = a(hertz, f1, f2, f3, f4) / a(1000.0, f1, f2, f3, f4);
            assertThat(Math.sqrt(Weighting.A.powerGain(hertz)) / expected).isCloseTo(1.0, within(POLE_ROUNDING));
        }
    }

    private static double a(double f, double f1, double f2, double f3, double f4) {
        return Math.pow(f, 4.0) / ((f * f + f1 * f1) * Math.hypot(f, f2) * Math.hypot(f, f3) * (f * f + f4 * f4));
    }

    @Test
    void playbackIsItsThreeTimeConstants() {
        // |1 + jω 318 µs| / (|1 + jω 3180 µs| |1 + jω 75 µs|), re 1 kHz: +19.274 dB at 20 Hz, -19.620 dB at 20 kHz
        assertThat(Decibels.ofPowerRatio(Weighting.PLAYBACK.powerGain(20.0)))
                .isCloseTo(19.274, within(PLAYBACK_ROUNDING));
        assertThat(Decibels.ofPowerRatio(Weighting.PLAYBACK.powerGain(20_000.0)))
                .isCloseTo(-19.620, within(PLAYBACK_ROUNDING));
        assertThat(Decibels.ofPowerRatio(Weighting.PLAYBACK.powerGain(100.0)))
                .isCloseTo(13.088, within(PLAYBACK_ROUNDING));
    }

    @Test
    void playbackWithAIsTheProductOfBoth() {
        for (double hertz : Band.AUDIO.logarithmicHertz(50)) {
            assertThat(Weighting.PLAYBACK_A.powerGain(hertz)
                            / (Weighting.PLAYBACK.powerGain(hertz) * Weighting.A.powerGain(hertz)))
                    .isCloseTo(1.0, within(ALGEBRA_ROUNDING));
            assertThat(Weighting.FLAT.powerGain(hertz)).isEqualTo(1.0);
        }
    }

    @ParameterizedTest
    @EnumSource(Weighting.class)
    void hasWordsForAResult(Weighting weighting) {
        assertThat(weighting.label()).isNotBlank();
    }

    @Test
    void itu468IsLabelledAsRms() {
        assertThat(Weighting.ITU_468.label()).isEqualTo("ITU-R BS.468 gain, rms detection");
    }
}
