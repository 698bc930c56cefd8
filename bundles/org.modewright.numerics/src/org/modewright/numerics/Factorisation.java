package org.modewright.numerics;

/** The LDL<sup>T</sup> factors of K - shift M. Solves may be called from one thread at a time. */
public interface Factorisation extends AutoCloseable {

    /** Inertia of K - shift M, read from D. */
    Inertia inertia();

    /** Number of rows. */
    int order();

    /**
     * Solves (K - shift M) x = b.
     *
     * @param rightHandSide b on entry, x on return; length order
     */
    void solve(double[] rightHandSide);

    /**
     * Solves for several right-hand sides at once, which is several times faster than one by one.
     *
     * @param rightHandSides each b on entry, x on return; each of length order
     */
    void solve(double[][] rightHandSides);

    /**
     * Degrees of freedom whose pivot vanished, ascending. Their solution component is set to 0: the solution is the one of the system
     * that is held there.
     */
    int[] zeroPivots();

    /** Largest multiplier in L after scaling each row and column to a unit diagonal; large values warn of an inaccurate factor. */
    double pivotGrowth();

    @Override
    default void close() {
        // factors in Java arrays need no release
    }
}
