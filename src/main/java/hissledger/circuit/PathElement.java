package hissledger.circuit;

import hissledger.twoport.ChainPass;
import java.util.List;

/** A passive element between the source and the active device. */
public sealed interface PathElement permits SeriesElement, ShuntElement, Transformer, Pad {
    /** The name of its entry. */
    String name();

    /** Lets the walk pass through the element. */
    void walk(ChainPass pass);

    /**
     * Enters what a noisy supply at its far end adds, where the element stands; nothing for most.
     *
     * @param pass the walk, standing at the element
     * @param path the whole path, other parts of which shunt the supply's noise to ground
     */
    default void walkSupply(ChainPass pass, List<PathElement> path) {}
}
