package hissledger.cli;

import hissledger.choose.BiasDesign;
import hissledger.choose.BiasRequest;
import hissledger.choose.Candidate;
import hissledger.choose.ESeries;
import hissledger.choose.Scenario;
import hissledger.files.BiasFile;
import hissledger.files.InputException;
import hissledger.files.Nearest;
import hissledger.files.Quantities;
import hissledger.report.BiasText;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import java.util.function.ToDoubleFunction;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Preferred values that give a candidate its current. */
@Command(
        name = "bias",
        mixinStandardHelpOptions = true,
        sortOptions = false,
        description =
                "Resistors and capacitors of preferred values that give a single stage its current: near the least"
                        + " noise, then steady, then few values; says what the bias network costs.",
        footer = {
            "",
            "Example:",
            "  hissledger bias scenarios/vocal-dynamic.json \"PNP switch\" --supply \"12 V\" --write biased.json"
        })
final class BiasVerb implements Callable<Integer> {
    /** The series that resistors come in. */
    static final ESeries[] RESISTORS = {ESeries.E12, ESeries.E24, ESeries.E48, ESeries.E96};

    @Mixin
    private Inputs inputs = new Inputs();

    @Parameters(index = "1", paramLabel = "CANDIDATE", description = "the name of a candidate of the scenario")
    private String name = "";

    @Option(names = "--supply", required = true, paramLabel = "VOLTAGE", description = "the supply, like \"12 V\"")
    private String supply = "";

    @Option(names = "--series", paramLabel = "SERIES", description = "E12, E24 (default), E48 or E96")
    private ESeries series = ESeries.E24;

    @Option(
            names = "--tolerance",
            paramLabel = "PERCENT",
            description = "of each resistor (default: 10, 5, 2, 1 %% with the series)")
    private Optional<String> tolerance = Optional.empty();

    @Option(
            names = "--headroom",
            paramLabel = "VOLTAGE",
            description = "least peak of the output in the worst case (default: 0.5 V)")
    private Optional<String> headroom = Optional.empty();

    @Option(
            names = "--edge",
            paramLabel = "FREQUENCY",
            description = "where the capacitors may cost 3 dB of response (default: lower edge of the band)")
    private Optional<String> edge = Optional.empty();

    @Option(
            names = "--penalty",
            paramLabel = "DECIBELS",
            description = "noise that the capacitors may add at the lower edge of the band (default: 0.1 dB)")
    private Optional<String> penalty = Optional.empty();

    @Option(
            names = "--write",
            paramLabel = "FILE",
            description = "write a new scenario with the candidate so built; never overwrites")
    private Optional<Path> target = Optional.empty();

    @Mixin
    private Outputs outputs = new Outputs();

    @Spec
    private CommandSpec spec = CommandSpec.create();

    @Override
    public Integer call() throws InputException {
        outputs.check();
        BiasRequest request = request();
        if (target.isPresent()) {
            BiasFile.check(target.get());
        }
        Scenario scenario = inputs.read();
        Candidate candidate = candidate(scenario);
        BiasDesign.Outcome outcome;
        try {
            outcome = BiasDesign.of(scenario, candidate, request);
        } catch (IllegalArgumentException refused) {
            throw InputException.of(inputs.file(), "candidate \"" + name + "\": " + refused.getMessage());
        }
        if (target.isPresent()) {
            BiasFile.write(Path.of(inputs.file()), target.get(), outcome);
        }
        String wrote = target.map(file -> "Wrote " + file + ". Confirm it: hissledger ledger " + file + "\n")
                .orElse("");
        outputs.write(
                spec.commandLine().getOut(),
                BiasText.of(outcome) + wrote,
                () -> BiasText.tree(outcome),
                () -> BiasText.csv(outcome));
        return ExitCode.DONE;
    }

    private BiasRequest request() {
        double supplyVolts = value("--supply", supply, Quantities::volts);
        double part =
                tolerance.isPresent() ? value("--tolerance", tolerance.get(), Quantities::part) : series.tolerance();
        double headroomVolts = headroom.isPresent()
                ? value("--headroom", headroom.get(), Quantities::volts)
                : BiasRequest.USUAL_HEADROOM_VOLTS;
        OptionalDouble edgeHertz = edge.isPresent()
                ? OptionalDouble.of(value("--edge", edge.get(), Quantities::hertz))
                : OptionalDouble.empty();
        double decibels = penalty.isPresent()
                ? value("--penalty", penalty.get(), Quantities::decibels)
                : BiasRequest.USUAL_PENALTY_DECIBELS;
        try {
            return new BiasRequest(supplyVolts, series, part, headroomVolts, edgeHertz, decibels);
        } catch (IllegalArgumentException wrong) {
            throw new ParameterException(spec.commandLine(), String.valueOf(wrong.getMessage()));
        }
    }

    private double value(String option, String text, ToDoubleFunction<String> reading) {
        try {
            return reading.applyAsDouble(text);
        } catch (IllegalArgumentException wrong) {
            throw new ParameterException(spec.commandLine(), option + " " + wrong.getMessage());
        }
    }

    private Candidate candidate(Scenario scenario) {
        for (Candidate candidate : scenario.candidates()) {
            if (candidate.name().equals(name)) {
                return candidate;
            }
        }
        List<String> known = scenario.candidates().stream().map(Candidate::name).toList();
        List<String> near = Nearest.of(name, known);
        throw new ParameterException(
                spec.commandLine(),
                "the scenario has no candidate '" + name + "'; "
                        + (near.isEmpty()
                                ? "use one of: " + String.join(", ", known)
                                : "did you mean '" + near.get(0) + "'?"));
    }
}
