package org.modewright.fem.internal;

import java.util.HashSet;
import java.util.Set;

/**
 * Rank-revealing elimination of sparse homogeneous linear constraints. Constraint by constraint, the unknowns that are known already
 * are replaced by what they stand for; of what remains, one unknown is expressed by the others. Of the unknowns with a factor of at
 * least a tenth of the largest, the one that the fewest other constraints and expressions use is taken, so that the motion of a whole
 * floor stays expressed by the few unknowns of one node and little fill arises. A constraint of which nothing remains is redundant.
 *
 * <p>Source: H. M. Markowitz, Management Science 3 (1957) 255-269, for the choice of the pivot; I. S. Duff, A. M. Erisman and
 * J. K. Reid, Direct Methods for Sparse Matrices (2nd edition, 2017), section 5.2, for the threshold.
 */
final class ConstraintElimination {

    /** A constraint whose factors shrink to this share of their first size says nothing new; coordinates are given to some 1e-10. */
    private static final double REDUNDANT = 1e-8;
    private static final double THRESHOLD = 0.1;

    private final LinearForm[] expression;
    private final Set<Integer>[] users;
    private final int[] waiting;

    /**
     * Begins without constraints.
     *
     * @param unknowns number of unknowns
     */
    @SuppressWarnings("unchecked")
    ConstraintElimination(int unknowns) {
        expression = new LinearForm[unknowns];
        users = new Set[unknowns];
        waiting = new int[unknowns];
    }

    /** Announces a constraint that will be imposed later, so that its unknowns are spared until then. */
    void announce(LinearForm constraint) {
        for (int i = 0; i < constraint.size(); i++) {
            waiting[constraint.unknown(i)]++;
        }
    }

    /**
     * Imposes an announced constraint.
     *
     * @param constraint the form that shall be zero, its unknowns scaled so that their factors compare
     */
    void impose(LinearForm constraint) {
        for (int i = 0; i < constraint.size(); i++) {
            waiting[constraint.unknown(i)]--;
        }
        LinearForm remainder = substituted(constraint);
        double largest = remainder.largest();
        if (largest <= REDUNDANT * constraint.largest()) {
            return;
        }
        int pivot = pivot(remainder, THRESHOLD * largest);
        eliminate(pivot, remainder.without(pivot).times(-1.0 / remainder.factorOf(pivot)));
    }

    /** What an unknown is expressed by; null if it is free, an empty form if it is held. */
    LinearForm expression(int unknown) {
        return expression[unknown];
    }

    /** The unknowns that are expressed by a free unknown, itself apart. */
    Set<Integer> users(int unknown) {
        return users[unknown] == null ? Set.of() : users[unknown];
    }

    private LinearForm substituted(LinearForm constraint) {
        LinearForm result = constraint;
        for (int i = 0; i < constraint.size(); i++) {
            LinearForm known = expression[constraint.unknown(i)];
            if (known != null) {
                result = result.without(constraint.unknown(i)).plus(known, constraint.factor(i));
            }
        }
        return result;
    }

    private int pivot(LinearForm form, double least) {
        int best = -1;
        int bestUse = Integer.MAX_VALUE;
        double bestFactor = 0.0;
        for (int i = 0; i < form.size(); i++) {
            double factor = Math.abs(form.factor(i));
            int use = use(form.unknown(i));
            if (factor >= least && (use < bestUse || use == bestUse && factor >= bestFactor)) {
                best = form.unknown(i);
                bestUse = use;
                bestFactor = factor;
            }
        }
        return best;
    }

    private int use(int unknown) {
        return waiting[unknown] + (users[unknown] == null ? 0 : users[unknown].size());
    }

    private void eliminate(int pivot, LinearForm form) {
        Set<Integer> dependent = users[pivot];
        users[pivot] = null;
        setExpression(pivot, form);
        if (dependent == null) {
            return;
        }
        for (Integer user : dependent) {
            LinearForm old = expression[user];
            setExpression(user, old.without(pivot).plus(form, old.factorOf(pivot)));
        }
    }

    private void setExpression(int unknown, LinearForm form) {
        LinearForm old = expression[unknown];
        if (old != null) {
            for (int i = 0; i < old.size(); i++) {
                if (users[old.unknown(i)] != null) {
                    users[old.unknown(i)].remove(unknown);
                }
            }
        }
        expression[unknown] = form;
        for (int i = 0; i < form.size(); i++) {
            int used = form.unknown(i);
            if (users[used] == null) {
                users[used] = new HashSet<>();
            }
            users[used].add(unknown);
        }
    }
}
