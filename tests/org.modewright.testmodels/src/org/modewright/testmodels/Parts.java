package org.modewright.testmodels;

import java.util.Arrays;
import java.util.List;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Group;
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
import org.modewright.model.structure.Vector;

/**
 * Adds parts to a model, each in one call; quantities in the model's own units. Components are named as in the files, such as {@code ux uy}.
 * Ids are left to the caller.
 */
public final class Parts {

    private static final StructureFactory FACTORY = StructureFactory.eINSTANCE;

    private final StructuralModel model;

    public Parts(StructuralModel model) {
        this.model = model;
    }

    public Node node(String name, double x, double y, double z) {
        Node node = FACTORY.createNode();
        node.setName(name);
        node.setX(x);
        node.setY(y);
        node.setZ(z);
        model.getNodes().add(node);
        return node;
    }

    public Material material(String name, double young, double poisson, double density) {
        Material material = FACTORY.createMaterial();
        material.setName(name);
        material.setYoung(young);
        material.setPoisson(poisson);
        material.setDensity(density);
        model.getMaterials().add(material);
        return material;
    }

    public FrameSection section(String name, double area, double iy, double iz, double torsion) {
        FrameSection section = FACTORY.createFrameSection();
        section.setName(name);
        section.setArea(area);
        section.setIy(iy);
        section.setIz(iz);
        section.setTorsion(torsion);
        model.getFrameSections().add(section);
        return section;
    }

    public Member member(String name, Node start, Node end, FrameSection section, Material material) {
        Member member = FACTORY.createMember();
        member.setName(name);
        member.setStart(start);
        member.setEnd(end);
        member.setSection(section);
        member.setMaterial(material);
        model.getMembers().add(member);
        return member;
    }

    /** Releases components at one end of a member. */
    public static void free(Member member, boolean atStart, Component... components) {
        (atStart ? member.getStartFree() : member.getEndFree()).addAll(Arrays.asList(components));
    }

    public Support support(String name, Node node, String held) {
        Support support = FACTORY.createSupport();
        support.setName(name);
        support.setNode(node);
        model.getSupports().add(support);
        hold(support, held);
        return support;
    }

    /** Holds components on top of those held before. */
    public static void hold(Support support, String held) {
        support.setUx(support.isUx() || held.contains("ux"));
        support.setUy(support.isUy() || held.contains("uy"));
        support.setUz(support.isUz() || held.contains("uz"));
        support.setRx(support.isRx() || held.contains("rx"));
        support.setRy(support.isRy() || held.contains("ry"));
        support.setRz(support.isRz() || held.contains("rz"));
    }

    /** A nodal mass; components that are not given are 0. */
    public NodalMass mass(String name, Node node, double... components) {
        double[] six = Arrays.copyOf(components, 6);
        NodalMass mass = FACTORY.createNodalMass();
        mass.setName(name);
        mass.setNode(node);
        mass.setUx(six[0]);
        mass.setUy(six[1]);
        mass.setUz(six[2]);
        mass.setRx(six[3]);
        mass.setRy(six[4]);
        mass.setRz(six[5]);
        model.getMasses().add(mass);
        return mass;
    }

    /** A spring, to ground where {@code to} is null; stiffnesses that are not given are 0. */
    public Spring spring(String name, Node node, Node to, double... stiffness) {
        double[] six = Arrays.copyOf(stiffness, 6);
        Spring spring = FACTORY.createSpring();
        spring.setName(name);
        spring.setNode(node);
        spring.setTo(to);
        spring.setUx(six[0]);
        spring.setUy(six[1]);
        spring.setUz(six[2]);
        spring.setRx(six[3]);
        spring.setRy(six[4]);
        spring.setRz(six[5]);
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

    public RigidFloor floor(String name, List<Node> nodes) {
        RigidFloor floor = FACTORY.createRigidFloor();
        floor.setName(name);
        floor.getNodes().addAll(nodes);
        model.getRigidFloors().add(floor);
        return floor;
    }

    /** A rigid link; without components it ties all six. */
    public RigidLink link(String name, Node from, Node to, Component... components) {
        RigidLink link = FACTORY.createRigidLink();
        link.setName(name);
        link.setFrom(from);
        link.setTo(to);
        link.getComponents().addAll(Arrays.asList(components));
        model.getRigidLinks().add(link);
        return link;
    }

    /** A tie without terms: the sum of factor times component, over the terms that follow, is zero. */
    public MultiPointTie tie(String name) {
        MultiPointTie tie = FACTORY.createMultiPointTie();
        tie.setName(name);
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

    public Group group(String name) {
        Group group = FACTORY.createGroup();
        group.setName(name);
        model.getGroups().add(group);
        return group;
    }

    public Level level(String name, double elevation) {
        Level level = FACTORY.createLevel();
        level.setName(name);
        level.setElevation(elevation);
        model.getLevels().add(level);
        return level;
    }

    public LoadPattern pattern(String name, double massFactor) {
        LoadPattern pattern = FACTORY.createLoadPattern();
        pattern.setName(name);
        pattern.setMassFactor(massFactor);
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

    public static Vector vector(double x, double y, double z) {
        Vector vector = FACTORY.createVector();
        vector.setX(x);
        vector.setY(y);
        vector.setZ(z);
        return vector;
    }
}
