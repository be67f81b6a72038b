package hissledger.circuit;

/**
 * The parts that only pairs have.
 *
 * @param gainOhms resistor between the two emitters or sources, Ω; 0 where they meet in a virtual ground
 * @param feedbackOhms resistor from each emitter or source to its own output, Ω; infinite for none
 * @param otherOhms resistor at the other input of a single-ended pair, Ω; 0 for ground
 */
public record PairParts(double gainOhms, double feedbackOhms, double otherOhms) {
    /** No such part. */
    public static PairParts none() {
        return new PairParts(0.0, Double.POSITIVE_INFINITY, 0.0);
    }

    /** A gain resistor with its two feedback resistors, Ω. */
    public static PairParts gain(double gainOhms, double feedbackOhms) {
        return new PairParts(gainOhms, feedbackOhms, 0.0);
    }

    /** A resistor at the other input, Ω. */
    public static PairParts otherSide(double ohms) {
        return new PairParts(0.0, Double.POSITIVE_INFINITY, ohms);
    }
}
