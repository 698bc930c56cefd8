package org.modewright.numerics.internal.eigen;

import java.util.Arrays;

import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.Progress;

/** Makes the answer of a solver from purified vectors: normalises them, measures residuals and bounds errors. */
final class EigenPairAssembly {

    private static final double ROUND_OFF = 16.0 * Math.ulp(1.0);
    private static final int PANEL = 8;

    private final ShiftedProblem shifted;
    private final EigenProblem problem;

    EigenPairAssembly(ShiftedProblem shifted) {
        this.shifted = shifted;
        this.problem = shifted.problem();
    }

    /**
     * Assembles eigenpairs.
     *
     * @param values ascending
     * @param vectors nearly M-orthonormal; normalised in place
     * @param exhausted whether there are no more finite eigenvalues
     */
    EigenPairs assemble(double[] values, double[][] vectors, boolean exhausted, Progress progress) {
        progress.report("Checking the modes", Double.NaN);
        orthonormalise(vectors, progress);
        double[] cleaned = cleanZeros(values, vectors);
        double[] residuals = new double[values.length];
        for (int i = 0; i < values.length; i++) {
            progress.checkCancelled();
            orient(vectors[i]);
            residuals[i] = EigenPairChecks.residual(problem, cleaned[i], vectors[i]);
        }
        return new EigenPairs(cleaned, vectors, residuals, errorBounds(cleaned, vectors, progress), exhausted);
    }

    /** Gram-Schmidt from the lowest vector up, so that a vector only loses components that leave its residual small. */
    private void orthonormalise(double[][] vectors, Progress progress) {
        double[][] massTimes = new double[vectors.length][];
        for (int j = 0; j < vectors.length; j++) {
            progress.checkCancelled();
            double[][] single = {vectors[j]};
            double[][] h = BlockOperations.transposedProduct(massTimes, j, single);
            BlockOperations.subtractProduct(single, vectors, j, h);
            massTimes[j] = problem.mass().multiply(vectors[j]);
            double norm = Math.sqrt(VectorMath.dot(vectors[j], massTimes[j]));
            VectorMath.scale(vectors[j], 1.0 / norm);
            VectorMath.scale(massTimes[j], 1.0 / norm);
        }
    }

    private double[] cleanZeros(double[] values, double[][] vectors) {
        double[] cleaned = values.clone();
        if (shifted.stiffnessZeros() == 0) {
            return cleaned;
        }
        for (int i = 0; i < cleaned.length; i++) {
            double[] size = EigenPairChecks.absoluteProduct(problem.stiffness(), vectors[i]);
            double reference = 0.0;
            for (int k = 0; k < size.length; k++) {
                reference += Math.abs(vectors[i][k]) * size[k];
            }
            if (Math.abs(cleaned[i]) <= ROUND_OFF * reference) {
                cleaned[i] = 0.0;
            }
        }
        Arrays.sort(cleaned);
        return cleaned;
    }

    private static void orient(double[] vector) {
        double extreme = 0.0;
        for (double component : vector) {
            // Components of a symmetric mode differ by round-off only: the first of them decides.
            if (Math.abs(component) > Math.abs(extreme) * (1.0 + 1e-8)) {
                extreme = component;
            }
        }
        if (extreme < 0.0) {
            VectorMath.scale(vector, -1.0);
        }
    }

    /**
     * With r = K&phi; - &lambda;M&phi; and w = (K - &sigma;M)<sup>-1</sup>r the transformed pair has the residual &theta;||w||<sub>M</sub>,
     * &theta; = 1/(&lambda; - &sigma;), so an eigenvalue lies within |&lambda; - &sigma;| q / (1 - q) with q = ||w||<sub>M</sub>.
     */
    private double[] errorBounds(double[] values, double[][] vectors, Progress progress) {
        double[] bounds = new double[values.length];
        for (int start = 0; start < values.length; start += PANEL) {
            progress.checkCancelled();
            int end = Math.min(values.length, start + PANEL);
            double[][] w = new double[end - start][];
            for (int i = start; i < end; i++) {
                w[i - start] = problem.stiffness().multiply(vectors[i]);
                VectorMath.add(w[i - start], -values[i], problem.mass().multiply(vectors[i]));
            }
            shifted.factorisation().solve(w);
            for (int i = start; i < end; i++) {
                double q = Math.sqrt(Math.max(0.0, problem.mass().quadratic(w[i - start])));
                bounds[i] = q < 1.0 ? Math.abs(values[i] - shifted.shift()) * q / (1.0 - q) : Double.POSITIVE_INFINITY;
            }
        }
        return bounds;
    }
}
