package org.modewright.numerics;

import java.util.Arrays;
import java.util.Objects;

/**
 * Symmetric sparse matrix: its lower triangle with the diagonal, compressed by columns, rows ascending in each column.
 * Entries that are not stored are zero; a stored zero is part of the pattern. Immutable by convention: the arrays are shared, not copied.
 */
public final class SymmetricMatrix {

    private final int order;
    private final int[] columnStart;
    private final int[] row;
    private final double[] value;

    /**
     * Wraps the arrays of a lower triangle.
     *
     * @param order number of rows
     * @param columnStart length order + 1: column j holds the entries columnStart[j] to columnStart[j + 1] - 1
     * @param row row of each entry, at least its column, ascending in each column
     * @param value value of each entry, finite
     * @throws IllegalArgumentException if the arrays do not describe such a triangle; the message names the column
     */
    public SymmetricMatrix(int order, int[] columnStart, int[] row, double[] value) {
        this.order = order;
        this.columnStart = Objects.requireNonNull(columnStart);
        this.row = Objects.requireNonNull(row);
        this.value = Objects.requireNonNull(value);
        checkShape();
        for (int column = 0; column < order; column++) {
            checkColumn(column);
        }
    }

    private void checkShape() {
        if (order < 0 || columnStart.length != order + 1 || columnStart[0] != 0) {
            throw new IllegalArgumentException("A matrix of order " + order + " needs " + (order + 1)
                    + " column starts beginning with 0.");
        }
        int entries = columnStart[order];
        if (entries < 0 || row.length < entries || value.length < entries) {
            throw new IllegalArgumentException("The column starts announce " + entries + " entries, but there are " + row.length
                    + " rows and " + value.length + " values.");
        }
    }

    private void checkColumn(int column) {
        if (columnStart[column + 1] < columnStart[column]) {
            throw new IllegalArgumentException("Column " + column + " ends before it starts.");
        }
        int previous = column - 1;
        for (int p = columnStart[column]; p < columnStart[column + 1]; p++) {
            if (row[p] <= previous || row[p] >= order) {
                throw new IllegalArgumentException("Column " + column + " holds row " + row[p]
                        + "; rows must ascend from the diagonal and stay below " + order + ".");
            }
            if (!Double.isFinite(value[p])) {
                throw new IllegalArgumentException("The entry at row " + row[p] + ", column " + column + " is " + value[p]
                        + "; every entry must be a finite number.");
            }
            previous = row[p];
        }
    }

    /** Number of rows. */
    public int order() {
        return order;
    }

    /** Where each column starts; length order + 1. */
    public int[] columnStart() {
        return columnStart;
    }

    /** Row of each stored entry. */
    public int[] row() {
        return row;
    }

    /** Value of each stored entry. */
    public double[] value() {
        return value;
    }

    /** Number of stored entries of the lower triangle. */
    public int entries() {
        return columnStart[order];
    }

    /**
     * y = A x.
     *
     * @param x length order
     * @param y length order, overwritten; not the same array as x
     */
    public void multiply(double[] x, double[] y) {
        if (x == y) {
            throw new IllegalArgumentException("The product needs an array of its own.");
        }
        checkLength(x);
        checkLength(y);
        Arrays.fill(y, 0, order, 0.0);
        for (int column = 0; column < order; column++) {
            y[column] += multiplyColumn(column, x, y);
        }
    }

    private double multiplyColumn(int column, double[] x, double[] y) {
        double xColumn = x[column];
        double sum = 0.0;
        for (int p = columnStart[column]; p < columnStart[column + 1]; p++) {
            int i = row[p];
            sum += value[p] * x[i];
            if (i != column) {
                y[i] += value[p] * xColumn;
            }
        }
        return sum;
    }

    /** A x. */
    public double[] multiply(double[] x) {
        double[] y = new double[order];
        multiply(x, y);
        return y;
    }

    /** x<sup>T</sup> A x. */
    public double quadratic(double[] x) {
        checkLength(x);
        double sum = 0.0;
        for (int column = 0; column < order; column++) {
            double offDiagonal = 0.0;
            double diagonal = 0.0;
            for (int p = columnStart[column]; p < columnStart[column + 1]; p++) {
                if (row[p] == column) {
                    diagonal = value[p] * x[column];
                } else {
                    offDiagonal += value[p] * x[row[p]];
                }
            }
            sum += x[column] * (diagonal + 2.0 * offDiagonal);
        }
        return sum;
    }

    /** The entry at row i, column j; zero if it is not stored. */
    public double get(int i, int j) {
        int column = Math.min(i, j);
        int p = Arrays.binarySearch(row, columnStart[column], columnStart[column + 1], Math.max(i, j));
        return p < 0 ? 0.0 : value[p];
    }

    /** The diagonal, length order. */
    public double[] diagonal() {
        double[] diagonal = new double[order];
        for (int column = 0; column < order; column++) {
            int p = columnStart[column];
            if (p < columnStart[column + 1] && row[p] == column) {
                diagonal[column] = value[p];
            }
        }
        return diagonal;
    }

    private void checkLength(double[] x) {
        if (x.length < order) {
            throw new IllegalArgumentException("A vector of length " + x.length + " does not fit a matrix of order " + order + ".");
        }
    }

    /**
     * Collects contributions to a matrix.
     *
     * @param order number of rows
     */
    public static Builder builder(int order) {
        return new Builder(order);
    }

    /**
     * Sums contributions into a symmetric matrix. Zeros are kept as part of the pattern: adding an element's matrix whole lets the
     * ordering recognise the degrees of freedom of a node as one, which makes the factorisation cheaper.
     */
    public static final class Builder {

        private final int order;
        private int count;
        private int[] rows = new int[1024];
        private int[] columns = new int[1024];
        private double[] values = new double[1024];

        private Builder(int order) {
            if (order < 0) {
                throw new IllegalArgumentException("The order of a matrix cannot be " + order + ".");
            }
            this.order = order;
        }

        /**
         * Adds a contribution to a<sub>ij</sub> = a<sub>ji</sub>. Give each pair once, in either order; contributions to the same
         * entry are summed.
         *
         * @throws IllegalArgumentException if an index is outside the matrix or the value is not finite
         */
        public Builder add(int i, int j, double contribution) {
            if (i < 0 || j < 0 || i >= order || j >= order) {
                throw new IllegalArgumentException("Entry (" + i + ", " + j + ") lies outside a matrix of order " + order + ".");
            }
            if (!Double.isFinite(contribution)) {
                throw new IllegalArgumentException("The contribution to entry (" + i + ", " + j + ") is " + contribution
                        + "; it must be a finite number.");
            }
            if (count == rows.length) {
                grow();
            }
            rows[count] = Math.max(i, j);
            columns[count] = Math.min(i, j);
            values[count] = contribution;
            count++;
            return this;
        }

        private void grow() {
            int capacity = (int) Math.min(Integer.MAX_VALUE - 8L, 2L * count);
            rows = Arrays.copyOf(rows, capacity);
            columns = Arrays.copyOf(columns, capacity);
            values = Arrays.copyOf(values, capacity);
        }

        /** The matrix of the contributions so far; more may be added afterwards. */
        public SymmetricMatrix build() {
            int[] byRow = countingSort(rows, null);
            int[] byColumnThenRow = countingSort(columns, byRow);
            int[] columnStart = new int[order + 1];
            int[] row = new int[count];
            double[] value = new double[count];
            int entries = 0;
            int previous = -1;
            for (int position = 0; position < count; position++) {
                int triplet = byColumnThenRow[position];
                boolean same = previous >= 0 && rows[previous] == rows[triplet] && columns[previous] == columns[triplet];
                if (!same) {
                    row[entries] = rows[triplet];
                    entries++;
                    columnStart[columns[triplet] + 1] = entries;
                }
                value[entries - 1] += values[triplet];
                previous = triplet;
            }
            for (int column = 0; column < order; column++) {
                columnStart[column + 1] = Math.max(columnStart[column + 1], columnStart[column]);
            }
            return new SymmetricMatrix(order, columnStart, Arrays.copyOf(row, entries), Arrays.copyOf(value, entries));
        }

        /** Stable order of the triplets by key; sequence is the order to start from, null for the order of adding. */
        private int[] countingSort(int[] key, int[] sequence) {
            int[] next = new int[order + 1];
            for (int t = 0; t < count; t++) {
                next[key[t] + 1]++;
            }
            for (int k = 0; k < order; k++) {
                next[k + 1] += next[k];
            }
            int[] sorted = new int[count];
            for (int position = 0; position < count; position++) {
                int triplet = sequence == null ? position : sequence[position];
                sorted[next[key[triplet]]++] = triplet;
            }
            return sorted;
        }
    }
}
