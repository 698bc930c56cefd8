package org.modewright.audit.detect;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.modewright.audit.Finding;
import org.modewright.audit.ObjectRef;
import org.modewright.audit.Severity;
import org.modewright.fem.NodePoint;
import org.modewright.fem.Snapshot;
import org.modewright.fem.StructuralElement;
import org.modewright.modal.Connectivity;
import org.modewright.modal.Figures;

/** Parts with elements that no support, spring to ground or other part holds. */
public final class LooseParts {

    /** Id of the finding. */
    public static final String ID = "loose-part";

    private final Snapshot snapshot;
    private final Connectivity connectivity;

    /** In a model with its connectivity. */
    public LooseParts(Snapshot snapshot, Connectivity connectivity) {
        this.snapshot = snapshot;
        this.connectivity = connectivity;
    }

    /** One finding for each loose part. */
    public List<Finding> find() {
        Set<Integer> withElements = new HashSet<>();
        for (StructuralElement element : snapshot.elements()) {
            withElements.add(connectivity.partOf(element.nodes()[0]));
        }
        List<Finding> findings = new ArrayList<>();
        for (int part = 0; part < connectivity.parts().size(); part++) {
            if (!connectivity.meetsSupport(part) && withElements.contains(part)) {
                findings.add(finding(part));
            }
        }
        return findings;
    }

    private Finding finding(int part) {
        int[] nodes = connectivity.parts().get(part);
        List<NodePoint> points = snapshot.nodes();
        List<ObjectRef> objects = new ArrayList<>(elements(part));
        objects.addAll(Refs.nodes(nodes, points));
        boolean whole = nodes.length == points.size();
        String subject = (whole ? "The whole structure of " : "A part of ") + nodes.length + " nodes ("
                + Figures.list(Refs.names(nodes, points)) + ")";
        return new Finding(ID, Severity.ERROR, objects, subject + " is not connected to any support, so it can float away in X, Y and Z"
                + " and turn about each: its lowest modes lie at 0 Hz.", whole ? "Support the structure."
                        : "Join the part to the structure, support it, or delete it.");
    }

    private List<ObjectRef> elements(int part) {
        List<ObjectRef> elements = new ArrayList<>();
        for (StructuralElement element : snapshot.elements()) {
            if (connectivity.partOf(element.nodes()[0]) == part) {
                elements.add(new ObjectRef(element.kind().word(), element.id(), element.name()));
            }
        }
        return elements;
    }
}
