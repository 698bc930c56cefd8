package org.modewright.numerics;

import org.modewright.numerics.internal.sparse.SparseFactoriser;

/** Makes factorisers. */
public final class Factorisers {

    private Factorisers() {
    }

    /**
     * A sparse factoriser for the pattern of a problem.
     *
     * @param problem whose K and M give the pattern
     * @param progress told of the ordering; a cancel is obeyed
     */
    public static Factoriser sparse(EigenProblem problem, Progress progress) {
        return SparseFactoriser.forPattern(problem.stiffness(), problem.mass(), progress);
    }

    /**
     * A sparse factoriser for the pattern of one matrix, without shifts.
     *
     * @param matrix that gives the pattern
     * @param progress told of the ordering; a cancel is obeyed
     */
    public static Factoriser sparse(SymmetricMatrix matrix, Progress progress) {
        return SparseFactoriser.forPattern(matrix, null, progress);
    }
}
