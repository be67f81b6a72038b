package hissledger.ledger;

import hissledger.device.NoiseSource;
import java.util.List;

/**
 * One line of the account: one independent generator, referred to the source's EMF.
 *
 * @param source the generator
 * @param bandVoltsSquared its power over the band under the account's weighting, V²
 * @param lowBandVoltsSquared its power below {@link Accounting#LOW_BAND_TO_HERTZ}, V²; zero where the band begins above
 * @param share its part of the total power, 0 to 1
 * @param savesDecibels how much the total would fall without it, dB; infinite for the only entry
 * @param spotVoltsPerRootHertz its density at the scenario's spots, V/√Hz
 */
public record Entry(
        NoiseSource source,
        double bandVoltsSquared,
        double lowBandVoltsSquared,
        double share,
        double savesDecibels,
        List<Double> spotVoltsPerRootHertz) {
    public Entry {
        spotVoltsPerRootHertz = List.copyOf(spotVoltsPerRootHertz);
    }

    /** Its name. */
    public String name() {
        return source.name();
    }

    /** Its power above {@link Accounting#LOW_BAND_TO_HERTZ}, V². */
    public double midBandVoltsSquared() {
        return Math.max(0.0, bandVoltsSquared - lowBandVoltsSquared);
    }

    /** Its noise over the band under the account's weighting, V rms. */
    public double bandVolts() {
        return Math.sqrt(bandVoltsSquared);
    }
}
