package org.modewright.audit.detect;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.modewright.audit.AuditContext;
import org.modewright.audit.Finding;
import org.modewright.audit.FindingDetector;
import org.modewright.audit.ObjectRef;
import org.modewright.audit.Severity;
import org.modewright.fem.FrameElement;
import org.modewright.fem.NodePoint;
import org.modewright.modal.Connectivity;
import org.modewright.modal.Instability;

/** Mechanisms and indefinite stiffness. Parts without any support are the affair of {@link LooseParts} and {@link UnusedNodes}. */
final class Unstable implements FindingDetector {

    static final String MECHANISM = "mechanism";
    static final String INDEFINITE = "indefinite-stiffness";

    @Override
    public List<Finding> detect(AuditContext context) {
        if (context.modal().instabilities().isEmpty()) {
            return List.of();
        }
        Map<String, Integer> index = new HashMap<>();
        List<NodePoint> nodes = context.snapshot().nodes();
        for (int i = 0; i < nodes.size(); i++) {
            index.put(nodes.get(i).id(), i);
        }
        Connectivity connectivity = Connectivity.of(context.snapshot());
        List<Finding> findings = new ArrayList<>();
        for (Instability instability : context.modal().instabilities()) {
            int node = instability.nodeIds().isEmpty() ? -1 : index.get(instability.nodeIds().get(0));
            boolean loose = instability.kind() == Instability.Kind.FREE_PART && !connectivity.meetsSupport(connectivity.partOf(node));
            if (!loose) {
                findings.add(finding(instability, context));
            }
        }
        return findings;
    }

    private static Finding finding(Instability instability, AuditContext context) {
        List<ObjectRef> objects = new ArrayList<>();
        for (FrameElement member : context.snapshot().members()) {
            if (instability.elementIds().contains(member.id())) {
                objects.add(new ObjectRef("member", member.id(), member.name()));
            }
        }
        for (int i = 0; i < instability.nodeIds().size(); i++) {
            objects.add(new ObjectRef("node", instability.nodeIds().get(i), instability.nodeNames().get(i)));
        }
        String id = instability.kind() == Instability.Kind.INDEFINITE ? INDEFINITE : MECHANISM;
        return new Finding(id, Severity.ERROR, objects, instability.text(), instability.remedy());
    }
}
