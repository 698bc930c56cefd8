package org.modewright.audit.detect;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.modewright.audit.Finding;
import org.modewright.audit.Severity;
import org.modewright.fem.NodePoint;
import org.modewright.fem.Snapshot;
import org.modewright.modal.Connectivity;
import org.modewright.modal.Figures;

/** Nodes that no element and no constraint uses: harmless without mass, unstable with it unless they are held. */
public final class UnusedNodes {

    /** Id of the finding about nodes without mass, and about nodes that are held. */
    public static final String UNUSED = "unused-node";
    /** Id of the finding about masses that nothing holds. */
    public static final String MASS = "mass-without-stiffness";

    private final Snapshot snapshot;
    private final Connectivity connectivity;

    /** In a model with its connectivity. */
    public UnusedNodes(Snapshot snapshot, Connectivity connectivity) {
        this.snapshot = snapshot;
        this.connectivity = connectivity;
    }

    /** At most one finding of each kind. */
    public List<Finding> find() {
        HeldMasses masses = new HeldMasses(snapshot);
        int[] unused = IntStream.range(0, snapshot.nodes().size()).filter(node -> isUnused(node)).toArray();
        int[] heavy = IntStream.of(unused).filter(node -> masses.at(node) > 0 && !isHeld(node)).toArray();
        int[] idle = IntStream.of(unused).filter(node -> masses.at(node) == 0).toArray();
        List<Finding> findings = new ArrayList<>();
        List<NodePoint> points = snapshot.nodes();
        if (heavy.length > 0) {
            double total = IntStream.of(heavy).mapToDouble(masses::at).sum();
            findings.add(new Finding(MASS, Severity.ERROR, Refs.nodes(heavy, points), "There is mass (" + Figures.significant(total, 4)
                    + " kg) at " + subject(heavy, points) + ", where no element and no support gives it stiffness.",
                    "Connect the " + (heavy.length == 1 ? "node" : "nodes") + " to the structure, or move the mass to a node of it."));
        }
        if (idle.length > 0) {
            findings.add(new Finding(UNUSED, Severity.INFO, Refs.nodes(idle, points), "No element uses " + subject(idle, points)
                    + ", and there is no mass there; the modes do not change by it.",
                    "Delete " + (idle.length == 1 ? "it" : "them") + ", or draw the missing elements."));
        }
        return findings;
    }

    private boolean isUnused(int node) {
        return !connectivity.isUsed(node);
    }

    private boolean isHeld(int node) {
        return connectivity.meetsSupport(connectivity.partOf(node));
    }

    private static String subject(int[] nodes, List<NodePoint> points) {
        return (nodes.length == 1 ? "node " : nodes.length + " nodes: ") + Figures.list(Refs.names(nodes, points));
    }
}
