package hissledger.report;

import hissledger.choose.Evaluation;
import hissledger.choose.Limits;
import hissledger.choose.Scenario;
import hissledger.circuit.Signal;
import hissledger.circuit.StagePlan;
import hissledger.files.Phrases;
import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;

/** Values and conditions in words, the same in every report. */
final class Words {
    /** What is printed where a figure has no meaning. */
    static final String NOT_DEFINED = "not defined";

    /** Sentences are broken to this width. */
    private static final int LINE_WIDTH = 110;

    /** Half of the last decimal of a printed level, dB. */
    private static final double LEVEL_DECIBELS = 0.005;

    private Words() {}

    /** A physical value in engineering notation. */
    static String value(double value, String unit) {
        return Phrases.value(value, unit);
    }

    /** A level or ratio with two decimals. */
    static String decibels(double decibels) {
        return String.format(Locale.ROOT, "%.2f", decibels);
    }

    /** A level or ratio with two decimals, or the words for one that has no meaning. */
    static String decibels(OptionalDouble decibels) {
        return decibels.isPresent() ? decibels(decibels.getAsDouble()) : NOT_DEFINED;
    }

    /** Whether a difference vanishes in the decimals that are printed. */
    static boolean isLevel(double decibels) {
        return Math.abs(decibels) < LEVEL_DECIBELS;
    }

    /** A voltage as a level in dBu. */
    static String dbu(double volts) {
        return decibels(Decibels.dbu(volts));
    }

    /** The lines that head every report: what the figures below them refer to. */
    static List<String> conditions(Scenario scenario) {
        List<String> lines = new ArrayList<>(List.of(
                "Source: " + Phrases.source(scenario.source()) + ". Path and stage at "
                        + Phrases.temperature(scenario.temperatureKelvin()) + ".",
                "Band " + Phrases.band(scenario.band())
                        + ", unweighted unless said otherwise. EIN refers to the source's EMF and",
                "includes the source's own noise; NF refers to a source at 290 K."));
        signal(scenario.source().signal()).ifPresent(lines::add);
        return lines;
    }

    /** The limits of a scenario, one line; empty for none. */
    static Optional<String> limits(Limits limits) {
        List<String> parts = new ArrayList<>();
        limits.totalAmps().ifPresent(amps -> parts.add("current of all devices at most " + Phrases.brief(amps, "A")));
        limits.powerWatts()
                .ifPresent(watts -> parts.add("power at most " + Phrases.brief(watts, "W") + " from "
                        + Phrases.brief(limits.supplyVolts().orElse(0.0), "V")));
        limits.headroomVolts()
                .ifPresent(
                        volts -> parts.add("1 % harmonic not below an EMF of " + Phrases.value(volts, "V") + " rms"));
        limits.inputFarads().ifPresent(farads -> parts.add("input capacitance at most " + Phrases.brief(farads, "F")));
        return parts.isEmpty() ? Optional.empty() : Optional.of("Limits: " + String.join("; ", parts) + ".");
    }

    /** What the source gives, one line; empty where nothing is stated. */
    private static Optional<String> signal(Signal signal) {
        List<String> parts = new ArrayList<>();
        signal.voltsPerUnit()
                .ifPresent(volts -> parts.add("Sensitivity " + Phrases.brief(volts, "V/" + signal.unit())));
        signal.referenceVolts()
                .ifPresent(volts -> parts.add((parts.isEmpty() ? "Reference" : "reference") + " level: an EMF of "
                        + Phrases.brief(volts, "V") + " rms"));
        return parts.isEmpty() ? Optional.empty() : Optional.of(String.join("; ", parts) + ".");
    }

    /** Device and how many of them in all, both sides of a pair counted: "bf862 x4". */
    static String device(Evaluation evaluation) {
        StagePlan plan = evaluation.candidate().plan();
        int count = plan.arrangement().isPair() ? 2 * plan.inParallel() : plan.inParallel();
        String id = evaluation.candidate().device().id();
        return count == 1 ? id : id + " x" + count;
    }

    /** A sentence broken into lines, those after the first set in. */
    static List<String> wrapped(String sentence) {
        List<String> lines = new ArrayList<>();
        StringBuilder line = new StringBuilder();
        for (String word : sentence.split(" ", -1)) {
            if (line.length() + 1 + word.length() > LINE_WIDTH) {
                lines.add(line.toString());
                line = new StringBuilder("  ");
            }
            line.append(line.length() == 0 || line.toString().isBlank() ? "" : " ")
                    .append(word);
        }
        lines.add(line.toString());
        return lines;
    }

    /** The current of each device: as stated, or to three digits where a search found it. */
    static String current(Evaluation evaluation) {
        return evaluation.optimum().isPresent()
                ? Phrases.value(evaluation.amps(), "A")
                : Phrases.brief(evaluation.amps(), "A");
    }

    /** EIN under a weighting, in words. */
    static String ein(Weighting weighting) {
        return switch (weighting) {
            case FLAT -> "EIN flat";
            case A -> "EIN A-weighted";
            default -> "EIN with " + weighting.label();
        };
    }
}
