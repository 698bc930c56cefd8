package org.modewright.numerics.internal.sparse;

import java.util.Arrays;

/**
 * Columns of the factor that were eliminated in one front.
 *
 * @param pivots number of columns
 * @param index position of each row in the order of elimination; the first rows are the pivots'
 * @param l unit lower trapezoid, column-major, index.length rows and pivots columns
 * @param d diagonal of D
 * @param e subdiagonal of D: not 0 at the first column of a two by two pivot
 * @param vanished which pivots vanished
 */
record FactorBlock(int pivots, int[] index, double[] l, double[] d, double[] e, boolean[] vanished) {

    static FactorBlock of(Front front, int pivots, boolean[] vanished) {
        return new FactorBlock(pivots, front.index, Arrays.copyOf(front.a, pivots * front.size), Arrays.copyOf(front.d, pivots),
                Arrays.copyOf(front.e, pivots), Arrays.copyOf(vanished, pivots));
    }

    int rows() {
        return index.length;
    }

    /** Solves with D in place; vanished pivots give 0. */
    void solveDiagonal(double[] x) {
        int k = 0;
        while (k < pivots) {
            int i = index[k];
            if (vanished[k]) {
                x[i] = 0.0;
                k++;
            } else if (e[k] == 0.0) {
                x[i] /= d[k];
                k++;
            } else {
                int j = index[k + 1];
                double determinant = d[k] * d[k + 1] - e[k] * e[k];
                double xi = (d[k + 1] * x[i] - e[k] * x[j]) / determinant;
                x[j] = (d[k] * x[j] - e[k] * x[i]) / determinant;
                x[i] = xi;
                k += 2;
            }
        }
    }
}
