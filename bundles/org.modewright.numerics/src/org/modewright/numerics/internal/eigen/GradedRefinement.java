package org.modewright.numerics.internal.eigen;

import java.util.Arrays;
import java.util.function.UnaryOperator;

import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;

/**
 * The error of an eigenvalue &theta; of the projected operator is a multiple of &epsilon; times the largest &theta;. Pairs far below the
 * largest are therefore computed anew by the Rayleigh-Ritz method on the M-orthogonal complement of the accurate ones, group by group.
 */
final class GradedRefinement {

    /** Share of the largest &theta; down to which pairs are accurate enough. */
    private static final double ACCURATE = 1e-4;

    private final SymmetricMatrix mass;
    private final UnaryOperator<double[][]> operator;
    private final Progress progress;

    /**
     * A refinement.
     *
     * @param mass M
     * @param operator V to (K - &sigma;M)<sup>-1</sup>M V; may overwrite nothing of V
     * @param progress asked for a cancel
     */
    GradedRefinement(SymmetricMatrix mass, UnaryOperator<double[][]> operator, Progress progress) {
        this.mass = mass;
        this.operator = operator;
        this.progress = progress;
    }

    /**
     * M-orthonormalises the vectors in their order and refines those that need it, in place.
     *
     * @param theta descending, positive
     * @param vectors purified, nearly M-orthogonal
     */
    void refine(double[] theta, double[][] vectors) {
        orthonormalise(vectors, 0);
        int accurate = endOfAccurate(theta, 0);
        while (accurate < theta.length) {
            refineFrom(theta, vectors, accurate);
            accurate = endOfAccurate(theta, accurate);
        }
    }

    private static int endOfAccurate(double[] theta, int from) {
        int end = from + 1;
        while (end < theta.length && theta[end] >= ACCURATE * theta[from]) {
            end++;
        }
        return Math.min(end, theta.length);
    }

    private void refineFrom(double[] theta, double[][] vectors, int from) {
        double[][] basis = Arrays.copyOfRange(vectors, from, vectors.length);
        double[][] image = operator.apply(basis);
        double[][] massTimesAccurate = massTimes(Arrays.copyOf(vectors, from));
        for (int pass = 0; pass < 2; pass++) {
            BlockOperations.subtractProduct(image, vectors, from, BlockOperations.transposedProduct(massTimesAccurate, from, image));
        }
        DenseSpectrum spectrum = DenseSpectrum.ofProduct(massTimes(basis), image, progress);
        double[][] refined = BlockOperations.combine(image, image.length, spectrum.vectors());
        System.arraycopy(spectrum.values(), 0, theta, from, basis.length);
        System.arraycopy(refined, 0, vectors, from, basis.length);
        orthonormalise(vectors, from);
    }

    private double[][] massTimes(double[][] vectors) {
        return Arrays.stream(vectors).map(mass::multiply).toArray(double[][]::new);
    }

    /** Gram-Schmidt from the largest &theta; down, so that a vector only loses components that leave its residual small. */
    private void orthonormalise(double[][] vectors, int from) {
        double[][] massTimes = new double[vectors.length][];
        for (int j = 0; j < vectors.length; j++) {
            progress.checkCancelled();
            massTimes[j] = mass.multiply(vectors[j]);
            if (j >= from) {
                orthonormaliseOne(vectors, massTimes, j);
            }
        }
    }

    private void orthonormaliseOne(double[][] vectors, double[][] massTimes, int j) {
        double[][] single = {vectors[j]};
        for (int pass = 0; pass < 2; pass++) {
            BlockOperations.subtractProduct(single, vectors, j, BlockOperations.transposedProduct(massTimes, j, single));
            double[] massTimesVector = mass.multiply(vectors[j]);
            double norm = Math.sqrt(VectorMath.dot(vectors[j], massTimesVector));
            VectorMath.scale(vectors[j], 1.0 / norm);
            VectorMath.scale(massTimesVector, 1.0 / norm);
            massTimes[j] = massTimesVector;
        }
    }
}
