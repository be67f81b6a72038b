package hissledger.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import hissledger.device.Device;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class CatalogueFoldersTest {
    @TempDir
    private Path folder = Path.of("");

    private Path folder(String name) throws Exception {
        return Files.createDirectories(folder.resolve(name));
    }

    private static String described(String words) {
        return Texts.exchanged(Texts.BIPOLAR, "\"description\": \"d\"", "\"description\": \"" + words + "\"");
    }

    @Test
    void holdsEveryShippedDeviceSortedById() throws Exception {
        List<String> ids =
                Catalogue.load(List.of()).all().stream().map(Device::id).toList();
        long files;
        try (Stream<Path> entries = Files.list(Path.of("device-params"))) {
            files = entries.filter(entry -> entry.toString().endsWith(".json")).count();
        }
        assertThat(ids).isSorted().doesNotHaveDuplicates().hasSize((int) files).contains("2n4403", "bf862");
    }

    @Test
    void letsTheLaterFolderWin() throws Exception {
        Texts.file(folder("one"), "x.json", described("first"));
        Texts.file(folder("two"), "x.json", described("second"));
        Catalogue catalogue = Catalogue.load(List.of(folder("one"), folder("two")));
        assertThat(catalogue.find("x").orElseThrow().description()).isEqualTo("second");
        assertThat(Catalogue.load(List.of(folder("two"), folder("one")))
                        .find("x")
                        .orElseThrow()
                        .description())
                .isEqualTo("first");
    }

    @Test
    void letsAFolderReplaceAShippedDevice() throws Exception {
        Texts.file(folder, "bf862.json", Texts.exchanged(described("mine"), "\"id\": \"x\"", "\"id\": \"bf862\""));
        Catalogue catalogue = Catalogue.load(List.of(folder));
        assertThat(catalogue.find("bf862").orElseThrow().description()).isEqualTo("mine");
        assertThat(catalogue.all()).hasSameSizeAs(Catalogue.load(List.of()).all());
    }

    @Test
    void readsAFileOnlyWhenItIsAskedFor() throws Exception {
        Texts.file(folder, "x.json", "not JSON");
        Catalogue catalogue = Catalogue.load(List.of(folder));
        assertThat(catalogue.find("bf862")).isPresent();
        InputException broken = catchThrowableOfType(InputException.class, catalogue::all);
        assertThat(broken.faults()).hasSize(1);
        assertThat(broken.faults().get(0).file())
                .isEqualTo(folder.resolve("x.json").toString());
    }

    @Test
    void reportsTheFaultsOfAllFilesTogether() throws Exception {
        Texts.file(folder, "x.json", "");
        Texts.file(folder, "y.json", Texts.BIPOLAR);
        Catalogue catalogue = Catalogue.load(List.of(folder));
        assertThat(Texts.sentences(catchThrowableOfType(InputException.class, catalogue::all), folder))
                .containsExactly(
                        "x.json: holds nothing; it should hold one JSON object { ... }",
                        "y.json:2:9: id must equal the file name without its ending, \"y\", was \"x\"; rename the one or the other");
    }

    @Test
    void suggestsIdsNearAMistypedOne() throws Exception {
        Catalogue catalogue = Catalogue.load(List.of());
        assertThat(catalogue.find("2n4430")).isEmpty();
        assertThat(catalogue.nearest("2n4430")).contains("2n4403");
        assertThat(catalogue.nearest("no such thing at all")).isEmpty();
    }

    @Test
    void wantsFolders() {
        Path missing = folder.resolve("none");
        InputException fault = catchThrowableOfType(InputException.class, () -> Catalogue.load(List.of(missing)));
        assertThat(Texts.sentences(fault, folder))
                .containsExactly("none: is no folder of device files; check the path");
    }
}
