package org.modewright.numerics.internal.sparse;

/**
 * Dense frontal matrix: lower triangle, column-major. The first columns are fully summed, so they may be eliminated.
 * After elimination column k holds column k of the unit lower triangular L below the diagonal; D stands apart.
 */
final class Front {

    /** Largest front whose square fits into one array. */
    private static final int LARGEST = 46340;

    final int size;
    final int fullySummed;
    /** Position in the order of elimination of each row; permuted along with the rows. */
    final int[] index;
    final double[] a;
    final double[] d;
    /** Subdiagonal of D: not 0 at the first column of a two by two pivot. */
    final double[] e;

    Front(int[] index, int fullySummed) {
        this.size = index.length;
        this.fullySummed = fullySummed;
        this.index = index;
        if (size > LARGEST) {
            throw new IllegalArgumentException("The equations are coupled too densely: " + size
                    + " of them depend on each other at once, and at most " + LARGEST + " can be dealt with.");
        }
        this.a = new double[size * size];
        this.d = new double[fullySummed + 1];
        this.e = new double[fullySummed + 1];
    }

    double get(int i, int j) {
        return i >= j ? a[j * size + i] : a[i * size + j];
    }

    void add(int i, int j, double value) {
        if (i >= j) {
            a[j * size + i] += value;
        } else {
            a[i * size + j] += value;
        }
    }

    /** Exchanges rows and columns p and q. */
    void swap(int p, int q) {
        if (p == q) {
            return;
        }
        int low = Math.min(p, q);
        int high = Math.max(p, q);
        for (int j = 0; j < low; j++) {
            exchange(j * size + low, j * size + high);
        }
        exchange(low * size + low, high * size + high);
        for (int j = low + 1; j < high; j++) {
            exchange(low * size + j, j * size + high);
        }
        for (int i = high + 1; i < size; i++) {
            exchange(low * size + i, high * size + i);
        }
        int kept = index[low];
        index[low] = index[high];
        index[high] = kept;
    }

    private void exchange(int p, int q) {
        double kept = a[p];
        a[p] = a[q];
        a[q] = kept;
    }
}
