package org.modewright.fem.internal;

import java.util.Arrays;

/**
 * Finds which unknowns of a small homogeneous system A x = 0 can differ from zero, by Gauss-Jordan elimination with full pivoting.
 *
 * <p>Source: G. H. Golub and C. F. Van Loan, Matrix Computations (4th edition, 2013), section 3.4.
 */
final class SmallNullSpace {

    /** Pivots and multipliers below this count as zero. */
    private static final double NEGLIGIBLE = 1e-12;

    private final double[] matrix;
    private final int rows;
    private final int columns;
    private final int[] pivotRow;
    private int rank;

    /**
     * Eliminates.
     *
     * @param matrix A by rows, scaled so that entries far below 1 are round-off; overwritten
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
        while (rank < Math.min(rows, columns)) {
            int largest = largest();
            if (Math.abs(matrix[largest]) <= NEGLIGIBLE) {
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

    /** Number of independent equations. */
    int rank() {
        return rank;
    }

    /** Independent equation i: the factors of all unknowns, 1 at its own pivot and 0 at the pivots of the others. */
    double[] constraint(int i) {
        double[] factors = Arrays.copyOfRange(matrix, i * columns, (i + 1) * columns);
        for (int j = 0; j < columns; j++) {
            if (Math.abs(factors[j]) <= NEGLIGIBLE) {
                factors[j] = 0.0;
            }
        }
        return factors;
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
