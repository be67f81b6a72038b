package hissledger.ledger;

import hissledger.circuit.SingleStage;
import hissledger.device.BiasedBipolar;
import hissledger.device.BiasedJfet;
import hissledger.device.BipolarModel;
import hissledger.device.Device;
import hissledger.device.DeviceKind;
import hissledger.device.GainPoint;
import hissledger.device.JfetModel;
import hissledger.device.Transistor;
import hissledger.physics.Thermal;
import hissledger.twoport.Frequencies;
import hissledger.twoport.NoiseParameters;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleFunction;
import java.util.function.DoubleUnaryOperator;

/**
 * What current does to a transistor: its gain or transconductance and its noise at one frequency.
 *
 * @param hertz the frequency, Hz
 * @param points one a current, rising
 */
public record DeviceCurves(double hertz, List<Point> points) {
    /** The frequency at which noise is listed, Hz. */
    public static final double USUAL_HERTZ = 1000.0;

    private static final double[] DIGITS = {1.0, 2.0, 5.0};
    private static final double[] TENTHS = {1.0, 1.25, 1.6, 2.0, 2.5, 3.2, 4.0, 5.0, 6.3, 8.0};
    private static final double LEAST_AMPS = 1e-6;
    private static final double GREATEST_AMPS = 0.1;
    private static final double DECADE = 10.0;

    /**
     * One current.
     *
     * @param amps collector or drain current, A
     * @param gain hFE of a bipolar transistor, transconductance of a JFET in S
     * @param noise en, in, optimum and least noise figure of the bare device
     */
    public record Point(double amps, double gain, NoiseParameters noise) {}

    public DeviceCurves {
        points = List.copyOf(points);
    }

    /** A transistor whose current is open, and the currents at which its values hold. */
    private record Open(DoubleFunction<Transistor> biased, DoubleUnaryOperator gain, double fromAmps, double toAmps) {
        private static final double ROUNDING = 1e-9;

        boolean holdsAt(double amps) {
            return amps >= fromAmps * (1.0 - ROUNDING) && amps <= toAmps * (1.0 + ROUNDING);
        }

        Point at(double amps, double hertz) {
            double inside = Math.min(toAmps, Math.max(fromAmps, amps));
            NoiseParameters noise = NoiseParameters.of(
                            Frequencies.of(hertz), SingleStage.bare(biased.apply(inside))::walk)
                    .get(0);
            return new Point(amps, gain.applyAsDouble(inside), noise);
        }
    }

    private static Open open(Device device) {
        double rated = Math.min(GREATEST_AMPS, device.ratedAmps().orElse(GREATEST_AMPS));
        return switch (device.kind()) {
            case BIPOLAR -> {
                BipolarModel model = device.bipolar().model();
                List<GainPoint> gains = device.currentGain().orElseThrow().points();
                boolean curve = gains.size() > 1;
                yield new Open(
                        amps -> new BiasedBipolar(model, amps, SheetCheck.SHEET_KELVIN),
                        model.currentGain()::at,
                        curve ? Math.max(LEAST_AMPS, gains.get(0).currentAmps() / DECADE) : LEAST_AMPS,
                        curve ? Math.min(rated, gains.get(gains.size() - 1).currentAmps() * DECADE) : rated);
            }
            case JFET -> {
                JfetModel model = device.jfet().model();
                double thermalVolts = Thermal.voltageVolts(SheetCheck.SHEET_KELVIN);
                yield new Open(
                        amps -> new BiasedJfet(model, amps, SheetCheck.SHEET_KELVIN),
                        amps -> model.law().transconductanceSiemens(amps, thermalVolts),
                        LEAST_AMPS,
                        Math.min(rated, model.law().saturationAmps()));
            }
            case AMPLIFIER ->
                throw new IllegalArgumentException("a behavioural amplifier has no current of the user's");
        };
    }

    /** A transistor at one current, A; empty where its values do not hold there, and for a behavioural amplifier. */
    public static Optional<Point> at(Device device, double amps, double hertz) {
        if (device.kind() == DeviceKind.AMPLIFIER) {
            return Optional.empty();
        }
        Open open = open(device);
        return open.holdsAt(amps) ? Optional.of(open.at(amps, hertz)) : Optional.empty();
    }

    /** The typical curves of a transistor at 25 °C, at 1, 2 and 5 of each decade over the currents at which its values hold. */
    public static DeviceCurves of(Device device, double hertz) {
        return of(device, hertz, DIGITS);
    }

    /** The same curves at ten currents a decade, to be drawn. */
    public static DeviceCurves smooth(Device device, double hertz) {
        return of(device, hertz, TENTHS);
    }

    private static DeviceCurves of(Device device, double hertz, double[] digits) {
        Open open = open(device);
        List<Point> points = new ArrayList<>();
        int first = (int) Math.floor(Math.log10(open.fromAmps()));
        int last = (int) Math.ceil(Math.log10(open.toAmps()));
        for (int decade = first; decade <= last; decade++) {
            for (double digit : digits) {
                double amps = Double.parseDouble(digit + "e" + decade);
                if (open.holdsAt(amps)) {
                    points.add(open.at(amps, hertz));
                }
            }
        }
        return new DeviceCurves(hertz, points);
    }
}
