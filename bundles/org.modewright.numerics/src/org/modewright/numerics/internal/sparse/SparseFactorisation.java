package org.modewright.numerics.internal.sparse;

import java.util.Arrays;

import org.modewright.numerics.Factorisation;
import org.modewright.numerics.Inertia;

/** Factors of S (K - &sigma;M) S, S diagonal. */
final class SparseFactorisation implements Factorisation {

    private static final int PANEL = 4;

    private final SymbolicFactorisation symbolic;
    private final FactorBlock[] blocks;
    private final double[] scale;
    private final int negative;
    private final double growth;
    private final int[] zeroPivots;
    private final int largestFront;

    SparseFactorisation(SymbolicFactorisation symbolic, FactorBlock[] blocks, double[] scale, int negative, double growth) {
        this.symbolic = symbolic;
        this.blocks = blocks;
        this.scale = scale;
        this.negative = negative;
        this.growth = growth;
        this.zeroPivots = collectZeroPivots();
        int largest = 0;
        for (FactorBlock block : blocks) {
            largest = Math.max(largest, block.rows());
        }
        this.largestFront = largest;
    }

    private int[] collectZeroPivots() {
        int[] found = new int[symbolic.order()];
        int count = 0;
        for (FactorBlock block : blocks) {
            for (int k = 0; k < block.pivots(); k++) {
                if (block.vanished()[k]) {
                    found[count++] = symbolic.degreeOfFreedom()[block.index()[k]];
                }
            }
        }
        int[] sorted = Arrays.copyOf(found, count);
        Arrays.sort(sorted);
        return sorted;
    }

    @Override
    public Inertia inertia() {
        return new Inertia(negative, zeroPivots.length, symbolic.order() - negative - zeroPivots.length);
    }

    @Override
    public int order() {
        return symbolic.order();
    }

    @Override
    public int[] zeroPivots() {
        return zeroPivots.clone();
    }

    @Override
    public double pivotGrowth() {
        return growth;
    }

    SymbolicFactorisation symbolic() {
        return symbolic;
    }

    @Override
    public void solve(double[] rightHandSide) {
        double[] x = new double[order()];
        scaleAndPermute(rightHandSide, x);
        forward(x);
        for (FactorBlock block : blocks) {
            block.solveDiagonal(x);
        }
        backward(x);
        permuteBackAndScale(x, rightHandSide);
    }

    private void scaleAndPermute(double[] from, double[] to) {
        if (from.length != order()) {
            throw new IllegalArgumentException("A right-hand side of length " + from.length + " does not fit a matrix of order "
                    + order() + ".");
        }
        int[] degreeOfFreedom = symbolic.degreeOfFreedom();
        for (int i = 0; i < to.length; i++) {
            to[i] = scale[i] * from[degreeOfFreedom[i]];
        }
    }

    private void permuteBackAndScale(double[] from, double[] to) {
        int[] degreeOfFreedom = symbolic.degreeOfFreedom();
        for (int i = 0; i < from.length; i++) {
            to[degreeOfFreedom[i]] = scale[i] * from[i];
        }
    }

    private void forward(double[] x) {
        for (FactorBlock block : blocks) {
            int rows = block.rows();
            double[] l = block.l();
            int[] index = block.index();
            for (int k = 0; k < block.pivots(); k++) {
                double value = x[index[k]];
                if (value != 0.0) {
                    for (int i = k + 1; i < rows; i++) {
                        x[index[i]] -= l[k * rows + i] * value;
                    }
                }
            }
        }
    }

    private void backward(double[] x) {
        for (int s = blocks.length - 1; s >= 0; s--) {
            FactorBlock block = blocks[s];
            int rows = block.rows();
            double[] l = block.l();
            int[] index = block.index();
            for (int k = block.pivots() - 1; k >= 0; k--) {
                double sum = x[index[k]];
                for (int i = k + 1; i < rows; i++) {
                    sum -= l[k * rows + i] * x[index[i]];
                }
                x[index[k]] = sum;
            }
        }
    }

    @Override
    public void solve(double[][] rightHandSides) {
        int done = 0;
        while (rightHandSides.length - done >= PANEL) {
            solvePanel(rightHandSides, done);
            done += PANEL;
        }
        for (; done < rightHandSides.length; done++) {
            solve(rightHandSides[done]);
        }
    }

    /** Solves for four right-hand sides, interleaved by rows so that every entry of L is read once for all of them. */
    private void solvePanel(double[][] rightHandSides, int first) {
        int n = order();
        double[] x = new double[PANEL * n];
        double[] column = new double[n];
        for (int c = 0; c < PANEL; c++) {
            scaleAndPermute(rightHandSides[first + c], column);
            for (int i = 0; i < n; i++) {
                x[PANEL * i + c] = column[i];
            }
        }
        double[] work = new double[PANEL * largestFront];
        for (FactorBlock block : blocks) {
            PanelSubstitution.forward(block, x, work);
        }
        for (int s = blocks.length - 1; s >= 0; s--) {
            PanelSubstitution.backward(blocks[s], x, work);
        }
        for (int c = 0; c < PANEL; c++) {
            for (int i = 0; i < n; i++) {
                column[i] = x[PANEL * i + c];
            }
            permuteBackAndScale(column, rightHandSides[first + c]);
        }
    }

    /** The null vector with given components at the zero pivots. */
    double[] nullVector(double[] weights) {
        double[] x = new double[order()];
        for (int z = 0; z < zeroPivots.length; z++) {
            int position = symbolic.position()[zeroPivots[z]];
            x[position] = weights[z] / scale[position];
        }
        // The columns of L at vanished pivots are zero, so the back substitution leaves their components as they are.
        backward(x);
        double[] vector = new double[order()];
        permuteBackAndScale(x, vector);
        return vector;
    }

    /** The product of the factors, for a vector: S<sup>-1</sup> L D L<sup>T</sup> S<sup>-1</sup> x. */
    double[] multiplyFactors(double[] vector) {
        int n = order();
        double[] x = new double[n];
        for (int i = 0; i < n; i++) {
            x[i] = vector[symbolic.degreeOfFreedom()[i]] / scale[i];
        }
        for (FactorBlock block : blocks) {
            FactorProduct.upper(block, x);
        }
        for (FactorBlock block : blocks) {
            FactorProduct.diagonal(block, x);
        }
        for (int s = blocks.length - 1; s >= 0; s--) {
            FactorProduct.lower(blocks[s], x);
        }
        double[] y = new double[n];
        for (int i = 0; i < n; i++) {
            y[symbolic.degreeOfFreedom()[i]] = x[i] / scale[i];
        }
        return y;
    }
}
