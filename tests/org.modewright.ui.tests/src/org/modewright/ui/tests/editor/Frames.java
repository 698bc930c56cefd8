package org.modewright.ui.tests.editor;

import java.util.ArrayList;
import java.util.List;
import org.modewright.model.Ids;
import org.modewright.model.ModelFile;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.Support;

/** Regular frames of any size, in kN, m and t. */
final class Frames {

    private static final double BAY = 6;
    private static final double STOREY = 3.5;

    private Frames() {
    }

    /** One storey, one bay: four columns, four beams. */
    static StructuralModel small() {
        return grid(2, 2, 1);
    }

    /**
     * A frame of columns and beams on fixed supports.
     *
     * @param alongX columns along x
     * @param alongY columns along y
     * @param storeys storeys
     */
    static StructuralModel grid(int alongX, int alongY, int storeys) {
        StructuralModel model = ModelFile.create("frame");
        Material steel = StructureFactory.eINSTANCE.createMaterial();
        steel.setName("steel");
        steel.setYoung(2.1e8);
        steel.setPoisson(0.3);
        steel.setDensity(7.85);
        model.getMaterials().add(steel);
        model.getFrameSections().add(section("column", 0.02));
        model.getFrameSections().add(section("beam", 0.01));
        List<Node> nodes = new ArrayList<>();
        for (int level = 0; level <= storeys; level++) {
            for (int row = 0; row < alongY; row++) {
                for (int column = 0; column < alongX; column++) {
                    nodes.add(node("N" + nodes.size(), column * BAY, row * BAY, level * STOREY));
                }
            }
        }
        model.getNodes().addAll(nodes);
        int plan = alongX * alongY;
        List<Member> members = new ArrayList<>();
        for (int i = 0; i < nodes.size(); i++) {
            if (i + plan < nodes.size()) {
                members.add(member(model, "C" + i, nodes.get(i), nodes.get(i + plan), 0));
            }
            boolean ground = i < plan;
            if (!ground && i % alongX + 1 < alongX) {
                members.add(member(model, "X" + i, nodes.get(i), nodes.get(i + 1), 1));
            }
            if (!ground && i % plan / alongX + 1 < alongY) {
                members.add(member(model, "Y" + i, nodes.get(i), nodes.get(i + alongX), 1));
            }
        }
        model.getMembers().addAll(members);
        nodes.subList(0, plan).forEach(node -> model.getSupports().add(support(node)));
        Ids.assignMissing(model);
        return model;
    }

    private static FrameSection section(String name, double area) {
        FrameSection section = StructureFactory.eINSTANCE.createFrameSection();
        section.setName(name);
        section.setArea(area);
        section.setIy(2e-4);
        section.setIz(1e-4);
        section.setTorsion(1e-6);
        return section;
    }

    private static Node node(String name, double x, double y, double z) {
        Node node = StructureFactory.eINSTANCE.createNode();
        node.setName(name);
        node.setX(x);
        node.setY(y);
        node.setZ(z);
        return node;
    }

    private static Member member(StructuralModel model, String name, Node start, Node end, int section) {
        Member member = StructureFactory.eINSTANCE.createMember();
        member.setName(name);
        member.setStart(start);
        member.setEnd(end);
        member.setSection(model.getFrameSections().get(section));
        member.setMaterial(model.getMaterials().get(0));
        return member;
    }

    private static Support support(Node node) {
        Support support = StructureFactory.eINSTANCE.createSupport();
        support.setName("S" + node.getName());
        support.setNode(node);
        support.setUx(true);
        support.setUy(true);
        support.setUz(true);
        support.setRx(true);
        support.setRy(true);
        support.setRz(true);
        return support;
    }
}
