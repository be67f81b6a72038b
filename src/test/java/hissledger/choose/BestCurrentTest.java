package hissledger.choose;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hissledger.circuit.Arrangement;
import hissledger.circuit.CommonLead;
import hissledger.circuit.Passive;
import hissledger.circuit.ResistorSource;
import hissledger.circuit.Signal;
import hissledger.circuit.SingleStage;
import hissledger.circuit.StagePlan;
import hissledger.circuit.Surroundings;
import hissledger.device.Basis;
import hissledger.device.BiasedBipolar;
import hissledger.device.BipolarModel;
import hissledger.device.Device;
import hissledger.device.DeviceKind;
import hissledger.device.DeviceParameter;
import hissledger.device.GainPoint;
import hissledger.device.GainSheet;
import hissledger.device.Parameter;
import hissledger.device.Polarity;
import hissledger.ledger.BandWalk;
import hissledger.physics.Band;
import hissledger.physics.Decibels;
import hissledger.physics.Thermal;
import hissledger.physics.Weighting;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class BestCurrentTest {
    private static final double KELVIN = 300.0;

    /** A load so large that its noise vanishes: without any, the gain is infinite and a bench could measure nothing. */
    private static final Surroundings LOADED =
            new Surroundings(CommonLead.grounded(), Optional.of(Passive.Resistor.of(1e12)), Optional.empty(), false);

    private static Design design(double sourceOhms, double gain, double baseOhms, CurrentRange range) {
        Device device = new Device(
                "ideal",
                DeviceKind.BIPOLAR,
                Polarity.NPN,
                "",
                "",
                "",
                Optional.of(new GainSheet(
                        List.of(new GainPoint(
                                1e-3, OptionalDouble.empty(), OptionalDouble.of(gain), OptionalDouble.empty())),
                        Basis.INVENTED,
                        "",
                        "")),
                Map.of(DeviceParameter.BASE_RESISTANCE, Parameter.typical(baseOhms, Basis.INVENTED)),
                List.of());
        StagePlan plan = new StagePlan(Arrangement.COMMON_EMITTER, 1, LOADED);
        Candidate candidate = new Candidate("ideal", device, plan, CurrentChoice.Optimum.usual(), List.of());
        BipolarModel model = BipolarModel.ideal(gain, baseOhms);
        return new Design(
                candidate,
                new ResistorSource(sourceOhms, KELVIN, Signal.none()),
                List.of(),
                amps -> new SingleStage(new BiasedBipolar(model, amps, KELVIN), 1, LOADED),
                range,
                List.of(),
                KELVIN);
    }

    private static final CurrentRange WIDE = new CurrentRange(1e-6, "low", 0.1, "high");

    /**
     * Set X of the laws: IC = (VT/(Rs + rbb')) β/√(1 + β), the exact low-frequency optimum (Proc. IEEE 82 (1994) 1515, from
     * memory; each value confirmed by numerical minimisation when the table was made).
     */
    @ParameterizedTest
    @CsvSource({
        "150, 300, 30, 0.002483474159",
        "200, 500, 40, 0.002406212859",
        "1000, 200, 100, 0.0003315380856",
        "10000, 400, 200, 5.062695147e-05",
        "50, 150, 10, 0.005259514766"
    })
    void findsTheExactOptimum(double sourceOhms, double gain, double baseOhms, double amps) {
        double closedForm = Thermal.voltageVolts(KELVIN) / (sourceOhms + baseOhms) * gain / Math.sqrt(1.0 + gain);
        BestCurrent.Optimum found =
                BestCurrent.of(design(sourceOhms, gain, baseOhms, WIDE), Band.AUDIO, Weighting.FLAT);
        double asPrinted = 1e-9;
        double asSearched = 1e-6;
        assertThat(closedForm / amps).isCloseTo(1.0, within(asPrinted));
        assertThat(found.amps() / amps).isCloseTo(1.0, within(asSearched));
        assertThat(found.bound()).isEmpty();
        assertThat(found.otherMinimaAmps()).isEmpty();
    }

    @Test
    void theFlatZoneCostsATenthOfADecibelAtItsEdges() {
        Design design = design(150.0, 300.0, 30.0, WIDE);
        BestCurrent.Optimum found = BestCurrent.of(design, Band.AUDIO, Weighting.FLAT);
        BandWalk walk = BandWalk.over(design.at(found.amps()), Band.AUDIO);
        double best = level(design, walk, found.amps());
        double edge = 1e-4;
        assertThat(level(design, walk, found.flatFromAmps()) - best).isCloseTo(0.1, within(edge));
        assertThat(level(design, walk, found.flatToAmps()) - best).isCloseTo(0.1, within(edge));
        assertThat(found.flatFromAmps()).isLessThan(found.amps());
        assertThat(found.flatToAmps()).isGreaterThan(found.amps());
    }

    /** The penalty for m times the best current turns the two current terms into (m + 1/m)/2: 0.2 to 0.3 dB at m = 4. */
    @Test
    void fourTimesTooMuchCostsAFewTenths() {
        Design design = design(150.0, 300.0, 30.0, WIDE);
        double amps = BestCurrent.of(design, Band.AUDIO, Weighting.FLAT).amps();
        BandWalk walk = BandWalk.over(design.at(amps), Band.AUDIO);
        double best = level(design, walk, amps);
        assertThat(level(design, walk, 4.0 * amps) - best).isBetween(0.2, 0.3);
        assertThat(level(design, walk, amps / 4.0) - best).isBetween(0.2, 0.3);
    }

    @Test
    void tellsWhatHoldsItBack() {
        CurrentRange low = new CurrentRange(1e-6, "low", 1e-3, "IDSS of something");
        CurrentRange high = new CurrentRange(1e-2, "range given in the scenario", 0.1, "high");
        BestCurrent.Optimum above = BestCurrent.of(design(150.0, 300.0, 30.0, low), Band.AUDIO, Weighting.FLAT);
        BestCurrent.Optimum below = BestCurrent.of(design(150.0, 300.0, 30.0, high), Band.AUDIO, Weighting.FLAT);
        assertThat(above.bound()).contains("IDSS of something");
        assertThat(above.amps()).isEqualTo(1e-3);
        assertThat(above.flatToAmps()).isEqualTo(1e-3);
        assertThat(below.bound()).contains("range given in the scenario");
        assertThat(below.amps()).isEqualTo(1e-2);
    }

    @Test
    void refusesARangeThatLeavesNothing() {
        assertThat(org.assertj.core.api.Assertions.catchThrowable(() -> WIDE.atLeast(1.0, "given")))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("no current is left to choose: at least 1.0 A (given) and at most 0.1 A (high)");
    }

    private static double level(Design design, BandWalk walk, double amps) {
        walk.walk(design.at(amps));
        return Decibels.ofPowerRatio(walk.einVoltsSquared(Weighting.FLAT));
    }
}
