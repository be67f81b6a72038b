package hissledger.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.RandomAccessFile;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What is said of a file before its keys are looked at. */
class FilesAsAWholeTest {
    private static final long HUNDRED_MEGABYTES = 100L << 20;

    @TempDir
    private Path folder = Path.of("");

    private List<String> refusal(Path file) throws InputException {
        Catalogue catalogue = Catalogue.load(List.of());
        return Texts.sentences(
                catchThrowableOfType(InputException.class, () -> ScenarioReader.read(file, catalogue)), folder);
    }

    private List<String> refusal(String text) throws Exception {
        return refusal(Texts.file(folder, "t.json", text));
    }

    @Test
    void namesAMissingFile() throws Exception {
        assertThat(refusal(folder.resolve("t.json"))).containsExactly("t.json: does not exist; check the path");
    }

    @Test
    void wantsAFileAndNoFolder() throws Exception {
        Files.createDirectory(folder.resolve("sub"));
        assertThat(refusal(folder.resolve("sub"))).containsExactly("sub: is a folder; name a file in it");
    }

    @Test
    void refusesAHugeFileBeforeReadingIt() throws Exception {
        Path file = folder.resolve("t.json");
        try (RandomAccessFile sparse = new RandomAccessFile(file.toFile(), "rw")) {
            sparse.setLength(HUNDRED_MEGABYTES);
        }
        assertThat(refusal(file))
                .containsExactly(
                        "t.json: has 104857600 bytes, more than the 5000000 that are read; is this the right file?");
    }

    @Test
    void doesNotReadADeviceForEver() throws Exception {
        Path endless = Path.of("/dev/zero");
        org.junit.jupiter.api.Assumptions.assumeTrue(Files.exists(endless), "no such device here");
        assertThat(refusal(endless))
                .containsExactly(
                        "/dev/zero: has more bytes than it states, more than the 5000000 that are read; is this the right file?");
    }

    @Test
    void saysThatAFileIsEmpty() throws Exception {
        String sentence = "t.json: holds nothing; it should hold one JSON object { ... }";
        assertThat(refusal("")).containsExactly(sentence);
        assertThat(refusal(" \n // nothing but a comment\n")).containsExactly(sentence);
    }

    /** The column is that of the first character that does not fit, or the end of the file. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {"{ \"title\": \"T\" \"note\": \"N\" }| 16", "{ \"title\": | 11", "title = 5| 1", "<html></html>| 1"
            })
    void saysWhereAFileCeasesToBeJson(String text, int column) throws Exception {
        assertThat(refusal(text))
                .containsExactly("t.json:1:" + column
                        + ": is not JSON from here on; look for a missing comma, quote, colon or bracket just before");
    }

    @Test
    void refusesWhatFollowsTheEnd() throws Exception {
        assertThat(refusal("{ }\n{ }"))
                .containsExactly("t.json:2:1: goes on after the end of the JSON value; remove what follows");
    }

    @Test
    void refusesEndlessNesting() throws Exception {
        assertThat(refusal("[".repeat(100_000)))
                .containsExactly(
                        "t.json:1:51: goes beyond what is read: objects and lists in each other to a depth of 50, numbers of 1000 digits");
    }

    @Test
    void wantsTextInUtf8() throws Exception {
        Path file = folder.resolve("t.json");
        Files.write(file, Texts.SCENARIO.getBytes(StandardCharsets.UTF_16));
        assertThat(refusal(file)).containsExactly("t.json: is not text in UTF-8; save it in that encoding");
        Files.write(file, "{ \"title\": \"10 \u00b5V\" }".getBytes(StandardCharsets.ISO_8859_1));
        assertThat(refusal(file)).containsExactly("t.json: is not text in UTF-8; save it in that encoding");
    }

    @Test
    void readsAByteOrderMarkAndCommentsAndTrailingCommas() throws Exception {
        String text =
                "\ufeff// first\n" + Texts.exchanged(Texts.SCENARIO, "\"path\": [],", "/* none */ \"path\": [ ],");
        text = Texts.exchanged(text, "\"1 kohm\" } }", "\"1 kohm\", }, },");
        assertThat(ScenarioReader.read(Texts.file(folder, "t.json", text), Texts.catalogue())
                        .title())
                .isEqualTo("T");
    }

    @Test
    void countsColumnsInCharactersAndNotInBytes() throws Exception {
        assertThat(refusal("{ \"title\": \"µΩ√\", \"x\": 1 }"))
                .anyMatch(sentence -> sentence.startsWith("t.json:1:19: x "));
    }

    @Test
    void putsTheSentenceTogether() {
        assertThat(new Fault("a.json", 5, 30, "source.resistance", "must be > 0 ohm, was -1 ohm").sentence())
                .isEqualTo("a.json:5:30: source.resistance must be > 0 ohm, was -1 ohm");
        assertThat(new Fault("a.json", 5, 30, "", "is wrong").sentence()).isEqualTo("a.json:5:30: is wrong");
        assertThat(Fault.of("a.json", "is wrong").sentence()).isEqualTo("a.json: is wrong");
    }

    @Test
    void sortsFaultsByFileAndPlace() {
        InputException fault = new InputException(List.of(
                new Fault("b", 1, 1, "", "third"),
                new Fault("a", 2, 9, "", "second"),
                new Fault("a", 2, 3, "", "first")));
        assertThat(fault.faults()).extracting(Fault::message).containsExactly("first", "second", "third");
        assertThat(fault).hasNoCause();
    }
}
