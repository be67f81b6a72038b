package hissledger.cli;

import hissledger.chart.Picture;
import hissledger.files.InputException;
import hissledger.files.SafeWrite;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;

/** Where a chart goes. */
final class ChartFile {
    private static final int WIDTH = 1600;
    private static final int HEIGHT = 1000;
    private static final String PNG = ".png";

    @Option(names = "--chart", paramLabel = "FILE.png", description = "write the chart as PNG, 1600 x 1000 pixels")
    private Optional<Path> file = Optional.empty();

    /** Refuses a file name that says another format, before anything is computed. */
    void check(CommandSpec spec) {
        if (file.isPresent() && !file.get().toString().toLowerCase(Locale.ROOT).endsWith(PNG)) {
            throw new ParameterException(
                    spec.commandLine(), "--chart writes PNG: give a file name that ends in .png, not " + file.get());
        }
    }

    boolean isAsked() {
        return file.isPresent();
    }

    /** Writes the chart where it was asked for. */
    void write(Picture picture) throws InputException {
        if (file.isPresent()) {
            SafeWrite.bytes(file.get(), picture.png(WIDTH, HEIGHT));
        }
    }
}
