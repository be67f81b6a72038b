package hissledger.chart;

import hissledger.choose.BestCurrent;
import hissledger.choose.CurrentSweep;
import hissledger.choose.Design;
import hissledger.choose.OpenSearch;
import hissledger.choose.OpenValue;
import hissledger.choose.Scenario;
import hissledger.files.Phrases;
import hissledger.ledger.Figure;
import hissledger.physics.Decibels;
import java.util.ArrayList;
import java.util.List;

/** The chart of a search: the figure against the current of each device. */
public final class OptimumChart {
    private static final double ROOM_DECIBELS = 1.0;
    /** Far above the best nobody decides anything: what lies higher is cut off, dB. */
    private static final double MOST_DECIBELS = 15.0;

    private OptimumChart() {}

    /** EIN against the current of each device for all candidates that have a current. */
    public static Picture current(Scenario scenario, Figure figure, List<CurrentSweep> sweeps) {
        return PlateDrawing.picture(plate(scenario, figure, sweeps));
    }

    static Plate plate(Scenario scenario, Figure figure, List<CurrentSweep> sweeps) {
        if (sweeps.isEmpty()) {
            throw new IllegalArgumentException("no candidate has a current to draw");
        }
        double least = Double.POSITIVE_INFINITY;
        double greatest = Double.NEGATIVE_INFINITY;
        double from = Double.POSITIVE_INFINITY;
        double to = 0.0;
        List<Trace> zones = new ArrayList<>();
        List<Trace> lines = new ArrayList<>();
        List<Shade> shades = new ArrayList<>();
        for (int k = 0; k < sweeps.size(); k++) {
            CurrentSweep sweep = sweeps.get(k);
            List<Double> levels = levels(sweep.typicalVolts());
            List<Double> amps = sweep.amps();
            from = Math.min(from, amps.get(0));
            to = Math.max(to, amps.get(amps.size() - 1));
            for (double level : levels) {
                least = Math.min(least, level);
                greatest = Math.max(greatest, level);
            }
            int number = number(scenario, sweep.choice().design());
            Design design = sweep.choice().design();
            lines.add(new Trace(
                    Trace.Role.CANDIDATE, number, design.candidate().name(), chosen(sweep.choice()), amps, levels));
            shades.add(new Shade(number, amps, levels(sweep.leastVolts()), levels(sweep.greatestVolts())));
            sweep.flat().ifPresent(flat -> zone(amps, levels, flat, number).forEach(zones::add));
        }
        List<Trace> traces = new ArrayList<>(lines);
        traces.addAll(zones);
        double top = Math.min(greatest + ROOM_DECIBELS, least + MOST_DECIBELS);
        String weighting = Phrases.weighting(figure.weighting());
        return new Plate(
                scenario.title(),
                List.of(
                        "Source: " + Phrases.source(scenario.source()) + ". Path and stage at "
                                + Phrases.temperature(scenario.temperatureKelvin()) + ".",
                        "EIN over " + Phrases.band(scenario.band()) + ", " + weighting
                                + ", referred to the source's EMF, source noise included.",
                        "Broad: within 0.1 dB of the best current. Shaded: hFE (JFET: IDSS with VGS(off)) from its least to its"
                                + " greatest."),
                new Scale("current of each device, A", Scale.Kind.LOGARITHMIC_PREFIXED, from, to),
                new Scale(
                        "equivalent input noise, " + weighting + ", dBu",
                        Scale.Kind.LEVEL,
                        Math.floor(least - ROOM_DECIBELS),
                        Math.ceil(top)),
                traces,
                List.of(),
                shades);
    }

    private static List<Trace> zone(List<Double> amps, List<Double> levels, BestCurrent.Optimum flat, int number) {
        List<Double> x = new ArrayList<>();
        List<Double> y = new ArrayList<>();
        for (int k = 0; k < amps.size(); k++) {
            if (amps.get(k) >= flat.flatFromAmps() && amps.get(k) <= flat.flatToAmps()) {
                x.add(amps.get(k));
                y.add(levels.get(k));
            }
        }
        return x.size() < 2 ? List.of() : List.of(new Trace(Trace.Role.ZONE, number, "", "", x, y));
    }

    /** What the search settled on: devices, current and open values. */
    private static String chosen(OpenSearch.Choice choice) {
        int count = choice.design().deviceCount();
        StringBuilder words =
                new StringBuilder(choice.design().candidate().device().id());
        words.append(count == 1 ? "" : " x" + count)
                .append(", ")
                .append(Phrases.value(choice.amps(), "A"))
                .append(count == 1 ? "" : " each");
        choice.values().forEach((open, value) -> {
            if (!(open instanceof OpenValue.Count)) {
                words.append(", ").append(open.name()).append(' ').append(Phrases.chosen(open, value));
            }
        });
        return words.toString();
    }

    private static int number(Scenario scenario, Design design) {
        for (int k = 0; k < scenario.candidates().size(); k++) {
            if (scenario.candidates().get(k).name().equals(design.candidate().name())) {
                return k;
            }
        }
        throw new IllegalStateException("a design of no candidate of the scenario");
    }

    private static List<Double> levels(List<Double> volts) {
        return volts.stream().map(Decibels::dbu).toList();
    }
}
