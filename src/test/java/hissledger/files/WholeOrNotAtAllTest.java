package hissledger.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class WholeOrNotAtAllTest {
    private static final long PATIENCE_SECONDS = 10;

    @TempDir
    private Path folder = Path.of("");

    private static String refusal(Path target) {
        return catchThrowableOfType(InputException.class, () -> SafeWrite.text(target, "new"))
                .faults()
                .get(0)
                .sentence();
    }

    private List<String> names() throws IOException {
        try (Stream<Path> entries = Files.list(folder)) {
            return entries.map(entry -> entry.getFileName().toString()).sorted().toList();
        }
    }

    @Test
    void writesANewFileAndReplacesAnOldOneLeavingNothingBeside() throws Exception {
        Path target = folder.resolve("out.json");
        SafeWrite.text(target, "0 Ω");
        assertThat(target).hasContent("0 Ω");
        SafeWrite.bytes(target, new byte[] {65});
        assertThat(target).hasContent("A");
        assertThat(names()).containsExactly("out.json");
    }

    @Test
    void namesAFolderThatIsMissing() {
        Path target = folder.resolve("none/out.json");
        assertThat(refusal(target))
                .isEqualTo(target + ": cannot be written: the folder " + folder.resolve("none")
                        + " does not exist; make it first");
    }

    @Test
    void doesNotWriteOverAFolder() throws Exception {
        Files.createDirectory(folder.resolve("sub"));
        Path target = folder.resolve("sub");
        assertThat(refusal(target)).isEqualTo(target + ": cannot be written: it is a folder; name a file in it");
        assertThat(refusal(Path.of("/"))).isEqualTo("/: cannot be written: it is a folder; name a file in it");
    }

    @Test
    void saysSoWhereItHasNoPermission() throws Exception {
        Path closed = Files.createDirectory(
                folder.resolve("closed"),
                PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString("r-x------")));
        assumeTrue(!Files.isWritable(closed), "the superuser may write everywhere");
        Path target = closed.resolve("out.json");
        assertThat(refusal(target))
                .isEqualTo(
                        target + ": cannot be written: no permission; choose another folder or change its permissions");
    }

    @Test
    void leavesNothingHalfWrittenWhereTheSystemRefuses() throws Exception {
        // longer than the 255 bytes that file systems take for a name
        Path target = folder.resolve("x".repeat(300));
        assertThat(refusal(target))
                .isEqualTo(target + ": cannot be written; check the folder, its permissions and the free space");
        assertThat(names()).isEmpty();
    }

    @Test
    void writesThroughALinkWithoutReplacingIt() throws Exception {
        Path real = Files.writeString(folder.resolve("real.json"), "old");
        Path link = Files.createSymbolicLink(folder.resolve("link.json"), real);
        SafeWrite.text(link, "new");
        assertThat(Files.isSymbolicLink(link)).isTrue();
        assertThat(real).hasContent("new");
    }

    /** A pipe of the test's own: the devices of the machine are not risked. */
    @Test
    void writesIntoAPipeInsteadOfReplacingIt() throws Exception {
        Path pipe = folder.resolve("pipe");
        assumeTrue(makesPipe(pipe), "no pipes with names here");
        CompletableFuture<String> read = CompletableFuture.supplyAsync(() -> content(pipe));
        SafeWrite.text(pipe, "new");
        assertThat(Files.isRegularFile(pipe)).isFalse();
        assertThat(read.get(PATIENCE_SECONDS, TimeUnit.SECONDS)).isEqualTo("new");
    }

    private static boolean makesPipe(Path pipe) throws InterruptedException {
        try {
            return new ProcessBuilder("mkfifo", pipe.toString()).start().waitFor() == 0;
        } catch (IOException none) {
            return false;
        }
    }

    private static String content(Path file) {
        try {
            return Files.readString(file);
        } catch (IOException broken) {
            throw new UncheckedIOException(broken);
        }
    }
}
