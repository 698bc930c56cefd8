package org.modewright.model.edit.commands;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Deque;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.modewright.model.edit.commands.References.Reference;
import org.modewright.model.structure.Grouped;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.TieTerm;

/**
 * The deletion of objects with all that cannot be without them: the members, springs, supports, masses, links, ties and loads of a
 * node, the loads of a member, the members of a section or material, a floor that is left with fewer than two nodes. Elements of a
 * deleted group stay, without a group.
 */
public final class Deletion {

    private static final int FEWEST_FLOOR_NODES = 2;

    private final EditingDomain domain;
    private final StructuralModel model;
    private final References references;
    private final int asked;
    private final Set<EObject> going = new LinkedHashSet<>();
    private final Deque<EObject> pending = new ArrayDeque<>();
    private final Map<RigidFloor, Set<Node>> leavingFloors = new LinkedHashMap<>();
    private final Set<Grouped> leavingGroups = new LinkedHashSet<>();

    Deletion(EditingDomain domain, StructuralModel model, Collection<? extends EObject> objects) {
        this.domain = domain;
        this.model = model;
        this.references = new References(model);
        for (EObject object : objects) {
            if (object == model || object.eContainer() == null) {
                throw new IllegalArgumentException(Texts.get("notDeletable"));
            }
            mark(object);
        }
        this.asked = going.size();
        while (!pending.isEmpty()) {
            references.to(pending.poll()).forEach(this::follow);
        }
    }

    private void mark(EObject object) {
        if (going.add(object)) {
            pending.add(object);
            object.eAllContents().forEachRemaining(pending::add);
        }
    }

    private void follow(Reference reference) {
        EObject source = reference.source();
        if (source instanceof RigidFloor floor) {
            leaveFloor(floor);
        } else if (reference.feature() == StructurePackage.Literals.GROUPED__GROUP) {
            leavingGroups.add((Grouped) source);
        } else {
            mark(source instanceof TieTerm ? source.eContainer() : source);
        }
    }

    private void leaveFloor(RigidFloor floor) {
        Set<Node> leaving = leavingFloors.computeIfAbsent(floor, k -> new LinkedHashSet<>());
        floor.getNodes().stream().filter(going::contains).forEach(leaving::add);
        if (floor.getNodes().stream().filter(n -> !leaving.contains(n)).distinct().count() < FEWEST_FLOOR_NODES) {
            mark(floor);
        }
    }

    /**
     * @return all objects that go: first those asked for, then those that depend on them
     */
    public List<EObject> objects() {
        return List.copyOf(going);
    }

    /**
     * @return the objects that go because others do
     */
    public List<EObject> dependants() {
        return new ArrayList<>(going).subList(asked, going.size());
    }

    /**
     * @return deletes all of {@link #objects()} as one act
     */
    public Command command() {
        Edit edit = new Edit(domain, model, Texts.get("delete", Texts.count(new ArrayList<>(going).subList(0, asked))));
        leavingFloors.forEach((floor, nodes) -> {
            if (!going.contains(floor)) {
                edit.set(floor, StructurePackage.Literals.RIGID_FLOOR__NODES,
                        floor.getNodes().stream().filter(n -> !nodes.contains(n)).toList());
            }
        });
        leavingGroups.stream().filter(g -> !going.contains(g)).forEach(g -> edit.set(g, StructurePackage.Literals.GROUPED__GROUP, null));
        edit.removeFromOwners(going.stream().filter(this::isHeldByOneThatStays).toList());
        return edit.toCommand();
    }

    private boolean isHeldByOneThatStays(EObject object) {
        for (EObject owner = object.eContainer(); owner != null; owner = owner.eContainer()) {
            if (going.contains(owner)) {
                return false;
            }
        }
        return true;
    }
}
