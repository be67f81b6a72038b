package hissledger.physics;

/**
 * Frequency weightings. Each gives the power gain |W(f)|², dimensionless, normalised to 1 at 1 kHz unless said otherwise.
 */
public enum Weighting {
    /** No weighting: 1 at every frequency. */
    FLAT("flat") {
        @Override
        public double powerGain(double hertz) {
            return 1.0;
        }
    },

    /**
     * A-weighting of IEC 61672-1 in its analytic form, normalised to exactly 1 at 1 kHz:
     * {@code A(f) ∝ f₄² f⁴ / [(f²+f₁²) √(f²+f₂²) √(f²+f₃²) (f²+f₄²)]}.
     */
    A("A") {
        @Override
        public double powerGain(double hertz) {
            double ratio = aWeightingUnscaled(hertz) / A_AT_ONE_KILOHERTZ;
            return ratio * ratio;
        }
    },

    /**
     * The gain curve of ITU-R BS.468-4, Table 1, from the poles and zero of its network, normalised to +12.2 dB at
     * 6.3 kHz (the Recommendation's reference point; 1 kHz then reads −0.017 dB). With rms detection it is <em>not</em>
     * a quasi-peak reading, and it is so labelled wherever it is printed.
     */
    ITU_468("ITU-R BS.468 gain, rms detection") {
        @Override
        public double powerGain(double hertz) {
            return ITU_468_SCALE * itu468Unscaled(hertz);
        }
    },

    /**
     * Disc playback equalisation of IEC 60098 with time constants 3180, 318 and 75 µs, normalised at 1 kHz:
     * {@code |W|² ∝ (1+(ωt₂)²) / [(1+(ωt₁)²)(1+(ωt₃)²)]}.
     */
    PLAYBACK("playback equalisation") {
        @Override
        public double powerGain(double hertz) {
            return playbackUnscaled(hertz) / playbackUnscaled(ONE_KILOHERTZ);
        }
    },

    /** Playback equalisation followed by A-weighting. */
    PLAYBACK_A("playback equalisation + A") {
        @Override
        public double powerGain(double hertz) {
            return PLAYBACK.powerGain(hertz) * A.powerGain(hertz);
        }
    };

    private static final double ONE_KILOHERTZ = 1000.0;

    /*
     * Pole frequencies of the A network, Hz. IEC 61672-1 constructs them from fr = 1000 Hz, fL = 10^1.5 Hz,
     * fH = 10^3.9 Hz, fA = 10^2.45 Hz and D² = 1/2.
     */
    private static final double A_POLE_1_HERTZ = 20.598997;
    private static final double A_POLE_2_HERTZ = 107.652649;
    private static final double A_POLE_3_HERTZ = 737.862231;
    private static final double A_POLE_4_HERTZ = 12194.217148;
    private static final double A_AT_ONE_KILOHERTZ = aWeightingUnscaled(ONE_KILOHERTZ);

    /* Poles of the BS.468-4 network, rad/s (real poles, and the real and imaginary parts of two conjugate pairs). */
    private static final double ITU_REAL_POLE_1 = -25903.70104781628;
    private static final double ITU_REAL_POLE_2 = -62675.1700584679;
    private static final double ITU_PAIR_1_REAL = -23615.53521363528;
    private static final double ITU_PAIR_1_IMAGINARY = 36379.90893732929;
    private static final double ITU_PAIR_2_REAL = -18743.74669072136;
    private static final double ITU_PAIR_2_IMAGINARY = 62460.15645250649;
    private static final double ITU_REFERENCE_HERTZ = 6300.0;
    private static final double ITU_REFERENCE_DECIBELS = 12.2;
    private static final double ITU_468_SCALE =
            Decibels.toPowerRatio(ITU_REFERENCE_DECIBELS) / itu468Unscaled(ITU_REFERENCE_HERTZ);

    private static final double PLAYBACK_BASS_SECONDS = 3180e-6;
    private static final double PLAYBACK_TURNOVER_SECONDS = 318e-6;
    private static final double PLAYBACK_TREBLE_SECONDS = 75e-6;

    private final String label;

    Weighting(String label) {
        this.label = label;
    }

    /** The words a result prints for this weighting. */
    public String label() {
        return label;
    }

    /**
     * The power gain |W(f)|² of the weighting.
     *
     * @param hertz frequency f, Hz; &gt; 0
     * @return dimensionless, ≥ 0
     */
    public abstract double powerGain(double hertz);

    private static double aWeightingUnscaled(double hertz) {
        double square = hertz * hertz;
        double pole1 = square + A_POLE_1_HERTZ * A_POLE_1_HERTZ;
        double pole2 = square + A_POLE_2_HERTZ * A_POLE_2_HERTZ;
        double pole3 = square + A_POLE_3_HERTZ * A_POLE_3_HERTZ;
        double pole4 = square + A_POLE_4_HERTZ * A_POLE_4_HERTZ;
        return square * square / (pole1 * Math.sqrt(pole2 * pole3) * pole4);
    }

    /** |H(jω)|² of one zero at the origin, two real poles and two pole pairs. */
    private static double itu468Unscaled(double hertz) {
        double omega = 2.0 * Math.PI * hertz;
        double numerator = omega * omega;
        double denominator = distanceSquared(omega, ITU_REAL_POLE_1, 0.0)
                * distanceSquared(omega, ITU_REAL_POLE_2, 0.0)
                * distanceSquared(omega, ITU_PAIR_1_REAL, ITU_PAIR_1_IMAGINARY)
                * distanceSquared(omega, ITU_PAIR_1_REAL, -ITU_PAIR_1_IMAGINARY)
                * distanceSquared(omega, ITU_PAIR_2_REAL, ITU_PAIR_2_IMAGINARY)
                * distanceSquared(omega, ITU_PAIR_2_REAL, -ITU_PAIR_2_IMAGINARY);
        return numerator / denominator;
    }

    /** |jω − p|² for the pole p = real + j imaginary, (rad/s)². */
    private static double distanceSquared(double omega, double real, double imaginary) {
        return real * real + (omega - imaginary) * (omega - imaginary);
    }

    private static double playbackUnscaled(double hertz) {
        double omega = 2.0 * Math.PI * hertz;
        return (1.0 + square(omega * PLAYBACK_TURNOVER_SECONDS))
                / ((1.0 + square(omega * PLAYBACK_BASS_SECONDS)) * (1.0 + square(omega * PLAYBACK_TREBLE_SECONDS)));
    }

    private static double square(double x) {
        return x * x;
    }
}
