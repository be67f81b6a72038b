package hissledger.circuit;

import hissledger.device.NoiseKind;
import hissledger.device.NoiseSource;
import hissledger.twoport.Spectrum;

/** Names and sums of the excess noise of path resistors. */
final class Excess {
    private static final String SUFFIX = ", excess";

    private Excess() {}

    static NoiseSource source(String elementName) {
        return new NoiseSource(elementName + SUFFIX, NoiseKind.PATH_EXCESS);
    }

    /** The power of a generator that stands {@code times} over, or counts as a part of itself. */
    static Spectrum times(Spectrum each, double times) {
        return (frequencies, density) -> {
            each.fill(frequencies, density);
            for (int k = 0; k < frequencies.count(); k++) {
                density[k] *= times;
            }
        };
    }
}
