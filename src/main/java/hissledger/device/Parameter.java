package hissledger.device;

import hissledger.physics.Require;
import java.util.Map;
import java.util.OptionalDouble;

/**
 * One value of a device as its sheet states it: any of least, typical and greatest, and where it comes from.
 *
 * <p>Where the typical value is missing, {@link #representative()} follows a documented rule: the geometric mean of least
 * and greatest where both are stated (their arithmetic mean where least is zero), else the one bound there is.
 *
 * @param min the least value, SI
 * @param typical the typical value, SI
 * @param max the greatest value, SI
 * @param basis where the value comes from
 * @param reference title, publisher and document, or the derivation; empty where the basis asks for none
 * @param conditions under which it holds; empty where not stated
 * @param at companion values it is stated with, SI
 */
public record Parameter(
        OptionalDouble min,
        OptionalDouble typical,
        OptionalDouble max,
        Basis basis,
        String reference,
        String conditions,
        Map<StatedAt, Double> at) {
    public Parameter {
        at = Map.copyOf(at);
        if (min.isEmpty() && typical.isEmpty() && max.isEmpty()) {
            throw new IllegalArgumentException("a parameter needs at least one of min, typical and max");
        }
        double below = Double.NEGATIVE_INFINITY;
        for (OptionalDouble value : new OptionalDouble[] {min, typical, max}) {
            if (value.isPresent()) {
                Require.finite("value", value.getAsDouble(), "");
                if (!(value.getAsDouble() >= below)) {
                    throw new IllegalArgumentException(
                            "min, typical and max must not fall, but " + value.getAsDouble() + " follows " + below);
                }
                below = value.getAsDouble();
            }
        }
    }

    /** A parameter with a typical value alone, without reference. */
    public static Parameter typical(double value, Basis basis) {
        return new Parameter(
                OptionalDouble.empty(), OptionalDouble.of(value), OptionalDouble.empty(), basis, "", "", Map.of());
    }

    /** The value that a typical calculation uses; see the rule above. */
    public double representative() {
        if (typical.isPresent()) {
            return typical.getAsDouble();
        }
        if (min.isPresent() && max.isPresent()) {
            double least = min.getAsDouble();
            double greatest = max.getAsDouble();
            return least > 0.0 ? Math.sqrt(least * greatest) : 0.5 * (least + greatest);
        }
        return min.isPresent() ? min.getAsDouble() : max.getAsDouble();
    }

    /** How the representative value came about, in words; empty where it is the stated typical value. */
    public String rule() {
        if (typical.isPresent()) {
            return "";
        }
        if (min.isPresent() && max.isPresent()) {
            return min.getAsDouble() > 0.0 ? "geometric mean of its min and max" : "mean of its min and max";
        }
        return min.isPresent() ? "its min" : "its max";
    }

    /** The least value of production: min where stated, else the representative value. */
    public double least() {
        return min.orElse(representative());
    }

    /** The greatest value of production: max where stated, else the representative value. */
    public double greatest() {
        return max.orElse(representative());
    }
}
