package hissledger.cli;

import hissledger.chart.DeviceChart;
import hissledger.device.Device;
import hissledger.device.DeviceKind;
import hissledger.device.DeviceParameter;
import hissledger.device.Polarity;
import hissledger.files.Catalogue;
import hissledger.files.DeviceReader;
import hissledger.files.Fault;
import hissledger.files.InputException;
import hissledger.files.Quantities;
import hissledger.ledger.DeviceCurves;
import hissledger.report.DeviceText;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
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

    /** The devices that a verb works on. */
    static final class Folders {
        @Option(
                names = "--devices",
                paramLabel = "DIR",
                description = "a folder of device files of your own; may be repeated")
        private List<Path> folders = new ArrayList<>();

        Catalogue load() throws InputException {
            return Catalogue.load(folders);
        }
    }

    /** Lists the catalogue. */
    @Command(
            name = "list",
            mixinStandardHelpOptions = true,
            sortOptions = false,
            description =
                    "One line a device: what it is, and its gain and noise at a current. Options narrow the list.",
            footer = {
                "",
                "Examples:",
                "  hissledger devices list --kind bipolar --polarity pnp --rbb-below \"30 ohm\"",
                "  hissledger devices list --kind jfet --at \"2 mA\" --gm-above \"10 mS\""
            })
    static final class ListAll implements Callable<Integer> {
        @Mixin
        private Folders folders = new Folders();

        @Option(names = "--kind", paramLabel = "KIND", description = "bipolar, jfet or amplifier")
        private Optional<String> kind = Optional.empty();

        @Option(names = "--polarity", paramLabel = "POLARITY", description = "npn, pnp, n-channel or p-channel")
        private Optional<String> polarity = Optional.empty();

        @Option(names = "--evidence", paramLabel = "LETTER", description = "A, B or C: how well the noise is published")
        private Optional<String> evidence = Optional.empty();

        @Option(names = "--at", paramLabel = "CURRENT", description = "the current of gain and noise (default 1 mA)")
        private String at = "1 mA";

        @Option(
                names = "--rbb-below",
                paramLabel = "RESISTANCE",
                description = "typical rbb' below this, like \"30 ohm\"")
        private Optional<String> rbbBelow = Optional.empty();

        @Option(names = "--hfe-above", paramLabel = "GAIN", description = "typical hFE at the current above this")
        private Optional<Double> hfeAbove = Optional.empty();

        @Option(
                names = "--gm-above",
                paramLabel = "SLOPE",
                description = "typical gm at the current above this, like \"10 mS\"")
        private Optional<String> gmAbove = Optional.empty();

        @Spec
        private CommandSpec spec = CommandSpec.create();

        @Override
        public Integer call() throws InputException {
            kind.ifPresent(word ->
                    known("--kind", word, Arrays.stream(DeviceKind.values()).map(DeviceKind::label)));
            polarity.ifPresent(word -> known(
                    "--polarity",
                    word,
                    Arrays.stream(Polarity.values()).map(Polarity::label).filter(label -> !label.isEmpty())));
            evidence.ifPresent(word -> known("--evidence", word, Stream.of("A", "B", "C")));
            double amps = quantity("--at", at, Quantities::amps);
            Optional<Double> ohms = rbbBelow.map(text -> quantity("--rbb-below", text, Quantities::ohms));
            Optional<Double> siemens = gmAbove.map(text -> quantity("--gm-above", text, Quantities::siemens));
            List<Device> chosen = folders.load().all().stream()
                    .filter(device -> kind.isEmpty() || device.kind().label().equals(kind.get()))
                    .filter(device ->
                            polarity.isEmpty() || device.polarity().label().equals(polarity.get()))
                    .filter(device -> evidence.isEmpty() || device.evidence().equals(evidence.get()))
                    .filter(device -> ohms.isEmpty()
                            || device.parameter(DeviceParameter.BASE_RESISTANCE)
                                    .filter(value -> value.representative() < ohms.get())
                                    .isPresent())
                    .filter(device -> hfeAbove.isEmpty() || gainAbove(device, DeviceKind.BIPOLAR, amps, hfeAbove.get()))
                    .filter(device -> siemens.isEmpty() || gainAbove(device, DeviceKind.JFET, amps, siemens.get()))
                    .toList();
            spec.commandLine()
                    .getOut()
                    .print(
                            chosen.isEmpty()
                                    ? "No device fits all of these options; leave one out or loosen it.\n"
                                    : DeviceText.list(chosen, amps));
            return ExitCode.DONE;
        }

        private static boolean gainAbove(Device device, DeviceKind wanted, double amps, double limit) {
            return device.kind() == wanted
                    && DeviceCurves.at(device, amps, DeviceCurves.USUAL_HERTZ)
                            .filter(point -> point.gain() > limit)
                            .isPresent();
        }

        private void known(String option, String word, Stream<String> words) {
            List<String> all = words.toList();
            if (!all.contains(word)) {
                throw new ParameterException(
                        spec.commandLine(), option + " must be " + String.join(" or ", all) + ", was '" + word + "'");
            }
        }

        private double quantity(String option, String text, ToDoubleFunction<String> reader) {
            try {
                return reader.applyAsDouble(text);
            } catch (IllegalArgumentException fault) {
                throw new ParameterException(spec.commandLine(), option + " " + fault.getMessage(), fault);
            }
        }
    }

    /** Shows one device. */
    @Command(
            name = "show",
            mixinStandardHelpOptions = true,
            sortOptions = false,
            description = "Every value of a device with its basis and reference, and what current does to its noise.",
            footer = {"", "Example:", "  hissledger devices show bf862 --chart bf862.png"})
    static final class Show implements Callable<Integer> {
        @Parameters(paramLabel = "ID", description = "the device's id")
        private String id = "";

        @Mixin
        private Folders folders = new Folders();

        @Mixin
        private ChartFile chart = new ChartFile();

        @Spec
        private CommandSpec spec = CommandSpec.create();

        @Override
        public Integer call() throws InputException {
            chart.check(spec);
            Catalogue catalogue = folders.load();
            Device device = catalogue.find(id).orElseThrow(() -> {
                List<String> near = catalogue.nearest(id);
                return new ParameterException(
                        spec.commandLine(),
                        "there is no device '" + id + "'"
                                + (near.isEmpty()
                                        ? "; see devices list"
                                        : "; did you mean " + String.join(" or ", near) + "?"));
            });
            if (chart.isAsked()) {
                if (device.kind() == DeviceKind.AMPLIFIER) {
                    throw new ParameterException(
                            spec.commandLine(), "a behavioural amplifier has no curve against current to draw");
                }
                chart.write(DeviceChart.noise(device));
            }
            spec.commandLine().getOut().print(DeviceText.show(device));
            return ExitCode.DONE;
        }
    }

    /** Checks device files. */
    @Command(
            name = "check",
            mixinStandardHelpOptions = true,
            sortOptions = false,
            description =
                    "Names every fault in device files, and holds each model against the noise published of the device;"
                            + " the shipped ones if none is given.",
            footer = {
                "",
                "Examples:",
                "  hissledger devices check my-devices",
                "  hissledger devices check --chart all.png"
            })
    static final class Check implements Callable<Integer> {
        @Parameters(paramLabel = "FILE|DIR", arity = "0..*", description = "device files, or folders of them")
        private List<Path> paths = new ArrayList<>();

        @Mixin
        private ChartFile chart = new ChartFile();

        @Spec
        private CommandSpec spec = CommandSpec.create();

        @Override
        public Integer call() throws InputException {
            chart.check(spec);
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
            if (chart.isAsked()) {
                try {
                    chart.write(DeviceChart.check(devices));
                } catch (IllegalArgumentException nothing) {
                    throw new ParameterException(
                            spec.commandLine(), "--chart has nothing to draw: " + nothing.getMessage(), nothing);
                }
            }
            spec.commandLine().getOut().print(DeviceText.checked(devices));
            return ExitCode.DONE;
        }

        private List<Path> files() throws InputException {
            List<Path> files = new ArrayList<>();
            for (Path path : paths) {
                if (Files.isDirectory(path)) {
                    files.addAll(Catalogue.list(path));
                } else {
                    files.add(path);
                }
            }
            return files;
        }
    }
}
