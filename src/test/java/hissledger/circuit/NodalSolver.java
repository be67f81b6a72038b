package hissledger.circuit;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.DoubleFunction;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.DecompositionSolver;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;

/**
 * Noise analysis of a drawn circuit by modified nodal analysis and the adjoint method: the reference against which the
 * chain engine is held. It shares no algebra and no impedance with the engine; every element is a component value.
 *
 * <p>The unknowns are the node voltages and the currents of those elements that are entered as branches, so that an
 * element may be a short circuit, and a noise voltage in series with it needs no division. With the circuit's equations
 * M x = b and the output v = dᵀ x, one solution of the adjoint system Mᵀ w = d tells the transfer of every source at
 * once: a current drawn from node m and fed into node n reaches the output by w_n − w_m, a voltage in a branch by that
 * branch's w. Dividing by the transfer of the source's EMF refers it to the EMF.
 *
 * <p>Complex equations are solved as real ones of twice the size, since only Commons Math's real LU decomposition chooses
 * the largest pivot. Rows and columns are first scaled by powers of two, which rounds nothing, because admittances span
 * fifteen decades; three steps of iterative refinement, with residuals summed in twice the working precision, then remove
 * what the decomposition rounded.
 *
 * <p>Sources: C.-W. Ho, A. E. Ruehli and P. A. Brennan, <cite>The modified nodal approach to network analysis</cite>, IEEE
 * Trans. CAS 22 (1975) 504; R. Rohrer, L. Nagel, R. Meyer and L. Weber, <cite>Computationally efficient electronic-circuit
 * noise calculations</cite>, IEEE J. Solid-State Circuits 6 (1971) 204 (both from memory).
 */
final class NodalSolver {
    /** The reference node. */
    static final int GROUND = -1;

    private static final int REFINEMENTS = 3;
    private static final int SCALING_SWEEPS = 3;

    /** Writes an element's coefficients at ω. */
    @FunctionalInterface
    private interface Stamp {
        void into(Equations equations, double omega);
    }

    /** How one generator drives the equations: unit source at row {@code row}, times a factor that may depend on ω. */
    private record Drive(int row, DoubleFunction<Complex> factor) {}

    private record Noise(String name, DoubleUnaryOperator density, List<Drive> drives) {}

    private final List<Stamp> stamps = new ArrayList<>();
    private final List<Noise> noises = new ArrayList<>();
    private int unknowns;

    /** What one frequency gives. */
    record Answer(Complex gain, Map<String, Double> referred) {}

    // --------------------------------------------------------------------------------------------------- drawing

    /** A new node. */
    int node() {
        return unknowns++;
    }

    /** An admittance Y(ω) between two nodes. */
    void admittance(int a, int b, DoubleFunction<Complex> siemens) {
        stamps.add((m, omega) -> {
            Complex y = siemens.apply(omega);
            m.add(a, a, y);
            m.add(b, b, y);
            m.add(a, b, y.negate());
            m.add(b, a, y.negate());
        });
    }

    /** A noiseless conductance, S. */
    void conductance(int a, int b, double siemens) {
        admittance(a, b, omega -> new Complex(siemens));
    }

    /** A capacitance, F. */
    void capacitance(int a, int b, double farads) {
        admittance(a, b, omega -> new Complex(0.0, omega * farads));
    }

    /**
     * An element entered by its impedance: Va − Vb = Z I + E, the current I flowing from a through the element to b.
     *
     * @return the branch, to which noise voltages and the EMF may be given
     */
    int branch(int a, int b, DoubleFunction<Complex> ohms) {
        int current = unknowns++;
        stamps.add((m, omega) -> {
            m.add(a, current, Complex.ONE);
            m.add(b, current, Complex.ONE.negate());
            m.add(current, a, Complex.ONE);
            m.add(current, b, Complex.ONE.negate());
            m.add(current, current, ohms.apply(omega).negate());
        });
        return current;
    }

    /** A short circuit, for a voltage source or to read a current. */
    int branch(int a, int b) {
        return branch(a, b, omega -> Complex.ZERO);
    }

    /** A current gm (Vp − Vm) that flows from node {@code from} through the source to node {@code to}. */
    void transconductance(int from, int to, int plus, int minus, double siemens) {
        Complex gm = new Complex(siemens);
        stamps.add((m, omega) -> {
            m.add(from, plus, gm);
            m.add(from, minus, gm.negate());
            m.add(to, plus, gm.negate());
            m.add(to, minus, gm);
        });
    }

    /** A copy of a branch's current that flows from node {@code from} through the source to node {@code to}. */
    void currentCopy(int from, int to, int branch) {
        stamps.add((m, omega) -> {
            m.add(from, branch, Complex.ONE);
            m.add(to, branch, Complex.ONE.negate());
        });
    }

    /** An ideal transformer 1:n from (p, q) to (s, t): Vp − Vq = (Vs − Vt)/n, and the power that enters leaves. */
    void transformer(int p, int q, int s, int t, double ratio) {
        int primary = unknowns++;
        Complex inverse = new Complex(1.0 / ratio);
        stamps.add((m, omega) -> {
            m.add(p, primary, Complex.ONE);
            m.add(q, primary, Complex.ONE.negate());
            m.add(s, primary, inverse.negate());
            m.add(t, primary, inverse);
            m.add(primary, p, Complex.ONE);
            m.add(primary, q, Complex.ONE.negate());
            m.add(primary, s, inverse.negate());
            m.add(primary, t, inverse);
        });
    }

    /** A noise current of density S(ω), A²/Hz, flowing from node {@code from} through its source to node {@code to}. */
    void noiseCurrent(String name, int from, int to, DoubleUnaryOperator density) {
        noises.add(new Noise(name, density, current(from, to, omega -> Complex.ONE)));
    }

    /** Two noise currents that are one: the first of density S(ω), the second the first times a factor. */
    void noiseCurrents(
            String name,
            int from,
            int to,
            DoubleUnaryOperator density,
            int secondFrom,
            int secondTo,
            DoubleFunction<Complex> factor) {
        List<Drive> drives = new ArrayList<>(current(from, to, omega -> Complex.ONE));
        drives.addAll(current(secondFrom, secondTo, factor));
        noises.add(new Noise(name, density, drives));
    }

    /** A noise voltage of density S(ω), V²/Hz, in a branch. */
    void noiseVoltage(String name, int branch, DoubleUnaryOperator density) {
        noises.add(new Noise(name, density, List.of(new Drive(branch, omega -> Complex.ONE))));
    }

    private static List<Drive> current(int from, int to, DoubleFunction<Complex> factor) {
        return List.of(new Drive(from, omega -> factor.apply(omega).negate()), new Drive(to, factor));
    }

    // --------------------------------------------------------------------------------------------------- solving

    /**
     * The gain from the EMF in a branch to the voltage between two nodes, and what every generator contributes, referred
     * to that EMF, V²/Hz. Generators of the same name are independent and their powers are summed.
     */
    Answer solve(double hertz, int emfBranch, int outputPlus, int outputMinus) {
        double omega = 2.0 * Math.PI * hertz;
        Equations equations = new Equations(unknowns);
        stamps.forEach(stamp -> stamp.into(equations, omega));
        Complex[] adjoint = equations.solveTransposed(outputPlus, outputMinus);
        Complex gain = adjoint[emfBranch];
        Map<String, Double> referred = new LinkedHashMap<>();
        for (Noise noise : noises) {
            double density = noise.density().applyAsDouble(omega);
            Complex transfer = Complex.ZERO;
            for (Drive drive : noise.drives()) {
                if (drive.row() != GROUND) {
                    transfer = transfer.add(
                            adjoint[drive.row()].multiply(drive.factor().apply(omega)));
                }
            }
            double ratio = transfer.abs() / gain.abs();
            referred.merge(noise.name(), density * ratio * ratio, Double::sum);
        }
        return new Answer(gain, referred);
    }

    /** The circuit's equations at one frequency, [Re −Im; Im Re] in real form. */
    private static final class Equations {
        private final int size;
        private final double[][] re;
        private final double[][] im;

        Equations(int size) {
            this.size = size;
            re = new double[size][size];
            im = new double[size][size];
        }

        void add(int row, int column, Complex value) {
            if (row != GROUND && column != GROUND) {
                re[row][column] += value.getReal();
                im[row][column] += value.getImaginary();
            }
        }

        /** Solves Mᵀ w = d with d one at {@code plus} and minus one at {@code minus}. */
        Complex[] solveTransposed(int plus, int minus) {
            int n = 2 * size;
            double[][] matrix = new double[n][n];
            for (int r = 0; r < size; r++) {
                for (int c = 0; c < size; c++) {
                    matrix[c][r] = re[r][c];
                    matrix[c + size][r + size] = re[r][c];
                    matrix[c][r + size] = -im[r][c];
                    matrix[c + size][r] = im[r][c];
                }
            }
            double[] right = new double[n];
            if (plus != GROUND) {
                right[plus] += 1.0;
            }
            if (minus != GROUND) {
                right[minus] -= 1.0;
            }
            double[] w = solveScaled(matrix, right);
            Complex[] adjoint = new Complex[size];
            for (int k = 0; k < size; k++) {
                adjoint[k] = new Complex(w[k], w[k + size]);
            }
            return adjoint;
        }

        private static double[] solveScaled(double[][] matrix, double[] right) {
            int n = right.length;
            double[] rowScale = new double[n];
            double[] columnScale = new double[n];
            Arrays.fill(rowScale, 1.0);
            Arrays.fill(columnScale, 1.0);
            for (int sweep = 0; sweep < SCALING_SWEEPS; sweep++) {
                for (int k = 0; k < n; k++) {
                    double largestInRow = 0.0;
                    for (int c = 0; c < n; c++) {
                        largestInRow = Math.max(largestInRow, Math.abs(matrix[k][c]) * columnScale[c]);
                    }
                    rowScale[k] = powerOfTwoNear(largestInRow);
                }
                for (int k = 0; k < n; k++) {
                    double largestInColumn = 0.0;
                    for (int r = 0; r < n; r++) {
                        largestInColumn = Math.max(largestInColumn, Math.abs(matrix[r][k]) * rowScale[r]);
                    }
                    columnScale[k] = powerOfTwoNear(largestInColumn);
                }
            }
            double[][] scaled = new double[n][n];
            double[] target = new double[n];
            for (int r = 0; r < n; r++) {
                target[r] = right[r] * rowScale[r];
                for (int c = 0; c < n; c++) {
                    scaled[r][c] = matrix[r][c] * rowScale[r] * columnScale[c];
                }
            }
            RealMatrix system = new Array2DRowRealMatrix(scaled, false);
            DecompositionSolver solver = new LUDecomposition(system, Double.MIN_NORMAL).getSolver();
            RealVector solution = solver.solve(new ArrayRealVector(target));
            for (int step = 0; step < REFINEMENTS; step++) {
                solution = solution.add(solver.solve(residual(scaled, target, solution)));
            }
            double[] w = solution.toArray();
            for (int k = 0; k < n; k++) {
                w[k] *= columnScale[k];
            }
            return w;
        }

        /** target − matrix · solution, each row summed with its rounding errors kept (Ogita, Rump, Oishi 2005). */
        private static RealVector residual(double[][] matrix, double[] target, RealVector solution) {
            double[] residual = new double[target.length];
            for (int r = 0; r < target.length; r++) {
                double sum = target[r];
                double lost = 0.0;
                for (int c = 0; c < target.length; c++) {
                    double x = -matrix[r][c];
                    double y = solution.getEntry(c);
                    double product = x * y;
                    double productLost = Math.fma(x, y, -product);
                    double next = sum + product;
                    double carried = next - sum;
                    lost += (sum - (next - carried)) + (product - carried) + productLost;
                    sum = next;
                }
                residual[r] = sum + lost;
            }
            return new ArrayRealVector(residual);
        }

        private static double powerOfTwoNear(double largest) {
            return largest == 0.0 ? 1.0 : Math.scalb(1.0, -Math.getExponent(largest));
        }
    }
}
