package org.modewright.model.edit.commands;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.modewright.model.Ids;
import org.modewright.model.Names;
import org.modewright.model.structure.GravityLoad;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;

/**
 * Copies objects with a shift. Nodes that copied elements stand on are copied with them; sections, materials and groups are shared unless
 * they are to be copied themselves.
 */
final class Duplication {

    private final StructuralModel model;
    private final double[] shift;
    private final Edit edit;
    private final Set<EObject> originals = new LinkedHashSet<>();

    Duplication(EditingDomain domain, StructuralModel model, List<EObject> objects, double[] shift) {
        this.model = model;
        this.shift = shift;
        this.edit = new Edit(domain, model, Texts.get("duplicate", Texts.count(objects)));
        for (EObject object : objects) {
            if (!(object instanceof Identified) && !(object instanceof GravityLoad)) {
                throw new IllegalArgumentException(Texts.get("notCopyable"));
            }
            addNodes(object);
            originals.add(object);
        }
        originals.removeIf(o -> o instanceof GravityLoad && originals.contains(o.eContainer()));
    }

    private void addNodes(EObject object) {
        if (object instanceof LoadPattern || object instanceof GravityLoad) {
            return;
        }
        addTargets(object);
        object.eAllContents().forEachRemaining(this::addTargets);
    }

    private void addTargets(EObject object) {
        for (EReference reference : object.eClass().getEAllReferences()) {
            if (reference.getEReferenceType() == StructurePackage.Literals.NODE && !reference.isContainment()) {
                Object value = object.eGet(reference);
                Collection<?> nodes = value instanceof Collection<?> many ? many : value == null ? List.of() : List.of(value);
                nodes.forEach(node -> originals.add((EObject) node));
            }
        }
    }

    Command command() {
        EcoreUtil.Copier copier = new EcoreUtil.Copier(true, true);
        copier.copyAll(originals);
        copier.copyReferences();
        Ids ids = new Ids(model);
        Names names = new Names(model);
        List<Identified> copies = new ArrayList<>();
        for (EObject original : originals) {
            EObject copy = copier.get(original);
            if (copy instanceof Identified identified) {
                identified.setId(ids.next(copy.eClass()));
                identified.setName(name(names, identified));
                move(identified);
                copies.add(identified);
            } else {
                edit.add(original.eContainer(), StructurePackage.Literals.LOAD_PATTERN__LOADS, List.of(copy));
            }
        }
        edit.add(copies);
        return edit.toCommand();
    }

    /** Nodes and elements are counted on; what carries a meaning in its name says where it comes from. */
    private static String name(Names names, Identified copy) {
        boolean counted = copy instanceof Node || copy.eClass() == StructurePackage.Literals.MEMBER;
        return counted ? names.next(copy.eClass()) : names.derived(copy.eClass(), copy.getName());
    }

    private void move(Identified copy) {
        if (copy instanceof Node node) {
            node.setX(node.getX() + shift[0]);
            node.setY(node.getY() + shift[1]);
            node.setZ(node.getZ() + shift[2]);
        } else if (copy instanceof Level level) {
            level.setElevation(level.getElevation() + shift[2]);
        }
    }
}
