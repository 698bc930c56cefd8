package org.modewright.numerics.internal.sparse;

import java.util.Arrays;

/**
 * C &larr; C - L W<sup>T</sup> on the lower triangle of a dense column-major array, W = L D. Operands are packed into strips of four rows
 * and multiplied in four by four register blocks.
 */
final class RankUpdate {

    private static final int BLOCK = 4;
    /** Rows of L that stay in the second-level cache while a strip of W passes over them. */
    private static final int ROW_CHUNK = 256;

    private double[] left = new double[0];
    private double[] right = new double[0];
    private final double[] tile = new double[BLOCK * BLOCK];

    /**
     * Updates rows and columns from..size-1 with the columns first..end-1.
     *
     * @param a array of the front
     * @param size leading dimension
     * @param from first row and column to update
     * @param first first column of L
     * @param end one past the last column of L
     * @param d diagonal of D, indexed by column
     * @param e subdiagonal of D, indexed by column
     */
    void apply(double[] a, int size, int from, int first, int end, double[] d, double[] e) {
        int depth = end - first;
        int strips = (size - from + BLOCK - 1) / BLOCK;
        if (depth == 0 || strips == 0) {
            return;
        }
        reserve(strips * BLOCK * depth);
        pack(a, size, from, first, end, d, e);
        for (int chunk = 0; chunk < strips; chunk += ROW_CHUNK / BLOCK) {
            int chunkEnd = Math.min(strips, chunk + ROW_CHUNK / BLOCK);
            for (int columnStrip = 0; columnStrip < chunkEnd; columnStrip++) {
                updateStrip(a, size, from, depth, Math.max(chunk, columnStrip), chunkEnd, columnStrip);
            }
        }
    }

    private void reserve(int length) {
        if (left.length < length) {
            left = new double[length];
            right = new double[length];
        }
    }

    private void pack(double[] a, int size, int from, int first, int end, double[] d, double[] e) {
        int depth = end - first;
        int rows = size - from;
        for (int k = first; k < end; k++) {
            int column = k * size + from;
            boolean secondOfPair = k > 0 && e[k - 1] != 0.0;
            int partner = e[k] != 0.0 ? column + size : column - size;
            double coupling = e[k] != 0.0 ? e[k] : secondOfPair ? e[k - 1] : 0.0;
            for (int i = 0; i < rows; i++) {
                int target = (i / BLOCK) * BLOCK * depth + (k - first) * BLOCK + i % BLOCK;
                double value = a[column + i];
                left[target] = value;
                right[target] = coupling == 0.0 ? d[k] * value : d[k] * value + coupling * a[partner + i];
            }
            for (int i = rows; i % BLOCK != 0; i++) {
                int target = (i / BLOCK) * BLOCK * depth + (k - first) * BLOCK + i % BLOCK;
                left[target] = 0.0;
                right[target] = 0.0;
            }
        }
    }

    private void updateStrip(double[] a, int size, int from, int depth, int firstRowStrip, int endRowStrip, int columnStrip) {
        int rows = size - from;
        int column = columnStrip * BLOCK;
        int width = Math.min(BLOCK, rows - column);
        for (int rowStrip = firstRowStrip; rowStrip < endRowStrip; rowStrip++) {
            int row = rowStrip * BLOCK;
            int target = (from + column) * size + from + row;
            if (rowStrip > columnStrip && row + BLOCK <= rows && width == BLOCK) {
                subtractProduct(depth, left, row * depth, right, column * depth, a, target, size);
            } else {
                subtractPart(a, target, size, depth, row, column, Math.min(BLOCK, rows - row), width);
            }
        }
    }

    private void subtractPart(double[] a, int target, int size, int depth, int row, int column, int height, int width) {
        Arrays.fill(tile, 0.0);
        subtractProduct(depth, left, row * depth, right, column * depth, tile, 0, BLOCK);
        for (int j = 0; j < width; j++) {
            for (int i = row == column ? j : 0; i < height; i++) {
                a[target + j * size + i] += tile[j * BLOCK + i];
            }
        }
    }

    private static void subtractProduct(int depth, double[] l, int lStart, double[] w, int wStart, double[] c, int cStart, int cSize) {
        double c00 = 0;
        double c10 = 0;
        double c20 = 0;
        double c30 = 0;
        double c01 = 0;
        double c11 = 0;
        double c21 = 0;
        double c31 = 0;
        double c02 = 0;
        double c12 = 0;
        double c22 = 0;
        double c32 = 0;
        double c03 = 0;
        double c13 = 0;
        double c23 = 0;
        double c33 = 0;
        for (int k = 0; k < depth; k++) {
            int p = lStart + BLOCK * k;
            int q = wStart + BLOCK * k;
            double l0 = l[p];
            double l1 = l[p + 1];
            double l2 = l[p + 2];
            double l3 = l[p + 3];
            double w0 = w[q];
            double w1 = w[q + 1];
            double w2 = w[q + 2];
            double w3 = w[q + 3];
            c00 += l0 * w0;
            c10 += l1 * w0;
            c20 += l2 * w0;
            c30 += l3 * w0;
            c01 += l0 * w1;
            c11 += l1 * w1;
            c21 += l2 * w1;
            c31 += l3 * w1;
            c02 += l0 * w2;
            c12 += l1 * w2;
            c22 += l2 * w2;
            c32 += l3 * w2;
            c03 += l0 * w3;
            c13 += l1 * w3;
            c23 += l2 * w3;
            c33 += l3 * w3;
        }
        int column = cStart;
        c[column] -= c00;
        c[column + 1] -= c10;
        c[column + 2] -= c20;
        c[column + 3] -= c30;
        column += cSize;
        c[column] -= c01;
        c[column + 1] -= c11;
        c[column + 2] -= c21;
        c[column + 3] -= c31;
        column += cSize;
        c[column] -= c02;
        c[column + 1] -= c12;
        c[column + 2] -= c22;
        c[column + 3] -= c32;
        column += cSize;
        c[column] -= c03;
        c[column + 1] -= c13;
        c[column + 2] -= c23;
        c[column + 3] -= c33;
    }
}
