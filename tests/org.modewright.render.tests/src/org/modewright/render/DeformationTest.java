package org.modewright.render;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class DeformationTest {

    private static final double[] START = {1, 2, 3};
    private static final double[] END = {4, 6, 15};
    private static final double LENGTH = 13;
    private static final double[] AXIS = {3 / LENGTH, 4 / LENGTH, 12 / LENGTH};
    private static final double[] ENDS = {0.1, -0.2, 0.05, 0.02, -0.03, 0.04, -0.3, 0.15, 0.2, -0.01, 0.05, 0.03};

    private static double[] at(double xi, double[] ends) {
        double[] out = new double[3];
        Deformation.curve(START, END, ends, xi, out);
        return out;
    }

    @Test
    void theCurvePassesThroughTheEnds() {
        assertArrayEquals(new double[] {0.1, -0.2, 0.05}, at(0, ENDS), 1e-15);
        assertArrayEquals(new double[] {-0.3, 0.15, 0.2}, at(1, ENDS), 1e-15);
    }

    @Test
    void theTangentsAtTheEndsFollowTheRotations() {
        // Slope of the part square to the axis = rotation x axis. Central difference of a cubic: error of the order of step squared, 1e-8.
        double step = 1e-4;
        for (int end = 0; end < 2; end++) {
            double[] before = at(end - step, ENDS);
            double[] after = at(end + step, ENDS);
            double[] slope = new double[3];
            for (int k = 0; k < 3; k++) {
                slope[k] = (after[k] - before[k]) / (2 * step * LENGTH);
            }
            double along = slope[0] * AXIS[0] + slope[1] * AXIS[1] + slope[2] * AXIS[2];
            int r = 3 + 6 * end;
            for (int k = 0; k < 3; k++) {
                int i = (k + 1) % 3;
                int j = (k + 2) % 3;
                double expected = ENDS[r + i] * AXIS[j] - ENDS[r + j] * AXIS[i];
                assertEquals(expected, slope[k] - along * AXIS[k], 1e-8, "end " + end + " component " + k);
            }
        }
    }

    @Test
    void theElongationIsLinear() {
        double first = axial(0.25) - axial(0);
        double second = axial(0.9) - axial(0.65);
        assertEquals(first, second, 1e-15);
    }

    private static double axial(double xi) {
        double[] d = at(xi, ENDS);
        return d[0] * AXIS[0] + d[1] * AXIS[1] + d[2] * AXIS[2];
    }

    @Test
    void aCantileverWithATipForceBendsAsInTheTextbooks() {
        // Closed form: w(x) = F x² (3L - x) / (6EI): with tip deflection 1 and tip slope 3/(2L), w(ξ) = ξ² (3 - ξ) / 2
        double[] out = new double[3];
        double[] ends = {0, 0, 0, 0, 0, 0, 0, 0, 1, 0, -1.5 / 8, 0};
        for (double xi = 0; xi <= 1; xi += 0.125) {
            Deformation.curve(new double[3], new double[] {8, 0, 0}, ends, xi, out);
            assertArrayEquals(new double[] {0, 0, xi * xi * (3 - xi) / 2}, out, 1e-15);
        }
    }

    @Test
    void aRigidRotationKeepsTheMemberStraight() {
        // u = ω × r is linear along the member.
        double[] omega = {0.01, -0.02, 0.03};
        double[] ends = new double[12];
        rigid(omega, START, ends, 0);
        rigid(omega, END, ends, 6);
        double[] middle = at(0.5, ends);
        for (int k = 0; k < 3; k++) {
            assertEquals((ends[k] + ends[6 + k]) / 2, middle[k], 1e-15);
        }
    }

    private static void rigid(double[] w, double[] r, double[] ends, int from) {
        for (int k = 0; k < 3; k++) {
            int i = (k + 1) % 3;
            int j = (k + 2) % 3;
            ends[from + k] = w[i] * r[j] - w[j] * r[i];
            ends[from + 3 + k] = w[k];
        }
    }

    @Test
    void aSceneTakesTheCurveVertexByVertex() {
        SceneBuilder builder = Scene.builder();
        int bent = builder.member(0, 1, 2, 3, 4, 6, 15, 4);
        int bar = builder.member(1, 1, 2, 3, 4, 6, 15, 4);
        int node = builder.vertex(4, 6, 15);
        Scene scene = builder.build();
        Deformation shape = new Deformation(scene);
        shape.member(bent, ENDS);
        shape.memberStraight(bar, ENDS);
        shape.vertex(node, -0.3, 0.15, 0.2);
        // Single precision keeps seven digits.
        assertArrayEquals(at(0.75, ENDS), shape.at(scene.firstVertex(bent) + 3), 1e-7);
        assertArrayEquals(new double[] {-0.1, -0.025, 0.125}, shape.at(scene.firstVertex(bar) + 2), 1e-7);
        assertTrue(shape.largest() >= Math.sqrt(0.3 * 0.3 + 0.15 * 0.15 + 0.2 * 0.2) - 1e-7);
    }

    @Test
    void aMemberWithoutLengthMovesWithItsEnds() {
        double[] out = new double[3];
        Deformation.curve(START, START, ENDS, 0.5, out);
        assertArrayEquals(new double[] {-0.1, -0.025, 0.125}, out, 1e-15);
    }
}
