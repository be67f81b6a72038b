package hissledger.files;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/** Writes a file whole or not at all: to a temporary file beside the target, which is then moved. */
public final class SafeWrite {
    private SafeWrite() {}

    /** Writes a text in UTF-8. */
    public static void text(Path target, String content) throws InputException {
        bytes(target, content.getBytes(StandardCharsets.UTF_8));
    }

    /** Writes bytes. */
    public static void bytes(Path target, byte[] content) throws InputException {
        String name = target.toString();
        Path folder = target.toAbsolutePath().getParent();
        if (folder == null || !Files.isDirectory(folder)) {
            throw InputException.of(name, "cannot be written: the folder " + folder + " does not exist; make it first");
        }
        if (Files.isDirectory(target)) {
            throw InputException.of(name, "cannot be written: it is a folder; name a file in it");
        }
        Path temporary = folder.resolve(
                "." + target.getFileName() + "." + ProcessHandle.current().pid() + ".part");
        try {
            Files.write(temporary, content);
            move(temporary, target);
        } catch (AccessDeniedException denied) {
            throw InputException.of(
                    name, "cannot be written: no permission; choose another folder or change its permissions");
        } catch (IOException failed) {
            throw InputException.of(name, "cannot be written; check the folder, its permissions and the free space");
        } finally {
            try {
                Files.deleteIfExists(temporary);
            } catch (IOException stays) {
                // the temporary file stays behind; the target is whole or untouched all the same
            }
        }
    }

    private static void move(Path temporary, Path target) throws IOException {
        try {
            Files.move(temporary, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } catch (AtomicMoveNotSupportedException plain) {
            Files.move(temporary, target, StandardCopyOption.REPLACE_EXISTING);
        }
    }
}
