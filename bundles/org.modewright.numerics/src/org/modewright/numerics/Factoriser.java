package org.modewright.numerics;

/**
 * Factorises K - shift M for one pattern of K and M: ordering and symbolic analysis are done once, when it is made.
 *
 * <p>The implementation is made by the eigen solvers.
 */
public interface Factoriser {

    /**
     * LDL<sup>T</sup> of K - shift M.
     *
     * @param k stiffness, of the pattern that the factoriser was made for
     * @param m mass, likewise; null if shift is 0
     * @param shift in the units of the eigenvalue
     * @param progress told of the fronts eliminated; a cancel is obeyed
     * @throws IllegalArgumentException if the pattern or the order does not fit
     * @throws CancelledException on a cancel
     */
    Factorisation factorise(SymmetricMatrix k, SymmetricMatrix m, double shift, Progress progress);

    /**
     * Null vectors of K - shift M, one per zero pivot and in their order: component 1 at its own zero pivot, 0 at the others.
     *
     * @param factorisation made by this factoriser
     */
    default double[][] nullVectors(Factorisation factorisation) {
        double[][] vectors = new double[factorisation.zeroPivots().length][];
        for (int z = 0; z < vectors.length; z++) {
            vectors[z] = nullVector(factorisation, z);
        }
        return vectors;
    }

    /**
     * One of the null vectors, where all of them would take too much memory.
     *
     * @param factorisation made by this factoriser
     * @param index which of the zero pivots
     */
    default double[] nullVector(Factorisation factorisation, int index) {
        double[] weights = new double[factorisation.zeroPivots().length];
        weights[index] = 1.0;
        return nullVector(factorisation, weights);
    }

    /**
     * A combination of the null vectors.
     *
     * @param factorisation made by this factoriser
     * @param weights component at each zero pivot
     */
    double[] nullVector(Factorisation factorisation, double[] weights);
}
