package hissledger.cli;

import hissledger.device.Device;
import hissledger.files.Catalogue;
import hissledger.files.DeviceReader;
import hissledger.files.Fault;
import hissledger.files.InputException;
import hissledger.report.DeviceText;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** The catalogue of devices. */
@Command(
        name = "devices",
        mixinStandardHelpOptions = true,
        sortOptions = false,
        synopsisSubcommandLabel = "[list | show ID | check [FILE|DIR]...]",
        description = "The catalogue of devices: list them, show one with the basis of each value, check files.",
        subcommands = {DevicesVerb.ListAll.class, DevicesVerb.Show.class, DevicesVerb.Check.class},
        footer = {"", "Examples:", "  hissledger devices list", "  hissledger devices show 2n4403"})
final class DevicesVerb implements Runnable {
    @Spec
    private CommandSpec spec = CommandSpec.create();

    @Override
    public void run() {
        throw new ParameterException(spec.commandLine(), "say what to do: list, show ID or check");
    }

    /** Lists the catalogue. */
    @Command(
            name = "list",
            mixinStandardHelpOptions = true,
            description = "One line a device: kind, polarity, what it stands out by.",
            footer = {"", "Example:", "  hissledger devices list --devices my-devices"})
    static final class ListAll implements Callable<Integer> {
        @Option(
                names = "--devices",
                paramLabel = "DIR",
                description = "a folder of device files of your own; may be repeated")
        private List<Path> folders = new ArrayList<>();

        @Spec
        private CommandSpec spec = CommandSpec.create();

        @Override
        public Integer call() throws InputException {
            spec.commandLine()
                    .getOut()
                    .print(DeviceText.list(Catalogue.load(folders).all()));
            return ExitCode.DONE;
        }
    }

    /** Shows one device. */
    @Command(
            name = "show",
            mixinStandardHelpOptions = true,
            description = "Every value of a device with its basis and reference.",
            footer = {"", "Example:", "  hissledger devices show bf862"})
    static final class Show implements Callable<Integer> {
        @Parameters(paramLabel = "ID", description = "the device's id")
        private String id = "";

        @Option(
                names = "--devices",
                paramLabel = "DIR",
                description = "a folder of device files of your own; may be repeated")
        private List<Path> folders = new ArrayList<>();

        @Spec
        private CommandSpec spec = CommandSpec.create();

        @Override
        public Integer call() throws InputException {
            Catalogue catalogue = Catalogue.load(folders);
            Optional<Device> device = catalogue.find(id);
            if (device.isEmpty()) {
                List<String> near = catalogue.nearest(id);
                throw new ParameterException(
                        spec.commandLine(),
                        "there is no device '" + id + "'"
                                + (near.isEmpty()
                                        ? "; see devices list"
                                        : "; did you mean " + String.join(" or ", near) + "?"));
            }
            spec.commandLine().getOut().print(DeviceText.show(device.get()));
            return ExitCode.DONE;
        }
    }

    /** Checks device files. */
    @Command(
            name = "check",
            mixinStandardHelpOptions = true,
            description = "Reads device files and names every fault in them; the shipped ones if none is given.",
            footer = {"", "Example:", "  hissledger devices check my-devices"})
    static final class Check implements Callable<Integer> {
        @Parameters(paramLabel = "FILE|DIR", arity = "0..*", description = "device files, or folders of them")
        private List<Path> paths = new ArrayList<>();

        @Spec
        private CommandSpec spec = CommandSpec.create();

        @Override
        public Integer call() throws InputException {
            PrintWriter out = spec.commandLine().getOut();
            List<Device> devices = new ArrayList<>();
            List<Fault> faults = new ArrayList<>();
            if (paths.isEmpty()) {
                devices.addAll(Catalogue.load(List.of()).all());
            }
            for (Path file : files()) {
                try {
                    devices.add(DeviceReader.read(file));
                } catch (InputException fault) {
                    faults.addAll(fault.faults());
                }
            }
            if (!faults.isEmpty()) {
                throw new InputException(faults);
            }
            out.print(DeviceText.checked(devices));
            return ExitCode.DONE;
        }

        private List<Path> files() throws InputException {
            List<Path> files = new ArrayList<>();
            for (Path path : paths) {
                if (!Files.isDirectory(path)) {
                    files.add(path);
                    continue;
                }
                files.addAll(Catalogue.list(path));
            }
            return files;
        }
    }
}
