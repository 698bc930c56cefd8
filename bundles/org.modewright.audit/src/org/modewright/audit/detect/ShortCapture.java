package org.modewright.audit.detect;

import java.util.List;
import org.modewright.audit.AuditContext;
import org.modewright.audit.Finding;
import org.modewright.audit.FindingDetector;
import org.modewright.audit.Severity;
import org.modewright.audit.Verdict;

/** Every verdict that fails. */
final class ShortCapture implements FindingDetector {

    static final String ID = "capture-short";

    @Override
    public List<Finding> detect(AuditContext context) {
        return context.verdicts().stream().filter(verdict -> !verdict.pass()).map(ShortCapture::finding).toList();
    }

    private static Finding finding(Verdict verdict) {
        String remedy = verdict.moreModes() > 0 ? "Ask for about " + verdict.moreModes() + " modes more, or leave the number open."
                : "Ask for more modes, or leave the number open; look at what holds the missing mass.";
        return new Finding(ID, Severity.ERROR, List.of(Refs.direction(verdict.direction())), verdict.text(), remedy);
    }
}
