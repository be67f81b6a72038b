package hissledger.files;

import java.io.IOException;
import java.net.URISyntaxException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/** Files that the tests read, and the sentences that come of them. */
final class Texts {
    /** A scenario without faults; the tests exchange parts of it. Its places matter. */
    static final String SCENARIO = """
            {
              "title": "T",
              "source": { "kind": "resistor", "resistance": "150 ohm" },
              "path": [],
              "candidates": [
                { "name": "a", "device": "trial-npn", "arrangement": "common-emitter", "current": "1 mA",
                  "load": { "resistor": "1 kohm" } }
              ]
            }
            """;

    /** A bipolar device without faults. */
    static final String BIPOLAR = """
            {
              "id": "x",
              "kind": "bipolar", "polarity": "npn",
              "description": "d",
              "parameters": {
                "currentGain": { "points": [ { "current": "1 mA", "typical": 100 }, { "current": "2 mA", "typical": 90 } ], "basis": "invented" },
                "baseResistance": { "typical": "40 ohm", "basis": "invented" }
              }
            }
            """;

    /** A JFET without faults. */
    static final String JFET = """
            {
              "id": "x",
              "kind": "jfet", "polarity": "n-channel",
              "description": "d",
              "parameters": {
                "drainSaturationCurrent": { "typical": "10 mA", "basis": "invented" },
                "pinchOffVoltage": { "typical": "1 V", "basis": "invented" },
                "gateLeakage": { "typical": "1 pA", "basis": "invented" }
              }
            }
            """;

    private Texts() {}

    /** The folder of the tests' own devices. */
    static Path devices() {
        return resource("devices");
    }

    /** A file or folder beside the tests. */
    static Path resource(String name) {
        try {
            java.net.URL url = Texts.class.getResource(name);
            if (url == null) {
                throw new IllegalStateException("no resource " + name);
            }
            return Path.of(url.toURI());
        } catch (URISyntaxException impossible) {
            throw new IllegalStateException(impossible);
        }
    }

    /** The shipped devices and those of the tests. */
    static Catalogue catalogue() throws InputException {
        return Catalogue.load(List.of(devices()));
    }

    /** A text with one part of it exchanged, which must stand in it once. */
    static String exchanged(String text, String part, String other) {
        int at = text.indexOf(part);
        if (at < 0 || text.indexOf(part, at + 1) >= 0) {
            throw new IllegalArgumentException("stands not once in the text: " + part);
        }
        return text.substring(0, at) + other + text.substring(at + part.length());
    }

    /** A file with this text. */
    static Path file(Path folder, String name, String text) throws IOException {
        return Files.write(folder.resolve(name), text.getBytes(StandardCharsets.UTF_8));
    }

    /** The sentences of an exception, each without the folder of the file. */
    static List<String> sentences(InputException fault, Path folder) {
        return fault.faults().stream()
                .map(Fault::sentence)
                .map(sentence -> sentence.replace(
                        folder.toString() + folder.getFileSystem().getSeparator(), ""))
                .toList();
    }
}
