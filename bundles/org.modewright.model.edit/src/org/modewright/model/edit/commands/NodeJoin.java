package org.modewright.model.edit.commands;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EcorePackage;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.modewright.model.Names;
import org.modewright.model.edit.commands.References.Reference;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.Support;

/** Merges one node into another. */
final class NodeJoin {

    private final StructuralModel model;
    private final Node kept;
    private final Node merged;
    private final Edit edit;
    private final References references;
    private final Set<EObject> going = new LinkedHashSet<>();

    NodeJoin(EditingDomain domain, StructuralModel model, Node kept, Node merged) {
        if (kept == merged) {
            throw new IllegalArgumentException(Texts.get("joinSame"));
        }
        this.model = model;
        this.kept = kept;
        this.merged = merged;
        this.edit = new Edit(domain, model, Texts.get("join", Names.describe(merged), Names.describe(kept)));
        this.references = new References(model);
    }

    Command command() {
        List<Reference> toMerged = references.to(merged);
        for (Reference reference : toMerged) {
            if (vanishes(reference.source())) {
                drop(reference.source());
            } else {
                redirect(reference);
            }
        }
        going.add(merged);
        edit.removeFromOwners(going);
        return edit.toCommand();
    }

    /** An element from one of the two nodes to the other is left without ends that differ. */
    private boolean vanishes(EObject source) {
        if (source instanceof Member member) {
            return isPair(member.getStart(), member.getEnd());
        }
        if (source instanceof Spring spring) {
            return isPair(spring.getNode(), spring.getTo());
        }
        return source instanceof RigidLink link && isPair(link.getFrom(), link.getTo());
    }

    private boolean isPair(Node a, Node b) {
        return (a == kept || a == merged) && (b == kept || b == merged);
    }

    private void drop(EObject object) {
        going.add(object);
        for (Reference reference : references.to(object)) {
            if (reference.source() instanceof MemberLoad) {
                going.add(reference.source());
            }
        }
    }

    private void redirect(Reference reference) {
        if (reference.source() instanceof RigidFloor floor) {
            redirectFloor(floor);
        } else if (reference.source() instanceof Support support) {
            redirectSupport(support);
        } else {
            edit.set(reference.source(), reference.feature(), kept);
        }
    }

    private void redirectFloor(RigidFloor floor) {
        List<Node> nodes = new ArrayList<>(floor.getNodes());
        if (nodes.contains(kept)) {
            nodes.removeIf(n -> n == merged);
        } else {
            nodes.replaceAll(n -> n == merged ? kept : n);
        }
        if (nodes.size() < 2) {
            going.add(floor);
        } else {
            edit.set(floor, StructurePackage.Literals.RIGID_FLOOR__NODES, nodes);
        }
    }

    private void redirectSupport(Support support) {
        Support other = model.getSupports().stream().filter(s -> s.getNode() == kept).findFirst().orElse(null);
        if (other == null) {
            edit.set(support, StructurePackage.Literals.SUPPORT__NODE, kept);
            return;
        }
        for (EAttribute attribute : StructurePackage.Literals.SUPPORT.getEAttributes()) {
            edit.set(other, attribute, together(attribute, other.eGet(attribute), support.eGet(attribute)));
        }
        going.add(support);
    }

    /** What either holds is held; elastic stiffnesses act side by side. */
    private static Object together(EAttribute attribute, Object a, Object b) {
        if (attribute.getEAttributeType() == EcorePackage.Literals.EBOOLEAN) {
            return (Boolean) a || (Boolean) b;
        }
        return (Double) a + (Double) b;
    }
}
