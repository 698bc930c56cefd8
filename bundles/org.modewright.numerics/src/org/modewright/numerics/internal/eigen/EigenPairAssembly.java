package org.modewright.numerics.internal.eigen;

import java.util.Arrays;

import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.Progress;

/** Makes the answer of a solver from purified vectors: measures residuals and bounds errors. */
final class EigenPairAssembly {

    /** Values below this share of the shift are taken from the Rayleigh quotient. */
    private static final double NEAR_ZERO = 1e-3;
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
     * @param vectors M-orthonormal; the array is kept
     * @param exhausted whether there are no more finite eigenvalues
     */
    EigenPairs assemble(double[] values, double[][] vectors, boolean exhausted, Progress progress) {
        progress.report("Checking the modes", Double.NaN);
        double[] cleaned = cleanZeros(values, vectors);
        double[] residuals = new double[values.length];
        for (int i = 0; i < values.length; i++) {
            progress.checkCancelled();
            orient(vectors[i]);
            residuals[i] = EigenPairChecks.residual(problem, cleaned[i], vectors[i]);
        }
        return new EigenPairs(cleaned, vectors, residuals, errorBounds(cleaned, vectors, progress), exhausted);
    }

    /**
     * A value near zero went through a shift that is large against it: the Rayleigh quotient is more accurate there, and is zero if it
     * cannot be told from round-off.
     */
    private double[] cleanZeros(double[] values, double[][] vectors) {
        double[] cleaned = values.clone();
        if (!shifted.isNearlySingular()) {
            return cleaned;
        }
        for (int i = 0; i < cleaned.length; i++) {
            if (Math.abs(cleaned[i]) <= NEAR_ZERO * Math.abs(shifted.shift())) {
                double quotient = problem.stiffness().quadratic(vectors[i]);
                double sizes = EigenPairChecks.energyOfSizes(problem.stiffness(), vectors[i]);
                double roundOff = EigenPairChecks.ENERGY_ROUND_OFF * (sizes + Math.abs(shifted.shift()));
                cleaned[i] = Math.abs(quotient) <= roundOff ? 0.0 : quotient;
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
