package org.modewright.audit;

import java.util.HashMap;
import java.util.Map;
import org.modewright.fem.Snapshot;
import org.modewright.model.Ids;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Group;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.MassFormulation;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.UnitSystem;

/** Builds small structures for tests, in N, m and kg. */
final class Structures {

    private static final StructureFactory FACTORY = StructureFactory.eINSTANCE;

    private final StructuralModel model = FACTORY.createStructuralModel();
    private final Map<String, Node> nodes = new HashMap<>();

    Structures(String name) {
        model.setName(name);
        model.setUnits(UnitSystem.NEWTON_METRE);
    }

    /** A chain of masses (kg) on springs (N/m) along X from the ground, the nodes one above the other; nothing else can move. */
    static Structures chain(double[] masses, double[] stiffnesses) {
        Structures structures = new Structures("chain");
        structures.node("base", 0, 0, 0).support("base", "ux uy uz rx ry rz");
        String below = "base";
        for (int i = 0; i < masses.length; i++) {
            String floor = "floor " + (i + 1);
            structures.node(floor, 0, 0, 3.0 * (i + 1)).support(floor, "uy uz rx ry rz").mass(floor, masses[i], 0, 0, 0, 0, 0);
            structures.spring("storey " + (i + 1), below, floor, stiffnesses[i], 0, 0, 0, 0, 0);
            below = floor;
        }
        return structures;
    }

    Structures node(String name, double x, double y, double z) {
        Node node = FACTORY.createNode();
        node.setName(name);
        node.setX(x);
        node.setY(y);
        node.setZ(z);
        model.getNodes().add(node);
        nodes.put(name, node);
        return this;
    }

    Node node(String name) {
        return nodes.get(name);
    }

    Structures support(String node, String held) {
        Support support = FACTORY.createSupport();
        support.setName("support " + node);
        support.setNode(nodes.get(node));
        support.setUx(held.contains("ux"));
        support.setUy(held.contains("uy"));
        support.setUz(held.contains("uz"));
        support.setRx(held.contains("rx"));
        support.setRy(held.contains("ry"));
        support.setRz(held.contains("rz"));
        model.getSupports().add(support);
        return this;
    }

    Structures mass(String node, double... components) {
        NodalMass mass = FACTORY.createNodalMass();
        mass.setName("mass " + (model.getMasses().size() + 1));
        mass.setNode(nodes.get(node));
        mass.setUx(components[0]);
        mass.setUy(components[1]);
        mass.setUz(components[2]);
        mass.setRx(components[3]);
        mass.setRy(components[4]);
        mass.setRz(components[5]);
        model.getMasses().add(mass);
        return this;
    }

    Structures spring(String name, String node, String to, double... stiffness) {
        Spring spring = FACTORY.createSpring();
        spring.setName(name);
        spring.setNode(nodes.get(node));
        spring.setTo(to == null ? null : nodes.get(to));
        spring.setUx(stiffness[0]);
        spring.setUy(stiffness[1]);
        spring.setUz(stiffness[2]);
        spring.setRx(stiffness[3]);
        spring.setRy(stiffness[4]);
        spring.setRz(stiffness[5]);
        model.getSprings().add(spring);
        return this;
    }

    Structures material(String name, double young, double poisson, double density) {
        Material material = FACTORY.createMaterial();
        material.setName(name);
        material.setYoung(young);
        material.setPoisson(poisson);
        material.setDensity(density);
        model.getMaterials().add(material);
        return this;
    }

    Structures section(String name, double area, double iy, double iz, double torsion) {
        FrameSection section = FACTORY.createFrameSection();
        section.setName(name);
        section.setArea(area);
        section.setIy(iy);
        section.setIz(iz);
        section.setTorsion(torsion);
        model.getFrameSections().add(section);
        return this;
    }

    /** A member of the last section and material. */
    Member member(String name, String start, String end) {
        Member member = FACTORY.createMember();
        member.setName(name);
        member.setStart(nodes.get(start));
        member.setEnd(nodes.get(end));
        member.setSection(model.getFrameSections().get(model.getFrameSections().size() - 1));
        member.setMaterial(model.getMaterials().get(model.getMaterials().size() - 1));
        model.getMembers().add(member);
        return member;
    }

    Structures with(String name, String start, String end) {
        member(name, start, end);
        return this;
    }

    static void free(Member member, boolean atStart, Component... components) {
        for (Component component : components) {
            (atStart ? member.getStartFree() : member.getEndFree()).add(component);
        }
    }

    Structures floor(String name, String... members) {
        RigidFloor floor = FACTORY.createRigidFloor();
        floor.setName(name);
        for (String member : members) {
            floor.getNodes().add(nodes.get(member));
        }
        model.getRigidFloors().add(floor);
        return this;
    }

    /**
     * A frame building of 2 by 2 bays with rigid floors, stiffest round the perimeter, so that it sways before it twists; node
     * {@code n<level><0..8>}, columns {@code c}, beams {@code x} and {@code y}.
     */
    static Structures building(int storeys) {
        Structures s = new Structures("building").material("concrete", 3e10, 0.2, 2500);
        for (int level = 0; level <= storeys; level++) {
            for (int i = 0; i < 9; i++) {
                String name = "n" + level + i;
                s.node(name, (i % 3) * 6.0, (i / 3) * 5.0, 3.5 * level);
                if (level == 0) {
                    s.support(name, "ux uy uz rx ry rz");
                } else {
                    boolean corner = i != 4 && i % 2 == 0;
                    s.section("column " + name, corner ? 0.25 : 0.09, corner ? 5e-3 : 7e-4, corner ? 8e-3 : 7e-4, corner ? 9e-3 : 1e-3);
                    s.with("c" + level + i, "n" + (level - 1) + i, name).mass(name, i == 4 ? 24000 : 9000, i == 4 ? 24000 : 9000, 9000, 0,
                            0, 0);
                }
            }
        }
        s.section("beam", 0.18, 5e-3, 2e-3, 2e-3);
        for (int level = 1; level <= storeys; level++) {
            String[] names = new String[9];
            for (int i = 0; i < 9; i++) {
                names[i] = "n" + level + i;
                if (i % 3 < 2) {
                    s.with("x" + level + i, names[i], "n" + level + (i + 1));
                }
                if (i < 6) {
                    s.with("y" + level + i, names[i], "n" + level + (i + 3));
                }
            }
            s.floor("floor " + level, names);
        }
        return s;
    }

    Structures link(String name, String from, String to) {
        RigidLink link = FACTORY.createRigidLink();
        link.setName(name);
        link.setFrom(nodes.get(from));
        link.setTo(nodes.get(to));
        model.getRigidLinks().add(link);
        return this;
    }

    Structures level(String name, double elevation) {
        Level level = FACTORY.createLevel();
        level.setName(name);
        level.setElevation(elevation);
        model.getLevels().add(level);
        return this;
    }

    Group group(String name) {
        Group group = FACTORY.createGroup();
        group.setName(name);
        model.getGroups().add(group);
        return group;
    }

    Structures lumped() {
        model.setMassFormulation(MassFormulation.LUMPED);
        return this;
    }

    StructuralModel model() {
        Ids.assignMissing(model);
        return model;
    }

    Snapshot snapshot() {
        return Snapshot.of(model());
    }

}
