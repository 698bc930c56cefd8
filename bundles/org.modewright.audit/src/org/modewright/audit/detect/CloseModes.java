package org.modewright.audit.detect;

import java.util.ArrayList;
import java.util.List;
import org.modewright.audit.AuditContext;
import org.modewright.audit.Finding;
import org.modewright.audit.FindingDetector;
import org.modewright.audit.Severity;
import org.modewright.audit.Words;
import org.modewright.modal.Direction;
import org.modewright.modal.Figures;
import org.modewright.modal.Mode;

/**
 * Modes with neighbouring frequencies that both take part in a direction. Their responses are correlated, so the square root of the sum of
 * squares (SRSS) is wrong for them; the complete quadratic combination (CQC) is right: E. L. Wilson, A. Der Kiureghian and E. P. Bayo,
 * A replacement for the SRSS method in seismic analysis, Earthquake Engineering and Structural Dynamics 9 (1981) 187-194.
 */
final class CloseModes implements FindingDetector {

    static final String ID = "close-modes";

    @Override
    public List<Finding> detect(AuditContext context) {
        List<Mode> modes = context.modal().modes().stream().filter(mode -> !mode.isUnstable()).toList();
        List<Finding> findings = new ArrayList<>();
        for (Direction direction : context.request().directions()) {
            List<Mode> taking = modes.stream().filter(mode -> takesPart(mode, direction, context)).toList();
            List<List<Mode>> groups = groups(taking, context.thresholds().closeModes());
            if (!groups.isEmpty()) {
                findings.add(finding(direction, groups, context.thresholds().closeModes()));
            }
        }
        return findings;
    }

    private static boolean takesPart(Mode mode, Direction direction, AuditContext context) {
        return mode.effectiveMassShare(direction) >= context.thresholds().significantMass();
    }

    /** Runs of modes each within the limit of the one before. */
    private static List<List<Mode>> groups(List<Mode> modes, double limit) {
        List<List<Mode>> groups = new ArrayList<>();
        List<Mode> run = new ArrayList<>();
        for (Mode mode : modes) {
            if (!run.isEmpty() && mode.frequency() > (1 + limit) * run.get(run.size() - 1).frequency()) {
                groups.add(run);
                run = new ArrayList<>();
            }
            run.add(mode);
        }
        groups.add(run);
        groups.removeIf(group -> group.size() < 2);
        return groups;
    }

    private static Finding finding(Direction direction, List<List<Mode>> groups, double limit) {
        List<String> words = new ArrayList<>();
        for (List<Mode> group : groups) {
            words.add(Words.numbers(group.stream().map(Mode::number).toList()) + " ("
                    + Figures.significant(group.get(0).frequency(), 4) + " to "
                    + Figures.significant(group.get(group.size() - 1).frequency(), 4) + " Hz)");
        }
        return new Finding(ID, Severity.INFO, groups.stream().flatMap(List::stream).map(Refs::mode).toList(),
                "In " + direction.label() + " these modes lie within " + Math.round(100 * limit) + " % of each other: "
                        + String.join("; ", words) + ". Their responses are correlated.",
                "Combine their responses by the complete quadratic combination (CQC), not by the square root of the sum of squares.");
    }
}
