package org.modewright.fem;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Random;

import org.junit.jupiter.api.Test;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.Spring;
import org.modewright.numerics.EigenPairs;

/** Springs and masses at nodes. */
class SpringAndMassTest {

    @Test
    void rigidMotionOfBothNodesCostsNothing() {
        Random random = new Random(5);
        for (int trial = 0; trial < 50; trial++) {
            TestStructure structure = new TestStructure();
            Node a = structure.node(random.nextDouble() * 5, random.nextDouble() * 5, random.nextDouble() * 5);
            Node b = structure.node(random.nextDouble() * 5, random.nextDouble() * 5, random.nextDouble() * 5);
            Spring spring = structure.spring(a, b, random.nextDouble(), random.nextDouble(), random.nextDouble(), random.nextDouble(),
                    random.nextDouble(), random.nextDouble());
            // small enough to leave the matrix positive
            TestStructure.couple(spring, Component.UX, Component.RZ, 1e-3 * random.nextDouble());
            spring.setUx(spring.getUx() + 0.1);
            spring.setRz(spring.getRz() + 0.1);
            structure.mass(a, 1, 1, 1, 1, 1, 1);
            structure.mass(b, 1, 1, 1, 1, 1, 1);
            // six rigid-body motions; relative to stiffnesses and masses of about 1
            double[] values = structure.pairs().values();
            for (int mode = 0; mode < 6; mode++) {
                assertEquals(0.0, values[mode], 1e-12);
            }
            assertTrue(values[6] > 1e-4);
        }
    }

    @Test
    void aSpringActsAtTheMidPoint() {
        // shear spring k across a gap L, both nodes turning by theta: relative motion k (u2 - u1 - L theta)
        TestStructure structure = new TestStructure();
        Node a = structure.node(0, 0, 0);
        Node b = structure.node(3, 0, 0);
        structure.hold(a, TestStructure.ALL);
        structure.hold(b, "ux uy uz rx ry");
        structure.mass(b, 0, 0, 0, 0, 0, 1.0);
        structure.spring(a, b, 0, 8.0, 0, 0, 0, 5.0);
        // rotation of b alone moves its mid-point by -1.5 theta
        assertEquals(Math.sqrt(8.0 * 1.5 * 1.5 + 5.0), structure.circular()[0], 1e-13);
    }

    @Test
    void coincidentNodesAreJoinedWithoutArms() {
        TestStructure structure = new TestStructure();
        Node a = structure.node(1, 1, 1);
        Node b = structure.node(1, 1, 1);
        structure.hold(a, TestStructure.ALL);
        structure.spring(a, b, 1, 4, 9, 16, 25, 36);
        structure.mass(b, 1, 1, 1, 1, 1, 1);
        assertArrayEquals(new double[] {1, 2, 3, 4, 5, 6}, structure.circular(), 1e-12);
    }

    @Test
    void couplingsAddUpAndFillBothTriangles() {
        TestStructure structure = new TestStructure();
        Node a = structure.node(0, 0, 0);
        Spring spring = structure.spring(a, null, 4, 0, 0, 0, 3, 0);
        TestStructure.couple(spring, Component.UX, Component.RY, 0.5);
        TestStructure.couple(spring, Component.RY, Component.UX, 1.0);
        structure.hold(a, "uy uz rx rz");
        structure.mass(a, 1, 1, 1, 1, 1, 1);
        // eigenvalues of [4 1.5; 1.5 3]
        double root = Math.sqrt(0.25 + 1.5 * 1.5);
        assertArrayEquals(new double[] {3.5 - root, 3.5 + root}, structure.pairs().values(), 1e-12);
    }

    @Test
    void anElasticSupportIsASpringCarrierWhereItIsNotHeld() {
        TestStructure structure = new TestStructure();
        Node a = structure.node(0, 0, 0);
        structure.hold(a, "uy uz rx ry rz").setElasticUx(400.0);
        structure.mass(a, 4.0);
        structure.model().getSupports().get(0).setElasticUy(1e9);
        Assembly assembly = structure.assemble();
        EigenPairs pairs = TestStructure.pairs(assembly);
        assertEquals(1, pairs.count());
        assertEquals(100.0, pairs.values()[0], 1e-12);
        Carrier carrier = assembly.carriers().get(0);
        assertEquals(Kind.SPRING, carrier.kind());
        assertEquals(structure.model().getSupports().get(0).getId(), carrier.id());
        assertEquals(100.0, assembly.strainEnergies(assembly.expand(pairs.vectors()[0]))[0], 1e-12);
    }

    @Test
    void massAtAnOffsetEqualsMassOnARigidLink() {
        double[][] results = new double[2][];
        for (int i = 0; i < 2; i++) {
            TestStructure structure = new TestStructure();
            Node node = structure.node(0, 0, 0);
            structure.spring(node, null, 1e3, 2e3, 3e3, 4e3, 5e3, 6e3);
            if (i == 0) {
                structure.mass(node, 2, 3, 4, 0.5, 0.6, 0.7).setOffset(TestStructure.vector(0.3, -0.8, 1.1));
            } else {
                Node far = structure.node(0.3, -0.8, 1.1);
                structure.link(node, far);
                structure.mass(far, 2, 3, 4, 0.5, 0.6, 0.7);
            }
            results[i] = structure.circular();
        }
        assertEquals(6, results[0].length);
        assertArrayEquals(results[1], results[0], 1e-10);
    }

    @Test
    void massesAtOneNodeAddUp() {
        TestStructure structure = new TestStructure();
        Node node = structure.node(0, 0, 0);
        structure.hold(node, "uy uz rx ry rz");
        structure.spring(node, null, 36.0);
        structure.mass(node, 1.0);
        structure.mass(node, 3.0);
        assertEquals(3.0, structure.circular()[0], 1e-13);
        assertEquals(1, structure.assemble().carriers().stream().filter(carrier -> carrier.kind() == Kind.NODE).count());
    }

    @Test
    void anyMixtureOfMassesHasItsTotalInTheLedger() {
        TestStructure structure = new TestStructure();
        Random random = new Random(9);
        double[] total = new double[3];
        for (int i = 0; i < 20; i++) {
            Node node = structure.node(random.nextDouble(), random.nextDouble(), random.nextDouble());
            double[] m = {random.nextDouble(), random.nextDouble(), random.nextDouble()};
            structure.mass(node, m[0], m[1], m[2], random.nextDouble(), 0, 0).setOffset(TestStructure.vector(1, random.nextDouble(), 2));
            for (int k = 0; k < 3; k++) {
                total[k] += m[k];
            }
        }
        assertArrayEquals(total, structure.assemble().ledger().movable(), 1e-12);
        assertTrue(Arrays.stream(structure.assemble().ledger().onSupports()).allMatch(value -> value == 0.0));
    }

    /** The rounding of the centre leaves no lever, so a rotation about it moves no mass and has no share in any mode. */
    @Test
    void aMassInItsOwnAxisHasNoRotaryInertia() {
        Random random = new Random(23);
        for (int trial = 0; trial < 200; trial++) {
            TestStructure structure = new TestStructure();
            structure.hold(structure.node(10 * random.nextGaussian(), 10 * random.nextGaussian(), 0), TestStructure.ALL);
            Node node = structure.node(10 * random.nextGaussian(), 10 * random.nextGaussian(), 10 * random.nextGaussian());
            structure.mass(node, 0, 100 + 1000 * random.nextDouble(), 0, 0, 0, 0);
            structure.spring(node, null, 1e6, 1e6, 1e6, 1e6, 1e6, 1e6);
            assertArrayEquals(new double[3], structure.assemble().ledger().rotary(), 0.0, "trial " + trial);
        }
    }
}
