package org.modewright.ui.editor.fields;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.osgi.util.NLS;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.StructuralModel;

/** Finds objects of the model by the names that the user types. */
final class Lookup {

    private Lookup() {
    }

    /** All objects of a kind, in the model's order. */
    static List<Identified> all(StructuralModel model, EClass kind) {
        List<Identified> found = new ArrayList<>();
        for (EReference list : model.eClass().getEAllContainments()) {
            if (list.isMany() && kind.isSuperTypeOf(list.getEReferenceType())) {
                for (Object object : (List<?>) model.eGet(list)) {
                    found.add((Identified) object);
                }
            }
        }
        return found;
    }

    /**
     * The object of a kind with a name.
     *
     * @throws IllegalArgumentException if there is none
     */
    static Identified named(StructuralModel model, EClass kind, String name) {
        String wanted = name.strip();
        return all(model, kind).stream().filter(object -> wanted.equals(object.getName())).findFirst()
                .orElseThrow(() -> new IllegalArgumentException(NLS.bind(FieldMessages.noSuchObject, word(kind), wanted)));
    }

    /** A kind as sentences say it. */
    static String word(EClass kind) {
        return kind.getName().replaceAll("(?<=[a-z])(?=[A-Z])", " ").toLowerCase(java.util.Locale.ROOT);
    }
}
