package org.modewright.audit.detect;

import java.util.List;
import org.modewright.audit.AuditContext;
import org.modewright.audit.Finding;
import org.modewright.audit.FindingDetector;
import org.modewright.audit.Severity;
import org.modewright.modal.Character;
import org.modewright.modal.Direction;
import org.modewright.modal.Figures;
import org.modewright.modal.Mode;

/** A structure whose first mode, local ones apart, is torsion. */
final class TorsionFirst implements FindingDetector {

    static final String ID = "torsion-first";

    @Override
    public List<Finding> detect(AuditContext context) {
        return context.modal().modes().stream().filter(mode -> !mode.isUnstable() && !mode.isLocal()).findFirst()
                .filter(mode -> mode.character().kind() == Character.Kind.TORSION).map(TorsionFirst::finding).map(List::of)
                .orElse(List.of());
    }

    private static Finding finding(Mode mode) {
        return new Finding(ID, Severity.WARNING, List.of(Refs.mode(mode)), "The structure's first mode (mode " + mode.number() + ", "
                + Figures.significant(mode.period(), 3) + " s) is " + mode.character().text() + ", with "
                + Figures.percent(mode.effectiveMassShare(Direction.RZ))
                + " of the spin inertia: it is weaker in torsion than in sway, and torsion governs its response.",
                "Move stiffness towards the perimeter, or bring the centres of mass and stiffness together; check that no bracing is"
                        + " missing on one side.");
    }
}
