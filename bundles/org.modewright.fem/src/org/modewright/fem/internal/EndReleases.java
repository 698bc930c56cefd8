package org.modewright.fem.internal;

/**
 * Static condensation of released components of a member. With r the released and k the other components, the motion of the member's
 * ends is d<sub>r</sub> = -K<sub>rr</sub><sup>-1</sup> K<sub>rk</sub> d<sub>k</sub>, d = C d<sub>node</sub>; stiffness and mass become
 * C<sup>T</sup>KC and C<sup>T</sup>MC.
 *
 * <p>Where K<sub>rr</sub> is singular the releases make a mechanism inside the member, and its inverse is replaced by the
 * pseudo-inverse. A translation that is left undetermined follows the nodes, so that the member's mass stays with them; a rotation
 * that is left undetermined is dropped.
 *
 * <p>Source: R. J. Guyan, AIAA Journal 3 (1965) 380; J. S. Przemieniecki, Theory of Matrix Structural Analysis (1968), section 9.2.
 */
final class EndReleases {

    /** Eigenvalues of the scaled K_rr below this share of the largest entry count as zero: well above the round-off of 4 x 4 sums. */
    private static final double SINGULAR = 1e-11;
    /** Entries left below this share of the largest entry before condensation are round-off of exact cancellation. */
    private static final double ROUND_OFF = 1e-14;

    private final int order;
    private final boolean[] released;
    private final boolean[] translation;
    private final double length;

    /**
     * Describes the releases of one action of a member.
     *
     * @param released which components are released
     * @param translation which components are translations; the others are rotations
     * @param length length of the member, which makes rotations comparable to translations, m
     */
    EndReleases(boolean[] released, boolean[] translation, double length) {
        this.order = released.length;
        this.released = released;
        this.translation = translation;
        this.length = length;
    }

    /**
     * Condenses both matrices in place.
     *
     * @param stiffness elastic and geometric stiffness, by rows
     * @param mass mass, by rows
     */
    void condense(double[] stiffness, double[] mass) {
        if (!anyReleased()) {
            return;
        }
        scale(stiffness, true);
        scale(mass, true);
        double largest = largest(stiffness);
        double[] transformation = transformation(stiffness, largest);
        congruence(transformation, stiffness, largest * ROUND_OFF);
        congruence(transformation, mass, 0.0);
        scale(stiffness, false);
        scale(mass, false);
    }

    private boolean anyReleased() {
        for (boolean free : released) {
            if (free) {
                return true;
            }
        }
        return false;
    }

    /** To rotations times length, so that all entries of a matrix have one unit, or back. */
    private void scale(double[] matrix, boolean forward) {
        for (int i = 0; i < order; i++) {
            for (int j = 0; j < order; j++) {
                double factor = (translation[i] ? 1.0 : length) * (translation[j] ? 1.0 : length);
                matrix[i * order + j] *= forward ? 1.0 / factor : factor;
            }
        }
    }

    private static double largest(double[] matrix) {
        double largest = 0.0;
        for (double entry : matrix) {
            largest = Math.max(largest, Math.abs(entry));
        }
        return largest;
    }

    private double[] transformation(double[] stiffness, double largest) {
        double[] matrix = new double[order * order];
        int[] free = new int[order];
        int count = 0;
        for (int i = 0; i < order; i++) {
            if (released[i]) {
                free[count++] = i;
            } else {
                matrix[i * order + i] = 1.0;
            }
        }
        double[] block = new double[count * count];
        for (int i = 0; i < count; i++) {
            for (int j = 0; j < count; j++) {
                block[i * count + j] = stiffness[free[i] * order + free[j]];
            }
        }
        SmallSymmetricEigen eigen = new SmallSymmetricEigen(count, block);
        for (int k = 0; k < count; k++) {
            if (Math.abs(eigen.value(k)) > SINGULAR * largest) {
                subtractElastic(matrix, stiffness, free, count, eigen, k);
            } else {
                addFollowing(matrix, free, count, eigen, k);
            }
        }
        return matrix;
    }

    /** Part of -K_rr^+ K_rk that belongs to eigenvalue k of K_rr. */
    private void subtractElastic(double[] matrix, double[] stiffness, int[] free, int count, SmallSymmetricEigen eigen, int k) {
        for (int column = 0; column < order; column++) {
            if (released[column]) {
                continue;
            }
            double projection = 0.0;
            for (int i = 0; i < count; i++) {
                projection += eigen.vector(k, i) * stiffness[free[i] * order + column];
            }
            for (int i = 0; i < count; i++) {
                matrix[free[i] * order + column] -= eigen.vector(k, i) * projection / eigen.value(k);
            }
        }
    }

    /** An undetermined motion follows the translations of the nodes. */
    private void addFollowing(double[] matrix, int[] free, int count, SmallSymmetricEigen eigen, int k) {
        for (int j = 0; j < count; j++) {
            if (!translation[free[j]]) {
                continue;
            }
            for (int i = 0; i < count; i++) {
                matrix[free[i] * order + free[j]] += eigen.vector(k, i) * eigen.vector(k, j);
            }
        }
    }

    private void congruence(double[] transformation, double[] matrix, double roundOff) {
        double[] product = new double[order * order];
        for (int i = 0; i < order; i++) {
            for (int j = 0; j < order; j++) {
                double sum = 0.0;
                for (int k = 0; k < order; k++) {
                    sum += matrix[i * order + k] * transformation[k * order + j];
                }
                product[i * order + j] = sum;
            }
        }
        for (int i = 0; i < order; i++) {
            for (int j = 0; j <= i; j++) {
                double sum = 0.0;
                for (int k = 0; k < order; k++) {
                    sum += transformation[k * order + i] * product[k * order + j];
                }
                double entry = Math.abs(sum) <= roundOff ? 0.0 : sum;
                matrix[i * order + j] = entry;
                matrix[j * order + i] = entry;
            }
        }
    }
}
