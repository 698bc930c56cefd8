package org.modewright.modal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.EnumSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.modewright.fem.Assembly;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.Member;
import org.modewright.numerics.Progress;

/** Effective masses of beams, eccentric floors and appendages, and the sums over all modes. */
class EffectiveMassTest {

    private static final double LENGTH = 10;

    /** A cantilever along Z that can bend in X alone, of so many members. */
    private static Structures cantilever(int members) {
        Structures structures = new Structures("cantilever").material("steel", 2.1e11, 0.3, 7850).section("bar", 0.01, 8e-6, 8e-6, 1e-5);
        structures.node("0", 0, 0, 0).support("0", "ux uy uz rx ry rz");
        for (int i = 1; i <= members; i++) {
            structures.node("" + i, 0, 0, LENGTH * i / members).support("" + i, "uy uz rx rz");
            structures.with("m" + i, "" + (i - 1), "" + i);
        }
        return structures;
    }

    /**
     * Uniform cantilever, effective mass over the whole mass in per cent: A. K. Chopra, Dynamics of Structures, distributed-mass systems;
     * R. D. Blevins, Formulas for Natural Frequency and Mode Shape (1979) (from memory, recomputed). Shares are of the movable mass, so
     * they are turned back to the whole mass here. With consistent mass the movable mass lacks 264/420 of the first member.
     */
    @Test
    void cantilever() {
        ModalResult result = cantilever(120).modes(8);
        double[] expected = {61.307609, 18.830036, 6.473223, 3.308689, 2.001400, 1.339784, 0.959254, 0.720506};
        double total = 7850 * 0.01 * LENGTH;
        for (int i = 0; i < expected.length; i++) {
            double effective = result.modes().get(i).effectiveMassShare(Direction.X) * result.mass().movable()[0];
            assertEquals(expected[i], 100 * effective / total, 1e-3 * expected[i], "mode " + (i + 1));
        }
        assertEquals(1.875104069 * 1.875104069 * Math.sqrt(2.1e11 * 8e-6 / (7850 * 0.01)) / (LENGTH * LENGTH),
                2 * Math.PI * result.modes().get(0).frequency(), 1e-5);
    }

    /**
     * Simply supported beam shaken across at both ends: shares 8/(n&pi;)&sup2; for odd n, none for even n (closed form, recomputed). The
     * run does not stop at the second mode, which has no mass: 90 % are reached by the third, 81.057 + 0 + 9.006 %. The mass coupling to
     * the supports, which participation leaves out, is of the square of the member's share of the length.
     */
    @Test
    void simplySupportedBeamHasModesWithoutMass() {
        int members = 80;
        double couplingLeftOut = 5.0 / (members * members);
        Structures s = new Structures("beam").material("steel", 2.1e11, 0.3, 7850).section("bar", 0.01, 8e-6, 8e-6, 1e-5);
        for (int i = 0; i <= members; i++) {
            s.node("" + i, LENGTH * i / members, 0, 0).support("" + i, i % members == 0 ? "ux uy uz rx ry" : "ux uz rx ry");
        }
        for (int i = 1; i <= members; i++) {
            s.with("m" + i, "" + (i - 1), "" + i);
        }
        ModalResult result = ModalRun.run(s.snapshot(), ModalRequest.of(new CaptureTarget(0.9, EnumSet.of(Direction.Y))), Progress.NONE);
        double movable = result.mass().movable()[1] / (7850 * 0.01 * LENGTH);
        for (int n = 1; n <= 5; n++) {
            double expected = n % 2 == 0 ? 0 : 8 / (n * n * Math.PI * Math.PI);
            assertEquals(expected, result.modes().get(n - 1).effectiveMassShare(Direction.Y) * movable, couplingLeftOut, "mode " + n);
        }
        assertTrue(result.running(Direction.Y)[1] < 0.9);
        assertTrue(result.running(Direction.Y)[2] > 0.9);
    }

    /** A rod along X fixed at one end, total mass 1, EA/L = 1, of so many equal members. */
    private static Structures rod(int members) {
        Structures structures = new Structures("rod").material("unit", 1, 0, 1).section("unit", 1, 1, 1, 1);
        structures.node("0", 0, 0, 0).support("0", "ux uy uz rx ry rz");
        for (int i = 1; i <= members; i++) {
            structures.node("" + i, (double) i / members, 0, 0).support("" + i, "uy uz rx ry rz");
            structures.with("m" + i, "" + (i - 1), "" + i);
        }
        return structures;
    }

    /**
     * Mass on supports never takes part: of the total mass 1 the modes of a lumped fixed-free rod hold 1 &minus; h/2, of a consistent one
     * 1 &minus; 2h/3 without the coupling to the support; own derivation, recomputed. First frequencies of both.
     */
    @ParameterizedTest
    @CsvSource({"1, 0.500000, 0.333333, 1.414214, 1.732051", "2, 0.750000, 0.666667, 1.530734, 1.611416",
        "3, 0.833333, 0.777778, 1.552914, 1.588796", "5, 0.900000, 0.866667, 1.564345, 1.577264",
        "10, 0.950000, 0.933333, 1.569182, 1.572412", "20, 0.975000, 0.966667, 1.570393, 1.571200"})
    void massOnSupportsTakesNoPart(int members, double lumped, double consistent, double lumpedOmega, double consistentOmega) {
        ModalResult ofLumped = rod(members).lumped().allModes();
        ModalResult ofConsistent = rod(members).allModes();
        assertEquals(lumped, ofLumped.capture(Direction.X) * ofLumped.mass().movable()[0], 0.5e-6 + 1e-12);
        assertEquals(consistent, ofConsistent.capture(Direction.X) * ofConsistent.mass().movable()[0], 0.5e-6 + 1e-12);
        assertEquals(1, ofLumped.capture(Direction.X), 1e-12);
        assertEquals(1, ofConsistent.capture(Direction.X), 1e-12);
        assertEquals(1, ofConsistent.mass().movable()[0] + ofConsistent.mass().onSupports()[0], 1e-12);
        assertEquals(lumpedOmega, 2 * Math.PI * ofLumped.modes().get(0).frequency(), 0.5e-6 + 1e-9);
        assertEquals(consistentOmega, 2 * Math.PI * ofConsistent.modes().get(0).frequency(), 0.5e-6 + 1e-9);
    }

    /** One mass with spin inertia, held in X, on a spring in Y off its centre; K = [[kx, 0, -kx ey], [0, ky, ky ex], [.., .., ktheta]]. */
    private static Structures floor(double kx, double ky, double spin, double ex, double ey) {
        Structures structures = new Structures("floor").node("centre", 0, 0, 3).support("centre", "uz rx ry")
                .mass("centre", 1, 1, 0, 0, 0, 1);
        double rest = spin - kx * ey * ey - ky * ex * ex;
        structures.node("off", ex, ey, 3).link("arm", "centre", "off").spring("stiffness", "off", null, kx, ky, 0, 0, 0, rest);
        return structures;
    }

    /**
     * One-way eccentric storey, &Omega; = &omega;<sub>&theta;</sub>/&omega;<sub>y</sub> with the torsional stiffness about the centre of
     * mass: A. K. Chopra, Dynamics of Structures, section 13.3; C. L. Kan and A. K. Chopra (1977) (from memory, recomputed).
     */
    @ParameterizedTest
    @CsvSource({"0.6, 0.05, 0.59675565, 1.00193947, 0.599398, 99.400602", "0.6, 0.4, 0.40957302, 1.09190198, 18.765248, 81.234752",
        "0.8, 0.2, 0.74224492, 1.04358636, 16.551763, 83.448237", "1.0, 0.05, 0.97467943, 1.02469508, 50, 50",
        "1.0, 0.4, 0.77459667, 1.18321596, 50, 50", "1.2, 0.1, 0.98911025, 1.20899170, 95.518324, 4.481676",
        "1.5, 0.4, 0.93965893, 1.53851913, 92.113570, 7.886430", "2.0, 0.2, 0.99334053, 2.00331590, 99.561395, 0.438605"})
    void oneWayEccentricFloor(double ratio, double eccentricity, double first, double second, double share1, double share2) {
        ModalResult result = floor(0, 1, ratio * ratio, eccentricity, 0).support("off", "ux").allModes();
        assertEquals(2, result.modes().size());
        assertEquals(first, 2 * Math.PI * result.modes().get(0).frequency(), 0.5e-8 + 1e-11);
        assertEquals(second, 2 * Math.PI * result.modes().get(1).frequency(), 0.5e-8 + 1e-11);
        assertEquals(share1, 100 * result.modes().get(0).effectiveMassShare(Direction.Y), 0.5e-6 + 1e-9);
        assertEquals(share2, 100 * result.modes().get(1).effectiveMassShare(Direction.Y), 0.5e-6 + 1e-9);
        assertEquals(share2, 100 * result.modes().get(0).effectiveMassShare(Direction.RZ), 0.5e-6 + 1e-9);
    }

    /** Two-way eccentric floor, m = r = 1, kx = 1, ky = 1.2, ktheta = 1.5, ex = 0.1, ey = 0.15: own case, recomputed. */
    @Test
    void twoWayEccentricFloor() {
        ModalResult result = floor(1, 1.2, 1.5, 0.1, 0.15).allModes();
        double[][] expected = {{0.895166380704556, 0.04704332361286382, 0.057790295682579824},
            {0.020132000979132297, 0.8932569488232349, 0.08661105019763311}, {0.0847016183163113, 0.059699727563901496, 0.855598654119787}};
        double[] omega = {0.9766571497579821, 1.0811925484030542, 1.2558516970981581};
        for (int mode = 0; mode < 3; mode++) {
            double[] shares = result.modes().get(mode).effectiveMassShare();
            assertEquals(omega[mode], 2 * Math.PI * result.modes().get(mode).frequency(), 1e-10);
            assertEquals(expected[0][mode], shares[0], 1e-10);
            assertEquals(expected[1][mode], shares[1], 1e-10);
            assertEquals(expected[2][mode], shares[5], 1e-10);
        }
    }

    /**
     * One-storey floor of 30 by 20 ft, 100 psf, on frames A (75 kip/ft in y, 1.5 ft off centre), B and C (40 kip/ft in x at &plusmn;10 ft):
     * A. K. Chopra, Dynamics of Structures, example 10.6 (from memory, recomputed): &omega; = 5.878, 6.552, 6.794.
     */
    @Test
    void floorOnThreeFrames() {
        double mass = 60 / 32.2;
        Structures structures = new Structures("three frames").node("centre", 0, 0, 12).support("centre", "uz rx ry")
                .mass("centre", mass, mass, 0, 0, 0, mass * (30 * 30 + 20 * 20) / 12.0);
        structures.node("A", 1.5, 0, 12).node("B", 0, 10, 12).node("C", 0, -10, 12).floor("roof", "centre", "A", "B", "C");
        structures.spring("frame A", "A", null, 0, 75, 0, 0, 0, 0).spring("frame B", "B", null, 40, 0, 0, 0, 0, 0)
                .spring("frame C", "C", null, 40, 0, 0, 0, 0, 0);
        ModalResult result = structures.allModes();
        double[] omega = result.modes().stream().mapToDouble(mode -> 2 * Math.PI * mode.frequency()).toArray();
        assertArrayEquals(new double[] {5.878495630769048, 6.552353266829662, 6.794116564223784}, omega, 1e-9);
        assertEquals(1, result.modes().get(1).effectiveMassShare(Direction.X), 1e-12);
        assertEquals("sway X", result.modes().get(1).character().text());
    }

    /**
     * Light appendage tuned to its carrier, mass ratio &mu;: two close modes with about half of the mass each: J. L. Sackman and J. M.
     * Kelly (1979); T. Igusa and A. Der Kiureghian (1985) (from memory, recomputed). At the smallest ratio the shares of the single modes
     * depend on the last digits, so there the sum over the pair is compared more sharply than they are.
     */
    @ParameterizedTest
    @CsvSource({"0.1, 0.8543089536, 1.1705367196, 0.72006303, 1e-8", "0.01, 0.9512492197, 1.0512492197, 0.57441199, 1e-8",
        "0.001, 0.9843136039, 1.0159363805, 0.52369832, 1e-8", "0.0001, 0.9950124999, 1.0050124999, 0.50749941, 1e-8",
        "0.000001, 0.9995001250, 1.0005001250, 0.50075000, 1e-7"})
    void tunedAppendage(double ratio, double first, double second, double share, double tolerance) {
        ModalResult result = Structures.chain(new double[] {1, ratio}, new double[] {1, ratio}).allModes();
        assertEquals(first, 2 * Math.PI * result.modes().get(0).frequency(), 0.5e-10 + 1e-11);
        assertEquals(second, 2 * Math.PI * result.modes().get(1).frequency(), 0.5e-10 + 1e-11);
        double carrier = result.shape(0)[6];
        double effective = result.modes().get(0).effectiveMassShare(Direction.X) * result.mass().movable()[0];
        assertEquals(share, effective / (1 + ratio), tolerance);
        assertEquals(1, result.capture(Direction.X), 1e-12);
        assertEquals(Math.sqrt(0.5), Math.abs(carrier), 0.2);
    }

    /**
     * Ring of six equal masses on ring springs: &omega; = 2 sin(r&pi;/6): 0, 1, 1, &radic;3, &radic;3, 2; textbook (Born and von Karman).
     */
    @Test
    void ringOfMassesHasDoubleRoots() {
        Structures structures = new Structures("ring");
        for (int i = 0; i < 6; i++) {
            structures.node("n" + i, i, 0, 0).support("n" + i, "uy uz rx ry rz").mass("n" + i, 1, 0, 0, 0, 0, 0);
        }
        for (int i = 0; i < 6; i++) {
            structures.spring("s" + i, "n" + i, "n" + (i + 1) % 6, 1, 0, 0, 0, 0, 0);
        }
        ModalResult result = structures.allModes();
        double[] omega = result.modes().stream().mapToDouble(mode -> 2 * Math.PI * mode.frequency()).toArray();
        assertArrayEquals(new double[] {0, 1, 1, Math.sqrt(3), Math.sqrt(3), 2}, omega, 1e-12);
        assertEquals(0, result.modes().get(0).eigenvalue());
        assertEquals(1, result.modes().get(0).effectiveMassShare(Direction.X), 1e-12);
    }

    /**
     * Rigid block on sway and rocking springs, m = 1, h = 2, I = 0.5, kh = 4, kr = 20: F. E. Richart, R. D. Woods and J. R. Hall;
     * recomputed.
     */
    @Test
    void swayAndRocking() {
        Structures structures = new Structures("block").node("base", 0, 0, 0).support("base", "uy uz rx rz")
                .mass("base", 1, 0, 0, 0, 0.5, 0).massOffset(0, 0, 2).spring("soil", "base", null, 4, 0, 0, 0, 20, 0);
        ModalResult result = structures.allModes();
        assertEquals(1.4720917993325573, 2 * Math.PI * result.modes().get(0).frequency(), 1e-11);
        assertEquals(8.592609948923425, 2 * Math.PI * result.modes().get(1).frequency(), 1e-10);
        assertEquals(0.9744237363580555, result.modes().get(0).effectiveMassShare(Direction.X), 1e-11);
        assertEquals(0.02557626364194462, result.modes().get(1).effectiveMassShare(Direction.X), 1e-11);
    }

    /** Everything at once: floors, links, offsets, releases, massless nodes, mass on supports, bars, springs, dropped motions. */
    private static Structures everything() {
        Structures s = new Structures("everything").material("steel", 2.1e11, 0.3, 7850).section("column", 0.012, 9e-5, 6e-5, 3e-5);
        for (int level = 0; level <= 2; level++) {
            for (int i = 0; i < 4; i++) {
                s.node("n" + level + i, (i % 2) * 6.0 + 0.4 * level * (i / 2), (i / 2) * 5.0, 3.2 * level);
            }
        }
        for (int i = 0; i < 4; i++) {
            s.support("n0" + i, i == 3 ? "ux uy uz" : "ux uy uz rx ry rz");
            s.with("c1" + i, "n0" + i, "n1" + i).with("c2" + i, "n1" + i, "n2" + i);
        }
        s.section("beam", 0.008, 1.2e-4, 2e-5, 1e-6);
        for (int level = 1; level <= 2; level++) {
            int[][] edges = {{0, 1}, {1, 3}, {3, 2}, {2, 0}};
            for (int[] edge : edges) {
                Member beam = s.member("b" + level + edge[0], "n" + level + edge[0], "n" + level + edge[1]);
                beam.setStartRigid(0.2);
                beam.setEndOffset(Structures.vector(0, 0, level == 2 ? 0.15 : 0));
                if (edge[0] == 1) {
                    Structures.free(beam, false, Component.RY, Component.RZ);
                }
            }
        }
        s.section("bar", 0.001, 1e-8, 1e-8, 1e-8);
        Member brace = s.member("brace", "n00", "n11");
        brace.setAxialOnly(true);
        s.section("pole", 0.004, 5e-6, 5e-6, 1e-5);
        s.floor("floor 1", "n10", "n11", "n12", "n13").floor("floor 2", "n20", "n21", "n22", "n23");
        s.mass("n21", 4000, 4000, 4000, 10, 20, 3000).massOffset(0.5, -0.3, 0.2);
        s.mass("n12", 2500, 2500, 0, 0, 0, 0).mass("n03", 700, 700, 700, 0, 0, 0);
        s.node("mast", 3, 2, 9).node("arm", 3.5, 2, 9).with("mast", "n22", "mast").link("arm", "mast", "arm").mass("arm", 300, 300, 300,
                0, 0, 0);
        s.node("tip", 6, 5, 8.5).spring("hanger", "n23", "tip", 1e6, 1e6, 1e6, 2e5, 2e5, 2e5).mass("tip", 50, 50, 50, 0, 0, 0);
        return s;
    }

    /**
     * All modes together hold exactly the movable mass, in six components, whatever constraints, offsets and massless motions there are.
     */
    @Test
    void allModesTogetherHoldAllMass() {
        ModalResult result = everything().allModes();
        for (Direction direction : Direction.values()) {
            assertEquals(1, result.capture(direction), 1e-12 * result.modes().size(), direction.word());
        }
        assertEquals(1, result.capture(Math.toRadians(34)), 1e-12 * result.modes().size());
        assertEquals(1, result.capture(Math.toRadians(-71)), 1e-12 * result.modes().size());
        assertEquals(0, result.mass().balance(), 1e-12);
    }

    /** The same with lumped mass, where most rotations are massless. */
    @Test
    void allModesTogetherHoldAllLumpedMass() {
        ModalResult result = everything().lumped().allModes();
        for (Direction direction : Direction.values()) {
            assertEquals(1, result.capture(direction), 1e-12 * result.modes().size(), direction.word());
        }
        assertTrue(result.modes().size() < result.freeDofs());
        assertTrue(result.isExhausted());
    }

    /** A pin joint of bars, whose turns have neither stiffness nor mass, changes nothing in the sums. */
    @Test
    void allModesTogetherHoldAllMassBesideDroppedMotions() {
        Structures s = everything().section("rod", 0.002, 1e-8, 1e-8, 1e-8).node("joint", 9, 2, 4);
        for (String end : new String[] {"n01", "n11", "n21", "n13"}) {
            s.member("rod " + end, "joint", end).setAxialOnly(true);
        }
        Assembly assembly = Assembly.of(s.snapshot(), Progress.NONE);
        assertEquals(3, assembly.dropped().size());
        ModalResult result = ModalRun.run(assembly, ModalRequest.ofAllModes(), Progress.NONE);
        for (Direction direction : Direction.values()) {
            assertEquals(1, result.capture(direction), 1e-12 * result.modes().size(), direction.word());
        }
    }

    /** A support that slides along a line at 30 degrees to X: the plan directions are coupled, and every angle is captured whole. */
    @Test
    void skewSlideCouplesThePlanDirections() {
        double c = Math.cos(Math.toRadians(30));
        double sine = Math.sin(Math.toRadians(30));
        Structures s = new Structures("slide").node("a", 0, 0, 0).support("a", "uz rx ry rz").mass("a", 40, 40, 0, 0, 0, 0)
                .tie("line", "a", Component.UX, sine, "a", Component.UY, -c).spring("k", "a", null, 1000, 1000, 0, 0, 0, 0);
        ModalResult result = s.allModes();
        assertEquals(1, result.modes().size());
        assertEquals(Math.sqrt(1000 / 40.0), 2 * Math.PI * result.modes().get(0).frequency(), 1e-12);
        for (double degrees : new double[] {0, 17, 30, 90, 154}) {
            assertEquals(1, result.capture(Math.toRadians(degrees)), 1e-12, degrees + " degrees");
        }
        assertTrue(result.planCoupling() > 1);
    }

    /** A plan direction at an angle agrees with the same structure turned by that angle. */
    @Test
    void captureAtAnAngleIsCaptureOfTheTurnedStructure() {
        ModalResult result = everything().modes(5);
        double angle = Math.toRadians(90);
        assertEquals(result.capture(Direction.Y), result.capture(angle), 1e-14);
        assertEquals(result.capture(Direction.X), result.capture(0.0), 1e-14);
        ModalResult floor = floor(1, 1.2, 1.5, 0.1, 0.15).modes(2);
        double c = Math.cos(0.5);
        double s = Math.sin(0.5);
        double expected = 0;
        for (Mode mode : floor.modes()) {
            double participation = c * mode.participation(Direction.X) + s * mode.participation(Direction.Y);
            expected += participation * participation;
        }
        assertEquals(expected, floor.capture(0.5), 1e-14);
    }
}
