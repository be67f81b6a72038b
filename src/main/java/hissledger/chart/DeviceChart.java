package hissledger.chart;

import hissledger.device.Device;
import hissledger.device.NoisePoint;
import hissledger.ledger.DeviceCurves;
import hissledger.ledger.SheetCheck;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeMap;

/** Charts of devices. */
public final class DeviceChart {
    private static final double NANO = 1e9;
    private static final double ROOM = 1.6;
    private static final double LEAST_LEVEL = 1.0;

    private DeviceChart() {}

    /** What has been published of some devices over what their models give, against current. */
    public static Picture check(List<Device> devices) {
        return PlateDrawing.picture(checkPlate(devices));
    }

    static Plate checkPlate(List<Device> devices) {
        Map<SheetCheck.Verdict, List<double[]>> byVerdict = new TreeMap<>();
        double least = Double.POSITIVE_INFINITY;
        double greatest = 0.0;
        double level = LEAST_LEVEL;
        int compared = 0;
        for (Device device : devices) {
            for (SheetCheck check : SheetCheck.of(device)) {
                OptionalDouble difference = check.differenceDecibels();
                if (difference.isEmpty() || check.point().quantity() == NoisePoint.Quantity.OPTIMUM_RESISTANCE) {
                    continue;
                }
                double amps = check.point().currentAmps().orElseThrow();
                byVerdict
                        .computeIfAbsent(check.verdict(), verdict -> new ArrayList<>())
                        .add(new double[] {amps, difference.getAsDouble()});
                least = Math.min(least, amps);
                greatest = Math.max(greatest, amps);
                level = Math.max(level, Math.abs(difference.getAsDouble()));
                compared++;
            }
        }
        if (compared == 0) {
            throw new IllegalArgumentException("no device has a published noise point that can be compared");
        }
        List<Trace> traces = new ArrayList<>();
        traces.add(new Trace(
                Trace.Role.LIMIT,
                0,
                "model",
                "typical values of the sheet",
                List.of(least / ROOM, greatest * ROOM),
                List.of(0.0, 0.0)));
        int number = 0;
        for (Map.Entry<SheetCheck.Verdict, List<double[]>> group : byVerdict.entrySet()) {
            List<double[]> points = group.getValue();
            points.sort(Comparator.comparingDouble(point -> point[0]));
            traces.add(new Trace(
                    Trace.Role.POINTS,
                    number++,
                    group.getKey().words(),
                    points.size() + (points.size() == 1 ? " point" : " points"),
                    points.stream().map(point -> point[0]).toList(),
                    points.stream().map(point -> point[1]).toList()));
        }
        double end = Math.ceil(level + 0.5);
        return new Plate(
                devices.size() == 1
                        ? devices.get(0).id() + ": published noise against the model"
                        : "Published noise of " + devices.size() + " devices against their models",
                List.of(
                        "Noise voltage densities and noise figures in dB over the model; limits count where no typical value"
                                + " is published.",
                        "Model at 25 °C with the typical values of each sheet, unweighted, at the frequency of each point."),
                new Scale(
                        "collector or drain current, A",
                        Scale.Kind.LOGARITHMIC_PREFIXED,
                        least / ROOM,
                        greatest * ROOM),
                new Scale("published over model, dB", Scale.Kind.LEVEL, -end, end),
                traces,
                List.of());
    }

    /** Noise voltage of a device against current, with what has been published of it. */
    public static Picture noise(Device device) {
        return PlateDrawing.picture(noisePlate(device));
    }

    static Plate noisePlate(Device device) {
        List<Trace> traces = new ArrayList<>();
        double least = Double.POSITIVE_INFINITY;
        double greatest = 0.0;
        double[] frequencies = {1000.0, 10.0};
        boolean flickers = device.noiseFallsWithFrequency();
        String[] names = {flickers ? "en at 1 kHz" : "en, no flicker stated", "en at 10 Hz"};
        double from = 0.0;
        double to = 0.0;
        for (int k = 0; k < (flickers ? 2 : 1); k++) {
            List<DeviceCurves.Point> points =
                    DeviceCurves.smooth(device, frequencies[k]).points();
            List<Double> amps = points.stream().map(DeviceCurves.Point::amps).toList();
            List<Double> nanovolts = points.stream()
                    .map(point -> NANO * point.noise().voltsPerRootHertz())
                    .toList();
            traces.add(new Trace(Trace.Role.CANDIDATE, k, names[k], "model, typical", amps, nanovolts));
            from = amps.get(0);
            to = amps.get(amps.size() - 1);
            for (double value : nanovolts) {
                least = Math.min(least, value);
                greatest = Math.max(greatest, value);
            }
        }
        List<double[]> published = new ArrayList<>();
        for (NoisePoint point : device.noisePoints()) {
            boolean drawn = point.quantity() == NoisePoint.Quantity.VOLTAGE_NOISE
                    && point.currentAmps().isPresent()
                    && point.typical().isPresent();
            if (drawn) {
                double value = NANO * point.typical().getAsDouble();
                published.add(new double[] {point.currentAmps().getAsDouble(), value});
                least = Math.min(least, value);
                greatest = Math.max(greatest, value);
            }
        }
        if (!published.isEmpty()) {
            published.sort(Comparator.comparingDouble(point -> point[0]));
            traces.add(new Trace(
                    Trace.Role.POINTS,
                    2,
                    "published",
                    "typical, each at its own frequency",
                    published.stream().map(point -> point[0]).toList(),
                    published.stream().map(point -> point[1]).toList()));
        }
        return new Plate(
                device.id() + ": " + device.description(),
                List.of("Noise voltage density of the bare device, input shorted, unweighted, at 25 °C."),
                new Scale("collector or drain current, A", Scale.Kind.LOGARITHMIC_PREFIXED, from, to),
                new Scale("noise voltage density, nV/√Hz", Scale.Kind.LOGARITHMIC_PLAIN, least / ROOM, greatest * ROOM),
                traces,
                List.of());
    }
}
