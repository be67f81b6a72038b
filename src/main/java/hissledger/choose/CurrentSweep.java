package hissledger.choose;

import hissledger.device.Device;
import hissledger.device.DeviceKind;
import hissledger.device.DeviceParameter;
import hissledger.device.GainSheet;
import hissledger.ledger.BandWalk;
import hissledger.physics.Band;
import hissledger.physics.Weighting;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * EIN of a design against the current of each device, with the typical device and with the least and the greatest of production:
 * hFE of a bipolar transistor, IDSS with VGS(off) of a JFET.
 *
 * @param choice the design at its chosen current
 * @param amps currents, A, rising
 * @param typicalVolts EIN with the typical device, V rms
 * @param leastVolts EIN with the device of least gain or IDSS; shorter than {@code amps} where its range ends earlier
 * @param greatestVolts EIN with the device of greatest gain or IDSS
 * @param flat the search for the best current; empty where the current was given
 */
public record CurrentSweep(
        OpenSearch.Choice choice,
        List<Double> amps,
        List<Double> typicalVolts,
        List<Double> leastVolts,
        List<Double> greatestVolts,
        Optional<BestCurrent.Optimum> flat) {
    private static final int POINTS = 61;

    public CurrentSweep {
        amps = List.copyOf(amps);
        typicalVolts = List.copyOf(typicalVolts);
        leastVolts = List.copyOf(leastVolts);
        greatestVolts = List.copyOf(greatestVolts);
    }

    /** Sweeps the current of a choice over the range of its design. */
    public static CurrentSweep of(
            OpenSearch.Choice choice, Optional<BestCurrent.Optimum> flat, Band band, Weighting weighting) {
        Design design = choice.design();
        CurrentRange range = design.range();
        List<Double> amps = new ArrayList<>();
        for (double each : new Band(range.fromAmps(), range.toAmps()).logarithmicHertz(POINTS)) {
            amps.add(each);
        }
        return new CurrentSweep(
                choice,
                amps,
                volts(design, amps, band, weighting),
                volts(least(design), amps, band, weighting),
                volts(greatest(design), amps, band, weighting),
                flat);
    }

    private static List<Double> volts(Design design, List<Double> amps, Band band, Weighting weighting) {
        double rounding = 1.0 + 1e-12;
        BandWalk walk = BandWalk.over(
                design.at(Math.sqrt(design.range().fromAmps() * design.range().toAmps())), band);
        List<Double> volts = new ArrayList<>();
        for (double each : amps) {
            if (each > design.range().toAmps() * rounding) {
                break;
            }
            walk.walk(design.at(Math.min(each, design.range().toAmps())));
            volts.add(Math.sqrt(walk.einVoltsSquared(weighting)));
        }
        return volts;
    }

    private static Design least(Design design) {
        Device device = design.candidate().device();
        if (device.kind() == DeviceKind.JFET) {
            return jfet(design, true);
        }
        return device.currentGain()
                .map(GainSheet::least)
                .map(curve -> design.withDevice(device.with(curve, 1.0)))
                .orElse(design);
    }

    private static Design greatest(Design design) {
        Device device = design.candidate().device();
        if (device.kind() == DeviceKind.JFET) {
            return jfet(design, false);
        }
        return device.currentGain()
                .map(GainSheet::greatest)
                .map(curve -> design.withDevice(device.with(curve, 1.0)))
                .orElse(design);
    }

    /** IDSS and VGS(off) at their least, or both at their greatest: they vary together. */
    private static Design jfet(Design design, boolean least) {
        Device device = design.candidate().device();
        for (DeviceParameter key :
                List.of(DeviceParameter.DRAIN_SATURATION_CURRENT, DeviceParameter.PINCH_OFF_VOLTAGE)) {
            if (device.parameter(key).isPresent()) {
                double value = least
                        ? device.parameter(key).get().least()
                        : device.parameter(key).get().greatest();
                device = device.with(key, value);
            }
        }
        return design.withDevice(device);
    }
}
