package hissledger.choose;

import hissledger.circuit.PathElement;
import hissledger.circuit.StagePlan;
import hissledger.device.Device;
import java.util.List;

/**
 * One way to build the active stage.
 *
 * @param name its name, unique in the scenario
 * @param device the active device
 * @param plan arrangement, devices in parallel and the parts around
 * @param current quiescent current of each device
 * @param path passive elements of its own, after those that all candidates share
 * @param open values that a search may choose; other verbs take them as they stand
 */
public record Candidate(
        String name,
        Device device,
        StagePlan plan,
        CurrentChoice current,
        List<PathElement> path,
        List<OpenValue> open) {
    public Candidate {
        path = List.copyOf(path);
        open = List.copyOf(open);
    }

    /** A candidate in which nothing but perhaps the current is open. */
    public Candidate(String name, Device device, StagePlan plan, CurrentChoice current, List<PathElement> path) {
        this(name, device, plan, current, path, List.of());
    }
}
