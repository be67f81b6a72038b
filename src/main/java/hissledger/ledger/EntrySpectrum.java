package hissledger.ledger;

import hissledger.circuit.FrontEnd;
import hissledger.physics.Band;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Frequencies;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * One entry against frequency.
 *
 * @param name the entry's name
 * @param hertz frequencies, Hz, rising
 * @param entryVoltsPerRootHertz its density at them, V/√Hz at the EMF
 * @param einVoltsPerRootHertz the EIN density at them, V/√Hz at the EMF
 */
public record EntrySpectrum(
        String name, List<Double> hertz, List<Double> entryVoltsPerRootHertz, List<Double> einVoltsPerRootHertz) {
    private static final int POINTS_PER_DECADE = 10;

    public EntrySpectrum {
        hertz = List.copyOf(hertz);
        entryVoltsPerRootHertz = List.copyOf(entryVoltsPerRootHertz);
        einVoltsPerRootHertz = List.copyOf(einVoltsPerRootHertz);
    }

    /** The spectrum of the entry with a name, ten points a decade; empty where the front end has no such entry. */
    public static Optional<EntrySpectrum> of(FrontEnd frontEnd, Band band, String name) {
        int points = 1 + (int) Math.ceil(Math.log10(band.toHertz() / band.fromHertz()) * POINTS_PER_DECADE);
        double[] hertz = band.logarithmicHertz(Math.max(2, points));
        ChainPass pass = new ChainPass(Frequencies.of(hertz));
        frontEnd.walk(pass);
        double[] total = new double[hertz.length];
        pass.total(total);
        for (int g = 0; g < pass.generatorCount(); g++) {
            if (pass.generators().get(g).name().equals(name)) {
                return Optional.of(new EntrySpectrum(
                        name,
                        Arrays.stream(hertz).boxed().toList(),
                        Accounting.roots(pass.power(g)),
                        Accounting.roots(total)));
            }
        }
        return Optional.empty();
    }
}
