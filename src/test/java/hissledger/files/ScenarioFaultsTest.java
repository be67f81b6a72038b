package hissledger.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/** Every sentence that a wrong scenario is answered with, in full. */
class ScenarioFaultsTest {
    /** Stands in the table where a part is left out. */
    private static final String NOTHING = "(nothing)";

    @TempDir
    private Path folder = Path.of("");

    private List<String> faults(String text) throws Exception {
        Path file = Texts.file(folder, "t.json", text);
        Catalogue catalogue = Texts.catalogue();
        return Texts.sentences(
                catchThrowableOfType(InputException.class, () -> ScenarioReader.read(file, catalogue)), folder);
    }

    private List<String> faults(String part, String other) throws Exception {
        return faults(Texts.exchanged(Texts.SCENARIO, part, other));
    }

    @ParameterizedTest
    @CsvFileSource(
            resources = "scenario-faults.csv",
            useHeadersInDisplayName = true,
            delimiter = '|',
            quoteCharacter = '\0',
            maxCharsPerColumn = 2000)
    void saysWhatIsWrongAndWhatWouldBeRight(String part, String other, String sentence) throws Exception {
        assertThat(faults(part, other.equals(NOTHING) ? "" : other)).containsExactly("t.json:" + sentence);
    }

    @Test
    void namesAllFaultsOfAFileInItsOrder() throws Exception {
        assertThat(faults("""
                        {
                          "tilte": "T",
                          "source": { "kind": "coil", "resistance": "-1 ohm", "inductance": 5 },
                          "candidates": [
                            { "name": "a", "device": "bf826", "arrangement": "common-source", "current": "1,5 mA", "load": { } }
                          ]
                        }
                        """))
                .containsExactly(
                        "t.json:1:1: a scenario has no title: the title of every result",
                        "t.json:2:3: tilte is not a key of a scenario; did you mean title? Known are $schema, title, note, "
                                + "temperature, band, spots, target, limits, source, path, candidates",
                        "t.json:3:45: source.resistance must be finite and >= 0 Ω, was \"-1 ohm\"",
                        "t.json:3:69: source.inductance must be an inductance with its unit in quotes, was the bare number 5; "
                                + "write it like \"5 mH\"",
                        "t.json:5:30: candidates[0].device names no device of the catalogue, \"bf826\"; did you mean bf862?",
                        "t.json:5:82: candidates[0].current has a decimal comma in \"1,5 mA\"; write a decimal point, as in \"1.5 mA\"",
                        "t.json:5:100: candidates[0].load has no resistor: load resistor, > 0 ohm");
    }

    @Test
    void namesTwoCandidatesOfOneName() throws Exception {
        String second =
                "{ \"name\": \"a\", \"device\": \"trial-npn\", \"arrangement\": \"common-emitter\", \"current\": \"1 mA\", "
                        + "\"load\": { \"resistor\": \"1 kohm\" } }";
        assertThat(faults("\"1 kohm\" } }\n", "\"1 kohm\" } },\n" + second))
                .containsExactly(
                        "t.json:8:11: candidates[1].name is the name of two candidates: \"a\"; give each its own");
    }

    @Test
    void namesTheFaultsOfADeviceFileOnce() throws Exception {
        Path devices = Files.createDirectory(folder.resolve("devices"));
        Texts.file(devices, "x.json", Texts.exchanged(Texts.BIPOLAR, "\"typical\": \"40 ohm\"", "\"typical\": \"40\""));
        Path file = Texts.file(folder, "t.json", """
                {
                  "title": "T",
                  "source": { "kind": "resistor", "resistance": "150 ohm" },
                  "candidates": [
                    { "name": "a", "device": "x", "arrangement": "common-emitter", "current": "1 mA", "load": { "resistor": "1k0" } },
                    { "name": "b", "device": "x", "arrangement": "common-emitter", "current": "2 mA", "load": { "resistor": "1k0" } }
                  ]
                }
                """);
        Catalogue catalogue = Catalogue.load(List.of(devices));
        InputException fault = catchThrowableOfType(InputException.class, () -> ScenarioReader.read(file, catalogue));
        assertThat(Texts.sentences(fault, devices))
                .containsExactly(
                        "x.json:7:36: parameters.baseResistance.typical has no unit in \"40\"; write it like \"150 ohm\"");
    }

    @Test
    void namesWhatIsWrongWithATable() throws Exception {
        String table = "{ \"kind\": \"table\", \"file\": \"z.csv\" }";
        String source = "{ \"kind\": \"resistor\", \"resistance\": \"150 ohm\" }";
        Path csv = folder.resolve("z.csv");
        assertThat(faults(source, table))
                .containsExactly("t.json:3:40: source.file names z.csv, which does not exist; check the path");
        Texts.file(folder, "z.csv", "f,r,x\n1,2,3\n");
        assertThat(faults(source, table))
                .containsExactly("z.csv:1:1: must begin with the header frequency_Hz,real_ohm,imag_ohm or "
                        + "frequency_Hz,magnitude_ohm,phase_deg, was \"f,r,x\"");
        Files.writeString(
                csv, "# measured\nfrequency_Hz,real_ohm,imag_ohm\n10,100,0\n9,100,0\n100000,-1,0\n2e5,x,0\n3e5,1\n");
        assertThat(faults(source, table))
                .containsExactly(
                        "z.csv:4:1: frequencies must be > 0 Hz and rise from row to row; sort the rows and remove doubles",
                        "z.csv:5:8: the real part of the impedance must be >= 0 ohm, was -1.0 ohm: a passive source has no other",
                        "z.csv:6:5: must be a finite number, was \"x\"",
                        "z.csv:7:1: must hold three values divided by commas, was \"3e5,1\"");
        Files.writeString(csv, "frequency_Hz,real_ohm,imag_ohm\n100,100,0\n5000,100,0\n");
        assertThat(faults(source, table))
                .containsExactly(
                        "t.json:1:1: needs spots inside the table of the source, 100 Hz to 5 kHz; "
                                + "the usual 100 Hz, 1 kHz, 10 kHz do not fit; add spots",
                        "t.json:3:40: source.file covers 100 Hz to 5 kHz, less than the band 20 Hz to 20 kHz; "
                                + "measure further or narrow the band: a table is never continued");
    }
}
