package org.modewright.model.edit.commands;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Objects;

import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.EcorePackage;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.modewright.model.Ids;
import org.modewright.model.Names;
import org.modewright.model.Quantity;
import org.modewright.model.Units;
import org.modewright.model.structure.GravityLoad;
import org.modewright.model.structure.Group;
import org.modewright.model.structure.Grouped;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.UnitSystem;

/**
 * What a user does to a model, each act one command: one undo takes it back completely. The commands change nothing until they are
 * executed, and are to be executed on the model as it was when they were made. Where nothing would change the command cannot be executed,
 * and the stack ignores it.
 */
public final class StructureCommands {

    private final EditingDomain domain;
    private final StructuralModel model;

    /**
     * @param domain editing domain that holds the command stack
     * @param model  the model to edit
     */
    public StructureCommands(EditingDomain domain, StructuralModel model) {
        this.domain = Objects.requireNonNull(domain);
        this.model = Objects.requireNonNull(model);
    }

    /**
     * @param object a new object
     * @return adds it to the model; it gets an id and, where it has none, a name
     */
    public Command create(Identified object) {
        return create(List.of(object));
    }

    /**
     * @param objects new objects
     * @return adds them to the model, each to the list of its kind; they get ids and, where they have none, names
     */
    public Command create(Collection<? extends Identified> objects) {
        Edit edit = new Edit(domain, model, Texts.get("create", Texts.count(objects)));
        Ids ids = new Ids(model);
        Names names = new Names(model);
        for (Identified object : objects) {
            ids.assign(object);
            if (object.getName() == null || object.getName().isBlank()) {
                object.setName(names.next(object.eClass()));
            } else {
                names.take(object.eClass(), object.getName());
            }
        }
        edit.add(objects);
        return edit.toCommand();
    }

    /**
     * @param pattern a load pattern of the model
     * @param load    a new load
     * @return adds the load to the pattern
     */
    public Command create(LoadPattern pattern, GravityLoad load) {
        Edit edit = new Edit(domain, model, Texts.get("create", Texts.count(List.of(load))));
        edit.add(pattern, StructurePackage.Literals.LOAD_PATTERN__LOADS, List.of(load));
        return edit.toCommand();
    }

    /**
     * @param objects objects of the model
     * @return what goes if they are deleted, and the command that deletes it
     */
    public Deletion deletion(Collection<? extends EObject> objects) {
        return new Deletion(domain, model, objects);
    }

    /**
     * @param objects objects of the model
     * @return deletes them and all that cannot be without them
     * @see #deletion
     */
    public Command delete(Collection<? extends EObject> objects) {
        return deletion(objects).command();
    }

    /**
     * @param object an object of the model
     * @param name   its new name
     * @return renames the object
     * @throws IllegalArgumentException if the name is blank or taken by another object of the kind
     */
    public Command rename(Identified object, String name) {
        String trimmed = name == null ? "" : name.strip();
        if (trimmed.isEmpty()) {
            throw new IllegalArgumentException(Texts.get("nameBlank"));
        }
        if (!trimmed.equals(object.getName()) && !new Names(model).isFree(object.eClass(), trimmed)) {
            throw new IllegalArgumentException(Texts.get("nameTaken", trimmed));
        }
        Edit edit = new Edit(domain, model, Texts.get("rename", Names.describe(object)));
        edit.set(object, StructurePackage.Literals.IDENTIFIED__NAME, trimmed);
        return edit.toCommand();
    }

    /**
     * @param object  an object of the model
     * @param feature one of its features, not a containment list
     * @param value   its new value; null clears a reference
     * @return sets the value
     */
    public Command set(EObject object, EStructuralFeature feature, Object value) {
        return set(List.of(object), feature, value);
    }

    /**
     * @param objects objects of the model
     * @param feature a feature that all of them have, not a containment
     * @param value   its new value; null clears a reference
     * @return sets the value of all of them
     */
    public Command set(Collection<? extends EObject> objects, EStructuralFeature feature, Object value) {
        Edit edit = new Edit(domain, model, Texts.get("set", Texts.feature(feature)));
        for (EObject object : objects) {
            edit.set(object, feature, value);
        }
        return edit.toCommand();
    }

    /**
     * @param nodes nodes of the model
     * @param dx    shift in x, length
     * @param dy    shift in y, length
     * @param dz    shift in z, length
     * @return shifts the nodes
     */
    public Command moveNodes(Collection<Node> nodes, double dx, double dy, double dz) {
        Edit edit = new Edit(domain, model, Texts.get("move", Texts.count(nodes)));
        for (Node node : nodes) {
            place(edit, node, node.getX() + dx, node.getY() + dy, node.getZ() + dz);
        }
        return edit.toCommand();
    }

    /**
     * @param node a node of the model
     * @param x    its new coordinate x, length
     * @param y    its new coordinate y, length
     * @param z    its new coordinate z, length
     * @return places the node
     */
    public Command placeNode(Node node, double x, double y, double z) {
        Edit edit = new Edit(domain, model, Texts.get("move", Texts.count(List.of(node))));
        place(edit, node, x, y, z);
        return edit.toCommand();
    }

    private static void place(Edit edit, Node node, double x, double y, double z) {
        edit.set(node, StructurePackage.Literals.NODE__X, x);
        edit.set(node, StructurePackage.Literals.NODE__Y, y);
        edit.set(node, StructurePackage.Literals.NODE__Z, z);
    }

    /**
     * @param kept   node that stays where it is
     * @param merged node that goes; whatever refers to it refers to the kept node afterwards
     * @return joins the two; members, springs and links between them go, two supports become one
     * @throws IllegalArgumentException if the two are one
     */
    public Command joinNodes(Node kept, Node merged) {
        return new NodeJoin(domain, model, kept, merged).command();
    }

    /**
     * @param member a member of the model
     * @param at     a node on it
     * @return splits the member at the node: it keeps the part at its start, a new member takes the rest
     * @throws IllegalArgumentException if the node is not between the ends of the member, or inside a rigid zone
     */
    public Command splitMember(Member member, Node at) {
        return new MemberSplit(domain, model, member, at).command();
    }

    /**
     * @param elements elements of the model
     * @param group    their group from now on, or null for none
     * @return assigns the group
     */
    public Command assignGroup(Collection<? extends Grouped> elements, Group group) {
        Edit edit = new Edit(domain, model, Texts.get("assign", Texts.count(elements)));
        for (Grouped element : elements) {
            edit.set(element, StructurePackage.Literals.GROUPED__GROUP, group);
        }
        return edit.toCommand();
    }

    /**
     * @param objects objects of the model
     * @param dx      shift of the copied nodes in x, length
     * @param dy      shift of the copied nodes in y, length
     * @param dz      shift of the copied nodes and levels in z, length
     * @return copies the objects, the nodes of copied elements with them, under new ids and names; its result is the copies
     */
    public Command duplicate(Collection<? extends EObject> objects, double dx, double dy, double dz) {
        return new Duplication(domain, model, new ArrayList<>(objects), new double[] {dx, dy, dz}).command();
    }

    /**
     * @param system another unit system
     * @return converts every number of the model, so that the structure stays the same in the other units
     */
    public Command convertUnits(UnitSystem system) {
        Units from = Units.of(model);
        Units to = Units.of(system);
        Edit edit = new Edit(domain, model, Texts.get("convertUnits", system.getLiteral()));
        convert(edit, model, from, to);
        model.eAllContents().forEachRemaining(object -> convert(edit, object, from, to));
        edit.set(model, StructurePackage.Literals.STRUCTURAL_MODEL__UNITS, system);
        return edit.toCommand();
    }

    private static void convert(Edit edit, EObject object, Units from, Units to) {
        for (EAttribute attribute : object.eClass().getEAllAttributes()) {
            if (attribute.getEType() == EcorePackage.Literals.EDOUBLE && (Double) object.eGet(attribute) != 0) {
                Quantity quantity = Quantity.of(object, attribute);
                double factor = from.toSi(quantity) / to.toSi(quantity);
                if (factor != 1) {
                    edit.set(object, attribute, (Double) object.eGet(attribute) * factor);
                }
            }
        }
    }
}
