package hissledger.device;

import hissledger.physics.Require;

/**
 * A behavioural amplifier: equivalent input noise voltage and current with their flicker corners, and an input impedance
 * that is noiseless because its noise is part of the stated current noise.
 *
 * @param voltsPerRootHertz en, V/√Hz; ≥ 0
 * @param voltageCornerHertz corner of en², Hz; ≥ 0
 * @param ampsPerRootHertz in, A/√Hz; ≥ 0
 * @param currentCornerHertz corner of in², Hz; ≥ 0
 * @param inputOhms input resistance, Ω; &gt; 0, infinite for none
 * @param inputFarads input capacitance, F; ≥ 0
 */
public record AmplifierModel(
        double voltsPerRootHertz,
        double voltageCornerHertz,
        double ampsPerRootHertz,
        double currentCornerHertz,
        double inputOhms,
        double inputFarads) {
    public AmplifierModel {
        Require.notNegative("voltsPerRootHertz", voltsPerRootHertz, "V/√Hz");
        Require.notNegative("voltageCornerHertz", voltageCornerHertz, "Hz");
        Require.notNegative("ampsPerRootHertz", ampsPerRootHertz, "A/√Hz");
        Require.notNegative("currentCornerHertz", currentCornerHertz, "Hz");
        if (!(inputOhms > 0.0)) {
            throw new IllegalArgumentException("inputOhms must be > 0 Ω, was " + inputOhms);
        }
        Require.notNegative("inputFarads", inputFarads, "F");
    }
}
