package org.modewright.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.modewright.model.Severity.ERROR;
import static org.modewright.model.Severity.INFO;
import static org.modewright.model.Severity.WARNING;

import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Consumer;
import java.util.stream.Collectors;
import java.util.stream.Stream;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.util.InternalEList;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.NodeLoad;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.SpringCoupling;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;

/**
 * Every check with a change of a sound model that triggers it and, where there is a limit, its twin just on the right side of it.
 */
class WellFormednessTest {

    private record Case(String id, Severity severity, String what, Consumer<StructuralModel> fault, Consumer<StructuralModel> twin) {
        @Override
        public String toString() {
            return id + ": " + what;
        }
    }

    private static Case error(String id, String what, Consumer<StructuralModel> fault, Consumer<StructuralModel> twin) {
        return new Case(id, ERROR, what, fault, twin);
    }

    private static Case warning(String id, String what, Consumer<StructuralModel> fault, Consumer<StructuralModel> twin) {
        return new Case(id, WARNING, what, fault, twin);
    }

    static List<Case> cases() {
        return Stream.of(references(), numbers(), members(), springs(), constraints(), masses()).flatMap(s -> s).toList();
    }

    private static Stream<Case> references() {
        return Stream.of(
                error("reference-missing", "member without section", m -> m.getMembers().get(0).setSection(null),
                        m -> m.getMembers().get(0).setGroup(null)),
                error("reference-missing", "load without node", m -> load(m).eUnset(load(m).eClass().getEStructuralFeature("node")),
                        m -> m.getSprings().get(0).setTo(null)),
                error("reference-outside", "member on a node of no model",
                        m -> m.getMembers().get(0).setStart(StructureFactory.eINSTANCE.createNode()),
                        m -> m.getMembers().get(0).setStart(m.getNodes().get(8))),
                error("reference-outside", "floor with a node of no model",
                        m -> m.getRigidFloors().get(0).getNodes().add(StructureFactory.eINSTANCE.createNode()),
                        m -> m.getRigidFloors().get(0).getNodes().remove(0)),
                error("id-repeated", "two nodes", m -> m.getNodes().get(1).setId("n1"), m -> m.getNodes().get(1).setId("n99")),
                error("name-repeated", "two nodes", m -> m.getNodes().get(1).setName("N1"), m -> m.getMembers().get(1).setName("N1")),
                error("name-blank", "node", m -> m.getNodes().get(1).setName("  "), m -> m.getNodes().get(1).setName("x")),
                warning("name-blank", "support", m -> m.getSupports().get(0).setName(null), m -> m.getSupports().get(0).setName("S")),
                warning("level-repeated", "two levels", m -> level(m, 3), m -> level(m, 3.1)));
    }

    private static Stream<Case> numbers() {
        return Stream.of(
                error("number-not-finite", "coordinate", m -> m.getNodes().get(8).setX(Double.NaN), m -> m.getNodes().get(8).setX(1e300)),
                error("number-not-finite", "tie factor", m -> m.getTies().get(0).getTerms().get(0).setFactor(Double.POSITIVE_INFINITY),
                        m -> m.getTies().get(0).getTerms().get(0).setFactor(-1e9)),
                error("number-not-positive", "young", m -> m.getMaterials().get(0).setYoung(0), m -> m.getMaterials().get(0).setYoung(1)),
                error("number-not-positive", "density", m -> m.getMaterials().get(0).setDensity(0),
                        m -> m.getMaterials().get(0).setDensity(1e-9)),
                error("number-not-positive", "area", m -> m.getFrameSections().get(0).setArea(-1),
                        m -> m.getFrameSections().get(0).setArea(1)),
                error("number-not-positive", "second moment of a section of frame members", m -> m.getFrameSections().get(0).setIy(0),
                        WellFormednessTest::barsWithoutSecondMoment),
                error("number-not-positive", "shear factor", m -> m.getMembers().get(0).setShearYFactor(0),
                        m -> m.getMembers().get(0).setBendingYFactor(0)),
                error("number-negative", "second moment of a section of bars", m -> {
                    barsWithoutSecondMoment(m);
                    m.getFrameSections().get(0).setIz(-1);
                }, WellFormednessTest::barsWithoutSecondMoment),
                error("number-negative", "stiffness factor", m -> m.getMembers().get(0).setTorsionFactor(-0.1),
                        m -> m.getMembers().get(0).setTorsionFactor(0)),
                error("number-negative", "spring", m -> m.getSprings().get(0).setUz(-1), m -> m.getSprings().get(0).setUz(0)),
                error("number-negative", "mass", m -> m.getMasses().get(0).setRx(-1e-9), m -> m.getMasses().get(0).setRx(0)),
                error("number-negative", "elastic support", m -> m.getSupports().get(0).setElasticRx(-1),
                        m -> m.getSupports().get(0).setElasticRx(1)),
                error("number-negative", "modes", m -> m.getAnalysis().setModes(-1), m -> m.getAnalysis().setModes(0)),
                error("number-negative", "gravity", m -> m.setGravity(-9.81), m -> m.setGravity(9.81)),
                error("poisson-range", "half", m -> m.getMaterials().get(0).setPoisson(0.5),
                        m -> m.getMaterials().get(0).setPoisson(0.499)),
                error("poisson-range", "minus one", m -> m.getMaterials().get(0).setPoisson(-1),
                        m -> m.getMaterials().get(0).setPoisson(-0.99)),
                error("share-range", "local share", m -> m.getAudit().setLocalNodes(1.1), m -> m.getAudit().setLocalNodes(1)),
                warning("no-direction", "none chosen", m -> {
                    m.getAudit().setX(false);
                    m.getAudit().setY(false);
                }, m -> m.getAudit().setX(false)));
    }

    private static Stream<Case> members() {
        return Stream.of(
                error("member-ends-coincide", "same node twice", m -> m.getMembers().get(0).setEnd(m.getMembers().get(0).getStart()),
                        m -> m.getMembers().get(0).setEnd(m.getNodes().get(8))),
                error("member-zero-length", "nodes at one place", m -> m.getNodes().get(4).setZ(0), m -> m.getNodes().get(8).setZ(3)),
                error("member-zero-length", "offsets eat it up", m -> m.getMembers().get(0).setEndOffset(Fixtures.vector(0, 0, -3)),
                        m -> m.getMembers().get(0).setEndOffset(Fixtures.vector(0, 0, -2.9))),
                error("member-rigid-too-long", "both zones", m -> rigid(m, 1.5, 1.5), m -> rigid(m, 1.5, 1.49)),
                warning("release-repeated", "same component twice",
                        m -> ((InternalEList<Component>) m.getMembers().get(0).getEndFree())
                                .addAllUnique(List.of(Component.RY, Component.RY)),
                        m -> m.getMembers().get(0).getEndFree().addAll(List.of(Component.RY, Component.RZ))),
                warning("release-leaves-motion", "spins about its axis", m -> release(m, List.of(Component.RX), List.of(Component.RX)),
                        m -> release(m, List.of(Component.RX), List.of())),
                warning("release-leaves-motion", "slides along its axis", m -> release(m, List.of(Component.UX), List.of(Component.UX)),
                        m -> release(m, List.of(Component.UX), List.of(Component.RX))),
                warning("release-leaves-motion", "shifts sideways", m -> release(m, List.of(Component.UY), List.of(Component.UY)),
                        m -> release(m, List.of(Component.UY), List.of(Component.UZ))),
                warning("release-leaves-motion", "tilts", m -> release(m, List.of(Component.UZ, Component.RY), List.of(Component.RY)),
                        m -> release(m, List.of(Component.RZ, Component.RY), List.of(Component.RY, Component.RZ))));
    }

    private static Stream<Case> springs() {
        return Stream.of(
                error("spring-to-itself", "same node", m -> m.getSprings().get(0).setTo(m.getSprings().get(0).getNode()),
                        m -> m.getSprings().get(0).setTo(null)),
                error("spring-repeated-coupling-component", "ux with ux",
                        m -> m.getSprings().get(0).getCouplings().get(0).setSecond(Component.UX),
                        m -> m.getSprings().get(0).getCouplings().get(0).setSecond(Component.RY)),
                // sqrt(10 * 20) = 14.1421...
                error("spring-not-semidefinite", "coupling beyond the geometric mean", m -> coupling(m, 14.143), m -> coupling(m, 14.142)),
                error("spring-not-semidefinite", "coupling to a component without stiffness",
                        m -> m.getSprings().get(0).getCouplings().get(0).setSecond(Component.RZ), m -> coupling(m, 0)),
                error("spring-not-semidefinite", "three pairwise harmless couplings", m -> threeCouplings(m, -0.51),
                        m -> threeCouplings(m, -0.5)));
    }

    private static Stream<Case> constraints() {
        return Stream.of(
                error("support-repeated", "two on a node", m -> m.getSupports().get(1).setNode(m.getNodes().get(0)),
                        m -> m.getSupports().get(1).setNode(m.getNodes().get(8))),
                warning("support-elastic-on-held", "ux", m -> m.getSupports().get(0).setElasticUx(5),
                        m -> m.getSupports().get(0).setElasticRx(5)),
                error("floor-too-few-nodes", "one node", m -> retain(m, 1), m -> retain(m, 2)),
                warning("floor-node-repeated", "same node twice",
                        m -> ((InternalEList<Node>) floor(m).getNodes()).addUnique(floor(m).getNodes().get(0)),
                        m -> floor(m).getNodes().move(0, 2)),
                // size sqrt(32) = 5.66, so the limit is 5.66e-6; lifting one corner moves the plane of the other three by less than itself
                error("floor-not-coplanar", "one node lifted", m -> m.getNodes().get(6).setZ(3.0001),
                        m -> m.getNodes().get(6).setZ(3.000001)),
                warning("floor-line-not-horizontal", "vertical line", m -> floorOnLine(m, 0, 3), m -> floorOnLine(m, 3, 3)),
                error("link-to-itself", "same node", m -> link(m).setTo(link(m).getFrom()), m -> link(m).setTo(m.getNodes().get(7))),
                warning("link-component-repeated", "ux twice",
                        m -> ((InternalEList<Component>) link(m).getComponents()).addUnique(Component.UX),
                        m -> link(m).getComponents().add(Component.RX)),
                new Case("link-cyclic", INFO, "there and back", m -> addLink(m, link(m).getTo(), link(m).getFrom()),
                        m -> addLink(m, link(m).getTo(), m.getNodes().get(7))),
                error("tie-empty", "no term", m -> m.getTies().get(0).getTerms().clear(), m -> m.getTies().get(0).getTerms().remove(0)),
                warning("tie-term-repeated", "same component of a node twice",
                        m -> m.getTies().get(0).getTerms().get(1).setNode(m.getTies().get(0).getTerms().get(0).getNode()),
                        m -> m.getTies().get(0).getTerms().get(1).setNode(m.getNodes().get(8))));
    }

    /**
     * The beam's 5 kN/m over 4 m put 10 kN on each of its nodes, so 10 kN is what a node load may take away again; with a factor of 0.3.
     * The node's share of its members' own mass is 7.85 t/m3 times 0.01 m2 times (3 + 4 + 4) m / 2 = 0.43175 t, which is 4.2340 kN or
     * 14.113 kN before the factor; the tank of 2 t at the next node is 65.378 kN before it.
     */
    private static Stream<Case> masses() {
        return Stream.of(
                error("mass-negative", "node load", m -> nodeLoad(m, 0, 5, -10.001), m -> nodeLoad(m, 0, 5, -10)),
                error("mass-negative", "node load against own mass", m -> nodeLoad(m, 1, 5, -24.12), m -> nodeLoad(m, 1, 5, -24.11)),
                error("mass-negative", "node load against a nodal mass", m -> nodeLoad(m, 0, 6, -65.38), m -> nodeLoad(m, 0, 6, -65.37)),
                error("mass-negative", "line load", m -> lineLoad(m, -1e-9), m -> lineLoad(m, 0)));
    }

    @ParameterizedTest
    @MethodSource("cases")
    void triggeredByTheFaultAndNotByItsTwin(Case c) {
        StructuralModel faulty = Fixtures.sound();
        c.fault().accept(faulty);
        List<Defect> found = WellFormedness.check(faulty);
        Defect defect = found.stream().filter(d -> d.id().equals(c.id())).findFirst()
                .orElseThrow(() -> new AssertionError("found " + found));
        assertEquals(c.severity(), defect.severity());
        assertEquals(c.severity() != ERROR, WellFormedness.isComputable(found.stream().filter(d -> d.id().equals(c.id())).toList()));
        assertFalse(defect.text().isBlank() || defect.remedy().isBlank());
        assertTrue(defect.feature() == null || defect.object().eClass().getEAllStructuralFeatures().contains(defect.feature()));

        StructuralModel twin = Fixtures.sound();
        c.twin().accept(twin);
        assertEquals(List.of(), WellFormedness.check(twin));
    }

    @Test
    void soundModelHasNoDefect() {
        assertEquals(List.of(), WellFormedness.check(Fixtures.sound()));
    }

    @Test
    void emptyModelIsSaid() {
        List<Defect> found = WellFormedness.check(ModelFile.create("Nothing"));
        assertEquals(List.of("model-empty"), found.stream().map(Defect::id).toList());
    }

    @Test
    void everyCheckIsTriggeredByACase() {
        Set<String> covered = new TreeSet<>(cases().stream().map(Case::id).toList());
        covered.add("model-empty");
        assertEquals(new TreeSet<>(WellFormedness.checks()), covered);
    }

    @Test
    void quantitiesAreCalledByTheirNames() {
        StructuralModel model = Fixtures.sound();
        model.getMaterials().get(0).setYoung(0);
        model.getFrameSections().get(0).setShearAreaY(-1);
        model.getMembers().get(0).setBendingYFactor(-2);
        model.getMaterials().get(0).setPoisson(1);
        assertEquals(Set.of("The modulus of elasticity of material Steel is 0.0; it must be positive.",
                "Poisson's ratio of material Steel is 1.0; it must lie between -1 and 0.5.",
                "The shear area y of frame section Post is -1.0; it must not be negative.",
                "The factor of E Iy of member M1 is -2.0; it must not be negative."),
                WellFormedness.check(model).stream().map(Defect::text).collect(Collectors.toSet()));
    }

    /** (10 kN - 110 kN) times the factor 0.3 over 9.80665 m/s2 is -3.059 t. */
    @Test
    void aNegativeMassNamesPatternNodeAndLoad() {
        StructuralModel model = Fixtures.sound();
        nodeLoad(model, 0, 5, -110);
        Defect defect = WellFormedness.check(model).get(0);
        assertEquals("Gravity pattern Live gives node N6 a negative mass, -3.06 t.", defect.text());
        assertSame(model.getLoadPatterns().get(0).getLoads().get(0), defect.object());
    }

    /** What counts is the sum of all patterns: one may take away what another brings, and one without a factor takes nothing. */
    @Test
    void patternsMayTakeAwayWhatOthersBring() {
        StructuralModel model = Fixtures.sound();
        model.setSelfMassFactor(0);
        LoadPattern opening = StructureFactory.eINSTANCE.createLoadPattern();
        opening.setName("Opening");
        opening.setMassFactor(0.3);
        MemberLoad load = StructureFactory.eINSTANCE.createMemberLoad();
        load.setMember(model.getMembers().get(1));
        load.setValue(-5);
        opening.getLoads().add(load);
        model.getLoadPatterns().add(opening);
        assertEquals(List.of(), WellFormedness.check(model));
        load.setValue(-6);
        assertEquals(List.of("mass-negative"), WellFormedness.check(model).stream().map(Defect::id).toList());
        opening.setMassFactor(0);
        assertEquals(List.of(), WellFormedness.check(model));
    }

    @Test
    void redundantConstraintsAreComputable() {
        StructuralModel model = Fixtures.sound();
        addLink(model, model.getNodes().get(4), model.getNodes().get(5));
        addLink(model, model.getNodes().get(5), model.getNodes().get(4));
        assertTrue(WellFormedness.isComputable(WellFormedness.check(model)));
    }

    private static EObject load(StructuralModel m) {
        return m.getLoadPatterns().get(0).getLoads().get(0);
    }

    private static void nodeLoad(StructuralModel m, double selfMassFactor, int node, double force) {
        m.setSelfMassFactor(selfMassFactor);
        NodeLoad load = (NodeLoad) m.getLoadPatterns().get(0).getLoads().get(0);
        load.setNode(m.getNodes().get(node));
        load.setValue(force);
    }

    private static void lineLoad(StructuralModel m, double forcePerLength) {
        m.setSelfMassFactor(0);
        m.getLoadPatterns().get(0).getLoads().get(1).setValue(forcePerLength);
    }

    private static void level(StructuralModel m, double elevation) {
        Level level = StructureFactory.eINSTANCE.createLevel();
        level.setName("Other");
        level.setElevation(elevation);
        m.getLevels().add(level);
    }

    private static void barsWithoutSecondMoment(StructuralModel m) {
        m.getMembers().forEach(member -> member.setAxialOnly(true));
        m.getFrameSections().get(0).setIy(0);
        m.getFrameSections().get(0).setIz(0);
        m.getFrameSections().get(0).setTorsion(0);
    }

    private static void rigid(StructuralModel m, double start, double end) {
        m.getMembers().get(0).setStartRigid(start);
        m.getMembers().get(0).setEndRigid(end);
    }

    private static void release(StructuralModel m, List<Component> start, List<Component> end) {
        Member member = m.getMembers().get(0);
        member.getStartFree().addAll(start);
        member.getEndFree().addAll(end);
    }

    private static void coupling(StructuralModel m, double stiffness) {
        m.getSprings().get(0).getCouplings().get(0).setStiffness(stiffness);
    }

    /** Unit diagonal, equal couplings c: eigenvalues 1 - c, 1 - c, 1 + 2c. */
    private static void threeCouplings(StructuralModel m, double c) {
        Spring spring = m.getSprings().get(0);
        spring.setUx(1);
        spring.setUy(1);
        spring.setUz(1);
        spring.getCouplings().clear();
        couple(spring, Component.UX, Component.UY, c);
        couple(spring, Component.UY, Component.UZ, c);
        couple(spring, Component.UZ, Component.UX, c);
    }

    private static void couple(Spring spring, Component first, Component second, double stiffness) {
        SpringCoupling coupling = StructureFactory.eINSTANCE.createSpringCoupling();
        coupling.setFirst(first);
        coupling.setSecond(second);
        coupling.setStiffness(stiffness);
        spring.getCouplings().add(coupling);
    }

    private static RigidFloor floor(StructuralModel m) {
        return m.getRigidFloors().get(0);
    }

    private static void retain(StructuralModel m, int count) {
        floor(m).getNodes().retainAll(List.copyOf(floor(m).getNodes().subList(0, count)));
    }

    private static void floorOnLine(StructuralModel m, double firstZ, double secondZ) {
        floor(m).getNodes().clear();
        floor(m).getNodes().add(Fixtures.node(m, 9, 9, firstZ));
        floor(m).getNodes().add(Fixtures.node(m, firstZ == secondZ ? 10 : 9, 9, secondZ));
    }

    private static RigidLink link(StructuralModel m) {
        return m.getRigidLinks().get(0);
    }

    private static void addLink(StructuralModel m, Node from, Node to) {
        RigidLink link = StructureFactory.eINSTANCE.createRigidLink();
        link.setName("Link " + m.getRigidLinks().size());
        link.setFrom(from);
        link.setTo(to);
        m.getRigidLinks().add(link);
    }
}
