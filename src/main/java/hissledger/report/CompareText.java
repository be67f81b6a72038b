package hissledger.report;

import hissledger.choose.BestCurrent;
import hissledger.choose.Comparison;
import hissledger.choose.Crossover;
import hissledger.choose.CurrentChoice;
import hissledger.choose.Evaluation;
import hissledger.choose.Limits;
import hissledger.choose.Scenario;
import hissledger.choose.Target;
import hissledger.circuit.CapacitorSource;
import hissledger.circuit.Source;
import hissledger.circuit.TableSource;
import hissledger.device.Basis;
import hissledger.device.Device;
import hissledger.device.DeviceKind;
import hissledger.device.DeviceParameter;
import hissledger.files.Phrases;
import hissledger.ledger.Accounting;
import hissledger.ledger.Entry;
import hissledger.ledger.Figure;
import hissledger.ledger.Totals;
import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import java.util.stream.Collectors;

/** The comparison of candidates as text. */
public final class CompareText {
    private CompareText() {}

    /** The whole text, lines ended by line feeds. */
    public static String of(Comparison comparison) {
        Scenario scenario = comparison.scenario();
        StringBuilder text = new StringBuilder();
        line(text, scenario.title());
        Words.conditions(scenario).forEach(condition -> line(text, condition));
        line(text, "Sorted by " + comparison.figure().words() + ", quietest first.");
        target(scenario.target()).forEach(limit -> line(text, limit));
        Words.limits(scenario.limits()).ifPresent(limit -> line(text, limit));
        line(text, "");
        text.append(table(comparison).render());
        line(text, "");
        decision(comparison).forEach(sentence -> Words.wrapped(sentence).forEach(part -> line(text, part)));
        List<String> currents = new ArrayList<>();
        bestCurrents(comparison.ranked()).forEach(sentence -> currents.addAll(Words.wrapped(sentence)));
        cautions(comparison.ranked()).forEach(caution -> currents.addAll(Words.wrapped(caution)));
        if (!currents.isEmpty()) {
            line(text, "");
            currents.forEach(sentence -> line(text, sentence));
        }
        List<String> remarks = remarks(comparison.ranked());
        if (!remarks.isEmpty()) {
            line(text, "");
            remarks.forEach(remark -> line(text, remark));
        }
        return text.toString();
    }

    private static void line(StringBuilder text, String line) {
        text.append(line).append('\n');
    }

    /** The limits of a target, one line. */
    static List<String> target(Target target) {
        if (target.limits().isEmpty()) {
            return List.of();
        }
        List<String> limits = new ArrayList<>();
        for (Map.Entry<Figure, Double> limit : target.inOrder().entrySet()) {
            Figure figure = limit.getKey();
            double value = figure.isEin() ? Decibels.dbu(limit.getValue()) : limit.getValue();
            limits.add(figure.words() + " at most " + Words.decibels(value) + " " + figure.unit());
        }
        return List.of("Target: " + String.join("; ", limits) + ".");
    }

    private static TextTable table(Comparison comparison) {
        Scenario scenario = comparison.scenario();
        boolean flatOrA = comparison.figure() == Figure.EIN_FLAT || comparison.figure() == Figure.EIN_A;
        TextTable table = new TextTable()
                .column(TextTable.Align.LEFT, "candidate")
                .column(TextTable.Align.LEFT, "device")
                .column(TextTable.Align.POINT, "current", "of each")
                .column(TextTable.Align.POINT, "EIN flat", "dBu")
                .column(TextTable.Align.POINT, "EIN A", "dBu")
                .column(TextTable.Align.POINT, "above", "floor dB")
                .column(TextTable.Align.POINT, "band", "NF dB")
                .column(TextTable.Align.POINT, "to " + Phrases.brief(Accounting.LOW_BAND_TO_HERTZ, "Hz"), "EIN dBu")
                .column(
                        TextTable.Align.LEFT,
                        "strongest entry, " + comparison.figure().weighting().label(),
                        "(removing it saves)")
                .column(TextTable.Align.POINT, "total", "current");
        if (!flatOrA) {
            table.column(
                    TextTable.Align.POINT,
                    comparison.figure().words(),
                    comparison.figure().unit());
        }
        if (!scenario.target().limits().isEmpty()) {
            table.column(TextTable.Align.POINT, "margin", "dB");
        }
        for (Evaluation evaluation : comparison.ranked()) {
            List<String> cells = new ArrayList<>(row(evaluation));
            if (!flatOrA) {
                cells.add(figure(evaluation, comparison.figure()));
            }
            if (!scenario.target().limits().isEmpty()) {
                cells.add(margin(evaluation.marginDecibels(scenario.target())));
            }
            table.row(cells.toArray(String[]::new));
        }
        return table;
    }

    private static List<String> row(Evaluation evaluation) {
        Totals totals = evaluation.ledger().totals();
        Entry strongest = evaluation.ledger().dominating();
        OptionalDouble low = totals.lowBandVolts();
        return List.of(
                evaluation.name(),
                Words.device(evaluation),
                current(evaluation),
                Words.dbu(totals.ein(Weighting.FLAT)),
                Words.dbu(totals.ein(Weighting.A)),
                Words.decibels(totals.aboveFloorDecibels()),
                Words.decibels(totals.noiseFigureDecibels()),
                low.isPresent() ? Words.dbu(low.getAsDouble()) : "-",
                strongest.name() + " (" + Words.decibels(strongest.savesDecibels()) + " dB)",
                evaluation.ledger().frontEnd().stage().deviceAmps().isPresent()
                        ? Words.value(evaluation.ledger().frontEnd().stage().totalAmps(), "A")
                        : "-");
    }

    private static String current(Evaluation evaluation) {
        if (evaluation.ledger().frontEnd().stage().deviceAmps().isEmpty()) {
            return "-";
        }
        String amps = Words.current(evaluation);
        return evaluation.optimum().isPresent() ? amps + " best" : amps;
    }

    private static String figure(Evaluation evaluation, Figure figure) {
        OptionalDouble value = evaluation.ledger().figure(figure);
        if (value.isEmpty()) {
            return Words.NOT_DEFINED;
        }
        return figure.isEin() ? Words.dbu(value.getAsDouble()) : Words.decibels(value.getAsDouble());
    }

    private static String margin(OptionalDouble margin) {
        if (margin.isEmpty()) {
            return "-";
        }
        return (margin.getAsDouble() >= 0.0 ? "+" : "") + Words.decibels(margin.getAsDouble());
    }

    /** Who wins, by how much, and where the kinds change places. */
    static List<String> decision(Comparison comparison) {
        List<String> sentences = new ArrayList<>();
        Evaluation winner = comparison.winner();
        String figure = comparison.figure().words();
        if (comparison.leadDecibels().isPresent()) {
            double lead = comparison.leadDecibels().getAsDouble();
            String runnerUp = quoted(comparison.ranked().get(1));
            sentences.add("Quietest: " + quoted(winner) + ", "
                    + (Words.isLevel(lead)
                            ? "level with " + runnerUp + " within 0.01 dB"
                            : "by " + Words.decibels(lead) + " dB over " + runnerUp)
                    + " (" + figure + ").");
        } else {
            sentences.add("One candidate: " + quoted(winner) + ".");
        }
        limits(comparison, sentences);
        comparison.crossover().ifPresent(crossover -> sentences.add(crossover(comparison, crossover)));
        return sentences;
    }

    /** Which candidates break the limits of the scenario, and who is quietest without them. */
    private static void limits(Comparison comparison, List<String> sentences) {
        List<String> breaking = new ArrayList<>();
        for (Evaluation evaluation : comparison.ranked()) {
            List<Limits.Kind> broken = evaluation.broken(comparison.scenario().limits());
            if (!broken.isEmpty()) {
                breaking.add(quoted(evaluation) + " ("
                        + broken.stream().map(Limits.Kind::path).collect(Collectors.joining(", ")) + ")");
            }
        }
        if (breaking.isEmpty()) {
            return;
        }
        sentences.add(
                "Beyond the limits of the scenario: " + String.join(", ", breaking) + "; the verb optimum keeps them.");
        comparison
                .bestWithinLimits()
                .ifPresentOrElse(
                        best -> sentences.add("Quietest within the limits: " + quoted(best) + "."),
                        () -> sentences.add("No candidate keeps the limits."));
    }

    /** What a designer must know of the working points: a current that not every device carries, a gain beyond the sheet. */
    static List<String> cautions(List<Evaluation> evaluations) {
        List<String> cautions = new ArrayList<>();
        for (Evaluation evaluation : evaluations) {
            Device device = evaluation.candidate().device();
            double amps = evaluation.amps();
            if (device.kind() == DeviceKind.JFET) {
                double least = device.parameter(DeviceParameter.DRAIN_SATURATION_CURRENT)
                        .flatMap(idss ->
                                idss.min().isPresent() ? Optional.of(idss.min().getAsDouble()) : Optional.empty())
                        .orElse(Double.POSITIVE_INFINITY);
                if (amps > least) {
                    cautions.add("Caution: " + quoted(evaluation) + " runs at " + Words.value(amps, "A")
                            + " each, above the least IDSS of " + device.id() + ", " + Words.value(least, "A")
                            + ": not every device carries it.");
                }
            }
            device.currentGain()
                    .filter(gain -> gain.points().size() > 1)
                    .filter(gain -> amps < gain.points().get(0).currentAmps()
                            || amps
                                    > gain.points()
                                            .get(gain.points().size() - 1)
                                            .currentAmps())
                    .ifPresent(gain -> cautions.add("Caution: " + quoted(evaluation) + " runs at "
                            + Words.value(amps, "A")
                            + " each, where the current gain of " + device.id()
                            + " is continued beyond its published points, "
                            + Words.value(gain.points().get(0).currentAmps(), "A") + " to "
                            + Words.value(
                                    gain.points().get(gain.points().size() - 1).currentAmps(), "A") + "."));
        }
        return cautions;
    }

    private static String crossover(Comparison comparison, Crossover crossover) {
        String bipolar = quoted(crossover.bipolar());
        String jfet = quoted(crossover.jfet());
        Source source = comparison.scenario().source();
        String how = source instanceof CapacitorSource || source instanceof TableSource
                ? "With a plain resistor as the source"
                : "Best currents found anew at each resistance and all else unchanged";
        if (crossover.resistanceOhms().isEmpty()) {
            String quieter = crossover.bipolarQuieterAtLeastResistance() ? bipolar : jfet;
            return how + ", the best bipolar candidate " + bipolar + " and the best JFET candidate " + jfet
                    + " do not change places from 1 Ω to 10 MΩ: of these two the quieter is "
                    + quieter + " throughout.";
        }
        String places = crossover.resistanceOhms().stream()
                .map(ohms -> Words.value(ohms, "Ω"))
                .collect(Collectors.joining(" and "));
        String below = crossover.bipolarQuieterAtLeastResistance() ? bipolar : jfet;
        return how + ", the best bipolar candidate " + bipolar + " and the best JFET candidate " + jfet
                + " change places at a source resistance of " + places + "; below "
                + (crossover.resistanceOhms().size() == 1 ? "it" : "the first") + " the quieter is " + below + ".";
    }

    private static String quoted(Evaluation evaluation) {
        return "\"" + evaluation.name() + "\"";
    }

    /** How flat each best current is, and what held it back. */
    static List<String> bestCurrents(List<Evaluation> evaluations) {
        List<String> sentences = new ArrayList<>();
        for (Evaluation evaluation : evaluations) {
            if (evaluation.optimum().isEmpty()) {
                continue;
            }
            BestCurrent.Optimum optimum = evaluation.optimum().get();
            StringBuilder sentence = new StringBuilder("Best current of " + evaluation.name() + ": least "
                    + minimised(evaluation)
                    + " at " + Words.value(optimum.amps(), "A") + " each; EIN within 0.1 dB of its least from "
                    + Words.value(optimum.flatFromAmps(), "A") + " to " + Words.value(optimum.flatToAmps(), "A"));
            optimum.bound()
                    .ifPresent(bound -> sentence.append("; held back by: ").append(bound));
            if (!optimum.otherMinimaAmps().isEmpty()) {
                sentence.append("; another minimum at ")
                        .append(optimum.otherMinimaAmps().stream()
                                .map(amps -> Words.value(amps, "A"))
                                .collect(Collectors.joining(", ")));
            }
            sentences.add(sentence.append('.').toString());
        }
        return sentences;
    }

    private static String minimised(Evaluation evaluation) {
        return evaluation.candidate().current() instanceof CurrentChoice.Optimum open
                ? Words.ein(open.figure().weighting())
                : Words.ein(Weighting.FLAT);
    }

    /** Defaults used and values that rest on little, device by device. */
    static List<String> remarks(List<Evaluation> evaluations) {
        Map<String, Evaluation> byDevice = new TreeMap<>();
        evaluations.forEach(
                evaluation -> byDevice.put(evaluation.candidate().device().id(), evaluation));
        List<String> remarks = new ArrayList<>();
        byDevice.forEach((id, evaluation) -> {
            List<String> parts = new ArrayList<>();
            for (Basis basis : List.of(Basis.DERIVED, Basis.PRACTICE, Basis.MEMORY, Basis.INVENTED)) {
                List<String> resting = evaluation.candidate().device().resting(basis);
                if (!resting.isEmpty()) {
                    parts.add(basis.label() + ": " + String.join(", ", resting));
                }
            }
            parts.addAll(grouped(evaluation.design().defaultsUsed()));
            if (!parts.isEmpty()) {
                remarks.addAll(Words.wrapped("On " + id + ": " + String.join("; ", parts) + "."));
            }
        });
        return remarks;
    }

    /** Defaults of the same kind in one sentence: "taken as its max: Ccb, Ceb". */
    private static List<String> grouped(List<String> defaults) {
        Map<String, List<String>> byRule = new LinkedHashMap<>();
        for (String line : defaults) {
            int colon = line.indexOf(": ");
            byRule.computeIfAbsent(line.substring(colon + 2), rule -> new ArrayList<>())
                    .add(line.substring(0, colon));
        }
        List<String> groups = new ArrayList<>();
        byRule.forEach((rule, names) -> groups.add(String.join(", ", names) + " " + rule));
        return groups;
    }
}
