package org.modewright.numerics;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;

import org.junit.jupiter.api.Test;

class SymmetricMatrixTest {

    @Test
    void builderSumsContributionsInEitherOrder() {
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(3);
        builder.add(0, 2, 1.5).add(2, 0, 2.0).add(1, 1, -1.0).add(1, 1, 4.0).add(0, 1, 0.0);
        SymmetricMatrix matrix = builder.build();
        assertArrayEquals(new int[] {0, 2, 3, 3}, matrix.columnStart());
        assertArrayEquals(new int[] {1, 2, 1}, matrix.row());
        assertArrayEquals(new double[] {0.0, 3.5, 3.0}, matrix.value());
        assertEquals(3.5, matrix.get(0, 2));
        assertEquals(3.5, matrix.get(2, 0));
        assertEquals(0.0, matrix.get(2, 2));
        assertArrayEquals(new double[] {0.0, 3.0, 0.0}, matrix.diagonal());
    }

    @Test
    void productsAgreeWithTheDenseMatrix() {
        Random random = new Random(1);
        int n = 300;
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(n);
        double[][] dense = new double[n][n];
        for (int t = 0; t < 5000; t++) {
            int i = random.nextInt(n);
            int j = random.nextInt(n);
            int value = random.nextInt(9) - 4;
            builder.add(i, j, value);
            dense[i][j] += value;
            if (i != j) {
                dense[j][i] += value;
            }
        }
        SymmetricMatrix matrix = builder.build();
        double[] x = random.ints(n, -5, 6).asDoubleStream().toArray();
        double[] expected = new double[n];
        double quadratic = 0.0;
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                expected[i] += dense[i][j] * x[j];
            }
            quadratic += x[i] * expected[i];
        }
        // Integers: sums are exact.
        assertArrayEquals(expected, matrix.multiply(x));
        assertEquals(quadratic, matrix.quadratic(x));
    }

    @Test
    void wrongInputIsRefusedWithItsPlace() {
        assertThrows(IllegalArgumentException.class, () -> SymmetricMatrix.builder(2).add(0, 2, 1.0));
        IllegalArgumentException notFinite = assertThrows(IllegalArgumentException.class,
                () -> SymmetricMatrix.builder(9).add(7, 4, Double.NaN));
        assertTrue(notFinite.getMessage().contains("(7, 4)"), notFinite.getMessage());
        assertThrows(IllegalArgumentException.class,
                () -> new SymmetricMatrix(2, new int[] {0, 2, 2}, new int[] {1, 0}, new double[] {1.0, 1.0}));
        assertThrows(IllegalArgumentException.class,
                () -> new SymmetricMatrix(2, new int[] {0, 1, 2}, new int[] {0, 0}, new double[] {1.0, 1.0}));
        assertThrows(IllegalArgumentException.class, () -> Pencils.diagonal(1.0, 2.0).multiply(new double[1]));
    }

    @Test
    void emptyMatrixHasNoEntries() {
        assertEquals(0, SymmetricMatrix.builder(0).build().entries());
        assertEquals(0, SymmetricMatrix.builder(5).build().entries());
    }
}
