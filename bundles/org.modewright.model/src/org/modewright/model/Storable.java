package org.modewright.model;

import java.util.HashSet;
import java.util.Set;

import org.eclipse.emf.common.util.TreeIterator;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EcorePackage;
import org.eclipse.emf.ecore.InternalEObject;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.StructuralModel;

/**
 * Makes sure that what is written can be read back: ids, references and characters.
 */
final class Storable {

    private final StructuralModel model;
    private final String name;
    private final Set<String> ids = new HashSet<>();

    private Storable(StructuralModel model, String name) {
        this.model = model;
        this.name = name;
    }

    static void check(StructuralModel model, String name) throws ModelFileException {
        Storable storable = new Storable(model, name);
        storable.checkObject(model);
        for (TreeIterator<EObject> all = model.eAllContents(); all.hasNext();) {
            storable.checkObject(all.next());
        }
    }

    private void checkObject(EObject object) throws ModelFileException {
        if (object instanceof Identified identified) {
            checkId(identified);
        }
        for (EAttribute attribute : object.eClass().getEAllAttributes()) {
            if (attribute.getEAttributeType() == EcorePackage.Literals.ESTRING) {
                checkText(object, attribute, (String) object.eGet(attribute));
            }
        }
        for (EReference reference : object.eClass().getEAllReferences()) {
            if (!reference.isContainment() && !reference.isMany()) {
                checkTarget(object, reference, object.eGet(reference));
            } else if (!reference.isContainment()) {
                for (Object target : (Iterable<?>) object.eGet(reference)) {
                    checkTarget(object, reference, target);
                }
            }
        }
    }

    private void checkId(Identified object) throws ModelFileException {
        String id = object.getId();
        if (!Ids.isWellFormed(id) || !ids.add(id)) {
            throw refused("The id '" + id + "' of " + Names.describe(object) + " is missing, not valid or taken twice.",
                    "Let the program assign ids.");
        }
    }

    private void checkText(EObject object, EAttribute attribute, String text) throws ModelFileException {
        if (text == null) {
            return;
        }
        int bad = text.codePoints().filter(c -> !isAllowed(c)).findFirst().orElse(-1);
        if (bad >= 0) {
            throw refused(String.format("The %s of %s holds the control character U+%04X.", attribute.getName(),
                    Names.describe(object), bad),
                    "Remove it.");
        }
    }

    /** Characters of XML 1.0, section 2.2. */
    private static boolean isAllowed(int c) {
        return c == '\t' || c == '\n' || c == '\r' || c >= 0x20 && c <= 0xD7FF || c >= 0xE000 && c <= 0xFFFD || c >= 0x10000;
    }

    private void checkTarget(EObject object, EReference reference, Object target) throws ModelFileException {
        if (target instanceof InternalEObject internal && (internal.eIsProxy() || !EcoreUtil.isAncestor(model, internal))) {
            throw refused("The " + reference.getName() + " of " + Names.describe(object) + " refers to " + Names.describe(internal)
                    + ", which is not part of the model.", "Refer to an object of the model.");
        }
    }

    private ModelFileException refused(String reason, String remedy) {
        return new ModelFileException(name, 0, 0, reason, remedy, null);
    }
}
