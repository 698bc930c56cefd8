package org.modewright.fem;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;

import org.junit.jupiter.api.Test;

/** Local axes as the table package defines them. */
class LocalAxesTest {

    @Test
    void horizontalInclinedAndVerticalMembers() {
        assertArrayEquals(new double[] {1, 0, 0, 0, 1, 0, 0, 0, 1}, LocalAxes.of(new double[] {7, 0, 0}, 0), 1e-15);
        assertArrayEquals(new double[] {0, 1, 0, -1, 0, 0, 0, 0, 1}, LocalAxes.of(new double[] {0, 2, 0}, 0), 1e-15);
        double r = Math.sqrt(0.5);
        assertArrayEquals(new double[] {r, 0, r, 0, 1, 0, -r, 0, r}, LocalAxes.of(new double[] {3, 0, 3}, 0), 1e-15);
        assertArrayEquals(new double[] {0, 0, 1, 0, 1, 0, -1, 0, 0}, LocalAxes.of(new double[] {0, 0, 3}, 0), 1e-15);
        assertArrayEquals(new double[] {0, 0, -1, 0, 1, 0, 1, 0, 0}, LocalAxes.of(new double[] {0, 0, -3}, 0), 1e-15);
    }

    @Test
    void verticalBeginsAtAMillionth() {
        assertArrayEquals(new double[] {0, 1, 0}, row(LocalAxes.of(new double[] {0.9e-6, 0, 1}, 0), 1), 1e-6);
        // just outside, z lies in the vertical plane through x and y is horizontal across it
        double[] axes = LocalAxes.of(new double[] {0, 1.1e-6, 1}, 0);
        assertArrayEquals(new double[] {-1, 0, 0}, row(axes, 1), 1e-6);
        assertArrayEquals(new double[] {0, -1, 1.1e-6}, row(axes, 2), 1e-12);
    }

    @Test
    void rollTurnsRightHandedAboutX() {
        double[] axes = LocalAxes.of(new double[] {1, 0, 0}, Math.toRadians(90));
        assertArrayEquals(new double[] {0, 0, 1}, row(axes, 1), 1e-15);
        assertArrayEquals(new double[] {0, -1, 0}, row(axes, 2), 1e-15);
    }

    @Test
    void alwaysARightHandedRotationWithZUp() {
        Random random = new Random(3);
        for (int i = 0; i < 1000; i++) {
            double[] direction = {random.nextGaussian(), random.nextGaussian(), random.nextGaussian()};
            double[] axes = LocalAxes.of(direction, 0.0);
            for (int a = 0; a < 3; a++) {
                for (int b = 0; b < 3; b++) {
                    double dot = 0.0;
                    for (int k = 0; k < 3; k++) {
                        dot += axes[3 * a + k] * axes[3 * b + k];
                    }
                    assertEquals(a == b ? 1.0 : 0.0, dot, 1e-14);
                }
            }
            assertEquals(axes[6], axes[1] * axes[5] - axes[2] * axes[4], 1e-14);
            assertEquals(0.0, axes[5], 1e-15);
            assertTrue(axes[8] > 0.0);
        }
    }

    /** A direction across which a member resists nothing shall get a stiffness of zero, not one of round-off squared. */
    @Test
    void roundOffIsExactlyZero() {
        Random random = new Random(5);
        for (int i = 0; i < 1000; i++) {
            double[] direction = {random.nextGaussian(), random.nextGaussian(), random.nextGaussian()};
            assertEquals(0.0, LocalAxes.of(direction, 0.0)[5], 0.0);
            double[] turned = LocalAxes.of(direction, Math.toRadians(90 * random.nextInt(4)));
            assertTrue(turned[5] == 0.0 || turned[8] == 0.0);
        }
        assertArrayEquals(new double[] {0, 0, 1, -1, 0, 0, 0, -1, 0}, LocalAxes.of(new double[] {0, 0, 3}, Math.toRadians(90)), 0.0);
    }

    private static double[] row(double[] axes, int i) {
        return new double[] {axes[3 * i], axes[3 * i + 1], axes[3 * i + 2]};
    }
}
