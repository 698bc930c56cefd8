package org.modewright.numerics.internal.eigen;

import java.util.Arrays;

import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.CommonOps_DDRM;
import org.ejml.dense.row.factory.LinearSolverFactory_DDRM;
import org.ejml.interfaces.linsol.LinearSolverDense;
import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.Progress;

/**
 * All eigenpairs through the spectral transformation of T. Ericsson and A. Ruhe, Math. Comp. 35 (1980) 1251-1268: with
 * M = B B<sup>T</sup> the matrix B<sup>T</sup>(K - &sigma;M)<sup>-1</sup>B of the order of the rank of M has the eigenvalues
 * &theta; = 1/(&lambda; - &sigma;) and its eigenvectors y give &phi; = (K - &sigma;M)<sup>-1</sup>B y / &theta;, free of massless
 * components.
 *
 * @param theta descending
 * @param vectors nearly M-orthonormal
 */
record DenseModes(double[] theta, double[][] vectors) {

    static final DenseModes NONE = new DenseModes(new double[0], new double[0][]);

    static DenseModes of(EigenProblem problem, double shift, Progress progress) {
        return new Computation(problem, shift, progress).run();
    }

    private static final class Computation {

        private final EigenProblem problem;
        private final Progress progress;
        private final LinearSolverDense<DMatrixRMaj> solver;

        Computation(EigenProblem problem, double shift, Progress progress) {
            this.problem = problem;
            this.progress = progress;
            this.solver = LinearSolverFactory_DDRM.lu(problem.order());
            DMatrixRMaj shifted = DenseMatrices.shifted(problem.stiffness(), problem.mass(), shift);
            if (!CancellableCall.run(() -> solver.setA(shifted), progress)) {
                throw new ArithmeticException("The stiffness shifted by " + shift + " is singular.");
            }
        }

        DenseModes run() {
            double[][] root = MassRoot.of(problem.mass()).columns();
            double[][] flexible = solve(root);
            DenseSpectrum spectrum = DenseSpectrum.ofProduct(root, flexible, progress);
            double[] theta = spectrum.values();
            double[][] vectors = BlockOperations.combine(flexible, flexible.length, spectrum.vectors());
            GradedRefinement refinement = new GradedRefinement(problem.mass(), columns -> solve(massTimes(columns)), progress);
            refinement.refine(theta, vectors);
            return new DenseModes(theta, vectors);
        }

        private double[][] massTimes(double[][] vectors) {
            return Arrays.stream(vectors).map(problem.mass()::multiply).toArray(double[][]::new);
        }

        private double[][] solve(double[][] columns) {
            DMatrixRMaj right = DMatrixRMaj.wrap(columns.length, problem.order(), flatten(columns));
            CommonOps_DDRM.transpose(right);
            DMatrixRMaj solution = new DMatrixRMaj(problem.order(), columns.length);
            CancellableCall.run(() -> {
                solver.solve(right, solution);
                return solution;
            }, progress);
            CommonOps_DDRM.transpose(solution);
            double[][] result = new double[columns.length][];
            for (int c = 0; c < result.length; c++) {
                result[c] = Arrays.copyOfRange(solution.data, c * problem.order(), (c + 1) * problem.order());
            }
            return result;
        }

        private double[] flatten(double[][] columns) {
            double[] flat = new double[columns.length * problem.order()];
            for (int c = 0; c < columns.length; c++) {
                System.arraycopy(columns[c], 0, flat, c * problem.order(), problem.order());
            }
            return flat;
        }
    }
}
