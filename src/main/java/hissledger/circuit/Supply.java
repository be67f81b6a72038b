package hissledger.circuit;

import hissledger.physics.Require;

/**
 * A noisy supply at the far end of a resistor.
 *
 * @param voltsPerRootHertz its noise density, V/√Hz; ≥ 0, white
 * @param mismatch relative difference between the two legs of a balanced line, 0 to 1; of no meaning with one leg
 */
public record Supply(double voltsPerRootHertz, double mismatch) {
    public Supply {
        Require.notNegative("voltsPerRootHertz", voltsPerRootHertz, "V/√Hz");
        if (!(mismatch >= 0.0 && mismatch <= 1.0)) {
            throw new IllegalArgumentException("mismatch must lie between 0 and 1, was " + mismatch);
        }
    }
}
