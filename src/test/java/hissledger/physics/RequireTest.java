package hissledger.physics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class RequireTest {
    @ParameterizedTest
    @ValueSource(doubles = {Double.MIN_VALUE, 1.0, Double.MAX_VALUE})
    void acceptsAndReturnsWhatIsInRange(double value) {
        assertThat(Require.positive("x", value, "V")).isEqualTo(value);
        assertThat(Require.notNegative("x", value, "V")).isEqualTo(value);
        assertThat(Require.finite("x", -value, "V")).isEqualTo(-value);
    }

    @Test
    void zeroIsNotPositiveButNotNegative() {
        assertThat(Require.notNegative("x", 0.0, "V")).isZero();
        assertThat(Require.finite("x", 0.0, "V")).isZero();
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Require.positive("cornerHertz", 0.0, "Hz"))
                .withMessage("cornerHertz must be finite and > 0 Hz, was 0.0");
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void whatIsNoNumberFailsEveryCheck(double value) {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Require.positive("cornerHertz", value, "Hz"))
                .withMessage("cornerHertz must be finite and > 0 Hz, was " + value);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Require.notNegative("seriesOhms", value, "Ω"))
                .withMessage("seriesOhms must be finite and >= 0 Ω, was " + value);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Require.finite("directVolts", value, "V"))
                .withMessage("directVolts must be finite (V), was " + value);
    }

    @Test
    void aPureNumberHasNoUnitInItsMessage() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Require.positive("gain", -3.0, ""))
                .withMessage("gain must be finite and > 0, was -3.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Require.notNegative("lossTangent", -0.5, ""))
                .withMessage("lossTangent must be finite and >= 0, was -0.5");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Require.finite("exponent", Double.NaN, ""))
                .withMessage("exponent must be finite, was NaN");
    }

    @Test
    void countsHaveALeastValue() {
        assertThat(Require.atLeast("order", 1, 1)).isEqualTo(1);
        assertThat(Require.atLeast("order", 7, 1)).isEqualTo(7);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Require.atLeast("order", 0, 1))
                .withMessage("order must be >= 1, was 0");
    }
}
