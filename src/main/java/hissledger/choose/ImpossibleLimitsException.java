package hissledger.choose;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;

/** The limits of a scenario leave a candidate no choice at all. */
public final class ImpossibleLimitsException extends IllegalArgumentException {
    private static final long serialVersionUID = 1L;

    private final EnumMap<Limits.Kind, Optional<Double>> relief;

    /**
     * Says what would help.
     *
     * @param relief every limit that is set, with the value that alone would leave a choice, three digits, in its unit; empty
     *     where relaxing it alone does not help
     */
    public ImpossibleLimitsException(Map<Limits.Kind, Optional<Double>> relief) {
        super("the limits " + relief.keySet() + " leave no choice");
        this.relief = new EnumMap<>(relief);
    }

    /** What would help, as constructed. */
    public Map<Limits.Kind, Optional<Double>> relief() {
        return new EnumMap<>(relief);
    }
}
