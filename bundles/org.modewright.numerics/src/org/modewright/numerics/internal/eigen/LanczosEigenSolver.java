package org.modewright.numerics.internal.eigen;

import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.EigenSession;
import org.modewright.numerics.EigenSolver;
import org.modewright.numerics.Progress;

/** Sparse shift-invert block Lanczos: see {@link LanczosEigenSession}. */
public final class LanczosEigenSolver implements EigenSolver {

    @Override
    public EigenSession open(EigenProblem problem, Progress progress) {
        ShiftedProblem shifted = ShiftedProblem.of(problem, progress);
        return new LanczosEigenSession(shifted, shifted.massRank());
    }
}
