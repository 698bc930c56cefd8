package org.modewright.fem.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;

import org.junit.jupiter.api.Test;
import org.modewright.fem.LocalAxes;

/** The small dense and sparse tools below the elements. */
class SmallMatrixTest {

    @Test
    void eigenvaluesAndVectorsRebuildTheMatrix() {
        Random random = new Random(2);
        for (int trial = 0; trial < 200; trial++) {
            int n = 1 + random.nextInt(4);
            double[] a = new double[n * n];
            for (int i = 0; i < n; i++) {
                for (int j = 0; j <= i; j++) {
                    a[i * n + j] = trial % 5 == 0 ? random.nextInt(2) : random.nextGaussian();
                    a[j * n + i] = a[i * n + j];
                }
            }
            SmallSymmetricEigen eigen = new SmallSymmetricEigen(n, a);
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    double rebuilt = 0.0;
                    double product = 0.0;
                    for (int k = 0; k < n; k++) {
                        rebuilt += eigen.value(k) * eigen.vector(k, i) * eigen.vector(k, j);
                        product += eigen.vector(i, k) * eigen.vector(j, k);
                    }
                    assertEquals(a[i * n + j], rebuilt, 1e-13);
                    assertEquals(i == j ? 1.0 : 0.0, product, 1e-13);
                }
            }
        }
    }

    // J. S. Przemieniecki, Theory of Matrix Structural Analysis (1968): the matrices of the slender member, from memory
    @Test
    void theSlenderMemberHasTheTextbookMatrices() {
        double l = 3.0;
        BendingPlane plane = new BendingPlane(5.0, Double.POSITIVE_INFINITY, l);
        double k = 5.0 / (l * l * l);
        assertArrayEquals(new double[] {12 * k, 6 * l * k, -12 * k, 6 * l * k, 6 * l * k, 4 * l * l * k, -6 * l * k, 2 * l * l * k,
            -12 * k, -6 * l * k, 12 * k, -6 * l * k, 6 * l * k, 2 * l * l * k, -6 * l * k, 4 * l * l * k}, plane.stiffness(), 1e-12);
        double m = 7.0 * l / 420.0;
        assertArrayEquals(new double[] {156 * m, 22 * l * m, 54 * m, -13 * l * m, 22 * l * m, 4 * l * l * m, 13 * l * m, -3 * l * l * m,
            54 * m, 13 * l * m, 156 * m, -22 * l * m, -13 * l * m, -3 * l * l * m, -22 * l * m, 4 * l * l * m}, plane.mass(7.0, 0.0),
                1e-12);
        double n = 11.0 / (30.0 * l);
        assertArrayEquals(new double[] {36 * n, 3 * l * n, -36 * n, 3 * l * n, 3 * l * n, 4 * l * l * n, -3 * l * n, -l * l * n,
            -36 * n, -3 * l * n, 36 * n, -3 * l * n, 3 * l * n, -l * l * n, -3 * l * n, 4 * l * l * n}, plane.geometricStiffness(11.0),
                1e-12);
    }

    // the same source, stiffness with shear: (4 + Phi) and (2 - Phi) over (1 + Phi), from memory
    @Test
    void shearSoftensTheStiffness() {
        double l = 2.0;
        double bending = 3.0;
        double shear = 4.0;
        double phi = 12.0 * bending / (shear * l * l);
        double[] k = new BendingPlane(bending, shear, l).stiffness();
        assertEquals(12.0 * bending / (l * l * l * (1.0 + phi)), k[0], 1e-13);
        assertEquals((4.0 + phi) * bending / (l * (1.0 + phi)), k[5], 1e-13);
        assertEquals((2.0 - phi) * bending / (l * (1.0 + phi)), k[7], 1e-13);
    }

    @Test
    void nullSpaceOfASmallSystem() {
        // x1 = 2 x2, x3 = 0; x4 does not appear
        double[] a = {1, -2, 0, 0, 0, 0, 5, 0, 2, -4, 5, 0};
        SmallNullSpace space = new SmallNullSpace(a, 3, 4);
        assertEquals(2, space.rank());
        assertTrue(space.canMove(0));
        assertTrue(space.canMove(1));
        assertFalse(space.canMove(2));
        assertTrue(space.canMove(3));
    }

    @Test
    void sparseFormsAddAndForgetWhatCancels() {
        LinearForm a = LinearForm.of(new int[] {5, 1, 5}, new double[] {2, 1, 1});
        assertEquals(2, a.size());
        assertEquals(3.0, a.factorOf(5), 0.0);
        LinearForm sum = a.plus(LinearForm.of(new int[] {5, 7}, new double[] {1, 4}), -3.0);
        assertEquals(2, sum.size());
        assertEquals(0.0, sum.factorOf(5), 0.0);
        assertEquals(-12.0, sum.factorOf(7), 0.0);
        assertEquals(1, sum.without(7).size());
    }

    @Test
    void aLongChainOfConstraintsKeepsShortExpressions() {
        int count = 5000;
        ConstraintElimination elimination = new ConstraintElimination(count);
        LinearForm[] forms = new LinearForm[count - 1];
        for (int i = 0; i < count - 1; i++) {
            forms[i] = LinearForm.of(new int[] {i, i + 1}, new double[] {1, -1});
            elimination.announce(forms[i]);
        }
        for (LinearForm form : forms) {
            elimination.impose(form);
        }
        int free = 0;
        for (int i = 0; i < count; i++) {
            LinearForm expression = elimination.expression(i);
            free += expression == null ? 1 : 0;
            assertTrue(expression == null || expression.size() == 1 && expression.factor(0) == 1.0);
        }
        assertEquals(1, free);
    }

    /** A rotation moves the end of a rigid zone across the member only; not even by round-off along it, where the member is stiffest. */
    @Test
    void anArmAlongItsAxisHasNoLeverThere() {
        Random random = new Random(11);
        for (int i = 0; i < 1000; i++) {
            double[] axes = LocalAxes.of(new double[] {random.nextGaussian(), random.nextGaussian(), random.nextGaussian()},
                    random.nextDouble());
            double length = 0.1 + random.nextDouble();
            double[] motion = RigidArm.motion(axes, new double[] {length * axes[0], length * axes[1], length * axes[2]});
            assertArrayEquals(new double[3], new double[] {motion[3], motion[4], motion[5]}, 0.0);
            for (int j = 0; j < 3; j++) {
                assertEquals(length * axes[6 + j], motion[9 + j], 1e-15, "y moves by the rotation about z");
                assertEquals(-length * axes[3 + j], motion[15 + j], 1e-15, "z moves against the rotation about y");
            }
        }
    }
}
