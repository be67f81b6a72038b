package hissledger.circuit;

import hissledger.twoport.Impedance;

/** The transducer: an EMF behind an impedance whose real part makes thermal noise at the source's own temperature. */
public sealed interface Source permits ResistorSource, CoilSource, CapacitorSource, TableSource {
    /** Zs against frequency. */
    Impedance impedance();

    /** Temperature of the source, K. */
    double temperatureKelvin();

    /** What the source gives for its stimulus, where stated. */
    Signal signal();

    /**
     * The same kind of source with another resistance: the resistor itself, or the coil's DC resistance. Of a capacitor
     * nothing is left but a resistor of that value.
     *
     * @param ohms R, Ω; &gt; 0
     */
    Source withResistance(double ohms);
}
