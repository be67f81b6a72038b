package hissledger.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import hissledger.choose.Scenario;
import hissledger.circuit.CapacitorSource;
import hissledger.circuit.ShuntElement;
import hissledger.circuit.TableSource;
import hissledger.circuit.Transformer;
import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Every sentence that a wrong scenario can get. */
class ScenarioReaderTest {
    private static final String SOURCE = "\"source\": { \"kind\": \"resistor\", \"resistance\": \"150 ohm\" }";
    private static final String STAGE =
            "\"arrangement\": \"common-emitter\", \"current\": \"1 mA\", " + "\"load\": { \"resistor\": \"2.7 kohm\" }";
    private static final String CANDIDATE = "{ \"name\": \"a\", \"device\": \"2n4403\", " + STAGE + " }";

    @TempDir
    private Path folder = Path.of("");

    private Path write(String name, String content) throws IOException {
        return Files.writeString(folder.resolve(name), content);
    }

    private static Scenario read(Path file) throws InputException {
        return ScenarioReader.read(file, Catalogue.load(List.of()));
    }

    /** The sentences about a scenario of one line, without the file name. */
    private List<String> faults(String content) throws IOException {
        Path file = write("scenario.json", content);
        InputException fault = catchThrowableOfType(InputException.class, () -> read(file));
        assertThat(fault)
                .as("the scenario should have been refused: " + content)
                .isNotNull();
        return fault.faults().stream()
                .map(each -> each.sentence().replace(file + ":", "").replace(folder.toString() + "/", ""))
                .toList();
    }

    private static String scenario(String source, String candidate) {
        return "{ \"title\": \"t\", " + source + ", \"candidates\": [ " + candidate + " ] }";
    }

    private String message(String source, String candidate) throws IOException {
        List<String> faults = faults(scenario(source, candidate));
        assertThat(faults).hasSize(1);
        return faults.get(0).replaceFirst("^[0-9]+:[0-9]+: ", "");
    }

    @Test
    void readsWhatTheContractShows() throws IOException, InputException {
        Path file = write("full.json", """
                // a comment
                {
                  "title": "t", "note": "n", "temperature": "27 degC",
                  "band": { "from": "50 Hz", "to": "10 kHz" }, "spots": ["1 kHz"],
                  "target": { "einA": "-120 dBu", "noiseFigure": "2 dB" },
                  "source": { "kind": "capacitor", "capacitance": "60 pF", "lossTangent": 0.01, "sensitivity": "9 mV/Pa",
                              "referenceLevel": "94 dB SPL" },
                  "path": [
                    { "kind": "cable", "length": "3 m", "capacitancePerLength": "100 pF/m" },
                    { "kind": "shunt-resistor", "value": "6k81", "legs": 2, "supplyNoise": "10 uV/rtHz", "mismatch": "1 %" },
                    { "kind": "transformer", "ratio": 10, "primaryResistance": "20 ohm", "secondaryResistance": "2 kohm" },
                    { "kind": "pad", "series": "680 ohm", "shunt": "150 ohm", "legs": 2 }, /* trailing comma: */
                  ],
                  "candidates": [
                    { "name": "pair", "device": "2n4403", "arrangement": "gain-resistor-pair",
                      "current": { "optimum": { "from": "10 uA", "to": "5 mA", "for": "einA" } }, "inParallel": 2,
                      "gainResistor": "10 ohm", "feedbackResistor": "5 kohm", "load": { "resistor": "2.7 kohm" } },
                    { "name": "amp", "device": "demo-amplifier-bipolar-input", "arrangement": "amplifier" }
                  ]
                }
                """);
        Scenario scenario = read(file);
        assertThat(scenario.temperatureKelvin()).isEqualTo(300.15);
        assertThat(scenario.source()).isInstanceOf(CapacitorSource.class);
        double pascal = 20e-6 * Math.pow(10.0, 94.0 / 20.0);
        assertThat(scenario.source().signal().referenceVolts()).hasValue(9e-3 * pascal);
        assertThat(scenario.path()).hasSize(4);
        ShuntElement cable = (ShuntElement) scenario.path().get(0);
        assertThat(cable.name()).isEqualTo("cable");
        ShuntElement feed = (ShuntElement) scenario.path().get(1);
        assertThat(feed.name()).isEqualTo("shunt resistor 6.81 kΩ");
        assertThat(feed.supply()).isPresent();
        assertThat(scenario.path().get(2)).isInstanceOf(Transformer.class);
        assertThat(scenario.candidates()).hasSize(2);
    }

    @Test
    void readsATableOfBothHeaders() throws IOException, InputException {
        write("z.csv", "# measured\nfrequency_Hz,real_ohm,imag_ohm\n10,100,0\n1000,200,300\n100000,400,-5\n");
        write("p.csv", "frequency_Hz,magnitude_ohm,phase_deg\n10,100,0\n1000,200,90\n100000,400,-45\n");
        for (String table : List.of("z.csv", "p.csv")) {
            Path file = write(
                    "table.json",
                    scenario("\"source\": { \"kind\": \"table\", \"file\": \"" + table + "\" }", CANDIDATE));
            TableSource source = (TableSource) read(file).source();
            assertThat(source.hertz()).containsExactly(10.0, 1000.0, 100000.0);
        }
    }

    @Test
    void aFileAsAWhole() throws IOException {
        assertThat(faults("")).containsExactly(" holds nothing; it should hold one JSON object { ... }");
        assertThat(faults("[ 1 ]")).containsExactly("1:1: must be a scenario, an object { }, was a list [ ]");
        assertThat(faults("title: x"))
                .containsExactly("1:1: is not JSON from here on; look for a missing comma, quote, colon or bracket just"
                        + " before");
        assertThat(faults(scenario(SOURCE, CANDIDATE) + " {}").get(0))
                .contains("goes on after the end of the JSON value; remove what follows");
        InputException missing = catchThrowableOfType(InputException.class, () -> read(folder.resolve("missing.json")));
        assertThat(missing.faults().get(0).message()).isEqualTo("does not exist; check the path");
        InputException isFolder = catchThrowableOfType(InputException.class, () -> read(folder));
        assertThat(isFolder.faults().get(0).message()).isEqualTo("is a folder; name a file in it");
    }

    @Test
    void aHugeFileIsRefusedUnread() throws IOException {
        Path huge = folder.resolve("huge.json");
        try (RandomAccessFile sparse = new RandomAccessFile(huge.toFile(), "rw")) {
            sparse.setLength(100_000_000L);
        }
        InputException fault = catchThrowableOfType(InputException.class, () -> read(huge));
        assertThat(fault.faults().get(0).message())
                .isEqualTo("has 100000000 bytes, more than the 5000000 that are read; is this the right file?");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "\"resistance\": 150 | source.resistance must be a resistance with its unit in quotes, was the bare number"
                        + " 150; write it like \"150 ohm\"",
                "\"resistance\": \"150\" | source.resistance has no unit in \"150\"; write it like \"150 ohm\"",
                "\"resistance\": \"-1 ohm\" | source.resistance must be finite and >= 0 Ω, was \"-1 ohm\"",
                "\"resistance\": \"1e400 ohm\" | source.resistance must be finite and >= 0 Ω, was \"1e400 ohm\"",
                "\"resistance\": null | source.resistance must be a resistance in quotes, like \"150 ohm\", was null",
                "\"resistance\": \"1 mH\" | source.resistance must be a resistance, but \"mH\" in \"1 mH\" is the unit of an"
                        + " inductance; write it like \"150 ohm\""
            })
    void wrongValues(String member, String sentence) throws IOException {
        assertThat(message("\"source\": { \"kind\": \"resistor\", " + member + " }", CANDIDATE))
                .isEqualTo(sentence);
    }

    @Test
    void wrongKindsAndWords() throws IOException {
        assertThat(message("\"source\": { \"kind\": \"coyl\" }", CANDIDATE))
                .isEqualTo("source.kind must be one of resistor, coil, capacitor, table, was \"coyl\"; did you mean"
                        + " \"coil\"?");
        assertThat(message("\"source\": { }", CANDIDATE))
                .isEqualTo("source has no kind; it must be one of resistor, coil, capacitor, table");
        assertThat(message(SOURCE, CANDIDATE.replace("common-emitter", "common-emiter")))
                .startsWith("candidates[0].arrangement must be one of common-emitter, common-source,")
                .endsWith("was \"common-emiter\"; did you mean \"common-emitter\"?");
        assertThat(message(SOURCE, CANDIDATE.replace("common-emitter", "common-source")))
                .isEqualTo("candidates[0].arrangement does not fit 2n4403, a device of kind bipolar; use one of"
                        + " common-emitter, follower, differential-pair, single-ended-pair, gain-resistor-pair");
    }

    @Test
    void doubledAndMissingKeys() throws IOException {
        assertThat(faults("{ \"title\": \"a\", \"title\": \"b\", " + SOURCE + ", \"candidates\": [ " + CANDIDATE
                        + " ] }"))
                .containsExactly("1:17: title stands twice in a scenario, first at line 1, column 3; keep one");
        assertThat(faults("{ \"title\": \"a\", " + SOURCE + " }"))
                .containsExactly("1:1: a scenario has no candidates: ways to build the stage, at least one");
        assertThat(faults("{ \"title\": \"a\", " + SOURCE + ", \"candidates\": [ ] }"))
                .containsExactly("1:90: candidates must hold at least 1 item");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "\"current\": \"700 mA\" | candidates[0].current must not exceed the current rating of 2n4403, 600 mA, was"
                        + " \"700 mA\"",
                "\"current\": { \"optimum\": { \"from\": \"2 mA\", \"to\": \"1 mA\" } } | candidates[0].current leaves no"
                        + " current to choose: from must be below to",
                "\"current\": { \"optimum\": { \"from\": \"1 A\" } } | candidates[0].current leaves no current to choose:"
                        + " from is above the current rating of 2n4403, 600 mA",
                "\"current\": \"lots\" | candidates[0].current must be a current, like \"1.2 mA\", or \"optimum\", was \"lots\""
            })
    void currentsTheDeviceCannotCarry(String current, String sentence) throws IOException {
        assertThat(message(SOURCE, CANDIDATE.replace("\"current\": \"1 mA\"", current)))
                .isEqualTo(sentence);
    }

    @Test
    void aJfetAboveItsSaturationCurrent() throws IOException {
        assertThat(message(
                        SOURCE,
                        "{ \"name\": \"a\", \"device\": \"2n4117a\", \"arrangement\": \"common-source\", \"current\":"
                                + " \"1 mA\", \"load\": { \"resistor\": \"10 kohm\" } }"))
                .startsWith("candidates[0].current must not exceed the typical IDSS of 2n4117a, ");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "\"kind\": \"series-capacitor\", \"value\": \"1 uF\", \"lossTangent\": 0.1, \"esr\": \"1 ohm\" | path[0].esr"
                        + " says the losses of the capacitor a second time beside lossTangent; keep one of the two",
                "\"kind\": \"series-resistor\", \"value\": \"1 kohm\", \"noiseIndex\": \"-20 dB\" | path[0].noiseIndex makes"
                        + " excess noise only with the direct voltage across the resistor; add dcVoltage",
                "\"kind\": \"series-resistor\", \"value\": \"1 kohm\", \"dcVoltage\": \"5 V\" | path[0].dcVoltage makes"
                        + " excess noise only with a noise index of the resistor; add noiseIndex",
                "\"kind\": \"shunt-resistor\", \"value\": \"1 kohm\", \"mismatch\": \"1 %\" | path[0].mismatch has a meaning"
                        + " only with supplyNoise and \"legs\": 2; add them or remove it",
                "\"kind\": \"shunt-resistor\", \"value\": \"1 kohm\", \"legs\": 3 | path[0].legs must be a whole number from"
                        + " 1 to 2, was 3",
                "\"kind\": \"transformer\", \"ratio\": 0, \"primaryResistance\": \"1 ohm\", \"secondaryResistance\":"
                        + " \"1 ohm\" | path[0].ratio must be finite and > 0, was 0"
            })
    void pathElementsThatContradictThemselves(String element, String sentence) throws IOException {
        assertThat(message(SOURCE + ", \"path\": [ { " + element + " } ]", CANDIDATE))
                .isEqualTo(sentence);
    }

    @Test
    void arrangementsWithoutWhatTheyNeedOrWithWhatTheyCannotUse() throws IOException {
        assertThat(faults(scenario(SOURCE, CANDIDATE.replace("common-emitter", "gain-resistor-pair"))))
                .hasSize(2)
                .allSatisfy(fault -> assertThat(fault).contains("which the arrangement gain-resistor-pair needs"))
                .anySatisfy(fault -> assertThat(fault).contains("has no gainResistor"))
                .anySatisfy(fault -> assertThat(fault).contains("has no feedbackResistor"));
        assertThat(message(SOURCE, CANDIDATE.replace("common-emitter", "single-ended-pair")))
                .startsWith("candidates[0] has no otherSide, which the arrangement single-ended-pair needs");
        assertThat(
                        message(
                                SOURCE,
                                "{ \"name\": \"a\", \"device\": \"2n4403\", \"arrangement\": \"follower\", \"current\": \"1 mA\" }"))
                .startsWith("candidates[0] has no load, which the arrangement follower needs");
        assertThat(message(
                        SOURCE,
                        CANDIDATE
                                .replace("common-emitter", "follower")
                                .replace("\"load\"", "\"commonLead\": { \"unbypassed\": \"10 ohm\" }, \"load\"")))
                .isEqualTo("candidates[0].commonLead has no use in the arrangement follower; remove it");
        assertThat(message(SOURCE, CANDIDATE.replace("\"load\"", "\"gainResistor\": \"10 ohm\", \"load\"")))
                .isEqualTo("candidates[0].gainResistor has no use in the arrangement common-emitter; remove it");
        assertThat(message(
                        SOURCE, CANDIDATE.replace("\"load\"", "\"commonLead\": { \"bypass\": \"100 uF\" }, \"load\"")))
                .isEqualTo(
                        "candidates[0].commonLead.bypass has no resistor to bypass; add commonLead.resistor or remove it");
    }

    @Test
    void tablesThatCannotBeUsed() throws IOException {
        String source = "\"source\": { \"kind\": \"table\", \"file\": \"z.csv\" }";
        assertThat(message(source, CANDIDATE))
                .isEqualTo("source.file names z.csv, which does not exist; check the path");
        String header = "frequency_Hz,real_ohm,imag_ohm\n";
        write("z.csv", "f,R,X\n");
        assertThat(message(source, CANDIDATE))
                .isEqualTo("z.csv:1:1: must begin with the header frequency_Hz,real_ohm,imag_ohm or"
                        + " frequency_Hz,magnitude_ohm,phase_deg, was \"f,R,X\"");
        write("z.csv", header + "10,1,2\n");
        assertThat(message(source, CANDIDATE))
                .isEqualTo(
                        "source.file names z.csv, which holds 1 row of values; at least two are needed to interpolate");
        write("z.csv", header + "10,1,2\n10,2,3\n");
        assertThat(message(source, CANDIDATE))
                .isEqualTo("z.csv:3:1: frequencies must be > 0 Hz and rise from row to row; sort the rows and remove"
                        + " doubles");
        write("z.csv", header + "10,1,NaN\n1e5,2,3\n");
        assertThat(message(source, CANDIDATE)).isEqualTo("z.csv:2:6: must be a finite number, was \"NaN\"");
        write("z.csv", header + "10,-1,0\n1e5,2,3\n");
        assertThat(message(source, CANDIDATE))
                .isEqualTo(
                        "z.csv:2:4: the real part of the impedance must be >= 0 ohm, was -1.0 ohm: a passive source has"
                                + " no other");
        write("z.csv", header + "10,1,2,3\n1e5,2,3\n");
        assertThat(message(source, CANDIDATE))
                .isEqualTo("z.csv:2:1: must hold three values divided by commas, was \"10,1,2,3\"");
        write("z.csv", header + "100,1,2\n1e5,2,3\n");
        assertThat(message(source, CANDIDATE))
                .startsWith("source.file covers 100 Hz to 100 kHz, less than the band 20 Hz to 20 kHz;");
    }

    @Test
    void bandsTargetsLevelsAndNames() throws IOException {
        assertThat(message(SOURCE + ", \"band\": { \"from\": \"1 kHz\", \"to\": \"100 Hz\" }", CANDIDATE))
                .isEqualTo("band.to must be above band.from, 1 kHz, was \"100 Hz\"");
        assertThat(message(SOURCE + ", \"target\": { \"equivalentNoiseLevel\": \"15 dB\" }", CANDIDATE))
                .isEqualTo(
                        "target.equivalentNoiseLevel needs a sensitivity of the source in V/Pa, in air; add source.sensitivity,"
                                + " like \"1.8 mV/Pa\"");
        assertThat(message(
                        "\"source\": { \"kind\": \"resistor\", \"resistance\": \"1 ohm\", \"referenceLevel\": \"94 dB SPL\" }",
                        CANDIDATE))
                .isEqualTo(
                        "source.referenceLevel in dB SPL needs a sensitivity in V/Pa; add it, or state the EMF in V");
        assertThat(message(SOURCE, CANDIDATE + ", " + CANDIDATE))
                .isEqualTo("candidates[1].name is the name of two candidates: \"a\"; give each its own");
        assertThat(message(SOURCE, CANDIDATE.replace("\"a\"", "\" \"")))
                .isEqualTo("candidates[0].name must not be empty");
    }
}
