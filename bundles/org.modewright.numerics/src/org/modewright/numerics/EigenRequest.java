package org.modewright.numerics;

/**
 * Which eigenpairs are wanted: the lowest, as many as both limits allow.
 *
 * @param count at most so many; Integer.MAX_VALUE for no limit
 * @param below eigenvalues below this only; POSITIVE_INFINITY for no limit
 */
public record EigenRequest(int count, double below) {

    /** Checks the limits. */
    public EigenRequest {
        if (count < 0) {
            throw new IllegalArgumentException("The number of eigenpairs asked for is " + count + "; it cannot be negative.");
        }
        if (Double.isNaN(below)) {
            throw new IllegalArgumentException("The upper limit of the eigenvalues is not a number.");
        }
    }

    /** The lowest count eigenpairs. */
    public static EigenRequest lowest(int count) {
        return new EigenRequest(count, Double.POSITIVE_INFINITY);
    }

    /** All eigenpairs below a limit. */
    public static EigenRequest allBelow(double limit) {
        return new EigenRequest(Integer.MAX_VALUE, limit);
    }
}
