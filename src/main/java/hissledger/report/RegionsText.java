package hissledger.report;

import hissledger.choose.NoiseFigureMap;
import hissledger.choose.Regions;
import hissledger.choose.Scenario;
import hissledger.choose.SpotCrossover;
import hissledger.circuit.CoilSource;
import hissledger.circuit.ResistorSource;
import hissledger.files.Phrases;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;

/** Who is quietest over source resistance and frequency, and the noise figure of one candidate over resistance and current. */
public final class RegionsText {
    private static final double PERCENT = 100.0;
    /** A tenth of a per cent of a crossing is the last digit printed. */
    private static final double LEAST_PERCENT = 0.05;

    private RegionsText() {}

    /** The winners at round resistances, and the crossovers. */
    public static String of(Regions regions) {
        Scenario scenario = regions.scenario();
        StringBuilder text = new StringBuilder();
        head(text, scenario);
        line(
                text,
                "Each candidate at the current it states, or at its best over the band for each resistance, by the figure it"
                        + " names.");
        text.append("Quietest candidate and by how many dB it leads the next (spots: EIN density; band: ")
                .append(Words.ein(regions.figure().weighting()))
                .append("):\n\n");
        text.append(winners(regions).render()).append('\n');
        List<Integer> winners = regions.winners();
        List<String> losers = new ArrayList<>();
        for (int c = 0; c < scenario.candidates().size(); c++) {
            if (!winners.contains(c)) {
                losers.add(quoted(regions.name(c)));
            }
        }
        if (!losers.isEmpty()) {
            line(text, "Nowhere quietest at these resistances and frequencies: " + String.join(", ", losers) + ".");
        }
        crossovers(regions).forEach(sentence -> line(text, sentence));
        return text.toString();
    }

    private static void head(StringBuilder text, Scenario scenario) {
        text.append(scenario.title()).append('\n');
        Words.conditions(scenario).forEach(each -> text.append(each).append('\n'));
        boolean keepsItsKind = scenario.source() instanceof ResistorSource || scenario.source() instanceof CoilSource;
        line(
                text,
                keepsItsKind
                        ? "The resistance of the source is varied, everything else unchanged."
                        : "The source is replaced by a plain resistor at "
                                + Phrases.temperature(scenario.source().temperatureKelvin())
                                + ", which is varied; everything else unchanged.");
    }

    private static TextTable winners(Regions regions) {
        List<Double> spots = regions.scenario().spotsHertz();
        TextTable table = new TextTable().column(TextTable.Align.POINT, "source", "resistance");
        for (double hertz : spots) {
            table.column(TextTable.Align.LEFT, "at " + Phrases.brief(hertz, "Hz"), "quietest")
                    .column(TextTable.Align.POINT, "", "dB");
        }
        table.column(TextTable.Align.LEFT, "over the band", "quietest").column(TextTable.Align.POINT, "", "dB");
        for (Regions.Column column : regions.steps()) {
            List<String> cells = new ArrayList<>();
            cells.add(Phrases.value(column.ohms(), "Ω"));
            for (int spot = 0; spot < spots.size(); spot++) {
                lead(cells, regions, column.atSpot(spot));
            }
            lead(cells, regions, column.overBand());
            table.row(cells.toArray(String[]::new));
        }
        return table;
    }

    private static void lead(List<String> cells, Regions regions, Regions.Lead lead) {
        cells.add(regions.name(lead.winner()));
        cells.add(Words.decibels(lead.marginDecibels()));
    }

    private static List<String> crossovers(Regions regions) {
        if (regions.crossovers().isEmpty()) {
            return List.of("No crossover: the scenario needs both a bipolar and a JFET candidate for one.");
        }
        List<String> sentences = new ArrayList<>();
        for (SpotCrossover crossover : regions.crossovers()) {
            String where = crossover.hertz().isPresent()
                    ? "At " + Phrases.brief(crossover.hertz().getAsDouble(), "Hz")
                    : "Over the band (" + Words.ein(regions.figure().weighting()) + ")";
            if (crossover.crossings().isEmpty()) {
                List<Regions.Column> columns = regions.columns();
                sentences.add(where + " the best bipolar and the best JFET do not change places from "
                        + Phrases.brief(columns.get(0).ohms(), "Ω") + " to "
                        + Phrases.brief(columns.get(columns.size() - 1).ohms(), "Ω") + ": the "
                        + (crossover.bipolarQuieterAtLeastResistance() ? "bipolar" : "JFET")
                        + " is quieter throughout.");
            }
            boolean bipolarBelow = crossover.bipolarQuieterAtLeastResistance();
            for (SpotCrossover.Crossing crossing : crossover.crossings()) {
                sentences.add(where + " the best bipolar " + quoted(crossing.bipolar()) + " and the best JFET "
                        + quoted(crossing.jfet()) + " change places at " + Phrases.value(crossing.ohms(), "Ω")
                        + "; below it the " + (bipolarBelow ? "bipolar" : "JFET") + " is quieter. 10 % more "
                        + crossing.shifts().stream()
                                .map(shift -> shift(shift, crossing.ohms()))
                                .collect(Collectors.joining(", "))
                        + ".");
                bipolarBelow = !bipolarBelow;
            }
        }
        return sentences;
    }

    private static String shift(SpotCrossover.Shift shift, double ohms) {
        String more = shift.cause().words();
        if (shift.ohms().isEmpty()) {
            return more + " removes it";
        }
        double percent = PERCENT * (shift.ohms().getAsDouble() / ohms - 1.0);
        return Math.abs(percent) < LEAST_PERCENT
                ? more + " leaves it there"
                : String.format(
                        Locale.ROOT,
                        "%s moves it to %s (%+.1f %%)",
                        more,
                        Phrases.value(shift.ohms().getAsDouble(), "Ω"),
                        percent);
    }

    /** The noise figure of one candidate at round resistances and currents. */
    public static String of(NoiseFigureMap map) {
        StringBuilder text = new StringBuilder();
        head(text, map.scenario());
        line(
                text,
                "Noise figure in dB of " + quoted(map.candidate().name()) + " ("
                        + map.candidate().device().id()
                        + "), unweighted over the band, for source resistance and current of each device:");
        text.append('\n');
        TextTable table = new TextTable()
                .column(TextTable.Align.POINT, "source", "resistance")
                .column(TextTable.Align.POINT, "best", "current")
                .column(TextTable.Align.POINT, "NF", "there");
        for (double amps : map.stepAmps()) {
            table.column(TextTable.Align.POINT, "at", Phrases.brief(amps, "A"));
        }
        for (NoiseFigureMap.Step step : map.steps()) {
            List<String> cells = new ArrayList<>(List.of(
                    Phrases.value(step.ohms(), "Ω"),
                    Phrases.value(step.bestAmps(), "A"),
                    Words.decibels(step.bestDecibels())));
            step.decibels().forEach(each -> cells.add(Words.decibels(each)));
            table.row(cells.toArray(String[]::new));
        }
        text.append(table.render()).append('\n');
        line(
                text,
                map.working()
                        .map(point -> "Working point: source " + Phrases.brief(point.ohms(), "Ω") + ", "
                                + Phrases.value(point.amps(), "A") + " each, NF "
                                + Words.decibels(point.noiseFigureDecibels()) + " dB.")
                        .orElse("No working point: the scenario's source is no resistor and no coil."));
        return text.toString();
    }

    private static String quoted(String name) {
        return '"' + name + '"';
    }

    private static void line(StringBuilder text, String sentence) {
        Words.wrapped(sentence).forEach(each -> text.append(each).append('\n'));
    }
}
