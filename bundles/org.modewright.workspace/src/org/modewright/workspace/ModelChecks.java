package org.modewright.workspace;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.emf.ecore.EObject;
import org.modewright.audit.AuditRequest;
import org.modewright.audit.Finding;
import org.modewright.audit.ModelFindings;
import org.modewright.audit.ObjectRef;
import org.modewright.audit.Severity;
import org.modewright.fem.Snapshot;
import org.modewright.model.Defect;
import org.modewright.model.Names;
import org.modewright.model.WellFormedness;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.StructuralModel;

/** The checks of a model that need no modes, as findings: whether it can be computed, and what is suspicious about it. */
public final class ModelChecks {

    private ModelChecks() {
    }

    /** All findings of a model, defects first; the search for suspicious things is left out where defects forbid it. */
    public static List<Finding> check(StructuralModel model) {
        List<Defect> defects = WellFormedness.check(model);
        List<Finding> findings = new ArrayList<>();
        defects.forEach(defect -> findings.add(finding(defect)));
        if (WellFormedness.isComputable(defects)) {
            findings.addAll(ModelFindings.of(Snapshot.of(model), AuditRequest.of(model).thresholds()));
        }
        return findings;
    }

    private static Finding finding(Defect defect) {
        Severity severity = Severity.valueOf(defect.severity().name());
        return new Finding(defect.id(), severity, objects(defect.object()), defect.text(), defect.remedy());
    }

    private static List<ObjectRef> objects(EObject object) {
        for (EObject part = object; part != null; part = part.eContainer()) {
            if (part instanceof Identified identified && identified.getId() != null) {
                String name = identified.getName() == null ? identified.getId() : identified.getName();
                return List.of(new ObjectRef(Names.kind(part.eClass()), identified.getId(), name));
            }
        }
        return List.of();
    }
}
