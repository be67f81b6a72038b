package hissledger.ledger;

import java.util.List;

/**
 * EIN density against frequency.
 *
 * @param hertz frequencies, Hz, rising
 * @param einVoltsPerRootHertz EIN density at them, V/√Hz at the EMF
 * @param sourceVoltsPerRootHertz the source's own thermal noise at them, V/√Hz
 */
public record NoiseSpectrum(
        List<Double> hertz, List<Double> einVoltsPerRootHertz, List<Double> sourceVoltsPerRootHertz) {
    public NoiseSpectrum {
        hertz = List.copyOf(hertz);
        einVoltsPerRootHertz = List.copyOf(einVoltsPerRootHertz);
        sourceVoltsPerRootHertz = List.copyOf(sourceVoltsPerRootHertz);
    }
}
