package hissledger.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.within;

import hissledger.Trials;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class QuantityFormsTest {
    /** Half a unit in the fourth of four digits, at the least mantissa 1.000. */
    private static final double FOUR_DIGITS = 0.5e-3;

    private static double parse(String text, Dimension dimension) {
        try {
            return Quantities.parse(text, dimension).value();
        } catch (Quantities.NotAQuantity fault) {
            throw new AssertionError(fault.why(), fault);
        }
    }

    /** Read as the double nearest to the decimal number, so equality is exact. */
    @ParameterizedTest
    @CsvSource({
        "150 ohm, RESISTANCE, 150",
        "150 Ω, RESISTANCE, 150",
        "150\u2126, RESISTANCE, 150",
        "150 R, RESISTANCE, 150",
        "4.7 kohm, RESISTANCE, 4700",
        "4.7kΩ, RESISTANCE, 4700",
        "0.1 kohm, RESISTANCE, 100",
        "1 Gohm, RESISTANCE, 1e9",
        "50 mohm, RESISTANCE, 0.05",
        "4k7, RESISTANCE, 4700",
        "4K7, RESISTANCE, 4700",
        "R22, RESISTANCE, 0.22",
        "4R7, RESISTANCE, 4.7",
        "150R, RESISTANCE, 150",
        "1M0, RESISTANCE, 1e6",
        "1G0, RESISTANCE, 1e9",
        "1T5, RESISTANCE, 1.5e12",
        "4L7, RESISTANCE, 0.0047",
        "22 uF, CAPACITANCE, 22e-6",
        "22 µF, CAPACITANCE, 22e-6",
        "22 \u03bcF, CAPACITANCE, 22e-6",
        "4n7, CAPACITANCE, 4.7e-9",
        "3p3, CAPACITANCE, 3.3e-12",
        "u33, CAPACITANCE, 0.33e-6",
        "µ33, CAPACITANCE, 0.33e-6",
        "100n, CAPACITANCE, 100e-9",
        "1m5, CAPACITANCE, 1.5e-3",
        "1F0, CAPACITANCE, 1",
        "0.6 mH, INDUCTANCE, 0.6e-3",
        "4u7, INDUCTANCE, 4.7e-6",
        "3m3, INDUCTANCE, 3.3e-3",
        "1.2 mA, CURRENT, 1.2e-3",
        "1e-3 A, CURRENT, 1e-3",
        "1.2mA, CURRENT, 1.2e-3",
        ".5 pA, CURRENT, 0.5e-12",
        "10 fA, CURRENT, 1e-14",
        "48 V, VOLTAGE, 48",
        "-3.5 V, VOLTAGE, -3.5",
        "350 mW, POWER, 0.35",
        "20 kHz, FREQUENCY, 20000",
        "300 K, TEMPERATURE, 300",
        "27 degC, TEMPERATURE, 300.15",
        "27°C, TEMPERATURE, 300.15",
        "-40 degC, TEMPERATURE, 233.14999999999998",
        "10 K, TEMPERATURE_STEP, 10",
        "14 mS, CONDUCTANCE, 14e-3",
        "0.01 1/V, INVERSE_VOLTAGE, 0.01",
        "5 nV/rtHz, VOLTAGE_DENSITY, 5e-9",
        "5 nV/√Hz, VOLTAGE_DENSITY, 5e-9",
        "0.5 pA/rtHz, CURRENT_DENSITY, 0.5e-12",
        "-20 dB, DECIBELS, -20",
        "-20dB, DECIBELS, -20",
        "5 %, PERCENT, 0.05",
        "4.5 m, LENGTH, 4.5",
        "100 pF/m, CAPACITANCE_PER_LENGTH, 100e-12",
        "1.8 mV/Pa, SENSITIVITY, 1.8e-3",
        "28 V/(m/s), SENSITIVITY, 28",
        "5 mV/N, SENSITIVITY, 5e-3",
        "-128 dBu, LEVEL, -128",
        "-130 dBV, LEVEL, -130",
        "5 mV, LEVEL, 5e-3",
        "94 dB SPL, REFERENCE_LEVEL, 94",
        "1 Pa, REFERENCE_LEVEL, 1"
    })
    void readsEveryFormOfTheContract(String text, Dimension dimension, double value) {
        assertThat(parse(text, dimension)).isEqualTo(value);
    }

    @ParameterizedTest
    @EnumSource(Dimension.class)
    void readsItsOwnExamples(Dimension dimension) {
        assertThat(parse(dimension.example(), dimension)).isFinite();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "22 uF| RESISTANCE| must be a resistance, but \"uF\" in \"22 uF\" is the unit of a capacitance; "
                        + "write it like \"150 ohm\"",
                "-128 dBu| VOLTAGE| must be a voltage, but \"dBu\" in \"-128 dBu\" is the unit of a voltage level; "
                        + "write it like \"48 V\"",
                "150| RESISTANCE| has no unit in \"150\"; write it like \"150 ohm\"",
                "1,5 mA| CURRENT| has a decimal comma in \"1,5 mA\"; write a decimal point, as in \"1.5 mA\"",
                "1.2 m A| CURRENT| has an unknown unit \"m A\" in \"1.2 m A\"; write it like \"1.2 mA\"",
                "2 mX| CURRENT| has an unknown unit \"mX\" in \"2 mX\"; write it like \"1.2 mA\"",
                "20 m°C| TEMPERATURE| has an unknown unit \"m°C\" in \"20 m°C\"; write it like \"27 degC\"",
                "five ohm| RESISTANCE| must be a resistance, was \"five ohm\"; write it like \"150 ohm\"",
                "NaN ohm| RESISTANCE| must be a resistance, was \"NaN ohm\"; write it like \"150 ohm\"",
                "ohm| RESISTANCE| must be a resistance, was \"ohm\"; write it like \"150 ohm\"",
                "''| RESISTANCE| must not be empty; write it like \"150 ohm\"",
                "' '| RESISTANCE| must not be empty; write it like \"150 ohm\"",
                "4n7| RESISTANCE| has an unknown unit \"n7\" in \"4n7\"; write it like \"150 ohm\"",
                "4k7| CURRENT| has an unknown unit \"k7\" in \"4k7\"; write it like \"1.2 mA\""
            })
    void saysWhatIsWrongAndHowToWriteIt(String text, Dimension dimension, String sentence) {
        Quantities.NotAQuantity fault =
                catchThrowableOfType(Quantities.NotAQuantity.class, () -> Quantities.parse(text, dimension));
        assertThat(fault.why()).isEqualTo(sentence);
    }

    @Test
    void keepsMessagesOnOneLineAndShort() {
        Quantities.NotAQuantity broken = catchThrowableOfType(
                Quantities.NotAQuantity.class, () -> Quantities.parse("1\n2 ohm", Dimension.RESISTANCE));
        assertThat(broken.why()).isEqualTo("has an unknown unit \"2 ohm\" in \"1 2 ohm\"; write it like \"150 ohm\"");
        String endless = "1".repeat(1_000_000) + " ohm";
        Quantities.NotAQuantity tooLong = catchThrowableOfType(
                Quantities.NotAQuantity.class, () -> Quantities.parse(endless, Dimension.RESISTANCE));
        assertThat(tooLong.why())
                .isEqualTo("must be a resistance, was \"" + "1".repeat(60) + "...\"; write it like \"150 ohm\"");
    }

    @ParameterizedTest
    @CsvSource({
        "4700, Ω, 4, 4.700 kΩ",
        "4700, Ω, 2, 4.7 kΩ",
        "2.15e-9, V/√Hz, 3, 2.15 nV/√Hz",
        "0.0012, A, 3, 1.20 mA",
        "-0.0012, A, 2, -1.2 mA",
        "0, V, 4, 0 V",
        "-0.0, V, 4, 0 V",
        "999.96, Hz, 4, 1.000 kHz",
        "999.94, Hz, 4, 999.9 Hz",
        "0.00099996, A, 4, 1.000 mA",
        "1e6, Ω, 3, 1.00 MΩ",
        "1.5e12, Ω, 3, 1.50 TΩ",
        "3.3e-12, F, 3, 3.30 pF",
        "2.5e-15, A, 3, 2.50 fA",
        "300.16, K, 4, 300.2 K",
        "-127.46, dBu, 4, -127.5 dBu",
        "0.01, 1/V, 3, 0.0100 1/V",
        "180, '', 3, 180",
        "5e-18, A, 3, 0.00500 fA",
        "2e15, Ω, 3, 2000 TΩ"
    })
    void printsInEngineeringNotation(double value, String unit, int digits, String text) {
        assertThat(Quantities.format(value, unit, digits)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource({
        "4700, Ω, 4, 4.7 kΩ",
        "100, Hz, 4, 100 Hz",
        "1000, Hz, 4, 1 kHz",
        "0, V, 4, 0 V",
        "1.25e-3, A, 4, 1.25 mA"
    })
    void printsBrieflyWithoutIdleZeros(double value, String unit, int digits, String text) {
        assertThat(Quantities.brief(value, unit, digits)).isEqualTo(text);
    }

    @Test
    void readsBackWhatItPrints() {
        List<Dimension> prefixed = List.of(
                Dimension.RESISTANCE,
                Dimension.CAPACITANCE,
                Dimension.INDUCTANCE,
                Dimension.CURRENT,
                Dimension.VOLTAGE,
                Dimension.FREQUENCY,
                Dimension.CONDUCTANCE,
                Dimension.VOLTAGE_DENSITY,
                Dimension.CURRENT_DENSITY,
                Dimension.SENSITIVITY);
        Trials.forAll(2_000, random -> {
            Dimension dimension = prefixed.get(random.nextInt(prefixed.size()));
            double value = Trials.logUniform(random, 1e-15, 1e15) * (random.nextBoolean() ? 1.0 : -1.0);
            String text = Quantities.format(value, dimension.printed(), 4);
            assertThat(parse(text, dimension)).isCloseTo(value, within(Math.abs(value) * FOUR_DIGITS));
            assertThat(Quantities.format(parse(text, dimension), dimension.printed(), 4))
                    .isEqualTo(text);
        });
    }

    @Test
    void doesNotDependOnTheLocale() {
        Locale before = Locale.getDefault();
        Locale.setDefault(Locale.GERMANY);
        try {
            assertThat(Quantities.format(4700.0, "Ω", 4)).isEqualTo("4.700 kΩ");
            assertThat(parse("4.7 kohm", Dimension.RESISTANCE)).isEqualTo(4700.0);
            assertThat(Range.between(1e-3, 1e9).words("Hz")).isEqualTo("finite and from 1 mHz to 1 GHz");
            assertThat(JsonOut.text(java.util.Map.of("a", 0.5))).contains("0.5");
        } finally {
            Locale.setDefault(before);
        }
    }
}
