package hissledger.ledger;

import hissledger.circuit.FrontEnd;
import hissledger.physics.Band;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Frequencies;
import java.util.ArrayList;
import java.util.List;

/**
 * Finds the resonances of a front end, so that an integral over frequency can close in on them.
 *
 * <p>A resonance of quality Q is only 1/Q wide and can fall between any sampling points. Its phase cannot: across it the
 * phase of the source impedance or of the transfer from the EMF turns by half a turn however narrow it is. The scan looks
 * for steps of phase between neighbouring points of a logarithmic grid, far larger than networks without resonance make, and
 * halves the interval around each toward the steepest part.
 */
final class ResonanceScan {
    private static final int POINTS_PER_DECADE = 64;
    /** A pair of real poles turns the phase by at most 0.04 rad between grid points; a Q of 2 by 0.14 rad. */
    private static final double LEAST_STEP_RADIANS = 0.12;
    /** After so many halvings an interval is 1e-9 wide in ln f: narrower than any Q below a million needs. */
    private static final int HALVINGS = 25;

    private ResonanceScan() {}

    /** Frequencies of resonance in the band, Hz. */
    static double[] resonancesHertz(FrontEnd frontEnd, Band band) {
        double decades = Math.log10(band.toHertz() / band.fromHertz());
        double[] grid = band.logarithmicHertz(2 + (int) Math.ceil(decades * POINTS_PER_DECADE));
        double[][] phases = phases(frontEnd, grid);
        List<double[]> intervals = new ArrayList<>();
        for (double[] phase : phases) {
            for (int k = 1; k < grid.length; k++) {
                if (step(phase[k - 1], phase[k]) > LEAST_STEP_RADIANS) {
                    intervals.add(new double[] {grid[k - 1], grid[k]});
                }
            }
        }
        if (intervals.isEmpty()) {
            return new double[0];
        }
        for (int halving = 0; halving < HALVINGS; halving++) {
            halve(frontEnd, intervals);
        }
        return intervals.stream().mapToDouble(i -> Math.sqrt(i[0] * i[1])).toArray();
    }

    private static void halve(FrontEnd frontEnd, List<double[]> intervals) {
        double[] hertz = new double[3 * intervals.size()];
        for (int j = 0; j < intervals.size(); j++) {
            double[] interval = intervals.get(j);
            hertz[3 * j] = interval[0];
            hertz[3 * j + 1] = Math.sqrt(interval[0] * interval[1]);
            hertz[3 * j + 2] = interval[1];
        }
        double[][] phases = phases(frontEnd, hertz);
        for (int j = 0; j < intervals.size(); j++) {
            double lower = 0.0;
            double upper = 0.0;
            for (double[] phase : phases) {
                lower = Math.max(lower, step(phase[3 * j], phase[3 * j + 1]));
                upper = Math.max(upper, step(phase[3 * j + 1], phase[3 * j + 2]));
            }
            double middle = hertz[3 * j + 1];
            intervals.set(
                    j, lower >= upper ? new double[] {hertz[3 * j], middle} : new double[] {middle, hertz[3 * j + 2]});
        }
    }

    /** Phase of the source impedance and phase of the transfer to the output, rad. */
    private static double[][] phases(FrontEnd frontEnd, double[] hertz) {
        ChainPass pass = new ChainPass(Frequencies.of(hertz));
        pass.beginBehind(frontEnd.source().impedance());
        double[] source = new double[hertz.length];
        for (int k = 0; k < hertz.length; k++) {
            source[k] = Math.atan2(pass.rowCurrentIm()[k], pass.rowCurrentRe()[k]);
        }
        frontEnd.walkBehindSource(pass);
        double[] transfer = new double[hertz.length];
        for (int k = 0; k < hertz.length; k++) {
            transfer[k] = Math.atan2(pass.rowVoltageIm()[k], pass.rowVoltageRe()[k]);
        }
        return new double[][] {source, transfer};
    }

    /** The turn from one phase to the next, 0 to π rad. */
    private static double step(double from, double to) {
        return Math.abs(Math.IEEEremainder(to - from, 2.0 * Math.PI));
    }
}
