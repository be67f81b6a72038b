package hissledger.chart;

import hissledger.choose.Candidate;
import hissledger.choose.Comparison;
import hissledger.choose.CurrentChoice;
import hissledger.choose.ResistanceSweep;
import hissledger.choose.Scenario;
import hissledger.choose.Target;
import hissledger.circuit.Arrangement;
import hissledger.circuit.CapacitorSource;
import hissledger.circuit.CommonLead;
import hissledger.circuit.Passive;
import hissledger.circuit.ResistorSource;
import hissledger.circuit.Signal;
import hissledger.circuit.Source;
import hissledger.circuit.StagePlan;
import hissledger.circuit.Surroundings;
import hissledger.device.Basis;
import hissledger.device.Device;
import hissledger.device.DeviceKind;
import hissledger.device.DeviceParameter;
import hissledger.device.GainPoint;
import hissledger.device.GainSheet;
import hissledger.device.Parameter;
import hissledger.device.Polarity;
import hissledger.ledger.Figure;
import hissledger.physics.Band;
import hissledger.physics.Decibels;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** Comparisons of invented devices to be drawn. */
final class Comparisons {
    static final Source MICROPHONE = new ResistorSource(150.0, 293.15, Signal.none());
    static final Source SILENT_CAPSULE =
            new CapacitorSource(50e-12, 0.0, Double.POSITIVE_INFINITY, 293.15, Signal.none());
    static final double LIMIT_DBU = -128.0;

    private static final double KELVIN = 300.15;
    private static final int POINTS_PER_DECADE = 6;
    private static final Surroundings LOADED =
            new Surroundings(CommonLead.grounded(), Optional.of(Passive.Resistor.of(2700.0)), Optional.empty(), false);

    private Comparisons() {}

    /** A bipolar transistor, a JFET and a pair of JFETs, with a limit to the flat EIN. */
    static Comparison usual() {
        return of(MICROPHONE, Figure.EIN_FLAT, usualCandidates());
    }

    static List<Candidate> usualCandidates() {
        return List.of(
                new Candidate(
                        "NPN",
                        bipolar("npn-1", 300.0, 3.0),
                        new StagePlan(Arrangement.COMMON_EMITTER, 1, LOADED),
                        CurrentChoice.Optimum.usual(),
                        List.of()),
                new Candidate(
                        "JFETs",
                        jfet("njf-1"),
                        new StagePlan(Arrangement.COMMON_SOURCE, 2, LOADED),
                        new CurrentChoice.Given(5e-3),
                        List.of()),
                new Candidate(
                        "JFET pair",
                        jfet("njf-2"),
                        new StagePlan(Arrangement.DIFFERENTIAL_PAIR, 1, LOADED),
                        new CurrentChoice.Given(2.5e-3),
                        List.of()),
                new Candidate(
                        "chip",
                        amplifier("amp-1"),
                        new StagePlan(Arrangement.AMPLIFIER, 1, Surroundings.none()),
                        new CurrentChoice.None(),
                        List.of()));
    }

    /** Many candidates whose names are longer than any column. */
    static Comparison crowded(int candidates) {
        List<Candidate> many = new ArrayList<>();
        for (int k = 0; k < candidates; k++) {
            many.add(new Candidate(
                    "candidate " + k + " with a name of manycharactersandnoblankthatnobodywouldreadaloud, revised",
                    bipolar("a-device-of-long-name-" + k, 300.0, 5.0 + 4.0 * k),
                    new StagePlan(Arrangement.COMMON_EMITTER, 1 + k, LOADED),
                    new CurrentChoice.Given(1e-3),
                    List.of()));
        }
        return of(MICROPHONE, Figure.EIN_A, many);
    }

    static Comparison of(Source source, Figure figure, List<Candidate> candidates) {
        return Comparison.of(
                new Scenario(
                        "Microphone before a long cable, the question of the review that was put off twice already",
                        "",
                        KELVIN,
                        Band.AUDIO,
                        List.of(1000.0),
                        new Target(Map.of(Figure.EIN_FLAT, Decibels.dbuToVolts(LIMIT_DBU))),
                        source,
                        List.of(),
                        candidates),
                figure);
    }

    static List<ResistanceSweep> sweeps(Comparison comparison) {
        return comparison.ranked().stream()
                .map(evaluation -> ResistanceSweep.of(
                        comparison.scenario(),
                        evaluation,
                        ResistanceSweep.grid(POINTS_PER_DECADE),
                        comparison.figure().weighting()))
                .toList();
    }

    static List<Double> floor(Comparison comparison) {
        return ResistanceSweep.floorVolts(
                comparison.scenario(),
                comparison.winner(),
                ResistanceSweep.grid(POINTS_PER_DECADE),
                comparison.figure().weighting());
    }

    static Plate resistancePlate(Comparison comparison) {
        return ComparisonChart.resistancePlate(comparison, sweeps(comparison), floor(comparison));
    }

    private static Device bipolar(String id, double gain, double baseOhms) {
        GainSheet sheet = new GainSheet(
                List.of(new GainPoint(1e-3, OptionalDouble.empty(), OptionalDouble.of(gain), OptionalDouble.empty())),
                Basis.INVENTED,
                "",
                "");
        return device(
                id,
                DeviceKind.BIPOLAR,
                Polarity.NPN,
                Optional.of(sheet),
                Map.of(
                        DeviceParameter.BASE_RESISTANCE, typical(baseOhms),
                        DeviceParameter.BASE_FLICKER_CORNER, typical(200.0)));
    }

    private static Device jfet(String id) {
        return device(
                id,
                DeviceKind.JFET,
                Polarity.N_CHANNEL,
                Optional.empty(),
                Map.of(
                        DeviceParameter.DRAIN_SATURATION_CURRENT, typical(12e-3),
                        DeviceParameter.PINCH_OFF_VOLTAGE, typical(0.8),
                        DeviceParameter.GATE_LEAKAGE, typical(5e-12)));
    }

    private static Device amplifier(String id) {
        return device(
                id,
                DeviceKind.AMPLIFIER,
                Polarity.NONE,
                Optional.empty(),
                Map.of(
                        DeviceParameter.VOLTAGE_NOISE, typical(4e-9),
                        DeviceParameter.CURRENT_NOISE, typical(0.6e-12)));
    }

    private static Parameter typical(double value) {
        return Parameter.typical(value, Basis.INVENTED);
    }

    private static Device device(
            String id,
            DeviceKind kind,
            Polarity polarity,
            Optional<GainSheet> gain,
            Map<DeviceParameter, Parameter> parameters) {
        return new Device(id, kind, polarity, "", "", "", gain, parameters, List.of());
    }
}
