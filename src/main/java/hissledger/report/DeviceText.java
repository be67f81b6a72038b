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
import hissledger.ledger.DeviceCurves;
import hissledger.ledger.SheetCheck;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
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

    /**
     * One line a device, with its typical gain or transconductance and noise at a current.
     *
     * @param devices the devices
     * @param amps the collector or drain current, A
     */
    public static String list(List<Device> devices, double amps) {
        TextTable table = new TextTable()
                .column(TextTable.Align.LEFT, "id")
                .column(TextTable.Align.LEFT, "kind")
                .column(TextTable.Align.LEFT, "polarity")
                .column(TextTable.Align.LEFT, "evidence")
                .column(TextTable.Align.POINT, "hFE or gm", "at " + Phrases.brief(amps, "A"))
                .column(TextTable.Align.POINT, "rbb'", "typical")
                .column(TextTable.Align.POINT, "en at 1 kHz", "per √Hz")
                .column(TextTable.Align.POINT, "in at 1 kHz", "per √Hz")
                .column(TextTable.Align.LEFT, "description");
        for (Device device : devices) {
            Optional<DeviceCurves.Point> point = DeviceCurves.at(device, amps, DeviceCurves.USUAL_HERTZ);
            table.row(
                    device.id(),
                    device.kind().label(),
                    device.polarity().label(),
                    device.evidence(),
                    point.map(each -> gain(device, each)).orElse(""),
                    device.parameter(DeviceParameter.BASE_RESISTANCE)
                            .map(ohms -> Words.value(ohms.representative(), "Ω"))
                            .orElse(""),
                    point.map(each -> Words.value(each.noise().voltsPerRootHertz(), "V"))
                            .orElse(""),
                    point.map(each -> Words.value(each.noise().ampsPerRootHertz(), "A"))
                            .orElse(""),
                    device.description());
        }
        return table.render() + devices.size() + (devices.size() == 1 ? " device" : " devices")
                + "; typical values at 25 °C, input shorted for en, open for in.\n";
    }

    private static String gain(Device device, DeviceCurves.Point point) {
        return device.kind() == DeviceKind.JFET
                ? Words.value(point.gain(), "S")
                : String.format(Locale.ROOT, "%.0f", point.gain());
    }

    /** What a check found of files that have no fault: each published noise point held against the model. */
    public static String checked(List<Device> devices) {
        TextTable table = new TextTable()
                .column(TextTable.Align.LEFT, "device")
                .column(TextTable.Align.LEFT, "quantity", "at 25 °C")
                .column(TextTable.Align.POINT, "current")
                .column(TextTable.Align.POINT, "frequency")
                .column(TextTable.Align.POINT, "source")
                .column(TextTable.Align.POINT, "model", "typical")
                .column(TextTable.Align.POINT, "model", "least")
                .column(TextTable.Align.POINT, "model", "greatest")
                .column(TextTable.Align.POINT, "published", "typical")
                .column(TextTable.Align.POINT, "published", "limit")
                .column(TextTable.Align.POINT, "published", "over model, dB")
                .column(TextTable.Align.LEFT, "verdict");
        Map<SheetCheck.Verdict, Integer> counts = new EnumMap<>(SheetCheck.Verdict.class);
        int points = 0;
        for (Device device : devices) {
            for (SheetCheck check : SheetCheck.of(device)) {
                counts.merge(check.verdict(), 1, Integer::sum);
                points++;
                checkRow(table, device, check);
            }
        }
        StringBuilder text = new StringBuilder();
        if (points > 0) {
            text.append(table.render()).append('\n');
        }
        text.append(devices.size())
                .append(devices.size() == 1 ? " device" : " devices")
                .append(" read, no fault. Published noise points: ")
                .append(points);
        counts.forEach((verdict, count) ->
                text.append("; ").append(verdict.words()).append(' ').append(count));
        text.append(".\n");
        if (points > 0) {
            Words.wrapped(
                            "Where a sheet derives rbb' or the channel noise factor from one of these points, agreement with"
                                    + " that point shows that the derivation is sound, not that the model is confirmed (see devices"
                                    + " show ID).")
                    .forEach(line -> text.append(line).append('\n'));
        }
        return text.toString();
    }

    private static void checkRow(TextTable table, Device device, SheetCheck check) {
        NoisePoint point = check.point();
        String unit = unit(point.quantity());
        boolean compared = check.model().isPresent();
        OptionalDouble difference = check.differenceDecibels();
        table.row(
                device.id(),
                point.quantity().key(),
                point.currentAmps().isPresent()
                        ? Phrases.brief(point.currentAmps().getAsDouble(), "A")
                        : "",
                Phrases.brief(point.hertz(), "Hz"),
                point.sourceOhms().isPresent()
                        ? Phrases.brief(point.sourceOhms().getAsDouble(), "Ω")
                        : "",
                compared ? figure(check.model().getAsDouble(), unit) : "",
                compared ? figure(check.least(), unit) : "",
                compared ? figure(check.greatest(), unit) : "",
                point.typical().isPresent() ? figure(point.typical().getAsDouble(), unit) : "",
                point.max().isPresent() ? figure(point.max().getAsDouble(), unit) : "",
                difference.isPresent() ? String.format(Locale.ROOT, "%+.2f", difference.getAsDouble()) : "",
                check.verdict().words() + (check.reason().isEmpty() ? "" : ": " + check.reason()));
    }

    private static String figure(double value, String unit) {
        return unit.equals("dB") ? String.format(Locale.ROOT, "%.2f dB", value) : Words.value(value, unit);
    }

    private static String unit(NoisePoint.Quantity quantity) {
        return switch (quantity) {
            case VOLTAGE_NOISE -> "V/√Hz";
            case CURRENT_NOISE -> "A/√Hz";
            case NOISE_FIGURE -> "dB";
            case OPTIMUM_RESISTANCE -> "Ω";
        };
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
        if (device.kind() != DeviceKind.AMPLIFIER) {
            text.append("\nTypical values against current at 25 °C:\n");
            text.append(curves(device).render());
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

    private static TextTable curves(Device device) {
        TextTable table = new TextTable()
                .column(TextTable.Align.POINT, device.kind() == DeviceKind.JFET ? "ID" : "IC")
                .column(TextTable.Align.POINT, device.kind() == DeviceKind.JFET ? "gm" : "hFE")
                .column(TextTable.Align.POINT, "en at 1 kHz", "per √Hz")
                .column(TextTable.Align.POINT, "in at 1 kHz", "per √Hz")
                .column(TextTable.Align.POINT, "best source", "resistance")
                .column(TextTable.Align.POINT, "least NF", "dB");
        for (DeviceCurves.Point point :
                DeviceCurves.of(device, DeviceCurves.USUAL_HERTZ).points()) {
            table.row(
                    Phrases.brief(point.amps(), "A"),
                    gain(device, point),
                    Words.value(point.noise().voltsPerRootHertz(), "V"),
                    Words.value(point.noise().ampsPerRootHertz(), "A"),
                    Words.value(point.noise().optimumResistanceOhms(), "Ω"),
                    Words.decibels(point.noise().minimumNoiseFigureDecibels()));
        }
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
            String unit = unit(point.quantity());
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
