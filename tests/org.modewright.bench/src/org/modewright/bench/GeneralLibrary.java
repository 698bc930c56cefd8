package org.modewright.bench;

import org.ejml.data.DMatrixRMaj;
import org.ejml.data.DMatrixSparseCSC;
import org.ejml.interfaces.linsol.LinearSolverSparse;
import org.ejml.sparse.FillReducing;
import org.ejml.sparse.csc.factory.LinearSolverFactory_DSCC;
import org.modewright.numerics.SymmetricMatrix;

/** The sparse Cholesky factorisation of the general matrix library EJML, in the order of the matrix, which is storey by storey. */
final class GeneralLibrary {

    private final DMatrixSparseCSC matrix;

    GeneralLibrary(SymmetricMatrix lower) {
        matrix = full(lower);
    }

    /** Factorises. */
    LinearSolverSparse<DMatrixSparseCSC, DMatrixRMaj> factorise() {
        LinearSolverSparse<DMatrixSparseCSC, DMatrixRMaj> solver = LinearSolverFactory_DSCC.cholesky(FillReducing.NONE);
        if (!solver.setA(matrix)) {
            throw new IllegalStateException("The stiffness of the benchmark's frame is not positive definite.");
        }
        return solver;
    }

    /** Both triangles, rows ascending in each column. */
    private static DMatrixSparseCSC full(SymmetricMatrix lower) {
        int order = lower.order();
        int[] start = lower.columnStart();
        int[] row = lower.row();
        int[] count = new int[order + 1];
        for (int column = 0; column < order; column++) {
            for (int p = start[column]; p < start[column + 1]; p++) {
                count[column + 1]++;
                if (row[p] != column) {
                    count[row[p] + 1]++;
                }
            }
        }
        for (int column = 0; column < order; column++) {
            count[column + 1] += count[column];
        }
        DMatrixSparseCSC full = new DMatrixSparseCSC(order, order, count[order]);
        System.arraycopy(count, 0, full.col_idx, 0, order + 1);
        int[] next = count.clone();
        // Column by column of the lower triangle: entry (i, j) comes to column i before the entries of column i itself, so rows ascend.
        for (int column = 0; column < order; column++) {
            for (int p = start[column]; p < start[column + 1]; p++) {
                put(full, next, column, row[p], lower.value()[p]);
                if (row[p] != column) {
                    put(full, next, row[p], column, lower.value()[p]);
                }
            }
        }
        full.nz_length = count[order];
        full.indicesSorted = true;
        return full;
    }

    private static void put(DMatrixSparseCSC full, int[] next, int column, int row, double value) {
        int at = next[column]++;
        full.nz_rows[at] = row;
        full.nz_values[at] = value;
    }
}
