package org.modewright.audit.detect;

import java.util.List;
import java.util.TreeSet;
import org.modewright.audit.AuditContext;
import org.modewright.audit.Finding;
import org.modewright.audit.FindingDetector;
import org.modewright.audit.Severity;
import org.modewright.fem.DroppedMotion;
import org.modewright.modal.Connectivity;
import org.modewright.modal.Direction;
import org.modewright.modal.Figures;

/** Motions that have neither stiffness nor mass, at nodes that are used. */
final class DroppedMotions implements FindingDetector {

    static final String ID = "motion-dropped";

    @Override
    public List<Finding> detect(AuditContext context) {
        Connectivity connectivity = Connectivity.of(context.snapshot());
        TreeSet<Integer> nodes = new TreeSet<>();
        TreeSet<Direction> directions = new TreeSet<>();
        int count = 0;
        for (DroppedMotion motion : context.assembly().dropped()) {
            if (connectivity.isUsed(motion.node())) {
                count++;
                nodes.add(motion.node());
                directions.add(Direction.values()[motion.component()]);
            }
        }
        if (count == 0) {
            return List.of();
        }
        int[] indices = nodes.stream().mapToInt(Integer::intValue).toArray();
        String subject = indices.length == 1 ? "node " : indices.length + " nodes: ";
        return List.of(new Finding(ID, Severity.INFO, Refs.nodes(indices, context.snapshot().nodes()),
                (count == 1 ? "One motion has" : count + " motions have") + " neither stiffness nor mass and "
                        + (count == 1 ? "is" : "are") + " left out (" + Figures.list(directions.stream().map(Direction::label).toList())
                        + ") at " + subject + Figures.list(Refs.names(indices, context.snapshot().nodes())) + ".",
                "Nothing, if these are pin joints, which need not turn; otherwise connect the nodes in these directions."));
    }
}
