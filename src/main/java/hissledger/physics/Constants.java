package hissledger.physics;

/** Physical constants and the reference values that standards fix, each with its symbol, unit and issuing body. */
public final class Constants {
    private Constants() {}

    /** Boltzmann constant k = 1.380649e-23 J/K, exact (SI Brochure, 9th edition, 2019, BIPM). */
    public static final double BOLTZMANN_JOULES_PER_KELVIN = 1.380649e-23;

    /** Elementary charge q = 1.602176634e-19 C, exact (SI Brochure, 9th edition, 2019, BIPM). */
    public static final double ELEMENTARY_CHARGE_COULOMBS = 1.602176634e-19;

    /** Standard noise temperature T₀ = 290 K (IRE Standards on Electron Tubes: Definitions of Terms, 59 IRE 20.S1). */
    public static final double STANDARD_NOISE_TEMPERATURE_KELVIN = 290.0;

    /** The Celsius zero, 273.15 K, exact (SI Brochure, 9th edition, 2019, BIPM). */
    public static final double ZERO_CELSIUS_KELVIN = 273.15;

    /** 0 dBu: √0.6 V, the voltage of 1 mW in 600 Ω (IEC 60268-2, by secondary texts). */
    public static final double DBU_REFERENCE_VOLTS = Math.sqrt(0.6);

    /** Reference sound pressure 20 µPa of the sound pressure level in air (ISO 1683, by secondary texts). */
    public static final double REFERENCE_SOUND_PRESSURE_PASCALS = 20e-6;
}
