package hissledger.device;

import hissledger.physics.Require;
import java.util.OptionalDouble;

/**
 * Current gain at one collector current, as a sheet states it.
 *
 * @param currentAmps collector current, A; &gt; 0
 * @param min least current gain, dimensionless; &gt; 0
 * @param typical typical current gain
 * @param max greatest current gain
 */
public record GainPoint(double currentAmps, OptionalDouble min, OptionalDouble typical, OptionalDouble max) {
    public GainPoint {
        Require.positive("currentAmps", currentAmps, "A");
        double below = 0.0;
        for (OptionalDouble gain : new OptionalDouble[] {min, typical, max}) {
            if (gain.isPresent()) {
                Require.positive("currentGain", gain.getAsDouble(), "");
                if (gain.getAsDouble() < below) {
                    throw new IllegalArgumentException("min, typical and max of currentGain must not fall, but "
                            + gain.getAsDouble() + " follows " + below);
                }
                below = gain.getAsDouble();
            }
        }
        if (below == 0.0) {
            throw new IllegalArgumentException("a gain point needs at least one of min, typical and max");
        }
    }
}
