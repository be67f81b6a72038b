package hissledger.report;

import hissledger.choose.Evaluation;
import hissledger.choose.Scenario;
import hissledger.circuit.Signal;
import hissledger.files.Phrases;
import hissledger.ledger.Accounting;
import hissledger.ledger.Entry;
import hissledger.ledger.EntrySpectrum;
import hissledger.ledger.Figure;
import hissledger.ledger.Headroom;
import hissledger.ledger.Ledger;
import hissledger.ledger.Running;
import hissledger.ledger.Spot;
import hissledger.ledger.Totals;
import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import hissledger.twoport.NoiseParameters;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;

/** The itemised account as text. */
public final class LedgerText {
    private static final String LOW = Phrases.brief(Accounting.LOW_BAND_TO_HERTZ, "Hz");

    private LedgerText() {}

    /**
     * The accounts of the given candidates of a scenario, lines ended by line feeds.
     *
     * @param full whether to print every figure, or those a designer looks at first
     */
    public static String of(Scenario scenario, List<Evaluation> evaluations, boolean full) {
        StringBuilder text = head(scenario);
        for (Evaluation evaluation : evaluations) {
            Ledger ledger = evaluation.ledger();
            text.append('\n').append(name(evaluation)).append('\n');
            text.append(entries(scenario, ledger, full).render()).append('\n');
            text.append(figures(ledger, full).render());
            if (full) {
                text.append('\n').append(twoPort(ledger).render());
                text.append('\n').append(impedances(ledger).render());
                text.append('\n').append(running(ledger).render());
            }
            List<String> working = new ArrayList<>();
            CompareText.bestCurrents(List.of(evaluation)).forEach(sentence -> working.addAll(Words.wrapped(sentence)));
            CompareText.cautions(List.of(evaluation)).forEach(caution -> working.addAll(Words.wrapped(caution)));
            if (!working.isEmpty()) {
                text.append('\n');
                working.forEach(remark -> text.append(remark).append('\n'));
            }
        }
        List<String> remarks = CompareText.remarks(evaluations);
        if (!remarks.isEmpty()) {
            text.append('\n');
            remarks.forEach(remark -> text.append(remark).append('\n'));
        }
        return text.toString();
    }

    /** One entry of each candidate against frequency. */
    public static String entry(Scenario scenario, List<Evaluation> evaluations, List<EntrySpectrum> spectra) {
        StringBuilder text = head(scenario);
        for (int c = 0; c < evaluations.size(); c++) {
            EntrySpectrum spectrum = spectra.get(c);
            text.append('\n').append(name(evaluations.get(c))).append('\n');
            TextTable table = new TextTable()
                    .column(TextTable.Align.POINT, "frequency")
                    .column(TextTable.Align.POINT, spectrum.name(), "per √Hz")
                    .column(TextTable.Align.POINT, "EIN", "per √Hz")
                    .column(TextTable.Align.POINT, "share", "%");
            for (int k = 0; k < spectrum.hertz().size(); k++) {
                double entry = spectrum.entryVoltsPerRootHertz().get(k);
                double ein = spectrum.einVoltsPerRootHertz().get(k);
                table.row(
                        Words.value(spectrum.hertz().get(k), "Hz"),
                        Words.value(entry, "V"),
                        Words.value(ein, "V"),
                        percent(entry * entry / (ein * ein)));
            }
            text.append(table.render());
        }
        return text.toString();
    }

    private static StringBuilder head(Scenario scenario) {
        StringBuilder text = new StringBuilder();
        text.append(scenario.title()).append('\n');
        Words.conditions(scenario).forEach(line -> text.append(line).append('\n'));
        CompareText.target(scenario.target()).forEach(line -> text.append(line).append('\n'));
        return text;
    }

    private static String name(Evaluation evaluation) {
        String current = evaluation.ledger().frontEnd().stage().deviceAmps().isPresent()
                ? ", " + Words.current(evaluation) + " each"
                : "";
        return "[" + evaluation.name() + "] " + Words.device(evaluation) + ", "
                + evaluation.candidate().plan().arrangement().label() + current;
    }

    private static TextTable entries(Scenario scenario, Ledger ledger, boolean full) {
        TextTable table = new TextTable()
                .column(TextTable.Align.LEFT, "entry")
                .column(TextTable.Align.LEFT, "kind")
                .column(
                        TextTable.Align.POINT,
                        "over the band,",
                        ledger.weighting().label() + ", rms")
                .column(TextTable.Align.POINT, "share", "%")
                .column(TextTable.Align.POINT, "saves", "dB");
        if (full) {
            table.column(TextTable.Align.POINT, "below " + LOW, "%").column(TextTable.Align.POINT, "above " + LOW, "%");
        }
        for (double spot : scenario.spotsHertz()) {
            table.column(TextTable.Align.POINT, "at " + Phrases.brief(spot, "Hz"), "per √Hz");
        }
        Totals totals = ledger.totals();
        double low = ledger.entries().stream()
                .mapToDouble(Entry::lowBandVoltsSquared)
                .sum();
        double mid = ledger.entries().stream()
                .mapToDouble(Entry::midBandVoltsSquared)
                .sum();
        for (Entry entry : ledger.entries()) {
            List<String> cells = new ArrayList<>(List.of(
                    entry.name(),
                    entry.source().kind().label(),
                    Words.value(entry.bandVolts(), "V"),
                    percent(entry.share()),
                    Double.isFinite(entry.savesDecibels()) ? Words.decibels(entry.savesDecibels()) : "all"));
            if (full) {
                cells.add(part(entry.lowBandVoltsSquared(), low));
                cells.add(part(entry.midBandVoltsSquared(), mid));
            }
            entry.spotVoltsPerRootHertz().forEach(density -> cells.add(Words.value(density, "V")));
            table.row(cells.toArray(String[]::new));
        }
        List<String> total = new ArrayList<>(
                List.of("total", "", Words.value(totals.ein(ledger.weighting()), "V"), percent(1.0), ""));
        if (full) {
            total.add(totals.lowBandVolts().isPresent() ? percent(1.0) : "-");
            total.add(totals.midBandVolts().isPresent() ? percent(1.0) : "-");
        }
        ledger.spots().forEach(spot -> total.add(Words.value(spot.einVoltsPerRootHertz(), "V")));
        table.row(total.toArray(String[]::new));
        return table;
    }

    private static String part(double voltsSquared, double wholeVoltsSquared) {
        return wholeVoltsSquared > 0.0 ? percent(voltsSquared / wholeVoltsSquared) : "-";
    }

    private static String percent(double share) {
        return String.format(Locale.ROOT, "%.2f", 100.0 * share);
    }

    private static TextTable figures(Ledger ledger, boolean full) {
        Totals totals = ledger.totals();
        TextTable table = new TextTable()
                .column(TextTable.Align.LEFT, "over the band")
                .column(TextTable.Align.POINT, "rms")
                .column(TextTable.Align.POINT, "dBu")
                .column(TextTable.Align.POINT, "dBV");
        level(table, "EIN flat, at the EMF", totals.ein(Weighting.FLAT));
        for (Weighting weighting : List.of(Weighting.A, Weighting.ITU_468, Weighting.PLAYBACK, Weighting.PLAYBACK_A)) {
            if (full || weighting == Weighting.A) {
                level(table, Words.ein(weighting) + ", at the EMF", totals.ein(weighting));
            }
        }
        level(table, "EIN flat, at the source's loaded terminals", totals.einAtTerminalsVolts());
        level(table, "EIN flat, as measured (output over gain at 1 kHz)", totals.einAsMeasured(Weighting.FLAT));
        if (full) {
            for (Weighting weighting : List.of(Weighting.A, Weighting.PLAYBACK, Weighting.PLAYBACK_A)) {
                level(table, Words.ein(weighting) + ", as measured", totals.einAsMeasured(weighting));
            }
        }
        totals.lowBandVolts().ifPresent(low -> level(table, "EIN flat below " + LOW + ", at the EMF", low));
        totals.midBandVolts().ifPresent(mid -> level(table, "EIN flat above " + LOW + ", at the EMF", mid));
        double floor = totals.floor(Weighting.FLAT);
        if (floor > 0.0) {
            level(table, "floor: the source alone, flat", floor);
        }
        ratio(table, "EIN flat above the floor", totals.aboveFloorDecibels(), "dB");
        ratio(table, "NF of the band, flat, re 290 K", totals.noiseFigureDecibels(), "dB");
        OptionalDouble noiseLevel = ledger.figure(Figure.EQUIVALENT_NOISE_LEVEL);
        if (noiseLevel.isPresent()) {
            ratio(table, "equivalent noise level", noiseLevel, "dB(A) SPL");
        }
        for (Weighting weighting : List.of(Weighting.FLAT, Weighting.A, Weighting.PLAYBACK, Weighting.PLAYBACK_A)) {
            OptionalDouble signal = ledger.signalToNoiseDecibels(weighting);
            if (signal.isPresent() && (full || weighting == Weighting.A)) {
                ratio(table, "reference level over EIN as measured, " + weighting.label(), signal, "dB");
            }
        }
        ledger.headroom().ifPresent(headroom -> headroom(table, headroom));
        if (ledger.frontEnd().stage().deviceAmps().isPresent()) {
            table.row(
                    "current of all devices",
                    Words.value(ledger.frontEnd().stage().totalAmps(), "A"),
                    "",
                    "");
        }
        return table;
    }

    private static void headroom(TextTable table, Headroom headroom) {
        String what = headroom.cutOff()
                ? "cut-off of the device"
                : "1 % " + (headroom.harmonic() == 2 ? "second" : "third") + " harmonic of the device";
        level(table, what + ": at the stage's input", headroom.stageVolts());
        level(table, what + ": EMF at 1 kHz", headroom.emfVolts());
        if (headroom.soundPressureDecibels().isPresent()) {
            ratio(table, what + ": sound pressure", headroom.soundPressureDecibels(), "dB SPL");
        }
        ratio(table, "dynamic range, that EMF over EIN flat", OptionalDouble.of(headroom.dynamicRangeDecibels()), "dB");
    }

    private static void level(TextTable table, String words, double volts) {
        table.row(words, Words.value(volts, "V"), Words.dbu(volts), Words.decibels(Decibels.dbv(volts)));
    }

    private static void ratio(TextTable table, String words, OptionalDouble decibels, String unit) {
        String cell = decibels.isPresent() ? Words.decibels(decibels) + " " + unit : Words.NOT_DEFINED;
        table.row(words, cell, "", "");
    }

    /** Path and stage as a noisy two-port. */
    private static TextTable twoPort(Ledger ledger) {
        Signal signal = ledger.frontEnd().source().signal();
        boolean sensor = signal.voltsPerUnit().isPresent() && !signal.unit().isEmpty();
        TextTable table = new TextTable()
                .column(TextTable.Align.POINT, "path + stage", "at")
                .column(TextTable.Align.POINT, "spot", "NF dB")
                .column(TextTable.Align.POINT, "noise", "temperature")
                .column(TextTable.Align.POINT, "en", "per √Hz")
                .column(TextTable.Align.POINT, "in", "per √Hz")
                .column(TextTable.Align.POINT, "<e i*>/(en in)", "re")
                .column(TextTable.Align.POINT, "", "im")
                .column(TextTable.Align.POINT, "Rn")
                .column(TextTable.Align.POINT, "least", "NF dB")
                .column(TextTable.Align.POINT, "best source", "resistance")
                .column(TextTable.Align.POINT, "best source", "reactance");
        if (sensor) {
            table.column(TextTable.Align.POINT, "EIN density", "per √Hz");
        }
        for (Spot spot : ledger.spots()) {
            NoiseParameters parameters = spot.parameters();
            OptionalDouble kelvin = spot.noiseTemperatureKelvin();
            List<String> cells = new ArrayList<>(List.of(
                    Phrases.brief(spot.hertz(), "Hz"),
                    Words.decibels(spot.noiseFigureDecibels()),
                    kelvin.isPresent() ? Words.value(kelvin.getAsDouble(), "K") : Words.NOT_DEFINED,
                    Words.value(parameters.voltsPerRootHertz(), "V"),
                    Words.value(parameters.ampsPerRootHertz(), "A"),
                    String.format(Locale.ROOT, "%.3f", parameters.correlationRe()),
                    String.format(Locale.ROOT, "%.3f", parameters.correlationIm()),
                    Words.value(parameters.noiseResistanceOhms(), "Ω"),
                    Words.decibels(parameters.minimumNoiseFigureDecibels()),
                    ohms(parameters.optimumResistanceOhms()),
                    ohms(parameters.optimumReactanceOhms())));
            if (sensor) {
                cells.add(Words.value(
                        spot.einVoltsPerRootHertz() / signal.voltsPerUnit().getAsDouble(), signal.unit()));
            }
            table.row(cells.toArray(String[]::new));
        }
        return table;
    }

    private static String ohms(double ohms) {
        return Double.isFinite(ohms) ? Words.value(ohms, "Ω") : Words.NOT_DEFINED;
    }

    /** What the source sees and what comes out. */
    private static TextTable impedances(Ledger ledger) {
        TextTable table = new TextTable()
                .column(TextTable.Align.POINT, "input and output", "at")
                .column(TextTable.Align.POINT, "source", "resistance")
                .column(TextTable.Align.POINT, "source", "reactance")
                .column(TextTable.Align.POINT, "input, parallel", "resistance")
                .column(TextTable.Align.POINT, "input, parallel", "capacitance")
                .column(TextTable.Align.POINT, "gain from", "EMF dB");
        for (Spot spot : ledger.spots()) {
            double omega = 2.0 * Math.PI * spot.hertz();
            table.row(
                    Phrases.brief(spot.hertz(), "Hz"),
                    Words.value(spot.sourceOhms(), "Ω"),
                    Words.value(spot.sourceReactanceOhms(), "Ω"),
                    spot.inputSiemens() == 0.0 ? "none" : ohms(1.0 / spot.inputSiemens()),
                    Words.value(spot.inputSusceptanceSiemens() / omega, "F"),
                    Words.decibels(spot.gainDecibels()));
        }
        return table;
    }

    private static TextTable running(Ledger ledger) {
        TextTable table = new TextTable()
                .column(
                        TextTable.Align.POINT,
                        "from " + Phrases.brief(ledger.band().fromHertz(), "Hz"),
                        "up to")
                .column(TextTable.Align.POINT, "EIN flat", "dBu")
                .column(TextTable.Align.POINT, "EIN A", "dBu");
        for (Running step : ledger.running()) {
            table.row(Phrases.brief(step.hertz(), "Hz"), Words.dbu(step.flatVolts()), Words.dbu(step.aWeightedVolts()));
        }
        return table;
    }
}
