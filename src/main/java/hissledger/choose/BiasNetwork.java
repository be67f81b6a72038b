package hissledger.choose;

import hissledger.physics.Require;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;

/**
 * The resistors that set the quiescent point of a single stage.
 *
 * @param upperOhms from base to the supply, Ω; infinite for none, as at a gate
 * @param lowerOhms from base or gate to ground, Ω
 * @param unbypassedOhms part of the emitter or source resistance that no capacitor bypasses, Ω; ≥ 0
 * @param leadOhms emitter or source resistor to ground, Ω; in a follower it is the load
 * @param loadOhms collector or drain load, Ω; 0 for none, as in a follower
 */
public record BiasNetwork(double upperOhms, double lowerOhms, double unbypassedOhms, double leadOhms, double loadOhms) {
    public BiasNetwork {
        if (!(upperOhms > 0.0)) {
            throw new IllegalArgumentException("upperOhms must be > 0 Ω, was " + upperOhms);
        }
        Require.positive("lowerOhms", lowerOhms, "Ω");
        Require.notNegative("unbypassedOhms", unbypassedOhms, "Ω");
        Require.positive("leadOhms", leadOhms, "Ω");
        Require.notNegative("loadOhms", loadOhms, "Ω");
    }

    /** Whether a divider sets the voltage of the base. */
    public boolean hasDivider() {
        return !Double.isInfinite(upperOhms);
    }

    /** What the signal sees at base or gate, {@code R1 || R2}, Ω. */
    public double parallelOhms() {
        return 1.0 / (1.0 / upperOhms + 1.0 / lowerOhms);
    }

    /** Open-circuit voltage of the divider, {@code V R2/(R1 + R2)}, V; 0 without one. */
    public double openVolts(double supplyVolts) {
        return supplyVolts * parallelOhms() / upperOhms;
    }

    /** Direct-current resistance from emitter or source to ground, Ω. */
    public double directOhms() {
        return unbypassedOhms + leadOhms;
    }

    /** This network with each resistor off by a factor of its own. */
    BiasNetwork off(double upper, double lower, double lead, double load) {
        return new BiasNetwork(
                upperOhms * upper, lowerOhms * lower, unbypassedOhms * lead, leadOhms * lead, loadOhms * load);
    }

    /** How many different values it needs. */
    int differentValues() {
        Set<Double> values = new TreeSet<>(List.of(lowerOhms, leadOhms));
        if (hasDivider()) {
            values.add(upperOhms);
        }
        if (loadOhms > 0.0) {
            values.add(loadOhms);
        }
        return values.size();
    }
}
