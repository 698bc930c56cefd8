package org.modewright.fem;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Node;

/**
 * Rods in axial force and in torsion. Frequencies are compared as x = &omega; L / c. With linear shape functions and consistent mass
 * the error of a frequency is (xh/L)<sup>2</sup>/24.
 */
class RodTest {

    private static final double LENGTH = 4.0;
    private static final double YOUNG = 70e9;
    private static final double POISSON = 0.33;
    private static final double DENSITY = 2700.0;
    private static final int MEMBERS = 40;

    // Blevins (1979), Table 8-16; Meirovitch; x = (2n - 1) pi/2 and n pi; from memory, recomputed
    private static final double[] FIXED_FREE = {1.5707963267948966, 4.71238898038469, 7.853981633974483};
    private static final double[] FIXED_FIXED = {3.141592653589793, 6.283185307179586, 9.42477796076938};

    private static TestStructure rod(boolean bars, boolean torsion, boolean bothEnds, double tipMass) {
        TestStructure structure = new TestStructure();
        Material material = structure.material(YOUNG, POISSON, DENSITY);
        // not a circle: J differs from iy + iz
        FrameSection section = structure.section(0.003, 2e-6, 5e-6, 1.3e-6, 0.0, 0.0);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {LENGTH, 0, 0}, MEMBERS, section, material);
        for (Member member : structure.model().getMembers()) {
            member.setAxialOnly(bars);
        }
        structure.holdAll(torsion ? "ux uy uz ry rz" : "uy uz rx ry rz");
        String end = torsion ? "rx" : "ux";
        structure.hold(nodes[0], end);
        if (bothEnds) {
            structure.hold(nodes[MEMBERS], end);
        }
        structure.mass(nodes[MEMBERS], tipMass);
        return structure;
    }

    private static void assertRod(double[] omega, double speed, double... exact) {
        for (int mode = 0; mode < exact.length; mode++) {
            double x = omega[mode] * LENGTH / speed;
            double error = Math.pow(exact[mode] / MEMBERS, 2) / 24.0;
            assertEquals(error, x / exact[mode] - 1.0, 0.03 * error + 1e-9, "mode " + mode);
        }
    }

    @ParameterizedTest
    @ValueSource(booleans = {false, true})
    void axialVibration(boolean bars) {
        double speed = Math.sqrt(YOUNG / DENSITY);
        assertRod(rod(bars, false, false, 0.0).circular(), speed, FIXED_FREE);
        assertRod(rod(bars, false, true, 0.0).circular(), speed, FIXED_FIXED);
    }

    @ParameterizedTest
    @ValueSource(booleans = {false, true})
    void torsionalVibration(boolean bothEnds) {
        double shear = YOUNG / (2.0 * (1.0 + POISSON));
        double speed = Math.sqrt(shear * 1.3e-6 / (DENSITY * 7e-6));
        assertRod(rod(false, true, bothEnds, 0.0).circular(), speed, bothEnds ? FIXED_FIXED : FIXED_FREE);
    }

    // x tan x = 1/mu: Timoshenko, Vibration Problems in Engineering; Blevins (1979); from memory, roots recomputed
    @ParameterizedTest
    @CsvSource({"0.1, 1.42887001121, 4.30580141312, 7.22810977163", "0.5, 1.07687398631, 3.64359716743, 6.57833373272",
        "1, 0.860333589019, 3.42561845948, 6.43729817917", "2, 0.653271187094, 3.29231002128, 6.36162039207",
        "10, 0.3110528482, 3.17309717669, 6.2990593599"})
    void rodWithTipMass(double ratio, double first, double second, double third) {
        double mass = DENSITY * 0.003 * LENGTH;
        double[] omega = rod(false, false, false, ratio * mass).circular();
        double speed = Math.sqrt(YOUNG / DENSITY);
        double[] exact = {first, second, third};
        for (int mode = 0; mode < 3; mode++) {
            // the tip mass takes part of the energy, so the error lies below that of the bare rod
            double bound = 1.03 * Math.pow(exact[mode] / MEMBERS, 2) / 24.0 + 1e-9;
            assertEquals(exact[mode], omega[mode] * LENGTH / speed, bound * exact[mode], "mode " + mode);
        }
    }
}
