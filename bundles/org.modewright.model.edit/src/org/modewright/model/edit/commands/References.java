package org.modewright.model.edit.commands;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;

import org.eclipse.emf.common.util.TreeIterator;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.modewright.model.structure.StructuralModel;

/** Who refers to whom in a model, found in one pass. */
final class References {

    /** One reference: the object that holds it and the feature. */
    record Reference(EObject source, EReference feature) {
    }

    private final Map<EObject, List<Reference>> byTarget = new IdentityHashMap<>();

    References(StructuralModel model) {
        for (TreeIterator<EObject> all = model.eAllContents(); all.hasNext();) {
            collect(all.next());
        }
    }

    private void collect(EObject source) {
        for (EReference feature : source.eClass().getEAllReferences()) {
            if (feature.isContainment()) {
                continue;
            }
            Object value = source.eGet(feature);
            if (value instanceof List<?> targets) {
                targets.forEach(target -> put((EObject) target, source, feature));
            } else if (value != null) {
                put((EObject) value, source, feature);
            }
        }
    }

    private void put(EObject target, EObject source, EReference feature) {
        byTarget.computeIfAbsent(target, k -> new ArrayList<>()).add(new Reference(source, feature));
    }

    List<Reference> to(EObject target) {
        return byTarget.getOrDefault(target, List.of());
    }
}
