package hissledger.ledger;

import hissledger.circuit.SingleStage;
import hissledger.device.BiasedBipolar;
import hissledger.device.BiasedJfet;
import hissledger.device.Corners;
import hissledger.device.Device;
import hissledger.device.NoisePoint;
import hissledger.device.Transistor;
import hissledger.physics.Decibels;
import hissledger.twoport.Frequencies;
import hissledger.twoport.NoiseParameters;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A device's model held against a noise figure or density that has been published of it.
 *
 * @param point what was published
 * @param model the model's typical value, in the unit of the point; empty where the two cannot be compared
 * @param least the least value that the sheet's bounds allow
 * @param greatest the greatest value that they allow
 * @param verdict the outcome
 * @param reason why, in words; empty where the model agrees
 */
public record SheetCheck(
        NoisePoint point, OptionalDouble model, double least, double greatest, Verdict verdict, String reason) {
    /** Noise in sheets is stated at 25 °C unless said otherwise, K. */
    public static final double SHEET_KELVIN = 298.15;

    /** Sheets print noise figures to half a decibel. */
    private static final double AGREEMENT_DECIBELS = 0.5;

    /** A limit is printed to a tenth of a decibel, or to two digits: the model may stand half of that above it, dB. */
    private static final double LIMIT_ROUNDING = 0.05;

    /** Sheets print optimum resistances to two digits, read off a curve. */
    private static final double AGREEMENT_RESISTANCE = 0.25;

    /** The outcome of a comparison. */
    public enum Verdict {
        /** The typical value lies within what the sheet's bounds allow, or within half a decibel of it. */
        AGREES("agrees"),
        /** Only a limit is published, or the typical value is not met, and the model respects the limit. */
        WITHIN_LIMIT("within the limit"),
        /** The published value and the model exclude each other. */
        CONTRADICTS("contradicts"),
        /** The point does not say enough. */
        NOT_COMPARABLE("not comparable");

        private final String words;

        Verdict(String words) {
            this.words = words;
        }

        /** The verdict in words. */
        public String words() {
            return words;
        }
    }

    /** Holds a device against everything published of it. */
    public static List<SheetCheck> of(Device device) {
        List<SheetCheck> checks = new ArrayList<>();
        for (NoisePoint point : device.noisePoints()) {
            checks.add(of(device, point));
        }
        return checks;
    }

    private static SheetCheck of(Device device, NoisePoint point) {
        if (point.currentAmps().isEmpty()) {
            return notComparable(point, "the current is not stated");
        }
        double amps = point.currentAmps().getAsDouble();
        List<Transistor> corners = new ArrayList<>();
        switch (device.kind()) {
            case BIPOLAR ->
                Corners.bipolar(device).forEach(model -> corners.add(new BiasedBipolar(model, amps, SHEET_KELVIN)));
            case JFET -> {
                if (amps > device.jfet().model().law().saturationAmps()) {
                    return notComparable(point, "the current is above the typical IDSS");
                }
                Corners.jfet(device).forEach(model -> corners.add(new BiasedJfet(model, amps, SHEET_KELVIN)));
            }
            default -> {
                return notComparable(point, "a behavioural amplifier states its noise itself");
            }
        }
        double typical = quantity(corners.get(0), point);
        double least = typical;
        double greatest = typical;
        for (Transistor corner : corners) {
            double value = quantity(corner, point);
            least = Math.min(least, value);
            greatest = Math.max(greatest, value);
        }
        return judged(point, typical, least, greatest);
    }

    private static SheetCheck notComparable(NoisePoint point, String why) {
        return new SheetCheck(point, OptionalDouble.empty(), 0.0, 0.0, Verdict.NOT_COMPARABLE, why);
    }

    private static SheetCheck judged(NoisePoint point, double typical, double least, double greatest) {
        Verdict verdict;
        String reason = "";
        boolean within = point.max().isPresent()
                && differs(point, point.max().getAsDouble(), typical) >= -LIMIT_ROUNDING / AGREEMENT_DECIBELS;
        if (point.typical().isPresent()) {
            double published = point.typical().getAsDouble();
            if (differs(point, published, least) >= -1.0 && differs(point, published, greatest) <= 1.0) {
                verdict = Verdict.AGREES;
            } else {
                boolean low = published < least;
                verdict = within ? Verdict.WITHIN_LIMIT : Verdict.CONTRADICTS;
                reason = low
                        ? "published below all that the stated values allow"
                        : "published above it: noise that the sheet's values do not hold, or another sample";
            }
        } else {
            verdict = within ? Verdict.WITHIN_LIMIT : Verdict.CONTRADICTS;
            reason = within ? "" : "the model exceeds the published limit";
        }
        return new SheetCheck(point, OptionalDouble.of(typical), least, greatest, verdict, reason);
    }

    /** How far a published value is from a modelled one, in units of what counts as agreement; positive where it is above. */
    private static double differs(NoisePoint point, double published, double modelled) {
        return switch (point.quantity()) {
            case NOISE_FIGURE -> (published - modelled) / AGREEMENT_DECIBELS;
            case VOLTAGE_NOISE, CURRENT_NOISE -> Decibels.ofAmplitudeRatio(published / modelled) / AGREEMENT_DECIBELS;
            case OPTIMUM_RESISTANCE -> (published / modelled - 1.0) / AGREEMENT_RESISTANCE;
        };
    }

    private static double quantity(Transistor device, NoisePoint point) {
        NoiseParameters noise = NoiseParameters.of(Frequencies.of(point.hertz()), SingleStage.bare(device)::walk)
                .get(0);
        return switch (point.quantity()) {
            case VOLTAGE_NOISE -> noise.voltsPerRootHertz();
            case CURRENT_NOISE -> noise.ampsPerRootHertz();
            case NOISE_FIGURE ->
                Decibels.ofPowerRatio(noise.noiseFactor(point.sourceOhms().orElseThrow(), 0.0));
            case OPTIMUM_RESISTANCE -> noise.optimumResistanceOhms();
        };
    }

    /**
     * How far the published value, the typical one or else the limit, lies above the model, dB; empty where the two cannot be
     * compared.
     */
    public OptionalDouble differenceDecibels() {
        OptionalDouble published = point.typical().isPresent() ? point.typical() : point.max();
        if (model.isEmpty() || published.isEmpty()) {
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(
                switch (point.quantity()) {
                    case NOISE_FIGURE -> published.getAsDouble() - model.getAsDouble();
                    case OPTIMUM_RESISTANCE -> Decibels.ofPowerRatio(published.getAsDouble() / model.getAsDouble());
                    default -> Decibels.ofAmplitudeRatio(published.getAsDouble() / model.getAsDouble());
                });
    }
}
