package org.modewright.numerics.internal.eigen;

/**
 * Approximations from a Krylov basis V.
 *
 * @param theta eigenvalues of the projected operator, descending
 * @param coefficients coefficients[i] gives the vector V coefficients[i]
 * @param residuals M-norm of A x - &theta; x for each
 */
record RitzPairs(double[] theta, double[][] coefficients, double[] residuals) {

    /** For values near zero the residual is not measured against K &phi;. */
    private static final double SMALLEST_SHARE = 1e-3;

    int count() {
        return theta.length;
    }

    /**
     * Number of leading pairs whose purified vectors have relative residuals of at most a tolerance: ||r|| / &theta; divided by
     * &lambda; &theta; = 1 + &sigma; &theta;, which is 1 without a shift.
     */
    int converged(double tolerance, double shift) {
        int count = 0;
        while (count < theta.length && theta[count] > 0.0) {
            double share = Math.min(1.0, Math.max(SMALLEST_SHARE, Math.abs(1.0 + shift * theta[count])));
            if (residuals[count] > tolerance * theta[count] * share) {
                break;
            }
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
