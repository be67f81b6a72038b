package hissledger.ledger;

import hissledger.circuit.FrontEnd;
import hissledger.physics.Band;
import hissledger.physics.LogQuadrature;
import hissledger.physics.Weighting;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Frequencies;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.Map;

/**
 * A front end integrated over a band: the nodes found for one design, walked again for others near it.
 *
 * <p>Finding the nodes costs several walks; walking them costs one. A search over the current, or a thousand builds of one
 * design, find the nodes once. Belongs to one thread.
 */
public final class BandWalk {
    private final LogQuadrature quadrature;
    private final ChainPass pass;
    private final double[] hertz;
    private final double[] total;
    private final Map<Weighting, double[]> gains = new EnumMap<>(Weighting.class);

    private BandWalk(LogQuadrature quadrature) {
        this.quadrature = quadrature;
        this.hertz = quadrature.hertz();
        this.pass = new ChainPass(Frequencies.of(hertz));
        this.total = new double[hertz.length];
        for (Weighting weighting : Weighting.values()) {
            gains.put(weighting, weightingGain(weighting, hertz));
        }
    }

    /** Finds the nodes on which every printed integral of this front end converges. */
    public static BandWalk over(FrontEnd frontEnd, Band band) {
        return over(frontEnd, band, new double[] {Accounting.LOW_BAND_TO_HERTZ});
    }

    /** Finds such nodes with further frequencies, Hz, at which sums are to be split. */
    static BandWalk over(FrontEnd frontEnd, Band band, double[] splitHertz) {
        double[] resonances = ResonanceScan.resonancesHertz(frontEnd, band);
        double[] breaks = Arrays.copyOf(splitHertz, splitHertz.length + resonances.length);
        System.arraycopy(resonances, 0, breaks, splitHertz.length, resonances.length);
        return new BandWalk(LogQuadrature.refine(band, breaks, hertz -> densities(frontEnd, hertz)));
    }

    /** EIN density under each weighting, the source's own, and the density as measured up to a constant. */
    private static double[][] densities(FrontEnd frontEnd, double[] hertz) {
        ChainPass pass = new ChainPass(Frequencies.of(hertz));
        frontEnd.walk(pass);
        Weighting[] weightings = Weighting.values();
        double[][] rows = new double[weightings.length + 2][hertz.length];
        double[] total = new double[hertz.length];
        pass.total(total);
        for (int row = 0; row < weightings.length; row++) {
            double[] gain = weightingGain(weightings[row], hertz);
            for (int k = 0; k < hertz.length; k++) {
                rows[row][k] = total[k] * gain[k];
            }
        }
        double[] sourceAlone = rows[weightings.length];
        System.arraycopy(pass.power(0), 0, sourceAlone, 0, hertz.length);
        double[] asMeasured = rows[weightings.length + 1];
        double[] response = responseSquared(frontEnd, pass.frequencies());
        for (int k = 0; k < hertz.length; k++) {
            asMeasured[k] = total[k] * response[k];
        }
        return rows;
    }

    /** Walks a front end over the nodes. Results stand until the next walk. */
    public void walk(FrontEnd frontEnd) {
        frontEnd.walk(pass);
        pass.total(total);
    }

    /** EIN² under a weighting of the front end walked last, V². */
    public double einVoltsSquared(Weighting weighting) {
        return quadrature.integrate(total, gain(weighting));
    }

    /** Power of one generator of the front end walked last under a weighting, V². */
    public double powerVoltsSquared(int generator, Weighting weighting) {
        return quadrature.integrate(pass.power(generator), gain(weighting));
    }

    /** Power of one generator under a weighting below a frequency, V²; the frequency must have been a break of the nodes. */
    double powerBelowVoltsSquared(int generator, Weighting weighting, double limitHertz) {
        return below(pass.power(generator), weighting, limitHertz);
    }

    /** EIN² under a weighting below a frequency, V²; the frequency must have been a break of the nodes. */
    double einBelowVoltsSquared(Weighting weighting, double limitHertz) {
        return below(total, weighting, limitHertz);
    }

    private double below(double[] density, Weighting weighting, double limitHertz) {
        double[] weights = quadrature.weights();
        double[] gain = gain(weighting);
        double sum = 0.0;
        for (int k = 0; k < hertz.length && hertz[k] < limitHertz; k++) {
            sum += weights[k] * gain[k] * density[k];
        }
        return sum;
    }

    /** EIN² under a weighting, each frequency multiplied by a further power gain, V². */
    double einVoltsSquared(Weighting weighting, double[] powerGain) {
        double[] gain = gain(weighting);
        double[] product = new double[gain.length];
        for (int k = 0; k < product.length; k++) {
            product[k] = gain[k] * powerGain[k];
        }
        return quadrature.integrate(total, product);
    }

    /** |H|² from the EMF to the stage's output at some frequencies, up to a constant where feedback fixes the gain. */
    static double[] responseSquared(FrontEnd frontEnd, Frequencies frequencies) {
        ChainPass pass = new ChainPass(frequencies);
        pass.beginBehind(frontEnd.source().impedance());
        frontEnd.walkLoading(pass);
        double[] squares = new double[frequencies.count()];
        for (int k = 0; k < squares.length; k++) {
            double re = pass.rowVoltageRe()[k];
            double im = pass.rowVoltageIm()[k];
            squares[k] = 1.0 / (re * re + im * im);
        }
        return squares;
    }

    /** The walk itself, standing at the end of the chain. */
    ChainPass pass() {
        return pass;
    }

    private double[] gain(Weighting weighting) {
        double[] gain = gains.get(weighting);
        if (gain == null) {
            throw new IllegalStateException("no gain for " + weighting);
        }
        return gain;
    }

    private static double[] weightingGain(Weighting weighting, double[] hertz) {
        double[] gain = new double[hertz.length];
        for (int k = 0; k < gain.length; k++) {
            gain[k] = weighting.powerGain(hertz[k]);
        }
        return gain;
    }
}
