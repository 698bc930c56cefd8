package org.modewright.model;

import java.util.HashSet;
import java.util.List;
import java.util.Set;

import org.eclipse.emf.common.util.TreeIterator;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;

/** References that are missing or lead out of the model, and ids that two objects share. */
final class ReferenceChecks {

    private final StructuralModel model;
    private final DefectList defects;
    private final Set<String> ids = new HashSet<>();

    ReferenceChecks(StructuralModel model, DefectList defects) {
        this.model = model;
        this.defects = defects;
    }

    void run() {
        for (TreeIterator<EObject> all = model.eAllContents(); all.hasNext();) {
            EObject object = all.next();
            if (object instanceof Identified identified && identified.getId() != null && !ids.add(identified.getId())) {
                defects.error("id-repeated", object, StructurePackage.Literals.IDENTIFIED__ID,
                        "The id '" + identified.getId() + "' of " + Names.describe(object) + " is taken by another object.",
                        "Delete the object and create it anew.");
            }
            for (EReference reference : object.eClass().getEAllReferences()) {
                if (!reference.isContainment()) {
                    checkReference(object, reference);
                }
            }
        }
    }

    private void checkReference(EObject object, EReference reference) {
        Object value = object.eGet(reference);
        if (value == null && reference.isRequired()) {
            defects.error("reference-missing", object, reference, sentenceStart(object) + " has no " + reference.getName() + ".",
                    "Choose one, or delete the object.");
        } else if (value instanceof List<?> targets) {
            targets.forEach(target -> checkTarget(object, reference, (EObject) target));
        } else if (value != null) {
            checkTarget(object, reference, (EObject) value);
        }
    }

    private void checkTarget(EObject object, EReference reference, EObject target) {
        if (!EcoreUtil.isAncestor(model, target)) {
            defects.error("reference-outside", object, reference,
                    sentenceStart(object) + " refers to " + Names.describe(target) + " (" + reference.getName()
                            + "), which is not part of the model.",
                    "Choose another, or delete the object.");
        }
    }

    static String sentenceStart(EObject object) {
        String text = Names.describe(object);
        return Character.toUpperCase(text.charAt(0)) + text.substring(1);
    }
}
