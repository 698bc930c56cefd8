package org.modewright.numerics.internal.eigen;

/**
 * Approximations from a Krylov basis V.
 *
 * @param theta eigenvalues of the projected operator, descending
 * @param coefficients coefficients[i] gives the vector V coefficients[i]
 * @param residuals M-norm of A x - &theta; x for each
 */
record RitzPairs(double[] theta, double[][] coefficients, double[] residuals) {

    int count() {
        return theta.length;
    }

    /** Number of leading pairs whose residual is at most tolerance &theta;. */
    int converged(double tolerance) {
        int count = 0;
        while (count < theta.length && theta[count] > 0.0 && residuals[count] <= tolerance * theta[count]) {
            count++;
        }
        return count;
    }

    /** &sigma; + 1/&theta;, ascending; infinite where &theta; is not positive. */
    double[] eigenvalues(double shift) {
        double[] values = new double[theta.length];
        for (int i = 0; i < theta.length; i++) {
            values[i] = theta[i] > 0.0 ? shift + 1.0 / theta[i] : Double.POSITIVE_INFINITY;
        }
        return values;
    }
}
