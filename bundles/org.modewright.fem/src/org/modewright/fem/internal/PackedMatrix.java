package org.modewright.fem.internal;

import java.util.Arrays;

/** Operations on small symmetric matrices, full by rows or packed as their lower triangle by rows. */
final class PackedMatrix {

    private PackedMatrix() {
    }

    /** The lower triangle by rows of a full matrix by rows. */
    static double[] pack(int order, double[] full) {
        double[] packed = new double[order * (order + 1) / 2];
        int place = 0;
        for (int i = 0; i < order; i++) {
            for (int j = 0; j <= i; j++) {
                packed[place++] = 0.5 * (full[order * i + j] + full[order * j + i]);
            }
        }
        return packed;
    }

    /** The absolute values. */
    static double[] absolute(double[] packed) {
        return Arrays.stream(packed).map(Math::abs).toArray();
    }

    /**
     * Adds A<sup>T</sup> B C, all 6 x 6 by rows, to a block of a full matrix.
     *
     * @param matrix the full matrix by rows
     * @param order its order
     * @param row first row of the block
     * @param column first column of the block
     */
    static void addProduct(double[] matrix, int order, int row, int column, double[] a, double[] b, double[] c) {
        double[] product = new double[36];
        for (int i = 0; i < 6; i++) {
            for (int k = 0; k < 6; k++) {
                double entry = b[6 * i + k];
                if (entry == 0.0) {
                    continue;
                }
                for (int j = 0; j < 6; j++) {
                    product[6 * i + j] += entry * c[6 * k + j];
                }
            }
        }
        for (int k = 0; k < 6; k++) {
            for (int i = 0; i < 6; i++) {
                double entry = a[6 * k + i];
                if (entry == 0.0) {
                    continue;
                }
                for (int j = 0; j < 6; j++) {
                    matrix[order * (row + i) + column + j] += entry * product[6 * k + j];
                }
            }
        }
    }

    /** y += A x, the matrix packed, x and y gathered from places. */
    static void addMultiply(double[] packed, int[] places, double[] x, double[] y) {
        int place = 0;
        for (int i = 0; i < places.length; i++) {
            double xi = x[places[i]];
            double sum = 0.0;
            for (int j = 0; j < i; j++) {
                double entry = packed[place++];
                sum += entry * x[places[j]];
                y[places[j]] += entry * xi;
            }
            y[places[i]] += sum + packed[place++] * xi;
        }
    }

    /** x<sup>T</sup> A y, the matrix packed, x and y gathered from places. */
    static double bilinear(double[] packed, int[] places, double[] x, double[] y) {
        double total = 0.0;
        int place = 0;
        for (int i = 0; i < places.length; i++) {
            double xi = x[places[i]];
            double yi = y[places[i]];
            for (int j = 0; j < i; j++) {
                total += packed[place++] * (xi * y[places[j]] + yi * x[places[j]]);
            }
            total += packed[place++] * xi * yi;
        }
        return total;
    }
}
