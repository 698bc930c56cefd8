package org.modewright.fem.internal;

/**
 * Small matrices of rigid bodies: what a rigid arm does to motions and what a rigid mass does to a node. A point at arm r from a node
 * moves by u + &theta; &times; r.
 */
final class RigidArm {

    /** Levers shorter than this share of the arm are round-off of an arm that points along the axis. */
    private static final double ROUND_OFF = 4.0 * Math.ulp(1.0);

    private RigidArm() {
    }

    /**
     * Motion of the end of an arm, in axes of its own, from the motion of the node in global axes: 6 x 6 by rows. Along the arm a
     * rotation moves nothing, exactly: a stiff member would turn round-off there into a stiffness of its own.
     *
     * @param axes the axes x, y, z, one after the other, in global components; length 9
     * @param arm from the node to the end of the arm, global axes; length 3
     */
    static double[] motion(double[] axes, double[] arm) {
        double[] matrix = new double[36];
        double negligible = ROUND_OFF * Math.sqrt(arm[0] * arm[0] + arm[1] * arm[1] + arm[2] * arm[2]);
        for (int i = 0; i < 3; i++) {
            double ax = axes[3 * i];
            double ay = axes[3 * i + 1];
            double az = axes[3 * i + 2];
            for (int j = 0; j < 3; j++) {
                matrix[6 * i + j] = axes[3 * i + j];
                matrix[6 * (i + 3) + j + 3] = axes[3 * i + j];
            }
            // a . (theta x r) = theta . (r x a)
            matrix[6 * i + 3] = unless(negligible, arm[1] * az - arm[2] * ay);
            matrix[6 * i + 4] = unless(negligible, arm[2] * ax - arm[0] * az);
            matrix[6 * i + 5] = unless(negligible, arm[0] * ay - arm[1] * ax);
        }
        return matrix;
    }

    private static double unless(double negligible, double lever) {
        return Math.abs(lever) <= negligible ? 0.0 : lever;
    }

    /**
     * Mass of a straight rigid line about its node, in axes whose x runs along the line; 6 x 6 by rows.
     *
     * @param mass mass per length, kg/m
     * @param spin rotary inertia about the line per length, kg m
     * @param from coordinate along the line where it begins, m, measured from the point the matrix is for
     * @param to coordinate where it ends, m
     */
    static double[] lineMass(double mass, double spin, double from, double to) {
        double length = to - from;
        double first = mass * length * 0.5 * (from + to);
        double second = mass * (to * to * to - from * from * from) / 3.0;
        double[] matrix = new double[36];
        for (int i = 0; i < 3; i++) {
            matrix[7 * i] = mass * length;
        }
        matrix[21] = spin * length;
        matrix[28] = second;
        matrix[35] = second;
        matrix[6 + 5] = first;
        matrix[30 + 1] = first;
        matrix[12 + 4] = -first;
        matrix[24 + 2] = -first;
        return matrix;
    }
}
