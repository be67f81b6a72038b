package hissledger.ledger;

import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import java.util.EnumMap;
import java.util.Map;
import java.util.OptionalDouble;

/**
 * The sums of an account over its band.
 *
 * @param einVolts EIN of each weighting, V rms at the EMF, the source included
 * @param einAsMeasuredVolts the same as a bench gives it: output noise over the band divided by the gain at 1 kHz, V rms
 * @param floorVolts noise of the source alone under each weighting, V rms
 * @param einAtTerminalsVolts flat EIN at the source's loaded terminals, V rms
 * @param lowBandVolts flat EIN below {@link Accounting#LOW_BAND_TO_HERTZ}, V rms; empty where the band begins above
 * @param midBandVolts flat EIN above it, V rms; empty where the band ends below
 * @param noiseFigureDecibels flat band noise figure re T₀ = 290 K, dB; empty where Re Zs = 0 over the band
 */
public record Totals(
        Map<Weighting, Double> einVolts,
        Map<Weighting, Double> einAsMeasuredVolts,
        Map<Weighting, Double> floorVolts,
        double einAtTerminalsVolts,
        OptionalDouble lowBandVolts,
        OptionalDouble midBandVolts,
        OptionalDouble noiseFigureDecibels) {
    public Totals {
        einVolts = new EnumMap<>(einVolts);
        einAsMeasuredVolts = new EnumMap<>(einAsMeasuredVolts);
        floorVolts = new EnumMap<>(floorVolts);
    }

    /** EIN under a weighting, V rms at the EMF. */
    public double ein(Weighting weighting) {
        return einVolts.getOrDefault(weighting, Double.NaN);
    }

    /** EIN under a weighting as measured, V rms. */
    public double einAsMeasured(Weighting weighting) {
        return einAsMeasuredVolts.getOrDefault(weighting, Double.NaN);
    }

    /** Noise of the source alone under a weighting, V rms. */
    public double floor(Weighting weighting) {
        return floorVolts.getOrDefault(weighting, Double.NaN);
    }

    /** How far the flat EIN stands above the source's own noise, dB; empty where the source makes none. */
    public OptionalDouble aboveFloorDecibels() {
        double floor = floor(Weighting.FLAT);
        return floor > 0.0
                ? OptionalDouble.of(Decibels.ofAmplitudeRatio(ein(Weighting.FLAT) / floor))
                : OptionalDouble.empty();
    }
}
