package org.modewright.numerics.internal;

import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.EigenSession;
import org.modewright.numerics.EigenSolver;
import org.modewright.numerics.Progress;

/** Dense eigenvalue solver: see {@link DenseEigenSession}. */
public final class DenseEigenSolver implements EigenSolver {

    @Override
    public EigenSession open(EigenProblem problem, Progress progress) {
        progress.report("Solving " + problem.order() + " dense equations", Double.NaN);
        progress.checkCancelled();
        return new DenseEigenSession(problem);
    }
}
