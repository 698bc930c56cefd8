package org.modewright.fem;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Arrays;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Node;
import org.modewright.numerics.EigenPairs;

/** Lumped chains, shear buildings and floors against closed forms. */
class ShearBuildingTest {

    private static final String NOT_X = "uy uz rx ry rz";

    private static double[] omega(EigenPairs pairs) {
        return Arrays.stream(pairs.values()).map(Math::sqrt).toArray();
    }

    static double[][] uniformBuildings() {
        // closed form of the fixed-free chain (Humar; Newmark and Rosenblueth), recomputed: frequencies in sqrt(k/m), then effective
        // masses in percent
        return new double[][] {
            {1.000000, 100.0000},
            {0.618034, 1.618034, 94.7214, 5.2786},
            {0.445042, 1.246980, 1.801938, 91.4079, 7.4877, 1.1044},
            {0.347296, 1.000000, 1.532089, 1.879385, 89.3429, 8.3333, 1.9558, 0.3680},
            {0.284630, 0.830830, 1.309721, 1.682507, 1.918986, 87.9530, 8.7177, 2.4216, 0.7509, 0.1568},
            {0.241073, 0.709210, 1.136129, 1.497021, 1.770912, 1.941884, 86.9582, 8.9136, 2.6909, 1.0062, 0.3532, 0.0779},
            {0.209057, 0.618034, 1.000000, 1.338261, 1.618034, 1.827091, 1.956295,
                86.2125, 9.0211, 2.8571, 1.1747, 0.5027, 0.1888, 0.0430},
            {0.184537, 0.547326, 0.891477, 1.205269, 1.478018, 1.700434, 1.864944, 1.965946,
                85.6332, 9.0828, 2.9656, 1.2894, 0.6111, 0.2819, 0.1104, 0.0257},
            {0.165159, 0.490971, 0.803391, 1.093896, 1.354563, 1.578281, 1.758948, 1.891634, 1.972723,
                85.1705, 9.1192, 3.0394, 1.3700, 0.6901, 0.3543, 0.1713, 0.0689, 0.0163},
            {0.149460, 0.445042, 0.730682, 1.000000, 1.246980, 1.466104, 1.652478, 1.801938, 1.911146, 1.977662,
                84.7925, 9.1408, 3.0915, 1.4286, 0.7488, 0.4100, 0.2214, 0.1104, 0.0453, 0.0108}};
    }

    private static void assertBuilding(Assembly assembly, double unit, double[] expected) {
        int storeys = expected.length / 2;
        EigenPairs pairs = TestStructure.pairs(assembly);
        double[] omega = omega(pairs);
        double[] shares = TestStructure.effectiveShares(assembly, pairs, 0);
        assertEquals(storeys, omega.length);
        for (int mode = 0; mode < storeys; mode++) {
            // half a unit of the last printed digit
            assertEquals(expected[mode], omega[mode] / unit, 0.6e-6, "frequency " + (mode + 1));
            assertEquals(expected[storeys + mode], 100.0 * shares[mode], 0.6e-4, "effective mass " + (mode + 1));
        }
        assertEquals(1.0, Arrays.stream(shares).sum(), 1e-12);
    }

    @ParameterizedTest
    @MethodSource("uniformBuildings")
    void uniformBuildingOfSprings(double[] expected) {
        TestStructure structure = new TestStructure();
        Node below = structure.node(0, 0, 0);
        structure.hold(below, TestStructure.ALL);
        for (int storey = 1; storey <= expected.length / 2; storey++) {
            Node floor = structure.node(0, 0, 3.0 * storey);
            structure.hold(floor, NOT_X);
            structure.spring(floor, below, 4.0e6);
            structure.mass(floor, 1.0e4);
            below = floor;
        }
        assertBuilding(structure.assemble(), 20.0, expected);
    }

    @ParameterizedTest
    @MethodSource("uniformBuildings")
    void uniformBuildingOfColumnsWithoutMass(double[] expected) {
        TestStructure structure = new TestStructure();
        structure.model().setSelfMassFactor(0.0);
        Material material = structure.material(30e9, 0.2, 2500.0);
        FrameSection column = structure.section(0.09, 6.75e-4, 6.75e-4, 1e-3, 0.0, 0.0);
        Node below = structure.node(0, 0, 0);
        structure.hold(below, TestStructure.ALL);
        for (int storey = 1; storey <= expected.length / 2; storey++) {
            Node floor = structure.node(0, 0, 3.0 * storey);
            structure.hold(floor, NOT_X);
            structure.member(below, floor, column, material);
            structure.mass(floor, 2.0e4);
            below = floor;
        }
        // a column clamped at both floors: 12 E I/h^3
        assertBuilding(structure.assemble(), Math.sqrt(12.0 * 30e9 * 6.75e-4 / 27.0 / 2.0e4), expected);
    }

    // Chopra, Dynamics of Structures, one-way unsymmetric system of section 13.3; Kan and Chopra (1977); from memory, recomputed from
    // w^2/wy^2 = (1 + O^2 -+ sqrt((1 - O^2)^2 + 4 (e/r)^2))/2, torsional stiffness about the centre of mass
    @ParameterizedTest
    @CsvSource({"0.6, 0.1, 0.58714471, 1.00760165, 2.276001", "0.6, 0.4, 0.40957302, 1.09190198, 18.765248",
        "0.8, 0.2, 0.74224492, 1.04358636, 16.551763", "1.0, 0.05, 0.97467943, 1.02469508, 50.0",
        "1.0, 0.4, 0.77459667, 1.18321596, 50.0", "1.2, 0.2, 0.96056162, 1.23179600, 86.997004",
        "1.5, 0.1, 0.99601735, 1.50264748, 99.372032", "2.0, 0.4, 0.97343851, 2.01306172, 98.311747"})
    void eccentricFloor(double ratio, double eccentricity, double first, double second, double share) {
        double mass = 3.0e5;
        double radius = 6.0;
        double stiffness = 5.0e7;
        TestStructure structure = new TestStructure();
        Node centre = structure.node(20, 10, 3);
        Node frame = structure.node(20 + eccentricity * radius, 10, 3);
        structure.floor(centre, frame);
        structure.hold(centre, "ux uz rx ry");
        structure.hold(frame, "uz rx ry");
        structure.mass(centre, mass, mass, mass, 0, 0, mass * radius * radius);
        structure.spring(frame, null, 0, stiffness, 0, 0, 0, 0);
        // the frame gives k e^2 about the centre of mass; the rest of the torsional stiffness comes from elsewhere
        double rest = stiffness * radius * radius * (ratio * ratio - eccentricity * eccentricity);
        structure.spring(centre, null, 0, 0, 0, 0, 0, rest);
        Assembly assembly = structure.assemble();
        EigenPairs pairs = TestStructure.pairs(assembly);
        double unit = Math.sqrt(stiffness / mass);
        assertEquals(2, pairs.count());
        assertEquals(first, Math.sqrt(pairs.values()[0]) / unit, 1e-8);
        assertEquals(second, Math.sqrt(pairs.values()[1]) / unit, 1e-8);
        double[] shares = TestStructure.effectiveShares(assembly, pairs, 1);
        assertEquals(share, 100.0 * shares[0], 1e-6);
        assertEquals(1.0, shares[0] + shares[1], 1e-12);
        assertEquals(1.0, Arrays.stream(TestStructure.effectiveShares(assembly, pairs, 5)).sum(), 1e-12);
        assertArrayEquals(new double[] {20, 10, 3}, assembly.ledger().centre(), 1e-9);
        assertEquals(mass * radius * radius, assembly.ledger().rotary()[2], 1e-9 * mass * radius * radius);
    }

    // A. K. Chopra, Dynamics of Structures, example 10.6 (system of figure 9.5.1): from memory, recomputed by a 3 x 3 eigenproblem
    @Test
    void slabOnThreeFramesInKipsAndFeet() {
        TestStructure structure = new TestStructure("kip-ft");
        double mass = 60.0 / 32.2;
        Node centre = structure.node(0, 0, 12);
        Node frameA = structure.node(1.5, 0, 12);
        Node frameB = structure.node(0, 10, 12);
        Node frameC = structure.node(0, -10, 12);
        structure.floor(centre, frameA, frameB, frameC);
        structure.holdAll("uz rx ry");
        structure.mass(centre, mass, mass, mass, 0, 0, mass * (30.0 * 30.0 + 20.0 * 20.0) / 12.0);
        structure.spring(frameA, null, 0, 75.0);
        structure.spring(frameB, null, 40.0);
        structure.spring(frameC, null, 40.0);
        double[] expected = {5.878495630769048, 6.552353266829662, 6.794116564223784};
        double[] found = structure.circular();
        for (int mode = 0; mode < 3; mode++) {
            assertEquals(expected[mode], found[mode], 1e-9 * expected[mode], "mode " + (mode + 1));
        }
    }

    // Sackman and Kelly (1979); Igusa and Der Kiureghian (1985); Den Hartog: closed form, from memory, recomputed
    @ParameterizedTest
    @CsvSource({"0.1, 0.8543089535574104, 1.1705367195742484, 0.7200630281157631, 3.7015621187164247",
        "0.01, 0.9512492197250392, 1.0512492197250394, 0.5744119935649081, 10.512492197250406",
        "0.001, 0.9843136038876344, 1.0159363804893184, 0.5236983247530834, 32.12672920173677",
        "0.0001, 0.995012499921876, 1.005012499921876, 0.5074994063080023, 100.50124999218755",
        "1e-6, 0.9995001249999922, 1.000500124999992, 0.5007499994062714, 1000.5001249999509"})
    void lightTunedAppendage(double ratio, double first, double second, double share, double amplitude) {
        TestStructure structure = new TestStructure();
        Node main = structure.node(0, 0, 0);
        Node light = structure.node(0, 0, 1);
        structure.holdAll(NOT_X);
        structure.mass(main, 2000.0);
        structure.mass(light, 2000.0 * ratio);
        structure.spring(main, null, 2000.0);
        structure.spring(light, main, 2000.0 * ratio);
        Assembly assembly = structure.assemble();
        EigenPairs pairs = TestStructure.pairs(assembly);
        assertEquals(first, Math.sqrt(pairs.values()[0]), 1e-12);
        assertEquals(second, Math.sqrt(pairs.values()[1]), 1e-12);
        double[] shares = TestStructure.effectiveShares(assembly, pairs, 0);
        // the pair lies sqrt(mu) apart, which magnifies round-off in the vectors
        double tolerance = 1e-13 / Math.sqrt(ratio) + 1e-12;
        assertEquals(share, shares[0], tolerance);
        assertEquals(1.0, shares[0] + shares[1], 1e-12);
        double[] nodal = assembly.expand(pairs.vectors()[0]);
        assertEquals(amplitude, nodal[6] / nodal[0], amplitude * 1e-9);
    }

    // textbook (Born and von Karman): w = 2 sqrt(k/m) sin(r pi/N), recomputed
    @Test
    void ringChainHasDoubleFrequencies() {
        TestStructure structure = new TestStructure();
        Node[] nodes = new Node[6];
        for (int i = 0; i < 6; i++) {
            nodes[i] = structure.node(i, 0, 0);
            structure.mass(nodes[i], 2.0);
        }
        structure.holdAll(NOT_X);
        for (int i = 0; i < 6; i++) {
            structure.spring(nodes[i], nodes[(i + 1) % 6], 2.0);
        }
        double[] expected = {0, 1, 1, 1.7320508075688772, 1.7320508075688772, 2};
        assertArrayEquals(expected, structure.circular(), 1e-7);
    }

    // textbook: w = 2 sqrt(k/m) sin(r pi/(2 N)), recomputed
    @Test
    void freeChain() {
        TestStructure structure = new TestStructure();
        Node[] nodes = new Node[5];
        for (int i = 0; i < 5; i++) {
            nodes[i] = structure.node(i, 0, 0);
            structure.mass(nodes[i], 3.0);
        }
        structure.holdAll(NOT_X);
        for (int i = 0; i < 4; i++) {
            structure.spring(nodes[i], nodes[i + 1], 3.0);
        }
        double[] expected = {0.0, 0.6180339887498948, 1.1755705045849463, 1.618033988749895, 1.902113032590307};
        assertArrayEquals(expected, structure.circular(), 1e-7);
    }

    // Lagrange, Rayleigh; w = 2 sqrt(T/(m a)) sin(r pi/(2 (N + 1))), recomputed: bars in tension alone, no elastic stiffness across
    @Test
    void tautStringWithNineMasses() {
        double[] expected = {0.31286893008046174, 0.6180339887498948, 0.9079809994790935, 1.1755705045849463, 1.414213562373095,
            1.618033988749895, 1.7820130483767356, 1.902113032590307, 1.9753766811902755};
        TestStructure structure = new TestStructure();
        structure.model().setSelfMassFactor(0.0);
        Material material = structure.material(200e9, 0.3, 7800);
        FrameSection section = structure.section(1e-4, 0, 0, 0, 0, 0);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {5, 0, 0}, 10, section, material);
        structure.model().getMembers().forEach(member -> {
            member.setAxialOnly(true);
            member.setAxialForce(800.0);
        });
        structure.holdAll("ux uz");
        structure.hold(nodes[0], "uy");
        structure.hold(nodes[10], "uy");
        for (int i = 1; i < 10; i++) {
            structure.mass(nodes[i], 4.0);
        }
        double unit = Math.sqrt(800.0 / (4.0 * 0.5));
        double[] found = Arrays.stream(structure.circular()).map(value -> value / unit).toArray();
        assertArrayEquals(expected, found, 1e-12);
    }

    // Richart, Hall and Woods; Wolf (1985): rigid block on sway and rocking springs, recomputed by a 2 x 2 eigenproblem
    @Test
    void rigidBlockThatSwaysAndRocks() {
        for (boolean byLink : new boolean[] {false, true}) {
            TestStructure structure = new TestStructure();
            Node base = structure.node(0, 0, 0);
            if (byLink) {
                Node centre = structure.node(0, 0, 2);
                structure.link(base, centre);
                structure.mass(centre, 1, 1, 1, 0, 0.5, 0);
            } else {
                structure.mass(base, 1, 1, 1, 0, 0.5, 0).setOffset(TestStructure.vector(0, 0, 2));
            }
            structure.hold(base, "uy uz rx rz");
            structure.spring(base, null, 4, 0, 0, 0, 20, 0);
            Assembly assembly = structure.assemble();
            EigenPairs pairs = TestStructure.pairs(assembly);
            assertEquals(1.4720917993325573, Math.sqrt(pairs.values()[0]), 1e-12);
            assertEquals(8.592609948923425, Math.sqrt(pairs.values()[1]), 1e-11);
            double[] shares = TestStructure.effectiveShares(assembly, pairs, 0);
            assertEquals(0.9744237363580555, shares[0], 1e-12);
            assertEquals(0.02557626364194462, shares[1], 1e-12);
        }
    }

    // linearised P-Delta: T/T0 = 1/sqrt(1 - theta), theta = P/(k h); recomputed. A pinned bar in compression has no other stiffness
    // across than -P/h
    @ParameterizedTest
    @CsvSource({"0.05, 1.0259783520851542", "0.1, 1.0540925533894598", "0.2, 1.118033988749895", "0.25, 1.1547005383792517",
        "0.3, 1.1952286093343936"})
    void gravityLoadOnALeaningColumn(double theta, double expected) {
        TestStructure structure = new TestStructure();
        structure.model().setSelfMassFactor(0.0);
        Material material = structure.material(200e9, 0.3, 7800);
        FrameSection section = structure.section(1e-2, 0, 0, 0, 0, 0);
        Node base = structure.node(0, 0, 0);
        Node top = structure.node(0, 0, 4);
        structure.hold(base, TestStructure.ALL);
        structure.hold(top, NOT_X);
        structure.spring(top, null, 1e6);
        structure.mass(top, 1e4);
        structure.member(base, top, section, material).setAxialOnly(true);
        structure.model().getMembers().get(0).setAxialForce(-theta * 1e6 * 4.0);
        assertEquals(expected, 10.0 / structure.circular()[0], 1e-12);
    }

    // A. K. Chopra, Dynamics of Structures, section 1.3, equation 1.3.5 with the ratio rho of beam to column stiffness: k h^3/(24 E Ic)
    // = (12 rho + 1)/(12 rho + 4); from memory, recomputed
    @ParameterizedTest
    @CsvSource({"0.01, 0.2718446601941748", "0.1, 0.4230769230769231", "0.25, 0.5714285714285714", "0.5, 0.7", "1, 0.8125",
        "5, 0.953125"})
    void portalFrameWithFixedBases(double rho, double expected) {
        TestStructure structure = new TestStructure();
        structure.model().setSelfMassFactor(0.0);
        double inertia = 1e-4;
        Material material = structure.material(200e9, 0.3, 7800);
        FrameSection column = structure.section(1e3, inertia, inertia, 1e-4, 0, 0);
        FrameSection beam = structure.section(1e3, 4.0 * rho * inertia, inertia, 1e-4, 0, 0);
        Node a = structure.node(0, 0, 0);
        Node b = structure.node(0, 0, 3);
        Node c = structure.node(6, 0, 3);
        Node d = structure.node(6, 0, 0);
        structure.member(a, b, column, material);
        structure.member(b, c, beam, material);
        structure.member(d, c, column, material);
        structure.hold(a, TestStructure.ALL);
        structure.hold(d, TestStructure.ALL);
        structure.hold(b, "uy rx rz");
        structure.hold(c, "uy rx rz");
        structure.mass(b, 500, 0, 0, 0, 0, 0);
        structure.mass(c, 500, 0, 0, 0, 0, 0);
        double stiffness = structure.pairs().values()[0] * 1000.0;
        // axial flexibility is E I/(E A h^2) = 1e-8 of the flexural one
        assertEquals(expected, stiffness * 27.0 / (24.0 * 200e9 * inertia), 1e-6);
    }
}
