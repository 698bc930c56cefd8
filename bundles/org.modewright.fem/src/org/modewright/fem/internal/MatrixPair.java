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

    /** The rows and columns of some unknowns alone. */
    MatrixPair restrictedTo(int[] unknowns) {
        return new MatrixPair(restrict(stiffness, unknowns), restrict(mass, unknowns));
    }

    private static SymmetricMatrix restrict(SymmetricMatrix matrix, int[] unknowns) {
        int[] number = new int[matrix.order()];
        Arrays.fill(number, -1);
        for (int i = 0; i < unknowns.length; i++) {
            number[unknowns[i]] = i;
        }
        int[] start = new int[unknowns.length + 1];
        int[] row = new int[matrix.entries()];
        double[] value = new double[matrix.entries()];
        int count = 0;
        for (int i = 0; i < unknowns.length; i++) {
            for (int p = matrix.columnStart()[unknowns[i]]; p < matrix.columnStart()[unknowns[i] + 1]; p++) {
                if (number[matrix.row()[p]] >= 0) {
                    row[count] = number[matrix.row()[p]];
                    value[count++] = matrix.value()[p];
                }
            }
            start[i + 1] = count;
        }
        return new SymmetricMatrix(unknowns.length, start, Arrays.copyOf(row, count),
                Arrays.copyOf(value, count));
    }
}
