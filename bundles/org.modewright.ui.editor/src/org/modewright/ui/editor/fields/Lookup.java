package org.modewright.ui.editor.fields;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.osgi.util.NLS;
import org.modewright.model.Names;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.StructuralModel;

/** Finds objects of the model by the names that the user types. */
final class Lookup {

    private final StructuralModel model;
    private final Map<EClass, Map<String, Identified>> remembered;

    /** @param remembers whether names are gathered once, for as long as nothing is edited */
    Lookup(StructuralModel model, boolean remembers) {
        this.model = model;
        remembered = remembers ? new HashMap<>() : null;
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
    Identified named(EClass kind, String name) {
        String wanted = name.strip();
        Identified found = remembered == null ? search(kind, wanted)
                : remembered.computeIfAbsent(kind, this::byName).get(wanted);
        if (found == null) {
            throw new IllegalArgumentException(NLS.bind(FieldMessages.noSuchObject, Names.kind(kind), wanted));
        }
        return found;
    }

    private Identified search(EClass kind, String name) {
        return all(model, kind).stream().filter(object -> name.equals(object.getName())).findFirst().orElse(null);
    }

    private Map<String, Identified> byName(EClass kind) {
        Map<String, Identified> names = new HashMap<>();
        all(model, kind).forEach(object -> names.putIfAbsent(object.getName(), object));
        return names;
    }
}
