package org.modewright.numerics.internal.eigen;

/** Elementary operations on vectors. */
final class VectorMath {

    private VectorMath() {
    }

    static double dot(double[] x, double[] y) {
        int n = x.length;
        double s0 = 0.0;
        double s1 = 0.0;
        double s2 = 0.0;
        double s3 = 0.0;
        int i = 0;
        for (; i + 3 < n; i += 4) {
            s0 += x[i] * y[i];
            s1 += x[i + 1] * y[i + 1];
            s2 += x[i + 2] * y[i + 2];
            s3 += x[i + 3] * y[i + 3];
        }
        for (; i < n; i++) {
            s0 += x[i] * y[i];
        }
        return s0 + s1 + (s2 + s3);
    }

    /** y &larr; y + a x. */
    static void add(double[] y, double a, double[] x) {
        for (int i = 0; i < y.length; i++) {
            y[i] += a * x[i];
        }
    }

    static void scale(double[] x, double a) {
        for (int i = 0; i < x.length; i++) {
            x[i] *= a;
        }
    }

    static double norm(double[] x) {
        return Math.sqrt(dot(x, x));
    }
}
