package hissledger.twoport;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.complex.Complex;

/**
 * The algebra of noisy two-ports in its plain form, at one frequency, as the reference of {@link ChainPass}: whole chain
 * matrices, and for every generator its pair (e, i) at the input.
 *
 * <p>Convention: V1 = A V2 + B I2 + e and I1 = C V2 + D I2 + i, where I2 leaves port 2.
 */
final class ReferenceChain {
    private ReferenceChain() {}

    /** The equivalent voltage and current at a port of one unit of a generator. */
    record Pair(double eRe, double eIm, double iRe, double iIm) {
        static final Pair VOLTAGE = new Pair(1.0, 0.0, 0.0, 0.0);
        static final Pair CURRENT = new Pair(0.0, 0.0, 1.0, 0.0);

        static Pair of(Complex e, Complex i) {
            return new Pair(e.getReal(), e.getImaginary(), i.getReal(), i.getImaginary());
        }

        Complex e() {
            return new Complex(eRe, eIm);
        }

        Complex i() {
            return new Complex(iRe, iIm);
        }

        /** |e + Zs i|², what one unit contributes to the EMF behind Zs. */
        double behind(Complex source) {
            double magnitude = e().add(source.multiply(i())).abs();
            return magnitude * magnitude;
        }

        Pair scaled(double voltage, double current) {
            return new Pair(voltage * eRe, voltage * eIm, current * iRe, current * iIm);
        }
    }

    /** A chain matrix [A B; C D]. */
    record Chain(double aRe, double aIm, double bRe, double bIm, double cRe, double cIm, double dRe, double dIm) {
        static final Chain THROUGH = of(Complex.ONE, Complex.ZERO, Complex.ZERO, Complex.ONE);

        static Chain of(Complex a, Complex b, Complex c, Complex d) {
            return new Chain(
                    a.getReal(),
                    a.getImaginary(),
                    b.getReal(),
                    b.getImaginary(),
                    c.getReal(),
                    c.getImaginary(),
                    d.getReal(),
                    d.getImaginary());
        }

        Complex a() {
            return new Complex(aRe, aIm);
        }

        Complex b() {
            return new Complex(bRe, bIm);
        }

        Complex c() {
            return new Complex(cRe, cIm);
        }

        Complex d() {
            return new Complex(dRe, dIm);
        }

        /** Series Z: [1 Z; 0 1]. */
        static Chain series(Complex z) {
            return of(Complex.ONE, z, Complex.ZERO, Complex.ONE);
        }

        /** Shunt Y: [1 0; Y 1]. */
        static Chain shunt(Complex y) {
            return of(Complex.ONE, Complex.ZERO, y, Complex.ONE);
        }

        /** Ideal step-up 1:n: [1/n 0; 0 n]. */
        static Chain stepUp(double n) {
            return of(new Complex(1.0 / n), Complex.ZERO, Complex.ZERO, new Complex(n));
        }

        Chain cascade(Chain next) {
            return of(
                    a().multiply(next.a()).add(b().multiply(next.c())),
                    a().multiply(next.b()).add(b().multiply(next.d())),
                    c().multiply(next.a()).add(d().multiply(next.c())),
                    c().multiply(next.b()).add(d().multiply(next.d())));
        }

        /** The pair of a generator of the next two-port, seen at this one's input: M (e, i). */
        Pair refer(Pair pair) {
            return Pair.of(
                    a().multiply(pair.e()).add(b().multiply(pair.i())),
                    c().multiply(pair.e()).add(d().multiply(pair.i())));
        }
    }

    /** The admittances of a three-terminal device. */
    record Admittances(Complex y11, Complex y12, Complex y21, Complex y22) {
        Complex sum() {
            return y11.add(y12).add(y21).add(y22);
        }

        Admittances parallel(int n) {
            return new Admittances(y11.multiply(n), y12.multiply(n), y21.multiply(n), y22.multiply(n));
        }

        /** y' = y − p r f with p = −(y11+y12, y21+y22), r = −(y11+y21, y12+y22), f = Ze/(1 + s Ze). */
        Admittances withCommonLead(Complex ze) {
            Complex f = ze.divide(Complex.ONE.add(sum().multiply(ze)));
            Complex p1 = y11.add(y12).negate();
            Complex p2 = y21.add(y22).negate();
            Complex r1 = y11.add(y21).negate();
            Complex r2 = y12.add(y22).negate();
            return new Admittances(
                    y11.subtract(p1.multiply(r1).multiply(f)),
                    y12.subtract(p1.multiply(r2).multiply(f)),
                    y21.subtract(p2.multiply(r1).multiply(f)),
                    y22.subtract(p2.multiply(r2).multiply(f)));
        }

        /** j' = j + p f (j1 + j2). */
        Complex[] currentsWithCommonLead(Complex ze, Complex j1, Complex j2) {
            Complex f = ze.divide(Complex.ONE.add(sum().multiply(ze)));
            Complex both = j1.add(j2).multiply(f);
            return new Complex[] {
                j1.subtract(y11.add(y12).multiply(both)),
                j2.subtract(y21.add(y22).multiply(both))
            };
        }

        /** An EMF in Ze gives j = p/(1 + s Ze). */
        Complex[] currentsOfLeadVoltage(Complex ze) {
            Complex d = Complex.ONE.divide(Complex.ONE.add(sum().multiply(ze)));
            return new Complex[] {
                y11.add(y12).negate().multiply(d), y21.add(y22).negate().multiply(d)
            };
        }

        /** y' = [y11, −(y11+y12); −(y11+y21), s]. */
        Admittances follower() {
            return new Admittances(y11, y11.add(y12).negate(), y11.add(y21).negate(), sum());
        }

        /** A = −y22/y21, B = −1/y21, C = y12 − y11 y22/y21, D = −y11/y21. */
        Chain chain() {
            return Chain.of(
                    y22.divide(y21).negate(),
                    y21.reciprocal().negate(),
                    y12.subtract(y11.multiply(y22).divide(y21)),
                    y11.divide(y21).negate());
        }

        /** e = −j2/y21, i = j1 − (y11/y21) j2. */
        Pair pair(Complex j1, Complex j2) {
            return Pair.of(j2.divide(y21).negate(), j1.subtract(y11.divide(y21).multiply(j2)));
        }
    }

    /** A generator with its density and its pair at the input. */
    record Entry(String name, double density, Pair pair) {}

    /** A two-port with its generators. */
    record NoisyTwoPort(Chain chain, List<Entry> entries) {
        NoisyTwoPort {
            entries = List.copyOf(entries);
        }

        static NoisyTwoPort noiseless(Chain chain) {
            return new NoisyTwoPort(chain, List.of());
        }

        NoisyTwoPort cascade(NoisyTwoPort next) {
            List<Entry> all = new ArrayList<>(entries);
            next.entries.forEach(entry -> all.add(new Entry(entry.name(), entry.density(), chain.refer(entry.pair()))));
            return new NoisyTwoPort(chain.cascade(next.chain), all);
        }

        /** N of them in parallel: B/N, C N, e/√N, i√N. */
        NoisyTwoPort parallel(int n) {
            return scaled(1.0 / n, n, 1.0 / Math.sqrt(n), Math.sqrt(n));
        }

        /** A matched pair seen differentially, from one half: 2B, C/2, e√2, i/√2. */
        NoisyTwoPort pair() {
            return scaled(2.0, 0.5, Math.sqrt(2.0), Math.sqrt(0.5));
        }

        private NoisyTwoPort scaled(double b, double c, double voltage, double current) {
            return new NoisyTwoPort(
                    Chain.of(chain.a(), chain.b().multiply(b), chain.c().multiply(c), chain.d()),
                    entries.stream()
                            .map(entry -> new Entry(
                                    entry.name(), entry.density(), entry.pair().scaled(voltage, current)))
                            .toList());
        }
    }
}
