package hissledger.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hissledger.choose.Evaluation;
import hissledger.choose.Scenario;
import hissledger.files.Catalogue;
import hissledger.files.ScenarioReader;
import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The verb bias as a user meets it. */
class BiasVerbTest {
    private static final String VOCAL = "scenarios/vocal-dynamic.json";
    private static final Pattern PROMISE = Pattern.compile("\"einFlat_dBu\" : (-?[0-9.]+)");
    /** What is promised of a written file, dB. */
    private static final double PROMISED_DECIBELS = 0.1;

    @TempDir
    private Path folder = Path.of("");

    private record Outcome(int exit, String out, String err) {}

    private static Outcome run(String... args) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int exit = Main.run(new PrintWriter(out), new PrintWriter(err), args);
        return new Outcome(exit, out.toString(), err.toString());
    }

    @ParameterizedTest
    @CsvSource({
        "vocal-dynamic.json, PNP switch, 12 V, E24",
        "vocal-dynamic.json, low-rbb PNP, 12 V, E96",
        "vocal-dynamic.json, one JFET, 24 V, E24",
        "cartridge-mm.json, bipolar at its best, 12 V, E12",
        "capsule.json, bipolar follower, 12 V, E24",
        "measured-source.json, PNP switch, 9 V, E48"
    })
    void theLedgerOfTheWrittenFileConfirmsThePromise(String file, String candidate, String supply, String series)
            throws Exception {
        Path target = folder.resolve("biased.json");
        Outcome outcome = run(
                "bias",
                "scenarios/" + file,
                candidate,
                "--supply",
                supply,
                "--series",
                series,
                "--write",
                target.toString(),
                "--json",
                "-");
        assertThat(outcome.err()).isEmpty();
        assertThat(outcome.exit()).isZero();
        Matcher promise = PROMISE.matcher(outcome.out());
        assertThat(promise.find()).isTrue();
        Scenario written = ScenarioReader.read(target, Catalogue.load(List.of()));
        assertThat(written.candidates()).hasSize(1);
        Evaluation evaluation = Evaluation.of(written, written.candidates().get(0), Weighting.FLAT);
        assertThat(Decibels.dbu(evaluation.ledger().totals().ein(Weighting.FLAT)))
                .isCloseTo(Double.parseDouble(promise.group(1)), within(PROMISED_DECIBELS));
        assertThat(run("ledger", target.toString()).exit()).isZero();
    }

    @Test
    void printsPartsCasesAndWhatItCosts() {
        Outcome outcome = run("bias", VOCAL, "PNP switch", "--supply", "12 V");
        assertThat(outcome.exit()).isZero();
        assertThat(outcome.out())
                .contains("supply to base", "bypass capacitor", "hFE least", "everything raises the current")
                .contains("the bias network costs", "common practice, no source")
                .doesNotContain("NaN", "Infinity");
        assertThat(run("bias", VOCAL, "PNP switch", "--supply", "12 V").out()).isEqualTo(outcome.out());
        assertThat(run("bias", VOCAL, "PNP switch", "--supply", "12 V", "--csv", "-")
                        .out())
                .startsWith("part,value,unit\r\n");
    }

    @Test
    void neverWritesOverAFile() throws Exception {
        Path target = folder.resolve("there.json");
        Files.writeString(target, "mine");
        Outcome outcome = run("bias", VOCAL, "PNP switch", "--supply", "12 V", "--write", target.toString());
        assertThat(outcome.exit()).isEqualTo(ExitCode.INPUT);
        assertThat(outcome.err()).contains("exists already");
        assertThat(Files.readString(target)).isEqualTo("mine");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            vocal-dynamic.json   | PNP swich              | 12 V  | did you mean 'PNP switch'
            vocal-dynamic.json   | PNP switch             | 0.8 V | is too low for
            vocal-dynamic.json   | PNP switch             | 12 Hz | must be a voltage
            geophone.json        | bipolar-input amplifier| 12 V  | is an amplifier
            geophone.json        | PNP pair               | 12 V  | is not designed yet
            cartridge-mm.json    | quiet JFET             | 1 V   | V would do
            """)
    void saysWhatIsWrongWithTheInput(String file, String candidate, String supply, String words) {
        Outcome outcome = run("bias", "scenarios/" + file, candidate, "--supply", supply);
        assertThat(outcome.exit()).isEqualTo(ExitCode.INPUT);
        assertThat(outcome.err()).contains(words);
        assertThat(outcome.out()).isEmpty();
    }

    @ParameterizedTest
    @CsvSource({
        "vocal-dynamic.json, PNP switch, 0.8 V",
        "vocal-dynamic.json, high-gain NPN, 1.5 V",
        "cartridge-mm.json, quiet JFET, 1 V"
    })
    void theLeastSupplyItNamesWouldDo(String file, String candidate, String supply) {
        String refused =
                run("bias", "scenarios/" + file, candidate, "--supply", supply).err();
        Matcher named = Pattern.compile("at least ([0-9.]+ V) would do").matcher(refused);
        assertThat(named.find()).isTrue();
        assertThat(run("bias", "scenarios/" + file, candidate, "--supply", named.group(1))
                        .exit())
                .isZero();
    }
}
