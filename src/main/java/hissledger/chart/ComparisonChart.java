package hissledger.chart;

import hissledger.choose.Candidate;
import hissledger.choose.Comparison;
import hissledger.choose.Crossover;
import hissledger.choose.Evaluation;
import hissledger.choose.ResistanceSweep;
import hissledger.choose.Scenario;
import hissledger.circuit.CoilSource;
import hissledger.circuit.ResistorSource;
import hissledger.circuit.Source;
import hissledger.files.Phrases;
import hissledger.files.Quantities;
import hissledger.ledger.Figure;
import hissledger.ledger.NoiseSpectrum;
import hissledger.physics.Decibels;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;

/** The pictures of a comparison. */
public final class ComparisonChart {
    private static final double NANO = 1e9;
    private static final int LABEL_DIGITS = 3;
    private static final String REFERENCE = "referred to the source's EMF, source noise included";
    private static final String FLOOR = "floor";
    private static final String FLOOR_DETAIL = "the source alone";

    /** Beyond the outermost values there is this much room on a logarithmic axis, as a factor. */
    private static final double ROOM = 1.08;

    /** A logarithmic axis spans at least this factor: a hair's breadth of difference should not fill the page. */
    private static final double LEAST_SPAN = 3.0;

    /** Where a logarithmic axis may end, in each decade. */
    private static final double[] ENDS = {1.0, 1.2, 1.5, 2.0, 2.5, 3.0, 4.0, 5.0, 6.0, 8.0, 10.0};

    /** A level axis ends at multiples of this, dB. */
    private static final double LEVEL_END_DECIBELS = 5.0;

    /** and at least this far from the outermost values, dB. */
    private static final double LEVEL_ROOM_DECIBELS = 1.0;

    /** How far around the source and the crossings a picture over resistance looks, as a factor. */
    private static final double AROUND = 30.0;

    private ComparisonChart() {}

    /**
     * EIN density of all candidates against frequency on log paper, with the source's own noise as the floor. Where the source
     * makes no noise there is no floor.
     */
    public static Picture density(Comparison comparison) {
        return PlateDrawing.picture(densityPlate(comparison));
    }

    /**
     * EIN of all candidates under the weighting of the comparison's figure against source resistance, with the floor, the limit
     * if the target sets one to this figure, the scenario's own source resistance and the crossings of the best bipolar and the
     * best JFET candidate. It shows the whole decades around those places, where the decision falls, or all of the sweep where
     * there is no such place.
     *
     * @param comparison the comparison
     * @param sweeps the candidates to be drawn, at least one, all over the same resistances
     * @param floorVolts noise of the source alone at those resistances, V rms
     * @throws IllegalArgumentException if there is no sweep, or not a floor to each resistance
     */
    public static Picture resistance(Comparison comparison, List<ResistanceSweep> sweeps, List<Double> floorVolts) {
        return PlateDrawing.picture(resistancePlate(comparison, sweeps, floorVolts));
    }

    static Plate densityPlate(Comparison comparison) {
        Scenario scenario = comparison.scenario();
        List<Trace> traces = new ArrayList<>();
        for (Evaluation evaluation : comparison.ranked()) {
            NoiseSpectrum spectrum = evaluation.ledger().spectrum();
            traces.add(new Trace(
                    Trace.Role.CANDIDATE,
                    number(scenario, evaluation.candidate()),
                    evaluation.name(),
                    device(evaluation) + current(evaluation),
                    spectrum.hertz(),
                    nano(spectrum.einVoltsPerRootHertz())));
        }
        NoiseSpectrum first = comparison.winner().ledger().spectrum();
        floor(first.hertz(), nano(first.sourceVoltsPerRootHertz()), 0.0).ifPresent(traces::add);
        return new Plate(
                scenario.title(),
                List.of(
                        "Source: " + Phrases.source(scenario.source()) + ". " + surroundings(scenario),
                        "EIN density over " + Phrases.band(scenario.band()) + ", unweighted, " + REFERENCE + "."),
                new Scale(
                        "frequency, Hz",
                        Scale.Kind.LOGARITHMIC_PREFIXED,
                        least(traces.stream().map(Trace::x).toList()),
                        greatest(traces.stream().map(Trace::x).toList())),
                logarithmic("equivalent input noise density, nV/√Hz", traces),
                traces,
                List.of());
    }

    static Plate resistancePlate(Comparison comparison, List<ResistanceSweep> sweeps, List<Double> floorVolts) {
        if (sweeps.isEmpty()) {
            throw new IllegalArgumentException("sweeps must not be empty");
        }
        Scenario scenario = comparison.scenario();
        List<Double> ohms = sweeps.get(0).resistanceOhms();
        if (floorVolts.size() != ohms.size()) {
            throw new IllegalArgumentException(
                    "floorVolts must be one to each of " + ohms.size() + " resistances, was " + floorVolts.size());
        }
        List<Place> places = places(comparison, sweeps);
        Span span = Span.around(places, ohms);
        List<Trace> traces = new ArrayList<>();
        for (ResistanceSweep sweep : sweeps) {
            Evaluation evaluation = sweep.evaluation();
            traces.add(new Trace(
                    Trace.Role.CANDIDATE,
                    number(scenario, evaluation.candidate()),
                    evaluation.name(),
                    device(evaluation) + (evaluation.optimum().isPresent() ? ", best current" : current(evaluation)),
                    span.of(sweep.resistanceOhms(), sweep.resistanceOhms()),
                    span.of(sweep.resistanceOhms(), levels(sweep.einVolts()))));
        }
        floor(span.of(ohms, ohms), span.of(ohms, levels(floorVolts)), Double.NEGATIVE_INFINITY)
                .ifPresent(traces::add);
        limitDbu(comparison)
                .ifPresent(dbu -> traces.add(new Trace(
                        Trace.Role.LIMIT,
                        0,
                        "limit",
                        Phrases.brief(dbu, "dBu").replace('-', '−'),
                        List.of(span.fromOhms, span.toOhms),
                        List.of(dbu, dbu))));
        return new Plate(
                scenario.title(),
                resistanceConditions(comparison, sweeps),
                new Scale("source resistance, Ω", Scale.Kind.LOGARITHMIC_PREFIXED, span.fromOhms, span.toOhms),
                levelScale(
                        "equivalent input noise, "
                                + Phrases.weighting(comparison.figure().weighting()) + ", dBu",
                        traces),
                traces,
                places);
    }

    private static List<String> resistanceConditions(Comparison comparison, List<ResistanceSweep> sweeps) {
        Scenario scenario = comparison.scenario();
        Source source = scenario.source();
        List<String> conditions = new ArrayList<>();
        boolean keepsItsKind = source instanceof ResistorSource || source instanceof CoilSource;
        conditions.add("Source: "
                + (keepsItsKind
                        ? Phrases.source(source) + ", its resistance varied"
                        : "a plain resistor at " + Phrases.temperature(source.temperatureKelvin()) + " in place of the "
                                + Phrases.source(source))
                + ". " + surroundings(scenario));
        boolean searched =
                sweeps.stream().anyMatch(sweep -> sweep.evaluation().optimum().isPresent());
        conditions.add("EIN over " + Phrases.band(scenario.band()) + ", "
                + Phrases.weighting(comparison.figure().weighting()) + ", " + REFERENCE + "."
                + (searched ? " Best currents are found anew at each resistance." : ""));
        comparison.crossover().map(ComparisonChart::crossing).ifPresent(conditions::add);
        return conditions;
    }

    private static String crossing(Crossover crossover) {
        String both = "\"" + crossover.bipolar().name() + "\" (bipolar) and \""
                + crossover.jfet().name() + "\" (JFET)";
        if (crossover.resistanceOhms().isEmpty()) {
            return both + " do not change places from " + Phrases.brief(ResistanceSweep.LEAST_OHMS, "Ω") + " to "
                    + Phrases.brief(ResistanceSweep.GREATEST_OHMS, "Ω") + ": the "
                    + (crossover.bipolarQuieterAtLeastResistance() ? "bipolar" : "JFET") + " is quieter throughout.";
        }
        return both + " change places at "
                + crossover.resistanceOhms().stream()
                        .map(ohms -> Phrases.value(ohms, "Ω"))
                        .collect(Collectors.joining(" and "))
                + ".";
    }

    private static List<Place> places(Comparison comparison, List<ResistanceSweep> sweeps) {
        List<Place> places = new ArrayList<>();
        OptionalDouble own = ownOhms(comparison.scenario().source());
        if (own.isPresent()) {
            places.add(new Place(
                    "source " + Phrases.brief(own.getAsDouble(), "Ω"), own.getAsDouble(), OptionalDouble.empty()));
        }
        comparison
                .crossover()
                .ifPresent(crossover -> crossover
                        .resistanceOhms()
                        .forEach(ohms -> places.add(new Place(
                                "crossover " + Phrases.value(ohms, "Ω"),
                                ohms,
                                levelOf(crossover.bipolar(), sweeps, ohms)))));
        List<Double> ohms = sweeps.get(0).resistanceOhms();
        places.removeIf(place -> !(place.x() >= ohms.get(0) && place.x() <= ohms.get(ohms.size() - 1)));
        return places;
    }

    /** The resistances that a picture shows. */
    private record Span(double fromOhms, double toOhms) {
        /** Rounding of a resistance that is equal to an end. */
        private static final double EDGE = 1.0 + 1e-9;

        /** A line needs two. */
        private static final int FEWEST_POINTS = 2;

        /** The whole decades around all places as far as a sweep goes, or all of it. */
        static Span around(List<Place> places, List<Double> sweptOhms) {
            Span all = new Span(sweptOhms.get(0), sweptOhms.get(sweptOhms.size() - 1));
            Span near = new Span(
                    Math.max(all.fromOhms, decadesAround(places, -1)), Math.min(all.toOhms, decadesAround(places, +1)));
            List<Double> shown = near.of(sweptOhms, sweptOhms);
            return shown.size() < FEWEST_POINTS ? all : new Span(shown.get(0), shown.get(shown.size() - 1));
        }

        /** One end of the decades around all places, Ω; without any place, infinitely far. */
        private static double decadesAround(List<Place> places, int direction) {
            double end = places.stream()
                    .mapToDouble(place -> direction * Math.log10(place.x()))
                    .max()
                    .orElse(Double.POSITIVE_INFINITY);
            return Math.pow(10.0, direction * Math.ceil(end + Math.log10(AROUND)));
        }

        /** Those values whose resistance lies in the span. */
        List<Double> of(List<Double> ohms, List<Double> values) {
            List<Double> kept = new ArrayList<>();
            for (int k = 0; k < ohms.size(); k++) {
                if (ohms.get(k) > fromOhms / EDGE && ohms.get(k) < toOhms * EDGE) {
                    kept.add(values.get(k));
                }
            }
            return kept;
        }
    }

    /** The height of a candidate's line at a resistance, on the straight line between its points, dBu. */
    private static OptionalDouble levelOf(Evaluation evaluation, List<ResistanceSweep> sweeps, double ohms) {
        for (ResistanceSweep sweep : sweeps) {
            if (!sweep.evaluation().name().equals(evaluation.name())) {
                continue;
            }
            for (int k = 1; k < sweep.resistanceOhms().size(); k++) {
                double before = sweep.resistanceOhms().get(k - 1);
                double after = sweep.resistanceOhms().get(k);
                if (ohms >= before && ohms <= after) {
                    double part = Math.log(ohms / before) / Math.log(after / before);
                    double level = Decibels.dbu(sweep.einVolts().get(k - 1));
                    return OptionalDouble.of(
                            level + part * (Decibels.dbu(sweep.einVolts().get(k)) - level));
                }
            }
        }
        return OptionalDouble.empty();
    }

    private static OptionalDouble ownOhms(Source source) {
        if (source instanceof ResistorSource resistor) {
            return OptionalDouble.of(resistor.resistanceOhms());
        }
        return source instanceof CoilSource coil ? OptionalDouble.of(coil.resistanceOhms()) : OptionalDouble.empty();
    }

    private static Optional<Double> limitDbu(Comparison comparison) {
        Figure figure = comparison.figure();
        return figure.isEin()
                ? Optional.ofNullable(comparison.scenario().target().limits().get(figure))
                        .map(Decibels::dbu)
                : Optional.empty();
    }

    /** The floor, as far as it is above {@code nothing}. */
    private static Optional<Trace> floor(List<Double> x, List<Double> y, double nothing) {
        List<Double> placesAbove = new ArrayList<>();
        List<Double> above = new ArrayList<>();
        for (int k = 0; k < x.size(); k++) {
            if (y.get(k) > nothing) {
                placesAbove.add(x.get(k));
                above.add(y.get(k));
            }
        }
        return above.isEmpty()
                ? Optional.empty()
                : Optional.of(new Trace(Trace.Role.FLOOR, 0, FLOOR, FLOOR_DETAIL, placesAbove, above));
    }

    /** Which candidate of the scenario it is: its line looks the same however the candidates are ranked. */
    private static int number(Scenario scenario, Candidate candidate) {
        List<String> names = scenario.candidates().stream().map(Candidate::name).toList();
        return Math.max(0, names.indexOf(candidate.name()));
    }

    /** Device and how many of them there are in all, "bf862 x2". */
    private static String device(Evaluation evaluation) {
        int devices = devices(evaluation);
        String id = evaluation.candidate().device().id();
        return devices == 1 ? id : id + " x" + devices;
    }

    private static int devices(Evaluation evaluation) {
        int perSide = evaluation.candidate().plan().inParallel();
        return evaluation.candidate().plan().arrangement().isPair() ? 2 * perSide : perSide;
    }

    /** ", 5 mA each"; nothing for an amplifier, which has no current of the user's. */
    private static String current(Evaluation evaluation) {
        if (evaluation.ledger().frontEnd().stage().deviceAmps().isEmpty()) {
            return "";
        }
        return ", " + Quantities.brief(evaluation.amps(), "A", LABEL_DIGITS) + (devices(evaluation) > 1 ? " each" : "");
    }

    private static String surroundings(Scenario scenario) {
        return "Path and stage at " + Phrases.temperature(scenario.temperatureKelvin()) + ".";
    }

    private static Scale logarithmic(String title, List<Trace> traces) {
        double least = least(traces.stream().map(Trace::y).toList()) / ROOM;
        double greatest = greatest(traces.stream().map(Trace::y).toList()) * ROOM;
        double spread = Math.sqrt(Math.max(1.0, LEAST_SPAN * least / greatest));
        return new Scale(title, Scale.Kind.LOGARITHMIC_PLAIN, endBelow(least / spread), endAbove(greatest * spread));
    }

    private static double endBelow(double value) {
        double end = 0.0;
        int decade = (int) Math.floor(Math.log10(value));
        for (double digits : ENDS) {
            double tried = Double.parseDouble(digits + "e" + decade);
            end = tried <= value || end == 0.0 ? tried : end;
        }
        return end;
    }

    private static double endAbove(double value) {
        int decade = (int) Math.floor(Math.log10(value));
        for (double digits : ENDS) {
            double tried = Double.parseDouble(digits + "e" + decade);
            if (tried >= value) {
                return tried;
            }
        }
        return value;
    }

    private static Scale levelScale(String title, List<Trace> traces) {
        double least = least(traces.stream().map(Trace::y).toList());
        double greatest = greatest(traces.stream().map(Trace::y).toList());
        return new Scale(
                title,
                Scale.Kind.LEVEL,
                LEVEL_END_DECIBELS * Math.floor((least - LEVEL_ROOM_DECIBELS) / LEVEL_END_DECIBELS),
                LEVEL_END_DECIBELS * Math.ceil((greatest + LEVEL_ROOM_DECIBELS) / LEVEL_END_DECIBELS));
    }

    private static double least(List<List<Double>> values) {
        return values.stream().mapToDouble(Collections::min).min().orElseThrow();
    }

    private static double greatest(List<List<Double>> values) {
        return values.stream().mapToDouble(Collections::max).max().orElseThrow();
    }

    private static List<Double> nano(List<Double> voltsPerRootHertz) {
        return voltsPerRootHertz.stream().map(volts -> volts * NANO).toList();
    }

    private static List<Double> levels(List<Double> volts) {
        return volts.stream().map(Decibels::dbu).toList();
    }
}
