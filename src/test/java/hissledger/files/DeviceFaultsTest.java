package hissledger.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/** Every sentence that a wrong device file is answered with, in full. */
class DeviceFaultsTest {
    /** Stands in the table where a part is left out. */
    private static final String NOTHING = "(nothing)";

    private static List<String> faults(String file, String text) {
        return catchThrowableOfType(
                        InputException.class, () -> DeviceReader.read(file, text.getBytes(StandardCharsets.UTF_8)))
                .faults()
                .stream()
                .map(Fault::sentence)
                .toList();
    }

    @ParameterizedTest
    @CsvFileSource(
            resources = "device-faults.csv",
            useHeadersInDisplayName = true,
            delimiter = '|',
            quoteCharacter = '\0',
            maxCharsPerColumn = 2000)
    void saysWhatIsWrongAndWhatWouldBeRight(String base, String part, String other, String sentence) {
        String text = base.equals("jfet") ? Texts.JFET : Texts.BIPOLAR;
        assertThat(faults("x.json", Texts.exchanged(text, part, other.equals(NOTHING) ? "" : other)))
                .containsExactly("x.json:" + sentence);
    }

    @Test
    void readsTheTextsThatTheFaultsArePlantedIn() throws Exception {
        assertThat(DeviceReader.read("x.json", Texts.BIPOLAR.getBytes(StandardCharsets.UTF_8))
                        .id())
                .isEqualTo("x");
        assertThat(DeviceReader.read("a/b\\x.json", Texts.JFET.getBytes(StandardCharsets.UTF_8))
                        .id())
                .isEqualTo("x");
    }

    @Test
    void wantsTheIdToEqualTheFileName() {
        assertThat(faults("folder/y.json", Texts.BIPOLAR))
                .containsExactly("folder/y.json:2:9: id must equal the file name without its ending, \"y\", was \"x\"; "
                        + "rename the one or the other");
    }

    @Test
    void namesAMissingParameterBesideItsMistypedName() {
        assertThat(faults("x.json", Texts.exchanged(Texts.BIPOLAR, "baseResistance", "baseResistence")))
                .containsExactly(
                        "x.json:5:17: parameters has no baseResistance: base spreading resistance rbb'",
                        "x.json:7:5: parameters.baseResistence is not a key of the parameters of a device of kind bipolar; "
                                + "did you mean baseResistance? Known are currentGain, baseResistance, emitterResistance, "
                                + "earlyVoltage, transitionFrequency, collectorBaseCapacitance, emitterBaseCapacitance, "
                                + "baseFlickerCorner");
    }

    @Test
    void namesAllFaultsOfAFileInItsOrder() {
        assertThat(faults("x.json", """
                        { "id": "x", "kind": "jfet", "polarity": "npn", "description": "d",
                          "parameters": {
                            "drainSaturationCurrent": { "min": "5 mA", "max": "1 mA", "basis": "maker" },
                            "pinchOffVoltage": { "basis": "guess" },
                            "gateLeakage": { "typical": 1e-9, "basis": "invented" }
                          } }
                        """))
                .containsExactly(
                        "x.json:1:42: polarity must be one of n-channel, p-channel, was \"npn\"",
                        "x.json:3:31: parameters.drainSaturationCurrent has the basis maker but no reference; "
                                + "name title, publisher and document, or the derivation",
                        "x.json:3:55: parameters.drainSaturationCurrent.max must not be below min, was \"1 mA\"",
                        "x.json:4:24: parameters.pinchOffVoltage has no value; state at least one of min, typical and max",
                        "x.json:4:35: parameters.pinchOffVoltage.basis must be one of maker, measured, derived, practice, "
                                + "memory, invented, was \"guess\"",
                        "x.json:5:33: parameters.gateLeakage.typical must be a current with its unit in quotes, "
                                + "was the bare number 1e-9; write it like \"1e-9 mA\"");
    }
}
