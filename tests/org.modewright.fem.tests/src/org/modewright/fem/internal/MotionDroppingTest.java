package org.modewright.fem.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Random;

import org.junit.jupiter.api.Test;
import org.modewright.fem.ElementFormulations;
import org.modewright.fem.RandomMember;
import org.modewright.fem.Snapshot;
import org.modewright.fem.TestStructure;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberMass;
import org.modewright.model.structure.Node;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;

/** Dropped motions against the rank of the dense matrices. */
class MotionDroppingTest {

    private record Undropped(Transformation transformation, CarrierStore store, MatrixPair matrices) {

        static Undropped of(Snapshot snapshot) {
            Transformation transformation = new ConstraintSet(snapshot).transformation(Progress.NONE);
            CarrierStore store = new CarrierStore(snapshot, ElementFormulations.standard(), new NodalMasses(snapshot), Progress.NONE);
            return new Undropped(transformation, store, MatrixAssembler.assemble(store, transformation, Progress.NONE));
        }

        MotionDropping drop() {
            return MotionDropping.of(store, transformation, Progress.NONE);
        }
    }

    /** Rank of K/|K| over M/|M| by elimination with full pivoting; stiffnesses here range over less than 1e8, lengths are some metres. */
    private static int rank(MatrixPair pair) {
        int n = pair.stiffness().order();
        double k = largest(pair.stiffness());
        double m = largest(pair.mass());
        double[][] a = new double[2 * n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                a[i][j] = pair.stiffness().get(i, j) / k;
                a[n + i][j] = pair.mass().get(i, j) / m;
            }
        }
        return rank(a, n);
    }

    private static double largest(SymmetricMatrix matrix) {
        double largest = Arrays.stream(matrix.value()).map(Math::abs).max().orElse(0.0);
        return largest > 0.0 ? largest : 1.0;
    }

    private static int rank(double[][] a, int columns) {
        for (int rank = 0; rank < columns; rank++) {
            int row = rank;
            int column = 0;
            for (int i = rank; i < a.length; i++) {
                for (int j = 0; j < columns; j++) {
                    if (Math.abs(a[i][j]) > Math.abs(a[row][column])) {
                        row = i;
                        column = j;
                    }
                }
            }
            if (Math.abs(a[row][column]) < 1e-12) {
                return rank;
            }
            double[] swap = a[rank];
            a[rank] = a[row];
            a[row] = swap;
            for (int i = rank + 1; i < a.length; i++) {
                double factor = a[i][column] / a[rank][column];
                for (int j = 0; j < columns; j++) {
                    a[i][j] -= factor * a[rank][j];
                }
                a[i][column] = 0.0;
            }
        }
        return columns;
    }

    private static TestStructure random(int seed) {
        TestStructure structure = new TestStructure();
        Random random = new Random(seed);
        structure.model().setSelfMassFactor(random.nextBoolean() ? 0.0 : 1.0);
        Node[] nodes = new Node[7];
        for (int i = 0; i < nodes.length; i++) {
            nodes[i] = structure.node(random.nextInt(4) * 2, random.nextInt(4) * 2, i * 1.5);
        }
        RandomMember maker = new RandomMember(seed, structure);
        for (int i = 0; i < 7; i++) {
            int from = random.nextInt(7);
            int to = random.nextInt(7);
            if (from != to) {
                addMember(maker, random, nodes[from], nodes[to]);
            }
        }
        structure.hold(nodes[0], random.nextBoolean() ? TestStructure.ALL : "ux uy uz");
        if (random.nextBoolean()) {
            structure.link(nodes[1], nodes[2], Component.UX, Component.UY, Component.RZ);
            structure.link(nodes[3], nodes[4]);
        }
        structure.spring(nodes[5], nodes[6], 1e6, 0, random.nextInt(2) * 1e6);
        structure.mass(nodes[3], 100.0);
        return structure;
    }

    private static void addMember(RandomMember maker, Random random, Node from, Node to) {
        Member member = maker.between(from, to);
        member.setMass(MemberMass.LUMPED);
        int kind = random.nextInt(4);
        if (kind == 0) {
            member.setAxialOnly(true);
        } else if (kind == 1) {
            TestStructure.release(member, "ry rz", "rx ry rz");
        } else if (kind == 2) {
            maker.addAnyReleases(member);
        }
    }

    @Test
    void exactlyTheCommonNullSpaceIsDropped() {
        int withMotions = 0;
        for (int seed = 0; seed < 300; seed++) {
            Undropped undropped = Undropped.of(random(seed).snapshot());
            MotionDropping dropping = undropped.drop();
            int n = undropped.transformation().unknowns();
            assertEquals(n - rank(undropped.matrices()), dropping.dropped().size(), "seed " + seed);
            assertEquals(n, dropping.kept().length + dropping.dropped().size());
            assertEquals(dropping.kept().length, rank(undropped.matrices().restrictedTo(dropping.kept())),
                    "nothing is left to drop, seed " + seed);
            withMotions += dropping.dropped().isEmpty() ? 0 : 1;
        }
        assertTrue(withMotions > 100, "the trials hold dropped motions: " + withMotions);
    }

    @Test
    void membersWithMassOrStiffnessClearAllUnknownsWithoutAFactorisation() {
        for (MemberMass mass : new MemberMass[] {MemberMass.CONSISTENT, MemberMass.LUMPED}) {
            TestStructure structure = new TestStructure();
            RandomMember maker = new RandomMember(1, structure);
            Node[][] grid = new Node[4][4];
            for (int i = 0; i < 4; i++) {
                for (int j = 0; j < 4; j++) {
                    grid[i][j] = structure.node(5 * i + 0.4 * j, 0.3 * i * j + j, 4 * j + 0.2 * i);
                    structure.hold(grid[i][j], j == 0 ? TestStructure.ALL : "");
                    if (j > 0) {
                        maker.between(grid[i][j - 1], grid[i][j]).setMass(mass);
                    }
                    if (i > 0 && j > 0) {
                        maker.between(grid[i - 1][j], grid[i][j]).setMass(mass);
                    }
                }
            }
            structure.model().getMembers().forEach(member -> member.setAxialOnly(false));
            Undropped undropped = Undropped.of(structure.snapshot());
            assertEquals(0, SuspectUnknowns.of(undropped.store(), undropped.transformation(), Progress.NONE).length);
        }
    }

    @Test
    void aLargeLooseMasslessPartLosesItsSixRigidMotions() {
        TestStructure structure = new TestStructure();
        structure.model().setSelfMassFactor(0.0);
        var material = structure.material(2e11, 0.3, 7850);
        var section = structure.section(0.01, 1e-5, 2e-5, 1e-5, 0, 0);
        structure.line(new double[] {0, 0, 0}, new double[] {30, 20, 10}, 60, section, material);
        MotionDropping dropping = Undropped.of(structure.snapshot()).drop();
        assertEquals(6, dropping.dropped().size());
        long moved = dropping.dropped().stream().flatMapToInt(motion -> Arrays.stream(motion.nodes())).distinct().count();
        assertEquals(61, moved);
    }

    @Test
    void aCompressedStrutAtItsCriticalLoadIsNotDropped() {
        // two springs hold a massless joint between compressed bars: k = 2 N/L leaves no stiffness, yet each part has forces
        TestStructure structure = new TestStructure();
        structure.model().setSelfMassFactor(0.0);
        var material = structure.material(2e11, 0.3, 7850);
        var section = structure.section(0.001, 0, 0, 0, 0, 0);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {4, 0, 0}, 2, section, material);
        structure.model().getMembers().forEach(member -> {
            member.setAxialOnly(true);
            member.setAxialForce(-1000.0);
        });
        structure.hold(nodes[0], TestStructure.ALL);
        structure.hold(nodes[2], TestStructure.ALL);
        structure.hold(nodes[1], "ux uz rx ry rz");
        structure.spring(nodes[1], null, 0, 1000.0);
        Undropped undropped = Undropped.of(structure.snapshot());
        assertEquals(0.0, undropped.matrices().stiffness().get(0, 0), 1e-9);
        assertTrue(undropped.drop().dropped().isEmpty());
    }
}
