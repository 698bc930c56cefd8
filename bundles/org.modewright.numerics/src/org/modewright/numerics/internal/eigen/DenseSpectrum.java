package org.modewright.numerics.internal.eigen;

import java.util.stream.IntStream;

import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.factory.DecompositionFactory_DDRM;
import org.ejml.interfaces.decomposition.EigenDecomposition_F64;
import org.modewright.numerics.Progress;

/**
 * Eigenvalues and orthonormal eigenvectors of a dense symmetric matrix.
 *
 * @param values descending
 * @param vectors vectors[i] belongs to values[i]
 */
record DenseSpectrum(double[] values, double[][] vectors) {

    static DenseSpectrum of(DMatrixRMaj symmetric, Progress progress) {
        if (symmetric.numRows == 0) {
            return new DenseSpectrum(new double[0], new double[0][]);
        }
        return CancellableCall.run(() -> decompose(symmetric), progress);
    }

    /** Spectrum of the symmetric part of L<sup>T</sup>R. */
    static DenseSpectrum ofProduct(double[][] left, double[][] right, Progress progress) {
        double[][] product = BlockOperations.transposedProduct(left, left.length, right);
        DMatrixRMaj symmetric = new DMatrixRMaj(product.length, product.length);
        for (int i = 0; i < product.length; i++) {
            for (int j = 0; j < product.length; j++) {
                symmetric.set(i, j, 0.5 * (product[i][j] + product[j][i]));
            }
        }
        return of(symmetric, progress);
    }

    private static DenseSpectrum decompose(DMatrixRMaj symmetric) {
        int n = symmetric.numRows;
        EigenDecomposition_F64<DMatrixRMaj> eigen = DecompositionFactory_DDRM.eig(n, true, true);
        if (!eigen.decompose(symmetric)) {
            throw new ArithmeticException("The dense eigenvalue iteration of order " + n + " did not converge.");
        }
        int[] descending = IntStream.range(0, n).boxed()
                .sorted((i, j) -> Double.compare(eigen.getEigenvalue(j).getReal(), eigen.getEigenvalue(i).getReal()))
                .mapToInt(Integer::intValue).toArray();
        double[] values = new double[n];
        double[][] vectors = new double[n][];
        for (int i = 0; i < n; i++) {
            values[i] = eigen.getEigenvalue(descending[i]).getReal();
            vectors[i] = eigen.getEigenVector(descending[i]).data.clone();
        }
        return new DenseSpectrum(values, vectors);
    }
}
