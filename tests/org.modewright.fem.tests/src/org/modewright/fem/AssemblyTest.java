package org.modewright.fem;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Random;

import org.junit.jupiter.api.Test;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Group;
import org.modewright.model.structure.MassFormulation;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructureFactory;
import org.modewright.numerics.CancelledException;
import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.Progress;

/** Assembly as a whole: carriers and energies, dropped motions, loose parts, names, cancel. */
class AssemblyTest {

    private static TestStructure mixedFrame() {
        TestStructure structure = new TestStructure();
        RandomMember maker = new RandomMember(42, structure);
        Node[] nodes = new Node[6];
        for (int i = 0; i < 6; i++) {
            nodes[i] = structure.node(i % 2 * 5, i / 2 * 4, i % 3 * 3);
        }
        for (int i = 0; i < 6; i++) {
            for (int j = i + 1; j < 6; j += 2) {
                maker.addSoundReleases(maker.between(nodes[i], nodes[j]));
            }
        }
        structure.hold(nodes[0], TestStructure.ALL);
        structure.hold(nodes[1], "uz").setElasticUx(1e6);
        structure.link(nodes[2], nodes[3], Component.UX, Component.UY, Component.RZ);
        structure.spring(nodes[4], nodes[5], 1e5, 1e5, 1e5);
        structure.spring(nodes[2], null, 1e5);
        structure.mass(nodes[4], 500.0).setOffset(TestStructure.vector(0.2, 0.1, 0));
        TestStructure.load(structure.pattern("G", 1.0), nodes[5], 9e3);
        return structure;
    }

    @Test
    void energiesOfTheCarriersAddUpToTheWhole() {
        Assembly assembly = mixedFrame().assemble();
        Random random = new Random(1);
        double[] free = new double[assembly.freeDofs()];
        for (int i = 0; i < free.length; i++) {
            free[i] = random.nextGaussian();
        }
        double[] nodal = assembly.expand(free);
        double strain = assembly.stiffness().quadratic(free);
        double kinetic = assembly.mass().quadratic(free);
        assertEquals(strain, Arrays.stream(assembly.strainEnergies(nodal)).sum(), 1e-11 * strain);
        assertEquals(kinetic, Arrays.stream(assembly.kineticEnergies(nodal)).sum(), 1e-11 * kinetic);
        assertEquals(kinetic, Arrays.stream(assembly.kineticProducts(free)).sum(), 1e-11 * kinetic);
        assertEquals(assembly.carriers().size(), assembly.strainEnergies(nodal).length);
    }

    @Test
    void carriersComeInTheOrderMembersSpringsElasticSupportsNodes() {
        Assembly assembly = mixedFrame().assemble();
        List<Kind> kinds = assembly.carriers().stream().map(Carrier::kind).toList();
        int members = assembly.snapshot().members().size();
        assertTrue(kinds.subList(0, members).stream().allMatch(kind -> kind == Kind.MEMBER));
        assertEquals(List.of(Kind.SPRING, Kind.SPRING, Kind.SPRING, Kind.NODE, Kind.NODE), kinds.subList(members, kinds.size()));
        assertArrayEquals(new int[] {5}, assembly.carriers().get(kinds.size() - 1).nodes());
    }

    @Test
    void aCarrierNamesItsGroupSectionMaterialAndLevel() {
        TestStructure structure = new TestStructure();
        Material material = structure.material(2e11, 0.3, 7850);
        FrameSection section = structure.section(0.01, 1e-5, 1e-5, 1e-5, 0, 0);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {0, 0, 12}, 4, section, material);
        Group group = StructureFactory.eINSTANCE.createGroup();
        group.setId("g1");
        group.setName("mast");
        structure.model().getGroups().add(group);
        Member first = structure.model().getMembers().get(0);
        first.setGroup(group);
        structure.hold(nodes[0], TestStructure.ALL);
        Assembly without = structure.assemble();
        assertNull(without.carriers().get(0).level());
        structure.level("upper", 6.0);
        structure.level("lower", 3.0 - 5e-6);
        Assembly assembly = structure.assemble();
        Carrier carrier = assembly.carriers().get(0);
        assertEquals("mast", carrier.group());
        assertEquals(section.getName(), carrier.section());
        assertEquals(material.getName(), carrier.material());
        // 1e-6 of the height of 12 m forgives the 5e-6 m
        assertEquals(List.of("lower", "upper", "upper", "upper"), assembly.carriers().stream().map(Carrier::level).toList());
        assertNull(assembly.carriers().get(1).group());
    }

    @Test
    void namesOfDegreesOfFreedom() {
        TestStructure structure = new TestStructure();
        Node node = structure.node(0, 0, 0);
        node.setName("N4");
        structure.hold(node, "ux uy uz rx ry");
        structure.spring(node, null, 0, 0, 0, 0, 0, 1.0);
        Assembly assembly = structure.assemble();
        assertEquals("rotation about Z of node N4", assembly.nameOf(0));
        assertEquals(0, assembly.nodeOf(0));
        assertEquals(5, assembly.componentOf(0));
        assertEquals("rz", Components.inFiles(5));
    }

    @Test
    void nodesThatSpinFreelyAreDropped() {
        // an inclined plane truss of frame members with all bending released at both ends: each of two joints can spin about the normal;
        // of their four spins in the plane the torsion of three members resists three, so that one motion of both joints is left
        TestStructure structure = new TestStructure();
        Material material = structure.material(2e11, 0.3, 7850);
        FrameSection section = structure.section(0.002, 1e-6, 1e-6, 1e-6, 0, 0);
        double c = Math.cos(0.3);
        double s = Math.sin(0.3);
        Node[] nodes = {structure.node(0, 0, 0), structure.node(4 * c, 0, 4 * s), structure.node(2 * c, 3, 2 * s)};
        int[][] pairs = {{0, 1}, {1, 2}, {2, 0}};
        for (int[] pair : pairs) {
            TestStructure.release(structure.member(nodes[pair[0]], nodes[pair[1]], section, material), "ry rz", "ry rz");
        }
        structure.model().setMassFormulation(MassFormulation.LUMPED);
        structure.hold(nodes[0], TestStructure.ALL);
        structure.hold(nodes[1], "ux uy uz");
        structure.spring(nodes[2], null, 0, 0, 1e6);
        Assembly assembly = structure.assemble();
        assertEquals(3, assembly.dropped().size());
        assembly.dropped().forEach(motion -> assertTrue(motion.component() >= 3));
        assertTrue(assembly.dropped().stream().anyMatch(motion -> Arrays.equals(new int[] {1, 2}, motion.nodes())));
        assertEquals(6, assembly.freeDofs());
        assertEquals(3, TestStructure.pairs(assembly).count());
    }

    @Test
    void aMasslessPartThatHangsOnNothingIsDropped() {
        TestStructure structure = new TestStructure();
        structure.model().setSelfMassFactor(0.0);
        Material material = structure.material(2e11, 0.3, 7850);
        FrameSection section = structure.section(0.002, 1e-6, 1e-6, 1e-6, 0, 0);
        Node held = structure.node(0, 0, 0);
        Node tip = structure.node(2, 0, 0);
        structure.hold(held, TestStructure.ALL);
        structure.member(held, tip, section, material);
        structure.mass(tip, 5.0);
        Node a = structure.node(0, 5, 1);
        Node b = structure.node(2, 6, 2);
        structure.member(a, b, section, material);
        structure.node(9, 9, 9);
        Assembly assembly = structure.assemble();
        // the loose massless member keeps its six elastic motions; its six rigid ones go, as do those of the lone node
        assertEquals(6 + 6, assembly.freeDofs());
        assertEquals(12, assembly.dropped().size());
        assertTrue(assembly.dropped().stream().filter(motion -> motion.node() < 4).allMatch(motion -> motion.nodes().length > 0));
        EigenPairs pairs = TestStructure.pairs(assembly);
        assertEquals(3, pairs.count());
        double[] shares = TestStructure.effectiveShares(assembly, pairs, 1);
        assertEquals(1.0, Arrays.stream(shares).sum(), 1e-12);
    }

    @Test
    void masslessRotationsStayAndAreCondensedBySolving() {
        // a cantilever of massless members in three pieces with a tip mass: 3 E I/(L^3 m)
        TestStructure structure = new TestStructure();
        structure.model().setSelfMassFactor(0.0);
        Material material = structure.material(2e11, 0.3, 7850);
        FrameSection section = structure.section(0.002, 1e-6, 2e-6, 1e-6, 0, 0);
        Node[] nodes = structure.line(new double[] {0, 0, 0}, new double[] {0, 0, 3}, 3, section, material);
        structure.hold(nodes[0], TestStructure.ALL);
        structure.mass(nodes[3], 50.0);
        Assembly assembly = structure.assemble();
        assertEquals(18, assembly.freeDofs());
        EigenPairs pairs = TestStructure.pairs(assembly);
        assertEquals(3, pairs.count());
        // for a vertical member y is global Y and z = x cross y is minus global X, so iy bends along X
        assertEquals(3.0 * 2e11 * 1e-6 / (27.0 * 50.0), pairs.values()[0], 1e-9 * pairs.values()[0]);
        assertEquals(3.0 * 2e11 * 2e-6 / (27.0 * 50.0), pairs.values()[1], 1e-9 * pairs.values()[1]);
        double[] nodal = assembly.expand(pairs.vectors()[0]);
        assertTrue(Math.abs(nodal[18]) > 1e3 * Math.abs(nodal[19]));
    }

    @Test
    void aCancelEndsTheAssembly() {
        Snapshot snapshot = mixedFrame().snapshot();
        Progress cancelled = new Progress() {
            @Override
            public void report(String stage, double fraction) {
                // nobody listens
            }

            @Override
            public boolean isCancelled() {
                return true;
            }
        };
        assertThrows(CancelledException.class, () -> Assembly.of(snapshot, cancelled));
    }

    @Test
    void defectsAreNamed() {
        TestStructure structure = new TestStructure();
        structure.material(-1.0, 0.3, 7850);
        structure.node(0, 0, 0);
        ModelDefectsException thrown = assertThrows(ModelDefectsException.class, structure::snapshot);
        assertEquals(1, thrown.defects().size());
        assertTrue(thrown.getMessage().contains("modulus of elasticity"), thrown.getMessage());
    }

    @Test
    void anotherFormulationTakesPrecedence() {
        TestStructure structure = new TestStructure();
        Node node = structure.node(0, 0, 0);
        structure.hold(node, "uy uz rx ry rz");
        structure.spring(node, null, 4.0);
        structure.mass(node, 1.0);
        ElementFormulation doubled = new ElementFormulation() {
            @Override
            public boolean accepts(StructuralElement element) {
                return element.kind() == Kind.SPRING;
            }

            @Override
            public ElementMatrices matrices(StructuralElement element, Snapshot snapshot) {
                double[] stiffness = new double[ElementMatrices.packedLength(6)];
                stiffness[0] = 9.0;
                return new ElementMatrices(stiffness, new double[0]);
            }
        };
        Assembly assembly = Assembly.of(structure.snapshot(), ElementFormulations.standard().with(doubled), Progress.NONE);
        assertEquals(9.0, assembly.stiffness().get(0, 0), 0.0);
    }

    @Test
    void anElementWithoutFormulationIsNamed() {
        StructuralElement unknown = new StructuralElement() {
            @Override
            public Kind kind() {
                return Kind.PANEL;
            }

            @Override
            public String id() {
                return "p1";
            }

            @Override
            public String name() {
                return "W7";
            }

            @Override
            public int[] nodes() {
                return new int[] {0};
            }

            @Override
            public String group() {
                return null;
            }

            @Override
            public String section() {
                return null;
            }

            @Override
            public String material() {
                return null;
            }

            @Override
            public double ownMass() {
                return 0.0;
            }
        };
        IllegalArgumentException thrown = assertThrows(IllegalArgumentException.class,
                () -> ElementFormulations.standard().matrices(unknown, mixedFrame().snapshot()));
        assertTrue(thrown.getMessage().contains("panel W7"), thrown.getMessage());
    }

    @Test
    void aSnapshotDoesNotFollowTheModel() {
        TestStructure structure = mixedFrame();
        Snapshot snapshot = structure.snapshot();
        double before = Assembly.of(snapshot, Progress.NONE).stiffness().quadratic(ones(snapshot));
        structure.model().getMaterials().forEach(material -> material.setYoung(2.0 * material.getYoung()));
        structure.model().getNodes().get(3).setX(77.0);
        assertEquals(before, Assembly.of(snapshot, Progress.NONE).stiffness().quadratic(ones(snapshot)), 0.0);
    }

    private static double[] ones(Snapshot snapshot) {
        double[] ones = new double[Assembly.of(snapshot, Progress.NONE).freeDofs()];
        Arrays.fill(ones, 1.0);
        return ones;
    }
}
