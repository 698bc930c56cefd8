package org.modewright.audit;

import java.util.List;
import org.modewright.fem.Assembly;
import org.modewright.fem.Snapshot;
import org.modewright.modal.ModalResult;

/**
 * What a detector may look at.
 *
 * @param snapshot the model
 * @param assembly its matrices
 * @param modal its modes
 * @param verdicts what the rule pack says of them
 * @param request what was asked, with the thresholds
 */
public record AuditContext(Snapshot snapshot, Assembly assembly, ModalResult modal, List<Verdict> verdicts, AuditRequest request) {

    public AuditContext {
        verdicts = List.copyOf(verdicts);
    }

    /** The limits of the findings. */
    public Thresholds thresholds() {
        return request.thresholds();
    }
}
