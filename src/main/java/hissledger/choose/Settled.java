package hissledger.choose;

import hissledger.circuit.FrontEnd;
import hissledger.ledger.BandWalk;
import hissledger.physics.Band;
import hissledger.physics.Weighting;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Frequencies;

/**
 * A design behind a source of some resistance with its current settled: as given, or the best over the band for that
 * resistance by the figure that the candidate names.
 *
 * @param frontEnd the front end
 * @param amps quiescent current of each device, A; 0 for a behavioural amplifier
 * @param band the band
 */
record Settled(FrontEnd frontEnd, double amps, Band band) {
    /** Settles the current of a design behind its source with another resistance, Ω. */
    static Settled at(Design design, double ohms, Band band) {
        Design moved = design.withSource(design.source().withResistance(ohms));
        double amps = amps(moved, band);
        return new Settled(moved.at(amps), amps, band);
    }

    private static double amps(Design design, Band band) {
        CurrentChoice current = design.candidate().current();
        if (current instanceof CurrentChoice.Optimum optimum) {
            return BestCurrent.of(design, band, optimum.figure().weighting()).amps();
        }
        return current instanceof CurrentChoice.Given given ? given.amps() : 0.0;
    }

    /** EIN² per hertz at some frequencies, V²/Hz. */
    double[] densities(Frequencies frequencies) {
        ChainPass pass = new ChainPass(frequencies);
        frontEnd.walk(pass);
        double[] total = new double[frequencies.count()];
        pass.total(total);
        return total;
    }

    /** EIN² over the band under a weighting, V². */
    double bandVoltsSquared(Weighting weighting) {
        BandWalk walk = BandWalk.over(frontEnd, band);
        walk.walk(frontEnd);
        return walk.einVoltsSquared(weighting);
    }
}
