package org.modewright.audit;

import java.util.List;
import java.util.Objects;
import org.modewright.modal.ModalResult;

/**
 * An audit's outcome.
 *
 * @param modal the modes
 * @param verdicts one for each direction judged
 * @param findings the gravest first
 * @param status how it ended
 * @param summary all in one sentence
 */
public record AuditResult(ModalResult modal, List<Verdict> verdicts, List<Finding> findings, AuditStatus status, String summary) {

    public AuditResult {
        Objects.requireNonNull(modal, "modal");
        verdicts = List.copyOf(verdicts);
        findings = List.copyOf(findings);
        Objects.requireNonNull(status, "status");
        Objects.requireNonNull(summary, "summary");
    }
}
