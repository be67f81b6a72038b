package hissledger.files;

import hissledger.choose.Candidate;
import hissledger.choose.Comparison;
import hissledger.choose.Limits;
import hissledger.choose.Scenario;
import hissledger.choose.Target;
import hissledger.circuit.PathElement;
import hissledger.circuit.Signal;
import hissledger.files.ScenarioShapes.ScenarioKeys;
import hissledger.files.ScenarioShapes.SourceKeys;
import hissledger.ledger.Figure;
import hissledger.physics.Band;
import hissledger.physics.Decibels;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * Reads a scenario file: its shape first, then what its values say together, and only if all of that is free of faults the
 * scenario itself. All faults of a file are reported at once.
 */
public final class ScenarioReader {
    private static final List<Double> USUAL_SPOTS = List.of(100.0, 1000.0, 10_000.0);

    private final Faults faults;
    private final Path folder;
    private final Catalogue catalogue;
    /** Faults of other files, each once however many candidates name the file. */
    private final Set<Fault> elsewhere = new LinkedHashSet<>();

    private ScenarioReader(Path file, Catalogue catalogue) {
        this.faults = new Faults(file.toString());
        Path parent = file.getParent();
        this.folder = parent == null ? Path.of("") : parent;
        this.catalogue = catalogue;
    }

    /**
     * Reads a scenario.
     *
     * @throws InputException with every fault of the file and of the files it names
     */
    public static Scenario read(Path file, Catalogue catalogue) throws InputException {
        Node tree = JsonIn.tree(file.toString(), JsonIn.bytes(file));
        return new ScenarioReader(file, catalogue).scenario(tree);
    }

    private Scenario scenario(Node tree) throws InputException {
        Optional<Fields> read = ScenarioKeys.SHAPE.read(tree, faults);
        if (read.isEmpty()) {
            faults.throwIfAny();
        }
        Fields fields = read.orElseThrow();
        double kelvin = fields.get(ScenarioShapes.TEMPERATURE, Scenario.USUAL_KELVIN);
        Optional<Band> band = band(fields);
        Optional<ImpedanceTable> table = fields.get(ScenarioKeys.SOURCE)
                .flatMap(source -> SourceReader.check(source, folder, band, faults, elsewhere));
        if (fields.get(ScenarioKeys.SPOTS).isEmpty() && table.isPresent()) {
            checkUsualSpots(fields, table.get());
        }
        fields.get(ScenarioKeys.PATH).ifPresent(path -> PathReader.check(path, faults));
        fields.get(ScenarioKeys.TARGET).ifPresent(target -> checkTarget(target, fields));
        fields.get(ScenarioKeys.SEARCH_LIMITS).ifPresent(this::checkLimits);
        List<CandidateReader> candidates = candidates(fields);
        if (!elsewhere.isEmpty()) {
            List<Fault> all = new ArrayList<>(elsewhere);
            try {
                faults.throwIfAny();
            } catch (InputException own) {
                all.addAll(own.faults());
            }
            throw new InputException(all);
        }
        faults.throwIfAny();

        Set<String> names = new HashSet<>();
        List<PathElement> path =
                PathReader.elements(fields.get(ScenarioKeys.PATH).orElse(List.of()), kelvin, names);
        List<Candidate> ready = new ArrayList<>();
        for (CandidateReader candidate : candidates) {
            ready.add(candidate.candidate(kelvin, names));
        }
        return new Scenario(
                fields.need(ScenarioKeys.TITLE),
                fields.get(ScenarioKeys.NOTE, ""),
                kelvin,
                band.orElseThrow(),
                fields.get(ScenarioKeys.SPOTS)
                        .map(spots -> spots.stream().map(Located::value).toList())
                        .orElse(USUAL_SPOTS),
                target(fields),
                SourceReader.source(fields.need(ScenarioKeys.SOURCE), table, kelvin),
                path,
                ready,
                limits(fields));
    }

    private Optional<Band> band(Fields fields) {
        Optional<Fields> stated = fields.get(ScenarioKeys.BAND);
        if (stated.isEmpty()) {
            return fields.node().member("band").isPresent() ? Optional.empty() : Optional.of(Band.AUDIO);
        }
        Optional<Double> from = stated.get().get(ScenarioKeys.BAND_FROM);
        Optional<Located<Double>> to = stated.get().located(ScenarioKeys.BAND_TO);
        if (from.isEmpty() || to.isEmpty()) {
            return Optional.empty();
        }
        if (!(to.get().value() > from.get())) {
            faults.at(
                    to.get().node(),
                    "must be above band.from, " + Quantities.brief(from.get(), "Hz", 4) + ", was "
                            + to.get().node().quoted());
            return Optional.empty();
        }
        return Optional.of(new Band(from.get(), to.get().value()));
    }

    /** The usual spots must lie inside a table as stated ones must. */
    private void checkUsualSpots(Fields fields, ImpedanceTable table) {
        double first = table.hertz().get(0);
        double last = table.hertz().get(table.hertz().size() - 1);
        for (double spot : USUAL_SPOTS) {
            if (spot < first || spot > last) {
                faults.at(
                        fields.node(),
                        "needs spots inside the table of the source, " + Quantities.brief(first, "Hz", 4) + " to "
                                + Quantities.brief(last, "Hz", 4)
                                + "; the usual 100 Hz, 1 kHz, 10 kHz do not fit; add spots");
                return;
            }
        }
    }

    private void checkTarget(Fields target, Fields fields) {
        Key<Quantities.Parsed> noiseLevel = ScenarioKeys.LIMITS.get(Figure.EQUIVALENT_NOISE_LEVEL);
        if (noiseLevel == null || target.get(noiseLevel).isEmpty()) {
            return;
        }
        boolean acoustic = fields.get(ScenarioKeys.SOURCE)
                        .flatMap(source -> source.get(SourceKeys.SENSITIVITY))
                        .filter(sensitivity -> sensitivity.unit().endsWith("/" + Signal.PASCAL))
                        .isPresent()
                && fields.get(ScenarioKeys.SOURCE)
                        .flatMap(source -> source.get(SourceKeys.MEDIUM))
                        .filter(medium -> !medium.equals("air"))
                        .isEmpty();
        if (!acoustic) {
            faults.at(
                    target.located(noiseLevel).orElseThrow().node(),
                    "needs a sensitivity of the source in V/Pa, in air; add source.sensitivity, like \"1.8 mV/Pa\"");
        }
    }

    private void checkLimits(Fields limits) {
        limits.located(ScenarioKeys.POWER).ifPresent(power -> {
            if (limits.get(ScenarioKeys.SUPPLY).isEmpty()) {
                faults.at(power.node(), "needs the voltage it is drawn at; add limits.supply, like \"12 V\"");
            }
        });
    }

    private static Limits limits(Fields fields) {
        Optional<Fields> limits = fields.get(ScenarioKeys.SEARCH_LIMITS);
        return new Limits(
                optional(limits.flatMap(each -> each.get(ScenarioKeys.TOTAL_CURRENT))),
                optional(limits.flatMap(each -> each.get(ScenarioKeys.SUPPLY))),
                optional(limits.flatMap(each -> each.get(ScenarioKeys.POWER))),
                optional(limits.flatMap(each -> each.get(ScenarioKeys.HEADROOM)).map(ScenarioReader::limit)),
                optional(limits.flatMap(each -> each.get(ScenarioKeys.INPUT_CAPACITANCE))));
    }

    private static OptionalDouble optional(Optional<Double> value) {
        return value.isPresent() ? OptionalDouble.of(value.get()) : OptionalDouble.empty();
    }

    private static Target target(Fields fields) {
        Map<Figure, Double> limits = new EnumMap<>(Figure.class);
        fields.get(ScenarioKeys.TARGET)
                .ifPresent(target -> ScenarioKeys.LIMITS.forEach(
                        (figure, key) -> target.get(key).ifPresent(limit -> limits.put(figure, limit(limit)))));
        return new Target(limits);
    }

    private static double limit(Quantities.Parsed limit) {
        return switch (limit.unit()) {
            case "dBu" -> Decibels.dbuToVolts(limit.value());
            case "dBV" -> Decibels.toAmplitudeRatio(limit.value());
            default -> limit.value();
        };
    }

    private List<CandidateReader> candidates(Fields fields) {
        List<CandidateReader> candidates = new ArrayList<>();
        Set<String> names = new HashSet<>();
        Figure deciding = Comparison.decidingFigure(target(fields));
        for (Located<Fields> candidate : fields.get(ScenarioKeys.CANDIDATES).orElse(List.of())) {
            CandidateReader reader = new CandidateReader(candidate.value(), faults, elsewhere, catalogue, deciding);
            reader.check(names, fields.get(ScenarioKeys.PATH).orElse(List.of()));
            candidates.add(reader);
        }
        return candidates;
    }
}
