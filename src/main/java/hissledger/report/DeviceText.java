package hissledger.report;

import hissledger.device.Device;
import hissledger.device.DeviceKind;
import hissledger.device.DeviceParameter;
import hissledger.device.GainPoint;
import hissledger.device.GainSheet;
import hissledger.device.NoisePoint;
import hissledger.device.Parameter;
import hissledger.device.StatedAt;
import hissledger.files.Phrases;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;

/** Devices as text. */
public final class DeviceText {
    private static final Map<DeviceParameter, String> UNITS = Map.ofEntries(
            Map.entry(DeviceParameter.BASE_RESISTANCE, "Ω"),
            Map.entry(DeviceParameter.EMITTER_RESISTANCE, "Ω"),
            Map.entry(DeviceParameter.EARLY_VOLTAGE, "V"),
            Map.entry(DeviceParameter.TRANSITION_FREQUENCY, "Hz"),
            Map.entry(DeviceParameter.COLLECTOR_BASE_CAPACITANCE, "F"),
            Map.entry(DeviceParameter.EMITTER_BASE_CAPACITANCE, "F"),
            Map.entry(DeviceParameter.BASE_FLICKER_CORNER, "Hz"),
            Map.entry(DeviceParameter.DRAIN_SATURATION_CURRENT, "A"),
            Map.entry(DeviceParameter.PINCH_OFF_VOLTAGE, "V"),
            Map.entry(DeviceParameter.TRANSCONDUCTANCE, "S"),
            Map.entry(DeviceParameter.GATE_LEAKAGE, "A"),
            Map.entry(DeviceParameter.GATE_SOURCE_CAPACITANCE, "F"),
            Map.entry(DeviceParameter.GATE_DRAIN_CAPACITANCE, "F"),
            Map.entry(DeviceParameter.FLICKER_DENSITY, "V/√Hz"),
            Map.entry(DeviceParameter.OUTPUT_CONDUCTANCE_FACTOR, "1/V"),
            Map.entry(DeviceParameter.VOLTAGE_NOISE, "V/√Hz"),
            Map.entry(DeviceParameter.VOLTAGE_NOISE_CORNER, "Hz"),
            Map.entry(DeviceParameter.CURRENT_NOISE, "A/√Hz"),
            Map.entry(DeviceParameter.CURRENT_NOISE_CORNER, "Hz"),
            Map.entry(DeviceParameter.INPUT_RESISTANCE, "Ω"),
            Map.entry(DeviceParameter.INPUT_CAPACITANCE, "F"),
            Map.entry(DeviceParameter.COLLECTOR_EMITTER_VOLTAGE, "V"),
            Map.entry(DeviceParameter.GATE_VOLTAGE, "V"),
            Map.entry(DeviceParameter.DRAIN_SOURCE_VOLTAGE, "V"),
            Map.entry(DeviceParameter.CURRENT, "A"),
            Map.entry(DeviceParameter.POWER, "W"));

    private static final Map<StatedAt, String> COMPANION_UNITS =
            Map.of(StatedAt.CURRENT, "A", StatedAt.DOUBLING_STEP, "K", StatedAt.FREQUENCY, "Hz");

    private DeviceText() {}

    /** One line a device. */
    public static String list(List<Device> devices) {
        TextTable table = new TextTable()
                .column(TextTable.Align.LEFT, "id")
                .column(TextTable.Align.LEFT, "kind")
                .column(TextTable.Align.LEFT, "polarity")
                .column(TextTable.Align.LEFT, "evidence")
                .column(TextTable.Align.LEFT, "description");
        for (Device device : devices) {
            table.row(
                    device.id(),
                    device.kind().label(),
                    device.polarity().label(),
                    device.evidence(),
                    device.description());
        }
        return table.render();
    }

    /** What a check found of files that have no fault. */
    public static String checked(List<Device> devices) {
        StringBuilder text = new StringBuilder();
        for (Device device : devices) {
            int defaults = resolvedDefaults(device).size();
            text.append(device.id()).append(": no fault; ");
            text.append(defaults == 0 ? "complete" : defaults + " default" + (defaults == 1 ? "" : "s") + " in use");
            text.append('\n');
        }
        text.append(devices.size())
                .append(devices.size() == 1 ? " device" : " devices")
                .append(" read.\n");
        return text.toString();
    }

    /** Every value with its basis and reference. */
    public static String show(Device device) {
        StringBuilder text = new StringBuilder();
        text.append(device.id()).append(": ").append(device.description()).append('\n');
        text.append(device.kind().label());
        if (!device.polarity().label().isEmpty()) {
            text.append(", ").append(device.polarity().label());
        }
        if (!device.evidence().isEmpty()) {
            text.append(", evidence ").append(device.evidence());
        }
        text.append('\n');
        if (!device.note().isEmpty()) {
            text.append(device.note()).append('\n');
        }
        text.append('\n');
        List<String> references = new ArrayList<>();
        text.append(parameters(device, references).render());
        if (!device.noisePoints().isEmpty()) {
            text.append("\nPublished noise of this device:\n");
            text.append(noisePoints(device, references).render());
        }
        if (!references.isEmpty()) {
            text.append("\nReferences:\n");
            for (int k = 0; k < references.size(); k++) {
                text.append("[")
                        .append(k + 1)
                        .append("] ")
                        .append(references.get(k))
                        .append('\n');
            }
        }
        List<String> defaults = resolvedDefaults(device);
        if (!defaults.isEmpty()) {
            text.append("\nDefaults in use:\n");
            defaults.forEach(line -> text.append("  ").append(line).append('\n'));
        }
        return text.toString();
    }

    private static TextTable parameters(Device device, List<String> references) {
        TextTable table = new TextTable()
                .column(TextTable.Align.LEFT, "parameter")
                .column(TextTable.Align.POINT, "min")
                .column(TextTable.Align.POINT, "typical")
                .column(TextTable.Align.POINT, "max")
                .column(TextTable.Align.LEFT, "basis")
                .column(TextTable.Align.LEFT, "stated at")
                .column(TextTable.Align.LEFT, "reference");
        device.currentGain().ifPresent(gain -> gain(table, gain, references));
        device.inOrder().forEach((key, parameter) -> {
            String unit = UNITS.getOrDefault(key, "");
            table.row(
                    key.words(),
                    cell(parameter.min(), unit),
                    cell(parameter.typical(), unit),
                    cell(parameter.max(), unit),
                    parameter.basis().label(),
                    conditions(parameter),
                    reference(parameter.reference(), references));
        });
        return table;
    }

    private static void gain(TextTable table, GainSheet gain, List<String> references) {
        for (GainPoint point : gain.points()) {
            table.row(
                    "current gain hFE",
                    cell(point.min(), ""),
                    cell(point.typical(), ""),
                    cell(point.max(), ""),
                    gain.basis().label(),
                    "IC " + Words.value(point.currentAmps(), "A")
                            + (gain.conditions().isEmpty() ? "" : "; " + gain.conditions()),
                    reference(gain.reference(), references));
        }
    }

    private static TextTable noisePoints(Device device, List<String> references) {
        TextTable table = new TextTable()
                .column(TextTable.Align.LEFT, "quantity")
                .column(TextTable.Align.POINT, "typical")
                .column(TextTable.Align.POINT, "max")
                .column(TextTable.Align.LEFT, "current")
                .column(TextTable.Align.LEFT, "frequency")
                .column(TextTable.Align.LEFT, "source")
                .column(TextTable.Align.LEFT, "basis")
                .column(TextTable.Align.LEFT, "reference");
        for (NoisePoint point : device.noisePoints()) {
            String unit = switch (point.quantity()) {
                case VOLTAGE_NOISE -> "V/√Hz";
                case CURRENT_NOISE -> "A/√Hz";
                case NOISE_FIGURE -> "dB";
                case OPTIMUM_RESISTANCE -> "Ω";
            };
            table.row(
                    point.quantity().key(),
                    cell(point.typical(), unit),
                    cell(point.max(), unit),
                    cell(point.currentAmps(), "A"),
                    Words.value(point.hertz(), "Hz"),
                    cell(point.sourceOhms(), "Ω"),
                    point.basis().label(),
                    reference(point.reference(), references));
        }
        return table;
    }

    private static String cell(OptionalDouble value, String unit) {
        if (value.isEmpty()) {
            return "";
        }
        if (unit.isEmpty() || unit.equals("dB") || unit.equals("1/V")) {
            String number = String.format(Locale.ROOT, "%.4g", value.getAsDouble());
            String trimmed = number.contains(".") && !number.contains("e")
                    ? number.replaceAll("0+$", "").replaceAll("\\.$", "")
                    : number;
            return unit.isEmpty() ? trimmed : trimmed + " " + unit;
        }
        return Words.value(value.getAsDouble(), unit);
    }

    private static String conditions(Parameter parameter) {
        List<String> parts = new ArrayList<>();
        parameter.at().entrySet().stream()
                .sorted(Map.Entry.comparingByKey())
                .forEach(entry -> parts.add(companion(entry.getKey(), entry.getValue())));
        if (!parameter.conditions().isEmpty()) {
            parts.add(parameter.conditions());
        }
        return String.join("; ", parts);
    }

    private static String companion(StatedAt at, double value) {
        if (at == StatedAt.TEMPERATURE) {
            return Phrases.temperature(value);
        }
        String unit = COMPANION_UNITS.getOrDefault(at, "");
        String number = cell(OptionalDouble.of(value), unit);
        return switch (at) {
            case CURRENT -> "at " + number;
            case FREQUENCY -> "at " + number;
            case DOUBLING_STEP -> "doubles every " + number;
            default -> at.key() + " " + number;
        };
    }

    private static String reference(String reference, List<String> references) {
        if (reference.isEmpty()) {
            return "";
        }
        int index = references.indexOf(reference);
        if (index < 0) {
            references.add(reference);
            index = references.size() - 1;
        }
        return "[" + (index + 1) + "]";
    }

    private static List<String> resolvedDefaults(Device device) {
        if (device.kind() == DeviceKind.BIPOLAR) {
            return device.bipolar().defaultsUsed();
        }
        return device.kind() == DeviceKind.JFET
                ? device.jfet().defaultsUsed()
                : device.amplifier().defaultsUsed();
    }
}
