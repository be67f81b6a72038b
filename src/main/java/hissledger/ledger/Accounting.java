package hissledger.ledger;

import hissledger.circuit.FrontEnd;
import hissledger.device.NoiseSource;
import hissledger.physics.Band;
import hissledger.physics.Constants;
import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Frequencies;
import hissledger.twoport.Generator;
import hissledger.twoport.NoiseParameters;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

/** Draws up the account of a front end. */
public final class Accounting {
    /** Upper edge of the low band, which is accounted for apart: flicker noise lives there, Hz. */
    public static final double LOW_BAND_TO_HERTZ = 200.0;

    /** Frequency to which a bench refers its gain, Hz. */
    public static final double REFERENCE_HERTZ = 1000.0;

    /** Points of the printed spectrum. */
    public static final int SPECTRUM_POINTS = 240;

    /** {@link #LOW_BAND_TO_HERTZ} is one of them. */
    private static final double[] STEPS_OF_A_DECADE = {1.0, 2.0, 5.0};

    private Accounting() {}

    /**
     * The account of a front end, its entries over the flat band.
     *
     * @param frontEnd the front end
     * @param band the band of its sums
     * @param spotsHertz frequencies at which densities are wanted, Hz
     */
    public static Ledger of(FrontEnd frontEnd, Band band, List<Double> spotsHertz) {
        return of(frontEnd, band, spotsHertz, Weighting.FLAT);
    }

    /**
     * The account of a front end.
     *
     * @param frontEnd the front end
     * @param band the band of its sums
     * @param spotsHertz frequencies at which densities are wanted, Hz
     * @param weighting the weighting under which entries are summed, shared and sorted
     */
    public static Ledger of(FrontEnd frontEnd, Band band, List<Double> spotsHertz, Weighting weighting) {
        double[] steps = steps(band);
        BandWalk walk = BandWalk.over(frontEnd, band, steps);
        walk.walk(frontEnd);
        SpotWalk spots = SpotWalk.of(frontEnd, spotsHertz);
        List<Entry> entries = entries(walk, band, spots, weighting);
        Totals totals = totals(frontEnd, walk, band);
        return new Ledger(
                frontEnd,
                band,
                weighting,
                entries,
                totals,
                spots.spots(),
                spectrum(frontEnd, band),
                running(walk, band, steps),
                Headroom.of(frontEnd, totals.ein(Weighting.FLAT)));
    }

    /** The frequencies 1, 2 and 5 of every decade inside a band, where its sums are split, Hz. */
    private static double[] steps(Band band) {
        List<Double> steps = new ArrayList<>();
        int first = (int) Math.floor(Math.log10(band.fromHertz()));
        int last = (int) Math.ceil(Math.log10(band.toHertz()));
        for (int decade = first; decade <= last; decade++) {
            for (double digit : STEPS_OF_A_DECADE) {
                double hertz = digit * Math.pow(10.0, decade);
                if (hertz > band.fromHertz() && hertz < band.toHertz()) {
                    steps.add(hertz);
                }
            }
        }
        return steps.stream().mapToDouble(Double::doubleValue).toArray();
    }

    private static List<Running> running(BandWalk walk, Band band, double[] steps) {
        List<Running> running = new ArrayList<>();
        for (double hertz : steps) {
            running.add(running(walk, hertz, hertz));
        }
        running.add(running(walk, band.toHertz(), Double.POSITIVE_INFINITY));
        return running;
    }

    private static Running running(BandWalk walk, double hertz, double limitHertz) {
        return new Running(
                hertz,
                Math.sqrt(walk.einBelowVoltsSquared(Weighting.FLAT, limitHertz)),
                Math.sqrt(walk.einBelowVoltsSquared(Weighting.A, limitHertz)));
    }

    private static List<Entry> entries(BandWalk walk, Band band, SpotWalk spots, Weighting weighting) {
        List<Generator> generators = walk.pass().generators();
        double[] powers = new double[generators.size()];
        double total = 0.0;
        for (int g = 0; g < powers.length; g++) {
            powers[g] = walk.powerVoltsSquared(g, weighting);
            total += powers[g];
        }
        List<Entry> entries = new ArrayList<>();
        for (int g = 0; g < powers.length; g++) {
            if (powers[g] == 0.0 && !generators.get(g).equals(FrontEnd.SOURCE_NOISE)) {
                continue; // a part without losses has no thermal noise, so it has no line in the account
            }
            double low = band.fromHertz() < LOW_BAND_TO_HERTZ
                    ? walk.powerBelowVoltsSquared(g, weighting, LOW_BAND_TO_HERTZ)
                    : 0.0;
            entries.add(new Entry(
                    (NoiseSource) generators.get(g),
                    powers[g],
                    low,
                    powers[g] / total,
                    Decibels.ofPowerRatio(total / (total - powers[g])),
                    spots.densities(g)));
        }
        entries.sort(Comparator.comparingDouble(Entry::bandVoltsSquared).reversed());
        return entries;
    }

    private static Totals totals(FrontEnd frontEnd, BandWalk walk, Band band) {
        Map<Weighting, Double> ein = new EnumMap<>(Weighting.class);
        Map<Weighting, Double> measured = new EnumMap<>(Weighting.class);
        Map<Weighting, Double> floor = new EnumMap<>(Weighting.class);
        double reference = BandWalk.responseSquared(frontEnd, Frequencies.of(REFERENCE_HERTZ))[0];
        double[] response = BandWalk.responseSquared(frontEnd, walk.pass().frequencies());
        for (int k = 0; k < response.length; k++) {
            response[k] /= reference;
        }
        for (Weighting weighting : Weighting.values()) {
            ein.put(weighting, Math.sqrt(walk.einVoltsSquared(weighting)));
            measured.put(weighting, Math.sqrt(walk.einVoltsSquared(weighting, response)));
            floor.put(weighting, Math.sqrt(walk.powerVoltsSquared(0, weighting)));
        }
        double total = walk.einVoltsSquared(Weighting.FLAT);
        double source = walk.powerVoltsSquared(0, Weighting.FLAT);
        // NF refers to a source at T0: 4kT0 Re Zs = (4kTs Re Zs) T0/Ts
        double standard = source
                * Constants.STANDARD_NOISE_TEMPERATURE_KELVIN
                / frontEnd.source().temperatureKelvin();
        OptionalDouble noiseFigure = source > 0.0
                ? OptionalDouble.of(Decibels.ofPowerRatio(1.0 + (total - source) / standard))
                : OptionalDouble.empty();
        double lowBand = walk.einBelowVoltsSquared(Weighting.FLAT, LOW_BAND_TO_HERTZ);
        OptionalDouble low =
                band.fromHertz() < LOW_BAND_TO_HERTZ ? OptionalDouble.of(Math.sqrt(lowBand)) : OptionalDouble.empty();
        OptionalDouble mid = band.toHertz() > LOW_BAND_TO_HERTZ
                ? OptionalDouble.of(Math.sqrt(total - lowBand))
                : OptionalDouble.empty();
        return new Totals(ein, measured, floor, atTerminalsVolts(frontEnd, walk), low, mid, noiseFigure);
    }

    /**
     * Flat EIN at the loaded terminals of the source, V rms: EIN times |Vterminal/EMF| = |A/(A + Zs C)|, A and C being of
     * path and stage.
     */
    private static double atTerminalsVolts(FrontEnd frontEnd, BandWalk walk) {
        ChainPass loaded = new ChainPass(walk.pass().frequencies());
        loaded.beginBehind(frontEnd.source().impedance());
        frontEnd.walkLoading(loaded);
        ChainPass open = new ChainPass(walk.pass().frequencies());
        open.beginWith(1.0, 0.0, 0.0);
        frontEnd.walkLoading(open);
        double[] ratio = new double[loaded.frequencies().count()];
        for (int k = 0; k < ratio.length; k++) {
            ratio[k] = square(open.rowVoltageRe()[k], open.rowVoltageIm()[k])
                    / square(loaded.rowVoltageRe()[k], loaded.rowVoltageIm()[k]);
        }
        return Math.sqrt(walk.einVoltsSquared(Weighting.FLAT, ratio));
    }

    private static NoiseSpectrum spectrum(FrontEnd frontEnd, Band band) {
        double[] hertz = band.logarithmicHertz(SPECTRUM_POINTS);
        ChainPass pass = new ChainPass(Frequencies.of(hertz));
        frontEnd.walk(pass);
        double[] total = new double[hertz.length];
        pass.total(total);
        return new NoiseSpectrum(boxed(hertz), roots(total), roots(pass.power(0)));
    }

    private static List<Double> boxed(double[] values) {
        return Arrays.stream(values).boxed().toList();
    }

    static List<Double> roots(double[] squares) {
        return Arrays.stream(squares).map(Math::sqrt).boxed().toList();
    }

    private static double square(double re, double im) {
        return re * re + im * im;
    }

    /** The walks at single frequencies: entries, two-port noise parameters, gain and input admittance. */
    private static final class SpotWalk {
        private final FrontEnd frontEnd;
        private final Frequencies frequencies;
        private final int wanted;
        private final ChainPass behind;
        private final double[] total;

        private SpotWalk(FrontEnd frontEnd, List<Double> spotsHertz) {
            this.frontEnd = frontEnd;
            wanted = spotsHertz.size();
            frequencies = Frequencies.of(
                    spotsHertz.stream().mapToDouble(Double::doubleValue).toArray());
            behind = new ChainPass(frequencies);
            total = new double[wanted];
        }

        static SpotWalk of(FrontEnd frontEnd, List<Double> spotsHertz) {
            SpotWalk walk = new SpotWalk(frontEnd, spotsHertz);
            frontEnd.walk(walk.behind);
            walk.behind.total(walk.total);
            return walk;
        }

        List<Double> densities(int generator) {
            List<Double> densities = new ArrayList<>();
            for (int k = 0; k < wanted; k++) {
                densities.add(Math.sqrt(behind.power(generator)[k]));
            }
            return densities;
        }

        List<Spot> spots() {
            int n = frequencies.count();
            List<NoiseParameters> noise = NoiseParameters.of(frequencies, frontEnd::walkBehindSource);
            ChainPass voltage = new ChainPass(frequencies);
            voltage.beginWith(1.0, 0.0, 0.0);
            frontEnd.walkBehindSource(voltage);
            ChainPass current = new ChainPass(frequencies);
            current.beginWith(0.0, 1.0, 0.0);
            frontEnd.walkBehindSource(current);
            double[] sourceRe = new double[n];
            double[] sourceIm = new double[n];
            frontEnd.source().impedance().fill(frequencies, sourceRe, sourceIm);

            List<Spot> spots = new ArrayList<>();
            for (int k = 0; k < wanted; k++) {
                NoiseParameters parameters = noise.get(k);
                OptionalDouble noiseFigure = sourceRe[k] > 0.0
                        ? OptionalDouble.of(Decibels.ofPowerRatio(parameters.noiseFactor(sourceRe[k], sourceIm[k])))
                        : OptionalDouble.empty();
                double openSquare = square(voltage.rowVoltageRe()[k], voltage.rowVoltageIm()[k]);
                // Y_in = C/A
                double cRe = current.rowVoltageRe()[k];
                double cIm = current.rowVoltageIm()[k];
                double aRe = voltage.rowVoltageRe()[k];
                double aIm = voltage.rowVoltageIm()[k];
                spots.add(new Spot(
                        frequencies.hertz()[k],
                        Math.sqrt(total[k]),
                        Math.sqrt(behind.power(0)[k]),
                        sourceRe[k],
                        sourceIm[k],
                        noiseFigure,
                        parameters,
                        -Decibels.ofPowerRatio(square(behind.rowVoltageRe()[k], behind.rowVoltageIm()[k])),
                        (cRe * aRe + cIm * aIm) / openSquare,
                        (cIm * aRe - cRe * aIm) / openSquare));
            }
            return spots;
        }
    }
}
