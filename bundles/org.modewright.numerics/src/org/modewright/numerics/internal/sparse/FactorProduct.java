package org.modewright.numerics.internal.sparse;

/** Products with the factors, block by block: used to put a matrix together again from its factors. */
final class FactorProduct {

    private FactorProduct() {
    }

    /** x &larr; L<sup>T</sup>x for the pivots of a block; blocks in ascending order. */
    static void upper(FactorBlock block, double[] x) {
        int rows = block.rows();
        for (int k = 0; k < block.pivots(); k++) {
            double sum = x[block.index()[k]];
            for (int i = k + 1; i < rows; i++) {
                sum += block.l()[k * rows + i] * x[block.index()[i]];
            }
            x[block.index()[k]] = sum;
        }
    }

    static void diagonal(FactorBlock block, double[] x) {
        for (int k = 0; k < block.pivots(); k++) {
            int i = block.index()[k];
            if (block.e()[k] == 0.0) {
                x[i] *= block.d()[k];
            } else {
                int j = block.index()[k + 1];
                double xi = block.d()[k] * x[i] + block.e()[k] * x[j];
                x[j] = block.e()[k] * x[i] + block.d()[k + 1] * x[j];
                x[i] = xi;
                k++;
            }
        }
    }

    /** x &larr; L x for the pivots of a block; blocks in descending order. */
    static void lower(FactorBlock block, double[] x) {
        int rows = block.rows();
        for (int k = block.pivots() - 1; k >= 0; k--) {
            double value = x[block.index()[k]];
            for (int i = k + 1; i < rows; i++) {
                x[block.index()[i]] += block.l()[k * rows + i] * value;
            }
        }
    }
}
