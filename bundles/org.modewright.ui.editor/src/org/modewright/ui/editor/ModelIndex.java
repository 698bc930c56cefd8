package org.modewright.ui.editor;

import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.eclipse.emf.ecore.EObject;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.StructuralModel;

/** Finds the objects of a model by id; made anew after a change. */
public final class ModelIndex {

    private final Map<String, Identified> byId = new HashMap<>();

    public ModelIndex(StructuralModel model) {
        for (EObject object : model.eContents()) {
            if (object instanceof Identified identified && identified.getId() != null) {
                byId.put(identified.getId(), identified);
            }
        }
    }

    /** The object with an id; null if there is none. */
    public Identified get(String id) {
        return byId.get(id);
    }

    /** The objects that there are, in no particular order. */
    public List<Identified> all(Collection<String> ids) {
        List<Identified> found = new ArrayList<>();
        for (String id : ids) {
            Identified object = byId.get(id);
            if (object != null) {
                found.add(object);
            }
        }
        return found;
    }
}
