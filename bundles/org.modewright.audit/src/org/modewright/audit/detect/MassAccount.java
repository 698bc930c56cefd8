package org.modewright.audit.detect;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.modewright.audit.AuditContext;
import org.modewright.audit.Finding;
import org.modewright.audit.FindingDetector;
import org.modewright.audit.ObjectRef;
import org.modewright.audit.Severity;
import org.modewright.fem.MassLedger;
import org.modewright.modal.Direction;
import org.modewright.modal.Figures;

/** What the mass ledger shows: nothing that can move, much on supports, mass in that is not mass out. */
final class MassAccount implements FindingDetector {

    static final String NO_MASS = "no-mass";
    static final String ON_SUPPORTS = "mass-on-supports";
    static final String BALANCE = "mass-balance";

    @Override
    public List<Finding> detect(AuditContext context) {
        List<Finding> findings = new ArrayList<>();
        withoutMass(context, findings);
        onSupports(context, findings);
        balance(context, findings);
        return findings;
    }

    private static void withoutMass(AuditContext context, List<Finding> findings) {
        Set<Direction> judged = context.request().directions();
        List<Direction> without = judged.stream().filter(direction -> !context.modal().hasMass(direction)).toList();
        if (without.isEmpty()) {
            return;
        }
        List<ObjectRef> objects = without.stream().map(Refs::direction).toList();
        String labels = String.join(" and ", without.stream().map(Direction::label).toList());
        if (without.size() == judged.size()) {
            findings.add(new Finding(NO_MASS, Severity.ERROR, objects, "No mass can move in " + labels + ", so nothing can be judged.",
                    "Give the materials a density, add nodal masses or gravity loads with a factor in the mass rule, or free a support."));
        } else {
            findings.add(new Finding(NO_MASS, Severity.INFO, objects, "No mass can move in " + labels + "; that direction is not judged.",
                    "Nothing, if the model is meant to be plane; otherwise free the supports or add mass in that direction."));
        }
    }

    private static void onSupports(AuditContext context, List<Finding> findings) {
        MassLedger ledger = context.modal().mass();
        List<ObjectRef> objects = new ArrayList<>();
        List<String> shares = new ArrayList<>();
        for (Direction direction : context.request().directions()) {
            if (direction.isTranslation()) {
                int component = direction.ordinal();
                double total = ledger.movable()[component] + ledger.onSupports()[component];
                double share = total > 0 ? ledger.onSupports()[component] / total : 0;
                if (share > context.thresholds().massOnSupports() && ledger.movable()[component] > 0) {
                    objects.add(Refs.direction(direction));
                    shares.add(Figures.percent(share) + " in " + direction.label());
                }
            }
        }
        if (!objects.isEmpty()) {
            findings.add(new Finding(ON_SUPPORTS, Severity.INFO, objects,
                    "Much of the mass sits on supports and takes no part in any mode: "
                    + String.join(", ", shares) + ". Captured shares leave this mass out.",
                    "Add the held mass to the base shear by hand where the code asks for it, or divide the lowest members."));
        }
    }

    private static void balance(AuditContext context, List<Finding> findings) {
        double balance = context.modal().mass().balance();
        if (Math.abs(balance) > context.thresholds().massBalance()) {
            findings.add(new Finding(BALANCE, Severity.ERROR, List.of(), "The mass given and the mass in the matrices differ by "
                    + Figures.significant(100 * Math.abs(balance), 2) + " %, so some of it was lost or counted twice.",
                    "Compare the lines of the mass table with your own sums; look at ties and links that stretch when the structure moves"
                            + " as a rigid body."));
        }
    }
}
