package hissledger.report;

import hissledger.choose.Comparison;
import hissledger.choose.Evaluation;
import hissledger.choose.NoiseFigureMap;
import hissledger.choose.OpenSearch;
import hissledger.choose.Regions;
import hissledger.choose.Scenario;
import hissledger.choose.Target;
import hissledger.ledger.Entry;
import hissledger.ledger.EntrySpectrum;
import hissledger.ledger.Figure;
import hissledger.ledger.Totals;
import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Results as CSV (RFC 4180): a header that names each column with its unit, SI values, decimal points, CRLF. */
public final class Csv {
    private static final String END = "\r\n";

    private Csv() {}

    /** One row a candidate, quietest first. */
    public static String comparison(Comparison comparison) {
        StringBuilder text = new StringBuilder();
        record(
                text,
                List.of(
                        "candidate",
                        "device",
                        "arrangement",
                        "inParallel",
                        "current_A",
                        "currentIsBest",
                        "einFlat_V",
                        "einFlat_dBu",
                        "einA_dBu",
                        "aboveFloor_dB",
                        "noiseFigure_dB",
                        "einLowBand_dBu",
                        "strongestEntry",
                        "strongestEntrySaves_dB",
                        "totalCurrent_A",
                        "targetMargin_dB",
                        "rankedBy",
                        "ranked_" + (comparison.figure().isEin() ? "dBu" : "dB"),
                        "from_Hz",
                        "to_Hz",
                        "temperature_K"));
        Target target = comparison.scenario().target();
        for (Evaluation evaluation : comparison.ranked()) {
            Totals totals = evaluation.ledger().totals();
            Entry strongest = evaluation.ledger().dominating();
            OptionalDouble low = totals.lowBandVolts();
            record(
                    text,
                    List.of(
                            evaluation.name(),
                            evaluation.candidate().device().id(),
                            evaluation.candidate().plan().arrangement().label(),
                            String.valueOf(evaluation.candidate().plan().inParallel()),
                            number(evaluation.amps()),
                            String.valueOf(evaluation.optimum().isPresent()),
                            number(totals.ein(Weighting.FLAT)),
                            number(Decibels.dbu(totals.ein(Weighting.FLAT))),
                            number(Decibels.dbu(totals.ein(Weighting.A))),
                            number(totals.aboveFloorDecibels()),
                            number(totals.noiseFigureDecibels()),
                            low.isPresent() ? number(Decibels.dbu(low.getAsDouble())) : "",
                            strongest.name(),
                            number(strongest.savesDecibels()),
                            number(evaluation.ledger().frontEnd().stage().totalAmps()),
                            number(evaluation.marginDecibels(target)),
                            comparison.figure().key(),
                            number(ranked(evaluation, comparison.figure())),
                            number(comparison.scenario().band().fromHertz()),
                            number(comparison.scenario().band().toHertz()),
                            number(comparison.scenario().temperatureKelvin())));
        }
        return text.toString();
    }

    private static OptionalDouble ranked(Evaluation evaluation, Figure figure) {
        OptionalDouble value = evaluation.ledger().figure(figure);
        return figure.isEin() && value.isPresent() ? OptionalDouble.of(Decibels.dbu(value.getAsDouble())) : value;
    }

    /** One row an entry of each candidate, largest first; all at the source's EMF, stage and path at the temperature. */
    public static String ledger(Scenario scenario, List<Evaluation> evaluations) {
        StringBuilder text = new StringBuilder();
        List<String> header = new ArrayList<>(List.of(
                "candidate",
                "entry",
                "kind",
                "weighting",
                "from_Hz",
                "to_Hz",
                "temperature_K",
                "band_V",
                "share",
                "saves_dB"));
        scenario.spotsHertz().forEach(spot -> header.add("at_" + number(spot) + "_Hz_V_rtHz"));
        record(text, header);
        for (Evaluation evaluation : evaluations) {
            for (Entry entry : evaluation.ledger().entries()) {
                List<String> cells = new ArrayList<>(List.of(
                        evaluation.name(),
                        entry.name(),
                        entry.source().kind().label(),
                        evaluation.ledger().weighting().label(),
                        number(scenario.band().fromHertz()),
                        number(scenario.band().toHertz()),
                        number(scenario.temperatureKelvin()),
                        number(entry.bandVolts()),
                        number(entry.share()),
                        number(entry.savesDecibels())));
                entry.spotVoltsPerRootHertz().forEach(density -> cells.add(number(density)));
                record(text, cells);
            }
        }
        return text.toString();
    }

    /** One row a candidate of a search over open values. */
    public static String optimum(List<OptimumText.Searched> searched) {
        StringBuilder text = new StringBuilder();
        record(text, List.of("candidate", "device", "deviceCount", "current_A", "ein_V", "ein_dBu", "chosen"));
        for (OptimumText.Searched each : searched) {
            OpenSearch.Choice best = each.outcome().best();
            List<String> chosen = new ArrayList<>();
            best.values().forEach((open, value) -> chosen.add(open.name() + "=" + number(value)));
            record(
                    text,
                    List.of(
                            each.candidate().name(),
                            each.candidate().device().id(),
                            String.valueOf(best.design().deviceCount()),
                            number(best.amps()),
                            number(best.einVolts()),
                            number(Decibels.dbu(best.einVolts())),
                            String.join("; ", chosen)));
        }
        return text.toString();
    }

    /** One row a source resistance and frequency of the grid: who is quietest, by how much, and its current. */
    public static String regions(Regions regions) {
        StringBuilder text = new StringBuilder();
        record(
                text,
                List.of(
                        "sourceResistance_ohm",
                        "frequency_Hz",
                        "quietest",
                        "next",
                        "margin_dB",
                        "ein_V_rtHz",
                        "current_A"));
        for (Regions.Column column : regions.columns()) {
            for (int j = 0; j < regions.hertz().size(); j++) {
                Regions.Lead lead = column.atGrid(j);
                record(
                        text,
                        List.of(
                                number(column.ohms()),
                                number(regions.hertz().get(j)),
                                regions.name(lead.winner()),
                                regions.name(lead.next()),
                                number(lead.marginDecibels()),
                                number(column.gridVoltsPerRootHertz()
                                        .get(lead.winner())
                                        .get(j)),
                                number(column.amps().get(lead.winner()))));
            }
        }
        return text.toString();
    }

    /** One row a source resistance and current of the map. */
    public static String noiseFigureMap(NoiseFigureMap map) {
        StringBuilder text = new StringBuilder();
        record(text, List.of("sourceResistance_ohm", "current_A", "noiseFigure_dB", "bestCurrent_A"));
        List<Double> ohms = map.noiseFigure().across();
        List<Double> amps = map.noiseFigure().up();
        for (int k = 0; k < ohms.size(); k++) {
            for (int j = 0; j < amps.size(); j++) {
                record(
                        text,
                        List.of(
                                number(ohms.get(k)),
                                number(amps.get(j)),
                                number(map.noiseFigure().at(k, j)),
                                number(map.ridge().get(k))));
            }
        }
        return text.toString();
    }

    /** One row a frequency of one entry of each candidate. */
    public static String entry(List<Evaluation> evaluations, List<EntrySpectrum> spectra) {
        StringBuilder text = new StringBuilder();
        record(text, List.of("candidate", "entry", "frequency_Hz", "entry_V_rtHz", "ein_V_rtHz"));
        for (int c = 0; c < evaluations.size(); c++) {
            EntrySpectrum spectrum = spectra.get(c);
            for (int k = 0; k < spectrum.hertz().size(); k++) {
                record(
                        text,
                        List.of(
                                evaluations.get(c).name(),
                                spectrum.name(),
                                number(spectrum.hertz().get(k)),
                                number(spectrum.entryVoltsPerRootHertz().get(k)),
                                number(spectrum.einVoltsPerRootHertz().get(k))));
            }
        }
        return text.toString();
    }

    private static String number(double value) {
        return Double.isFinite(value) ? Double.toString(value) : "";
    }

    private static String number(OptionalDouble value) {
        return value.isPresent() ? number(value.getAsDouble()) : "";
    }

    private static void record(StringBuilder text, List<String> cells) {
        text.append(String.join(",", cells.stream().map(Csv::quoted).toList())).append(END);
    }

    private static String quoted(String cell) {
        boolean plain = cell.chars().noneMatch(c -> c == ',' || c == '"' || c == '\n' || c == '\r');
        return plain ? cell : '"' + cell.replace("\"", "\"\"") + '"';
    }
}
