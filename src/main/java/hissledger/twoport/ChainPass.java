package hissledger.twoport;

import hissledger.physics.Thermal;
import java.util.ArrayList;
import java.util.List;

/**
 * One walk along a chain of noisy two-ports, from the source toward the output, at many frequencies at once.
 *
 * <p>Convention: {@code V1 = A V2 + B I2 + e} and {@code I1 = C V2 + D I2 + i}, where I2 leaves port 2. A generator with
 * the pair (e, i) at the port reached so far is referred to the beginning by the chain matrix M of everything before it,
 * and adds {@code S |e₀ + Zs i₀|²} to the equivalent input noise, with {@code (e₀, i₀) = M (e, i)}. The walk needs M only
 * in the product with the row (1, Zs), so it carries that row alone:
 *
 * <pre>
 *     (a, b) = (1, Zs) M          a generator (e, i) contributes S |a e + b i|²
 *     series Z, [1 Z; 0 1]:       b ← b + a Z        its thermal noise, pair (1, 0):  4kT Re Z |a|²
 *     shunt Y,  [1 0; Y 1]:       a ← a + b Y        its thermal noise, pair (0, 1):  4kT Re Y |b|²
 *     step-up 1:n, [1/n 0; 0 n]:  a ← a/n, b ← b n
 *     N cascaded two-ports:       the row passes through each in turn
 * </pre>
 *
 * <p>At the end of the walk 1/a is the gain from the source's EMF to the open output. A walk that starts from the row
 * (1, 0) gives equivalent voltages, one that starts from (0, 1) equivalent currents.
 *
 * <p>A three-terminal device is entered in steps: {@link #device}, then either {@link #commonLead} or {@link #follower},
 * then the noise of each of its generators ({@link #inputCurrent}, {@link #outputCurrent}, {@link #correlatedCurrents},
 * {@link #commonLeadVoltage}), then {@link #leaveDevice}.
 *
 * <p>The object owns all its arrays and is used again and again: a walk allocates nothing. It belongs to one thread.
 */
public final class ChainPass {
    private final Frequencies frequencies;
    private final int n;

    /* the row (a, b) */
    private final double[] aRe;
    private final double[] aIm;
    private final double[] bRe;
    private final double[] bIm;

    /* an impedance or admittance, and a spectrum, on their way into a law */
    private final double[] zRe;
    private final double[] zIm;
    private final double[] density;

    /* the device: admittances with its common lead, and the row seen by its generators */
    private final Matrix y;
    private final double[] inputRe;
    private final double[] inputIm;
    private final double[] outputRe;
    private final double[] outputIm;
    private final double[] leadRe;
    private final double[] leadIm;

    private final List<Generator> generators = new ArrayList<>();
    private final List<double[]> powers = new ArrayList<>();
    private int entered;
    /** How many times each generator counts: 2 between {@link #enterHalf} and {@link #leaveHalf}, else 1. */
    private double multiplicity = 1.0;

    /* the halves of an unequally driven pair */
    private final Row shared;
    private final Row between;
    private int firstOfHalf;
    /** Whether contributions add to those that the first half entered, and where the one under way will be added. */
    private boolean adding;

    private final double[] addend;
    private int pending = -1;

    /** A walk over the given frequencies. */
    public ChainPass(Frequencies frequencies) {
        this.frequencies = frequencies;
        n = frequencies.count();
        aRe = new double[n];
        aIm = new double[n];
        bRe = new double[n];
        bIm = new double[n];
        zRe = new double[n];
        zIm = new double[n];
        density = new double[n];
        y = new Matrix(n);
        inputRe = new double[n];
        inputIm = new double[n];
        outputRe = new double[n];
        outputIm = new double[n];
        leadRe = new double[n];
        leadIm = new double[n];
        shared = new Row(n);
        between = new Row(n);
        addend = new double[n];
    }

    /** The frequencies walked over. */
    public Frequencies frequencies() {
        return frequencies;
    }

    // ------------------------------------------------------------------------------------------------ beginning

    /** Begins a walk behind a source of impedance Zs: row (1, Zs); contributions are EMF densities, V²/Hz. */
    public void beginBehind(Impedance source) {
        begin();
        source.fill(frequencies, bRe, bIm);
        for (int k = 0; k < n; k++) {
            aRe[k] = 1.0;
            aIm[k] = 0.0;
        }
    }

    /**
     * Begins a walk from the same row (a, b) at every frequency: (1, 0) for equivalent voltages, (0, 1) for equivalent
     * currents.
     */
    public void beginWith(double rowVoltage, double rowCurrentRe, double rowCurrentIm) {
        begin();
        for (int k = 0; k < n; k++) {
            aRe[k] = rowVoltage;
            aIm[k] = 0.0;
            bRe[k] = rowCurrentRe;
            bIm[k] = rowCurrentIm;
        }
    }

    private void begin() {
        entered = 0;
        generators.clear();
        multiplicity = 1.0;
        adding = false;
        pending = -1;
    }

    // ---------------------------------------------------------------------------------------- passive two-ports

    /**
     * The thermal noise of the source itself, S = 4kT Re Zs at the EMF. To be called right after
     * {@link #beginBehind(Impedance)}, while the row still holds Zs.
     */
    public void sourceNoise(Generator thermal, double temperatureKelvin) {
        double fourKt = Thermal.fourKt(temperatureKelvin);
        double[] power = enter(thermal);
        for (int k = 0; k < n; k++) {
            power[k] = fourKt * bRe[k];
        }
    }

    /** Series impedance, [1 Z; 0 1], with thermal noise S = 4kT Re Z as the pair (1, 0). */
    public void series(Impedance impedance, Generator thermal, double temperatureKelvin) {
        impedance.fill(frequencies, zRe, zIm);
        double fourKt = Thermal.fourKt(temperatureKelvin) * multiplicity;
        double[] power = enter(thermal);
        for (int k = 0; k < n; k++) {
            double ar = aRe[k];
            double ai = aIm[k];
            double zr = zRe[k];
            double zi = zIm[k];
            power[k] = fourKt * zr * (ar * ar + ai * ai);
            bRe[k] += ar * zr - ai * zi;
            bIm[k] += ar * zi + ai * zr;
        }
    }

    /** Shunt admittance 1/Z, [1 0; Y 1], with thermal noise S = 4kT Re Y as the pair (0, 1). */
    public void shunt(Impedance impedance, Generator thermal, double temperatureKelvin) {
        impedance.fill(frequencies, zRe, zIm);
        double fourKt = Thermal.fourKt(temperatureKelvin) * multiplicity;
        double[] power = enter(thermal);
        for (int k = 0; k < n; k++) {
            double inverseSquare = 1.0 / (zRe[k] * zRe[k] + zIm[k] * zIm[k]);
            double yr = zRe[k] * inverseSquare;
            double yi = -zIm[k] * inverseSquare;
            double br = bRe[k];
            double bi = bIm[k];
            power[k] = fourKt * yr * (br * br + bi * bi);
            aRe[k] += br * yr - bi * yi;
            aIm[k] += br * yi + bi * yr;
        }
    }

    /** Noiseless shunt of a conductance and a capacitance, Y = G + jωC: an input that is no resistor. */
    public void noiselessShunt(double siemens, double farads) {
        double[] omega = frequencies.omega();
        for (int k = 0; k < n; k++) {
            double yi = omega[k] * farads;
            double br = bRe[k];
            double bi = bIm[k];
            aRe[k] += br * siemens - bi * yi;
            aIm[k] += br * yi + bi * siemens;
        }
    }

    /** Ideal step-up 1:n, [1/n 0; 0 n]; {@code ratio} is secondary over primary turns. */
    public void stepUp(double ratio) {
        double inverse = 1.0 / ratio;
        for (int k = 0; k < n; k++) {
            aRe[k] *= inverse;
            aIm[k] *= inverse;
            bRe[k] *= ratio;
            bIm[k] *= ratio;
        }
    }

    /** A voltage generator in series at this port, the pair (1, 0). */
    public void seriesVoltage(Generator generator, Spectrum spectrum) {
        spectrum.fill(frequencies, density);
        double[] power = enter(generator);
        for (int k = 0; k < n; k++) {
            power[k] = multiplicity * density[k] * (aRe[k] * aRe[k] + aIm[k] * aIm[k]);
        }
    }

    /** A current generator across this port, the pair (0, 1). */
    public void shuntCurrent(Generator generator, Spectrum spectrum) {
        spectrum.fill(frequencies, density);
        double[] power = enter(generator);
        for (int k = 0; k < n; k++) {
            power[k] = multiplicity * density[k] * (bRe[k] * bRe[k] + bIm[k] * bIm[k]);
        }
    }

    // -------------------------------------------------------------------------------------------- matched pairs

    /**
     * Enters one half of a matched pair driven between its two inputs. Seen as a whole the pair is 2B, C/2, e√2, i/√2 of
     * its half: with half the input voltage and the whole current the row becomes (a, b/2), and each generator counts
     * twice, once a half.
     */
    public void enterHalf() {
        multiplicity = 2.0;
        for (int k = 0; k < n; k++) {
            bRe[k] *= 0.5;
            bIm[k] *= 0.5;
        }
    }

    /** Leaves the half for the port between the two outputs: the row becomes (a, 2b) and generators count once. */
    public void leaveHalf() {
        multiplicity = 1.0;
        for (int k = 0; k < n; k++) {
            bRe[k] *= 2.0;
            bIm[k] *= 2.0;
        }
    }

    /**
     * Enters a pair on an ideal tail that is driven at one input only, Z1 being the source's side, (a, b) = (a, a Z1), and Z2
     * the other side's impedance. The thermal noise of Z2 is entered.
     *
     * <p>A generator (e, i) of the first half adds {@code |e + ½(Z1+Z2) i + ½(Z1−Z2) κ i|²}, its twin of the second half the
     * same with the sign of the last term turned, together {@code 2 |e + ½(Z1+Z2) i|² + 2 |½(Z1−Z2) κ i|²}. The first part
     * is that of a pair between the ends of Z1 + Z2, entered now; the second is what the tail lets pass of the current that
     * both inputs share, {@code κ = y21/(y11+y21)}, entered by {@link #enterSharedCurrent}. To be followed by the half, then
     * {@link #enterSharedCurrent}, the half's device again, and {@link #joinHalves}.
     */
    public void enterPair(Impedance other, Generator thermal, double temperatureKelvin) {
        other.fill(frequencies, zRe, zIm);
        double fourKt = Thermal.fourKt(temperatureKelvin);
        double[] power = enter(thermal);
        for (int k = 0; k < n; k++) {
            double ar = aRe[k];
            double ai = aIm[k];
            power[k] = fourKt * zRe[k] * (ar * ar + ai * ai);
            double otherRe = ar * zRe[k] - ai * zIm[k];
            double otherIm = ar * zIm[k] + ai * zRe[k];
            shared.aRe[k] = 0.0;
            shared.aIm[k] = 0.0;
            shared.bRe[k] = 0.5 * (bRe[k] - otherRe);
            shared.bIm[k] = 0.5 * (bIm[k] - otherIm);
            bRe[k] = 0.5 * (bRe[k] + otherRe);
            bIm[k] = 0.5 * (bIm[k] + otherIm);
        }
        multiplicity = 2.0;
        firstOfHalf = entered;
    }

    /** Enters the device of such a pair again with the row (0, ½(b1−b2)) of the current that both inputs share. */
    public void enterSharedCurrent() {
        between.copyFrom(aRe, aIm, bRe, bIm);
        shared.copyTo(aRe, aIm, bRe, bIm);
        entered = firstOfHalf;
        adding = true;
    }

    /** Leaves the pair for the port between its two outputs, with the row that the half led to. */
    public void joinHalves() {
        flush();
        adding = false;
        entered = generators.size();
        between.copyTo(aRe, aIm, bRe, bIm);
        leaveHalf();
    }

    // ------------------------------------------------------------------------------------ three-terminal devices

    /** Takes up a device: its admittances with the common lead grounded. */
    public void device(SmallSignal device) {
        if (device.shieldedFarads() > 0.0) {
            noiselessShunt(0.0, device.shieldedFarads());
        }
        y.set(device, frequencies);
    }

    /**
     * Puts an impedance Ze into the device's common lead. With p = −(y11+y12, y21+y22), r = −(y11+y21, y12+y22),
     * s = y11+y12+y21+y22 and f = Ze/(1+sZe): {@code y' = y − p r f}, {@code j' = j + p f (j1 + j2)}, and an EMF in Ze
     * gives {@code j = p/(1+sZe)}. Finite for Ze = 0 and for any Ze.
     *
     * <p>Short-circuit currents (j1, j2) drawn into the two terminals are the pair {@code e = −j2/y21},
     * {@code i = j1 − (y11/y21) j2}, so they reach the beginning as {@code a e + b i = b j1 − u j2} with
     * {@code u = (a + b y11)/y21}.
     */
    public void commonLead(Impedance lead) {
        lead.fill(frequencies, zRe, zIm);
        for (int k = 0; k < n; k++) {
            double y11Re = y.re11[k];
            double y11Im = y.im11[k];
            double y12Re = y.re12[k];
            double y12Im = y.im12[k];
            double y21Re = y.re21[k];
            double y21Im = y.im21[k];
            double y22Re = y.re22[k];
            double y22Im = y.im22[k];
            double zr = zRe[k];
            double zi = zIm[k];
            double p1Re = -(y11Re + y12Re);
            double p1Im = -(y11Im + y12Im);
            double p2Re = -(y21Re + y22Re);
            double p2Im = -(y21Im + y22Im);
            double r1Re = -(y11Re + y21Re);
            double r1Im = -(y11Im + y21Im);
            double r2Re = -(y12Re + y22Re);
            double r2Im = -(y12Im + y22Im);
            double sRe = -(p1Re + p2Re);
            double sIm = -(p1Im + p2Im);
            // d = 1/(1 + s Ze), f = Ze d
            double qRe = 1.0 + sRe * zr - sIm * zi;
            double qIm = sRe * zi + sIm * zr;
            double qSquare = 1.0 / (qRe * qRe + qIm * qIm);
            double dRe = qRe * qSquare;
            double dIm = -qIm * qSquare;
            double fRe = zr * dRe - zi * dIm;
            double fIm = zr * dIm + zi * dRe;
            double p1fRe = p1Re * fRe - p1Im * fIm;
            double p1fIm = p1Re * fIm + p1Im * fRe;
            double p2fRe = p2Re * fRe - p2Im * fIm;
            double p2fIm = p2Re * fIm + p2Im * fRe;
            // y' = y - p r f
            y11Re -= p1fRe * r1Re - p1fIm * r1Im;
            y11Im -= p1fRe * r1Im + p1fIm * r1Re;
            y12Re -= p1fRe * r2Re - p1fIm * r2Im;
            y12Im -= p1fRe * r2Im + p1fIm * r2Re;
            y21Re -= p2fRe * r1Re - p2fIm * r1Im;
            y21Im -= p2fRe * r1Im + p2fIm * r1Re;
            y22Re -= p2fRe * r2Re - p2fIm * r2Im;
            y22Im -= p2fRe * r2Im + p2fIm * r2Re;
            y.re11[k] = y11Re;
            y.im11[k] = y11Im;
            y.re12[k] = y12Re;
            y.im12[k] = y12Im;
            y.re21[k] = y21Re;
            y.im21[k] = y21Im;
            y.re22[k] = y22Re;
            y.im22[k] = y22Im;
            // u = (a + b y11)/y21
            double br = bRe[k];
            double bi = bIm[k];
            double tRe = aRe[k] + br * y11Re - bi * y11Im;
            double tIm = aIm[k] + br * y11Im + bi * y11Re;
            // a current that both inputs of a pair share finds y11 + y21 at the tail, and its return there
            double throughRe = adding ? y11Re + y21Re : y21Re;
            double throughIm = adding ? y11Im + y21Im : y21Im;
            double throughSquare = 1.0 / (throughRe * throughRe + throughIm * throughIm);
            double uRe = (tRe * throughRe + tIm * throughIm) * throughSquare;
            double uIm = (tIm * throughRe - tRe * throughIm) * throughSquare;
            if (adding) {
                br -= uRe;
                bi -= uIm;
            }
            // the lead's EMF: v = (b p1 - u p2)/(1 + s Ze); both terminals also feed the lead: t = v Ze
            double wRe = br * p1Re - bi * p1Im - (uRe * p2Re - uIm * p2Im);
            double wIm = br * p1Im + bi * p1Re - (uRe * p2Im + uIm * p2Re);
            double vRe = wRe * dRe - wIm * dIm;
            double vIm = wRe * dIm + wIm * dRe;
            double throughLeadRe = vRe * zr - vIm * zi;
            double throughLeadIm = vRe * zi + vIm * zr;
            leadRe[k] = vRe;
            leadIm[k] = vIm;
            inputRe[k] = br + throughLeadRe;
            inputIm[k] = bi + throughLeadIm;
            outputRe[k] = throughLeadRe - uRe;
            outputIm[k] = throughLeadIm - uIm;
            // u serves leaveDevice as well
            zRe[k] = uRe;
            zIm[k] = uIm;
        }
    }

    /**
     * Turns the device into a follower, port 2 at the emitter or source, collector or drain grounded:
     * {@code y' = [y11, −(y11+y12); −(y11+y21), s]}, {@code j' = (j1, −(j1+j2))}, so that (j1, j2) reach the beginning as
     * {@code b j1 + u (j1 + j2)}.
     */
    public void follower() {
        for (int k = 0; k < n; k++) {
            double y11Re = y.re11[k];
            double y11Im = y.im11[k];
            double turned12Re = -(y11Re + y.re12[k]);
            double turned12Im = -(y11Im + y.im12[k]);
            double turned21Re = -(y11Re + y.re21[k]);
            double turned21Im = -(y11Im + y.im21[k]);
            double sRe = -turned12Re + y.re21[k] + y.re22[k];
            double sIm = -turned12Im + y.im21[k] + y.im22[k];
            y.re12[k] = turned12Re;
            y.im12[k] = turned12Im;
            y.re21[k] = turned21Re;
            y.im21[k] = turned21Im;
            y.re22[k] = sRe;
            y.im22[k] = sIm;
            double br = bRe[k];
            double bi = bIm[k];
            double tRe = aRe[k] + br * y11Re - bi * y11Im;
            double tIm = aIm[k] + br * y11Im + bi * y11Re;
            double inverseSquare = 1.0 / (turned21Re * turned21Re + turned21Im * turned21Im);
            double uRe = (tRe * turned21Re + tIm * turned21Im) * inverseSquare;
            double uIm = (tIm * turned21Re - tRe * turned21Im) * inverseSquare;
            inputRe[k] = br + uRe;
            inputIm[k] = bi + uIm;
            outputRe[k] = uRe;
            outputIm[k] = uIm;
            leadRe[k] = 0.0;
            leadIm[k] = 0.0;
            zRe[k] = uRe;
            zIm[k] = uIm;
        }
    }

    /** A noise current drawn into the device's input terminal, j = (1, 0). */
    public void inputCurrent(Generator generator, Spectrum spectrum) {
        spectrum.fill(frequencies, density);
        double[] power = enter(generator);
        for (int k = 0; k < n; k++) {
            power[k] = multiplicity * density[k] * (inputRe[k] * inputRe[k] + inputIm[k] * inputIm[k]);
        }
    }

    /** A noise current drawn into the device's output terminal, j = (0, 1). */
    public void outputCurrent(Generator generator, Spectrum spectrum) {
        spectrum.fill(frequencies, density);
        double[] power = enter(generator);
        for (int k = 0; k < n; k++) {
            power[k] = multiplicity * density[k] * (outputRe[k] * outputRe[k] + outputIm[k] * outputIm[k]);
        }
    }

    /**
     * A noise current drawn into the output terminal that induces a proportional one at the input terminal,
     * {@code j = (jω τ, 1)}.
     *
     * @param inducedSeconds τ, s: the induced current is in quadrature and grows with ω
     */
    public void correlatedCurrents(Generator generator, Spectrum spectrum, double inducedSeconds) {
        spectrum.fill(frequencies, density);
        double[] omega = frequencies.omega();
        double[] power = enter(generator);
        for (int k = 0; k < n; k++) {
            double induced = omega[k] * inducedSeconds;
            double re = outputRe[k] - inputIm[k] * induced;
            double im = outputIm[k] + inputRe[k] * induced;
            power[k] = multiplicity * density[k] * (re * re + im * im);
        }
    }

    /** A noise voltage in the common lead, j = p/(1 + s Ze) per volt; nothing in a follower. */
    public void commonLeadVoltage(Generator generator, Spectrum spectrum) {
        spectrum.fill(frequencies, density);
        double[] power = enter(generator);
        for (int k = 0; k < n; k++) {
            power[k] = multiplicity * density[k] * (leadRe[k] * leadRe[k] + leadIm[k] * leadIm[k]);
        }
    }

    /**
     * Passes through the device: A = −y22/y21, B = −1/y21, C = y12 − y11 y22/y21, D = −y11/y21, which takes the row to
     * {@code (b y12 − u y22, −u)}.
     */
    public void leaveDevice() {
        for (int k = 0; k < n; k++) {
            double uRe = zRe[k];
            double uIm = zIm[k];
            double br = bRe[k];
            double bi = bIm[k];
            aRe[k] = br * y.re12[k] - bi * y.im12[k] - (uRe * y.re22[k] - uIm * y.im22[k]);
            aIm[k] = br * y.im12[k] + bi * y.re12[k] - (uRe * y.im22[k] + uIm * y.re22[k]);
            bRe[k] = -uRe;
            bIm[k] = -uIm;
        }
    }

    // ------------------------------------------------------------------------------------------------- results

    /** The generators met, in the order of the walk. */
    public List<Generator> generators() {
        return List.copyOf(generators);
    }

    /** How many generators were met. */
    public int generatorCount() {
        return entered;
    }

    /** The contribution of generator {@code index} at every frequency: the pass's own array, overwritten by the next walk. */
    public double[] power(int index) {
        return powers.get(index);
    }

    /** Writes the sum of all contributions at every frequency. */
    public void total(double[] sum) {
        for (int k = 0; k < n; k++) {
            sum[k] = 0.0;
        }
        for (int g = 0; g < entered; g++) {
            double[] power = powers.get(g);
            for (int k = 0; k < n; k++) {
                sum[k] += power[k];
            }
        }
    }

    /** Re a at the present port. */
    public double[] rowVoltageRe() {
        return aRe;
    }

    /** Im a at the present port. */
    public double[] rowVoltageIm() {
        return aIm;
    }

    /** Re b at the present port. */
    public double[] rowCurrentRe() {
        return bRe;
    }

    /** Im b at the present port. */
    public double[] rowCurrentIm() {
        return bIm;
    }

    /** The array that receives the contribution of the next generator. */
    private double[] enter(Generator generator) {
        if (adding) {
            flush();
            pending = entered++;
            return addend;
        }
        generators.add(generator);
        if (entered == powers.size()) {
            powers.add(new double[n]);
        }
        return powers.get(entered++);
    }

    /** Adds the second half's contribution under way to the first half's. */
    private void flush() {
        if (pending >= 0) {
            double[] power = powers.get(pending);
            for (int k = 0; k < n; k++) {
                power[k] += addend[k];
            }
            pending = -1;
        }
    }

    /** A row (a, b) kept aside. */
    private static final class Row {
        private final double[] aRe;
        private final double[] aIm;
        private final double[] bRe;
        private final double[] bIm;

        Row(int n) {
            aRe = new double[n];
            aIm = new double[n];
            bRe = new double[n];
            bIm = new double[n];
        }

        void copyFrom(double[] fromARe, double[] fromAIm, double[] fromBRe, double[] fromBIm) {
            System.arraycopy(fromARe, 0, aRe, 0, aRe.length);
            System.arraycopy(fromAIm, 0, aIm, 0, aIm.length);
            System.arraycopy(fromBRe, 0, bRe, 0, bRe.length);
            System.arraycopy(fromBIm, 0, bIm, 0, bIm.length);
        }

        void copyTo(double[] toARe, double[] toAIm, double[] toBRe, double[] toBIm) {
            System.arraycopy(aRe, 0, toARe, 0, aRe.length);
            System.arraycopy(aIm, 0, toAIm, 0, aIm.length);
            System.arraycopy(bRe, 0, toBRe, 0, bRe.length);
            System.arraycopy(bIm, 0, toBIm, 0, bIm.length);
        }
    }

    /** Four complex admittances by frequency. */
    private static final class Matrix {
        private final double[] re11;
        private final double[] im11;
        private final double[] re12;
        private final double[] im12;
        private final double[] re21;
        private final double[] im21;
        private final double[] re22;
        private final double[] im22;

        Matrix(int n) {
            re11 = new double[n];
            im11 = new double[n];
            re12 = new double[n];
            im12 = new double[n];
            re21 = new double[n];
            im21 = new double[n];
            re22 = new double[n];
            im22 = new double[n];
        }

        void set(SmallSignal device, Frequencies frequencies) {
            double[] omega = frequencies.omega();
            double input = device.inputFarads() + device.feedbackFarads();
            double feedback = device.feedbackFarads();
            for (int k = 0; k < omega.length; k++) {
                re11[k] = device.inputSiemens();
                im11[k] = omega[k] * input;
                re12[k] = 0.0;
                im12[k] = -omega[k] * feedback;
                re21[k] = device.transconductanceSiemens();
                im21[k] = -omega[k] * feedback;
                re22[k] = device.outputSiemens();
                im22[k] = omega[k] * feedback;
            }
        }
    }
}
