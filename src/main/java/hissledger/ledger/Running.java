package hissledger.ledger;

/**
 * The noise from the lower edge of the band up to a frequency.
 *
 * @param hertz the frequency, Hz
 * @param flatVolts flat EIN from the lower edge to it, V rms at the EMF
 * @param aWeightedVolts A-weighted EIN from the lower edge to it, V rms at the EMF
 */
public record Running(double hertz, double flatVolts, double aWeightedVolts) {}
