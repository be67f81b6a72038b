package hissledger.cli;

import hissledger.choose.Candidate;
import hissledger.choose.Comparison;
import hissledger.choose.Evaluation;
import hissledger.choose.Scenario;
import hissledger.files.InputException;
import hissledger.files.Nearest;
import hissledger.ledger.Entry;
import hissledger.ledger.EntrySpectrum;
import hissledger.ledger.Figure;
import hissledger.report.Csv;
import hissledger.report.LedgerText;
import hissledger.report.ResultTree;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The itemised account. */
@Command(
        name = "ledger",
        mixinStandardHelpOptions = true,
        sortOptions = false,
        description =
                "The itemised account: every noise generator between the source and the next stage, largest first.",
        footer = {
            "",
            "Examples:",
            "  hissledger ledger scenarios/vocal-dynamic.json --candidate \"PNP switch\"",
            "  hissledger ledger scenarios/vocal-dynamic.json --entry \"base resistance\""
        })
final class LedgerVerb implements Callable<Integer> {
    @Mixin
    private Inputs inputs = new Inputs();

    @Option(names = "--candidate", paramLabel = "NAME", description = "only this candidate; all of them if left out")
    private Optional<String> only = Optional.empty();

    @Option(
            names = "--full",
            description = "every figure: noise parameters, impedances, all weightings, running integral")
    private boolean full;

    @Option(
            names = "--by",
            paramLabel = "FIGURE",
            description = "sum and sort the entries under the weighting of this figure; einFlat if left out")
    private Optional<String> by = Optional.empty();

    @Option(names = "--entry", paramLabel = "NAME", description = "only this entry, against frequency")
    private Optional<String> entry = Optional.empty();

    @Mixin
    private Outputs outputs = new Outputs();

    @Option(names = "--check", description = "exit with 1 if a candidate misses the target of the scenario")
    private boolean check;

    @Spec
    private CommandSpec spec = CommandSpec.create();

    @Override
    public Integer call() throws InputException {
        outputs.check();
        Scenario scenario = selected(inputs.read());
        Figure figure = by.isPresent() ? Arguments.figure(spec, by.get()) : Figure.EIN_FLAT;
        List<Evaluation> evaluations = Comparison.evaluate(scenario, figure.weighting());
        if (entry.isPresent()) {
            writeEntry(scenario, evaluations, entry.get());
        } else {
            outputs.write(
                    spec.commandLine().getOut(),
                    LedgerText.of(scenario, evaluations, full),
                    () -> ResultTree.ledger(scenario, evaluations),
                    () -> Csv.ledger(scenario, evaluations));
        }
        boolean missed = evaluations.stream()
                .anyMatch(evaluation ->
                        evaluation.marginDecibels(scenario.target()).orElse(0.0) < 0.0);
        return check && missed ? ExitCode.TARGET_MISSED : ExitCode.DONE;
    }

    /** Writes one entry of every candidate that has it. */
    private void writeEntry(Scenario scenario, List<Evaluation> evaluations, String name) throws InputException {
        List<Evaluation> having = new ArrayList<>();
        List<EntrySpectrum> spectra = new ArrayList<>();
        for (Evaluation evaluation : evaluations) {
            Optional<EntrySpectrum> spectrum =
                    EntrySpectrum.of(evaluation.ledger().frontEnd(), scenario.band(), name);
            if (spectrum.isPresent()) {
                having.add(evaluation);
                spectra.add(spectrum.get());
            }
        }
        if (having.isEmpty()) {
            List<String> names = evaluations.stream()
                    .flatMap(evaluation -> evaluation.ledger().entries().stream())
                    .map(Entry::name)
                    .distinct()
                    .toList();
            throw unknown("no candidate has an entry", name, names);
        }
        outputs.write(
                spec.commandLine().getOut(),
                LedgerText.entry(scenario, having, spectra),
                () -> ResultTree.entry(scenario, having, spectra),
                () -> Csv.entry(having, spectra));
    }

    private Scenario selected(Scenario scenario) {
        if (only.isEmpty()) {
            return scenario;
        }
        List<Candidate> chosen = scenario.candidates().stream()
                .filter(candidate -> candidate.name().equals(only.get()))
                .toList();
        if (chosen.isEmpty()) {
            throw unknown(
                    "the scenario has no candidate",
                    only.get(),
                    scenario.candidates().stream().map(Candidate::name).toList());
        }
        return scenario.withCandidates(chosen);
    }

    private ParameterException unknown(String what, String name, List<String> known) {
        List<String> near = Nearest.of(name, known);
        return new ParameterException(
                spec.commandLine(),
                what + " '" + name + "'; "
                        + (near.isEmpty()
                                ? "use one of: " + String.join(", ", known)
                                : "did you mean '" + near.get(0) + "'?"));
    }
}
