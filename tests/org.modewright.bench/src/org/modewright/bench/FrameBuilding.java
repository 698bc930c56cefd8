package org.modewright.bench;

import org.modewright.model.ModelFile;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.UnitSystem;

/**
 * A plain frame building: a column at every crossing of the lines in plan, beams along the lines at every storey, all joints rigid,
 * columns held at their feet. Six degrees of freedom per joint above the ground.
 *
 * @param linesX lines of columns along X
 * @param linesY lines of columns along Y
 * @param storeys number of storeys
 */
record FrameBuilding(int linesX, int linesY, int storeys) {

    private static final StructureFactory FACTORY = StructureFactory.eINSTANCE;
    private static final double BAY_X = 6.0;
    private static final double BAY_Y = 5.0;
    private static final double STOREY = 3.5;

    /** A building with about so many degrees of freedom: about as many storeys as lines along X, three quarters as many along Y. */
    static FrameBuilding withDegreesOfFreedom(int wanted) {
        double joints = wanted / 6.0;
        int linesX = Math.max(2, (int) Math.round(Math.cbrt(joints / 0.75)));
        int linesY = Math.max(2, (int) Math.round(0.75 * linesX));
        int storeys = Math.max(1, (int) Math.round(joints / (linesX * linesY)));
        return new FrameBuilding(linesX, linesY, storeys);
    }

    int degreesOfFreedom() {
        return 6 * linesX * linesY * storeys;
    }

    int members() {
        return storeys * (linesX * linesY + (linesX - 1) * linesY + linesX * (linesY - 1));
    }

    /** The model, with consistent mass. */
    StructuralModel model() {
        StructuralModel model = ModelFile.create("Frame building");
        model.setUnits(UnitSystem.NEWTON_METRE);
        Material concrete = concrete(model);
        FrameSection column = section(model, "Column", 0.16, 2.1e-3, 2.1e-3, 3.6e-3);
        FrameSection beam = section(model, "Beam", 0.15, 3.1e-3, 1.1e-3, 2.8e-3);
        Node[] below = level(model, 0);
        for (Node foot : below) {
            hold(model, foot);
        }
        for (int storey = 1; storey <= storeys; storey++) {
            Node[] level = level(model, storey);
            addStorey(model, below, level, column, beam, concrete);
            below = level;
        }
        return model;
    }

    private void addStorey(StructuralModel model, Node[] below, Node[] level, FrameSection column, FrameSection beam, Material material) {
        for (int at = 0; at < level.length; at++) {
            member(model, below[at], level[at], column, material);
            if (at % linesX + 1 < linesX) {
                member(model, level[at], level[at + 1], beam, material);
            }
            if (at + linesX < level.length) {
                member(model, level[at], level[at + linesX], beam, material);
            }
        }
    }

    private Node[] level(StructuralModel model, int storey) {
        Node[] level = new Node[linesX * linesY];
        for (int at = 0; at < level.length; at++) {
            Node node = named(FACTORY.createNode(), "n" + (model.getNodes().size() + 1));
            node.setX(at % linesX * BAY_X);
            node.setY(at / linesX * BAY_Y);
            node.setZ(storey * STOREY);
            model.getNodes().add(node);
            level[at] = node;
        }
        return level;
    }

    private static void hold(StructuralModel model, Node node) {
        Support support = named(FACTORY.createSupport(), "h" + node.getId());
        support.setNode(node);
        support.setUx(true);
        support.setUy(true);
        support.setUz(true);
        support.setRx(true);
        support.setRy(true);
        support.setRz(true);
        model.getSupports().add(support);
    }

    private static void member(StructuralModel model, Node start, Node end, FrameSection section, Material material) {
        Member member = named(FACTORY.createMember(), "m" + (model.getMembers().size() + 1));
        member.setStart(start);
        member.setEnd(end);
        member.setSection(section);
        member.setMaterial(material);
        model.getMembers().add(member);
    }

    private static Material concrete(StructuralModel model) {
        Material concrete = named(FACTORY.createMaterial(), "Concrete");
        concrete.setYoung(30e9);
        concrete.setPoisson(0.2);
        concrete.setDensity(2500);
        model.getMaterials().add(concrete);
        return concrete;
    }

    private static FrameSection section(StructuralModel model, String name, double area, double iy, double iz, double torsion) {
        FrameSection section = named(FACTORY.createFrameSection(), name);
        section.setArea(area);
        section.setIy(iy);
        section.setIz(iz);
        section.setTorsion(torsion);
        model.getFrameSections().add(section);
        return section;
    }

    private static <T extends Identified> T named(T object, String name) {
        object.setId(name);
        object.setName(name);
        return object;
    }
}
