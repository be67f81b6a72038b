package hissledger.files;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/** Commented files to start from, with sensible values. */
public final class Starters {
    private static final String FOLDER = "/hissledger/starters/";
    private static final String ENDING = ".json";
    /** Stands in the starter for the id, which must equal the file name. */
    private static final String ID = "my-device";

    private Starters() {}

    /** Writes a scenario to start from. A file that exists is never overwritten. */
    public static void scenario(Path target) throws InputException {
        write(target, resource("scenario.json"));
    }

    /** Writes a device to start from, its id made from the file name. A file that exists is never overwritten. */
    public static void device(Path target) throws InputException {
        String name = String.valueOf(target.getFileName());
        if (!name.endsWith(ENDING) || name.equals(ENDING)) {
            throw InputException.of(
                    target.toString(), "must end in .json, since the name before it becomes the id of the device");
        }
        write(target, resource("device.json").replace(ID, name.substring(0, name.length() - ENDING.length())));
    }

    private static void write(Path target, String content) throws InputException {
        if (Files.exists(target)) {
            throw InputException.of(target.toString(), "exists already and is left as it is; choose another name");
        }
        SafeWrite.text(target, content);
    }

    private static String resource(String name) {
        try (InputStream stream = Starters.class.getResourceAsStream(FOLDER + name)) {
            if (stream == null) {
                throw new IllegalStateException("the program lacks its resource " + FOLDER + name);
            }
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException broken) {
            throw new IllegalStateException("the program's resource " + FOLDER + name + " cannot be read", broken);
        }
    }
}
