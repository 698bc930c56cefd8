package org.modewright.numerics.internal.eigen;

import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.EigenSession;
import org.modewright.numerics.EigenSolver;
import org.modewright.numerics.Progress;

/** Dense eigenvalue solver: see {@link DenseEigenSession}. */
public final class DenseEigenSolver implements EigenSolver {

    private static final int LARGEST_ORDER = 2000;

    @Override
    public EigenSession open(EigenProblem problem, Progress progress) {
        if (problem.order() > LARGEST_ORDER) {
            throw new IllegalArgumentException("The dense method is for at most " + LARGEST_ORDER + " degrees of freedom, not "
                    + problem.order() + "; use the sparse one.");
        }
        return DenseEigenSession.open(problem, progress);
    }
}
