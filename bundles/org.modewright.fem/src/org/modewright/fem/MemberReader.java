package org.modewright.fem;

import java.util.List;
import java.util.Map;

import org.modewright.model.Quantity;
import org.modewright.model.Units;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.MassFormulation;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;

/** Reads members of a well-formed model, converting to SI units. */
final class MemberReader {

    private final StructuralModel model;
    private final Units units;
    private final List<NodePoint> nodes;
    private final Map<Node, Integer> index;

    MemberReader(StructuralModel model, Units units, List<NodePoint> nodes, Map<Node, Integer> index) {
        this.model = model;
        this.units = units;
        this.nodes = nodes;
        this.index = index;
    }

    FrameElement read(Member member) {
        int start = index.get(member.getStart());
        int end = index.get(member.getEnd());
        MemberEnd atStart = new MemberEnd(SnapshotReader.components(member.getStartFree()),
                member.getStartRigid() * units.toSi(Quantity.LENGTH), SnapshotReader.vector(member.getStartOffset(), units));
        MemberEnd atEnd = new MemberEnd(SnapshotReader.components(member.getEndFree()),
                member.getEndRigid() * units.toSi(Quantity.LENGTH), SnapshotReader.vector(member.getEndOffset(), units));
        double[] axis = axis(nodes.get(start).position(), atStart.offset(), nodes.get(end).position(), atEnd.offset());
        double length = Math.sqrt(axis[0] * axis[0] + axis[1] * axis[1] + axis[2] * axis[2]);
        return new FrameElement(member.getId(), member.getName(), start, end, SnapshotReader.nameOf(member.getGroup()),
                SnapshotReader.nameOf(member.getSection()), SnapshotReader.nameOf(member.getMaterial()), length,
                LocalAxes.of(axis, Math.toRadians(member.getRoll())), stiffness(member), inertia(member), atStart, atEnd,
                member.isAxialOnly(), member.getAxialForce() * units.toSi(Quantity.FORCE), isLumped(member));
    }

    private static double[] axis(double[] start, double[] startOffset, double[] end, double[] endOffset) {
        double[] axis = new double[3];
        for (int i = 0; i < 3; i++) {
            axis[i] = (end[i] - start[i]) + (endOffset[i] - startOffset[i]);
        }
        return axis;
    }

    private MemberStiffness stiffness(Member member) {
        FrameSection section = member.getSection();
        Material material = member.getMaterial();
        double young = material.getYoung() * units.toSi(Quantity.STRESS);
        double shear = material.getShear() > 0.0
                ? material.getShear() * units.toSi(Quantity.STRESS)
                : young / (2.0 * (1.0 + material.getPoisson()));
        double area = units.toSi(Quantity.AREA);
        double secondMoment = units.toSi(Quantity.SECOND_MOMENT);
        return new MemberStiffness(member.getAxialFactor() * young * section.getArea() * area,
                shearStiffness(member.getShearYFactor() * shear * area, section.getShearAreaY()),
                shearStiffness(member.getShearZFactor() * shear * area, section.getShearAreaZ()),
                member.getTorsionFactor() * shear * section.getTorsion() * secondMoment,
                member.getBendingYFactor() * young * section.getIy() * secondMoment,
                member.getBendingZFactor() * young * section.getIz() * secondMoment);
    }

    private double shearStiffness(double perArea, double shearArea) {
        return model.isShearDeformation() && shearArea > 0.0 ? perArea * shearArea : Double.POSITIVE_INFINITY;
    }

    private MemberInertia inertia(Member member) {
        FrameSection section = member.getSection();
        double density = model.getSelfMassFactor() * member.getMaterial().getDensity() * units.toSi(Quantity.DENSITY);
        double secondMoment = units.toSi(Quantity.SECOND_MOMENT);
        return new MemberInertia(density * section.getArea() * units.toSi(Quantity.AREA), density * section.getIy() * secondMoment,
                density * section.getIz() * secondMoment);
    }

    private boolean isLumped(Member member) {
        return member.getMass() == MemberMass.LUMPED
                || member.getMass() == MemberMass.INHERIT && model.getMassFormulation() == MassFormulation.LUMPED;
    }
}
