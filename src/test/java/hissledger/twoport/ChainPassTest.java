package hissledger.twoport;

import static hissledger.Trials.forAll;
import static hissledger.Trials.logUniform;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hissledger.physics.Thermal;
import hissledger.twoport.ReferenceChain.Admittances;
import hissledger.twoport.ReferenceChain.Chain;
import hissledger.twoport.ReferenceChain.Entry;
import hissledger.twoport.ReferenceChain.NoisyTwoPort;
import hissledger.twoport.ReferenceChain.Pair;
import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;
import org.apache.commons.math3.complex.Complex;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** The walk that carries a row against the plain algebra of whole matrices and pairs. */
class ChainPassTest {
    /**
     * Some hundred roundings, 1e-14, of which a near-cancellation (a resonance, a null of a generator's transfer) takes up
     * to five digits.
     */
    private static final double ALGEBRA_ROUNDING = 1e-9;

    private static final Percentage ALGEBRA = Percentage.withPercentage(100.0 * ALGEBRA_ROUNDING);
    /** A dozen roundings without cancellation. */
    private static final Percentage FEW_ROUNDINGS = Percentage.withPercentage(100.0 * 1e-13);

    private static final int CHAINS = 1_000;
    private static final double ROOM_KELVIN = 293.15;

    private record Named(String name) implements Generator {}

    /** The same chain twice: walked by the engine, and multiplied out by the reference. */
    private static final class Twin {
        private final RandomGenerator random;
        private final double hertz;
        private final double omega;
        private final ChainPass pass;
        private final Complex source;
        private NoisyTwoPort reference;
        private int count;

        Twin(RandomGenerator random) {
            this.random = random;
            hertz = logUniform(random, 1.0, 1e6);
            omega = 2.0 * Math.PI * hertz;
            // a neighbour on either side, so that an index that strays is seen
            pass = new ChainPass(Frequencies.of(hertz * 3.0, hertz, hertz / 7.0));
            double ohms = logUniform(random, 0.1, 1e6);
            double henries = logUniform(random, 1e-7, 1.0);
            pass.beginBehind(Impedance.resistanceAndInductance(ohms, henries));
            pass.sourceNoise(new Named("source"), ROOM_KELVIN);
            source = new Complex(ohms, omega * henries);
            reference = new NoisyTwoPort(
                    Chain.THROUGH,
                    List.of(new Entry("source", Thermal.voltsSquaredPerHertz(ohms, ROOM_KELVIN), Pair.VOLTAGE)));
        }

        private Named next() {
            return new Named("generator " + count++);
        }

        private NoisyTwoPort noisy(Named name, double density, Pair pair, Chain chain) {
            return new NoisyTwoPort(chain, List.of(new Entry(name.name(), density, pair)));
        }

        /** A random passive or generator in both forms; the reference form is returned. */
        NoisyTwoPort element() {
            Named name = next();
            switch (random.nextInt(8)) {
                case 0 -> {
                    double ohms = logUniform(random, 0.1, 1e5);
                    double henries = logUniform(random, 1e-9, 1e-2);
                    pass.series(Impedance.resistanceAndInductance(ohms, henries), name, ROOM_KELVIN);
                    return noisy(
                            name,
                            Thermal.voltsSquaredPerHertz(ohms, ROOM_KELVIN),
                            Pair.VOLTAGE,
                            Chain.series(new Complex(ohms, omega * henries)));
                }
                case 1 -> {
                    double farads = logUniform(random, 1e-10, 1e-4);
                    double loss = logUniform(random, 1e-5, 0.1);
                    double ohms = logUniform(random, 1e-3, 10.0);
                    pass.series(Impedance.capacitance(farads, loss, ohms), name, ROOM_KELVIN);
                    Complex z = new Complex(ohms + loss / (omega * farads), -1.0 / (omega * farads));
                    return noisy(
                            name,
                            Thermal.voltsSquaredPerHertz(z.getReal(), ROOM_KELVIN),
                            Pair.VOLTAGE,
                            Chain.series(z));
                }
                case 2 -> {
                    double ohms = logUniform(random, 10.0, 1e8);
                    pass.shunt(Impedance.resistance(ohms), name, ROOM_KELVIN);
                    return noisy(
                            name,
                            Thermal.ampsSquaredPerHertz(1.0 / ohms, ROOM_KELVIN),
                            Pair.CURRENT,
                            Chain.shunt(new Complex(1.0 / ohms)));
                }
                case 3 -> {
                    // a coil with losses and winding capacitance across the line
                    double ohms = logUniform(random, 0.1, 1e3);
                    double henries = logUniform(random, 1e-3, 10.0);
                    double parallelOhms = logUniform(random, 1e3, 1e6);
                    double farads = logUniform(random, 1e-12, 1e-9);
                    pass.shunt(
                            Impedance.resistanceAndInductance(ohms, henries).across(parallelOhms, farads),
                            name,
                            ROOM_KELVIN);
                    Complex y = new Complex(ohms, omega * henries)
                            .reciprocal()
                            .add(new Complex(1.0 / parallelOhms, omega * farads));
                    return noisy(
                            name, Thermal.ampsSquaredPerHertz(y.getReal(), ROOM_KELVIN), Pair.CURRENT, Chain.shunt(y));
                }
                case 4 -> {
                    double ratio = logUniform(random, 0.05, 20.0);
                    pass.stepUp(ratio);
                    return NoisyTwoPort.noiseless(Chain.stepUp(ratio));
                }
                case 5 -> {
                    double siemens = logUniform(random, 1e-9, 1e-2);
                    double farads = logUniform(random, 1e-13, 1e-9);
                    pass.noiselessShunt(siemens, farads);
                    return NoisyTwoPort.noiseless(Chain.shunt(new Complex(siemens, omega * farads)));
                }
                case 6 -> {
                    double density = logUniform(random, 1e-20, 1e-14);
                    double corner = logUniform(random, 1.0, 1e5);
                    pass.seriesVoltage(name, Spectrum.whiteWithCorner(density, corner));
                    return noisy(name, density * (1.0 + corner / hertz), Pair.VOLTAGE, Chain.THROUGH);
                }
                default -> {
                    double density = logUniform(random, 1e-28, 1e-20);
                    double exponent = random.nextBoolean() ? 1.0 : random.nextDouble(-2.0, 2.0);
                    pass.shuntCurrent(name, Spectrum.powerLaw(density, 1000.0, exponent));
                    return noisy(name, density * Math.pow(1000.0 / hertz, exponent), Pair.CURRENT, Chain.THROUGH);
                }
            }
        }

        /** A random device, in common-lead or follower form. */
        NoisyTwoPort device() {
            double g11 = logUniform(random, 1e-8, 1e-2);
            double gm = logUniform(random, 1e-4, 1.0);
            double g22 = logUniform(random, 1e-8, 1e-3);
            double c1 = logUniform(random, 1e-13, 1e-9);
            double c12 = logUniform(random, 1e-13, 1e-10);
            double shielded = random.nextBoolean() ? logUniform(random, 1e-13, 1e-10) : 0.0;
            int devices = random.nextInt(1, 5);
            pass.device(new SmallSignal(g11, gm, g22, c1, c12, shielded).parallel(devices));
            Admittances y = new Admittances(
                            new Complex(g11, omega * (c1 + c12)),
                            new Complex(0.0, -omega * c12),
                            new Complex(gm, -omega * c12),
                            new Complex(g22, omega * c12))
                    .parallel(devices);
            NoisyTwoPort shield = NoisyTwoPort.noiseless(Chain.shunt(new Complex(0.0, devices * omega * shielded)));
            double s1 = logUniform(random, 1e-28, 1e-20);
            double s2 = logUniform(random, 1e-26, 1e-18);
            double s3 = logUniform(random, 1e-26, 1e-18);
            double s4 = logUniform(random, 1e-20, 1e-15);
            double seconds = logUniform(random, 1e-12, 1e-8);
            Complex[][] currents = {
                {Complex.ONE, Complex.ZERO},
                {Complex.ZERO, Complex.ONE},
                {new Complex(0.0, omega * seconds), Complex.ONE}
            };
            double[] densities = {s1, s2, s3};
            List<Entry> entries = new ArrayList<>();
            Named[] names = {next(), next(), next(), next()};
            boolean follower = random.nextInt(3) == 0;
            Admittances seen;
            if (follower) {
                pass.follower();
                seen = y.follower();
                for (int g = 0; g < 3; g++) {
                    // j' = (j1, −(j1+j2))
                    Pair pair = seen.pair(
                            currents[g][0], currents[g][0].add(currents[g][1]).negate());
                    entries.add(new Entry(names[g].name(), densities[g], pair));
                }
            } else {
                double re = random.nextInt(4) == 0 ? 0.0 : logUniform(random, 0.1, 1e5);
                double henries = random.nextBoolean() ? 0.0 : logUniform(random, 1e-7, 1e-2);
                pass.commonLead(Impedance.resistanceAndInductance(re, henries));
                Complex ze = new Complex(re, omega * henries);
                seen = y.withCommonLead(ze);
                for (int g = 0; g < 3; g++) {
                    Complex[] j = y.currentsWithCommonLead(ze, currents[g][0], currents[g][1]);
                    entries.add(new Entry(names[g].name(), densities[g], seen.pair(j[0], j[1])));
                }
                Complex[] j = y.currentsOfLeadVoltage(ze);
                entries.add(new Entry(names[3].name(), s4, seen.pair(j[0], j[1])));
            }
            pass.inputCurrent(names[0], Spectrum.white(s1));
            pass.outputCurrent(names[1], Spectrum.white(s2));
            pass.correlatedCurrents(names[2], Spectrum.white(s3), seconds);
            if (!follower) {
                pass.commonLeadVoltage(names[3], Spectrum.white(s4));
            }
            pass.leaveDevice();
            return shield.cascade(new NoisyTwoPort(seen.chain(), entries));
        }

        NoisyTwoPort several(int most) {
            NoisyTwoPort sum = NoisyTwoPort.noiseless(Chain.THROUGH);
            int elements = random.nextInt(most + 1);
            for (int e = 0; e < elements; e++) {
                sum = sum.cascade(element());
            }
            return sum;
        }

        void append(NoisyTwoPort next) {
            reference = reference.cascade(next);
        }

        void assertSame() {
            int k = 1;
            List<Entry> loud = reference.entries();
            for (Entry entry : loud) {
                double expected = entry.density() * entry.pair().behind(source);
                double ours = 0.0;
                int found = 0;
                for (int g = 0; g < pass.generatorCount(); g++) {
                    if (pass.generators().get(g).name().equals(entry.name())) {
                        ours += pass.power(g)[k];
                        found++;
                    }
                }
                assertThat(found).as("times that %s was met", entry.name()).isEqualTo(1);
                assertThat(ours).as("%s at %s Hz", entry.name(), hertz).isCloseTo(expected, ALGEBRA);
            }
            assertThat(pass.generatorCount()).isEqualTo(loud.size());
            Complex a =
                    reference.chain().a().add(source.multiply(reference.chain().c()));
            Complex b =
                    reference.chain().b().add(source.multiply(reference.chain().d()));
            assertThat(new Complex(pass.rowVoltageRe()[k], pass.rowVoltageIm()[k])
                            .subtract(a)
                            .abs())
                    .isCloseTo(0.0, within(ALGEBRA_ROUNDING * a.abs()));
            assertThat(new Complex(pass.rowCurrentRe()[k], pass.rowCurrentIm()[k])
                            .subtract(b)
                            .abs())
                    .isCloseTo(0.0, within(ALGEBRA_ROUNDING * b.abs()));
        }
    }

    @Test
    void passiveChainsAreThoseOfTheReference() {
        forAll(CHAINS, random -> {
            Twin twin = new Twin(random);
            twin.append(twin.several(8));
            twin.assertSame();
        });
    }

    @Test
    void chainsWithDevicesAreThoseOfTheReference() {
        forAll(CHAINS, random -> {
            Twin twin = new Twin(random);
            int stages = random.nextInt(1, 4);
            for (int s = 0; s < stages; s++) {
                twin.append(twin.several(3));
                twin.append(twin.device());
            }
            twin.append(twin.several(3));
            twin.assertSame();
        });
    }

    @Test
    void enteringAndLeavingAHalfIsThePairRule() {
        forAll(CHAINS, random -> {
            Twin twin = new Twin(random);
            twin.append(twin.several(3));
            twin.pass.enterHalf();
            NoisyTwoPort half = twin.several(3).cascade(twin.device()).cascade(twin.several(2));
            twin.pass.leaveHalf();
            twin.append(half.pair());
            twin.append(twin.several(2));
            twin.assertSame();
        });
    }

    @Test
    void parallelDevicesAreParallelTwoPorts() {
        // N y with N times the current powers and rbb'/N is the same as N whole two-ports, each with its own rbb'
        forAll(CHAINS, random -> {
            double hertz = logUniform(random, 1.0, 1e6);
            double omega = 2.0 * Math.PI * hertz;
            int n = random.nextInt(1, 9);
            double rbb = logUniform(random, 1.0, 500.0);
            double lead = logUniform(random, 0.05, 10.0);
            double gm = logUniform(random, 1e-3, 0.5);
            double g11 = gm / 200.0;
            double g22 = gm / 3000.0;
            double c1 = 1e-10;
            double c12 = 5e-12;
            double base = logUniform(random, 1e-26, 1e-22);
            double collector = logUniform(random, 1e-24, 1e-20);
            double zs = logUniform(random, 1.0, 1e5);

            ChainPass pass = new ChainPass(Frequencies.of(hertz));
            pass.beginBehind(Impedance.resistance(zs));
            pass.series(Impedance.resistance(rbb / n), new Named("rbb"), ROOM_KELVIN);
            pass.device(SmallSignal.of(g11, gm, g22, c1, c12).parallel(n));
            pass.commonLead(Impedance.resistance(lead / n));
            pass.inputCurrent(new Named("base"), Spectrum.white(n * base));
            pass.outputCurrent(new Named("collector"), Spectrum.white(n * collector));
            pass.commonLeadVoltage(
                    new Named("lead"), Spectrum.white(Thermal.voltsSquaredPerHertz(lead / n, ROOM_KELVIN)));
            pass.leaveDevice();

            Complex ze = new Complex(lead);
            Admittances y = new Admittances(
                    new Complex(g11, omega * (c1 + c12)),
                    new Complex(0.0, -omega * c12),
                    new Complex(gm, -omega * c12),
                    new Complex(g22, omega * c12));
            Admittances seen = y.withCommonLead(ze);
            Complex[] baseCurrents = y.currentsWithCommonLead(ze, Complex.ONE, Complex.ZERO);
            Complex[] collectorCurrents = y.currentsWithCommonLead(ze, Complex.ZERO, Complex.ONE);
            Complex[] leadCurrents = y.currentsOfLeadVoltage(ze);
            NoisyTwoPort one = new NoisyTwoPort(
                            Chain.series(new Complex(rbb)),
                            List.of(new Entry("rbb", Thermal.voltsSquaredPerHertz(rbb, ROOM_KELVIN), Pair.VOLTAGE)))
                    .cascade(new NoisyTwoPort(
                            seen.chain(),
                            List.of(
                                    new Entry("base", base, seen.pair(baseCurrents[0], baseCurrents[1])),
                                    new Entry(
                                            "collector",
                                            collector,
                                            seen.pair(collectorCurrents[0], collectorCurrents[1])),
                                    new Entry(
                                            "lead",
                                            Thermal.voltsSquaredPerHertz(lead, ROOM_KELVIN),
                                            seen.pair(leadCurrents[0], leadCurrents[1])))));
            List<Entry> whole = one.parallel(n).entries();
            for (int g = 0; g < whole.size(); g++) {
                assertThat(pass.power(g)[0])
                        .as(whole.get(g).name())
                        .isCloseTo(whole.get(g).density() * whole.get(g).pair().behind(new Complex(zs)), ALGEBRA);
            }
        });
    }

    @Test
    void aResistorMaySplitInTwo() {
        forAll(200, random -> {
            double ohms = logUniform(random, 1.0, 1e6);
            double part = random.nextDouble(0.01, 0.99);
            double behind = logUniform(random, 1.0, 1e6);
            boolean series = random.nextBoolean();
            ChainPass whole = begun(behind);
            ChainPass split = begun(behind);
            if (series) {
                whole.series(Impedance.resistance(ohms), new Named("whole"), ROOM_KELVIN);
                split.series(Impedance.resistance(part * ohms), new Named("one"), ROOM_KELVIN);
                split.series(Impedance.resistance((1.0 - part) * ohms), new Named("other"), ROOM_KELVIN);
            } else {
                whole.shunt(Impedance.resistance(ohms), new Named("whole"), ROOM_KELVIN);
                split.shunt(Impedance.resistance(ohms / part), new Named("one"), ROOM_KELVIN);
                split.shunt(Impedance.resistance(ohms / (1.0 - part)), new Named("other"), ROOM_KELVIN);
            }
            assertThat(split.power(0)[0] + split.power(1)[0]).isCloseTo(whole.power(0)[0], FEW_ROUNDINGS);
            assertThat(split.rowVoltageRe()[0]).isCloseTo(whole.rowVoltageRe()[0], FEW_ROUNDINGS);
            assertThat(split.rowCurrentRe()[0]).isCloseTo(whole.rowCurrentRe()[0], FEW_ROUNDINGS);
        });
    }

    private static ChainPass begun(double ohms) {
        ChainPass pass = new ChainPass(Frequencies.of(1000.0));
        pass.beginBehind(Impedance.resistance(ohms));
        return pass;
    }

    @Test
    void aPassiveNetworkInEquilibriumHasTheNoiseOfItsOwnImpedance() {
        // Twiss: 4kT Re Y between any two terminals. EMF noise over |a|² is the noise of the open output, 4kT Re Zout,
        // with Zout = b/a since V2 = (V1 - b I2)/a
        forAll(CHAINS, random -> {
            ChainPass pass = new ChainPass(Frequencies.of(logUniform(random, 1.0, 1e6)));
            pass.beginBehind(
                    Impedance.resistanceAndInductance(logUniform(random, 0.1, 1e5), logUniform(random, 1e-6, 1.0))
                            .across(logUniform(random, 1e3, 1e6), logUniform(random, 1e-12, 1e-8)));
            pass.sourceNoise(new Named("source"), ROOM_KELVIN);
            int elements = random.nextInt(7);
            for (int e = 0; e < elements; e++) {
                Named name = new Named("element " + e);
                switch (random.nextInt(4)) {
                    case 0 ->
                        pass.series(
                                Impedance.capacitance(
                                        logUniform(random, 1e-10, 1e-5),
                                        logUniform(random, 1e-4, 0.1),
                                        logUniform(random, 0.01, 10.0)),
                                name,
                                ROOM_KELVIN);
                    case 1 -> pass.series(Impedance.resistance(logUniform(random, 1.0, 1e5)), name, ROOM_KELVIN);
                    case 2 -> pass.shunt(Impedance.resistance(logUniform(random, 10.0, 1e7)), name, ROOM_KELVIN);
                    default -> pass.stepUp(logUniform(random, 0.1, 10.0));
                }
            }
            double[] total = new double[1];
            pass.total(total);
            Complex a = new Complex(pass.rowVoltageRe()[0], pass.rowVoltageIm()[0]);
            Complex output = new Complex(pass.rowCurrentRe()[0], pass.rowCurrentIm()[0]).divide(a);
            assertThat(total[0] / (a.abs() * a.abs()))
                    .isCloseTo(Thermal.voltsSquaredPerHertz(output.getReal(), ROOM_KELVIN), ALGEBRA);
        });
    }

    @Test
    void aUsedPassBeginsAfresh() {
        ChainPass pass = begun(600.0);
        pass.enterHalf();
        pass.series(Impedance.resistance(100.0), new Named("in a half"), ROOM_KELVIN);
        pass.beginBehind(Impedance.resistance(600.0));
        assertThat(pass.generatorCount()).isZero();
        assertThat(pass.generators()).isEmpty();
        pass.series(Impedance.resistance(100.0), new Named("in no half"), ROOM_KELVIN);
        assertThat(pass.power(0)[0]).isCloseTo(Thermal.voltsSquaredPerHertz(100.0, ROOM_KELVIN), FEW_ROUNDINGS);
        assertThat(pass.generators()).containsExactly(new Named("in no half"));
    }
}
