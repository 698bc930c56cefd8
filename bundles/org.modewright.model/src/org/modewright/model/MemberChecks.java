package org.modewright.model;

import java.util.EnumSet;
import java.util.List;
import java.util.Set;

import org.eclipse.emf.ecore.EAttribute;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;

/** Lengths, rigid zones and releases of members. */
final class MemberChecks {

    /** Below this share of the largest coordinate of its ends a length counts as zero: it is round-off. */
    private static final double ZERO_LENGTH = 1e-9;

    private final StructuralModel model;
    private final DefectList defects;

    MemberChecks(StructuralModel model, DefectList defects) {
        this.model = model;
        this.defects = defects;
    }

    void run() {
        for (Member member : model.getMembers()) {
            if (member.getStart() != null && member.getEnd() != null) {
                checkLength(member);
            }
            checkRepeated(member, StructurePackage.Literals.MEMBER__START_FREE, member.getStartFree());
            checkRepeated(member, StructurePackage.Literals.MEMBER__END_FREE, member.getEndFree());
            checkMotion(member);
        }
    }

    private void checkLength(Member member) {
        if (member.getStart() == member.getEnd()) {
            defects.error("member-ends-coincide", member, StructurePackage.Literals.MEMBER__END,
                    ReferenceChecks.sentenceStart(member) + " starts and ends at the same node.", "Choose two nodes or delete the member.");
            return;
        }
        double[] start = Geometry.end(member.getStart(), member.getStartOffset());
        double[] end = Geometry.end(member.getEnd(), member.getEndOffset());
        double length = Geometry.distance(start, end);
        double tolerance = ZERO_LENGTH * Math.max(Geometry.largest(start), Geometry.largest(end));
        double rigid = member.getStartRigid() + member.getEndRigid();
        if (length <= tolerance) {
            defects.error("member-zero-length", member, null, ReferenceChecks.sentenceStart(member) + " has no length.",
                    "Move one of its nodes, or join the two nodes and delete the member.");
        } else if (length - rigid <= tolerance) {
            defects.error("member-rigid-too-long", member, StructurePackage.Literals.MEMBER__START_RIGID,
                    "The rigid zones of " + Names.describe(member) + " are " + rigid + " long together; the member has a length of "
                            + length + ".",
                    "Shorten the rigid zones, or use a rigid link instead of the member.");
        }
    }

    private void checkRepeated(Member member, EAttribute feature, List<Component> released) {
        if (released.size() != Set.copyOf(released).size()) {
            defects.warning("release-repeated", member, feature,
                    "The " + Names.describe(feature) + " of " + Names.describe(member) + " name a component twice.", "Remove the repetition.");
        }
    }

    /**
     * A released end moves without resistance where both ends are free along or about the axis, where both are free across it, or where
     * more than two of the four components of a plane of bending are free.
     */
    private void checkMotion(Member member) {
        Set<Component> start = set(member.getStartFree());
        Set<Component> end = set(member.getEndFree());
        boolean along = both(start, end, Component.UX) || both(start, end, Component.RX);
        boolean across = both(start, end, Component.UY) || both(start, end, Component.UZ);
        boolean bending = free(start, end, Component.UZ, Component.RY) > 2 || free(start, end, Component.UY, Component.RZ) > 2;
        if (!member.isAxialOnly() && (along || across || bending)) {
            defects.warning("release-leaves-motion", member, StructurePackage.Literals.MEMBER__END_FREE,
                    "The releases of " + Names.describe(member) + " leave the member itself free to move between its ends.",
                    "Remove one of the releases.");
        }
    }

    private static Set<Component> set(List<Component> released) {
        return released.isEmpty() ? EnumSet.noneOf(Component.class) : EnumSet.copyOf(released);
    }

    private static boolean both(Set<Component> start, Set<Component> end, Component component) {
        return start.contains(component) && end.contains(component);
    }

    private static int free(Set<Component> start, Set<Component> end, Component across, Component about) {
        int count = 0;
        for (Set<Component> side : List.of(start, end)) {
            count += (side.contains(across) ? 1 : 0) + (side.contains(about) ? 1 : 0);
        }
        return count;
    }
}
