package org.modewright.fem;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Random;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.Vector;

/** Frame members and bars with all their options against invariants and against explicit models. */
class FrameMemberTest {

    private static final int TRIALS = 300;

    private static double[] rigidMotion(Snapshot snapshot, int direction, double[] centre) {
        double[] u = new double[6 * snapshot.nodes().size()];
        for (int i = 0; i < snapshot.nodes().size(); i++) {
            if (direction < 3) {
                u[6 * i + direction] = 1.0;
                continue;
            }
            double[] p = snapshot.nodes().get(i).position();
            double[] omega = new double[3];
            omega[direction - 3] = 1.0;
            double x = p[0] - centre[0];
            double y = p[1] - centre[1];
            double z = p[2] - centre[2];
            u[6 * i] = omega[1] * z - omega[2] * y;
            u[6 * i + 1] = omega[2] * x - omega[0] * z;
            u[6 * i + 2] = omega[0] * y - omega[1] * x;
            u[6 * i + direction] = 1.0;
        }
        return u;
    }

    private static double sum(double[] values) {
        double sum = 0.0;
        for (double value : values) {
            sum += value;
        }
        return sum;
    }

    private static double largestStiffness(Assembly assembly) {
        double largest = 0.0;
        for (double value : assembly.stiffness().value()) {
            largest = Math.max(largest, Math.abs(value));
        }
        return largest;
    }

    @Test
    void rigidMotionCostsNoEnergyAndTranslationMovesTheWholeMass() {
        for (int seed = 0; seed < TRIALS; seed++) {
            TestStructure structure = new TestStructure();
            RandomMember maker = new RandomMember(seed, structure);
            Node start = structure.node(1, 2, 3);
            Node end = structure.node(1 + 3 * maker.random().nextDouble(), 5, 3 + 4 * maker.random().nextDouble());
            Member member = maker.between(start, end);
            if (seed % 3 == 1) {
                maker.addSoundReleases(member);
            } else if (seed % 3 == 2) {
                maker.addAnyReleases(member);
            }
            Assembly assembly = structure.assemble();
            double scale = Math.max(largestStiffness(assembly), 1.0);
            double mass = assembly.snapshot().members().get(0).ownMass();
            for (int direction = 0; direction < 6; direction++) {
                double[] u = rigidMotion(assembly.snapshot(), direction, new double[] {1, 2, 3});
                // the motion is up to 5 m large and enters squared
                if (seed % 3 != 2 || direction < 3) {
                    assertEquals(0.0, sum(assembly.strainEnergies(u)), 1e-12 * scale * 25.0, "seed " + seed + " direction " + direction);
                }
                if (direction < 3) {
                    assertEquals(mass, sum(assembly.kineticEnergies(u)), 1e-12 * mass, "seed " + seed + " direction " + direction);
                }
            }
        }
    }

    @Test
    void consistentMassHoldsTheRotaryInertiaOfTheRigidMember() {
        TestStructure structure = new TestStructure();
        Material material = structure.material(2e11, 0.3, 7850);
        FrameSection section = structure.section(0.02, 3e-5, 7e-5, 5e-6, 0.01, 0.0);
        Member member = structure.member(structure.node(0, 0, 0), structure.node(4, 0, 0), section, material);
        member.setStartRigid(0.5);
        member.setEndRigid(0.7);
        Assembly assembly = structure.assemble();
        double line = 7850 * 0.02 * 64.0 / 3.0;
        double spin = 7850 * (3e-5 + 7e-5) * 4.0;
        // the x-y plane deforms in shear, so its flexible part has rho iz; the x-z plane has none, and rigid zones have none in bending
        double rotary = 7850 * 7e-5 * 2.8;
        double[] origin = new double[3];
        assertEquals(spin, sum(assembly.kineticEnergies(rigidMotion(assembly.snapshot(), 3, origin))), 1e-12 * spin);
        assertEquals(line, sum(assembly.kineticEnergies(rigidMotion(assembly.snapshot(), 4, origin))), 1e-12 * line);
        assertEquals(line + rotary, sum(assembly.kineticEnergies(rigidMotion(assembly.snapshot(), 5, origin))), 1e-12 * line);
    }

    @Test
    void axialForceWorksOnTheRotationOfTheWholeMember() {
        // N L theta^2 for the rigid rotation of a member of length L about an axis across it, whatever its zones and offsets
        for (int seed = 0; seed < TRIALS; seed++) {
            TestStructure with = new TestStructure();
            RandomMember maker = new RandomMember(seed, with);
            Member member = maker.between(with.node(0, 0, 0), with.node(2, 1, 3));
            member.setAxialForce(5e4);
            Assembly assembly = with.assemble();
            FrameElement element = assembly.snapshot().members().get(0);
            double scale = largestStiffness(assembly);
            for (int direction = 0; direction < 3; direction++) {
                double[] u = rigidMotion(assembly.snapshot(), direction + 3, new double[3]);
                double across = 1.0 - element.axes()[direction] * element.axes()[direction];
                assertEquals(5e4 * element.length() * across, sum(assembly.strainEnergies(u)), 1e-12 * scale * 14.0, "seed " + seed);
                double[] moved = rigidMotion(assembly.snapshot(), direction, new double[3]);
                assertEquals(0.0, sum(assembly.strainEnergies(moved)), 1e-12 * scale, "seed " + seed);
            }
        }
    }

    @Test
    void releasesThatLeaveAMechanismDoNotFail() {
        for (int mask = 0; mask < 4096; mask += 7) {
            TestStructure structure = new TestStructure();
            Material material = structure.material(2e11, 0.3, 7850);
            FrameSection section = structure.section(0.02, 3e-5, 7e-5, 5e-6, mask % 2 == 0 ? 0.01 : 0.0, 0.0);
            Node start = structure.node(0, 0, 0);
            Node end = structure.node(3, 0, 0);
            Member member = structure.member(start, end, section, material);
            for (int i = 0; i < 6; i++) {
                if ((mask >> i & 1) != 0) {
                    member.getStartFree().add(Component.get(i));
                }
                if ((mask >> i + 6 & 1) != 0) {
                    member.getEndFree().add(Component.get(i));
                }
            }
            Assembly assembly = structure.assemble();
            for (int direction = 0; direction < 3; direction++) {
                double[] u = rigidMotion(assembly.snapshot(), direction, new double[3]);
                double mass = 7850 * 0.02 * 3;
                assertEquals(mass, sum(assembly.kineticEnergies(u)), 1e-11 * mass, "mask " + mask);
                assertEquals(0.0, sum(assembly.strainEnergies(u)), 1e-3, "mask " + mask);
            }
            for (int end12 = 0; end12 < 12; end12++) {
                if (end12 % 6 > 2 && (mask >> end12 & 1) != 0) {
                    double[] u = new double[12];
                    u[end12] = 1.0;
                    assertEquals(0.0, sum(assembly.strainEnergies(u)), 0.0, "a released rotation of the node does nothing");
                }
            }
        }
    }

    /** Rotation matrix, by rows, about a random axis. */
    private static double[] rotation(Random random) {
        double[] q = new double[4];
        double size = 0.0;
        for (int i = 0; i < 4; i++) {
            q[i] = random.nextGaussian();
            size += q[i] * q[i];
        }
        for (int i = 0; i < 4; i++) {
            q[i] /= Math.sqrt(size);
        }
        double w = q[0];
        double x = q[1];
        double y = q[2];
        double z = q[3];
        return new double[] {1 - 2 * (y * y + z * z), 2 * (x * y - w * z), 2 * (x * z + w * y), 2 * (x * y + w * z),
            1 - 2 * (x * x + z * z), 2 * (y * z - w * x), 2 * (x * z - w * y), 2 * (y * z + w * x), 1 - 2 * (x * x + y * y)};
    }

    private static double[] times(double[] q, double... v) {
        double[] result = new double[3];
        for (int i = 0; i < 3; i++) {
            result[i] = q[3 * i] * v[0] + q[3 * i + 1] * v[1] + q[3 * i + 2] * v[2];
        }
        return result;
    }

    private static Node turned(TestStructure structure, double[] q, double x, double y, double z) {
        double[] p = times(q, x, y, z);
        return structure.node(p[0], p[1], p[2]);
    }

    /** A three-legged frame with every option, turned in space; the roll keeps each section as it was to its frame. */
    private static double[] turnedFrame(long seed, double[] q) {
        TestStructure upright = new TestStructure();
        TestStructure structure = new TestStructure();
        RandomMember maker = new RandomMember(seed, structure);
        double[][] feet = {{0, 0, 0}, {4, 0.5, 0}, {1, 3, -0.5}};
        Node head = turned(structure, q, 1.5, 1, 3);
        for (double[] foot : feet) {
            Node base = turned(structure, q, foot[0], foot[1], foot[2]);
            structure.hold(base, TestStructure.ALL);
            Member member = maker.between(base, head);
            maker.addSoundReleases(member);
            member.getStartFree().remove(Component.RX);
            member.getEndFree().remove(Component.RX);
            member.setAxialForce(-1e4 * maker.random().nextDouble());
            turnOptions(upright, member, q, foot);
        }
        structure.mass(head, 800.0);
        return structure.hertz();
    }

    private static void turnOptions(TestStructure upright, Member member, double[] q, double[] foot) {
        double[] from = foot.clone();
        double[] to = {1.5, 1, 3};
        if (member.getStartOffset() != null) {
            add(from, offset(member.getStartOffset()));
            member.setStartOffset(turnedVector(member.getStartOffset(), q));
        }
        if (member.getEndOffset() != null) {
            add(to, offset(member.getEndOffset()));
            member.setEndOffset(turnedVector(member.getEndOffset(), q));
        }
        double[] axis = {to[0] - from[0], to[1] - from[1], to[2] - from[2]};
        double[] wanted = LocalAxes.of(axis, Math.toRadians(member.getRoll()));
        double[] y = times(q, wanted[3], wanted[4], wanted[5]);
        double[] unrolled = LocalAxes.of(times(q, axis), 0.0);
        double cosine = y[0] * unrolled[3] + y[1] * unrolled[4] + y[2] * unrolled[5];
        double sine = y[0] * unrolled[6] + y[1] * unrolled[7] + y[2] * unrolled[8];
        member.setRoll(Math.toDegrees(Math.atan2(sine, cosine)));
    }

    private static double[] offset(Vector v) {
        return new double[] {v.getX(), v.getY(), v.getZ()};
    }

    private static Vector turnedVector(Vector v, double[] q) {
        double[] turned = times(q, v.getX(), v.getY(), v.getZ());
        return TestStructure.vector(turned[0], turned[1], turned[2]);
    }

    private static void add(double[] to, double[] vector) {
        for (int i = 0; i < 3; i++) {
            to[i] += vector[i];
        }
    }

    @Test
    void frequenciesDoNotDependOnTheOrientationInSpace() {
        double[] identity = {1, 0, 0, 0, 1, 0, 0, 0, 1};
        // upside down about x, upright along each axis, and at random
        double[][] fixed = {{1, 0, 0, 0, -1, 0, 0, 0, -1}, {0, 0, 1, 1, 0, 0, 0, 1, 0}, {0, 1, 0, 0, 0, 1, 1, 0, 0}};
        for (int seed = 0; seed < 60; seed++) {
            double[] reference = turnedFrame(seed, identity);
            double[] q = seed < fixed.length ? fixed[seed] : rotation(new Random(1000 + seed));
            double[] turned = turnedFrame(seed, q);
            assertEquals(reference.length, turned.length, "seed " + seed);
            for (int mode = 0; mode < reference.length; mode++) {
                assertEquals(reference[mode], turned[mode], 1e-8 * reference[mode] + 1e-9 * reference[reference.length - 1],
                        "seed " + seed + " mode " + mode);
            }
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"rz", "ry", "ry rz", "ux", "uy", "uz", "rx", "ux rz", "uy rx", "rx ry rz"})
    void releaseEqualsASecondNodeTiedInTheOtherComponents(String released) {
        for (double force : new double[] {0.0, 3e5, -3e5}) {
            double[] byRelease = cantileverChain(released, force, true);
            double[] byNode = cantileverChain(released, force, false);
            assertEquals(byNode.length, byRelease.length);
            for (int mode = 0; mode < byNode.length; mode++) {
                assertEquals(byNode[mode], byRelease[mode], 1e-9 * Math.abs(byNode[mode]) + 1e-10 * byNode[byNode.length - 1],
                        "mode " + mode);
            }
        }
    }

    /** Two members along x, all mass at the nodes, so that an extra node has none; the second is released at its start. */
    private static double[] cantileverChain(String released, double force, boolean byRelease) {
        TestStructure structure = new TestStructure();
        structure.model().setSelfMassFactor(0.0);
        Material material = structure.material(2e11, 0.3, 7850);
        FrameSection section = structure.section(0.02, 3e-5, 7e-5, 5e-6, 0.0, 0.009);
        Node base = structure.node(0, 0, 0);
        Node middle = structure.node(2, 0, 0);
        Node tip = structure.node(5, 0, 0);
        structure.hold(base, TestStructure.ALL);
        structure.hold(tip, "ux uy uz ry rz");
        structure.mass(tip, 0, 0, 0, 4.0, 0, 0);
        structure.mass(middle, 400, 400, 400, 3.0, 2.0, 1.0);
        structure.member(base, middle, section, material);
        Node start = middle;
        if (!byRelease) {
            start = structure.node(2, 0, 0);
            structure.link(middle, start, Arrays.stream(Component.values()).filter(c -> !released.contains(c.getLiteral()))
                    .toArray(Component[]::new));
        }
        Member member = structure.member(start, tip, section, material);
        member.setAxialForce(force);
        if (byRelease) {
            TestStructure.release(member, released, "");
        }
        return structure.circular();
    }

    @Test
    void zonesAndOffsetsEqualExplicitRigidLinks() {
        double[] inMember = zoneModel(false);
        double[] explicit = zoneModel(true);
        assertEquals(explicit.length, inMember.length);
        for (int mode = 0; mode < explicit.length; mode++) {
            assertEquals(explicit[mode], inMember[mode], 1e-9 * explicit[mode], "mode " + mode);
        }
    }

    private static double[] zoneModel(boolean explicit) {
        TestStructure structure = new TestStructure();
        Material material = structure.material(2e11, 0.3, 7850);
        FrameSection section = structure.section(0.02, 3e-5, 7e-5, 5e-6, 0.012, 0.0);
        Node base = structure.node(0, 0, 0);
        Node head = structure.node(4.2, -0.3, 0.1);
        structure.hold(base, "ux uy uz");
        structure.spring(base, null, 0, 0, 0, 1e6, 2e6, 3e6);
        structure.mass(head, 100.0);
        // the member runs from (0.1, 0.2, 0.3) along x to (4.1, 0.2, 0.3)
        if (!explicit) {
            Member member = structure.member(base, head, section, material);
            member.setStartOffset(TestStructure.vector(0.1, 0.2, 0.3));
            member.setEndOffset(TestStructure.vector(-0.1, 0.5, 0.2));
            member.setStartRigid(0.6);
            member.setEndRigid(0.8);
            return structure.circular();
        }
        Node start = structure.node(0.7, 0.2, 0.3);
        Node end = structure.node(3.3, 0.2, 0.3);
        structure.link(base, start);
        structure.link(head, end);
        structure.member(start, end, section, material);
        addZone(structure, base, 0.6, TestStructure.vector(0.4, 0.2, 0.3));
        addZone(structure, head, 0.8, TestStructure.vector(-0.5, 0.5, 0.2));
        return structure.circular();
    }

    private static void addZone(TestStructure structure, Node node, double length, Vector centre) {
        double mass = 7850 * 0.02 * length;
        double across = mass * length * length / 12.0;
        structure.mass(node, mass, mass, mass, 7850 * 1e-4 * length, across, across).setOffset(centre);
    }

    @ParameterizedTest
    @CsvSource({"axial", "bendingY", "bendingZ", "torsion", "shearY", "shearZ"})
    void effectiveStiffnessFactorsScaleTheirAction(String factor) {
        double[] expected = factored(factor, false);
        assertArrayEquals(expected, factored(factor, true), 1e-12 * expected[expected.length - 1]);
    }

    private static double[] factored(String factor, boolean inMember) {
        TestStructure structure = new TestStructure();
        Material material = structure.material(2e11, 0.3, 7850);
        double f = 0.37;
        FrameSection section = structure.section(0.02, 3e-5, 7e-5, 5e-6, 0.012, 0.011);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {1, 2, 2}, 1, section, material);
        structure.hold(nodes[0], TestStructure.ALL);
        structure.mass(nodes[1], 10, 10, 10, 5, 6, 7);
        structure.model().setSelfMassFactor(0.0);
        Member member = structure.model().getMembers().get(0);
        switch (factor) {
            case "axial" -> {
                member.setAxialFactor(inMember ? f : 1);
                section.setArea(0.02 * (inMember ? 1 : f));
            }
            case "bendingY" -> {
                member.setBendingYFactor(inMember ? f : 1);
                section.setIy(3e-5 * (inMember ? 1 : f));
            }
            case "bendingZ" -> {
                member.setBendingZFactor(inMember ? f : 1);
                section.setIz(7e-5 * (inMember ? 1 : f));
            }
            case "torsion" -> {
                member.setTorsionFactor(inMember ? f : 1);
                section.setTorsion(5e-6 * (inMember ? 1 : f));
            }
            case "shearY" -> {
                member.setShearYFactor(inMember ? f : 1);
                section.setShearAreaY(0.012 * (inMember ? 1 : f));
            }
            default -> {
                member.setShearZFactor(inMember ? f : 1);
                section.setShearAreaZ(0.011 * (inMember ? 1 : f));
            }
        }
        double[] omega = structure.circular();
        double[] whole = unfactored();
        double change = 0.0;
        for (int mode = 0; mode < whole.length; mode++) {
            change = Math.max(change, Math.abs(omega[mode] / whole[mode] - 1.0));
        }
        assertTrue(change > 1e-4, "the factor does something");
        return omega;
    }

    private static double[] unfactored() {
        TestStructure structure = new TestStructure();
        Material material = structure.material(2e11, 0.3, 7850);
        FrameSection section = structure.section(0.02, 3e-5, 7e-5, 5e-6, 0.012, 0.011);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {1, 2, 2}, 1, section, material);
        structure.hold(nodes[0], TestStructure.ALL);
        structure.mass(nodes[1], 10, 10, 10, 5, 6, 7);
        structure.model().setSelfMassFactor(0.0);
        return structure.circular();
    }

    @Test
    void aBarCarriesAxialForceAlone() {
        TestStructure structure = new TestStructure();
        Material material = structure.material(2e11, 0.3, 7850);
        FrameSection section = structure.section(0.001, 0, 0, 0, 0, 0);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {3, 4, 12}, 1, section, material);
        structure.model().getMembers().get(0).setAxialOnly(true);
        structure.hold(nodes[0], TestStructure.ALL);
        Assembly assembly = structure.assemble();
        // the rotations of the free node are dropped; E A/L against a third of the mass, and two motions across that cost nothing
        assertEquals(3, assembly.freeDofs());
        assertEquals(3, assembly.dropped().size());
        double[] omega = structure.circular();
        assertEquals(0.0, omega[0], 1e-3);
        assertEquals(0.0, omega[1], 1e-3);
        assertEquals(Math.sqrt(3.0 * 2e11 / (7850 * 169.0)), omega[2], 1e-9 * omega[2]);
    }

    /** Where the end of a taut bar is free to slide across it, the tension holds nothing and the bar's mass moves with the other end. */
    @Test
    void releasesOfATautBarCondenseItsGeometricStiffness() {
        TestStructure structure = new TestStructure();
        Material material = structure.material(2e11, 0.3, 7850);
        FrameSection section = structure.section(0.001, 0, 0, 0, 0, 0);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {2, 0, 0}, 1, section, material);
        Member bar = structure.model().getMembers().get(0);
        bar.setAxialOnly(true);
        bar.setAxialForce(1e4);
        bar.getStartFree().add(Component.UY);
        structure.hold(nodes[0], TestStructure.ALL);
        double[] omega = structure.circular();
        double mass = 7850 * 0.001 * 2;
        assertEquals(3, omega.length);
        assertEquals(0.0, omega[0], 1e-6);
        assertEquals(Math.sqrt(1e4 / 2 / (mass / 3)), omega[1], 1e-9 * omega[1]);
        assertEquals(mass * 4 / 3, structure.assemble().ledger().movable()[0] + structure.assemble().ledger().movable()[1], 1e-9);
    }

    @Test
    void lumpedMassSitsInTheTranslationsOfTheNodes() {
        TestStructure structure = new TestStructure();
        Material material = structure.material(2e11, 0.3, 7850);
        FrameSection section = structure.section(0.02, 3e-5, 7e-5, 5e-6, 0.012, 0.011);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {1, 2, 2}, 1, section, material);
        Member member = structure.model().getMembers().get(0);
        member.setMass(MemberMass.LUMPED);
        member.setStartRigid(0.2);
        member.setEndOffset(TestStructure.vector(0, 0, 0.5));
        structure.hold(nodes[0], TestStructure.ALL);
        Assembly assembly = structure.assemble();
        double half = 0.5 * assembly.snapshot().members().get(0).ownMass();
        for (int i = 0; i < 6; i++) {
            for (int j = 0; j < 6; j++) {
                assertEquals(i == j && i < 3 ? half : 0.0, assembly.mass().get(i, j), 1e-12 * half);
            }
        }
    }
}
