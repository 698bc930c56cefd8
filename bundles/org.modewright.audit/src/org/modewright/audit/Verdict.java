package org.modewright.audit;

import java.util.Objects;
import org.modewright.modal.Direction;

/**
 * What a clause of a rule pack says of one direction.
 *
 * @param rulePack id of the rule pack
 * @param clause id of the clause
 * @param direction the direction judged
 * @param captured sum of the effective mass shares of the modes found
 * @param required the share that the clause asks for
 * @param pass whether it is met
 * @param reachedAtMode number of the mode that reaches it; 0: not reached
 * @param moreModes estimate of how many more modes would reach it; 0: none needed; -1: unknown
 * @param text the verdict in a sentence
 */
public record Verdict(String rulePack, String clause, Direction direction, double captured, double required, boolean pass,
        int reachedAtMode, int moreModes, String text) {

    public Verdict {
        Objects.requireNonNull(rulePack, "rulePack");
        Objects.requireNonNull(clause, "clause");
        Objects.requireNonNull(direction, "direction");
        Objects.requireNonNull(text, "text");
    }

    /** Captured less required: negative is what is missing. */
    public double margin() {
        return captured - required;
    }
}
