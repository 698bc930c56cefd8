package org.modewright.modal;

import java.util.Optional;
import org.modewright.fem.LoadMass;
import org.modewright.fem.Snapshot;

/**
 * Says which load pattern makes a mass matrix indefinite. A consistent mass spares less for a negative load at a node than the node's share
 * of the mass, because the members beside it can move against it.
 */
final class NegativeLoads {

    private NegativeLoads() {
    }

    /** A sentence about the node from which a pattern takes most, and what to do; empty where no pattern takes mass away. */
    static Optional<String> sentence(Snapshot snapshot) {
        double least = 0;
        String worst = null;
        for (LoadMass load : snapshot.loadMasses()) {
            for (int i = 0; i < load.nodes().length; i++) {
                if (load.mass()[i] < least) {
                    least = load.mass()[i];
                    worst = "The loads of pattern " + load.pattern() + " take more mass from node "
                            + snapshot.nodes().get(load.nodes()[i]).name() + " (" + Figures.significant(least, 3).replace('-', '\u2212')
                            + " kg) than the consistent mass of its members can spare, so the mass matrix is indefinite. ";
                }
            }
        }
        return Optional.ofNullable(worst).map(text -> text
                + "Gravity loads count downwards positive: turn their sign, make the mass lumped, or set the mass factor of the pattern to 0.");
    }
}
