package org.modewright.fem.internal;

import java.util.Arrays;

/**
 * Finds which unknowns of a small homogeneous system A x = 0 can differ from zero, by Gauss-Jordan elimination with full pivoting.
 *
 * <p>Source: G. H. Golub and C. F. Van Loan, Matrix Computations (4th edition, 2013), section 3.4.
 */
final class SmallNullSpace {

    /** Pivots below this share of the largest entry, and multipliers below it, count as zero. */
    private static final double NEGLIGIBLE = 1e-10;

    private final double[] matrix;
    private final int rows;
    private final int columns;
    private final int[] pivotRow;
    private int rank;

    /**
     * Eliminates.
     *
     * @param matrix A by rows, its entries comparable; overwritten
     * @param rows number of rows
     * @param columns number of unknowns
     */
    SmallNullSpace(double[] matrix, int rows, int columns) {
        this.matrix = matrix;
        this.rows = rows;
        this.columns = columns;
        this.pivotRow = new int[columns];
        Arrays.fill(pivotRow, -1);
        eliminate();
    }

    private void eliminate() {
        double first = 0.0;
        while (rank < Math.min(rows, columns)) {
            int largest = largest();
            double pivot = Math.abs(matrix[largest]);
            first = Math.max(first, pivot);
            if (pivot <= NEGLIGIBLE * first) {
                return;
            }
            swap(largest / columns);
            pivotRow[largest % columns] = rank;
            clear(largest % columns);
            rank++;
        }
    }

    /** Place of the largest entry in the rows that are left; columns that have a pivot are clear there. */
    private int largest() {
        int largest = rank * columns;
        for (int p = rank * columns; p < rows * columns; p++) {
            if (Math.abs(matrix[p]) > Math.abs(matrix[largest])) {
                largest = p;
            }
        }
        return largest;
    }

    private void swap(int row) {
        for (int j = 0; j < columns && row != rank; j++) {
            double value = matrix[row * columns + j];
            matrix[row * columns + j] = matrix[rank * columns + j];
            matrix[rank * columns + j] = value;
        }
    }

    private void clear(int column) {
        double pivot = matrix[rank * columns + column];
        for (int j = 0; j < columns; j++) {
            matrix[rank * columns + j] /= pivot;
        }
        for (int i = 0; i < rows; i++) {
            double factor = matrix[i * columns + column];
            if (i == rank || factor == 0.0) {
                continue;
            }
            for (int j = 0; j < columns; j++) {
                matrix[i * columns + j] -= factor * matrix[rank * columns + j];
            }
            matrix[i * columns + column] = 0.0;
        }
    }

    /** Whether some solution moves an unknown. */
    boolean canMove(int unknown) {
        if (pivotRow[unknown] < 0) {
            return true;
        }
        for (int j = 0; j < columns; j++) {
            if (pivotRow[j] < 0 && Math.abs(matrix[pivotRow[unknown] * columns + j]) > NEGLIGIBLE) {
                return true;
            }
        }
        return false;
    }
}
