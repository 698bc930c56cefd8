package org.modewright.exchange.internal.tables;

import org.modewright.exchange.internal.tables.Row.Range;
import org.modewright.model.Geometry;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.StructureFactory;

/** Rows of materials, sections, members and springs. */
final class ElementTables {

    private static final StructureFactory FACTORY = StructureFactory.eINSTANCE;
    private static final double INCOMPRESSIBLE = 0.5;

    private final Import target;

    ElementTables(Import target) {
        this.target = target;
    }

    void material(Row row) {
        Material material = FACTORY.createMaterial();
        material.setName(row.requiredId("id"));
        material.setYoung(row.required("young", Range.POSITIVE));
        material.setPoisson(row.required("poisson", Range.NOT_NEGATIVE));
        material.setDensity(row.required("density", Range.POSITIVE));
        material.setShear(row.number("shear", Range.POSITIVE));
        if (material.getPoisson() >= INCOMPRESSIBLE) {
            row.problem("poisson", "Poisson's ratio must be below 0.5");
        }
        target.materials.declare(row, "id", material.getName(), material);
        target.from(row, material);
        target.model.getMaterials().add(material);
    }

    void frameSection(Row row) {
        FrameSection section = FACTORY.createFrameSection();
        section.setName(row.requiredId("id"));
        section.setArea(row.required("area", Range.POSITIVE));
        section.setIy(row.required("iy", Range.POSITIVE));
        section.setIz(row.required("iz", Range.POSITIVE));
        section.setTorsion(row.required("torsion", Range.POSITIVE));
        section.setShearAreaY(row.number("shear_area_y", Range.NOT_NEGATIVE));
        section.setShearAreaZ(row.number("shear_area_z", Range.NOT_NEGATIVE));
        target.sections.declare(row, "id", section.getName(), section);
        target.from(row, section);
        target.model.getFrameSections().add(section);
    }

    void member(Row row) {
        Member member = FACTORY.createMember();
        member.setName(row.requiredId("id"));
        member.setStart(target.nodes.required(row, "start"));
        member.setEnd(target.nodes.required(row, "end"));
        member.setSection(target.sections.required(row, "section"));
        member.setMaterial(target.materials.required(row, "material"));
        member.setRoll(row.number("roll", Range.ANY));
        member.getStartFree().addAll(Words.components(row, "start_free"));
        member.getEndFree().addAll(Words.components(row, "end_free"));
        member.setStartRigid(row.number("start_rigid", Range.NOT_NEGATIVE));
        member.setEndRigid(row.number("end_rigid", Range.NOT_NEGATIVE));
        member.setAxialOnly(row.flag("axial_only"));
        member.setAxialForce(row.number("axial_force", Range.ANY));
        member.setGroup(target.group(row));
        length(row, member);
        target.members.declare(row, "id", member.getName(), member);
        target.from(row, member);
        target.model.getMembers().add(member);
    }

    private static void length(Row row, Member member) {
        Node start = member.getStart();
        Node end = member.getEnd();
        if (start == null || end == null) {
            return;
        }
        double length = Geometry.distance(Geometry.position(start), Geometry.position(end));
        if (start == end || length == 0) {
            row.problem("end", start == end ? "the member ends at the node at which it starts"
                    : "the member has no length; its nodes coincide");
        } else if (member.getStartRigid() + member.getEndRigid() >= length) {
            row.problem(member.getStartRigid() > 0 ? "start_rigid" : "end_rigid",
                    "the rigid end zones take up the whole member; its length is " + length);
        }
    }

    void spring(Row row) {
        Spring spring = FACTORY.createSpring();
        spring.setName(row.requiredId("id"));
        spring.setNode(target.nodes.required(row, "node"));
        spring.setTo(target.nodes.optional(row, "to"));
        if (spring.getNode() != null && spring.getNode() == spring.getTo()) {
            row.problem("to", "the spring joins the node to itself; leave the cell blank for a spring to ground");
        }
        spring.setUx(row.number("ux", Range.NOT_NEGATIVE));
        spring.setUy(row.number("uy", Range.NOT_NEGATIVE));
        spring.setUz(row.number("uz", Range.NOT_NEGATIVE));
        spring.setRx(row.number("rx", Range.NOT_NEGATIVE));
        spring.setRy(row.number("ry", Range.NOT_NEGATIVE));
        spring.setRz(row.number("rz", Range.NOT_NEGATIVE));
        spring.setGroup(target.group(row));
        target.springs.declare(row, "id", spring.getName(), spring);
        target.from(row, spring);
        target.model.getSprings().add(spring);
    }
}
