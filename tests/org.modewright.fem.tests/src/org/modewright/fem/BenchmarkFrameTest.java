package org.modewright.fem;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;

import org.junit.jupiter.api.Test;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Node;
import org.modewright.numerics.EigenPairs;

/**
 * Frames of the natural-frequency benchmarks of NAFEMS: F. Abbassian, D. J. Dawswell and N. C. Knowles, Selected Benchmarks for
 * Natural Frequency Analysis (1987). Inputs and published targets from memory; the values asserted here were recomputed
 * independently. E = 200 GPa, Poisson's ratio 0.3, density 8000 kg/m3 throughout.
 */
class BenchmarkFrameTest {

    private static final double YOUNG = 200e9;

    private static Material steel(TestStructure structure) {
        return structure.material(YOUNG, 0.3, 8000.0);
    }

    /** Arms of 5 m and 0.125 m square, pinned at their outer ends, joined at the hub; in the x-y plane. */
    private static double[] cross(int arms, double areaFactor, int membersPerArm) {
        TestStructure structure = new TestStructure();
        Material steel = steel(structure);
        double side = 0.125;
        double inertia = Math.pow(side, 4) / 12.0;
        // the density follows the area factor, so that the mass stays
        steel.setDensity(8000.0 / areaFactor);
        FrameSection section = structure.section(areaFactor * side * side, inertia, inertia, 2.0 * inertia, 0.0, 0.0);
        Node hub = structure.node(0, 0, 0);
        for (int arm = 0; arm < arms; arm++) {
            double angle = 2.0 * Math.PI * arm / arms;
            Node tip = structure.node(5.0 * Math.cos(angle), 5.0 * Math.sin(angle), 0);
            structure.line(hub, tip, membersPerArm, section, steel);
            structure.hold(tip, "ux uy");
        }
        structure.holdAll(TestStructure.OUT_OF_XY);
        return structure.hertz();
    }

    private static void assertFrequencies(double[] found, double tolerance, double... expected) {
        for (int mode = 0; mode < expected.length; mode++) {
            assertEquals(expected[mode], found[mode], tolerance * expected[mode], "mode " + (mode + 1));
        }
    }

    // test FV1: recomputed with axial flexibility; six digits given, with 16 members per arm the error is up to
    // (7.07/16)^4/1440 = 2.6e-5 in the second family
    @Test
    void pinEndedCross() {
        assertFrequencies(cross(4, 1.0, 16), 3e-5, 11.3362, 17.6808, 17.6808, 17.7094, 45.3451, 57.0749, 57.0749, 57.3900);
    }

    // test FV1 without axial flexibility, the published target: closed form
    @Test
    void pinEndedCrossThatIsStiffAxially() {
        assertFrequencies(cross(4, 1e4, 16), 3e-5, 11.3362, 17.7094, 17.7094, 17.7094, 45.3450, 57.3897, 57.3897, 57.3897);
    }

    // test FV2: recomputed with axial flexibility
    @Test
    void pinEndedDoubleCross() {
        assertFrequencies(cross(8, 1.0, 16), 3e-5, 11.3363, 17.6808, 17.6808, 17.7094, 17.7094, 17.7094, 17.7094, 17.7094, 45.3453,
                57.0752, 57.0752, 57.3904, 57.3904, 57.3904, 57.3904, 57.3904);
    }

    private static TestStructure offCentreMasses(int members, boolean byOffset) {
        TestStructure structure = new TestStructure();
        Material steel = steel(structure);
        double inertia = Math.PI * Math.pow(0.5, 4) / 64.0;
        FrameSection section = structure.section(Math.PI * 0.25 / 4.0, inertia, inertia, 2.0 * inertia, 0.0, 0.0);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {10, 0, 0}, members, section, steel);
        structure.hold(nodes[0], TestStructure.ALL);
        if (byOffset) {
            structure.mass(nodes[members], 10000.0).setOffset(TestStructure.vector(0, 2, 0));
            structure.mass(nodes[members], 1000.0).setOffset(TestStructure.vector(0, -2, 0));
        } else {
            Node left = structure.node(10, 2, 0);
            Node right = structure.node(10, -2, 0);
            structure.link(nodes[members], left);
            structure.link(nodes[members], right);
            structure.mass(left, 10000.0);
            structure.mass(right, 1000.0);
        }
        return structure;
    }

    // test FV4: recomputed frequencies, and effective masses as shares of the free mass, which with consistent mass depends on the mesh
    // near the support (40 members); published 1.723, 1.727, 7.413, 9.972, 18.155, 26.957 Hz
    @Test
    void cantileverWithOffCentreMasses() {
        double[] expected = {1.7233, 1.7268, 7.4134, 9.9748, 18.1816, 26.9855};
        for (boolean byOffset : new boolean[] {true, false}) {
            Assembly assembly = offCentreMasses(40, byOffset).assemble();
            EigenPairs pairs = TestStructure.pairs(assembly);
            double[] hertz = Arrays.stream(pairs.values()).map(value -> Math.sqrt(value) / (2.0 * Math.PI)).toArray();
            // given to four decimals; the discretisation lies below 1e-5 up to the sixth mode
            assertFrequencies(hertz, 4e-5, expected);
            assertShares(TestStructure.effectiveShares(assembly, pairs, 0), 0.01763, 0.0, 0.0, 0.19194, 0.0, 0.07042);
            assertShares(TestStructure.effectiveShares(assembly, pairs, 1), 0.68779, 0.0, 0.0, 0.13807, 0.0, 0.06995);
            assertShares(TestStructure.effectiveShares(assembly, pairs, 2), 0.0, 0.72252, 0.03618, 0.0, 0.12239, 0.0);
        }
    }

    private static void assertShares(double[] found, double... expected) {
        for (int mode = 0; mode < expected.length; mode++) {
            assertEquals(expected[mode], found[mode], 3e-4, "effective mass of mode " + (mode + 1));
        }
    }

    private static double[] deepBeam(int members, double torsion) {
        TestStructure structure = new TestStructure();
        Material steel = steel(structure);
        double inertia = 16.0 / 12.0;
        FrameSection section = structure.section(4.0, inertia, inertia, torsion, 4.0 * 5.0 / 6.0, 4.0 * 5.0 / 6.0);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {10, 0, 0}, members, section, steel);
        structure.hold(nodes[0], "ux uy uz rx");
        structure.hold(nodes[members], "uy uz");
        return structure.hertz();
    }

    // test FV5: exact Timoshenko bending, exact axial, torsion with Saint-Venant's constant 0.1406 b^4 (the published torsion targets,
    // 77.542 and 233.10 Hz, take the polar second moment instead)
    @Test
    void deepBeam() {
        double[] exact = {42.6087, 42.6087, 71.1961, 125.0000, 147.7860, 147.7860, 213.5883, 282.3634, 282.3634};
        double[] coarse = deepBeam(40, 0.1406 * 16.0);
        double[] fine = deepBeam(80, 0.1406 * 16.0);
        for (int mode = 0; mode < exact.length; mode++) {
            // all of these converge from above with h^2, so that extrapolation leaves the order h^4; J is given to four digits
            assertTrue(fine[mode] > exact[mode] * (1.0 - 3e-4), "mode " + (mode + 1));
            assertEquals(exact[mode], (4.0 * fine[mode] - coarse[mode]) / 3.0, 2e-4 * exact[mode], "mode " + (mode + 1));
        }
    }

    // test FV5 with the torsion constant that the published targets used: (2n - 1)/(4L) sqrt(G/rho), closed form
    @Test
    void deepBeamWithPolarMomentAsTorsionConstant() {
        double[] coarse = deepBeam(40, 32.0 / 12.0);
        double[] fine = deepBeam(80, 32.0 / 12.0);
        assertEquals(77.5217, (4.0 * fine[2] - coarse[2]) / 3.0, 1e-5 * 77.5217);
        assertEquals(232.5651, (4.0 * fine[6] - coarse[6]) / 3.0, 1e-5 * 232.5651);
    }

    /** Ring of radius 1 m and 0.1 m diameter as a polygon whose corners lie on the circle. */
    private static double[] ring(int members, double diameter) {
        TestStructure structure = new TestStructure();
        Material steel = steel(structure);
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
        return structure.hertz();
    }

    // test FV6: thin inextensional ring, out of plane (Michell 1890; Love) and in plane (Hoppe 1871; Rayleigh): closed forms
    @Test
    void freeRing() {
        double[] exact = {51.8494, 51.8494, 53.3822, 53.3822, 148.7725, 148.7725, 150.9876, 150.9876, 286.9844, 286.9844, 289.5056,
            289.5056};
        double[] hertz = ring(48, 0.1);
        for (int mode = 0; mode < 6; mode++) {
            assertEquals(0.0, hertz[mode], 1e-3, "rigid-body mode " + mode);
        }
        for (int mode = 0; mode < exact.length; mode++) {
            // a chord shortens the ring by h^2/24 = 0.07 %, which raises f by up to 0.3 % (n = 4); extension and torsional inertia
            // of the real ring lower it by about (d/R)^2 n^2/16
            assertEquals(exact[mode], hertz[6 + mode], 1e-2 * exact[mode], "mode " + (7 + mode));
        }
        for (int pair = 0; pair < 6; pair++) {
            assertEquals(hertz[6 + 2 * pair], hertz[7 + 2 * pair], 1e-7 * hertz[6 + 2 * pair], "pair " + pair);
        }
    }

    @Test
    void thinRingConvergesToTheInextensionalRing() {
        // a ring ten times thinner is inextensional to (d/R)^2; its frequencies are a tenth
        double[] exact = {51.84936718324144, 53.38219075628829, 148.77253870047545, 150.9876363134611};
        double[] coarse = ring(32, 0.01);
        double[] fine = ring(64, 0.01);
        for (int n = 0; n < exact.length; n++) {
            double extrapolated = (4.0 * fine[6 + 2 * n] - coarse[6 + 2 * n]) / 3.0;
            assertEquals(0.1 * exact[n], extrapolated, 2e-4 * 0.1 * exact[n], "family " + n);
        }
    }
}
