package org.modewright.fem;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Random;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.modewright.model.Defect;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.MassFormulation;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Node;
import org.modewright.numerics.EigenPairs;

/** The books of the mass by the definitions of the result file. */
class LedgerTest {

    private static MassSource source(MassLedger ledger, String name) {
        return ledger.sources().stream().filter(source -> source.name().equals(name)).findFirst().orElseThrow();
    }

    // total mass 1, n elements: movable mass is 1 - h/2 with lumped mass; with consistent mass of M on the free degrees of freedom alone
    // iT M i = 1 - 2h/3, whatever share of it phiT M i reaches; own derivation
    @ParameterizedTest
    @CsvSource({"1", "2", "3", "5", "10", "20"})
    void massAtASupportDoesNotMove(int members) {
        for (MassFormulation formulation : MassFormulation.values()) {
            TestStructure structure = new TestStructure();
            structure.model().setMassFormulation(formulation);
            Material material = structure.material(2e11, 0.3, 1000.0);
            FrameSection section = structure.section(0.001, 1e-6, 1e-6, 1e-6, 0, 0);
            Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {1, 0, 0}, members, section, material);
            structure.holdAll("uy uz rx ry rz");
            structure.hold(nodes[0], "ux");
            MassLedger ledger = structure.assemble().ledger();
            double h = 1.0 / members;
            double movable = formulation == MassFormulation.LUMPED ? 1.0 - h / 2.0 : 1.0 - 2.0 * h / 3.0;
            assertEquals(movable, ledger.movable()[0], 1e-13);
            assertEquals(1.0 - movable, ledger.onSupports()[0], 1e-13);
            assertEquals(1.0, ledger.onSupports()[1], 1e-13);
            assertEquals(0.0, ledger.movable()[1], 0.0);
            assertTrue(ledger.balance() <= 1e-12);
        }
    }

    // uniform fixed-free rod of total mass 1, consistent mass: sum over all modes of (phiT M i)^2 as printed; own derivation, recomputed
    @ParameterizedTest
    @CsvSource({"1, 0.333333", "2, 0.666667", "3, 0.777778", "5, 0.866667", "10, 0.933333", "20, 0.966667"})
    void allModesTogetherHaveTheMovableMass(int members, double expected) {
        TestStructure structure = new TestStructure();
        Material material = structure.material(2e11, 0.3, 1000.0);
        FrameSection section = structure.section(0.001, 1e-6, 1e-6, 1e-6, 0, 0);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {1, 0, 0}, members, section, material);
        structure.holdAll("uy uz rx ry rz");
        structure.hold(nodes[0], "ux");
        Assembly assembly = structure.assemble();
        double[] shares = TestStructure.effectiveShares(assembly, TestStructure.pairs(assembly), 0);
        assertEquals(1.0, Arrays.stream(shares).sum(), 1e-12);
        assertEquals(expected, assembly.ledger().movable()[0], 0.6e-6);
    }

    @Test
    void sourcesAddUpAndBalance() {
        TestStructure structure = loadedFrame(0.0);
        Assembly assembly = structure.assemble();
        MassLedger ledger = assembly.ledger();
        assertEquals(List.of("self", "G", "Q", "nodal masses"), ledger.sources().stream().map(MassSource::name).toList());
        for (int i = 0; i < 3; i++) {
            int direction = i;
            assertEquals(ledger.movable()[i], ledger.sources().stream().mapToDouble(s -> s.movable()[direction]).sum(), 1e-9);
            assertEquals(ledger.onSupports()[i], ledger.sources().stream().mapToDouble(s -> s.onSupports()[direction]).sum(), 1e-9);
        }
        double self = 2500.0 * 0.16 * (3.5 * 2 + 6.0);
        assertEquals(self, source(ledger, "self").movable()[0] + source(ledger, "self").onSupports()[0], 1e-12 * self);
        // line load 12 kN/m over 6 m and 30 kN at a node
        double dead = (12e3 * 6.0 + 30e3) / 9.80665;
        assertEquals(dead, source(ledger, "G").movable()[0], 1e-12 * dead);
        assertEquals(0.3 * 5e3 * 6.0 / 9.80665, source(ledger, "Q").movable()[2], 1e-9);
        assertEquals(100.0, source(ledger, "nodal masses").movable()[0], 1e-9);
        assertEquals(70.0, source(ledger, "nodal masses").onSupports()[1], 1e-9);
        assertTrue(ledger.balance() <= 1e-12);
    }

    private static TestStructure loadedFrame(double far) {
        TestStructure structure = new TestStructure();
        Material material = structure.material(30e9, 0.2, 2500.0);
        FrameSection section = structure.section(0.16, 2e-3, 2e-3, 3e-3, 0.13, 0.0);
        Node a = structure.node(far, far, 0);
        Node b = structure.node(far, far, 3.5);
        Node c = structure.node(far + 6, far, 3.5);
        Node d = structure.node(far + 6, far, 0);
        structure.member(a, b, section, material);
        Member beam = structure.member(b, c, section, material);
        structure.member(d, c, section, material);
        structure.hold(a, TestStructure.ALL);
        structure.hold(d, TestStructure.ALL);
        structure.mass(c, 100.0);
        structure.mass(d, 70.0);
        LoadPattern dead = structure.pattern("G", 1.0);
        TestStructure.load(dead, beam, 12e3);
        TestStructure.load(dead, b, 30e3);
        LoadPattern live = structure.pattern("Q", 0.3);
        TestStructure.load(live, beam, 5e3);
        LoadPattern snow = structure.pattern("S", 0.0);
        TestStructure.load(snow, beam, 1e3);
        return structure;
    }

    @Test
    void allModesTogetherHaveEveryDirectionEvenFarFromTheOrigin() {
        for (double far : new double[] {0.0, 5e5}) {
            Assembly assembly = loadedFrame(far).assemble();
            EigenPairs pairs = TestStructure.pairs(assembly);
            for (int direction = 0; direction < 6; direction++) {
                double sum = Arrays.stream(TestStructure.effectiveShares(assembly, pairs, direction)).sum();
                // coordinates of 5e5 m carry 1e-10 m of round-off into the arms
                assertEquals(1.0, sum, far == 0.0 ? 1e-12 : 1e-9, "direction " + direction);
            }
        }
    }

    @Test
    void centreAndRotaryInertiaOfScatteredMasses() {
        // parallel axes: rotary inertia about the centre = sum of m r^2 + own; centre = sum m x / sum m
        TestStructure structure = new TestStructure();
        Random random = new Random(17);
        double[][] x = new double[12][3];
        double[] m = new double[12];
        double total = 0.0;
        double[] centre = new double[3];
        double own = 0.0;
        for (int i = 0; i < 12; i++) {
            for (int k = 0; k < 3; k++) {
                x[i][k] = 40 + 10 * random.nextDouble();
            }
            m[i] = 1 + random.nextDouble();
            double inertia = random.nextDouble();
            structure.mass(structure.node(x[i][0], x[i][1], x[i][2]), m[i], m[i], m[i], 0, 0, inertia);
            own += inertia;
            total += m[i];
            for (int k = 0; k < 3; k++) {
                centre[k] += m[i] * x[i][k];
            }
        }
        for (int k = 0; k < 3; k++) {
            centre[k] /= total;
        }
        double[] rotary = new double[3];
        for (int i = 0; i < 12; i++) {
            double[] r = {x[i][0] - centre[0], x[i][1] - centre[1], x[i][2] - centre[2]};
            rotary[0] += m[i] * (r[1] * r[1] + r[2] * r[2]);
            rotary[1] += m[i] * (r[2] * r[2] + r[0] * r[0]);
            rotary[2] += m[i] * (r[0] * r[0] + r[1] * r[1]);
        }
        rotary[2] += own;
        MassLedger ledger = structure.assemble().ledger();
        assertArrayEquals(centre, ledger.centre(), 1e-11);
        assertArrayEquals(rotary, ledger.rotary(), 1e-9);
    }

    @Test
    void centreByTheLetterOfTheDefinition() {
        Assembly assembly = loadedFrame(3.0).assemble();
        // z_c = (ix M iry - iy M irx)/(mx + my) about the origin, with i on the free degrees of freedom: rebuilt here from M itself
        double[][] iota = new double[6][assembly.freeDofs()];
        for (int dof = 0; dof < assembly.freeDofs(); dof++) {
            int component = assembly.componentOf(dof);
            double[] p = assembly.snapshot().nodes().get(assembly.nodeOf(dof)).position();
            iota[component][dof] = 1.0;
            if (component < 3) {
                int next = (component + 1) % 3;
                int last = (component + 2) % 3;
                // u = e x p: rotation about `next` moves `component` by p[last], rotation about `last` moves it by -p[next]
                iota[3 + next][dof] = p[last];
                iota[3 + last][dof] = -p[next];
            }
        }
        double[][] product = new double[6][];
        for (int i = 0; i < 6; i++) {
            product[i] = assembly.massTimes(iota[i]);
            double[] direct = assembly.massTimesRigid(i, new double[3]);
            assertArrayEquals(product[i], direct, 1e-8);
        }
        MassLedger ledger = assembly.ledger();
        for (int k = 0; k < 3; k++) {
            int a = (k + 1) % 3;
            int b = (k + 2) % 3;
            double moment = dot(product[a], iota[3 + b]) - dot(product[b], iota[3 + a]);
            assertEquals(moment / (dot(product[a], iota[a]) + dot(product[b], iota[b])), ledger.centre()[k], 1e-11);
            assertEquals(dot(product[k], iota[k]), ledger.movable()[k], 1e-8);
        }
    }

    private static double dot(double[] a, double[] b) {
        double sum = 0.0;
        for (int i = 0; i < a.length; i++) {
            sum += a[i] * b[i];
        }
        return sum;
    }

    @Test
    void anInvertedPendulumOnARigidBarHasItsMassInEveryShare() {
        TestStructure structure = new TestStructure();
        Node base = structure.node(0, 0, 0);
        Node top = structure.node(0, 0, 5);
        structure.link(base, top);
        structure.hold(base, "ux uy uz rz");
        structure.spring(base, null, 0, 0, 0, 3e6, 4e6, 0);
        structure.mass(top, 2000.0);
        Assembly assembly = structure.assemble();
        EigenPairs pairs = TestStructure.pairs(assembly);
        assertEquals(Math.sqrt(3e6 / (2000.0 * 25.0)), Math.sqrt(pairs.values()[0]), 1e-12);
        assertArrayEquals(new double[] {2000, 2000, 0}, assembly.ledger().movable(), 1e-9);
        assertArrayEquals(new double[] {0, 0, 2000}, assembly.ledger().onSupports(), 1e-9);
        assertEquals(1.0, Arrays.stream(TestStructure.effectiveShares(assembly, pairs, 0)).sum(), 1e-12);
        assertEquals(1.0, Arrays.stream(TestStructure.effectiveShares(assembly, pairs, 1)).sum(), 1e-12);
    }

    @Test
    void aSkewRollerMovesHalfOfItsMassEachWay() {
        // free along (1, -1)/sqrt(2) alone: the free motion closest to a shift along x has half of its energy
        TestStructure structure = new TestStructure();
        Node node = structure.node(0, 0, 0);
        var tie = structure.tie();
        TestStructure.term(tie, node, Component.UX, 1.0);
        TestStructure.term(tie, node, Component.UY, 1.0);
        structure.hold(node, "uz rx ry rz");
        structure.spring(node, null, 10.0);
        structure.mass(node, 8.0);
        Assembly assembly = structure.assemble();
        assertArrayEquals(new double[] {4, 4, 0}, assembly.ledger().movable(), 1e-12);
        assertArrayEquals(new double[] {4, 4, 8}, assembly.ledger().onSupports(), 1e-12);
        assertEquals(-4.0, assembly.planCoupling(), 1e-12);
        EigenPairs pairs = TestStructure.pairs(assembly);
        assertEquals(1.0, TestStructure.effectiveShares(assembly, pairs, 0)[0], 1e-12);
    }

    @Test
    void aModelWithoutMassHasEmptyBooks() {
        TestStructure structure = new TestStructure();
        structure.spring(structure.node(1, 2, 3), null, 1, 1, 1, 1, 1, 1);
        MassLedger ledger = structure.assemble().ledger();
        assertArrayEquals(new double[3], ledger.movable());
        assertArrayEquals(new double[] {1, 2, 3}, ledger.centre());
        assertEquals(0.0, ledger.balance());
        assertTrue(ledger.sources().isEmpty());
    }

    @Test
    void aNegativeSeismicMassIsRefused() {
        TestStructure s = new TestStructure();
        Node node = s.node(0, 0, 0);
        s.mass(node, 500);
        TestStructure.load(s.pattern("buoyancy", 1), node, -9806.65);
        ModelDefectsException refusal = assertThrows(ModelDefectsException.class, s::snapshot);
        assertEquals(List.of("mass-negative"), refusal.defects().stream().map(Defect::id).toList());
        assertTrue(refusal.getMessage().contains("buoyancy") && refusal.getMessage().contains("-500 kg"), refusal.getMessage());
    }
}
