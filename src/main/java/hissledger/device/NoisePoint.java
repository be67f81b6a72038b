package hissledger.device;

import java.util.OptionalDouble;

/**
 * A noise figure or density that has been published of a device, to hold the model against.
 *
 * @param quantity which figure it is
 * @param currentAmps collector or drain current, A; empty where not stated
 * @param hertz frequency, Hz
 * @param sourceOhms source resistance, Ω, of a noise figure
 * @param typical typical value: V/√Hz, A/√Hz, dB or Ω
 * @param max greatest value, in the same unit
 * @param basis where it comes from
 * @param reference title, publisher and document
 * @param conditions anything else it was stated with
 */
public record NoisePoint(
        Quantity quantity,
        OptionalDouble currentAmps,
        double hertz,
        OptionalDouble sourceOhms,
        OptionalDouble typical,
        OptionalDouble max,
        Basis basis,
        String reference,
        String conditions) {
    /** What a noise point states. */
    public enum Quantity {
        VOLTAGE_NOISE("voltageNoise"),
        CURRENT_NOISE("currentNoise"),
        NOISE_FIGURE("noiseFigure"),
        OPTIMUM_RESISTANCE("optimumResistance");

        private final String key;

        Quantity(String key) {
            this.key = key;
        }

        /** The word used in device files. */
        public String key() {
            return key;
        }
    }
}
