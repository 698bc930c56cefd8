package org.modewright.fem.internal;

/**
 * One plane of bending of a straight prismatic member: translation w across the axis and rotation &theta; at both ends, in the order
 * w<sub>1</sub>, &theta;<sub>1</sub>, w<sub>2</sub>, &theta;<sub>2</sub>, with &theta; = dw/dx where the member does not deform in
 * shear. All matrices are 4 x 4 by rows and rest on the static shape functions of the Timoshenko member, which are the cubics of
 * Hermite without shear deformation.
 *
 * <p>With &Phi; = 12 E I / (G A<sub>s</sub> l<sup>2</sup>) and &psi; = 1/(1 + &Phi;) the shape functions are blends of the cubics
 * (&psi;) and of the shape functions of a member that deforms in shear alone (1 - &psi;).
 *
 * <p>Sources: J. S. Przemieniecki, Theory of Matrix Structural Analysis (1968), sections 5.6 and 11.3 for stiffness and mass with
 * shear and rotary inertia; Z. Friedman and J. B. Kosmatka, Computers and Structures 47 (1993) 473-481 for the shape functions.
 */
final class BendingPlane {

    private final double length;
    private final double bending;
    private final double blend;
    private final double[][] deflection;
    private final double[][] rotation;

    /**
     * Prepares the shape functions.
     *
     * @param bending E I, N m<sup>2</sup>
     * @param shear G A<sub>s</sub>, N; positive infinity: no shear deformation
     * @param length l, m
     */
    BendingPlane(double bending, double shear, double length) {
        this.length = length;
        this.bending = bending;
        this.blend = blend(bending, shear, length);
        double shearing = 1.0 - blend;
        this.deflection = new double[][] {
            {1.0, -shearing, -3.0 * blend, 2.0 * blend},
            {0.0, length * (blend + 0.5 * shearing), -length * (2.0 * blend + 0.5 * shearing), length * blend},
            {0.0, shearing, 3.0 * blend, -2.0 * blend},
            {0.0, -0.5 * length * shearing, length * (0.5 * shearing - blend), length * blend}};
        double slope = 6.0 * blend / length;
        this.rotation = new double[][] {
            {0.0, -slope, slope},
            {1.0, -4.0 * blend - shearing, 3.0 * blend},
            {0.0, slope, -slope},
            {0.0, shearing - 2.0 * blend, 3.0 * blend}};
    }

    private static double blend(double bending, double shear, double length) {
        if (Double.isInfinite(shear) || bending == 0.0) {
            return 1.0;
        }
        return shear / (shear + 12.0 * bending / (length * length));
    }

    /** Elastic stiffness. */
    double[] stiffness() {
        double translation = 12.0 * blend * bending / (length * length * length);
        double coupling = 6.0 * blend * bending / (length * length);
        double near = (1.0 + 3.0 * blend) * bending / length;
        double far = (3.0 * blend - 1.0) * bending / length;
        return new double[] {
            translation, coupling, -translation, coupling,
            coupling, near, -coupling, far,
            -translation, -coupling, translation, -coupling,
            coupling, far, -coupling, near};
    }

    /**
     * Consistent geometric stiffness N &int; w'<sub>i</sub> w'<sub>j</sub> dx.
     *
     * @param axialForce N, tension positive
     */
    double[] geometricStiffness(double axialForce) {
        double[][] derivative = new double[4][];
        for (int i = 0; i < 4; i++) {
            double[] shape = deflection[i];
            derivative[i] = new double[] {shape[1], 2.0 * shape[2], 3.0 * shape[3]};
        }
        return products(derivative, axialForce / length);
    }

    /**
     * Consistent mass &rho;A &int; w<sub>i</sub> w<sub>j</sub> dx + &rho;I &int; &theta;<sub>i</sub> &theta;<sub>j</sub> dx.
     *
     * @param mass &rho;A, kg/m
     * @param rotary &rho;I, kg m; 0: no rotary inertia
     */
    double[] mass(double mass, double rotary) {
        double[] matrix = products(deflection, mass * length);
        if (rotary != 0.0) {
            double[] ofRotation = products(rotation, rotary * length);
            for (int i = 0; i < matrix.length; i++) {
                matrix[i] += ofRotation[i];
            }
        }
        return matrix;
    }

    /** factor times the integral from 0 to 1 of each product of two polynomials, given by ascending coefficients. */
    private static double[] products(double[][] polynomials, double factor) {
        double[] matrix = new double[16];
        for (int i = 0; i < 4; i++) {
            for (int j = 0; j <= i; j++) {
                matrix[4 * i + j] = factor * integral(polynomials[i], polynomials[j]);
                matrix[4 * j + i] = matrix[4 * i + j];
            }
        }
        return matrix;
    }

    private static double integral(double[] a, double[] b) {
        double sum = 0.0;
        for (int i = 0; i < a.length; i++) {
            for (int j = 0; j < b.length; j++) {
                sum += a[i] * b[j] / (i + j + 1);
            }
        }
        return sum;
    }
}
