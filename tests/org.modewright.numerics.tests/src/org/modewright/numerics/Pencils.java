package org.modewright.numerics;

import java.util.Random;

/** Stiffness and mass pairs for the tests. */
final class Pencils {

    private Pencils() {
    }

    /** Equal masses joined by equal springs; held at its first, at both or at no end. */
    static EigenProblem chain(int masses, double stiffness, double mass, boolean firstHeld, boolean lastHeld) {
        SymmetricMatrix.Builder k = SymmetricMatrix.builder(masses);
        SymmetricMatrix.Builder m = SymmetricMatrix.builder(masses);
        for (int i = 0; i < masses; i++) {
            m.add(i, i, mass);
            if (i > 0) {
                addSpring(k, i - 1, i, stiffness);
            }
        }
        if (firstHeld) {
            k.add(0, 0, stiffness);
        }
        if (lastHeld) {
            k.add(masses - 1, masses - 1, stiffness);
        }
        return new EigenProblem(k.build(), m.build());
    }

    static void addSpring(SymmetricMatrix.Builder k, int i, int j, double stiffness) {
        k.add(i, i, stiffness);
        k.add(j, j, stiffness);
        k.add(i, j, -stiffness);
    }

    /** A random sparse symmetric matrix with small integer entries, so that sums are exact. */
    static SymmetricMatrix randomInteger(int order, double density, int largest, Random random) {
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(order);
        for (int i = 0; i < order; i++) {
            for (int j = 0; j <= i; j++) {
                if (random.nextDouble() < density) {
                    builder.add(i, j, random.nextInt(2 * largest + 1) - largest);
                }
            }
        }
        return builder.build();
    }

    /** G G^T with G random of the given rank, restricted to a band so that it stays sparse. */
    static SymmetricMatrix randomSemidefinite(int order, int rank, int band, Random random) {
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(order);
        for (int c = 0; c < rank; c++) {
            int first = rank >= order ? c : random.nextInt(order);
            int size = Math.min(band, order);
            int[] at = new int[size];
            double[] g = new double[size];
            for (int k = 0; k < size; k++) {
                at[k] = (first + k) % order;
                g[k] = random.nextGaussian() + (k == 0 ? 2.0 : 0.0);
            }
            for (int a = 0; a < size; a++) {
                for (int b = 0; b <= a; b++) {
                    builder.add(at[a], at[b], g[a] * g[b]);
                }
            }
        }
        return builder.build();
    }

    /** A diagonal matrix. */
    static SymmetricMatrix diagonal(double... values) {
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(values.length);
        for (int i = 0; i < values.length; i++) {
            if (values[i] != 0.0) {
                builder.add(i, i, values[i]);
            }
        }
        return builder.build();
    }

    /** A + factor B. */
    static SymmetricMatrix sum(SymmetricMatrix a, double factor, SymmetricMatrix b) {
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(a.order());
        addAll(builder, a, 1.0);
        addAll(builder, b, factor);
        return builder.build();
    }

    private static void addAll(SymmetricMatrix.Builder builder, SymmetricMatrix matrix, double factor) {
        for (int column = 0; column < matrix.order(); column++) {
            for (int p = matrix.columnStart()[column]; p < matrix.columnStart()[column + 1]; p++) {
                builder.add(matrix.row()[p], column, factor * matrix.value()[p]);
            }
        }
    }

    /** Pin-jointed cube lattice with braced faces: three degrees of freedom a joint, springs along its edges and diagonals, unsupported. */
    static EigenProblem freeTruss(int nx, int ny, int nz) {
        int joints = nx * ny * nz;
        SymmetricMatrix.Builder k = SymmetricMatrix.builder(3 * joints);
        SymmetricMatrix.Builder m = SymmetricMatrix.builder(3 * joints);
        for (int a = 0; a < joints; a++) {
            for (int c = 0; c < 3; c++) {
                m.add(3 * a + c, 3 * a + c, 1.0 + 0.1 * (a % 7));
            }
            for (int b = a + 1; b < joints; b++) {
                int dx = b % nx - a % nx;
                int dy = b / nx % ny - a / nx % ny;
                int dz = b / (nx * ny) - a / (nx * ny);
                if (Math.abs(dx) <= 1 && Math.abs(dy) <= 1 && Math.abs(dz) <= 1) {
                    addBar(k, a, b, new double[] {dx, dy, dz}, 1000.0 + 10.0 * (a % 11));
                }
            }
        }
        return new EigenProblem(k.build(), m.build());
    }

    static void addBar(SymmetricMatrix.Builder k, int a, int b, double[] direction, double stiffness) {
        double length = Math.sqrt(direction[0] * direction[0] + direction[1] * direction[1] + direction[2] * direction[2]);
        for (int i = 0; i < 3; i++) {
            for (int j = 0; j < 3; j++) {
                double value = stiffness * direction[i] * direction[j] / (length * length * length);
                if (i >= j) {
                    k.add(3 * a + i, 3 * a + j, value);
                    k.add(3 * b + i, 3 * b + j, value);
                }
                k.add(3 * b + i, 3 * a + j, -value);
            }
        }
    }
}
