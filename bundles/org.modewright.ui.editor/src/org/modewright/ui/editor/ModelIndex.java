package org.modewright.ui.editor;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.eclipse.emf.ecore.EObject;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.Support;

/** Finds the objects of a model by id; made anew after a change. */
public final class ModelIndex {

    private record Entry(Identified object, int position) {
    }

    private final Map<String, Entry> byId = new HashMap<>();

    public ModelIndex(StructuralModel model) {
        int position = 0;
        for (EObject object : model.eContents()) {
            if (object instanceof Identified identified && identified.getId() != null) {
                byId.put(identified.getId(), new Entry(identified, position++));
            }
        }
    }

    /** The object with an id; null if there is none. */
    public Identified get(String id) {
        Entry entry = byId.get(id);
        return entry == null ? null : entry.object();
    }

    /** The objects that there are, in the model's order. */
    public List<Identified> all(Collection<String> ids) {
        List<Entry> found = new ArrayList<>();
        for (String id : ids) {
            Entry entry = byId.get(id);
            if (entry != null) {
                found.add(entry);
            }
        }
        found.sort(Comparator.comparingInt(Entry::position));
        return found.stream().map(Entry::object).toList();
    }

    /** Those of the ids that there are. */
    public Set<String> known(Collection<String> ids) {
        Set<String> known = new HashSet<>(ids);
        known.retainAll(byId.keySet());
        return known;
    }

    /** Ids of all objects that have a place in space. */
    public Set<String> drawn() {
        Set<String> ids = new HashSet<>();
        byId.forEach((id, entry) -> {
            if (isDrawn(entry.object())) {
                ids.add(id);
            }
        });
        return ids;
    }

    private static boolean isDrawn(Identified object) {
        return object instanceof Node || object instanceof Member || object instanceof Spring || object instanceof Support
                || object instanceof NodalMass;
    }
}
