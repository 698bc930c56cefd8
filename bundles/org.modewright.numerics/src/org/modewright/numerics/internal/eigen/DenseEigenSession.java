package org.modewright.numerics.internal.eigen;

import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.EigenRequest;
import org.modewright.numerics.Progress;

/** All eigenpairs at once, by dense matrices: see {@link DenseModes}. */
final class DenseEigenSession extends CertifiedSession {

    private final EigenPairs pairs;

    private DenseEigenSession(ShiftedProblem shifted, EigenPairs pairs) {
        super(shifted);
        this.pairs = pairs;
    }

    static DenseEigenSession open(EigenProblem problem, Progress progress) {
        ShiftedProblem shifted = ShiftedProblem.of(problem, progress);
        int rank = shifted.massRank();
        progress.report("Solving " + problem.order() + " equations with dense matrices", Double.NaN);
        DenseModes modes = rank == 0 ? DenseModes.NONE : DenseModes.of(problem, shifted.shift(), progress);
        double[] values = new double[modes.theta().length];
        for (int i = 0; i < values.length; i++) {
            values[i] = shifted.shift() + 1.0 / modes.theta()[i];
        }
        return new DenseEigenSession(shifted, new EigenPairAssembly(shifted).assemble(values, modes.vectors(), true, progress));
    }

    @Override
    EigenPairs known() {
        return pairs;
    }

    @Override
    double nextEstimate() {
        return Double.POSITIVE_INFINITY;
    }

    @Override
    public EigenPairs solve(EigenRequest request, Progress progress) {
        progress.checkCancelled();
        return answer(request.count(), request.below());
    }

    @Override
    public int finiteEigenvalueCount() {
        return pairs.count();
    }
}
