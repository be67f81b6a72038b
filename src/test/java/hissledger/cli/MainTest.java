package hissledger.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The program as a user meets it: what it prints, on which stream, and how it exits. */
class MainTest {
    private static final Path SCENARIOS = Path.of("scenarios");
    private static final String VOCAL = SCENARIOS.resolve("vocal-dynamic.json").toString();

    @TempDir
    private Path folder = Path.of("");

    private record Outcome(int exit, String out, String err) {}

    private static Outcome run(String... args) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int exit = Main.run(new PrintWriter(out), new PrintWriter(err), args);
        return new Outcome(exit, out.toString(), err.toString());
    }

    private String file(String name, String content) throws java.io.IOException {
        Path file = folder.resolve(name);
        Files.writeString(file, content);
        return file.toString();
    }

    @Test
    void compareNamesTheWinnerAndTheCrossover() {
        Outcome outcome = run("compare", VOCAL);
        assertThat(outcome.exit()).isZero();
        assertThat(outcome.err()).isEmpty();
        assertThat(outcome.out())
                .contains("Quietest: \"")
                .containsPattern("change places at a source\\s+resistance of")
                .contains("EIN flat at most -127.50 dBu")
                .doesNotContain("\u001b");
    }

    @Test
    void candidatesThatDifferInNoPrintedDigitAreLevel() {
        assertThat(run("compare", SCENARIOS.resolve("geophone.json").toString()).out())
                .contains("Quietest: \"PNP pair\", level with \"PNP pair at 2 mA\" within 0.01 dB (EIN flat).");
    }

    @Test
    void compareHoldsTheLimitsOfTheScenarioAgainstItsWinner() {
        assertThat(run("compare", SCENARIOS.resolve("cartridge-mc.json").toString())
                        .out()
                        .replaceAll("\\s+", " "))
                .contains(
                        "Limits: current of all devices at most 20 mA; power at most 360 mW from 18 V.",
                        "\"four low-rbb' PNP\" (limits.totalCurrent, limits.power)",
                        "Quietest within the limits: \"1:10 into a JFET\".",
                        "above the least IDSS of lsk170, 2.60 mA");
    }

    @Test
    void theBestCurrentIsThatOfTheFigureTheTargetDecidesBy() {
        String file = SCENARIOS.resolve("ribbon-secondary.json").toString();
        String current = "one PNP: least EIN A-weighted at 1.18 mA each";
        assertThat(run("compare", file).out()).contains(current);
        assertThat(run("optimum", file).out()).containsPattern("\\[one PNP\\]\nCurrent: best 1.18 mA each");
    }

    @Test
    void figuresThatAreNotDefinedAreNotRanked() {
        Outcome outcome =
                run("compare", SCENARIOS.resolve("cartridge-mc.json").toString(), "--by", "equivalentNoiseLevel");
        assertThat(outcome.exit()).isEqualTo(2);
        assertThat(outcome.err())
                .contains("equivalentNoiseLevel is not defined for this source", "add source.sensitivity");
    }

    @Test
    void twoResultsInOnePlaceAreRefused() {
        String same = folder.resolve("same").toString();
        assertThat(run("compare", VOCAL, "--json", same, "--csv", same).err()).contains("name the same file");
        assertThat(run("ledger", VOCAL, "--json", "-", "--csv", "-").err())
                .contains("standard output takes one of --json and --csv");
        assertThat(Path.of(same)).doesNotExist();
        assertThat(run("compare", VOCAL, "--chart-kind", "resistance").err()).contains("add --chart FILE.png");
    }

    @Test
    void aListOfDevicesSaysWhatItDoesNotKnowAndWhenNothingFits() {
        assertThat(run("devices", "list", "--kind", "fet").err())
                .contains("--kind must be bipolar or jfet or amplifier, was 'fet'");
        assertThat(run("devices", "list", "--kind", "jfet", "--polarity", "pnp").out())
                .startsWith("No device fits all of these options");
    }

    @Test
    void aCurrentFarBeyondThePublishedGainIsRefusedAndANearOneIsSaid() throws java.io.IOException {
        String shipped = Files.readString(SCENARIOS.resolve("guitar-pickup.json"));
        String stated = shipped.replace("{ \"optimum\": { \"for\": \"einA\" } }", "\"5 uA\"");
        assertThat(stated).isNotEqualTo(shipped);
        assertThat(run("compare", file("near.json", stated)).out().replaceAll("\\s+", " "))
                .contains("is continued beyond its published points, 10.0 µA to");
        assertThat(run("compare", file("far.json", stated.replace("\"5 uA\"", "\"0.5 uA\"")))
                        .err())
                .contains("lies more than one decade beyond the published current gain of bc550c");
    }

    @Test
    void ledgerPrintsEveryEntryAndItsTotal() {
        Outcome outcome = run("ledger", VOCAL, "--candidate", "PNP switch", "--full");
        assertThat(outcome.exit()).isZero();
        assertThat(outcome.out())
                .contains("base resistance", "collector shot", "RF stoppers", "100.00", "EIN flat, at the EMF")
                .contains("1 % second harmonic", "noise", "gain from");
    }

    @Test
    void ledgerShowsOneEntryAgainstFrequency() {
        Outcome outcome = run("ledger", VOCAL, "--entry", "base bias");
        assertThat(outcome.exit()).isZero();
        assertThat(outcome.out())
                .contains("[PNP switch]", "20.0 Hz", "20.0 kHz")
                .doesNotContain("[one JFET]");
    }

    @ParameterizedTest
    @ValueSource(strings = {"compare", "ledger"})
    void everyShippedScenarioRuns(String verb) throws java.io.IOException {
        try (var files = Files.list(SCENARIOS)) {
            for (Path scenario : files.filter(path -> path.toString().endsWith(".json"))
                    .sorted()
                    .toList()) {
                Outcome outcome = run(verb, scenario.toString());
                assertThat(outcome.err()).as(scenario.toString()).isEmpty();
                assertThat(outcome.exit()).as(scenario.toString()).isZero();
                assertThat(outcome.out()).as(scenario.toString()).doesNotContain("NaN", "Infinity", "null");
            }
        }
    }

    @Test
    void writesJsonAndCsv() throws java.io.IOException {
        Path json = folder.resolve("result.json");
        Path csv = folder.resolve("result.csv");
        Outcome outcome = run("compare", VOCAL, "--json", json.toString(), "--csv", csv.toString());
        assertThat(outcome.exit()).isZero();
        assertThat(Files.readString(json)).contains("\"einFlat_dBu\"", "\"decision\"", "\"spectrum\"");
        assertThat(Files.readString(csv))
                .startsWith("candidate,device,arrangement")
                .contains("\r\n");
    }

    @Test
    void aDashSendsDataToStandardOutputInPlaceOfTheText() {
        Outcome outcome = run("ledger", VOCAL, "--csv", "-");
        assertThat(outcome.out())
                .startsWith("candidate,entry,kind,weighting,from_Hz,to_Hz,temperature_K,band_V,share,saves_dB,"
                        + "at_100.0_Hz_V_rtHz");
        assertThat(outcome.out()).doesNotContain("Low-output moving-coil");
        assertThat(run("ledger", VOCAL, "--by", "einA", "--csv", "-").out())
                .contains(",source,source,A,20.0,20000.0,300.15,");
    }

    @Test
    void checkExitsWithOneWhereTheTargetIsMissed() {
        assertThat(run("compare", VOCAL, "--check").exit()).isZero();
        assertThat(run("ledger", VOCAL, "--candidate", "high-gain NPN", "--check")
                        .exit())
                .isEqualTo(1);
    }

    @Test
    void devicesListShowAndCheck() {
        assertThat(run("devices", "list").out()).contains("2n4403", "bf862", "demo-npn");
        assertThat(run("devices", "show", "2n4403").out())
                .contains("base spreading resistance", "derived", "References:", "Defaults in use:");
        Outcome check = run("devices", "check");
        assertThat(check.exit()).isZero();
        assertThat(check.out()).contains("devices read, no fault.");
    }

    @Test
    void devicesListNarrowsByKindPolarityAndValues() {
        String out = run("devices", "list", "--kind", "bipolar", "--polarity", "pnp", "--rbb-below", "5 ohm")
                .out();
        assertThat(out).contains("ztx951", "typical values at 25 °C").doesNotContain("bc327-40", "2n4401", "bf862");
        assertThat(run("devices", "list", "--at", "2 mA", "--gm-above", "10 mS").out())
                .contains("bf862", "lsk170")
                .doesNotContain("2n4117a", "2n4403");
        assertThat(run("devices", "list", "--hfe-above", "700").out())
                .contains("mpsa18")
                .doesNotContain("2n4403");
        Outcome wrong = run("devices", "list", "--rbb-below", "30");
        assertThat(wrong.exit()).isEqualTo(2);
        assertThat(wrong.err()).startsWith("hissledger: --rbb-below has no unit in \"30\"; write it like \"150 ohm\"");
    }

    @Test
    void optimumChoosesWhatIsOpenAndSaysHowFlatItIs() {
        Outcome outcome = run("optimum", SCENARIOS.resolve("ribbon-bare.json").toString());
        assertThat(outcome.err()).isEmpty();
        assertThat(outcome.exit()).isZero();
        assertThat(outcome.out())
                .contains(
                        "ratio of step-up 1:",
                        "devices in parallel",
                        "Runner-up:",
                        "What moves it",
                        "within 0.1 dB from");
        assertThat(run("optimum", SCENARIOS.resolve("cartridge-mc.json").toString())
                        .out())
                .contains("Limits: current of all devices at most 20 mA; power at most 360 mW from 18 V.")
                .containsPattern("held back by: current or power\\s+limit of the\\s+scenario");
        assertThat(run("optimum", VOCAL, "--json", "-").out()).contains("\"sensitivities\"", "\"closedFormCurrent_A\"");
    }

    @Test
    void aSearchIsDrawnWhereThereIsACurrent() throws java.io.IOException {
        Path picture = folder.resolve("search.png");
        assertThat(run("optimum", VOCAL, "--chart", picture.toString()).err()).isEmpty();
        assertThat(Files.readAllBytes(picture)).startsWith(0x89, 'P', 'N', 'G');
        String amplifier = file(
                "amplifier.json",
                "{ \"title\": \"One amplifier\", \"source\": { \"kind\": \"resistor\", \"resistance\": \"150 ohm\" },"
                        + " \"band\": { \"from\": \"20 Hz\", \"to\": \"20 kHz\" }, \"candidates\": [ { \"name\": \"only\","
                        + " \"device\": \"demo-amplifier-jfet-input\", \"arrangement\": \"amplifier\" } ] }");
        Path none = folder.resolve("none.png");
        Outcome refused = run("optimum", amplifier, "--chart", none.toString());
        assertThat(refused.exit()).isEqualTo(2);
        assertThat(refused.err()).contains("no candidate has one: all are behavioural amplifiers");
        assertThat(none).doesNotExist();
        Outcome text = run("optimum", amplifier);
        assertThat(text.exit()).isZero();
        assertThat(text.out()).contains("only", "demo-amplifier-jfet-input");
    }

    @Test
    void openValuesThatNameNothingOrLeaveNothing() throws java.io.IOException {
        String shipped = Files.readString(SCENARIOS.resolve("ribbon-bare.json"));
        String unnamed = file(
                "unnamed.json",
                shipped.replace(
                        "\"of\": \"step-up\", \"from\": 5, \"to\": 120", "\"of\": \"step\", \"from\": 5, \"to\": 3"));
        assertThat(run("optimum", unnamed).err().lines().map(line -> line.replaceFirst("^.*?json:[0-9]+:[0-9]+: ", "")))
                .containsExactly(
                        "candidates[1].open.ratio.of names no transformer of the path, \"step\"; use one of step-up",
                        "candidates[1].open.ratio.to must be above from, or there is nothing to choose; was 3");
        String hungry = file(
                "hungry.json",
                shipped.replace("\"candidates\": [", "\"limits\": { \"power\": \"1 mW\" },\n  \"candidates\": ["));
        assertThat(run("optimum", hungry).err())
                .contains("limits.power needs the voltage it is drawn at; add limits.supply");
        String loud = file(
                "loud.json",
                shipped.replace("\"candidates\": [", "\"limits\": { \"headroom\": \"1 V\" },\n  \"candidates\": ["));
        Outcome refused = run("optimum", loud);
        assertThat(refused.exit()).isEqualTo(2);
        assertThat(refused.err())
                .containsPattern(
                        "candidate \"1:20\": no choice of its open values and current respects limits.headroom;"
                                + " enough would be limits.headroom [0-9.]+ [nuµm]?V or less");
    }

    @Test
    void newWritesAStarterOnceAndSchemaDescribesIt() throws java.io.IOException {
        Path scenario = folder.resolve("mine.json");
        assertThat(run("new", "scenario", scenario.toString()).out())
                .isEqualToNormalizingNewlines("Wrote " + scenario + ". Try it: hissledger compare " + scenario + "\n");
        assertThat(run("compare", scenario.toString()).exit()).isZero();
        Outcome again = run("new", "scenario", scenario.toString());
        assertThat(again.exit()).isEqualTo(2);
        assertThat(again.err())
                .isEqualToNormalizingNewlines(
                        scenario + ": exists already and is left as it is; choose another name\n");
        Path device = folder.resolve("mine-too.json");
        assertThat(run("new", "device", device.toString()).exit()).isZero();
        assertThat(run("devices", "check", device.toString()).out()).contains("1 device read, no fault.");
        assertThat(run("new", "device", folder.resolve("mine.txt").toString()).err())
                .contains("must end in .json, since the name before it becomes the id of the device");
        assertThat(run("schema", "device").out()).startsWith("{").contains("2020-12/schema", "baseResistance");
        assertThat(run("schema", "circuit").err()).contains("must be scenario or device, was 'circuit'");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "ledger",
                "compare",
                "devices",
                "devices list",
                "devices show",
                "devices check",
                "new",
                "schema",
                ""
            })
    void everyVerbHasHelpWithAnExample(String verb) {
        String[] args = (verb.isEmpty() ? "--help" : verb + " --help").split(" ");
        Outcome outcome = run(args);
        assertThat(outcome.exit()).isZero();
        assertThat(outcome.out()).contains("Usage: hissledger", "Example", "  hissledger ");
    }

    // ------------------------------------------------------------------------------------------------ wrong input

    @Test
    void aMistypedVerbIsAnsweredWithTheNearest() {
        Outcome outcome = run("compair", VOCAL);
        assertThat(outcome.exit()).isEqualTo(2);
        assertThat(outcome.out()).isEmpty();
        assertThat(outcome.err())
                .isEqualToNormalizingNewlines("hissledger: Unmatched arguments from index 0: 'compair', '" + VOCAL
                        + "'; did you mean compare?\nSee: hissledger --help\n");
    }

    @Test
    void aMistypedOptionIsAnsweredWithTheNearest() {
        Outcome outcome = run("compare", VOCAL, "--chrat", "x.png");
        assertThat(outcome.exit()).isEqualTo(2);
        assertThat(outcome.err()).contains("did you mean --chart").endsWith("See: hissledger compare --help\n");
    }

    @Test
    void aMistypedCandidateOrEntryOrFigure() {
        assertThat(run("ledger", VOCAL, "--candidate", "PNP swich").err())
                .startsWith("hissledger: the scenario has no candidate 'PNP swich'; did you mean 'PNP switch'?\n");
        assertThat(run("ledger", VOCAL, "--entry", "base resistanse").err())
                .startsWith(
                        "hissledger: no candidate has an entry 'base resistanse'; did you mean 'base resistance'?\n");
        assertThat(run("compare", VOCAL, "--by", "loudness").err())
                .startsWith("hissledger: --by 'loudness' is no figure; use one of einFlat, einA, ein468,");
        assertThat(run("devices", "show", "2n4304").err())
                .startsWith("hissledger: there is no device '2n4304'; did you mean 2n4");
    }

    @Test
    void aMissingFile() {
        Outcome outcome = run("compare", "no-such.json");
        assertThat(outcome.exit()).isEqualTo(2);
        assertThat(outcome.err()).isEqualToNormalizingNewlines("no-such.json: does not exist; check the path\n");
    }

    @Test
    void allFaultsOfAFileAreReportedTogetherWithTheirPlaces() throws java.io.IOException {
        String path = file("bad.json", """
                {
                  "title": "bad",
                  "source": { "kind": "coil", "resistanse": "200 ohm", "inductance": 3 },
                  "candidates": [
                    { "name": "a", "device": "2n4404", "arrangement": "common-emitter", "current": "-1 mA",
                      "load": { "resistor": "1,5 kohm" } }
                  ]
                }
                """);
        Outcome outcome = run("compare", path);
        assertThat(outcome.exit()).isEqualTo(2);
        assertThat(outcome.out()).isEmpty();
        assertThat(outcome.err().lines())
                .containsExactly(
                        path + ":3:13: source has no resistance: DC resistance, >= 0 ohm",
                        path + ":3:31: source.resistanse is not a key of a coil source; did you mean resistance?"
                                + " Known are kind, resistance, inductance, parallelResistance, parallelCapacitance,"
                                + " temperature, sensitivity, medium, referenceLevel",
                        path
                                + ":3:70: source.inductance must be an inductance with its unit in quotes, was the bare number 3;"
                                + " write it like \"3 mH\"",
                        path + ":5:30: candidates[0].device names no device of the catalogue, \"2n4404\"; did you mean"
                                + " 2n4401 or 2n4403 or 2n3904?",
                        path + ":5:84: candidates[0].current must be finite and > 0 A, was \"-1 mA\"",
                        path + ":6:29: candidates[0].load.resistor has a decimal comma in \"1,5 kohm\"; write a decimal"
                                + " point, as in \"1.5 kohm\"");
    }

    @Test
    void anUnwritableOutputLeavesNothingBehind() throws java.io.IOException {
        Path missing = folder.resolve("no/such/folder/result.json");
        Outcome outcome = run("compare", VOCAL, "--json", missing.toString());
        assertThat(outcome.exit()).isEqualTo(2);
        assertThat(outcome.err()).contains("cannot be written: the folder", "does not exist; make it first");
        Outcome onFolder = run("compare", VOCAL, "--json", folder.toString());
        assertThat(onFolder.err()).contains("it is a folder; name a file in it");
        try (var left = Files.list(folder)) {
            assertThat(left).isEmpty();
        }
    }

    @Test
    void aChartThatIsNoPngIsRefusedBeforeAnythingIsComputed() {
        Outcome outcome = run("compare", VOCAL, "--chart", "picture.jpg");
        assertThat(outcome.exit()).isEqualTo(2);
        assertThat(outcome.err()).startsWith("hissledger: --chart writes PNG: give a file name that ends in .png");
    }

    @Test
    void numbersDoNotDependOnTheLocale() {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.ROOT);
            String plain = run("ledger", VOCAL, "--full").out();
            Locale.setDefault(Locale.GERMANY);
            assertThat(run("ledger", VOCAL, "--full").out()).isEqualTo(plain);
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void aUsersDeviceFileWinsById() throws java.io.IOException {
        Path devices = Files.createDirectory(folder.resolve("devices"));
        String shipped = Files.readString(Path.of("device-params/2n4403.json"), StandardCharsets.UTF_8);
        Files.writeString(devices.resolve("2n4403.json"), shipped.replace("\"11.1 ohm\"", "\"40 ohm\""));
        String before = run("ledger", VOCAL, "--candidate", "PNP switch").out();
        String after = run("ledger", VOCAL, "--candidate", "PNP switch", "--devices", devices.toString())
                .out();
        assertThat(after).isNotEqualTo(before).contains("base resistance");
    }
}
