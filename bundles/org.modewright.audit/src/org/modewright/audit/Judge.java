package org.modewright.audit;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.modewright.audit.RulePack.Clause;
import org.modewright.modal.CaptureTarget;
import org.modewright.modal.Direction;
import org.modewright.modal.Figures;
import org.modewright.modal.ModalResult;

/**
 * Judges modes by a rule pack. How many more modes a direction needs is estimated from the missing share s(n) = 1 &minus; captured after n
 * modes: it is taken to go on falling as the power of n that joins s(n/2) and s(n).
 */
final class Judge {

    private static final int MOST = 100_000;

    private final ModalResult modal;
    private final RulePack pack;

    Judge(ModalResult modal, RulePack pack) {
        this.modal = modal;
        this.pack = pack;
    }

    /** One verdict for each clause and direction that has movable mass, in the order of the directions. */
    List<Verdict> judge(Iterable<Direction> directions) {
        List<Verdict> verdicts = new ArrayList<>();
        for (Clause clause : pack.clauses()) {
            for (Direction direction : directions) {
                if (modal.hasMass(direction)) {
                    verdicts.add(verdict(clause, direction));
                }
            }
        }
        return verdicts;
    }

    private Verdict verdict(Clause clause, Direction direction) {
        double[] running = modal.running(direction);
        double captured = running.length == 0 ? 0 : running[running.length - 1];
        CaptureTarget target = new CaptureTarget(clause.required(), Set.of(direction));
        int reached = reachedAt(running, target);
        boolean pass = reached > 0;
        int more = pass ? 0 : moreModes(running, clause.required());
        String text = pass ? enough(direction, captured, reached, clause) : shortOf(direction, captured, running.length, more, clause);
        return new Verdict(pack.id(), clause.id(), direction, captured, clause.required(), pass, reached, more, text);
    }

    private static int reachedAt(double[] running, CaptureTarget target) {
        for (int i = 0; i < running.length; i++) {
            if (target.isMetBy(running[i])) {
                return i + 1;
            }
        }
        return 0;
    }

    /** The estimate; -1 where the modes so far give no trend. */
    static int moreModes(double[] running, double required) {
        int count = running.length;
        int half = count / 2;
        if (half < 1 || required >= 1) {
            return -1;
        }
        double before = 1 - running[half - 1];
        double now = 1 - running[count - 1];
        double power = Math.log(before / now) / Math.log((double) count / half);
        if (!(power > 0.01)) {
            return -1;
        }
        double needed = count * Math.pow(now / (1 - required), 1 / power);
        return needed - count > MOST ? -1 : Math.max(1, (int) Math.ceil(needed - count));
    }

    private String enough(Direction direction, double captured, int reached, Clause clause) {
        int count = modal.modes().size();
        String sum = label(direction) + ": " + Figures.percent(captured) + " of the mass by mode " + count + ", enough";
        return sum + (reached < count ? ": mode " + reached + " reaches the " + Figures.percent(clause.required()) + " required."
                : " for the " + Figures.percent(clause.required()) + " required.");
    }

    private static String shortOf(Direction direction, double captured, int count, int more, Clause clause) {
        String sum = label(direction) + ": " + Figures.percent(captured) + " of the mass by mode " + count + ", "
                + Figures.percent(clause.required() - captured) + " short of the " + Figures.percent(clause.required()) + " required: ";
        return sum + (more > 0
                ? "about " + Figures.count(more, "mode", "modes") + " more, if the missing mass goes on falling as from mode " + count / 2
                        + " to mode " + count + "."
                : "how many more modes it takes cannot be told from these.");
    }

    private static String label(Direction direction) {
        String label = direction.label();
        return Character.toUpperCase(label.charAt(0)) + label.substring(1);
    }
}
