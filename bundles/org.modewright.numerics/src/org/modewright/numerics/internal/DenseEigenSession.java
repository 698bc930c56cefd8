package org.modewright.numerics.internal;

import java.util.Arrays;
import java.util.stream.IntStream;

import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.CommonOps_DDRM;
import org.ejml.dense.row.factory.DecompositionFactory_DDRM;
import org.ejml.dense.row.factory.LinearSolverFactory_DDRM;
import org.ejml.interfaces.decomposition.EigenDecomposition_F64;
import org.ejml.interfaces.linsol.LinearSolverDense;
import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.EigenRequest;
import org.modewright.numerics.EigenSession;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SpectrumCertificate;

/**
 * All eigenpairs through the spectral transformation of T. Ericsson and A. Ruhe, Math. Comp. 35 (1980) 1251-1268: with M = B B<sup>T</sup>
 * the matrix B<sup>T</sup>(K - &sigma;M)<sup>-1</sup>B of the order of the rank of M has the eigenvalues 1/(&lambda; - &sigma;) and its
 * eigenvectors y give &phi; = (K - &sigma;M)<sup>-1</sup>B y (&lambda; - &sigma;), free of massless components.
 */
final class DenseEigenSession implements EigenSession {

    private final EigenProblem problem;
    private final double shift;
    private final double[] values;
    private final double[][] vectors;

    DenseEigenSession(EigenProblem problem) {
        this.problem = problem;
        MassRoot root = MassRoot.of(problem.mass());
        this.shift = shift(problem);
        DMatrixRMaj b = columnsOf(root);
        DMatrixRMaj x = new DMatrixRMaj(root.order(), root.rank());
        LinearSolverDense<DMatrixRMaj> solver = LinearSolverFactory_DDRM.lu(root.order());
        if (!solver.setA(DenseMatrices.shifted(problem.stiffness(), problem.mass(), shift))) {
            throw new IllegalArgumentException("The shifted stiffness is singular.");
        }
        solver.solve(b, x);
        DMatrixRMaj transformed = new DMatrixRMaj(root.rank(), root.rank());
        CommonOps_DDRM.multTransA(b, x, transformed);
        symmetrise(transformed);
        EigenDecomposition_F64<DMatrixRMaj> eigen = DecompositionFactory_DDRM.eig(root.rank(), true, true);
        eigen.decompose(transformed);
        int[] ascending = IntStream.range(0, root.rank()).boxed()
                .sorted((i, j) -> Double.compare(eigen.getEigenvalue(j).getReal(), eigen.getEigenvalue(i).getReal()))
                .mapToInt(Integer::intValue).toArray();
        values = new double[root.rank()];
        vectors = new double[root.rank()][];
        for (int i = 0; i < values.length; i++) {
            double theta = eigen.getEigenvalue(ascending[i]).getReal();
            values[i] = shift + 1.0 / theta;
            DMatrixRMaj vector = new DMatrixRMaj(root.order(), 1);
            CommonOps_DDRM.mult(1.0 / theta, x, eigen.getEigenVector(ascending[i]), vector);
            vectors[i] = vector.data;
        }
    }

    private static double shift(EigenProblem problem) {
        if (DecompositionFactory_DDRM.chol(problem.order(), true)
                .decompose(DenseMatrices.shifted(problem.stiffness(), problem.mass(), 0.0))) {
            return 0.0;
        }
        double smallest = Double.POSITIVE_INFINITY;
        double[] stiffness = problem.stiffness().diagonal();
        double[] mass = problem.mass().diagonal();
        for (int i = 0; i < mass.length; i++) {
            if (mass[i] > 0.0 && stiffness[i] > 0.0) {
                smallest = Math.min(smallest, stiffness[i] / mass[i]);
            }
        }
        return -1e-4 * smallest;
    }

    private static DMatrixRMaj columnsOf(MassRoot root) {
        DMatrixRMaj b = new DMatrixRMaj(root.order(), root.rank());
        for (int c = 0; c < root.rank(); c++) {
            for (int i = 0; i < root.order(); i++) {
                b.set(i, c, root.columns()[c][i]);
            }
        }
        return b;
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
    public EigenPairs solve(EigenRequest request, Progress progress) {
        int count = 0;
        while (count < Math.min(request.count(), values.length) && values[count] < request.below()) {
            count++;
        }
        double[] residuals = new double[count];
        double[] bounds = new double[count];
        for (int i = 0; i < count; i++) {
            residuals[i] = EigenPairChecks.residual(problem, values[i], vectors[i]);
            bounds[i] = residuals[i] * Math.abs(values[i]);
        }
        return new EigenPairs(Arrays.copyOf(values, count), Arrays.copyOf(vectors, count), residuals, bounds, count == values.length);
    }

    @Override
    public SpectrumCertificate certify(EigenPairs pairs, Progress progress) {
        int count = pairs.count();
        double last = count == 0 ? shift : pairs.values()[count - 1];
        double next = count < values.length ? values[count] : 2.0 * Math.abs(last) + 1.0;
        double where = 0.5 * (last + next);
        EigenDecomposition_F64<DMatrixRMaj> eigen = DecompositionFactory_DDRM.eig(problem.order(), false, true);
        eigen.decompose(DenseMatrices.shifted(problem.stiffness(), problem.mass(), where));
        int counted = 0;
        for (int i = 0; i < problem.order(); i++) {
            counted += eigen.getEigenvalue(i).getReal() < 0.0 ? 1 : 0;
        }
        double worst = Arrays.stream(pairs.residuals()).max().orElse(0.0);
        return new SpectrumCertificate(counted == count, where, counted, count, worst,
                EigenPairChecks.worstOrthogonality(problem.mass(), pairs.vectors()));
    }

    @Override
    public int finiteEigenvalueCount() {
        return values.length;
    }
}
