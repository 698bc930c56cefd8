package org.modewright.ui.modes;

import java.util.stream.Collectors;
import org.eclipse.osgi.util.NLS;
import org.modewright.audit.AuditResult;
import org.modewright.audit.AuditStatus;
import org.modewright.audit.Verdict;
import org.modewright.modal.ModalResult;
import org.modewright.ui.widgets.Numbers;
import org.modewright.ui.widgets.SentenceBar.Sign;

/** Whether the modes are enough, in a sentence a direction, with the sign that goes with it. */
public final class CaptureSentence {

    private CaptureSentence() {
    }

    /** Such as "X: 91.2 % by mode 7, enough. Y: 84.1 % by mode 60, 5.9 % short: about 25 modes more, or add the static correction." */
    public static String of(AuditResult audit) {
        if (audit.status() == AuditStatus.UNSTABLE || audit.status() == AuditStatus.INCOMPLETE) {
            return audit.summary();
        }
        if (audit.modal().modes().isEmpty()) {
            return Messages.Capture_noModes;
        }
        boolean allPass = audit.verdicts().stream().allMatch(Verdict::pass);
        return audit.verdicts().stream().map(verdict -> of(verdict, audit.modal())).collect(Collectors.joining(allPass ? " " : "\n"));
    }

    private static String of(Verdict verdict, ModalResult modal) {
        String direction = verdict.direction().label();
        String name = Character.toUpperCase(direction.charAt(0)) + direction.substring(1);
        if (verdict.pass()) {
            double reached = modal.running(verdict.direction())[verdict.reachedAtMode() - 1];
            return NLS.bind(Messages.Capture_enough, new Object[] {name, Numbers.percent(reached), verdict.reachedAtMode()});
        }
        String remedy = verdict.moreModes() > 0
                ? NLS.bind(Messages.Capture_moreModes, Numbers.counted(verdict.moreModes(), Messages.Capture_modeMore,
                        Messages.Capture_modesMore))
                : Messages.Capture_moreUnknown;
        return NLS.bind(Messages.Capture_short,
                new Object[] {name, Numbers.percent(verdict.captured()), modal.modes().size(), Numbers.percent(-verdict.margin()), remedy});
    }

    /** The sign before it. */
    public static Sign sign(AuditResult audit) {
        return switch (audit.status()) {
            case PASSED -> Sign.PASSED;
            case NOT_PASSED -> Sign.FAILED;
            case UNSTABLE, INCOMPLETE -> Sign.ERROR;
        };
    }
}
