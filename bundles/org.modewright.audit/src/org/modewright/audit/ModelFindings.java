package org.modewright.audit;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.modewright.audit.detect.LooseParts;
import org.modewright.audit.detect.NearlyCoincidentNodes;
import org.modewright.audit.detect.UnusedNodes;
import org.modewright.fem.Snapshot;
import org.modewright.modal.Connectivity;

/** Findings that need no modes, quick enough to be sought while a model is edited. */
public final class ModelFindings {

    private ModelFindings() {
    }

    /**
     * What can be found in a model alone: loose parts, nodes that are nearly coincident and not joined, nodes that nothing uses, masses
     * that nothing holds. The gravest first.
     */
    public static List<Finding> of(Snapshot snapshot, Thresholds thresholds) {
        Connectivity connectivity = Connectivity.of(snapshot);
        List<Finding> findings = new ArrayList<>();
        findings.addAll(new LooseParts(snapshot, connectivity).find());
        findings.addAll(new UnusedNodes(snapshot, connectivity).find());
        findings.addAll(new NearlyCoincidentNodes(snapshot, thresholds.coincidence()).find());
        findings.sort(Comparator.comparing(Finding::severity));
        return findings;
    }
}
