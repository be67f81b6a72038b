package hissledger.device;

import hissledger.twoport.Generator;

/**
 * One noise generator of a front end.
 *
 * @param name the name of its entry, unique within a front end
 * @param kind its physical kind
 */
public record NoiseSource(String name, NoiseKind kind) implements Generator {
    /** A generator named after its kind. */
    public static NoiseSource of(NoiseKind kind) {
        return new NoiseSource(kind.label(), kind);
    }
}
