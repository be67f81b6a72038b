package hissledger.files;

import hissledger.device.Device;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Stream;

/**
 * The devices at hand: those shipped with the program, and those of the user's folders, whose files win by id. A device file
 * is read when it is asked for. Belongs to one thread.
 */
public final class Catalogue {
    private static final String SHIPPED = "/hissledger/device-params/";
    private static final String INDEX = "index.txt";
    private static final String ENDING = ".json";

    /** Where a device file is: in a folder, or with the program. */
    private sealed interface Place {
        Device read() throws InputException;
    }

    private record InFolder(Path file) implements Place {
        @Override
        public Device read() throws InputException {
            return DeviceReader.read(file);
        }
    }

    private record InProgram(String file) implements Place {
        @Override
        public Device read() throws InputException {
            return DeviceReader.read(file, resource(file));
        }
    }

    private final Map<String, Place> places = new TreeMap<>();
    private final Map<String, Device> read = new HashMap<>();

    private Catalogue() {}

    /**
     * The catalogue of the shipped devices and those of some folders, the later folder winning.
     *
     * @throws InputException if a folder cannot be listed
     */
    public static Catalogue load(List<Path> folders) throws InputException {
        Catalogue catalogue = new Catalogue();
        new String(resource(INDEX), StandardCharsets.UTF_8)
                .lines()
                .filter(line -> line.endsWith(ENDING))
                .forEach(file -> catalogue.places.put(id(file), new InProgram(file)));
        for (Path folder : folders) {
            for (Path file : list(folder)) {
                catalogue.places.put(id(file.getFileName().toString()), new InFolder(file));
            }
        }
        return catalogue;
    }

    /** The device files of a folder, sorted by name. */
    public static List<Path> list(Path folder) throws InputException {
        if (!Files.isDirectory(folder)) {
            throw InputException.of(folder.toString(), "is no folder of device files; check the path");
        }
        try (Stream<Path> entries = Files.list(folder)) {
            return entries.filter(entry -> entry.toString().endsWith(ENDING))
                    .sorted()
                    .toList();
        } catch (IOException unreadable) {
            throw InputException.of(folder.toString(), "cannot be listed; check its permissions");
        }
    }

    /** The device with an id; empty where there is none. */
    public Optional<Device> find(String id) throws InputException {
        Place place = places.get(id);
        if (place == null) {
            return Optional.empty();
        }
        Device known = read.get(id);
        if (known == null) {
            known = place.read();
            read.put(id, known);
        }
        return Optional.of(known);
    }

    /** All devices, sorted by id. Faults of all files are reported together. */
    public List<Device> all() throws InputException {
        List<Device> devices = new ArrayList<>();
        List<Fault> faults = new ArrayList<>();
        for (String id : places.keySet()) {
            try {
                find(id).ifPresent(devices::add);
            } catch (InputException fault) {
                faults.addAll(fault.faults());
            }
        }
        if (!faults.isEmpty()) {
            throw new InputException(faults);
        }
        return devices;
    }

    /** Ids near a mistyped one. */
    public List<String> nearest(String id) {
        return Nearest.of(id, places.keySet());
    }

    private static String id(String file) {
        return file.substring(0, file.length() - ENDING.length());
    }

    private static byte[] resource(String file) {
        try (InputStream stream = Catalogue.class.getResourceAsStream(SHIPPED + file)) {
            if (stream == null) {
                throw new IllegalStateException("the program lacks its resource " + SHIPPED + file);
            }
            return stream.readAllBytes();
        } catch (IOException broken) {
            throw new IllegalStateException("the program's resource " + SHIPPED + file + " cannot be read", broken);
        }
    }
}
