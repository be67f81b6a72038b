package hissledger.ledger;

import hissledger.twoport.NoiseParameters;
import java.util.OptionalDouble;

/**
 * The account at one frequency.
 *
 * @param hertz frequency, Hz
 * @param einVoltsPerRootHertz EIN density including the source, V/√Hz at the EMF
 * @param sourceVoltsPerRootHertz the source's own thermal noise, V/√Hz
 * @param sourceOhms Re Zs, Ω
 * @param sourceReactanceOhms Im Zs, Ω
 * @param noiseFigureDecibels spot noise figure re T₀ = 290 K, dB; empty where Re Zs = 0
 * @param parameters en, in and correlation of path and stage as a two-port
 * @param gainDecibels voltage gain from the EMF to the stage's output, dB
 * @param inputSiemens Re of the input admittance of path and stage, S
 * @param inputSusceptanceSiemens Im of the input admittance of path and stage, S
 */
public record Spot(
        double hertz,
        double einVoltsPerRootHertz,
        double sourceVoltsPerRootHertz,
        double sourceOhms,
        double sourceReactanceOhms,
        OptionalDouble noiseFigureDecibels,
        NoiseParameters parameters,
        double gainDecibels,
        double inputSiemens,
        double inputSusceptanceSiemens) {
    /** Effective input noise temperature of path and stage with this source, K; empty where Re Zs = 0. */
    public OptionalDouble noiseTemperatureKelvin() {
        return sourceOhms > 0.0
                ? OptionalDouble.of(parameters.noiseTemperatureKelvin(sourceOhms, sourceReactanceOhms))
                : OptionalDouble.empty();
    }
}
