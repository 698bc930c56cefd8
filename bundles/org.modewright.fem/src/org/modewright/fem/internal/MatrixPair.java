package org.modewright.fem.internal;

import java.util.Arrays;

import org.modewright.numerics.SymmetricMatrix;

/**
 * Stiffness and mass over the same unknowns.
 *
 * @param stiffness K
 * @param mass M
 */
public record MatrixPair(SymmetricMatrix stiffness, SymmetricMatrix mass) {

    /**
     * The rows and columns of some unknowns alone.
     *
     * @param unknowns ascending
     */
    MatrixPair restrictedTo(int[] unknowns) {
        return new MatrixPair(restrict(stiffness, unknowns), restrict(mass, unknowns));
    }

    private static SymmetricMatrix restrict(SymmetricMatrix matrix, int[] unknowns) {
        int[] columnStart = matrix.columnStart();
        int most = 0;
        for (int unknown : unknowns) {
            most += columnStart[unknown + 1] - columnStart[unknown];
        }
        int[] start = new int[unknowns.length + 1];
        int[] row = new int[most];
        double[] value = new double[most];
        int count = 0;
        for (int i = 0; i < unknowns.length; i++) {
            for (int p = columnStart[unknowns[i]]; p < columnStart[unknowns[i] + 1]; p++) {
                int number = Arrays.binarySearch(unknowns, matrix.row()[p]);
                if (number >= 0) {
                    row[count] = number;
                    value[count++] = matrix.value()[p];
                }
            }
            start[i + 1] = count;
        }
        return new SymmetricMatrix(unknowns.length, start, Arrays.copyOf(row, count), Arrays.copyOf(value, count));
    }
}
