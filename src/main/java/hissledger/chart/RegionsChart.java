package hissledger.chart;

import hissledger.choose.Candidate;
import hissledger.choose.NoiseFigureMap;
import hissledger.choose.Regions;
import hissledger.choose.Scenario;
import hissledger.choose.SpotCrossover;
import hissledger.choose.Surface;
import hissledger.circuit.CoilSource;
import hissledger.circuit.ResistorSource;
import hissledger.files.Phrases;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Collectors;

/** Maps over source resistance: who is quietest at which frequency, and the noise figure of one candidate at which current. */
public final class RegionsChart {
    /** Leads that are drawn, dB. */
    private static final double[] MARGINS = {1.0, 2.0, 3.0, 6.0};

    /** Noise figures that are drawn, dB. */
    private static final double[] NOISE_FIGURES = {0.5, 1.0, 2.0, 3.0, 6.0, 10.0};

    private static final String RESISTANCE = "source resistance, Ω";

    private RegionsChart() {}

    /** Who is quietest over source resistance and frequency, with lines of its lead over the next. */
    public static Picture winners(Regions regions) {
        return PlateDrawing.picture(winnersPlate(regions));
    }

    /** Noise figure over source resistance and current, with the best current and the working point. */
    public static Picture contours(NoiseFigureMap map) {
        return PlateDrawing.picture(contoursPlate(map));
    }

    static Plate winnersPlate(Regions regions) {
        Scenario scenario = regions.scenario();
        List<Region> areas = new ArrayList<>();
        List<Trace> traces = new ArrayList<>();
        List<Integer> winners = regions.winners();
        for (int number : winners) {
            Candidate candidate = scenario.candidates().get(number);
            areas.add(new Region(number, candidate.name(), regions.advantage(number)));
            traces.add(new Trace(
                    Trace.Role.REGION,
                    number,
                    candidate.name(),
                    candidate.device().id(),
                    List.of(regions.columns().get(0).ohms()),
                    List.of(middleHertz(regions, number))));
        }
        Surface margin = regions.margin();
        List<Isoline> isolines = new ArrayList<>();
        for (double level : MARGINS) {
            isolines.add(new Isoline(margin, level, Phrases.brief(level, "dB")));
        }
        List<String> conditions = new ArrayList<>();
        conditions.add(source(scenario));
        conditions.add(
                "Areas: the candidate of least EIN density, referred to the source's EMF, source noise included; each at"
                        + " its stated current, or at its best over " + Phrases.band(scenario.band())
                        + " for each resistance. Lines: its lead over the next.");
        String crossovers = crossovers(regions);
        if (!crossovers.isEmpty()) {
            conditions.add(crossovers);
        }
        String losers = scenario.candidates().stream()
                .map(Candidate::name)
                .filter(name -> winners.stream()
                        .noneMatch(number -> regions.name(number).equals(name)))
                .map(name -> '"' + name + '"')
                .collect(Collectors.joining(", "));
        if (!losers.isEmpty()) {
            conditions.add("Nowhere quietest: " + losers + ".");
        }
        List<Double> hertz = regions.hertz();
        return new Plate(
                scenario.title(),
                conditions,
                across(margin),
                new Scale("frequency, Hz", Scale.Kind.LOGARITHMIC_PREFIXED, hertz.get(0), hertz.get(hertz.size() - 1)),
                traces,
                ownPlace(regions),
                List.of(),
                areas,
                isolines);
    }

    private static List<Place> ownPlace(Regions regions) {
        OptionalDouble own = regions.ownOhms();
        List<Double> ohms = regions.resistanceOhms();
        boolean shown =
                own.isPresent() && own.getAsDouble() >= ohms.get(0) && own.getAsDouble() <= ohms.get(ohms.size() - 1);
        return shown
                ? List.of(new Place(
                        "source " + Phrases.brief(own.getAsDouble(), "Ω"), own.getAsDouble(), OptionalDouble.empty()))
                : List.of();
    }

    /** The middle, on a logarithmic axis, of the frequencies at which a candidate is quietest at any resistance. */
    private static double middleHertz(Regions regions, int number) {
        double sum = 0.0;
        int count = 0;
        for (Regions.Column column : regions.columns()) {
            for (int j = 0; j < regions.hertz().size(); j++) {
                if (column.atGrid(j).winner() == number) {
                    sum += Math.log(regions.hertz().get(j));
                    count++;
                }
            }
        }
        return Math.exp(sum / count);
    }

    private static String crossovers(Regions regions) {
        List<String> parts = new ArrayList<>();
        for (SpotCrossover crossover : regions.crossovers()) {
            String where = crossover.hertz().isPresent()
                    ? " at " + Phrases.brief(crossover.hertz().getAsDouble(), "Hz")
                    : " over the band, " + Phrases.weighting(regions.figure().weighting());
            for (SpotCrossover.Crossing crossing : crossover.crossings()) {
                parts.add(Phrases.value(crossing.ohms(), "Ω") + where);
            }
        }
        return parts.isEmpty() ? "" : "Best bipolar and best JFET change places at " + String.join("; ", parts) + ".";
    }

    private static String source(Scenario scenario) {
        boolean keepsItsKind = scenario.source() instanceof ResistorSource || scenario.source() instanceof CoilSource;
        return "Source: "
                + (keepsItsKind
                        ? Phrases.source(scenario.source()) + ", its resistance varied"
                        : "a plain resistor at "
                                + Phrases.temperature(scenario.source().temperatureKelvin()) + " in place of the "
                                + Phrases.source(scenario.source()))
                + ". Path and stage at " + Phrases.temperature(scenario.temperatureKelvin()) + ".";
    }

    private static Scale across(Surface surface) {
        List<Double> ohms = surface.across();
        return new Scale(RESISTANCE, Scale.Kind.LOGARITHMIC_PREFIXED, ohms.get(0), ohms.get(ohms.size() - 1));
    }

    static Plate contoursPlate(NoiseFigureMap map) {
        Scenario scenario = map.scenario();
        Surface surface = map.noiseFigure();
        List<Isoline> isolines = new ArrayList<>();
        for (double level : NOISE_FIGURES) {
            isolines.add(new Isoline(surface, level, Phrases.brief(level, "dB")));
        }
        List<Double> amps = surface.up();
        double least = amps.get(0);
        double greatest = amps.get(amps.size() - 1);
        List<Place> places = new ArrayList<>();
        map.working()
                .filter(point -> point.amps() >= least && point.amps() <= greatest)
                .filter(point -> point.ohms() >= surface.across().get(0)
                        && point.ohms() <= surface.across().get(surface.across().size() - 1))
                .ifPresent(point -> places.add(new Place(
                        "working point " + Phrases.brief(point.ohms(), "Ω") + ", " + Phrases.value(point.amps(), "A")
                                + ", NF " + Phrases.value(point.noiseFigureDecibels(), "dB"),
                        point.ohms(),
                        OptionalDouble.of(point.amps()))));
        return new Plate(
                scenario.title() + ": " + map.candidate().name(),
                List.of(
                        source(scenario),
                        "Noise figure of " + map.candidate().name() + " ("
                                + map.candidate().device().id() + ") over " + Phrases.band(scenario.band())
                                + ", unweighted, referred to a source at 290 K: lines of equal noise figure, and the current at which it"
                                + " is least."),
                across(surface),
                new Scale("current of each device, A", Scale.Kind.LOGARITHMIC_PREFIXED, least, greatest),
                List.of(new Trace(
                        Trace.Role.CANDIDATE,
                        2,
                        "best current",
                        "for each source resistance",
                        surface.across(),
                        map.ridge())),
                places,
                List.of(),
                List.of(),
                isolines);
    }
}
