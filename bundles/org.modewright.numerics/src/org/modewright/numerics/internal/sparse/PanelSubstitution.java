package org.modewright.numerics.internal.sparse;

/** Forward and backward substitution with one block of the factor for four right-hand sides, interleaved by rows. */
final class PanelSubstitution {

    private static final int WIDTH = 4;

    private PanelSubstitution() {
    }

    /** Forward substitution with L, then the solution with D. */
    static void forward(FactorBlock block, double[] x, double[] work) {
        gather(block, x, work);
        int rows = block.rows();
        double[] l = block.l();
        for (int k = 0; k < block.pivots(); k++) {
            int p = WIDTH * k;
            double x0 = work[p];
            double x1 = work[p + 1];
            double x2 = work[p + 2];
            double x3 = work[p + 3];
            int column = k * rows;
            for (int i = k + 1; i < rows; i++) {
                double multiplier = l[column + i];
                int q = WIDTH * i;
                work[q] -= multiplier * x0;
                work[q + 1] -= multiplier * x1;
                work[q + 2] -= multiplier * x2;
                work[q + 3] -= multiplier * x3;
            }
        }
        solveDiagonal(block, work);
        scatter(block, block.rows(), work, x);
    }

    /** Backward substitution with L<sup>T</sup>. */
    static void backward(FactorBlock block, double[] x, double[] work) {
        gather(block, x, work);
        int rows = block.rows();
        double[] l = block.l();
        for (int k = block.pivots() - 1; k >= 0; k--) {
            double x0 = 0.0;
            double x1 = 0.0;
            double x2 = 0.0;
            double x3 = 0.0;
            int column = k * rows;
            for (int i = k + 1; i < rows; i++) {
                double multiplier = l[column + i];
                int q = WIDTH * i;
                x0 += multiplier * work[q];
                x1 += multiplier * work[q + 1];
                x2 += multiplier * work[q + 2];
                x3 += multiplier * work[q + 3];
            }
            int p = WIDTH * k;
            work[p] -= x0;
            work[p + 1] -= x1;
            work[p + 2] -= x2;
            work[p + 3] -= x3;
        }
        scatter(block, block.pivots(), work, x);
    }

    private static void gather(FactorBlock block, double[] x, double[] work) {
        int[] index = block.index();
        for (int i = 0; i < index.length; i++) {
            System.arraycopy(x, WIDTH * index[i], work, WIDTH * i, WIDTH);
        }
    }

    private static void scatter(FactorBlock block, int rows, double[] work, double[] x) {
        int[] index = block.index();
        for (int i = 0; i < rows; i++) {
            System.arraycopy(work, WIDTH * i, x, WIDTH * index[i], WIDTH);
        }
    }

    private static void solveDiagonal(FactorBlock block, double[] work) {
        int k = 0;
        while (k < block.pivots()) {
            int p = WIDTH * k;
            if (block.e()[k] != 0.0) {
                solvePair(block, k, work);
                k += 2;
                continue;
            }
            double inverse = block.vanished()[k] ? 0.0 : 1.0 / block.d()[k];
            for (int c = p; c < p + WIDTH; c++) {
                work[c] *= inverse;
            }
            k++;
        }
    }

    private static void solvePair(FactorBlock block, int k, double[] work) {
        double dk = block.d()[k];
        double dNext = block.d()[k + 1];
        double e = block.e()[k];
        double determinant = dk * dNext - e * e;
        for (int c = WIDTH * k; c < WIDTH * k + WIDTH; c++) {
            double first = work[c];
            double second = work[c + WIDTH];
            work[c] = (dNext * first - e * second) / determinant;
            work[c + WIDTH] = (dk * second - e * first) / determinant;
        }
    }
}
