package org.modewright.fem;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Random;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.MultiPointTie;
import org.modewright.model.structure.Node;

/** Supports, floors, links and ties as homogeneous linear constraints. */
class ConstraintTest {

    /** Springs to ground at every node, so that no motion is dropped and the free degrees of freedom count the constraints. */
    private static void ground(TestStructure structure) {
        for (Node node : structure.model().getNodes()) {
            structure.spring(node, null, 1e3, 2e3, 3e3, 4e3, 5e3, 6e3);
        }
    }

    private static double[] randomMotion(Assembly assembly, long seed) {
        Random random = new Random(seed);
        double[] free = new double[assembly.freeDofs()];
        for (int i = 0; i < free.length; i++) {
            free[i] = random.nextGaussian();
        }
        return assembly.expand(free);
    }

    private static double[] position(Node node) {
        return new double[] {node.getX(), node.getY(), node.getZ()};
    }

    private static double dot(double[] a, double[] b) {
        return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
    }

    private static double[] cross(double[] a, double[] b) {
        return new double[] {a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]};
    }

    private static double[] part(double[] u, int from) {
        return Arrays.copyOfRange(u, from, from + 3);
    }

    private static double[] minus(double[] a, double[] b) {
        return new double[] {a[0] - b[0], a[1] - b[1], a[2] - b[2]};
    }

    /** In-plane motion of every node of a floor is that of one rigid body; the rest is free. */
    private static void assertFloor(double[] u, List<Node> all, Node[] floor, double[] normal) {
        int first = 6 * all.indexOf(floor[0]);
        double spin = dot(normal, part(u, first + 3));
        for (Node node : floor) {
            int place = 6 * all.indexOf(node);
            assertEquals(spin, dot(normal, part(u, place + 3)), 1e-11);
            double[] arm = minus(position(node), position(floor[0]));
            double[] relative = minus(part(u, place), part(u, first));
            double[] turned = cross(normal, arm);
            double[] rest = minus(relative, new double[] {spin * turned[0], spin * turned[1], spin * turned[2]});
            double out = dot(rest, normal);
            double[] inPlane = minus(rest, new double[] {out * normal[0], out * normal[1], out * normal[2]});
            assertEquals(0.0, Math.sqrt(dot(inPlane, inPlane)), 1e-10);
        }
    }

    @ParameterizedTest
    @CsvSource({"0, 0, 1", "1, 0, 0", "0, 1, 0", "0.6, 0, 0.8", "0.36, 0.48, 0.8", "-0.48, 0.6, 0.64"})
    void floorsAreRigidInTheirPlaneWhateverPlaneThatIs(double nx, double ny, double nz) {
        double size = Math.sqrt(nx * nx + ny * ny + nz * nz);
        double[] normal = {nx / size, ny / size, nz / size};
        double[] helper = Math.abs(normal[0]) < 0.9 ? new double[] {1, 0, 0} : new double[] {0, 1, 0};
        double[] a = cross(normal, helper);
        double[] b = cross(normal, a);
        Random random = new Random(7);
        TestStructure structure = new TestStructure();
        Node[] nodes = new Node[8];
        for (int i = 0; i < nodes.length; i++) {
            double s = 20 * random.nextDouble();
            double t = 10 * random.nextDouble();
            nodes[i] = structure.node(100 + s * a[0] + t * b[0], s * a[1] + t * b[1], 30 + s * a[2] + t * b[2]);
        }
        structure.floor(nodes);
        ground(structure);
        Assembly assembly = structure.assemble();
        assertEquals(6 * 8 - 3 * 7, assembly.freeDofs());
        assertFloor(randomMotion(assembly, 1), structure.model().getNodes(), nodes, normal);
    }

    @Test
    void nodesOnALineMakeAHorizontalFloor() {
        TestStructure structure = new TestStructure();
        Node[] nodes = {structure.node(0, 0, 3), structure.node(4, 1, 3), structure.node(8, 2, 3)};
        structure.floor(nodes);
        structure.floor(nodes[0], nodes[2]);
        ground(structure);
        Assembly assembly = structure.assemble();
        assertEquals(18 - 6, assembly.freeDofs());
        assertFloor(randomMotion(assembly, 2), structure.model().getNodes(), nodes, new double[] {0, 0, 1});
    }

    @Test
    void floorsThatOverlapInOneNodeShareItInTwoNodesAreOne() {
        for (int shared = 1; shared <= 2; shared++) {
            TestStructure structure = new TestStructure();
            Node[] nodes = new Node[6];
            for (int i = 0; i < 6; i++) {
                nodes[i] = structure.node(i % 3 * 5, i / 3 * 4, 3);
            }
            structure.floor(nodes[0], nodes[3], nodes[1], nodes[4]);
            structure.floor(shared == 1 ? new Node[] {nodes[4], nodes[2], nodes[5]} : new Node[] {nodes[1], nodes[4], nodes[2], nodes[5]});
            ground(structure);
            Assembly assembly = structure.assemble();
            // each further node of a floor loses three motions; a second shared node is redundant
            assertEquals(36 - 3 * 5, assembly.freeDofs());
            assertFloor(randomMotion(assembly, 3), structure.model().getNodes(), nodes, new double[] {0, 0, 1});
        }
    }

    @Test
    void slightlyUnevenFloorsThatOverlapTieNoMoreThanFlatOnes() {
        TestStructure structure = new TestStructure();
        Random random = new Random(11);
        Node[] nodes = new Node[9];
        for (int i = 0; i < 9; i++) {
            nodes[i] = structure.node(i % 3 * 5, i / 3 * 4, 3 + 3e-6 * random.nextDouble());
        }
        structure.floor(Arrays.copyOf(nodes, 6));
        structure.floor(Arrays.copyOfRange(nodes, 3, 9));
        ground(structure);
        assertEquals(54 - 3 * 8, structure.assemble().freeDofs());
    }

    @Test
    void aFloorEqualsLinksInTheThreeComponents() {
        assertArrayEquals(frameWithFloor(true), frameWithFloor(false), 1e-9);
    }

    private static double[] frameWithFloor(boolean byFloor) {
        TestStructure structure = new TestStructure();
        Material material = structure.material(30e9, 0.2, 2500);
        FrameSection column = structure.section(0.16, 2e-3, 1.5e-3, 3e-3, 0.13, 0.13);
        Node[] heads = new Node[4];
        for (int i = 0; i < 4; i++) {
            Node base = structure.node(i % 2 * 6, i / 2 * 5, 0);
            structure.hold(base, TestStructure.ALL);
            heads[i] = structure.node(i % 2 * 6, i / 2 * 5, 3.5);
            structure.member(base, heads[i], column, material);
        }
        Node centre = structure.node(2.5, 2.7, 3.5);
        structure.mass(centre, 4e4, 4e4, 0, 0, 0, 2e5);
        if (byFloor) {
            structure.floor(heads[0], heads[1], heads[2], heads[3], centre);
        } else {
            for (Node head : heads) {
                structure.link(centre, head, Component.UX, Component.UY, Component.RZ);
            }
        }
        return structure.circular();
    }

    @Test
    void aRigidLinkCarriesItsFollowerAsARigidBody() {
        TestStructure structure = new TestStructure();
        Node from = structure.node(1, 2, 3);
        Node to = structure.node(3, -1, 7);
        structure.link(from, to);
        ground(structure);
        Assembly assembly = structure.assemble();
        assertEquals(6, assembly.freeDofs());
        double[] u = randomMotion(assembly, 4);
        assertArrayEquals(part(u, 3), part(u, 9), 1e-12);
        double[] turned = cross(part(u, 3), new double[] {2, -3, 4});
        assertArrayEquals(turned, minus(part(u, 6), part(u, 0)), 1e-11);
    }

    @Test
    void aLinkWithFewerComponentsTiesJustThose() {
        TestStructure structure = new TestStructure();
        Node from = structure.node(0, 0, 0);
        Node to = structure.node(0, 2, 5);
        structure.link(from, to, Component.UX, Component.RZ);
        ground(structure);
        Assembly assembly = structure.assemble();
        assertEquals(10, assembly.freeDofs());
        double[] u = randomMotion(assembly, 5);
        assertEquals(u[5], u[11], 1e-12);
        // x of (theta x r) with r = (0, 2, 5)
        assertEquals(u[0] + 5 * u[4] - 2 * u[5], u[6], 1e-11);
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6})
    void chainsCirclesAndRepetitionsOfLinksMakeOneBodyInAnyOrder(long seed) {
        TestStructure structure = new TestStructure();
        Random random = new Random(seed);
        Node[] nodes = new Node[6];
        for (int i = 0; i < 6; i++) {
            nodes[i] = structure.node(10 * random.nextDouble(), 10 * random.nextDouble(), 10 * random.nextDouble());
        }
        List<int[]> links = new ArrayList<>(List.of(new int[] {0, 1}, new int[] {1, 2}, new int[] {3, 2}, new int[] {3, 4},
                new int[] {4, 5}, new int[] {5, 0}, new int[] {1, 2}, new int[] {2, 1}, new int[] {0, 3}));
        Collections.shuffle(links, random);
        links.forEach(link -> structure.link(nodes[link[0]], nodes[link[1]]));
        ground(structure);
        Assembly assembly = structure.assemble();
        assertEquals(6, assembly.freeDofs());
        double[] u = randomMotion(assembly, seed);
        for (int i = 1; i < 6; i++) {
            assertArrayEquals(part(u, 3), part(u, 6 * i + 3), 1e-9);
            double[] turned = cross(part(u, 3), minus(position(nodes[i]), position(nodes[0])));
            assertArrayEquals(turned, minus(part(u, 6 * i), part(u, 0)), 1e-8);
        }
    }

    @Test
    void everyMixtureHasTheRankThatDenseEliminationFinds() {
        for (int seed = 0; seed < 200; seed++) {
            TestStructure structure = new TestStructure();
            List<double[]> rows = randomConstraints(structure, new Random(seed));
            ground(structure);
            Assembly assembly = structure.assemble();
            int rank = rank(rows);
            assertEquals(6 * structure.model().getNodes().size() - rank, assembly.freeDofs(), "seed " + seed);
            double[] u = randomMotion(assembly, seed);
            double largest = Arrays.stream(u).map(Math::abs).max().orElse(0.0);
            for (double[] row : rows) {
                double sum = 0.0;
                double size = 0.0;
                for (int i = 0; i < u.length; i++) {
                    sum += row[i] * u[i];
                    size = Math.max(size, Math.abs(row[i]));
                }
                assertEquals(0.0, sum, 1e-9 * size * Math.max(largest, 1.0), "seed " + seed);
            }
        }
    }

    /** Supports, horizontal floors, links and ties at random; the same as rows of a dense matrix. */
    private static List<double[]> randomConstraints(TestStructure structure, Random random) {
        int count = 7;
        Node[] nodes = new Node[count];
        for (int i = 0; i < count; i++) {
            nodes[i] = structure.node(random.nextInt(5), random.nextInt(5), i < 4 ? 3 : random.nextInt(3));
        }
        List<double[]> rows = new ArrayList<>();
        int floorSize = 2 + random.nextInt(3);
        if (random.nextBoolean()) {
            structure.floor(Arrays.copyOf(nodes, floorSize));
            for (int i = 1; i < floorSize; i++) {
                addLinkRows(rows, nodes, 0, i, new int[] {0, 1, 5});
            }
        }
        for (int i = 0; i < 4; i++) {
            int from = random.nextInt(count);
            int to = random.nextInt(count);
            if (from != to) {
                int[] components = random.ints(1 + random.nextInt(6), 0, 6).distinct().toArray();
                structure.link(nodes[from], nodes[to], Arrays.stream(components).mapToObj(Component::get).toArray(Component[]::new));
                addLinkRows(rows, nodes, from, to, components);
            }
        }
        for (int i = 0; i < 2; i++) {
            addTie(structure, rows, nodes, random);
        }
        for (int i = 0; i < 3; i++) {
            int node = random.nextInt(count);
            int component = random.nextInt(6);
            structure.hold(nodes[node], Component.get(component).getLiteral());
            double[] row = new double[6 * count];
            row[6 * node + component] = 1.0;
            rows.add(row);
        }
        return rows;
    }

    private static void addTie(TestStructure structure, List<double[]> rows, Node[] nodes, Random random) {
        MultiPointTie tie = structure.tie();
        double[] row = new double[6 * nodes.length];
        for (int term = 0; term < 3; term++) {
            int node = random.nextInt(nodes.length);
            int component = random.nextInt(6);
            if (row[6 * node + component] == 0.0) {
                row[6 * node + component] = 1 + random.nextInt(4);
                TestStructure.term(tie, nodes[node], Component.get(component), row[6 * node + component]);
            }
        }
        rows.add(row);
    }

    private static void addLinkRows(List<double[]> rows, Node[] nodes, int from, int to, int[] components) {
        double[] arm = minus(position(nodes[to]), position(nodes[from]));
        for (int component : components) {
            double[] row = new double[6 * nodes.length];
            row[6 * to + component] = 1.0;
            row[6 * from + component] = -1.0;
            if (component < 3) {
                double[] axis = new double[3];
                axis[component] = 1.0;
                double[] turn = cross(arm, axis);
                for (int i = 0; i < 3; i++) {
                    row[6 * from + 3 + i] = -turn[i];
                }
            }
            rows.add(row);
        }
    }

    /** Rank by Gaussian elimination with full pivoting. */
    private static int rank(List<double[]> rows) {
        double[][] a = rows.stream().map(double[]::clone).toArray(double[][]::new);
        int rank = 0;
        while (rank < a.length) {
            int pivotRow = rank;
            int pivotColumn = 0;
            for (int i = rank; i < a.length; i++) {
                for (int j = 0; j < a[i].length; j++) {
                    if (Math.abs(a[i][j]) > Math.abs(a[pivotRow][pivotColumn])) {
                        pivotRow = i;
                        pivotColumn = j;
                    }
                }
            }
            if (Math.abs(a[pivotRow][pivotColumn]) < 1e-9) {
                return rank;
            }
            double[] swap = a[rank];
            a[rank] = a[pivotRow];
            a[pivotRow] = swap;
            for (int i = rank + 1; i < a.length; i++) {
                double factor = a[i][pivotColumn] / a[rank][pivotColumn];
                for (int j = 0; j < a[i].length; j++) {
                    a[i][j] -= factor * a[rank][j];
                }
                a[i][pivotColumn] = 0.0;
            }
            rank++;
        }
        return rank;
    }

    @Test
    void tiesThatConflictRestrict() {
        TestStructure structure = new TestStructure();
        Node a = structure.node(0, 0, 0);
        Node b = structure.node(1, 0, 0);
        for (double factor : new double[] {-1.0, -2.0}) {
            MultiPointTie tie = structure.tie();
            TestStructure.term(tie, a, Component.UX, 1.0);
            TestStructure.term(tie, b, Component.UX, factor);
        }
        ground(structure);
        Assembly assembly = structure.assemble();
        assertEquals(10, assembly.freeDofs());
        double[] u = randomMotion(assembly, 8);
        assertEquals(0.0, u[0], 1e-12);
        assertEquals(0.0, u[6], 1e-12);
    }

    @Test
    void factorsOfATieBelongToTheModelsOwnLength() {
        // ux of the end of a 100 in arm equals -100 in times the rotation about y at its foot
        double[] frequencies = new double[2];
        for (int i = 0; i < 2; i++) {
            TestStructure structure = new TestStructure("kip-in");
            Node foot = structure.node(0, 0, 0);
            Node top = structure.node(0, 0, 100);
            structure.hold(foot, "ux uy uz rx rz");
            structure.hold(top, "uy uz rx ry rz");
            structure.spring(foot, null, 0, 0, 0, 0, 5e4, 0);
            structure.mass(top, 0.2);
            if (i == 0) {
                MultiPointTie tie = structure.tie();
                TestStructure.term(tie, top, Component.UX, 1.0);
                TestStructure.term(tie, foot, Component.RY, -100.0);
            } else {
                structure.link(foot, top, Component.UX);
            }
            frequencies[i] = structure.circular()[0];
        }
        assertEquals(Math.sqrt(5e4 / (0.2 * 1e4)), frequencies[0], 1e-12 * frequencies[0]);
        assertEquals(frequencies[1], frequencies[0], 1e-12 * frequencies[1]);
    }

    @Test
    void aFloorPinnedAtOneNodeTurnsAboutIt() {
        TestStructure structure = new TestStructure();
        Node pin = structure.node(2, 1, 3);
        Node other = structure.node(8, 9, 3);
        structure.floor(pin, other);
        structure.hold(pin, TestStructure.ALL.replace(" rz", ""));
        structure.hold(other, "uz rx ry");
        structure.mass(other, 5.0);
        structure.spring(pin, null, 0, 0, 0, 0, 0, 2000.0);
        Assembly assembly = structure.assemble();
        assertEquals(1, assembly.freeDofs());
        assertEquals(Math.sqrt(2000.0 / (5.0 * 100.0)), structure.circular()[0], 1e-12);
        // shaken along x the floor swings: participation m h_y / (m h^2) r, movable mass m (h_y/h)^2 with the arm h = (6, 8)
        assertEquals(5.0 * 0.64, assembly.ledger().movable()[0], 1e-12);
        assertEquals(5.0 * 0.36, assembly.ledger().movable()[1], 1e-12);
        double[] load = assembly.massTimesRigid(0, new double[3]);
        assertEquals(5.0 * 0.64, load[0] * load[0] / assembly.mass().get(0, 0), 1e-12);
    }

    @Test
    void manyLargeFloorsStaySparse() {
        TestStructure structure = new TestStructure();
        Random random = new Random(3);
        int floors = 12;
        int perFloor = 300;
        for (int floor = 0; floor < floors; floor++) {
            Node[] nodes = new Node[perFloor];
            for (int i = 0; i < perFloor; i++) {
                nodes[i] = structure.node(50 * random.nextDouble(), 30 * random.nextDouble(), 3.0 * floor);
            }
            structure.floor(nodes);
        }
        ground(structure);
        Assembly assembly = structure.assemble();
        int expected = 6 * floors * perFloor - 3 * floors * (perFloor - 1);
        assertEquals(expected, assembly.freeDofs());
        // diagonal, and six entries among the three unknowns of each floor
        assertTrue(assembly.stiffness().entries() <= expected + 12 * perFloor * floors,
                "entries " + assembly.stiffness().entries());
        assertEquals(0, assembly.dropped().size());
    }

    /**
     * A held floor leaves its nodes the motion along its normal, and a strut in its plane with hinges at both ends resists none of it: the
     * terms of the strut's matrix cancel, and what their rounding leaves must not pass for a stiffness.
     */
    @Test
    void whatCancelsUnderTiesIsNoStiffness() {
        Random random = new Random(17);
        for (int trial = 0; trial < 50; trial++) {
            double[] e = unit(new double[] {random.nextGaussian(), random.nextGaussian(), random.nextGaussian()});
            double[] f = unit(new double[] {e[1], -e[0], 0});
            TestStructure structure = new TestStructure();
            Node[] nodes = new Node[4];
            for (int k = 0; k < 4; k++) {
                double p = 5 * random.nextGaussian();
                double q = 5 * random.nextGaussian();
                nodes[k] = structure.node(p * e[0] + q * f[0], p * e[1] + q * f[1], p * e[2] + q * f[2]);
            }
            structure.floor(nodes[0], nodes[1], nodes[2]);
            structure.hold(nodes[0], TestStructure.ALL);
            structure.hold(nodes[3], TestStructure.ALL);
            TestStructure.release(structure.member(nodes[1], nodes[3], structure.section(0.01, 1e-4, 1e-4, 1e-4, 0, 0),
                    structure.material(2e11, 0.3, 7850)), "ry rz", "rx ry rz");
            Assembly assembly = structure.assemble();
            for (double stiffness : assembly.stiffness().diagonal()) {
                assertEquals(0.0, stiffness, 0.0, "trial " + trial);
            }
        }
    }

    private static double[] unit(double[] vector) {
        double length = Math.sqrt(Arrays.stream(vector).map(component -> component * component).sum());
        return Arrays.stream(vector).map(component -> component / length).toArray();
    }
}
