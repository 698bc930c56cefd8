package org.modewright.fem.internal;

/**
 * Eigenvalues and eigenvectors of a small symmetric matrix by cyclic Jacobi rotations.
 *
 * <p>Source: G. H. Golub and C. F. Van Loan, Matrix Computations (4th edition, 2013), section 8.5.
 */
final class SmallSymmetricEigen {

    private static final int SWEEPS = 60;

    private final int order;
    private final double[] matrix;
    private final double[] vectors;

    /**
     * Decomposes a matrix.
     *
     * @param order number of rows, a few
     * @param symmetric the matrix by rows; left as it is
     */
    SmallSymmetricEigen(int order, double[] symmetric) {
        this.order = order;
        this.matrix = symmetric.clone();
        this.vectors = new double[order * order];
        for (int i = 0; i < order; i++) {
            vectors[i * order + i] = 1.0;
        }
        int sweep = 0;
        while (sweep < SWEEPS && sweep()) {
            sweep++;
        }
    }

    /** Eigenvalue k, in no order. */
    double value(int k) {
        return matrix[k * order + k];
    }

    /** Entry i of the eigenvector of length 1 that belongs to eigenvalue k. */
    double vector(int k, int i) {
        return vectors[i * order + k];
    }

    private boolean sweep() {
        boolean rotated = false;
        for (int p = 0; p < order; p++) {
            for (int q = p + 1; q < order; q++) {
                rotated |= rotate(p, q);
            }
        }
        return rotated;
    }

    private boolean rotate(int p, int q) {
        double off = matrix[p * order + q];
        double first = matrix[p * order + p];
        double second = matrix[q * order + q];
        if (Math.abs(off) <= 1e-17 * (Math.abs(first) + Math.abs(second)) || off == 0.0) {
            return false;
        }
        double tau = (second - first) / (2.0 * off);
        double tangent = Math.copySign(1.0, tau) / (Math.abs(tau) + Math.hypot(1.0, tau));
        double cosine = 1.0 / Math.hypot(1.0, tangent);
        double sine = tangent * cosine;
        for (int i = 0; i < order; i++) {
            turn(matrix, i * order + p, i * order + q, cosine, sine);
            turn(vectors, i * order + p, i * order + q, cosine, sine);
        }
        for (int i = 0; i < order; i++) {
            turn(matrix, p * order + i, q * order + i, cosine, sine);
        }
        matrix[p * order + q] = 0.0;
        matrix[q * order + p] = 0.0;
        return true;
    }

    private static void turn(double[] array, int p, int q, double cosine, double sine) {
        double a = array[p];
        double b = array[q];
        array[p] = cosine * a - sine * b;
        array[q] = sine * a + cosine * b;
    }
}
