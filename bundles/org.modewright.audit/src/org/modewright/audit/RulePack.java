package org.modewright.audit;

import java.util.List;
import java.util.Objects;

/**
 * A set of rules that modes are judged by; data, read from a file by {@link RulePackFile}.
 *
 * @param id id, such as {@code common-90}
 * @param title title for people
 * @param version version of the pack
 * @param clauses what it asks for
 * @param source where the rules come from
 * @param provenance how sure that is: read in the source, from memory, common practice
 */
public record RulePack(String id, String title, String version, List<Clause> clauses, String source, String provenance) {

    public RulePack {
        Objects.requireNonNull(id, "id");
        Objects.requireNonNull(title, "title");
        clauses = List.copyOf(clauses);
    }

    /** The clause that asks for a share of the mass; every pack has one. */
    public Clause capturedMass() {
        return clauses.stream().filter(clause -> clause.measure() == Measure.CAPTURED_MASS).findFirst().orElseThrow();
    }

    /** What a clause measures. */
    public enum Measure {
        /** The sum of the effective mass shares of a direction. */
        CAPTURED_MASS("captured-mass");

        private final String word;

        Measure(String word) {
            this.word = word;
        }

        /** The word in files. */
        public String word() {
            return word;
        }
    }

    /**
     * One rule.
     *
     * @param id id within the pack
     * @param measure what it measures
     * @param required the least value, a share of 1
     * @param statement the rule in our words
     */
    public record Clause(String id, Measure measure, double required, String statement) {
        public Clause {
            Objects.requireNonNull(id, "id");
            Objects.requireNonNull(measure, "measure");
            Objects.requireNonNull(statement, "statement");
        }
    }
}
