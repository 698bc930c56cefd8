package org.modewright.exchange.internal.tables;

import java.util.HashSet;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

import org.modewright.model.structure.Identified;

/** The ids that objects have in a package: their names, as far as a table can hold them. */
final class PackageNames {

    private final Map<Identified, String> names = new IdentityHashMap<>();
    private final List<String> warnings;

    PackageNames(List<String> warnings) {
        this.warnings = warnings;
    }

    /** Gives every object of one kind an id; changed ones are named in a warning. */
    void add(String kind, List<? extends Identified> objects) {
        Set<String> taken = new HashSet<>();
        for (Identified object : objects) {
            String name = object.getName() == null ? "" : object.getName();
            String base = name.isBlank() ? object.getId() : name.strip();
            String id = base;
            for (int i = 2; !taken.add(id); i++) {
                id = base + " (" + i + ")";
            }
            if (!id.equals(name)) {
                warnings.add("The " + kind + " \"" + name + "\" was written as \"" + id
                        + "\": a table needs a unique id without blanks around it.");
            }
            names.put(object, id);
        }
    }

    /** The id of an object; empty where there is none. */
    String of(Identified object) {
        return object == null ? "" : names.getOrDefault(object, "");
    }
}
