package org.modewright.numerics.internal.eigen;

/**
 * Products of tall matrices stored as arrays of columns, in four by four register blocks over chunks of rows.
 */
final class BlockOperations {

    private static final int BLOCK = 4;
    private static final int CHUNK = 1024;

    private BlockOperations() {
    }

    /**
     * V<sup>T</sup>W.
     *
     * @param v at least count columns
     * @param count number of columns of V to use
     * @param w columns of the same length
     * @return element [i][j] is v<sub>i</sub><sup>T</sup>w<sub>j</sub>
     */
    static double[][] transposedProduct(double[][] v, int count, double[][] w) {
        double[][] product = new double[count][w.length];
        int n = w.length == 0 ? 0 : w[0].length;
        double[] tile = new double[BLOCK * BLOCK];
        for (int start = 0; start < n; start += CHUNK) {
            int end = Math.min(n, start + CHUNK);
            for (int j = 0; j < w.length; j += BLOCK) {
                for (int i = 0; i < count; i += BLOCK) {
                    multiplyTile(v, i, count, w, j, start, end, tile);
                    addTile(tile, product, i, j, count, w.length);
                }
            }
        }
        return product;
    }

    private static void addTile(double[] tile, double[][] product, int i, int j, int rows, int columns) {
        for (int a = 0; a < BLOCK && i + a < rows; a++) {
            for (int b = 0; b < BLOCK && j + b < columns; b++) {
                product[i + a][j + b] += tile[BLOCK * a + b];
            }
        }
    }

    private static void multiplyTile(double[][] v, int i, int count, double[][] w, int j, int start, int end, double[] tile) {
        int lastV = count - 1;
        int lastW = w.length - 1;
        dots(v[i], v[Math.min(i + 1, lastV)], v[Math.min(i + 2, lastV)], v[Math.min(i + 3, lastV)], w[j], w[Math.min(j + 1, lastW)],
                w[Math.min(j + 2, lastW)], w[Math.min(j + 3, lastW)], start, end, tile);
    }

    private static void dots(double[] v0, double[] v1, double[] v2, double[] v3, double[] w0, double[] w1, double[] w2, double[] w3,
            int start, int end, double[] tile) {
        double s00 = 0;
        double s01 = 0;
        double s02 = 0;
        double s03 = 0;
        double s10 = 0;
        double s11 = 0;
        double s12 = 0;
        double s13 = 0;
        double s20 = 0;
        double s21 = 0;
        double s22 = 0;
        double s23 = 0;
        double s30 = 0;
        double s31 = 0;
        double s32 = 0;
        double s33 = 0;
        for (int k = start; k < end; k++) {
            double a0 = v0[k];
            double a1 = v1[k];
            double a2 = v2[k];
            double a3 = v3[k];
            double b0 = w0[k];
            double b1 = w1[k];
            double b2 = w2[k];
            double b3 = w3[k];
            s00 += a0 * b0;
            s01 += a0 * b1;
            s02 += a0 * b2;
            s03 += a0 * b3;
            s10 += a1 * b0;
            s11 += a1 * b1;
            s12 += a1 * b2;
            s13 += a1 * b3;
            s20 += a2 * b0;
            s21 += a2 * b1;
            s22 += a2 * b2;
            s23 += a2 * b3;
            s30 += a3 * b0;
            s31 += a3 * b1;
            s32 += a3 * b2;
            s33 += a3 * b3;
        }
        tile[0] = s00;
        tile[1] = s01;
        tile[2] = s02;
        tile[3] = s03;
        tile[4] = s10;
        tile[5] = s11;
        tile[6] = s12;
        tile[7] = s13;
        tile[8] = s20;
        tile[9] = s21;
        tile[10] = s22;
        tile[11] = s23;
        tile[12] = s30;
        tile[13] = s31;
        tile[14] = s32;
        tile[15] = s33;
    }

    /**
     * W &larr; W - V H.
     *
     * @param w columns to update
     * @param v at least count columns
     * @param count number of columns of V to use
     * @param h count rows, one column per column of W
     */
    static void subtractProduct(double[][] w, double[][] v, int count, double[][] h) {
        int n = w.length == 0 ? 0 : w[0].length;
        for (int start = 0; start < n; start += CHUNK) {
            int end = Math.min(n, start + CHUNK);
            for (int j = 0; j < w.length; j++) {
                int i = 0;
                for (; i + BLOCK <= count; i += BLOCK) {
                    subtractFour(w[j], v[i], v[i + 1], v[i + 2], v[i + 3], h[i][j], h[i + 1][j], h[i + 2][j], h[i + 3][j], start, end);
                }
                for (; i < count; i++) {
                    subtractOne(w[j], v[i], h[i][j], start, end);
                }
            }
        }
    }

    private static void subtractFour(double[] w, double[] v0, double[] v1, double[] v2, double[] v3, double h0, double h1, double h2,
            double h3, int start, int end) {
        for (int k = start; k < end; k++) {
            w[k] -= v0[k] * h0 + v1[k] * h1 + v2[k] * h2 + v3[k] * h3;
        }
    }

    private static void subtractOne(double[] w, double[] v, double h, int start, int end) {
        for (int k = start; k < end; k++) {
            w[k] -= v[k] * h;
        }
    }

    /**
     * The first columns of V S.
     *
     * @param v at least count columns
     * @param count number of columns of V to use
     * @param s s[j] holds the count coefficients of column j of the result
     * @return s.length columns
     */
    static double[][] combine(double[][] v, int count, double[][] s) {
        int n = v[0].length;
        double[][] result = new double[s.length][n];
        double[][] negated = new double[count][s.length];
        for (int j = 0; j < s.length; j++) {
            for (int i = 0; i < count; i++) {
                negated[i][j] = -s[j][i];
            }
        }
        subtractProduct(result, v, count, negated);
        return result;
    }
}
