package org.modewright.ui.modes;

import java.util.stream.Collectors;
import org.modewright.audit.AuditResult;
import org.modewright.audit.AuditStatus;
import org.modewright.audit.Verdict;
import org.modewright.ui.widgets.SentenceBar.Sign;

/** Whether the modes are enough, in a sentence a direction, with the sign that goes with it. */
final class CaptureSentence {

    private CaptureSentence() {
    }

    static String of(AuditResult audit) {
        if (audit.status() == AuditStatus.UNSTABLE || audit.status() == AuditStatus.INCOMPLETE) {
            return audit.summary();
        }
        if (audit.modal().modes().isEmpty()) {
            return Messages.Capture_noModes;
        }
        return audit.verdicts().stream().map(Verdict::text).collect(Collectors.joining("\n"));
    }

    static Sign sign(AuditResult audit) {
        return switch (audit.status()) {
            case PASSED -> Sign.PASSED;
            case NOT_PASSED -> Sign.FAILED;
            case UNSTABLE, INCOMPLETE -> Sign.ERROR;
        };
    }
}
