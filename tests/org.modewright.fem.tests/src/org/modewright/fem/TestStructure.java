package org.modewright.fem;

import java.util.Arrays;

import org.modewright.model.ModelFile;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.MultiPointTie;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.NodeLoad;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.SpringCoupling;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.TieTerm;
import org.modewright.model.structure.UnitSystem;
import org.modewright.model.structure.Vector;
import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.EigenRequest;
import org.modewright.numerics.EigenSolvers;
import org.modewright.numerics.Progress;

/** Builds small structures for tests, in N, m and kg unless told otherwise, and solves them by the dense method. */
public final class TestStructure {

    public static final String ALL = "ux uy uz rx ry rz";
    /** Everything but motion in the x-y plane. */
    public static final String OUT_OF_XY = "uz rx ry";

    private static final StructureFactory FACTORY = StructureFactory.eINSTANCE;

    private final StructuralModel model = ModelFile.create("test");
    private int ids;

    public TestStructure() {
        this("N-m-kg");
    }

    public TestStructure(String units) {
        model.setUnits(UnitSystem.get(units));
    }

    public StructuralModel model() {
        return model;
    }

    private <T extends Identified> T named(T object) {
        ids++;
        object.setId("o" + ids);
        object.setName("o" + ids);
        return object;
    }

    public Node node(double x, double y, double z) {
        Node node = named(FACTORY.createNode());
        node.setX(x);
        node.setY(y);
        node.setZ(z);
        model.getNodes().add(node);
        return node;
    }

    public Material material(double young, double poisson, double density) {
        Material material = named(FACTORY.createMaterial());
        material.setYoung(young);
        material.setPoisson(poisson);
        material.setDensity(density);
        model.getMaterials().add(material);
        return material;
    }

    public FrameSection section(double area, double iy, double iz, double torsion, double shearY, double shearZ) {
        FrameSection section = named(FACTORY.createFrameSection());
        section.setArea(area);
        section.setIy(iy);
        section.setIz(iz);
        section.setTorsion(torsion);
        section.setShearAreaY(shearY);
        section.setShearAreaZ(shearZ);
        model.getFrameSections().add(section);
        return section;
    }

    public Member member(Node start, Node end, FrameSection section, Material material) {
        Member member = named(FACTORY.createMember());
        member.setStart(start);
        member.setEnd(end);
        member.setSection(section);
        member.setMaterial(material);
        model.getMembers().add(member);
        return member;
    }

    /** A straight line of equal members; the nodes from the first to the last. */
    public Node[] line(double[] from, double[] to, int members, FrameSection section, Material material) {
        return line(node(from[0], from[1], from[2]), node(to[0], to[1], to[2]), members, section, material);
    }

    public Node[] line(Node first, Node last, int members, FrameSection section, Material material) {
        Node[] nodes = new Node[members + 1];
        nodes[0] = first;
        nodes[members] = last;
        for (int i = 1; i < members; i++) {
            double share = (double) i / members;
            nodes[i] = node(first.getX() + share * (last.getX() - first.getX()), first.getY() + share * (last.getY() - first.getY()),
                    first.getZ() + share * (last.getZ() - first.getZ()));
        }
        for (int i = 0; i < members; i++) {
            member(nodes[i], nodes[i + 1], section, material);
        }
        return nodes;
    }

    /** Holds components of a node, on top of those held before. */
    public Support hold(Node node, String components) {
        Support support = model.getSupports().stream().filter(s -> s.getNode() == node).findFirst().orElse(null);
        if (support == null) {
            support = named(FACTORY.createSupport());
            support.setNode(node);
            model.getSupports().add(support);
        }
        support.setUx(support.isUx() || components.contains("ux"));
        support.setUy(support.isUy() || components.contains("uy"));
        support.setUz(support.isUz() || components.contains("uz"));
        support.setRx(support.isRx() || components.contains("rx"));
        support.setRy(support.isRy() || components.contains("ry"));
        support.setRz(support.isRz() || components.contains("rz"));
        return support;
    }

    public void holdAll(String components) {
        for (Node node : model.getNodes()) {
            hold(node, components);
        }
    }

    public static void release(Member member, String start, String end) {
        for (Component component : Component.values()) {
            if (start.contains(component.getLiteral())) {
                member.getStartFree().add(component);
            }
            if (end.contains(component.getLiteral())) {
                member.getEndFree().add(component);
            }
        }
    }

    public NodalMass mass(Node node, double translational) {
        return mass(node, translational, translational, translational, 0.0, 0.0, 0.0);
    }

    public NodalMass mass(Node node, double x, double y, double z, double rx, double ry, double rz) {
        NodalMass mass = named(FACTORY.createNodalMass());
        mass.setNode(node);
        mass.setUx(x);
        mass.setUy(y);
        mass.setUz(z);
        mass.setRx(rx);
        mass.setRy(ry);
        mass.setRz(rz);
        model.getMasses().add(mass);
        return mass;
    }

    public static Vector vector(double x, double y, double z) {
        Vector vector = FACTORY.createVector();
        vector.setX(x);
        vector.setY(y);
        vector.setZ(z);
        return vector;
    }

    /** A spring; to ground where `to` is null. */
    public Spring spring(Node node, Node to, double... stiffness) {
        double[] k = Arrays.copyOf(stiffness, 6);
        Spring spring = named(FACTORY.createSpring());
        spring.setNode(node);
        spring.setTo(to);
        spring.setUx(k[0]);
        spring.setUy(k[1]);
        spring.setUz(k[2]);
        spring.setRx(k[3]);
        spring.setRy(k[4]);
        spring.setRz(k[5]);
        model.getSprings().add(spring);
        return spring;
    }

    public static void couple(Spring spring, Component first, Component second, double stiffness) {
        SpringCoupling coupling = FACTORY.createSpringCoupling();
        coupling.setFirst(first);
        coupling.setSecond(second);
        coupling.setStiffness(stiffness);
        spring.getCouplings().add(coupling);
    }

    public RigidFloor floor(Node... nodes) {
        RigidFloor floor = named(FACTORY.createRigidFloor());
        floor.getNodes().addAll(Arrays.asList(nodes));
        model.getRigidFloors().add(floor);
        return floor;
    }

    public RigidLink link(Node from, Node to, Component... components) {
        RigidLink link = named(FACTORY.createRigidLink());
        link.setFrom(from);
        link.setTo(to);
        link.getComponents().addAll(Arrays.asList(components));
        model.getRigidLinks().add(link);
        return link;
    }

    public MultiPointTie tie() {
        MultiPointTie tie = named(FACTORY.createMultiPointTie());
        model.getTies().add(tie);
        return tie;
    }

    public static void term(MultiPointTie tie, Node node, Component component, double factor) {
        TieTerm term = FACTORY.createTieTerm();
        term.setNode(node);
        term.setComponent(component);
        term.setFactor(factor);
        tie.getTerms().add(term);
    }

    public Level level(String name, double elevation) {
        Level level = named(FACTORY.createLevel());
        level.setName(name);
        level.setElevation(elevation);
        model.getLevels().add(level);
        return level;
    }

    public LoadPattern pattern(String name, double factor) {
        LoadPattern pattern = named(FACTORY.createLoadPattern());
        pattern.setName(name);
        pattern.setMassFactor(factor);
        model.getLoadPatterns().add(pattern);
        return pattern;
    }

    public static void load(LoadPattern pattern, Node node, double force) {
        NodeLoad load = FACTORY.createNodeLoad();
        load.setNode(node);
        load.setValue(force);
        pattern.getLoads().add(load);
    }

    public static void load(LoadPattern pattern, Member member, double forcePerLength) {
        MemberLoad load = FACTORY.createMemberLoad();
        load.setMember(member);
        load.setValue(forcePerLength);
        pattern.getLoads().add(load);
    }

    public Snapshot snapshot() {
        return Snapshot.of(model);
    }

    public Assembly assemble() {
        return Assembly.of(snapshot(), Progress.NONE);
    }

    public EigenPairs pairs() {
        return pairs(assemble());
    }

    public static EigenPairs pairs(Assembly assembly) {
        return EigenSolvers.dense().open(new EigenProblem(assembly.stiffness(), assembly.mass()), Progress.NONE)
                .solve(new EigenRequest(Integer.MAX_VALUE, Double.POSITIVE_INFINITY), Progress.NONE);
    }

    /** Circular frequencies in rad/s, ascending; negative where the eigenvalue is. */
    public double[] circular() {
        return Arrays.stream(pairs().values()).map(value -> Math.copySign(Math.sqrt(Math.abs(value)), value)).toArray();
    }

    /** Frequencies in Hz, ascending. */
    public double[] hertz() {
        return Arrays.stream(circular()).map(omega -> omega / (2.0 * Math.PI)).toArray();
    }

    /** Effective mass of each mode in a direction as a share of the movable mass (of the rotary inertia for a rotation). */
    public static double[] effectiveShares(Assembly assembly, EigenPairs pairs, int direction) {
        MassLedger ledger = assembly.ledger();
        double[] load = assembly.massTimesRigid(direction, ledger.centre());
        double whole = direction < 3 ? ledger.movable()[direction] : ledger.rotary()[direction - 3];
        double[] shares = new double[pairs.count()];
        for (int mode = 0; mode < shares.length; mode++) {
            double participation = 0.0;
            for (int i = 0; i < load.length; i++) {
                participation += load[i] * pairs.vectors()[mode][i];
            }
            shares[mode] = participation * participation / whole;
        }
        return shares;
    }
}
