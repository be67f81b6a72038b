package hissledger.ledger;

import hissledger.circuit.FrontEnd;
import hissledger.circuit.Signal;
import hissledger.physics.Band;
import hissledger.physics.Constants;
import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The itemised account of one front end over one band.
 *
 * @param frontEnd what was computed
 * @param band over which band
 * @param weighting the weighting under which the entries are summed, shared and sorted
 * @param entries one an independent generator, largest first; their powers sum to the total
 * @param totals the sums
 * @param spots the account at single frequencies
 * @param spectrum EIN density against frequency
 * @param running noise from the lower edge up
 * @param headroom level of 1 % distortion; empty where the device law does not tell
 */
public record Ledger(
        FrontEnd frontEnd,
        Band band,
        Weighting weighting,
        List<Entry> entries,
        Totals totals,
        List<Spot> spots,
        NoiseSpectrum spectrum,
        List<Running> running,
        Optional<Headroom> headroom) {
    public Ledger {
        running = List.copyOf(running);
        entries = List.copyOf(entries);
        spots = List.copyOf(spots);
    }

    /** The largest entry that is not the source's own noise: what there is to improve. */
    public Entry dominating() {
        return entries.stream()
                .filter(entry -> !entry.source().equals(FrontEnd.SOURCE_NOISE))
                .findFirst()
                .orElseThrow(() -> new IllegalStateException("a front end without generators of its own"));
    }

    /**
     * A figure of merit: V rms for an EIN, dB for a noise figure, dB(A) SPL for an equivalent noise level.
     *
     * @return empty where the figure is not defined for this source
     */
    public OptionalDouble figure(Figure figure) {
        if (figure == Figure.NOISE_FIGURE) {
            return totals.noiseFigureDecibels();
        }
        if (figure == Figure.EQUIVALENT_NOISE_LEVEL) {
            return equivalentNoiseLevel();
        }
        return OptionalDouble.of(totals.ein(figure.weighting()));
    }

    /**
     * Equivalent noise level of a microphone, {@code 20 log10(EIN_A/(sensitivity · 20 µPa))}, dB(A) SPL; empty without a
     * sensitivity in V/Pa.
     */
    private OptionalDouble equivalentNoiseLevel() {
        Signal signal = frontEnd.source().signal();
        if (!signal.isAcoustic()) {
            return OptionalDouble.empty();
        }
        double pascals = totals.ein(Weighting.A) / signal.voltsPerUnit().getAsDouble();
        return OptionalDouble.of(Decibels.ofAmplitudeRatio(pascals / Constants.REFERENCE_SOUND_PRESSURE_PASCALS));
    }

    /** Signal-to-noise ratio of the reference level against the EIN as measured, dB; empty without a reference level. */
    public OptionalDouble signalToNoiseDecibels(Weighting weighting) {
        OptionalDouble reference = frontEnd.source().signal().referenceVolts();
        return reference.isPresent()
                ? OptionalDouble.of(
                        Decibels.ofAmplitudeRatio(reference.getAsDouble() / totals.einAsMeasured(weighting)))
                : OptionalDouble.empty();
    }
}
