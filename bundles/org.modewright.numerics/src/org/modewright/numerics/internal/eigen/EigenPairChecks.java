package org.modewright.numerics.internal.eigen;

import java.util.Arrays;

import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.SymmetricMatrix;

/** Measures of how well vectors and values solve an eigenproblem. */
final class EigenPairChecks {

    /** Share of |x|<sup>T</sup>|K||x| that x<sup>T</sup>Kx may be by the rounding of a K that was summed from products. */
    static final double ENERGY_ROUND_OFF = 64.0 * Math.ulp(1.0);

    private EigenPairChecks() {
    }

    /** ||K&phi; - &lambda;M&phi;|| / ||K&phi;||; for &lambda; = 0 relative to ||K||<sub>1</sub> ||&phi;||. */
    static double residual(EigenProblem problem, double value, double[] vector) {
        double[] force = problem.stiffness().multiply(vector);
        double reference = value == 0.0 ? columnSumNorm(problem.stiffness()) * VectorMath.norm(vector) : VectorMath.norm(force);
        double[] inertiaForce = problem.mass().multiply(vector);
        VectorMath.add(force, -value, inertiaForce);
        double size = VectorMath.norm(force);
        return size == 0.0 ? 0.0 : size / reference;
    }

    private static double columnSumNorm(SymmetricMatrix matrix) {
        double[] ones = new double[matrix.order()];
        Arrays.fill(ones, 1.0);
        return Arrays.stream(absoluteProduct(matrix, ones)).max().orElse(0.0);
    }

    /** The residual of a pair that is exact but for the rounding of its components: 32 &epsilon; || |K||&phi;| || / ||K&phi;||. */
    static double unavoidableResidual(EigenProblem problem, double value, double[] vector) {
        double roundOff = 32.0 * Math.ulp(1.0);
        if (value == 0.0) {
            return roundOff;
        }
        double force = VectorMath.norm(problem.stiffness().multiply(vector));
        return force == 0.0 ? 0.0 : roundOff * VectorMath.norm(absoluteProduct(problem.stiffness(), vector)) / force;
    }

    /** |K| |x|. */
    static double[] absoluteProduct(SymmetricMatrix matrix, double[] x) {
        double[] y = new double[x.length];
        for (int column = 0; column < matrix.order(); column++) {
            for (int p = matrix.columnStart()[column]; p < matrix.columnStart()[column + 1]; p++) {
                int i = matrix.row()[p];
                double size = Math.abs(matrix.value()[p]);
                y[column] += size * Math.abs(x[i]);
                if (i != column) {
                    y[i] += size * Math.abs(x[column]);
                }
            }
        }
        return y;
    }

    /** |x|<sup>T</sup>|K||x|. */
    static double energyOfSizes(SymmetricMatrix matrix, double[] x) {
        double[] size = absoluteProduct(matrix, x);
        double energy = 0.0;
        for (int k = 0; k < size.length; k++) {
            energy += Math.abs(x[k]) * size[k];
        }
        return energy;
    }

    /** Largest |&phi;<sub>i</sub><sup>T</sup>M&phi;<sub>j</sub> - &delta;<sub>ij</sub>|; 0 without vectors. */
    static double worstOrthogonality(SymmetricMatrix mass, double[][] vectors) {
        double worst = 0.0;
        for (int j = 0; j < vectors.length; j++) {
            double[] massTimesVector = mass.multiply(vectors[j]);
            for (int i = 0; i <= j; i++) {
                double expected = i == j ? 1.0 : 0.0;
                worst = Math.max(worst, Math.abs(VectorMath.dot(vectors[i], massTimesVector) - expected));
            }
        }
        return worst;
    }
}
