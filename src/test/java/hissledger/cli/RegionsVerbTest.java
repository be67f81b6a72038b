package hissledger.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class RegionsVerbTest {
    private static final String VOCAL = "scenarios/vocal-dynamic.json";
    private static final int GRID = 200;
    private static final int MAP = 160 * 120;

    @TempDir
    private Path folder = Path.of("");

    private record Outcome(int exit, String out, String err) {}

    private static Outcome run(String... args) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int exit = Main.run(new PrintWriter(out), new PrintWriter(err), args);
        return new Outcome(exit, out.toString(), err.toString());
    }

    @Test
    void namesTheWinnersAndTheCrossovers() {
        Outcome outcome = run("regions", VOCAL);
        assertThat(outcome.err()).isEmpty();
        assertThat(outcome.exit()).isZero();
        assertThat(outcome.out().replaceAll("\\s+", " "))
                .contains("at 1 kHz", "over the band")
                .contains("change places at 148 Ω; below it the bipolar is quieter. 10 % more rbb' moves it to")
                .contains("Nowhere quietest at these resistances and frequencies: \"PNP switch\", \"high-gain NPN\".");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "capsule",
                "cartridge-mc",
                "cartridge-mm",
                "electret",
                "geophone",
                "guitar-pickup",
                "hydrophone",
                "measured-source",
                "ribbon-bare",
                "ribbon-secondary",
                "vocal-gain-pair"
            })
    void everyShippedScenarioRuns(String name) {
        Outcome outcome = run("regions", "scenarios/" + name + ".json", "--from", "10 ohm", "--to", "1 Mohm");
        assertThat(outcome.err()).isEmpty();
        assertThat(outcome.exit()).isZero();
        assertThat(outcome.out()).contains("source", "over the band").doesNotContain("NaN", "Infinity", "null");
    }

    @Test
    void contoursOfOneCandidate() throws IOException {
        Path chart = folder.resolve("nf.png");
        Outcome outcome =
                run("regions", VOCAL, "--kind", "contours", "--candidate", "PNP switch", "--chart", chart.toString());
        assertThat(outcome.err()).isEmpty();
        assertThat(outcome.exit()).isZero();
        assertThat(outcome.out())
                .contains("Working point: source 200 Ω, 1.91 mA each, NF 1.31 dB.", "100 µA", "1.00 MΩ");
        assertThat(Files.size(chart)).isGreaterThan(10_000L);
    }

    @Test
    void writesJsonAndCsv() throws IOException {
        Path json = folder.resolve("regions.json");
        Path csv = folder.resolve("regions.csv");
        assertThat(run("regions", VOCAL, "--json", json.toString(), "--csv", csv.toString())
                        .exit())
                .isZero();
        JsonNode tree = new ObjectMapper().readTree(Files.readString(json));
        assertThat(tree.get("grid").get("sourceResistance_ohm")).hasSize(GRID);
        assertThat(tree.get("grid").get("margin_dB")).hasSize(GRID);
        assertThat(tree.get("grid").get("quietest").get(0)).hasSize(GRID);
        JsonNode band = tree.get("crossovers").get(tree.get("crossovers").size() - 1);
        assertThat(band.get("frequency_Hz").isNull()).isTrue();
        assertThat(band.get("crossings").get(0).get("sourceResistance_ohm").asDouble())
                .isBetween(147.0, 149.0);
        List<String> lines = Files.readAllLines(csv);
        assertThat(lines).hasSize(GRID * GRID + 1);
        assertThat(lines.get(0))
                .isEqualTo("sourceResistance_ohm,frequency_Hz,quietest,next,margin_dB,ein_V_rtHz,current_A");

        Outcome map = run("regions", VOCAL, "--kind", "contours", "--candidate", "one JFET", "--csv", "-");
        assertThat(map.out().lines()).hasSize(MAP + 1);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "--from|1 kohm|--to|10 ohm|the range of source resistance falls, from 1 kΩ to 10 Ω: --from must be below --to",
                "--from|1 kohm|--to|1 kohm|the range of source resistance is empty, from 1 kΩ to 1 kΩ: --from must be below --to",
                "--from|1 mA|--to|1 kohm|--from must be a resistance, but \"mA\" in \"1 mA\" is the unit of a current; write it like \"150 ohm\"",
                "--from|1 pohm|--to|1 kohm|--from must be from 1 mΩ to 1 TΩ, was 1 pohm",
                "--kind|contours|--candidate|PNP swich|the scenario has no candidate 'PNP swich'; did you mean 'PNP switch'?",
                "--kind|winners|--candidate|one JFET|--candidate goes with --kind contours; the winners are sought among all candidates"
            })
    void eachMistakeHasOneSentence(String first, String one, String second, String other, String sentence) {
        Outcome outcome = run("regions", VOCAL, first, one, second, other);
        assertThat(outcome.exit()).isEqualTo(2);
        assertThat(outcome.out()).isEmpty();
        assertThat(outcome.err().lines().findFirst()).hasValue("hissledger: " + sentence);
    }

    @Test
    void contoursNeedACandidateWithACurrent() {
        Outcome none = run("regions", VOCAL, "--kind", "contours");
        assertThat(none.exit()).isEqualTo(2);
        assertThat(none.err())
                .startsWith(
                        "hissledger: --kind contours needs one candidate: give --candidate with one of: PNP switch,");
        Outcome amplifier =
                run("regions", "scenarios/geophone.json", "--kind", "contours", "--candidate", "JFET-input amplifier");
        assertThat(amplifier.exit()).isEqualTo(2);
        assertThat(amplifier.err())
                .startsWith("hissledger: candidate \"JFET-input amplifier\" is a behavioural amplifier");
    }

    @Test
    void helpShowsExamples() {
        Outcome outcome = run("regions", "--help");
        assertThat(outcome.exit()).isZero();
        assertThat(outcome.out()).contains("Examples:", "--kind contours --candidate", "--from", "10 Mohm");
    }
}
