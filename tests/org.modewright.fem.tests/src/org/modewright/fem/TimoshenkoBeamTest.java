package org.modewright.fem;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Node;

/**
 * Simply supported beam of 10 m with a square section of 2 m that deforms in shear (shear factor 5/6).
 *
 * <p>The static shape functions have a constant shear strain in each member, so the shear strain energy of a vibrating beam, whose
 * shear force varies along the member, is missed by the order h<sup>2</sup>: the frequency converges with h<sup>2</sup>, not with
 * h<sup>4</sup> as without shear.
 */
class TimoshenkoBeamTest {

    // S. Timoshenko (1921, 1922); Huang (1961); closed form, one 2 x 2 problem per half-wave number, recomputed
    private static final double[] FIRST_SPECTRUM = {42.608717253941656, 147.78601200406803, 282.36338463546065, 428.47176738614485,
        578.5929844899488, 729.6641369618401};
    private static final double SECOND_SPECTRUM_FIRST = 830.4323527539487;
    // closed form n^2 pi/2 sqrt(EI/(m L^4)), recomputed
    private static final double WITHOUT_SHEAR_FIRST = 45.344984;

    private static final double SIDE = 2.0;

    private static TestStructure beam(int members, boolean vertical, String free) {
        TestStructure structure = new TestStructure();
        Material material = structure.material(200e9, 0.3, 8000.0);
        double area = SIDE * SIDE;
        double inertia = Math.pow(SIDE, 4) / 12.0;
        FrameSection section = structure.section(area, inertia, inertia, 0.1406 * Math.pow(SIDE, 4), area * 5.0 / 6.0, area * 5.0 / 6.0);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {10.0, 0, 0}, members, section, material);
        structure.holdAll(vertical ? "ux uy rx rz" : "ux uz rx ry");
        structure.hold(nodes[0], free);
        structure.hold(nodes[members], free);
        return structure;
    }

    @Test
    void bothPlanesConvergeToTheClosedForm() {
        for (boolean vertical : new boolean[] {false, true}) {
            String ends = vertical ? "uz" : "uy";
            double[] coarse = beam(32, vertical, ends).hertz();
            double[] fine = beam(64, vertical, ends).hertz();
            for (int mode = 0; mode < 4; mode++) {
                double exact = FIRST_SPECTRUM[mode];
                double error = fine[mode] / exact - 1.0;
                double coarseError = coarse[mode] / exact - 1.0;
                assertTrue(error > 0.0 && error < 3e-3, "a conforming member is too stiff: mode " + mode + ", error " + error);
                assertEquals(2.0, Math.log(coarseError / error) / Math.log(2.0), 0.06, "order of mode " + mode);
                // Richardson: with order 2 the extrapolated value is better by two orders
                double extrapolated = (4.0 * fine[mode] - coarse[mode]) / 3.0;
                assertEquals(exact, extrapolated, 1e-4 * exact, "mode " + mode);
            }
        }
    }

    @Test
    void theSecondSpectrumBeginsWhereItShould() {
        double[] hertz = beam(128, false, "uy").hertz();
        double nearest = Double.NaN;
        for (double found : hertz) {
            if (Double.isNaN(nearest) || Math.abs(found - SECOND_SPECTRUM_FIRST) < Math.abs(nearest - SECOND_SPECTRUM_FIRST)) {
                nearest = found;
            }
        }
        // the first modes of both spectra lie 50 Hz apart here, so the match is no accident
        assertEquals(SECOND_SPECTRUM_FIRST, nearest, 2e-3 * SECOND_SPECTRUM_FIRST);
    }

    @Test
    void ignoringShearGivesTheSlenderBeam() {
        TestStructure structure = beam(32, false, "uy");
        structure.model().setShearDeformation(false);
        assertEquals(WITHOUT_SHEAR_FIRST, structure.hertz()[0], 1e-6 * WITHOUT_SHEAR_FIRST);
    }

    @Test
    void aStaticTipDeflectionIsExactWithOneMember() {
        // F L^3/(3 E I) + F L/(G A_s): strength of materials; one massless member with a tip mass has exactly this flexibility
        TestStructure structure = new TestStructure();
        structure.model().setSelfMassFactor(0.0);
        Material material = structure.material(200e9, 0.25, 8000.0);
        FrameSection section = structure.section(0.02, 3e-5, 7e-5, 1e-5, 0.012, 0.008);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {1.5, 0, 0}, 1, section, material);
        structure.hold(nodes[0], TestStructure.ALL);
        structure.mass(nodes[1], 0.0, 250.0, 250.0, 0.0, 0.0, 0.0);
        double shear = 200e9 / 2.5;
        double alongY = Math.pow(1.5, 3) / (3.0 * 200e9 * 7e-5) + 1.5 / (shear * 0.012);
        double alongZ = Math.pow(1.5, 3) / (3.0 * 200e9 * 3e-5) + 1.5 / (shear * 0.008);
        double[] omega = structure.circular();
        assertEquals(2, omega.length);
        assertEquals(1.0 / Math.sqrt(250.0 * alongZ), omega[0], 1e-10 * omega[0]);
        assertEquals(1.0 / Math.sqrt(250.0 * alongY), omega[1], 1e-10 * omega[1]);
    }
}
