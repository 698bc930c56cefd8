package org.modewright.fem;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Node;
import org.modewright.numerics.EigenPairs;

/** Further closed forms: extensional modes of a ring, portal frames of any span, a cantilever with a quarter of its mass at the tip. */
class PublishedFrameTest {

    private static final double YOUNG = 200e9;
    private static final double DENSITY = 8000;

    // slope-deflection, k h^3/(E Ic) = 24 (1 + 6a)/(4 + 6a) with a = (Ib/L)/(Ic/h); recomputed by static condensation
    @ParameterizedTest
    @CsvSource({"0.1, 8.347826086956523", "0.5, 13.714285714285715", "1, 16.8", "2, 19.5", "10, 22.875"})
    void portalFrameOfAnySpan(double ratio, double expected) {
        TestStructure structure = new TestStructure();
        structure.model().setSelfMassFactor(0.0);
        double height = 4.0;
        double span = 7.0;
        double inertia = 2e-4;
        Material material = structure.material(YOUNG, 0.3, DENSITY);
        FrameSection column = structure.section(1e3, inertia, inertia, 1e-4, 0, 0);
        FrameSection beam = structure.section(1e3, ratio * inertia * span / height, inertia, 1e-4, 0, 0);
        Node leftFoot = structure.node(0, 0, 0);
        Node left = structure.node(0, 0, height);
        Node right = structure.node(span, 0, height);
        Node rightFoot = structure.node(span, 0, 0);
        structure.member(leftFoot, left, column, material);
        structure.member(left, right, beam, material);
        structure.member(rightFoot, right, column, material);
        structure.hold(leftFoot, TestStructure.ALL);
        structure.hold(rightFoot, TestStructure.ALL);
        structure.hold(left, "uy rx rz");
        structure.hold(right, "uy rx rz");
        structure.mass(left, 300, 0, 0, 0, 0, 0);
        structure.mass(right, 700, 0, 0, 0, 0, 0);
        double stiffness = structure.pairs().values()[0] * 1000.0;
        // axial flexibility is E I/(E A h^2) = 1e-8 of the flexural one
        assertEquals(expected, stiffness * Math.pow(height, 3) / (YOUNG * inertia), 1e-6 * expected);
    }

    // R. D. Blevins, Formulas for Natural Frequency and Mode Shape (1979), Table 8-8; from memory, root recomputed
    @Test
    void cantileverWithAQuarterOfItsMassAtTheTip() {
        double[] exact = {1.57375130266, 4.22511285671, 7.28123637341};
        double length = 3.0;
        double inertia = 4e-6;
        double area = 5e-3;
        int members = 20;
        TestStructure structure = new TestStructure();
        Material material = structure.material(YOUNG, 0.3, DENSITY);
        FrameSection section = structure.section(area, inertia, 2 * inertia, inertia, 0, 0);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {0, 0, length}, members, section, material);
        structure.holdAll("uy uz rx rz");
        structure.hold(nodes[0], TestStructure.ALL);
        structure.mass(nodes[members], 0.25 * DENSITY * area * length);
        double[] omega = structure.circular();
        for (int mode = 0; mode < exact.length; mode++) {
            // a vertical member bends in X with iy, its local y being the global Y
            double beta = Math.sqrt(omega[mode] * Math.sqrt(DENSITY * area / (YOUNG * inertia))) * length;
            // error of the cubic member, (beta h)^4/2880 in beta
            assertEquals(exact[mode], beta, exact[mode] * (1.2 * Math.pow(exact[mode] / members, 4) / 2880.0 + 2e-9), "mode " + mode);
        }
    }

    /**
     * Extensional modes of a thin ring, &omega; = &radic;(E/(&rho;R&sup2;)(1 + n&sup2;)): Rayleigh; Love; Blevins (1979); from memory,
     * recomputed. The radial displacement is cos n&theta;, the tangential one n sin n&theta;.
     */
    @ParameterizedTest
    @CsvSource({"0, 795.7747154594767", "1, 1125.3953951963827", "2, 1779.4063585429428"})
    void extensionalModesOfARing(int waves, double expected) {
        int members = 120;
        TestStructure structure = new TestStructure();
        Material steel = structure.material(YOUNG, 0.3, DENSITY);
        double diameter = 0.02;
        double inertia = Math.PI * Math.pow(diameter, 4) / 64.0;
        FrameSection section = structure.section(Math.PI * diameter * diameter / 4.0, inertia, inertia, 2.0 * inertia, 0.0, 0.0);
        Node[] nodes = new Node[members];
        for (int i = 0; i < members; i++) {
            double angle = 2.0 * Math.PI * i / members;
            nodes[i] = structure.node(Math.cos(angle), Math.sin(angle), 0);
        }
        for (int i = 0; i < members; i++) {
            structure.member(nodes[i], nodes[(i + 1) % members], section, steel);
        }
        structure.holdAll(TestStructure.OUT_OF_XY);
        Assembly assembly = structure.assemble();
        EigenPairs pairs = TestStructure.pairs(assembly);
        int best = 0;
        double most = 0.0;
        for (int mode = 0; mode < pairs.count(); mode++) {
            double likeness = likeness(assembly.expand(pairs.vectors()[mode]), members, waves);
            if (likeness > most) {
                most = likeness;
                best = mode;
            }
        }
        double found = Math.sqrt(pairs.values()[best]) / (2.0 * Math.PI);
        // A polygon's perimeter is shorter than the circle's by (pi/120)^2/6 = 1.1e-4, and the linear axial displacement of a member
        // stiffens it by (2 pi n/120)^2/24, 4.6e-4 for n = 2; bending adds (d/4R)^2 n^4 = 4e-4 at most.
        assertEquals(expected, found, 1e-3 * expected, "mode " + (best + 1) + ", likeness " + most);
    }

    /** Squared correlation of the translations with the extensional motion and its quarter turn together. */
    private static double likeness(double[] shape, int members, int waves) {
        double whole = 0.0;
        double cosine = 0.0;
        double sine = 0.0;
        for (int i = 0; i < members; i++) {
            double angle = 2.0 * Math.PI * i / members;
            double radial = shape[6 * i] * Math.cos(angle) + shape[6 * i + 1] * Math.sin(angle);
            double tangential = shape[6 * i + 1] * Math.cos(angle) - shape[6 * i] * Math.sin(angle);
            whole += radial * radial + tangential * tangential;
            double c = Math.cos(waves * angle);
            double s = Math.sin(waves * angle);
            cosine += radial * c + tangential * waves * s;
            sine += radial * s - tangential * waves * c;
        }
        return (cosine * cosine + sine * sine) / whole;
    }
}
