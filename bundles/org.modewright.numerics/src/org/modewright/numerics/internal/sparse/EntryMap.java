package org.modewright.numerics.internal.sparse;

import java.util.Arrays;

import org.modewright.numerics.SymmetricMatrix;

/**
 * Where the entries of a matrix of known pattern go in the order of elimination.
 *
 * @param start where the entries of each permuted column start; length order + 1
 * @param rowPosition permuted row of each entry, at least its permuted column
 * @param entry index of each entry in the matrix
 */
record EntryMap(int[] start, int[] rowPosition, int[] entry) {

    static EntryMap of(SymmetricMatrix matrix, int[] position) {
        int n = matrix.order();
        int[] start = new int[n + 1];
        for (int column = 0; column < n; column++) {
            for (int p = matrix.columnStart()[column]; p < matrix.columnStart()[column + 1]; p++) {
                start[Math.min(position[column], position[matrix.row()[p]]) + 1]++;
            }
        }
        for (int c = 0; c < n; c++) {
            start[c + 1] += start[c];
        }
        int[] next = Arrays.copyOf(start, n);
        int[] rowPosition = new int[matrix.entries()];
        int[] entry = new int[matrix.entries()];
        for (int column = 0; column < n; column++) {
            for (int p = matrix.columnStart()[column]; p < matrix.columnStart()[column + 1]; p++) {
                int a = position[column];
                int b = position[matrix.row()[p]];
                int q = next[Math.min(a, b)]++;
                rowPosition[q] = Math.max(a, b);
                entry[q] = p;
            }
        }
        return new EntryMap(start, rowPosition, entry);
    }
}
