package hissledger.physics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class BandTest {
    /** An exponential of a rounded logarithm, re the value. */
    private static final double ROUNDING = 1e-14;

    @Test
    void theAudioBandIsTwentyHertzToTwentyKilohertz() {
        assertThat(Band.AUDIO).isEqualTo(new Band(20.0, 20_000.0));
        assertThat(Band.AUDIO.widthHertz()).isEqualTo(19_980.0);
    }

    @Test
    void holdsItsEdges() {
        assertThat(Band.AUDIO.contains(20.0)).isTrue();
        assertThat(Band.AUDIO.contains(20_000.0)).isTrue();
        assertThat(Band.AUDIO.contains(1000.0)).isTrue();
        assertThat(Band.AUDIO.contains(19.999)).isFalse();
        assertThat(Band.AUDIO.contains(20_000.001)).isFalse();
        assertThat(Band.AUDIO.contains(Double.NaN)).isFalse();
    }

    @Test
    void logarithmicFrequenciesHaveEqualRatios() {
        double[] hertz = Band.AUDIO.logarithmicHertz(31);
        assertThat(hertz).hasSize(31).isSorted();
        assertThat(hertz[0]).isEqualTo(20.0);
        assertThat(hertz[30]).isEqualTo(20_000.0);
        for (int k = 1; k < hertz.length; k++) {
            assertThat(hertz[k] / hertz[k - 1]).isCloseTo(Math.pow(10.0, 0.1), within(ROUNDING));
        }
        assertThat(Band.AUDIO.logarithmicHertz(2)).containsExactly(20.0, 20_000.0);
    }

    @Test
    void refusesABandThatIsNone() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Band(100.0, 100.0))
                .withMessage("toHertz must be above fromHertz, was 100.0 Hz against 100.0 Hz");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Band(0.0, 100.0))
                .withMessage("fromHertz must be finite and > 0 Hz, was 0.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Band(20.0, Double.NaN))
                .withMessage("toHertz must be finite and > 0 Hz, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Band.AUDIO.logarithmicHertz(1))
                .withMessage("count must be >= 2, was 1");
    }
}
