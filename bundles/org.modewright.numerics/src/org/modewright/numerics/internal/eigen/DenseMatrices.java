package org.modewright.numerics.internal.eigen;

import org.ejml.data.DMatrixRMaj;
import org.modewright.numerics.SymmetricMatrix;

/** Sparse matrices written out in full. */
final class DenseMatrices {

    private DenseMatrices() {
    }

    /** Rows of the full symmetric matrix. */
    static double[][] rows(SymmetricMatrix matrix) {
        double[][] rows = new double[matrix.order()][matrix.order()];
        for (int column = 0; column < matrix.order(); column++) {
            for (int p = matrix.columnStart()[column]; p < matrix.columnStart()[column + 1]; p++) {
                rows[matrix.row()[p]][column] = matrix.value()[p];
                rows[column][matrix.row()[p]] = matrix.value()[p];
            }
        }
        return rows;
    }

    /** K - shift M in full. */
    static DMatrixRMaj shifted(SymmetricMatrix stiffness, SymmetricMatrix mass, double shift) {
        int n = stiffness.order();
        DMatrixRMaj full = new DMatrixRMaj(n, n);
        accumulate(full, stiffness, 1.0);
        accumulate(full, mass, -shift);
        return full;
    }

    private static void accumulate(DMatrixRMaj full, SymmetricMatrix matrix, double factor) {
        for (int column = 0; column < matrix.order(); column++) {
            for (int p = matrix.columnStart()[column]; p < matrix.columnStart()[column + 1]; p++) {
                int i = matrix.row()[p];
                full.add(i, column, factor * matrix.value()[p]);
                if (i != column) {
                    full.add(column, i, factor * matrix.value()[p]);
                }
            }
        }
    }
}
