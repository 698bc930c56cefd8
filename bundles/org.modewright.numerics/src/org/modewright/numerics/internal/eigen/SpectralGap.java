package org.modewright.numerics.internal.eigen;

/**
 * Finds where in an ascending list of eigenvalues an inertia count can be taken safely. Gaps are measured relative to the distance from
 * the shift &sigma;.
 */
final class SpectralGap {

    /** Eigenvalues closer than this, relatively, belong to one cluster. */
    static final double CLUSTER = 1e-5;
    private static final double FARTHEST = 0.01;

    private SpectralGap() {
    }

    /** Whether next lies in a cluster with last. */
    static boolean clustered(double last, double next, double sigma) {
        return next - last <= CLUSTER * Math.abs(next - sigma);
    }

    /**
     * First index at or after from whose value is not clustered with the next one.
     *
     * @param values ascending
     * @param from index to start at
     * @return values.length - 1 if the list ends in the cluster
     */
    static int endOfCluster(double[] values, int from, double sigma) {
        int last = from;
        while (last + 1 < values.length && clustered(values[last], values[last + 1], sigma)) {
            last++;
        }
        return last;
    }

    /** A place just above last: half-way to next, but no farther than a hundredth of the distance from the shift. */
    static double above(double last, double next, double sigma) {
        return last + Math.min(0.5 * (next - last), FARTHEST * Math.abs(last - sigma));
    }
}
