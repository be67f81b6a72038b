package hissledger.cli;

import hissledger.chart.ComparisonChart;
import hissledger.chart.Picture;
import hissledger.choose.Comparison;
import hissledger.choose.Evaluation;
import hissledger.choose.ResistanceSweep;
import hissledger.choose.Scenario;
import hissledger.files.InputException;
import hissledger.ledger.Figure;
import hissledger.report.CompareText;
import hissledger.report.Csv;
import hissledger.report.ResultTree;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** Candidates side by side. */
@Command(
        name = "compare",
        mixinStandardHelpOptions = true,
        sortOptions = false,
        description =
                "Candidates side by side, quietest first, with the deciding sentence and the chart for the review.",
        footer = {
            "",
            "Examples:",
            "  hissledger compare scenarios/vocal-dynamic.json --chart vocal.png",
            "  hissledger compare scenarios/vocal-dynamic.json --chart vocal-rs.png --chart-kind resistance"
        })
final class CompareVerb implements Callable<Integer> {
    /** The pictures of a comparison. */
    enum ChartKind {
        /** EIN density against frequency. */
        DENSITY,
        /** EIN over the band against source resistance. */
        RESISTANCE;

        @Override
        public String toString() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    private static final int SWEEP_POINTS_PER_DECADE = 6;

    @Mixin
    private Inputs inputs = new Inputs();

    @Option(
            names = "--by",
            paramLabel = "FIGURE",
            description = "the figure to sort by: einFlat, einA, ein468, einPlayback, einPlaybackA, noiseFigure or "
                    + "equivalentNoiseLevel (default: the first that the target limits, else einFlat)")
    private Optional<String> by = Optional.empty();

    @Mixin
    private Outputs outputs = new Outputs();

    @Mixin
    private ChartFile chart = new ChartFile();

    @Option(
            names = "--chart-kind",
            paramLabel = "KIND",
            description = "density: EIN density against frequency (default); resistance: EIN against source resistance")
    private Optional<ChartKind> chartKind = Optional.empty();

    @Option(
            names = "--check",
            description = "exit with 1 if the quietest candidate that keeps the limits misses the target")
    private boolean check;

    @Spec
    private CommandSpec spec = CommandSpec.create();

    @Override
    public Integer call() throws InputException {
        chart.check(spec);
        outputs.check();
        if (chartKind.isPresent() && !chart.isAsked()) {
            throw new ParameterException(
                    spec.commandLine(), "--chart-kind draws nothing without a file; add --chart FILE.png");
        }
        Scenario scenario = inputs.read();
        Comparison comparison = Comparison.of(scenario, figure(scenario));
        if (comparison.winner().ledger().figure(comparison.figure()).isEmpty()) {
            throw new ParameterException(
                    spec.commandLine(),
                    comparison.figure().key() + " is not defined for this source"
                            + (comparison.figure() == Figure.EQUIVALENT_NOISE_LEVEL
                                    ? ", which states no sensitivity in V/Pa in air; add source.sensitivity, or sort --by einA"
                                    : ", whose resistance is zero; sort --by einFlat"));
        }
        if (chart.isAsked()) {
            chart.write(picture(comparison));
        }
        outputs.write(
                spec.commandLine().getOut(),
                CompareText.of(comparison),
                () -> ResultTree.comparison(comparison),
                () -> Csv.comparison(comparison));
        boolean missed = comparison
                .bestWithinLimits()
                .map(best -> best.marginDecibels(scenario.target()).orElse(0.0) < 0.0)
                .orElse(true);
        return check && missed ? ExitCode.TARGET_MISSED : ExitCode.DONE;
    }

    private Figure figure(Scenario scenario) {
        return by.isPresent() ? Arguments.figure(spec, by.get()) : Comparison.decidingFigure(scenario);
    }

    private Picture picture(Comparison comparison) {
        if (chartKind.orElse(ChartKind.DENSITY) == ChartKind.DENSITY) {
            return ComparisonChart.density(comparison);
        }
        List<Double> ohms = ResistanceSweep.grid(SWEEP_POINTS_PER_DECADE);
        List<ResistanceSweep> sweeps = new ArrayList<>();
        for (Evaluation evaluation : comparison.ranked()) {
            sweeps.add(ResistanceSweep.of(
                    comparison.scenario(), evaluation, ohms, comparison.figure().weighting()));
        }
        List<Double> floor = ResistanceSweep.floorVolts(
                comparison.scenario(),
                comparison.winner(),
                ohms,
                comparison.figure().weighting());
        return ComparisonChart.resistance(comparison, sweeps, floor);
    }
}
