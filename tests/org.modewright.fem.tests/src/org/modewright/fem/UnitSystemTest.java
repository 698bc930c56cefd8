package org.modewright.fem;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MultiPointTie;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.Support;

/** The same structure written down in every unit system has the same frequencies in Hz and the same masses in kg. */
class UnitSystemTest {

    /** Foot and pound-force by definition: 0.3048 m; 0.45359237 kg times 9.80665 m/s2. */
    private static final double FOOT = 0.3048;
    private static final double POUND = 4.4482216152605;

    /** Length in m and force in N of one unit. */
    private static double[] unit(String system) {
        return switch (system) {
            case "N-m-kg" -> new double[] {1.0, 1.0};
            case "kN-m-t" -> new double[] {1.0, 1e3};
            case "N-mm-t" -> new double[] {1e-3, 1.0};
            case "kip-ft" -> new double[] {FOOT, 1e3 * POUND};
            case "kip-in" -> new double[] {FOOT / 12.0, 1e3 * POUND};
            case "lbf-in" -> new double[] {FOOT / 12.0, POUND};
            default -> throw new IllegalArgumentException(system);
        };
    }

    /** Something with every kind of quantity in it. */
    private static TestStructure structure(String system, double gravity) {
        double m = 1.0 / unit(system)[0];
        double n = 1.0 / unit(system)[1];
        double kg = n / m;
        TestStructure structure = new TestStructure(system);
        structure.model().setGravity(gravity * m);
        Material material = structure.material(2.1e11 * n / (m * m), 0.3, 7850.0 * kg / (m * m * m));
        Material other = structure.material(3e10 * n / (m * m), 0.2, 2500.0 * kg / (m * m * m));
        other.setShear(1.1e10 * n / (m * m));
        double area = m * m;
        double second = area * area;
        FrameSection section = structure.section(0.01 * area, 3e-5 * second, 5e-5 * second, 2e-5 * second, 0.006 * area, 0.0);
        Node a = structure.node(1 * m, 2 * m, 0);
        Node b = structure.node(1 * m, 2 * m, 4 * m);
        Node c = structure.node(6 * m, 2 * m, 4.5 * m);
        Node d = structure.node(6 * m, 2 * m, 0);
        Member column = structure.member(a, b, section, material);
        column.setAxialForce(-2e5 * n);
        column.setEndRigid(0.3 * m);
        column.setRoll(30.0);
        Member beam = structure.member(b, c, section, other);
        beam.setStartOffset(TestStructure.vector(0.1 * m, 0, 0.2 * m));
        structure.member(d, c, section, material);
        structure.hold(a, TestStructure.ALL);
        Support elastic = structure.hold(d, "ux uy");
        elastic.setElasticUz(5e7 * n / m);
        elastic.setElasticRy(4e6 * n * m);
        Spring spring = structure.spring(b, c, 1e5 * n / m, 0, 2e5 * n / m, 1e5 * n * m, 3e5 * n * m, 0);
        TestStructure.couple(spring, Component.UX, Component.RY, 1e4 * n);
        TestStructure.couple(spring, Component.RX, Component.RY, 1e2 * n * m);
        TestStructure.couple(spring, Component.UX, Component.UZ, 1e3 * n / m);
        structure.mass(c, 300 * kg, 300 * kg, 200 * kg, 20 * kg * m * m, 0, 10 * kg * m * m)
                .setOffset(TestStructure.vector(0, 0.4 * m, 0));
        LoadPattern pattern = structure.pattern("G", 1.0);
        TestStructure.load(pattern, b, 4000 * n);
        TestStructure.load(pattern, beam, 1500 * n / m);
        MultiPointTie tie = structure.tie();
        TestStructure.term(tie, b, Component.UY, 1.0);
        TestStructure.term(tie, c, Component.RX, -0.7 * m);
        structure.level("roof", 4.5 * m);
        return structure;
    }

    @ParameterizedTest
    @ValueSource(strings = {"kN-m-t", "N-mm-t", "kip-ft", "kip-in", "lbf-in"})
    void sameSecondsAndKilograms(String system) {
        TestStructure reference = structure("N-m-kg", 9.80665);
        TestStructure structure = structure(system, 0.0);
        double[] expected = reference.hertz();
        double[] found = structure.hertz();
        assertEquals(expected.length, found.length);
        for (int mode = 0; mode < expected.length; mode++) {
            assertEquals(expected[mode], found[mode], 1e-9 * expected[mode], system + " mode " + mode);
        }
        MassLedger books = reference.assemble().ledger();
        MassLedger other = structure.assemble().ledger();
        for (int i = 0; i < 3; i++) {
            assertEquals(books.movable()[i], other.movable()[i], 1e-11 * books.movable()[i]);
            assertEquals(books.onSupports()[i], other.onSupports()[i], 1e-11 * books.movable()[i]);
            assertEquals(books.centre()[i], other.centre()[i], 1e-9);
            assertEquals(books.rotary()[i], other.rotary()[i], 1e-10 * books.rotary()[i]);
        }
        assertEquals(4.5, structure.snapshot().levels().get(0).elevation(), 1e-12);
        assertEquals(9.80665, structure.snapshot().gravity(), 1e-12);
    }

    @Test
    void gravityOfTheModelTurnsLoadIntoMass() {
        MassLedger standard = structure("kN-m-t", 0.0).assemble().ledger();
        MassLedger round = structure("kN-m-t", 10.0).assemble().ledger();
        double load = standard.sources().stream().filter(source -> source.name().equals("G")).findFirst().orElseThrow().movable()[2];
        double lighter = round.sources().stream().filter(source -> source.name().equals("G")).findFirst().orElseThrow().movable()[2];
        assertEquals(load * 0.980665, lighter, 1e-11 * load);
    }
}
