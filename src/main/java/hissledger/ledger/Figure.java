package hissledger.ledger;

import hissledger.physics.Weighting;
import java.util.Optional;

/** A figure of merit that a target may limit and a search may minimise. */
public enum Figure {
    /** EIN over the band, unweighted. */
    EIN_FLAT("einFlat", "EIN flat", "dBu", Weighting.FLAT),
    /** EIN over the band, A-weighted. */
    EIN_A("einA", "EIN A", "dBu", Weighting.A),
    /** EIN over the band with the ITU-R BS.468 gain curve and rms detection. */
    EIN_468("ein468", "EIN 468 gain, rms", "dBu", Weighting.ITU_468),
    /** EIN over the band with playback equalisation. */
    EIN_PLAYBACK("einPlayback", "EIN playback", "dBu", Weighting.PLAYBACK),
    /** EIN over the band with playback equalisation and A-weighting. */
    EIN_PLAYBACK_A("einPlaybackA", "EIN playback + A", "dBu", Weighting.PLAYBACK_A),
    /** Noise figure of the band, unweighted. */
    NOISE_FIGURE("noiseFigure", "NF of the band", "dB", Weighting.FLAT),
    /** Equivalent noise level of a microphone. */
    EQUIVALENT_NOISE_LEVEL("equivalentNoiseLevel", "equivalent noise level", "dB(A) SPL", Weighting.A);

    private final String key;
    private final String words;
    private final String unit;
    private final Weighting weighting;

    Figure(String key, String words, String unit, Weighting weighting) {
        this.key = key;
        this.words = words;
        this.unit = unit;
        this.weighting = weighting;
    }

    /** The key in files and results. */
    public String key() {
        return key;
    }

    /** The figure in words, for tables. */
    public String words() {
        return words;
    }

    /** The unit in which it is printed. */
    public String unit() {
        return unit;
    }

    /** The weighting under its integral. */
    public Weighting weighting() {
        return weighting;
    }

    /** Whether it is an equivalent input noise voltage. */
    public boolean isEin() {
        return this != NOISE_FIGURE && this != EQUIVALENT_NOISE_LEVEL;
    }

    /** The figure with this key. */
    public static Optional<Figure> ofKey(String key) {
        for (Figure figure : values()) {
            if (figure.key.equals(key)) {
                return Optional.of(figure);
            }
        }
        return Optional.empty();
    }
}
