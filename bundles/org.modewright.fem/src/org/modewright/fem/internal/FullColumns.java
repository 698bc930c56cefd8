package org.modewright.fem.internal;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;

import org.modewright.numerics.SymmetricMatrix;

/** Whole columns, above and below the diagonal, of some unknowns of a symmetric matrix that is stored as its lower triangle. */
final class FullColumns {

    /** Sums below this share of what the largest entry of x makes at most are round-off, x being the result of an elimination. */
    private static final double ROUND_OFF = 1e-8;

    private final int[] number;
    private final int[] start;
    private final int[] row;
    private final double[] value;

    /**
     * Gathers columns.
     *
     * @param matrix the matrix
     * @param number place of an unknown among the wanted columns; negative if it is not wanted
     * @param wanted number of wanted columns
     */
    FullColumns(SymmetricMatrix matrix, int[] number, int wanted) {
        this.number = number;
        int[] next = new int[wanted + 1];
        visit(matrix, (column, at, entry) -> next[column + 1]++);
        for (int i = 0; i < wanted; i++) {
            next[i + 1] += next[i];
        }
        start = next.clone();
        row = new int[start[wanted]];
        value = new double[start[wanted]];
        visit(matrix, (column, at, entry) -> {
            row[next[column]] = at;
            value[next[column]++] = entry;
        });
    }

    private interface Visitor {
        void entry(int column, int row, double value);
    }

    private void visit(SymmetricMatrix matrix, Visitor visitor) {
        for (int column = 0; column < matrix.order(); column++) {
            for (int p = matrix.columnStart()[column]; p < matrix.columnStart()[column + 1]; p++) {
                int at = matrix.row()[p];
                if (number[column] >= 0) {
                    visitor.entry(number[column], at, matrix.value()[p]);
                }
                if (at != column && number[at] >= 0) {
                    visitor.entry(number[at], column, matrix.value()[p]);
                }
            }
        }
    }

    /** Whether A x differs from zero by more than round-off, x given by its entries at some wanted unknowns. */
    boolean hasProduct(int[] unknowns, double[] x) {
        Map<Integer, double[]> sums = new HashMap<>();
        double largest = Arrays.stream(x).map(Math::abs).max().orElse(0.0);
        for (int i = 0; i < unknowns.length; i++) {
            int column = number[unknowns[i]];
            for (int p = start[column]; p < start[column + 1]; p++) {
                double[] sum = sums.computeIfAbsent(row[p], key -> new double[2]);
                sum[0] += value[p] * x[i];
                sum[1] += Math.abs(value[p]) * largest;
            }
        }
        return sums.values().stream().anyMatch(sum -> Math.abs(sum[0]) > ROUND_OFF * sum[1]);
    }
}
