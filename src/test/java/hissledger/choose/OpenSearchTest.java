package hissledger.choose;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import hissledger.circuit.Arrangement;
import hissledger.circuit.CapacitorSource;
import hissledger.circuit.CommonLead;
import hissledger.circuit.Passive;
import hissledger.circuit.PathElement;
import hissledger.circuit.ResistorSource;
import hissledger.circuit.ShuntElement;
import hissledger.circuit.Signal;
import hissledger.circuit.Source;
import hissledger.circuit.StagePlan;
import hissledger.circuit.Surroundings;
import hissledger.circuit.Transformer;
import hissledger.device.Basis;
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

class OpenSearchTest {
    private static final double KELVIN = 290.0;
    private static final double NO_PART = Double.POSITIVE_INFINITY;
    private static final OptionalDouble FREE = OptionalDouble.empty();
    private static final Surroundings LOADED =
            new Surroundings(CommonLead.grounded(), Optional.of(Passive.Resistor.of(1e12)), Optional.empty(), true);

    private static Device bipolar(double gain, double baseOhms) {
        return new Device(
                "ideal",
                DeviceKind.BIPOLAR,
                Polarity.NPN,
                "",
                "",
                "",
                Optional.of(new GainSheet(
                        List.of(new GainPoint(1e-3, FREE, OptionalDouble.of(gain), FREE)), Basis.INVENTED, "", "")),
                Map.of(DeviceParameter.BASE_RESISTANCE, Parameter.typical(baseOhms, Basis.INVENTED)),
                List.of());
    }

    private static Device jfet(double inputFarads) {
        return new Device(
                "ideal-jfet",
                DeviceKind.JFET,
                Polarity.N_CHANNEL,
                "",
                "",
                "",
                Optional.empty(),
                Map.of(
                        DeviceParameter.DRAIN_SATURATION_CURRENT, Parameter.typical(5e-3, Basis.INVENTED),
                        DeviceParameter.PINCH_OFF_VOLTAGE, Parameter.typical(1.0, Basis.INVENTED),
                        DeviceParameter.GATE_LEAKAGE, Parameter.typical(0.0, Basis.INVENTED),
                        DeviceParameter.GATE_SOURCE_CAPACITANCE, Parameter.typical(inputFarads, Basis.INVENTED)),
                List.of());
    }

    private static Scenario scenario(Source source, List<PathElement> path, Candidate candidate, Limits limits) {
        return new Scenario(
                "search",
                "",
                KELVIN,
                Band.AUDIO,
                List.of(1000.0),
                Target.none(),
                source,
                path,
                List.of(candidate),
                limits);
    }

    private static Candidate candidate(
            Device device, Arrangement arrangement, CurrentChoice current, int inParallel, List<OpenValue> open) {
        return new Candidate(
                "searched", device, new StagePlan(arrangement, inParallel, LOADED), current, List.of(), open);
    }

    private static Transformer ideal(double ratio) {
        return new Transformer("step-up", ratio, 0.0, 0.0, NO_PART, 0.0, NO_PART, 0.0, KELVIN);
    }

    /** An ideal transformer's best ratio makes the source the optimum source resistance: n² = Ropt/Rs (identity E-m). */
    @Test
    void theBestRatioMatchesTheSourceToTheStage() {
        double gain = 200.0;
        double base = 30.0;
        double amps = 1e-3;
        double sourceOhms = 10.0;
        OpenValue.Ratio ratio = new OpenValue.Ratio("step-up", 1.0, 100.0);
        Candidate candidate = candidate(
                bipolar(gain, base), Arrangement.COMMON_EMITTER, new CurrentChoice.Given(amps), 1, List.of(ratio));
        OpenSearch.Outcome found = OpenSearch.of(
                scenario(
                        new ResistorSource(sourceOhms, KELVIN, Signal.none()),
                        List.of(ideal(10.0)),
                        candidate,
                        Limits.none()),
                candidate,
                Weighting.FLAT);
        // set X: Rs_opt = √(r² + 2βr/g + β²/(g²(1+β)))
        double g = amps / Thermal.voltageVolts(KELVIN);
        double optimum = Math.sqrt(base * base + 2.0 * gain * base / g + gain * gain / (g * g * (1.0 + gain)));
        double searched = 1e-3;
        assertThat(found.best().values().getOrDefault(ratio, 0.0) / Math.sqrt(optimum / sourceOhms))
                .isCloseTo(1.0, within(searched));
    }

    /** A capacitive source and JFETs in parallel at a given current each: the white optimum is where Cin equals Cs. */
    @Test
    void theBestCountMatchesTheInputCapacitanceToTheSource() {
        double source = 80e-12;
        double each = 10e-12;
        Candidate candidate = candidate(
                jfet(each),
                Arrangement.COMMON_SOURCE,
                new CurrentChoice.Given(1e-3),
                1,
                List.of(new OpenValue.Count(1, 20)));
        OpenSearch.Outcome found = OpenSearch.of(
                scenario(
                        new CapacitorSource(source, 0.0, NO_PART, KELVIN, Signal.none()),
                        List.of(),
                        candidate,
                        Limits.none()),
                candidate,
                Weighting.FLAT);
        assertThat(found.best().design().candidate().plan().inParallel()).isEqualTo((int) (source / each));
        assertThat(found.byCount()).hasSize(20);
    }

    /** A brute-force grid over ratio and current never beats the search. */
    @Test
    void aGridNeverBeatsTheSearch() {
        OpenValue.Ratio ratio = new OpenValue.Ratio("step-up", 1.0, 60.0);
        OpenValue.Resistance load = new OpenValue.Resistance("bias", 1e3, 1e6);
        Candidate candidate = candidate(
                bipolar(150.0, 40.0),
                Arrangement.COMMON_EMITTER,
                CurrentChoice.Optimum.usual(),
                1,
                List.of(ratio, load));
        Transformer real = new Transformer("step-up", 10.0, 1.0, 100.0, 2.0, 1e-3, 5e3, 100e-12, KELVIN);
        Scenario scenario = scenario(
                new ResistorSource(20.0, KELVIN, Signal.none()),
                List.of(real, new ShuntElement("bias", Passive.Resistor.of(47e3), 1, KELVIN)),
                candidate,
                Limits.none());
        OpenSearch.Outcome found = OpenSearch.of(scenario, candidate, Weighting.A);
        Design start = Design.of(scenario, candidate);
        BandWalk walk = BandWalk.over(start.at(1e-3), Band.AUDIO);
        double least = Double.POSITIVE_INFINITY;
        int steps = 100;
        for (int r = 0; r < steps; r++) {
            for (int b = 0; b < steps / 5; b++) {
                Design design = start.with(ratio, Math.pow(60.0, r / (steps - 1.0)))
                        .with(load, 1e3 * Math.pow(1e3, b / (steps / 5.0 - 1.0)));
                for (int i = 0; i < steps / 2; i++) {
                    walk.walk(design.at(1e-5 * Math.pow(1e4, i / (steps / 2.0 - 1.0))));
                    least = Math.min(least, Math.sqrt(walk.einVoltsSquared(Weighting.A)));
                }
            }
        }
        // the grid's nodes are those of the starting design: equal to the search's to the accuracy of the integrals
        double integrals = 1e-6;
        assertThat(found.best().einVolts()).isLessThan(least * (1.0 + integrals));
        OpenSearch.Zone zone = Optional.ofNullable(found.zones().get(ratio)).orElseThrow();
        double inside = found.best().values().getOrDefault(ratio, 0.0);
        assertThat(inside).isBetween(zone.from(), zone.to());
    }

    @Test
    void currentAndHeadroomLimitsAreRespected() {
        Candidate candidate = candidate(
                bipolar(300.0, 10.0),
                Arrangement.COMMON_EMITTER,
                CurrentChoice.Optimum.usual(),
                1,
                List.of(new OpenValue.Count(1, 6)));
        Limits limits = new Limits(OptionalDouble.of(2e-3), FREE, FREE, FREE, FREE);
        ResistorSource source = new ResistorSource(50.0, KELVIN, Signal.none());
        OpenSearch.Outcome found =
                OpenSearch.of(scenario(source, List.of(), candidate, limits), candidate, Weighting.FLAT);
        for (OpenSearch.Choice choice : found.byCount()) {
            assertThat(choice.amps() * choice.design().deviceCount()).isLessThanOrEqualTo(2e-3 * (1.0 + 1e-12));
        }
        assertThat(found.currentSearch().orElseThrow().bound()).contains("current or power limit of the scenario");

        Limits impossible = new Limits(FREE, FREE, FREE, OptionalDouble.of(1.0), FREE);
        assertThatExceptionOfType(ImpossibleLimitsException.class)
                .isThrownBy(() ->
                        OpenSearch.of(scenario(source, List.of(), candidate, impossible), candidate, Weighting.FLAT))
                .satisfies(refused -> {
                    double enough = refused.relief()
                            .getOrDefault(Limits.Kind.HEADROOM, Optional.empty())
                            .orElseThrow();
                    assertThat(reaches(candidate, source, enough)).isTrue();
                    assertThat(reaches(candidate, source, enough * 1.02)).isFalse();
                });
    }

    private static boolean reaches(Candidate candidate, ResistorSource source, double headroom) {
        Limits limits = new Limits(FREE, FREE, FREE, OptionalDouble.of(headroom), FREE);
        try {
            OpenSearch.of(scenario(source, List.of(), candidate, limits), candidate, Weighting.FLAT);
            return true;
        } catch (ImpossibleLimitsException refused) {
            return false;
        }
    }

    @Test
    void anInputCapacitanceLimitCutsTheCount() {
        Candidate candidate = candidate(
                jfet(10e-12),
                Arrangement.COMMON_SOURCE,
                new CurrentChoice.Given(1e-3),
                1,
                List.of(new OpenValue.Count(1, 20)));
        Limits limits = new Limits(FREE, FREE, FREE, FREE, OptionalDouble.of(35e-12));
        OpenSearch.Outcome found = OpenSearch.of(
                scenario(
                        new CapacitorSource(80e-12, 0.0, NO_PART, KELVIN, Signal.none()), List.of(), candidate, limits),
                candidate,
                Weighting.FLAT);
        assertThat(found.best().design().candidate().plan().inParallel()).isEqualTo(3);
    }

    /** A rise of rbb' by 1 % moves the EIN as its share says: 10 log10(1 + share · 1 %), to the first order. */
    @Test
    void sensitivityToBaseResistanceIsItsShare() {
        double base = 40.0;
        Candidate candidate =
                candidate(bipolar(1e9, base), Arrangement.COMMON_EMITTER, new CurrentChoice.Given(1e-2), 1, List.of());
        Scenario scenario =
                scenario(new ResistorSource(60.0, KELVIN, Signal.none()), List.of(), candidate, Limits.none());
        List<Sensitivity> found = Sensitivity.of(scenario, Design.of(scenario, candidate), 1e-2, Weighting.FLAT);
        Sensitivity ofBase = found.stream()
                .filter(each -> each.name().equals(DeviceParameter.BASE_RESISTANCE.words()))
                .findFirst()
                .orElseThrow();
        double half = 0.5 * Thermal.voltageVolts(KELVIN) / 1e-2;
        double share = base / (60.0 + base + half);
        double firstOrder = 1e-4;
        assertThat(ofBase.perPercentDecibels())
                .isCloseTo(Decibels.ofPowerRatio(1.0 + 0.01 * share), within(firstOrder));
        assertThat(found.get(0)).isEqualTo(ofBase);
    }
}
