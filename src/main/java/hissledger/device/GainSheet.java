package hissledger.device;

import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;

/**
 * The current gain of a bipolar transistor as its sheet states it.
 *
 * @param points gain at rising collector currents; at least one
 * @param basis where the values come from
 * @param reference title, publisher and document; empty where the basis asks for none
 * @param conditions under which they hold; empty where not stated
 */
public record GainSheet(List<GainPoint> points, Basis basis, String reference, String conditions) {
    public GainSheet {
        points = List.copyOf(points);
        if (points.isEmpty()) {
            throw new IllegalArgumentException("currentGain needs at least one point");
        }
        for (int k = 1; k < points.size(); k++) {
            if (!(points.get(k).currentAmps() > points.get(k - 1).currentAmps())) {
                throw new IllegalArgumentException("the currents of currentGain must rise");
            }
        }
    }

    /**
     * The typical curve. A point without a typical value takes: the geometric mean of its min and max where it has both;
     * else the one bound it has, scaled as at the nearest point (in ln IC) that has that bound and a typical value; else
     * the bound itself.
     */
    public GainCurve typical() {
        double[] gain = new double[points.size()];
        for (int k = 0; k < gain.length; k++) {
            gain[k] = typicalAt(points.get(k));
        }
        return GainCurve.through(currents(), gain);
    }

    /** The curve of least gain: min where stated, else the typical value scaled as at the nearest point with a min. */
    public GainCurve least() {
        return bounded(GainPoint::min);
    }

    /** The curve of greatest gain: max where stated, else the typical value scaled as at the nearest point with a max. */
    public GainCurve greatest() {
        return bounded(GainPoint::max);
    }

    private GainCurve bounded(Function<GainPoint, OptionalDouble> bound) {
        double[] gain = new double[points.size()];
        for (int k = 0; k < gain.length; k++) {
            GainPoint point = points.get(k);
            double ratio = 1.0;
            double nearest = Double.POSITIVE_INFINITY;
            for (GainPoint other : points) {
                double distance = Math.abs(Math.log(other.currentAmps() / point.currentAmps()));
                OptionalDouble stated = bound.apply(other);
                if (stated.isPresent() && distance < nearest) {
                    nearest = distance;
                    ratio = stated.getAsDouble() / typicalAt(other);
                }
            }
            gain[k] = bound.apply(point).orElse(typicalAt(point) * ratio);
        }
        return GainCurve.through(currents(), gain);
    }

    /** How the typical curve came about where the sheet states no typical value; empty where it states one everywhere. */
    public String rule() {
        boolean stated = points.stream().allMatch(point -> point.typical().isPresent());
        if (stated) {
            return "";
        }
        if (points.stream().anyMatch(point -> point.typical().isPresent())) {
            return "between its min and max, or scaled from its min as at the nearest current with a typical value";
        }
        if (points.stream()
                .anyMatch(point -> point.min().isPresent() && point.max().isPresent())) {
            return "geometric mean of min and max, and min scaled likewise at currents without max";
        }
        return "its min";
    }

    private double[] currents() {
        return points.stream().mapToDouble(GainPoint::currentAmps).toArray();
    }

    private double typicalAt(GainPoint point) {
        OptionalDouble own = ownMiddle(point);
        if (own.isPresent()) {
            return own.getAsDouble();
        }
        double bound = bound(point, point.min().isPresent());
        double ratio = 1.0;
        double nearest = Double.POSITIVE_INFINITY;
        for (GainPoint other : points) {
            boolean comparable = point.min().isPresent()
                    ? other.min().isPresent()
                    : other.max().isPresent();
            double distance = Math.abs(Math.log(other.currentAmps() / point.currentAmps()));
            if (comparable && ownMiddle(other).isPresent() && distance < nearest) {
                nearest = distance;
                ratio = ownMiddle(other).getAsDouble()
                        / bound(other, point.min().isPresent());
            }
        }
        return bound * ratio;
    }

    private static double bound(GainPoint point, boolean least) {
        return least ? point.min().orElseThrow() : point.max().orElseThrow();
    }

    private static OptionalDouble ownMiddle(GainPoint point) {
        if (point.typical().isPresent()) {
            return point.typical();
        }
        if (point.min().isPresent() && point.max().isPresent()) {
            return OptionalDouble.of(
                    Math.sqrt(point.min().getAsDouble() * point.max().getAsDouble()));
        }
        return OptionalDouble.empty();
    }
}
