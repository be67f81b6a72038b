package hissledger.device;

import hissledger.physics.Require;
import java.util.OptionalDouble;

/**
 * The square law of a JFET in saturation: {@code ID = IDSS (1 − VGS/VGS(off))²}.
 *
 * @param saturationAmps IDSS, A; &gt; 0
 * @param pinchOffVolts magnitude of VGS(off), V; &gt; 0
 * @param measuredSiemens a published transconductance, S, from which gm scales as √ID; empty to use the law
 * @param measuredAtAmps the drain current at which it holds, A
 */
public record SquareLaw(
        double saturationAmps, double pinchOffVolts, OptionalDouble measuredSiemens, double measuredAtAmps) {
    public SquareLaw {
        Require.positive("saturationAmps", saturationAmps, "A");
        Require.positive("pinchOffVolts", pinchOffVolts, "V");
        if (measuredSiemens.isPresent()) {
            Require.positive("measuredSiemens", measuredSiemens.getAsDouble(), "S");
            Require.positive("measuredAtAmps", measuredAtAmps, "A");
        }
    }

    /** The law without a published transconductance. */
    public static SquareLaw of(double saturationAmps, double pinchOffVolts) {
        return new SquareLaw(saturationAmps, pinchOffVolts, OptionalDouble.empty(), saturationAmps);
    }

    /**
     * Transconductance: {@code gm = (2/|VGS(off)|) √(IDSS ID)}, or {@code gm₀ √(ID/ID₀)} from a published point; never
     * above {@code ID/VT}, which a barrier-controlled current reaches at very low ID.
     *
     * @param drainAmps ID, A; &gt; 0
     * @param thermalVolts VT = kT/q, V
     * @return S
     */
    public double transconductanceSiemens(double drainAmps, double thermalVolts) {
        Require.positive("drainAmps", drainAmps, "A");
        double square = measuredSiemens.isPresent()
                ? measuredSiemens.getAsDouble() * Math.sqrt(drainAmps / measuredAtAmps)
                : 2.0 / pinchOffVolts * Math.sqrt(saturationAmps * drainAmps);
        return Math.min(square, drainAmps / thermalVolts);
    }

    /** Gate-source voltage at a drain current, magnitude below zero bias, {@code |VGS| = |VGS(off)| (1 − √(ID/IDSS))}, V. */
    public double gateSourceVolts(double drainAmps) {
        return pinchOffVolts * (1.0 - Math.sqrt(drainAmps / saturationAmps));
    }
}
