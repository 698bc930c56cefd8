package org.modewright.exchange.samples;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import org.modewright.model.Ids;
import org.modewright.model.ModelFile;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Group;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.UnitSystem;

/** Builds a structural model by the names of its parts. */
final class ModelBuilder {

    private static final StructureFactory FACTORY = StructureFactory.eINSTANCE;
    private static final MathContext FOUR_FIGURES = new MathContext(4);

    private final StructuralModel model;
    private final Map<String, Node> nodes = new HashMap<>();
    private final Map<String, Group> groups = new HashMap<>();
    private final Map<String, LoadPattern> patterns = new HashMap<>();

    ModelBuilder(String name, String title, String units, String notes) {
        model = ModelFile.create(name);
        model.setTitle(title);
        model.setUnits(UnitSystem.get(units));
        model.setNotes(notes);
    }

    StructuralModel model() {
        Ids.assignMissing(model);
        return model;
    }

    Node node(String name, double x, double y, double z) {
        Node node = FACTORY.createNode();
        node.setName(name);
        node.setX(x);
        node.setY(y);
        node.setZ(z);
        model.getNodes().add(node);
        nodes.put(name, node);
        return node;
    }

    /** The node of a name, or null. */
    Node node(String name) {
        return nodes.get(name);
    }

    Material material(String name, double young, double poisson, double density) {
        Material material = FACTORY.createMaterial();
        material.setName(name);
        material.setYoung(young);
        material.setPoisson(poisson);
        material.setDensity(density);
        model.getMaterials().add(material);
        return material;
    }

    FrameSection section(String name, double area, double iy, double iz, double torsion) {
        FrameSection section = FACTORY.createFrameSection();
        section.setName(name);
        section.setArea(area);
        section.setIy(iy);
        section.setIz(iz);
        section.setTorsion(torsion);
        model.getFrameSections().add(section);
        return section;
    }

    /** Welded I-section of three plates, without fillets: web h by tw between flanges b by tf. */
    FrameSection iSection(String name, double h, double b, double tw, double tf) {
        double web = h - 2 * tf;
        FrameSection section = section(name, rounded(2 * b * tf + web * tw),
                rounded((b * h * h * h - (b - tw) * web * web * web) / 12),
                rounded((2 * tf * b * b * b + web * tw * tw * tw) / 12),
                rounded((2 * b * tf * tf * tf + web * tw * tw * tw) / 3));
        section.setShearAreaY(rounded(2 * b * tf * 5 / 6));
        section.setShearAreaZ(rounded(h * tw));
        return section;
    }

    /** Round tube of outer diameter d and thickness t. */
    FrameSection tube(String name, double d, double t) {
        double inner = d - 2 * t;
        double second = Math.PI / 64 * (Math.pow(d, 4) - Math.pow(inner, 4));
        FrameSection section = section(name, rounded(Math.PI / 4 * (d * d - inner * inner)), rounded(second), rounded(second),
                rounded(2 * second));
        section.setShearAreaY(rounded(section.getArea() / 2));
        section.setShearAreaZ(rounded(section.getArea() / 2));
        return section;
    }

    private static double rounded(double value) {
        return new BigDecimal(value).round(FOUR_FIGURES).doubleValue();
    }

    Member member(String name, String start, String end, FrameSection section, Material material, String group) {
        Member member = FACTORY.createMember();
        member.setName(name);
        member.setStart(required(start));
        member.setEnd(required(end));
        member.setSection(section);
        member.setMaterial(material);
        member.setGroup(group == null ? null : groups.computeIfAbsent(group, this::group));
        model.getMembers().add(member);
        return member;
    }

    Member bar(String name, String start, String end, FrameSection section, Material material, String group) {
        Member member = member(name, start, end, section, material, group);
        member.setAxialOnly(true);
        return member;
    }

    private Group group(String name) {
        Group group = FACTORY.createGroup();
        group.setName(name);
        model.getGroups().add(group);
        return group;
    }

    /** Holds the components that are named, such as {@code ux uy}. */
    void support(String node, String held) {
        Support support = FACTORY.createSupport();
        List<String> words = List.of(held.split(" "));
        support.setName(node);
        support.setNode(required(node));
        support.setUx(words.contains("ux"));
        support.setUy(words.contains("uy"));
        support.setUz(words.contains("uz"));
        support.setRx(words.contains("rx"));
        support.setRy(words.contains("ry"));
        support.setRz(words.contains("rz"));
        model.getSupports().add(support);
    }

    void mass(String node, double x, double y, double z) {
        NodalMass mass = FACTORY.createNodalMass();
        mass.setName(node);
        mass.setNode(required(node));
        mass.setUx(x);
        mass.setUy(y);
        mass.setUz(z);
        model.getMasses().add(mass);
    }

    void spring(String name, String node, String to, double ux) {
        Spring spring = FACTORY.createSpring();
        spring.setName(name);
        spring.setNode(required(node));
        spring.setTo(to == null ? null : required(to));
        spring.setUx(ux);
        model.getSprings().add(spring);
    }

    void floor(String name, List<Node> floorNodes) {
        RigidFloor floor = FACTORY.createRigidFloor();
        floor.setName(name);
        floor.getNodes().addAll(floorNodes);
        model.getRigidFloors().add(floor);
    }

    void link(String name, String from, String to, Component... components) {
        RigidLink link = FACTORY.createRigidLink();
        link.setName(name);
        link.setFrom(required(from));
        link.setTo(required(to));
        link.getComponents().addAll(Arrays.asList(components));
        model.getRigidLinks().add(link);
    }

    void level(String name, double elevation) {
        Level level = FACTORY.createLevel();
        level.setName(name);
        level.setElevation(elevation);
        model.getLevels().add(level);
    }

    void pattern(String name, double massFactor) {
        LoadPattern pattern = FACTORY.createLoadPattern();
        pattern.setName(name);
        pattern.setMassFactor(massFactor);
        model.getLoadPatterns().add(pattern);
        patterns.put(name, pattern);
    }

    void lineLoad(String pattern, Member member, double value) {
        MemberLoad load = FACTORY.createMemberLoad();
        load.setMember(member);
        load.setValue(value);
        patterns.get(pattern).getLoads().add(load);
    }

    void selfMassFactor(double factor) {
        model.setSelfMassFactor(factor);
    }

    /** Judges only these directions. */
    void judge(boolean x, boolean y, boolean z) {
        model.getAudit().setX(x);
        model.getAudit().setY(y);
        model.getAudit().setZ(z);
    }

    private Node required(String name) {
        Node node = nodes.get(name);
        if (node == null) {
            throw new IllegalArgumentException("There is no node " + name + ".");
        }
        return node;
    }
}
