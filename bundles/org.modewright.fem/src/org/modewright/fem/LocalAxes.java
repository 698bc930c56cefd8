package org.modewright.fem;

/**
 * The local axes of a frame member: x from start to end; local z lies in the vertical plane through x and points up, y = z &times; x;
 * for a vertical member (horizontal part of x below 1e-6) y is global Y and z = x &times; y. The roll then turns y and z about x,
 * right-handed.
 */
public final class LocalAxes {

    private static final double VERTICAL = 1e-6;
    /** Components of a unit vector below this are round-off of its computation. */
    private static final double ROUND_OFF = 4.0 * Math.ulp(1.0);

    private LocalAxes() {
    }

    /**
     * The axes x, y, z, one after the other, in global components. A component that is round-off is exactly zero: across such a
     * direction the member shall resist nothing at all, not 1e-32 of its stiffness, which would be an eigenvalue of its own.
     *
     * @param direction from start to end, of any length but zero; length 3
     * @param roll roll, rad
     * @return length 9: a rotation matrix by rows, from global to local components
     */
    public static double[] of(double[] direction, double roll) {
        double[] x = unit(direction);
        double[] z = unit(Math.hypot(x[0], x[1]) < VERTICAL
                ? cross(x, new double[] {0.0, 1.0, 0.0})
                : new double[] {-x[2] * x[0], -x[2] * x[1], x[0] * x[0] + x[1] * x[1]});
        double[] y = cross(z, x);
        double cosine = Math.cos(roll);
        double sine = Math.sin(roll);
        double[] axes = new double[9];
        for (int i = 0; i < 3; i++) {
            axes[i] = x[i];
            axes[3 + i] = cosine * y[i] + sine * z[i];
            axes[6 + i] = cosine * z[i] - sine * y[i];
        }
        for (int i = 0; i < axes.length; i++) {
            axes[i] = Math.abs(axes[i]) < ROUND_OFF ? 0.0 : axes[i];
        }
        return axes;
    }

    private static double[] unit(double[] vector) {
        double length = Math.sqrt(vector[0] * vector[0] + vector[1] * vector[1] + vector[2] * vector[2]);
        return new double[] {vector[0] / length, vector[1] / length, vector[2] / length};
    }

    private static double[] cross(double[] a, double[] b) {
        return new double[] {a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]};
    }
}
