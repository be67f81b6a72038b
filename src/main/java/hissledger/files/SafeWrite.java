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
        if (Files.isDirectory(target)) {
            throw InputException.of(name, "cannot be written: it is a folder; name a file in it");
        }
        Path folder = target.toAbsolutePath().getParent();
        if (folder == null || !Files.isDirectory(folder)) {
            throw InputException.of(name, "cannot be written: the folder " + folder + " does not exist; make it first");
        }
        try {
            if (Files.exists(target) && !Files.isRegularFile(target)) {
                // a device or a pipe is written to; moving a file over it would destroy it
                Files.write(target, content);
            } else {
                // what a link leads to is replaced, not the link
                replace(Files.exists(target) ? target.toRealPath() : target.toAbsolutePath(), content);
            }
        } catch (AccessDeniedException denied) {
            throw InputException.of(
                    name, "cannot be written: no permission; choose another folder or change its permissions");
        } catch (IOException failed) {
            throw InputException.of(name, "cannot be written; check the folder, its permissions and the free space");
        }
    }

    private static void replace(Path target, byte[] content) throws IOException {
        Path temporary = target.resolveSibling(
                "." + target.getFileName() + "." + ProcessHandle.current().pid() + ".part");
        try {
            Files.write(temporary, content);
            move(temporary, target);
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
