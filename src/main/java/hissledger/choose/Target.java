package hissledger.choose;

import hissledger.ledger.Figure;
import java.util.Map;
import java.util.TreeMap;

/**
 * Limits that a design must not exceed.
 *
 * @param limits the greatest accepted value of each limited figure: V rms for an EIN, dB for a noise figure, dB(A) SPL for an
 *     equivalent noise level
 */
public record Target(Map<Figure, Double> limits) {
    public Target {
        limits = Map.copyOf(limits);
    }

    /** No limit. */
    public static Target none() {
        return new Target(Map.of());
    }

    /** The limits in the order of {@link Figure}. */
    public Map<Figure, Double> inOrder() {
        return new TreeMap<>(limits);
    }
}
