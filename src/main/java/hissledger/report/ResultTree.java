package hissledger.report;

import hissledger.choose.BestCurrent;
import hissledger.choose.Comparison;
import hissledger.choose.Evaluation;
import hissledger.choose.NoiseFigureMap;
import hissledger.choose.OpenSearch;
import hissledger.choose.Regions;
import hissledger.choose.Scenario;
import hissledger.choose.Sensitivity;
import hissledger.choose.SpotCrossover;
import hissledger.choose.Surface;
import hissledger.ledger.Entry;
import hissledger.ledger.EntrySpectrum;
import hissledger.ledger.Figure;
import hissledger.ledger.Headroom;
import hissledger.ledger.Ledger;
import hissledger.ledger.NoiseSpectrum;
import hissledger.ledger.Running;
import hissledger.ledger.Spot;
import hissledger.ledger.Totals;
import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Results as a tree of maps, lists and plain numbers, ready to be written as JSON. A figure that is not defined is an empty
 * {@link OptionalDouble}, which is written as {@code null}.
 */
public final class ResultTree {
    private ResultTree() {}

    /** The accounts of some candidates of a scenario. */
    public static Map<String, Object> ledger(Scenario scenario, List<Evaluation> evaluations) {
        Map<String, Object> tree = head(scenario);
        List<Object> candidates = new ArrayList<>();
        evaluations.forEach(evaluation -> candidates.add(candidate(evaluation, scenario)));
        tree.put("candidates", candidates);
        return tree;
    }

    /** A comparison: the accounts, quietest first, and the decision. */
    public static Map<String, Object> comparison(Comparison comparison) {
        Map<String, Object> tree = ledger(comparison.scenario(), comparison.ranked());
        Map<String, Object> decision = new LinkedHashMap<>();
        decision.put("figure", comparison.figure().key());
        decision.put("winner", comparison.winner().name());
        decision.put("lead_dB", comparison.leadDecibels());
        comparison.crossover().ifPresent(crossover -> {
            Map<String, Object> places = new LinkedHashMap<>();
            places.put("bipolar", crossover.bipolar().name());
            places.put("jfet", crossover.jfet().name());
            places.put("sourceResistance_ohm", crossover.resistanceOhms());
            places.put("bipolarQuieterAtOneOhm", crossover.bipolarQuieterAtLeastResistance());
            decision.put("crossover", places);
        });
        tree.put("decision", decision);
        return tree;
    }

    /** One entry of some candidates against frequency. */
    public static Map<String, Object> entry(
            Scenario scenario, List<Evaluation> evaluations, List<EntrySpectrum> spectra) {
        Map<String, Object> tree = head(scenario);
        List<Object> candidates = new ArrayList<>();
        for (int c = 0; c < evaluations.size(); c++) {
            EntrySpectrum spectrum = spectra.get(c);
            Map<String, Object> candidate = new LinkedHashMap<>();
            candidate.put("name", evaluations.get(c).name());
            candidate.put("entry", spectrum.name());
            candidate.put("frequency_Hz", spectrum.hertz());
            candidate.put("entry_V_rtHz", spectrum.entryVoltsPerRootHertz());
            candidate.put("ein_V_rtHz", spectrum.einVoltsPerRootHertz());
            candidates.add(candidate);
        }
        tree.put("candidates", candidates);
        return tree;
    }

    /** Who is quietest over source resistance and frequency; rows of the grid by resistance, then by frequency. */
    public static Map<String, Object> regions(Regions regions) {
        Map<String, Object> tree = head(regions.scenario());
        tree.put("candidates", names(regions));
        tree.put("figure", regions.figure().key());
        Map<String, Object> grid = new LinkedHashMap<>();
        grid.put("sourceResistance_ohm", regions.resistanceOhms());
        grid.put("frequency_Hz", regions.hertz());
        List<Object> winners = new ArrayList<>();
        for (Regions.Column column : regions.columns()) {
            List<Integer> row = new ArrayList<>();
            for (int j = 0; j < regions.hertz().size(); j++) {
                row.add(column.atGrid(j).winner());
            }
            winners.add(row);
        }
        grid.put("quietest", winners);
        grid.put("margin_dB", rows(regions.margin()));
        grid.put(
                "current_A",
                regions.columns().stream().map(Regions.Column::amps).toList());
        tree.put("grid", grid);
        List<Object> steps = new ArrayList<>();
        for (Regions.Column column : regions.steps()) {
            Map<String, Object> step = new LinkedHashMap<>();
            step.put("sourceResistance_ohm", column.ohms());
            List<Object> spots = new ArrayList<>();
            for (int spot = 0; spot < regions.scenario().spotsHertz().size(); spot++) {
                Map<String, Object> at = new LinkedHashMap<>();
                at.put("frequency_Hz", regions.scenario().spotsHertz().get(spot));
                at.putAll(lead(regions, column.atSpot(spot)));
                spots.add(at);
            }
            step.put("spots", spots);
            step.put("band", lead(regions, column.overBand()));
            steps.add(step);
        }
        tree.put("steps", steps);
        List<Object> crossovers = new ArrayList<>();
        regions.crossovers().forEach(crossover -> crossovers.add(crossover(crossover)));
        tree.put("crossovers", crossovers);
        return tree;
    }

    private static List<String> names(Regions regions) {
        List<String> names = new ArrayList<>();
        regions.scenario().candidates().forEach(candidate -> names.add(candidate.name()));
        return names;
    }

    private static Map<String, Object> lead(Regions regions, Regions.Lead lead) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("quietest", regions.name(lead.winner()));
        tree.put("next", regions.name(lead.next()));
        tree.put("margin_dB", lead.marginDecibels());
        return tree;
    }

    /** A crossover; a band has no frequency. */
    private static Map<String, Object> crossover(SpotCrossover crossover) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("frequency_Hz", crossover.hertz());
        tree.put("bipolarQuieterAtLeastResistance", crossover.bipolarQuieterAtLeastResistance());
        List<Object> crossings = new ArrayList<>();
        for (SpotCrossover.Crossing crossing : crossover.crossings()) {
            Map<String, Object> row = new LinkedHashMap<>();
            row.put("sourceResistance_ohm", crossing.ohms());
            row.put("bipolar", crossing.bipolar());
            row.put("jfet", crossing.jfet());
            Map<String, Object> shifts = new LinkedHashMap<>();
            crossing.shifts().forEach(shift -> shifts.put(shift.cause().key(), shift.ohms()));
            row.put("atTenPercentMore_ohm", shifts);
            crossings.add(row);
        }
        tree.put("crossings", crossings);
        return tree;
    }

    /** Noise figure of one candidate over source resistance and current; rows by resistance, then by current. */
    public static Map<String, Object> noiseFigureMap(NoiseFigureMap map) {
        Map<String, Object> tree = head(map.scenario());
        tree.put("candidate", map.candidate().name());
        tree.put("device", map.candidate().device().id());
        Map<String, Object> grid = new LinkedHashMap<>();
        grid.put("sourceResistance_ohm", map.noiseFigure().across());
        grid.put("current_A", map.noiseFigure().up());
        grid.put("noiseFigure_dB", rows(map.noiseFigure()));
        tree.put("grid", grid);
        Map<String, Object> ridge = new LinkedHashMap<>();
        ridge.put("sourceResistance_ohm", map.noiseFigure().across());
        ridge.put("current_A", map.ridge());
        ridge.put("noiseFigure_dB", map.ridgeDecibels());
        tree.put("bestCurrent", ridge);
        map.working().ifPresent(point -> {
            Map<String, Object> working = new LinkedHashMap<>();
            working.put("sourceResistance_ohm", point.ohms());
            working.put("current_A", point.amps());
            working.put("noiseFigure_dB", point.noiseFigureDecibels());
            tree.put("workingPoint", working);
        });
        return tree;
    }

    private static List<Object> rows(Surface surface) {
        List<Object> rows = new ArrayList<>();
        for (int k = 0; k < surface.across().size(); k++) {
            List<Double> row = new ArrayList<>();
            for (int j = 0; j < surface.up().size(); j++) {
                row.add(surface.at(k, j));
            }
            rows.add(row);
        }
        return rows;
    }

    /** The outcome of a search over open values. */
    public static Map<String, Object> optimum(Scenario scenario, Figure figure, List<OptimumText.Searched> searched) {
        Map<String, Object> tree = head(scenario);
        tree.put("figure", figure.key());
        List<Object> candidates = new ArrayList<>();
        for (OptimumText.Searched each : searched) {
            OpenSearch.Choice best = each.outcome().best();
            Map<String, Object> candidate = new LinkedHashMap<>();
            candidate.put("name", each.candidate().name());
            candidate.put("device", each.candidate().device().id());
            candidate.put("current_A", best.amps());
            candidate.put("deviceCount", best.design().deviceCount());
            candidate.put("ein_V", best.einVolts());
            candidate.put("ein_dBu", Decibels.dbu(best.einVolts()));
            candidate.put("closedFormCurrent_A", each.closedFormAmps());
            Map<String, Object> chosen = new LinkedHashMap<>();
            best.values().forEach((open, value) -> chosen.put(open.name(), value));
            candidate.put("chosen", chosen);
            Map<String, Object> zones = new LinkedHashMap<>();
            each.outcome().zones().forEach((open, zone) -> zones.put(open.name(), List.of(zone.from(), zone.to())));
            candidate.put("flatZones", zones);
            each.outcome().currentSearch().ifPresent(current -> candidate.put("bestCurrent", optimum(current)));
            List<Object> sensitivities = new ArrayList<>();
            for (Sensitivity sensitivity : each.sensitivities()) {
                Map<String, Object> row = new LinkedHashMap<>();
                row.put("name", sensitivity.name());
                row.put("perPercent_dB", sensitivity.perPercentDecibels());
                row.put("atLeast_dB", sensitivity.atLeastDecibels());
                row.put("atGreatest_dB", sensitivity.atGreatestDecibels());
                sensitivities.add(row);
            }
            candidate.put("sensitivities", sensitivities);
            candidates.add(candidate);
        }
        tree.put("candidates", candidates);
        return tree;
    }

    private static Map<String, Object> head(Scenario scenario) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("title", scenario.title());
        tree.put("temperature_K", scenario.temperatureKelvin());
        Map<String, Object> band = new LinkedHashMap<>();
        band.put("from_Hz", scenario.band().fromHertz());
        band.put("to_Hz", scenario.band().toHertz());
        tree.put("band", band);
        tree.put("reference", "source EMF, source noise included");
        return tree;
    }

    private static Map<String, Object> candidate(Evaluation evaluation, Scenario scenario) {
        Ledger ledger = evaluation.ledger();
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("name", evaluation.name());
        tree.put("device", evaluation.candidate().device().id());
        tree.put("arrangement", evaluation.candidate().plan().arrangement().label());
        tree.put("current_A", evaluation.amps());
        tree.put("inParallel", evaluation.candidate().plan().inParallel());
        evaluation.optimum().ifPresent(optimum -> tree.put("bestCurrent", optimum(optimum)));
        tree.put("entriesWeighting", ledger.weighting().label());
        tree.put("defaultsUsed", evaluation.design().defaultsUsed());
        tree.put("figures", figures(evaluation, scenario));
        List<Object> spots = new ArrayList<>();
        ledger.spots().forEach(spot -> spots.add(spot(spot)));
        tree.put("spots", spots);
        List<Object> entries = new ArrayList<>();
        ledger.entries().forEach(entry -> entries.add(entry(entry)));
        tree.put("entries", entries);
        tree.put("spectrum", spectrum(ledger.spectrum()));
        tree.put("running", running(ledger.running()));
        return tree;
    }

    private static Map<String, Object> optimum(BestCurrent.Optimum optimum) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("current_A", optimum.amps());
        tree.put("flatFrom_A", optimum.flatFromAmps());
        tree.put("flatTo_A", optimum.flatToAmps());
        tree.put("heldBackBy", optimum.bound().orElse(""));
        tree.put("otherMinima_A", optimum.otherMinimaAmps());
        return tree;
    }

    private static Map<String, Object> figures(Evaluation evaluation, Scenario scenario) {
        Ledger ledger = evaluation.ledger();
        Totals totals = ledger.totals();
        Map<String, Object> tree = new LinkedHashMap<>();
        for (Figure figure : Figure.values()) {
            if (figure.isEin()) {
                tree.put(figure.key() + "_V", totals.ein(figure.weighting()));
                tree.put(figure.key() + "_dBu", Decibels.dbu(totals.ein(figure.weighting())));
            }
        }
        tree.put("floorFlat_dBu", defined(Decibels.dbu(totals.floor(Weighting.FLAT))));
        tree.put("aboveFloor_dB", totals.aboveFloorDecibels());
        tree.put("noiseFigure_dB", totals.noiseFigureDecibels());
        tree.put("einFlatAtTerminals_dBu", Decibels.dbu(totals.einAtTerminalsVolts()));
        tree.put("einFlatAsMeasured_dBu", Decibels.dbu(totals.einAsMeasured(Weighting.FLAT)));
        tree.put("einAAsMeasured_dBu", Decibels.dbu(totals.einAsMeasured(Weighting.A)));
        OptionalDouble low = totals.lowBandVolts();
        tree.put("einLowBand_dBu", low.isPresent() ? Decibels.dbu(low.getAsDouble()) : OptionalDouble.empty());
        OptionalDouble mid = totals.midBandVolts();
        tree.put("einMidBand_dBu", mid.isPresent() ? Decibels.dbu(mid.getAsDouble()) : OptionalDouble.empty());
        tree.put("equivalentNoiseLevel_dBA", ledger.figure(Figure.EQUIVALENT_NOISE_LEVEL));
        tree.put("signalToNoiseA_dB", ledger.signalToNoiseDecibels(Weighting.A));
        Optional<Headroom> headroom = ledger.headroom();
        tree.put("secondHarmonicOnePercent_V", harmonic(headroom, 2));
        tree.put("thirdHarmonicOnePercent_V", harmonic(headroom, 3));
        tree.put("onePercentIsCutOff", headroom.map(Headroom::cutOff).orElse(false));
        tree.put("onePercentAtEmf_V", of(headroom.map(Headroom::emfVolts)));
        tree.put(
                "onePercent_dBSPL",
                headroom.map(Headroom::soundPressureDecibels).orElse(OptionalDouble.empty()));
        tree.put("dynamicRange_dB", of(headroom.map(Headroom::dynamicRangeDecibels)));
        tree.put("totalCurrent_A", ledger.frontEnd().stage().totalAmps());
        tree.put("targetMargin_dB", evaluation.marginDecibels(scenario.target()));
        return tree;
    }

    private static Map<String, Object> spot(Spot spot) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("frequency_Hz", spot.hertz());
        tree.put("ein_V_rtHz", spot.einVoltsPerRootHertz());
        tree.put("source_V_rtHz", spot.sourceVoltsPerRootHertz());
        tree.put("noiseFigure_dB", spot.noiseFigureDecibels());
        tree.put("en_V_rtHz", spot.parameters().voltsPerRootHertz());
        tree.put("in_A_rtHz", spot.parameters().ampsPerRootHertz());
        tree.put("correlation_re", spot.parameters().correlationRe());
        tree.put("correlation_im", spot.parameters().correlationIm());
        tree.put("noiseFigureMin_dB", defined(spot.parameters().minimumNoiseFigureDecibels()));
        tree.put("optimumResistance_ohm", defined(spot.parameters().optimumResistanceOhms()));
        tree.put("gain_dB", spot.gainDecibels());
        tree.put("sourceResistance_ohm", spot.sourceOhms());
        tree.put("sourceReactance_ohm", spot.sourceReactanceOhms());
        tree.put("noiseResistance_ohm", spot.parameters().noiseResistanceOhms());
        tree.put("optimumReactance_ohm", defined(spot.parameters().optimumReactanceOhms()));
        tree.put("noiseTemperature_K", spot.noiseTemperatureKelvin());
        tree.put("inputConductance_S", spot.inputSiemens());
        tree.put("inputSusceptance_S", spot.inputSusceptanceSiemens());
        return tree;
    }

    private static Map<String, Object> entry(Entry entry) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("name", entry.name());
        tree.put("kind", entry.source().kind().label());
        tree.put("band_V", entry.bandVolts());
        tree.put("share", entry.share());
        tree.put("saves_dB", defined(entry.savesDecibels()));
        tree.put("lowBand_V", Math.sqrt(entry.lowBandVoltsSquared()));
        tree.put("midBand_V", Math.sqrt(entry.midBandVoltsSquared()));
        tree.put("spots_V_rtHz", entry.spotVoltsPerRootHertz());
        return tree;
    }

    private static Map<String, Object> spectrum(NoiseSpectrum spectrum) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("frequency_Hz", spectrum.hertz());
        tree.put("ein_V_rtHz", spectrum.einVoltsPerRootHertz());
        tree.put("source_V_rtHz", spectrum.sourceVoltsPerRootHertz());
        return tree;
    }

    private static Map<String, Object> running(List<Running> running) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("frequency_Hz", running.stream().map(Running::hertz).toList());
        tree.put("einFlat_V", running.stream().map(Running::flatVolts).toList());
        tree.put("einA_V", running.stream().map(Running::aWeightedVolts).toList());
        return tree;
    }

    private static OptionalDouble harmonic(Optional<Headroom> headroom, int harmonic) {
        return of(headroom.filter(limit -> limit.harmonic() == harmonic).map(Headroom::stageVolts));
    }

    private static OptionalDouble of(Optional<Double> value) {
        return value.isPresent() ? OptionalDouble.of(value.get()) : OptionalDouble.empty();
    }

    private static OptionalDouble defined(double value) {
        return Double.isFinite(value) ? OptionalDouble.of(value) : OptionalDouble.empty();
    }
}
