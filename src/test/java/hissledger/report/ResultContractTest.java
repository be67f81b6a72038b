package hissledger.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import hissledger.choose.Comparison;
import hissledger.choose.Evaluation;
import hissledger.choose.Scenario;
import hissledger.files.Catalogue;
import hissledger.files.InputException;
import hissledger.files.JsonOut;
import hissledger.files.ScenarioReader;
import hissledger.ledger.Figure;
import hissledger.physics.Weighting;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The JSON that other programs read: these keys and meanings hold. */
class ResultContractTest {
    private static final List<String> CANDIDATE = List.of(
            "name",
            "device",
            "arrangement",
            "current_A",
            "inParallel",
            "defaultsUsed",
            "figures",
            "spots",
            "entries",
            "spectrum");
    private static final List<String> FIGURES = List.of(
            "einFlat_V",
            "einFlat_dBu",
            "einA_V",
            "einA_dBu",
            "ein468_V",
            "ein468_dBu",
            "floorFlat_dBu",
            "aboveFloor_dB",
            "noiseFigure_dB",
            "einFlatAtTerminals_dBu",
            "einFlatAsMeasured_dBu",
            "equivalentNoiseLevel_dBA",
            "secondHarmonicOnePercent_V",
            "totalCurrent_A");
    private static final List<String> SPOT = List.of(
            "frequency_Hz",
            "ein_V_rtHz",
            "source_V_rtHz",
            "noiseFigure_dB",
            "en_V_rtHz",
            "in_A_rtHz",
            "correlation_re",
            "correlation_im",
            "noiseFigureMin_dB",
            "optimumResistance_ohm",
            "gain_dB");
    private static final List<String> ENTRY = List.of("name", "kind", "band_V", "share", "saves_dB", "spots_V_rtHz");
    private static final List<String> SPECTRUM = List.of("frequency_Hz", "ein_V_rtHz", "source_V_rtHz");
    /** The entries of an account are summed in another order than its total. */
    private static final double ROUNDING = 1e-12;

    private static JsonNode ledger(String scenario) throws InputException, IOException {
        Scenario read = ScenarioReader.read(Path.of("scenarios", scenario), Catalogue.load(List.of()));
        List<Evaluation> evaluations = Comparison.evaluate(read, Weighting.FLAT);
        return new ObjectMapper().readTree(JsonOut.text(ResultTree.ledger(read, evaluations)));
    }

    private static List<String> names(JsonNode node) {
        List<String> names = new ArrayList<>();
        node.fieldNames().forEachRemaining(names::add);
        return names;
    }

    @Test
    void everyContractedKeyIsThere() throws InputException, IOException {
        JsonNode tree = ledger("vocal-gain-pair.json");
        assertThat(names(tree)).contains("title", "temperature_K", "band", "candidates");
        assertThat(names(tree.get("band"))).containsExactly("from_Hz", "to_Hz");
        for (JsonNode candidate : tree.get("candidates")) {
            assertThat(names(candidate)).containsAll(CANDIDATE);
            assertThat(names(candidate.get("figures"))).containsAll(FIGURES);
            candidate.get("spots").forEach(spot -> assertThat(names(spot)).containsAll(SPOT));
            candidate.get("entries").forEach(entry -> assertThat(names(entry)).containsAll(ENTRY));
            assertThat(names(candidate.get("spectrum"))).containsAll(SPECTRUM);
            assertThat(candidate.get("spectrum").get("frequency_Hz")).hasSize(240);
        }
    }

    @Test
    void entriesAreSortedAndTheirPowersSumToTheTotal() throws InputException, IOException {
        for (String scenario : List.of("vocal-dynamic.json", "capsule.json", "geophone.json", "guitar-pickup.json")) {
            for (JsonNode candidate : ledger(scenario).get("candidates")) {
                double sum = 0.0;
                double shares = 0.0;
                double before = Double.POSITIVE_INFINITY;
                for (JsonNode entry : candidate.get("entries")) {
                    double volts = entry.get("band_V").asDouble();
                    assertThat(volts).isLessThanOrEqualTo(before);
                    before = volts;
                    sum += volts * volts;
                    shares += entry.get("share").asDouble();
                }
                double total = candidate.get("figures").get("einFlat_V").asDouble();
                assertThat(Math.sqrt(sum) / total).isCloseTo(1.0, within(ROUNDING));
                assertThat(shares).isCloseTo(1.0, within(ROUNDING));
            }
        }
    }

    @Test
    void figuresWithoutMeaningAreNull() throws InputException, IOException {
        for (JsonNode candidate : ledger("hydrophone.json").get("candidates")) {
            assertThat(candidate.get("figures").get("equivalentNoiseLevel_dBA").isNull())
                    .isTrue();
        }
        for (JsonNode candidate : ledger("geophone.json").get("candidates")) {
            boolean amplifier = candidate.get("arrangement").asText().equals("amplifier");
            assertThat(candidate.get("figures").get("dynamicRange_dB").isNull()).isEqualTo(amplifier);
        }
    }

    @Test
    void theComparisonAddsItsDecision() throws InputException, IOException {
        Scenario read = ScenarioReader.read(Path.of("scenarios/vocal-dynamic.json"), Catalogue.load(List.of()));
        Comparison comparison = Comparison.of(read, Figure.EIN_FLAT);
        JsonNode decision = new ObjectMapper()
                .readTree(JsonOut.text(ResultTree.comparison(comparison)))
                .get("decision");
        assertThat(decision.get("winner").asText())
                .isEqualTo(comparison.winner().name());
        assertThat(decision.get("lead_dB").isNumber()).isTrue();
        assertThat(decision.get("crossover").get("sourceResistance_ohm")).hasSize(1);
    }

    @Test
    void csvQuotesWhatNeedsQuotesAndEndsLinesAsRfc4180Says() throws InputException {
        Scenario read = ScenarioReader.read(Path.of("scenarios/capsule.json"), Catalogue.load(List.of()));
        String csv = Csv.comparison(Comparison.of(read, Figure.EIN_A));
        assertThat(csv.split("\r\n", -1)).hasSize(read.candidates().size() + 2);
        assertThat(csv).contains("\"electrometer JFET, 1 Gohm\",2n4117a,follower");
        for (String line : csv.lines().toList()) {
            assertThat(line.replaceAll("\"[^\"]*\"", "").split(",", -1)).hasSize(21);
        }
    }
}
