package hissledger.files;

import static hissledger.Trials.forAll;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowable;
import static org.assertj.core.api.Assertions.within;

import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class QuantitiesTest {
    private static double parse(String text, Dimension dimension) throws Quantities.NotAQuantity {
        return Quantities.parse(text, dimension).value();
    }

    /** Letter codes of IEC 60062 and every spelling that the file contract lists. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "150 ohm | RESISTANCE | 150",
                "150Ω | RESISTANCE | 150",
                "470R | RESISTANCE | 470",
                "R47 | RESISTANCE | 0.47",
                "R22 | RESISTANCE | 0.22",
                "4R7 | RESISTANCE | 4.7",
                "4K7 | RESISTANCE | 4700",
                "4k7 | RESISTANCE | 4700",
                "47K | RESISTANCE | 47000",
                "47K3 | RESISTANCE | 47300",
                "4M7 | RESISTANCE | 4.7e6",
                "1G0 | RESISTANCE | 1e9",
                "1T0 | RESISTANCE | 1e12",
                "4.7 kohm | RESISTANCE | 4700",
                "50 mohm | RESISTANCE | 0.05",
                "4n7 | CAPACITANCE | 4.7e-9",
                "p33 | CAPACITANCE | 0.33e-12",
                "3p3 | CAPACITANCE | 3.3e-12",
                "u33 | CAPACITANCE | 0.33e-6",
                "µ33 | CAPACITANCE | 0.33e-6",
                "22 uF | CAPACITANCE | 22e-6",
                "22µF | CAPACITANCE | 22e-6",
                "0.6 mH | INDUCTANCE | 0.6e-3",
                "1.2 mA | CURRENT | 1.2e-3",
                "1.2mA | CURRENT | 1.2e-3",
                "1e-3 A | CURRENT | 1e-3",
                "27 degC | TEMPERATURE | 300.15",
                "27 °C | TEMPERATURE | 300.15",
                "300 K | TEMPERATURE | 300",
                "10 K | TEMPERATURE_STEP | 10",
                "20 kHz | FREQUENCY | 20000",
                "5 nV/rtHz | VOLTAGE_DENSITY | 5e-9",
                "5 nV/√Hz | VOLTAGE_DENSITY | 5e-9",
                "0.5 pA/rtHz | CURRENT_DENSITY | 0.5e-12",
                "1.8 mV/Pa | SENSITIVITY | 1.8e-3",
                "28 V/(m/s) | SENSITIVITY | 28",
                "-128 dBu | LEVEL | -128",
                "-20 dB | DECIBELS | -20",
                "5 % | PERCENT | 0.05",
                "48 V | VOLTAGE | 48",
                "14 mS | CONDUCTANCE | 14e-3",
                "0.01 1/V | INVERSE_VOLTAGE | 0.01",
                "100 pF/m | CAPACITANCE_PER_LENGTH | 100e-12"
            })
    void readsEverySpelling(String text, Dimension dimension, double value) throws Quantities.NotAQuantity {
        assertThat(parse(text, dimension)).isEqualTo(value);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "150 | RESISTANCE | has no unit in \"150\"; write it like \"150 ohm\"",
                "22 uF | RESISTANCE | must be a resistance, but \"uF\" in \"22 uF\" is the unit of a capacitance;"
                        + " write it like \"150 ohm\"",
                "1,5 mA | CURRENT | has a decimal comma in \"1,5 mA\"; write a decimal point, as in \"1.5 mA\"",
                "1.2 m A | CURRENT | has an unknown unit \"m A\" in \"1.2 m A\"; write it like \"1.2 mA\"",
                "much | CURRENT | must be a current, was \"much\"; write it like \"1.2 mA\"",
                "NaN ohm | RESISTANCE | must be a resistance, was \"NaN ohm\"; write it like \"150 ohm\"",
                "3 furlong | LENGTH | has an unknown unit \"furlong\" in \"3 furlong\"; write it like \"4.5 m\"",
                "20 mdB | DECIBELS | has an unknown unit \"mdB\" in \"20 mdB\"; write it like \"-20 dB\""
            })
    void saysWhatIsWrongAndWhatWouldBeRight(String text, Dimension dimension, String sentence) {
        Throwable fault = catchThrowable(() -> parse(text, dimension));
        assertThat(fault).isInstanceOf(Quantities.NotAQuantity.class).hasMessage(sentence);
    }

    @Test
    void anEmptyTextIsNoValue() {
        assertThat(catchThrowable(() -> parse(" ", Dimension.CURRENT)))
                .hasMessage("must not be empty; write it like \"1.2 mA\"");
    }

    @ParameterizedTest
    @CsvSource({
        "4700, Ω, 3, 4.70 kΩ",
        "2.146e-9, V/√Hz, 3, 2.15 nV/√Hz",
        "999.96, Hz, 3, 1.00 kHz",
        "999.4, Hz, 3, 999 Hz",
        "0, V, 3, 0 V",
        "-0.0123, V, 3, -12.3 mV",
        "1e-18, A, 3, 0.00100 fA",
        "5e15, Ω, 3, 5000 TΩ",
        "102.3, K, 3, 102 K",
        "12345, K, 3, 12300 K",
        "-20.5, dB, 3, -20.5 dB"
    })
    void printsEngineeringNotation(double value, String unit, int digits, String text) {
        assertThat(Quantities.format(value, unit, digits)).isEqualTo(text);
    }

    @Test
    void briefLeavesOutZerosAtTheEnd() {
        assertThat(Quantities.brief(4700.0, "Ω", 4)).isEqualTo("4.7 kΩ");
        assertThat(Quantities.brief(200.0, "Ω", 4)).isEqualTo("200 Ω");
        assertThat(Quantities.prefixed(20_000.0, 3)).isEqualTo("20 k");
        assertThat(Quantities.prefixed(500.0, 3)).isEqualTo("500");
    }

    /** What is printed reads back as the same value, to the digits printed. */
    @Test
    void whatIsPrintedReadsBack() {
        double lastDigit = 0.5e-3;
        forAll(2_000, random -> {
            double value = Math.pow(10.0, random.nextDouble(-14.0, 12.0));
            String text = Quantities.format(value, "Ω", 4);
            try {
                assertThat(parse(text, Dimension.RESISTANCE) / value).isCloseTo(1.0, within(lastDigit));
            } catch (Quantities.NotAQuantity fault) {
                throw new AssertionError(text, fault);
            }
        });
    }

    @Test
    void numbersDoNotDependOnTheLocale() {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.GERMANY);
            assertThat(Quantities.format(1.5, "V", 3)).isEqualTo("1.50 V");
        } finally {
            Locale.setDefault(before);
        }
    }
}
