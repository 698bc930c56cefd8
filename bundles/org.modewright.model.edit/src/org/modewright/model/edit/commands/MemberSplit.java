package org.modewright.model.edit.commands;

import java.util.List;

import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.modewright.model.Geometry;
import org.modewright.model.Ids;
import org.modewright.model.Names;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;

/** Splits a member in two at a node. */
final class MemberSplit {

    /** A node within this share of the member's length of its axis is on it. */
    private static final double ON_AXIS = 1e-3;

    private final StructuralModel model;
    private final Member member;
    private final Node at;
    private final Edit edit;

    MemberSplit(EditingDomain domain, StructuralModel model, Member member, Node at) {
        this.model = model;
        this.member = member;
        this.at = at;
        this.edit = new Edit(domain, model, Texts.get("split", Names.describe(member)));
        check();
    }

    private void check() {
        if (member.getStart() == null || member.getEnd() == null) {
            throw new IllegalArgumentException(Texts.get("splitNoEnds", Names.describe(member)));
        }
        double[] start = Geometry.end(member.getStart(), member.getStartOffset());
        double[] axis = Geometry.minus(Geometry.end(member.getEnd(), member.getEndOffset()), start);
        double[] toNode = Geometry.minus(Geometry.position(at), start);
        double length = Geometry.norm(axis);
        double along = Geometry.dot(toNode, axis) / length;
        double off = Math.sqrt(Math.max(0, Geometry.dot(toNode, toNode) - along * along));
        boolean between = along > member.getStartRigid() && length - along > member.getEndRigid() && off <= ON_AXIS * length;
        if (at == member.getStart() || at == member.getEnd() || !between) {
            throw new IllegalArgumentException(Texts.get("splitNotBetween", Names.describe(at), Names.describe(member)));
        }
    }

    Command command() {
        Member rest = EcoreUtil.copy(member);
        rest.setId(new Ids(model).next(member.eClass()));
        rest.setName(new Names(model).derived(member.eClass(), member.getName()));
        rest.setStart(at);
        rest.getStartFree().clear();
        rest.setStartRigid(0);
        rest.setStartOffset(null);
        edit.addAt(model, StructurePackage.Literals.STRUCTURAL_MODEL__MEMBERS, rest, model.getMembers().indexOf(member) + 1);
        edit.set(member, StructurePackage.Literals.MEMBER__END, at);
        edit.set(member, StructurePackage.Literals.MEMBER__END_RIGID, 0.0);
        edit.set(member, StructurePackage.Literals.MEMBER__END_OFFSET, null);
        if (!member.getEndFree().isEmpty()) {
            edit.set(member, StructurePackage.Literals.MEMBER__END_FREE, List.of());
        }
        copyLoads(rest);
        return edit.toCommand();
    }

    private void copyLoads(Member rest) {
        for (LoadPattern pattern : model.getLoadPatterns()) {
            int added = 0;
            for (int i = 0; i < pattern.getLoads().size(); i++) {
                if (pattern.getLoads().get(i) instanceof MemberLoad load && load.getMember() == member) {
                    MemberLoad copy = EcoreUtil.copy(load);
                    copy.setMember(rest);
                    added++;
                    edit.addAt(pattern, StructurePackage.Literals.LOAD_PATTERN__LOADS, copy, i + added);
                }
            }
        }
    }
}
