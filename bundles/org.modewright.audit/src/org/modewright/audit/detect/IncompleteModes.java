package org.modewright.audit.detect;

import java.util.List;
import org.modewright.audit.AuditContext;
import org.modewright.audit.Finding;
import org.modewright.audit.FindingDetector;
import org.modewright.audit.Severity;
import org.modewright.modal.Certificate;
import org.modewright.modal.Figures;

/** A certificate that does not prove the modes complete. */
final class IncompleteModes implements FindingDetector {

    static final String ID = "incomplete-certificate";

    @Override
    public List<Finding> detect(AuditContext context) {
        Certificate certificate = context.modal().certificate();
        if (certificate.complete()) {
            return List.of();
        }
        String reason = certificate.counted() == certificate.found()
                ? "the modes are not accurate (worst residual " + Figures.scientific(certificate.worstResidual()) + ", worst orthogonality "
                        + Figures.scientific(certificate.worstOrthogonality()) + ")"
                : "the inertia count finds " + certificate.counted() + " eigenvalues below " + Figures.significant(certificate.belowHz(), 3)
                        + " Hz, the solver " + certificate.found();
        return List.of(new Finding(ID, Severity.ERROR, List.of(), "The modes are not proven complete: " + reason + ".",
                "Ask for another number of modes; check the model for stiffnesses that differ by more than twelve orders of magnitude."));
    }
}
