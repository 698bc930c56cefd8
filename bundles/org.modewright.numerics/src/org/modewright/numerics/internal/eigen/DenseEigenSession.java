package org.modewright.numerics.internal.eigen;

import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.CommonOps_DDRM;
import org.ejml.dense.row.factory.LinearSolverFactory_DDRM;
import org.ejml.interfaces.linsol.LinearSolverDense;
import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.EigenRequest;
import org.modewright.numerics.Progress;

/**
 * All eigenpairs through the spectral transformation of T. Ericsson and A. Ruhe, Math. Comp. 35 (1980) 1251-1268: with M = B B<sup>T</sup>
 * the matrix B<sup>T</sup>(K - &sigma;M)<sup>-1</sup>B of the order of the rank of M has the eigenvalues 1/(&lambda; - &sigma;) and its
 * eigenvectors y give &phi; = (K - &sigma;M)<sup>-1</sup>B y (&lambda; - &sigma;), free of massless components.
 */
final class DenseEigenSession extends CertifiedSession {

    private final EigenPairs pairs;

    private DenseEigenSession(ShiftedProblem shifted, EigenPairs pairs) {
        super(shifted);
        this.pairs = pairs;
    }

    static DenseEigenSession open(EigenProblem problem, Progress progress) {
        int order = problem.order();
        MassRank.of(problem.mass(), progress);
        ShiftedProblem shifted = ShiftedProblem.of(problem, progress);
        progress.report("Solving " + order + " equations with dense matrices", Double.NaN);
        DMatrixRMaj root = MassRoot.of(problem.mass()).matrix();
        DMatrixRMaj flexibleRoot = CancellableCall.run(() -> solve(problem, shifted.shift(), root), progress);
        DMatrixRMaj transformed = new DMatrixRMaj(root.numCols, root.numCols);
        CommonOps_DDRM.multTransA(root, flexibleRoot, transformed);
        symmetrise(transformed);
        DenseSpectrum spectrum = DenseSpectrum.of(transformed, progress);
        double[] values = new double[root.numCols];
        double[][] vectors = new double[root.numCols][];
        for (int i = 0; i < values.length; i++) {
            double theta = spectrum.values()[i];
            values[i] = shifted.shift() + 1.0 / theta;
            DMatrixRMaj vector = new DMatrixRMaj(order, 1);
            CommonOps_DDRM.mult(1.0 / theta, flexibleRoot, DMatrixRMaj.wrap(root.numCols, 1, spectrum.vectors()[i]), vector);
            vectors[i] = vector.data;
        }
        return new DenseEigenSession(shifted, new EigenPairAssembly(shifted).assemble(values, vectors, true, progress));
    }

    private static DMatrixRMaj solve(EigenProblem problem, double shift, DMatrixRMaj root) {
        LinearSolverDense<DMatrixRMaj> solver = LinearSolverFactory_DDRM.lu(problem.order());
        if (!solver.setA(DenseMatrices.shifted(problem.stiffness(), problem.mass(), shift))) {
            throw new ArithmeticException("The stiffness shifted by " + shift + " is singular.");
        }
        DMatrixRMaj solution = new DMatrixRMaj(root.numRows, root.numCols);
        solver.solve(root, solution);
        return solution;
    }

    private static void symmetrise(DMatrixRMaj a) {
        for (int i = 0; i < a.numRows; i++) {
            for (int j = 0; j < i; j++) {
                double mean = 0.5 * (a.get(i, j) + a.get(j, i));
                a.set(i, j, mean);
                a.set(j, i, mean);
            }
        }
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
