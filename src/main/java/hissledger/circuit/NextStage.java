package hissledger.circuit;

import hissledger.device.NoiseKind;
import hissledger.device.NoiseSource;
import hissledger.physics.Require;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Spectrum;

/**
 * The amplifier after the active stage, by its equivalent input noise; one amplifier, across both outputs of a pair.
 *
 * @param voltsPerRootHertz voltage noise, V/√Hz; ≥ 0
 * @param voltageCornerHertz flicker corner of its square, Hz; ≥ 0
 * @param ampsPerRootHertz current noise, A/√Hz; ≥ 0
 * @param currentCornerHertz flicker corner of its square, Hz; ≥ 0
 */
public record NextStage(
        double voltsPerRootHertz, double voltageCornerHertz, double ampsPerRootHertz, double currentCornerHertz) {
    private static final NoiseSource VOLTAGE = NoiseSource.of(NoiseKind.NEXT_STAGE_VOLTAGE);
    private static final NoiseSource CURRENT = NoiseSource.of(NoiseKind.NEXT_STAGE_CURRENT);

    public NextStage {
        Require.notNegative("voltsPerRootHertz", voltsPerRootHertz, "V/√Hz");
        Require.notNegative("voltageCornerHertz", voltageCornerHertz, "Hz");
        Require.notNegative("ampsPerRootHertz", ampsPerRootHertz, "A/√Hz");
        Require.notNegative("currentCornerHertz", currentCornerHertz, "Hz");
    }

    /** Enters its two generators where it is connected. */
    public void walk(ChainPass pass) {
        if (voltsPerRootHertz > 0.0) {
            pass.seriesVoltage(
                    VOLTAGE, Spectrum.whiteWithCorner(voltsPerRootHertz * voltsPerRootHertz, voltageCornerHertz));
        }
        if (ampsPerRootHertz > 0.0) {
            pass.shuntCurrent(
                    CURRENT, Spectrum.whiteWithCorner(ampsPerRootHertz * ampsPerRootHertz, currentCornerHertz));
        }
    }
}
