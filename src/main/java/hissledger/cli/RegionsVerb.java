package hissledger.cli;

import hissledger.chart.RegionsChart;
import hissledger.choose.Candidate;
import hissledger.choose.NoiseFigureMap;
import hissledger.choose.Regions;
import hissledger.choose.ResistanceSweep;
import hissledger.choose.Scenario;
import hissledger.files.InputException;
import hissledger.files.Nearest;
import hissledger.files.Phrases;
import hissledger.files.Quantities;
import hissledger.report.Csv;
import hissledger.report.RegionsText;
import hissledger.report.ResultTree;
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

/** Who is quietest where. */
@Command(
        name = "regions",
        mixinStandardHelpOptions = true,
        sortOptions = false,
        description =
                "Which candidate is quietest over source resistance and frequency, by how much, and where bipolar and JFET"
                        + " change places; or the noise figure of one candidate over source resistance and current.",
        footer = {
            "",
            "Examples:",
            "  hissledger regions scenarios/vocal-dynamic.json --chart regions.png",
            "  hissledger regions scenarios/vocal-dynamic.json --from \"10 ohm\" --to \"10 kohm\"",
            "  hissledger regions scenarios/vocal-dynamic.json --kind contours --candidate \"PNP switch\" --chart nf.png"
        })
final class RegionsVerb implements Callable<Integer> {
    /** What is looked at. */
    enum Kind {
        /** Who is quietest over source resistance and frequency. */
        WINNERS,
        /** Noise figure of one candidate over source resistance and current. */
        CONTOURS;

        @Override
        public String toString() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    /** Beyond these no source has its resistance, Ω. */
    private static final double LEAST_OHMS = 1e-3;

    private static final double GREATEST_OHMS = 1e12;
    /** A range narrower than this factor is one resistance. */
    private static final double LEAST_SPAN = 1.01;

    @Mixin
    private Inputs inputs = new Inputs();

    @Option(
            names = "--kind",
            paramLabel = "KIND",
            description =
                    "winners: the quietest candidate over source resistance and frequency (default); contours: the noise"
                            + " figure of one candidate over source resistance and current")
    private Kind kind = Kind.WINNERS;

    @Option(names = "--candidate", paramLabel = "NAME", description = "the candidate whose contours are wanted")
    private Optional<String> only = Optional.empty();

    @Option(names = "--from", paramLabel = "OHMS", description = "least source resistance (default: 1 ohm)")
    private Optional<String> from = Optional.empty();

    @Option(names = "--to", paramLabel = "OHMS", description = "greatest source resistance (default: 10 Mohm)")
    private Optional<String> to = Optional.empty();

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
        double fromOhms = ohms("--from", from, ResistanceSweep.LEAST_OHMS);
        double toOhms = ohms("--to", to, ResistanceSweep.GREATEST_OHMS);
        checkRange(fromOhms, toOhms);
        if (kind == Kind.WINNERS && only.isPresent()) {
            throw wrong("--candidate goes with --kind contours; the winners are sought among all candidates");
        }
        Scenario scenario = inputs.read();
        if (kind == Kind.WINNERS) {
            writeWinners(scenario, fromOhms, toOhms);
        } else {
            writeContours(scenario, candidate(scenario), fromOhms, toOhms);
        }
        return ExitCode.DONE;
    }

    private void writeWinners(Scenario scenario, double fromOhms, double toOhms) throws InputException {
        if (scenario.candidates().size() < 2) {
            throw wrong(
                    "the scenario has a single candidate, so none can be quieter than another; use --kind contours");
        }
        Regions regions = Regions.of(scenario, fromOhms, toOhms);
        if (chart.isAsked()) {
            chart.write(RegionsChart.winners(regions));
        }
        outputs.write(
                spec.commandLine().getOut(),
                RegionsText.of(regions),
                () -> ResultTree.regions(regions),
                () -> Csv.regions(regions));
    }

    private void writeContours(Scenario scenario, Candidate candidate, double fromOhms, double toOhms)
            throws InputException {
        NoiseFigureMap map;
        try {
            map = NoiseFigureMap.of(scenario, candidate, fromOhms, toOhms);
        } catch (IllegalArgumentException refused) {
            throw new ParameterException(spec.commandLine(), refused.getMessage(), refused);
        }
        if (chart.isAsked()) {
            chart.write(RegionsChart.contours(map));
        }
        outputs.write(
                spec.commandLine().getOut(),
                RegionsText.of(map),
                () -> ResultTree.noiseFigureMap(map),
                () -> Csv.noiseFigureMap(map));
    }

    private double ohms(String option, Optional<String> text, double usual) {
        if (text.isEmpty()) {
            return usual;
        }
        double ohms;
        try {
            ohms = Quantities.ohms(text.get());
        } catch (IllegalArgumentException fault) {
            throw new ParameterException(spec.commandLine(), option + " " + fault.getMessage(), fault);
        }
        if (ohms < LEAST_OHMS || ohms > GREATEST_OHMS) {
            throw wrong(option + " must be from " + Phrases.brief(LEAST_OHMS, "Ω") + " to "
                    + Phrases.brief(GREATEST_OHMS, "Ω") + ", was " + text.get());
        }
        return ohms;
    }

    private void checkRange(double fromOhms, double toOhms) {
        String both = "from " + Phrases.brief(fromOhms, "Ω") + " to " + Phrases.brief(toOhms, "Ω");
        if (fromOhms > toOhms) {
            throw wrong("the range of source resistance falls, " + both + ": --from must be below --to");
        }
        if (toOhms < fromOhms * LEAST_SPAN) {
            throw wrong("the range of source resistance is empty, " + both + ": --from must be below --to");
        }
    }

    private Candidate candidate(Scenario scenario) {
        List<Candidate> all = scenario.candidates();
        List<String> names = all.stream().map(Candidate::name).toList();
        if (only.isEmpty()) {
            if (all.size() == 1) {
                return all.get(0);
            }
            throw wrong(
                    "--kind contours needs one candidate: give --candidate with one of: " + String.join(", ", names));
        }
        String name = only.get();
        return all.stream()
                .filter(candidate -> candidate.name().equals(name))
                .findFirst()
                .orElseThrow(() -> {
                    List<String> near = Nearest.of(name, names);
                    return wrong("the scenario has no candidate '" + name + "'; "
                            + (near.isEmpty()
                                    ? "use one of: " + String.join(", ", names)
                                    : "did you mean '" + near.get(0) + "'?"));
                });
    }

    private ParameterException wrong(String sentence) {
        return new ParameterException(spec.commandLine(), sentence);
    }
}
