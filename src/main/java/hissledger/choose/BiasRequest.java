package hissledger.choose;

import hissledger.physics.Require;
import java.util.OptionalDouble;

/**
 * What a bias network is designed for.
 *
 * @param supplyVolts the supply, V; &gt; 0
 * @param series the series of its resistors
 * @param tolerance of each resistor, a fraction; 0 to less than 0.5
 * @param headroomVolts least peak of the output before saturation or cut-off in the worst case, V; &gt; 0
 * @param edgeHertz where the capacitors together may cost 3 dB of response; empty for the lower edge of the band
 * @param penaltyDecibels what they together may cost in EIN density at the lower edge of the band, dB; &gt; 0
 */
public record BiasRequest(
        double supplyVolts,
        ESeries series,
        double tolerance,
        double headroomVolts,
        OptionalDouble edgeHertz,
        double penaltyDecibels) {
    /** Peak output wanted where nothing else is said, V. */
    public static final double USUAL_HEADROOM_VOLTS = 0.5;

    /** Penalty of the capacitors where nothing else is said, dB. */
    public static final double USUAL_PENALTY_DECIBELS = 0.1;

    private static final double GREATEST_TOLERANCE = 0.5;

    public BiasRequest {
        Require.positive("supplyVolts", supplyVolts, "V");
        if (!(tolerance >= 0.0 && tolerance < GREATEST_TOLERANCE)) {
            throw new IllegalArgumentException("tolerance must lie from 0 % to below 50 %, was " + tolerance);
        }
        Require.positive("headroomVolts", headroomVolts, "V");
        Require.positive("penaltyDecibels", penaltyDecibels, "dB");
    }

    /** This request on another supply, V. */
    BiasRequest withSupply(double volts) {
        return new BiasRequest(volts, series, tolerance, headroomVolts, edgeHertz, penaltyDecibels);
    }
}
