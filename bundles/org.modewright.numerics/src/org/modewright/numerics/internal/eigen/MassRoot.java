package org.modewright.numerics.internal.eigen;

import java.util.Arrays;

import org.modewright.numerics.SymmetricMatrix;

/**
 * B of n rows and r columns with M = B B<sup>T</sup>, r the rank of M: Cholesky with diagonal pivoting (N. J. Higham, Accuracy and
 * Stability of Numerical Algorithms, SIAM 2002, section 10.3). A pivot below n &epsilon; times its own diagonal entry ends its row.
 */
final class MassRoot {

    private static final double EPSILON = Math.ulp(1.0);

    private final double[][] columns;

    private MassRoot(double[][] columns) {
        this.columns = columns;
    }

    /**
     * Factorises a positive semidefinite matrix.
     *
     * @throws IllegalArgumentException if a diagonal entry is negative
     */
    static MassRoot of(SymmetricMatrix mass) {
        int n = mass.order();
        double[] original = mass.diagonal();
        for (int i = 0; i < n; i++) {
            if (original[i] < 0.0) {
                throw new IllegalArgumentException("The mass at degree of freedom " + i + " is negative (" + original[i] + ").");
            }
        }
        double[] remaining = original.clone();
        double[][] columns = new double[n][];
        double[][] dense = DenseMatrices.rows(mass);
        int rank = 0;
        for (int pivot = next(remaining, original); pivot >= 0; pivot = next(remaining, original)) {
            columns[rank] = column(dense[pivot], pivot, columns, rank, remaining);
            rank++;
        }
        return new MassRoot(Arrays.copyOf(columns, rank));
    }

    private static int next(double[] remaining, double[] original) {
        int best = -1;
        double bestShare = 10.0 * remaining.length * EPSILON;
        for (int i = 0; i < remaining.length; i++) {
            if (original[i] > 0.0 && remaining[i] > bestShare * original[i]) {
                bestShare = remaining[i] / original[i];
                best = i;
            }
        }
        return best;
    }

    private static double[] column(double[] massRow, int pivot, double[][] columns, int rank, double[] remaining) {
        int n = massRow.length;
        double[] column = massRow.clone();
        for (int c = 0; c < rank; c++) {
            double factor = columns[c][pivot];
            if (factor != 0.0) {
                for (int i = 0; i < n; i++) {
                    column[i] -= factor * columns[c][i];
                }
            }
        }
        double root = Math.sqrt(remaining[pivot]);
        for (int i = 0; i < n; i++) {
            column[i] = remaining[i] == 0.0 ? 0.0 : column[i] / root;
        }
        column[pivot] = root;
        for (int i = 0; i < n; i++) {
            remaining[i] -= column[i] * column[i];
        }
        remaining[pivot] = 0.0;
        return column;
    }

    /** The columns of B, each of length n. */
    double[][] columns() {
        return columns;
    }
}
