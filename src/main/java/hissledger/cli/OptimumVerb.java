package hissledger.cli;

import hissledger.chart.OptimumChart;
import hissledger.choose.Candidate;
import hissledger.choose.Comparison;
import hissledger.choose.CurrentSweep;
import hissledger.choose.ImpossibleLimitsException;
import hissledger.choose.OpenSearch;
import hissledger.choose.Scenario;
import hissledger.choose.Sensitivity;
import hissledger.files.Fault;
import hissledger.files.InputException;
import hissledger.ledger.Figure;
import hissledger.report.Csv;
import hissledger.report.OptimumText;
import hissledger.report.ResultTree;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The choice of everything that a scenario leaves open. */
@Command(
        name = "optimum",
        mixinStandardHelpOptions = true,
        sortOptions = false,
        description =
                "Chooses what the scenario leaves open: current, devices in parallel, transformer ratio, a resistor;"
                        + " says how flat the choice is, what holds it back and what moves it.",
        footer = {
            "",
            "Example:",
            "  hissledger optimum scenarios/ribbon-bare.json --by equivalentNoiseLevel --chart ribbon.png"
        })
final class OptimumVerb implements Callable<Integer> {
    @Mixin
    private Inputs inputs = new Inputs();

    @Option(
            names = "--by",
            paramLabel = "FIGURE",
            description = "the figure to minimise (default: the first that the target limits, else einFlat)")
    private Optional<String> by = Optional.empty();

    @Mixin
    private Outputs outputs = new Outputs();

    @Mixin
    private ChartFile chart = new ChartFile();

    @Spec
    private CommandSpec spec = CommandSpec.create();

    @Override
    public Integer call() throws InputException {
        chart.check(spec);
        outputs.check();
        Scenario scenario = inputs.read();
        Figure figure = by.isPresent() ? Arguments.figure(spec, by.get()) : Comparison.decidingFigure(scenario);
        List<OptimumText.Searched> searched = new ArrayList<>();
        List<Fault> faults = new ArrayList<>();
        for (Candidate candidate : scenario.candidates()) {
            try {
                searched.add(search(scenario, candidate, figure));
            } catch (ImpossibleLimitsException refused) {
                faults.add(Fault.of(
                        inputs.file(), "candidate \"" + candidate.name() + "\": " + OptimumText.refusal(refused)));
            } catch (IllegalArgumentException refused) {
                faults.add(Fault.of(inputs.file(), "candidate \"" + candidate.name() + "\": " + refused.getMessage()));
            }
        }
        if (!faults.isEmpty()) {
            throw new InputException(faults);
        }
        searched.sort(Comparator.comparingDouble(each -> each.outcome().best().einVolts()));
        if (chart.isAsked()) {
            List<CurrentSweep> sweeps = sweeps(scenario, figure, searched);
            if (sweeps.isEmpty()) {
                throw new ParameterException(
                        spec.commandLine(),
                        "--chart draws a figure against current, and no candidate has one: all are behavioural amplifiers");
            }
            chart.write(OptimumChart.current(scenario, figure, sweeps));
        }
        outputs.write(
                spec.commandLine().getOut(),
                OptimumText.of(scenario, figure, searched),
                () -> ResultTree.optimum(scenario, figure, searched),
                () -> Csv.optimum(searched));
        return ExitCode.DONE;
    }

    private static List<CurrentSweep> sweeps(Scenario scenario, Figure figure, List<OptimumText.Searched> searched) {
        return searched.stream()
                .filter(each -> each.outcome().best().amps() > 0.0)
                .map(each -> CurrentSweep.of(
                        each.outcome().best(), each.outcome().currentSearch(), scenario.band(), figure.weighting()))
                .toList();
    }

    private static OptimumText.Searched search(Scenario scenario, Candidate candidate, Figure figure) {
        OpenSearch.Outcome outcome = OpenSearch.of(scenario, candidate, figure.weighting());
        OpenSearch.Choice best = outcome.best();
        return new OptimumText.Searched(
                candidate,
                outcome,
                OpenSearch.closedFormAmps(best),
                Sensitivity.of(scenario, best.design(), best.amps(), figure.weighting()));
    }
}
