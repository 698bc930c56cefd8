package org.modewright.fem;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Node;

/**
 * Uniform beams without shear deformation against closed forms, in the x-y plane. Frequencies are compared as
 * &beta;L = (&omega;<sup>2</sup> m L<sup>4</sup> / E I)<sup>1/4</sup>. The cubic consistent-mass member has an error of
 * (&beta;h)<sup>4</sup>/720 in &omega;<sup>2</sup> (T. J. R. Hughes, The Finite Element Method, 1987, section 7.3; from memory), so
 * 1/1440 in the frequency and 1/2880 in &beta;L.
 */
class BeamFrequencyTest {

    private static final double YOUNG = 2.0e11;
    private static final double DENSITY = 7800.0;
    private static final double AREA = 0.01;
    private static final double INERTIA = 2.0e-5;
    private static final double LENGTH = 6.0;
    private static final double BENDING = YOUNG * INERTIA;
    private static final double MASS = DENSITY * AREA;

    private record Beam(TestStructure structure, Node[] nodes) {

        double[] betas() {
            double[] omega = structure.circular();
            double[] betas = new double[omega.length];
            for (int i = 0; i < betas.length; i++) {
                betas[i] = Math.sqrt(Math.max(0.0, omega[i]) * Math.sqrt(MASS / BENDING)) * LENGTH;
            }
            return betas;
        }
    }

    private static Beam beam(int members) {
        TestStructure structure = new TestStructure();
        Material material = structure.material(YOUNG, 0.3, DENSITY);
        FrameSection section = structure.section(AREA, INERTIA, INERTIA, 2.0 * INERTIA, 0.0, 0.0);
        Node[] nodes = structure.line(new double[] {0.0, 0.0, 0.0}, new double[] {LENGTH, 0.0, 0.0}, members, section, material);
        structure.holdAll("ux " + TestStructure.OUT_OF_XY);
        return new Beam(structure, nodes);
    }

    private static Beam beam(int members, String start, String end) {
        Beam beam = beam(members);
        beam.structure().hold(beam.nodes()[0], start);
        beam.structure().hold(beam.nodes()[members], end);
        return beam;
    }

    private static double order(double coarse, double fine) {
        return Math.log(coarse / fine) / Math.log(2.0);
    }

    // R. D. Blevins, Formulas for Natural Frequency and Mode Shape (1979), Table 8-1; Young and Felgar (1949);
    // from memory, roots recomputed from the characteristic equations
    @ParameterizedTest
    @CsvSource({
        "uy rz, '', 0, 1.87510407, 4.69409113, 7.85475744",
        "uy, uy, 0, 3.14159265, 6.28318531, 9.42477796",
        "uy rz, uy, 0, 3.92660231, 7.06858275, 10.21017612",
        "uy rz, uy rz, 0, 4.73004074, 7.85320462, 10.99560784",
        "'', '', 2, 4.73004074, 7.85320462, 10.99560784",
        "'', uy, 1, 3.92660231, 7.06858275, 10.21017612",
        "uy rz, rz, 0, 2.36502037, 5.49780392, 8.63937983",
        "'', rz, 1, 2.36502037, 5.49780392, 8.63937983",
        "uy, rz, 0, 1.57079633, 4.71238898, 7.85398163",
        "rz, rz, 1, 3.14159265, 6.28318531, 9.42477796"})
    void endConditions(String start, String end, int rigid, double first, double second, double third) {
        double[] exact = {first, second, third};
        double[] coarse = beam(10, start, end).betas();
        double[] fine = beam(20, start, end).betas();
        for (int mode = 0; mode < rigid; mode++) {
            // beta is the fourth root of the eigenvalue, whose round-off is some 1e-16 of the largest, 1e7 times the first
            assertEquals(0.0, Math.pow(fine[mode] / first, 4), 1e-9, "rigid mode " + mode);
        }
        for (int mode = 0; mode < 3; mode++) {
            double beta = exact[mode];
            double error = fine[rigid + mode] / beta - 1.0;
            double expected = Math.pow(beta / 20.0, 4) / 2880.0;
            // the table gives nine digits
            assertEquals(expected, error, 0.05 * expected + 2e-9, "error of mode " + mode);
            if (expected > 1e-7) {
                // at free ends the coarse mesh is not quite in the asymptotic range for the third mode
                assertEquals(4.0, order(coarse[rigid + mode] / beta - 1.0, error), 0.15, "order of mode " + mode);
            }
        }
    }

    @ParameterizedTest
    @CsvSource({"rz, rz, 3.14159265, 6.28318531, 9.42477796", "'', rz, 3.92660231, 7.06858275, 10.21017612",
        "rz, uy rz, 3.92660231, 7.06858275, 10.21017612"})
    void hingesInTheMemberConvergeLikeHingesAtTheSupport(String start, String end, double first, double second, double third) {
        // the same closed forms as above; a clamped end with shear and moment released is a free end, and a pinned-free beam has one
        // rigid-body mode
        double[] exact = {first, second, third};
        double[] coarse = hinged(10, start, end);
        double[] fine = hinged(20, start, end);
        int rigid = end.contains("uy") ? 1 : 0;
        for (int mode = 0; mode < 3; mode++) {
            double error = fine[rigid + mode] / exact[mode] - 1.0;
            double expected = Math.pow(exact[mode] / 20.0, 4) / 2880.0;
            // a last member with shear and moment released stays straight, which adds an error of the order h^5
            double bound = rigid == 0 ? 1.2 : 12.0;
            assertTrue(error < bound * expected + 2e-9 && error > 0.5 * expected, "mode " + mode + ": error " + error + " of " + expected);
            if (expected > 1e-7) {
                double order = order(coarse[rigid + mode] / exact[mode] - 1.0, error);
                assertTrue(order > 3.85 && order < (rigid == 0 ? 4.15 : 5.15), "order " + order + " of mode " + mode);
            }
        }
    }

    private static double[] hinged(int members, String start, String end) {
        Beam beam = beam(members, "uy rz", "uy rz");
        var all = beam.structure().model().getMembers();
        TestStructure.release(all.get(0), start, "");
        TestStructure.release(all.get(members - 1), "", end);
        return beam.betas();
    }

    // Blevins (1979), Table 8-8; Laura, Pombo and Susemihl, J. Sound Vib. 37 (1974) 161-168; from memory, roots recomputed
    @ParameterizedTest
    @CsvSource({
        "0.05, 1.79117056225, 4.51272017492, 7.58632188978",
        "0.1, 1.72274152059, 4.39952281616, 7.4510566733",
        "0.2, 1.61639966016, 4.26706156686, 7.31837267334",
        "0.5, 1.41996442977, 4.11113338642, 7.19033524196",
        "1, 1.24791740961, 4.03113943671, 7.13413224094",
        "2, 1.07619566408, 3.98257328776, 7.10265018605",
        "5, 0.87002145889, 3.94998049114, 7.08253760284",
        "10, 0.73578191939, 3.93846583325, 7.07561636703",
        "100, 0.415934240675, 3.92780479468, 7.06929123304"})
    void tipMass(double ratio, double first, double second, double third) {
        Beam beam = beam(20, "uy rz", "");
        beam.structure().mass(beam.nodes()[20], ratio * MASS * LENGTH);
        assertBetas(beam.betas(), first, second, third);
    }

    // Blevins (1979); Gorman, Free Vibration Analysis of Beams and Shafts (1975); from memory, roots recomputed
    @ParameterizedTest
    @CsvSource({
        "0.1, 0.73578191939, 3.93846583325, 7.07561636703",
        "1, 1.24791740961, 4.03113943671, 7.13413224094",
        "2, 1.41996442977, 4.11113338642, 7.19033524196",
        "5, 1.61639966016, 4.26706156686, 7.31837267334",
        "10, 1.72274152059, 4.39952281616, 7.4510566733",
        "100, 1.85678697696, 4.64972648342, 7.78267123973",
        "1e6, 1.87510219361, 4.69408643891, 7.85474958355"})
    void rotationalSpring(double ratio, double first, double second, double third) {
        Beam bySpring = beam(20, "uy", "");
        bySpring.structure().spring(bySpring.nodes()[0], null, 0.0, 0.0, 0.0, 0.0, 0.0, ratio * BENDING / LENGTH);
        assertBetas(bySpring.betas(), first, second, third);
        Beam bySupport = beam(20, "uy", "");
        bySupport.structure().hold(bySupport.nodes()[0], "").setElasticRz(ratio * BENDING / LENGTH);
        assertBetas(bySupport.betas(), first, second, third);
    }

    /** The bound of the discretisation error for the third mode with 20 members, with room for the boundary's part. */
    private static void assertBetas(double[] found, double... exact) {
        for (int mode = 0; mode < exact.length; mode++) {
            double error = found[mode] / exact[mode] - 1.0;
            double bound = 1.2 * Math.pow(exact[mode] / 20.0, 4) / 2880.0 + 2e-9;
            assertTrue(Math.abs(error) <= bound, "mode " + mode + ": error " + error + ", bound " + bound);
        }
    }

    // Characteristic equation solved by state-space exponential, recomputed; Bokaian, J. Sound Vib. 126 (1988) treats these cases
    @ParameterizedTest
    @CsvSource({
        "0, 3.516015268500151, 22.03449156466675, 61.69721441354927",
        "0.1, 3.3478236878985723, 21.852137860252792, 61.54245087641349",
        "0.25, 3.073499185640885, 21.575368166613142, 61.30956686028155",
        "0.5, 2.5345602160710228, 21.105172354558714, 60.919443045117504",
        "0.75, 1.8113034595715372, 20.623377714015124, 60.526817024480444",
        "0.9, 1.1532760801535964, 20.328510038420152, 60.29002963259479",
        "-0.5, 4.233459948900763, 22.9215386680665, 62.465185241435634",
        "-1, 4.814771570246307, 23.77013442297157, 63.223565491906825",
        "-4, 7.135976467065119, 28.223860819802383, 67.584189670608"})
    void cantileverUnderAxialForce(double shareOfCritical, double first, double second, double third) {
        double critical = Math.PI * Math.PI * BENDING / (4.0 * LENGTH * LENGTH);
        Beam beam = beam(40, "uy rz", "");
        beam.structure().model().getMembers().forEach(member -> member.setAxialForce(-shareOfCritical * critical));
        double[] omega = beam.structure().circular();
        double[] exact = {first, second, third};
        for (int mode = 0; mode < 3; mode++) {
            double scaled = omega[mode] * LENGTH * LENGTH * Math.sqrt(MASS / BENDING);
            // (beta h)^4/1440 for the third mode at 40 members is 1.1e-6; near buckling errors of K are magnified by 1/(1 - P/Pcr)
            assertEquals(exact[mode], scaled, 2e-6 * exact[mode], "mode " + mode);
        }
    }

    // Blevins (1979), section 8.1.4; f/f0 = sqrt(1 + P/(n^2 Pe)) exactly for pinned ends; from memory, recomputed
    @ParameterizedTest
    @CsvSource({"-0.9, 0.3162277660168379, 0.8803408430829505", "-0.5, 0.7071067811865476, 0.9354143466934853",
        "-0.25, 0.8660254037844386, 0.9682458365518543", "0.5, 1.224744871391589, 1.0606601717798212",
        "1, 1.4142135623730951, 1.118033988749895", "2, 1.7320508075688772, 1.224744871391589",
        "10, 3.3166247903554, 1.8708286933869707"})
    void pinnedBeamUnderAxialForce(double share, double first, double second) {
        double euler = Math.PI * Math.PI * BENDING / (LENGTH * LENGTH);
        double[] without = beam(20, "uy", "uy").structure().circular();
        Beam beam = beam(20, "uy", "uy");
        beam.structure().model().getMembers().forEach(member -> member.setAxialForce(share * euler));
        double[] with = beam.structure().circular();
        assertEquals(first, with[0] / without[0], 1e-5 * first);
        assertEquals(second, with[1] / without[1], 1e-5 * second);
    }

    @Test
    void compressionBeyondBucklingGivesANegativeEigenvalue() {
        double euler = Math.PI * Math.PI * BENDING / (LENGTH * LENGTH);
        Beam beam = beam(20, "uy", "uy");
        beam.structure().model().getMembers().forEach(member -> member.setAxialForce(-1.0 * euler));
        // at the Euler load the first frequency is zero; relative to the unloaded one the cubic misses it by its fourth-order error
        assertEquals(0.0, beam.structure().circular()[0], 1e-2 * beam(20, "uy", "uy").structure().circular()[0]);
        beam.structure().model().getMembers().forEach(member -> member.setAxialForce(-1.1 * euler));
        double[] omega = beam.structure().circular();
        assertTrue(omega[0] < 0.0 && omega[1] > 0.0);
    }

    // A. K. Chopra, Dynamics of Structures, chimney of examples 8.4 and 16.1; from memory, recomputed from the closed form
    @Test
    void chimneyInKipsAndFeet() {
        double[] periods = {3.6263315927123196, 0.5786490335482268, 0.20665823197717903, 0.10545934808100856, 0.0637959933217565};
        TestStructure structure = new TestStructure("kip-ft");
        double outer = 50.0;
        double inner = 45.0;
        double area = Math.PI / 4.0 * (outer * outer - inner * inner);
        double inertia = Math.PI / 64.0 * (Math.pow(outer, 4) - Math.pow(inner, 4));
        Material concrete = structure.material(3600.0 * 144.0, 0.2, 0.150 / 32.2);
        FrameSection shaft = structure.section(area, inertia, inertia, 2.0 * inertia, 0.0, 0.0);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {0, 0, 600.0}, 24, shaft, concrete);
        structure.holdAll("uy uz rx rz");
        structure.hold(nodes[0], TestStructure.ALL);
        double[] hertz = structure.hertz();
        double[] betas = {1.87510407, 4.69409113, 7.85475744, 10.99554073, 14.13716839};
        for (int mode = 0; mode < 5; mode++) {
            double expected = 1.0 / periods[mode];
            assertEquals(expected, hertz[mode], expected * (1.2 * Math.pow(betas[mode] / 24.0, 4) / 1440.0 + 1e-8), "mode " + mode);
        }
    }
}
