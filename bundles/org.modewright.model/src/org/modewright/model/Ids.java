package org.modewright.model;

import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import java.util.regex.Pattern;

import org.eclipse.emf.common.util.TreeIterator;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EObject;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;

/**
 * Gives stable ids: a prefix for the kind and the number after the highest in use, such as n12 or m7. An id once given never changes.
 * One object serves one model for one act of creation; it does not follow later changes of the model.
 */
public final class Ids {

    private static final Pattern WELL_FORMED = Pattern.compile("[\\p{L}\\p{N}_][\\p{L}\\p{N}_.-]*");

    private static final Map<EClass, String> PREFIXES = Map.ofEntries(
            Map.entry(StructurePackage.Literals.NODE, "n"),
            Map.entry(StructurePackage.Literals.MEMBER, "m"),
            Map.entry(StructurePackage.Literals.MATERIAL, "mat"),
            Map.entry(StructurePackage.Literals.FRAME_SECTION, "sec"),
            Map.entry(StructurePackage.Literals.GROUP, "grp"),
            Map.entry(StructurePackage.Literals.LEVEL, "lev"),
            Map.entry(StructurePackage.Literals.SPRING, "spr"),
            Map.entry(StructurePackage.Literals.SUPPORT, "sup"),
            Map.entry(StructurePackage.Literals.NODAL_MASS, "mass"),
            Map.entry(StructurePackage.Literals.RIGID_FLOOR, "flo"),
            Map.entry(StructurePackage.Literals.RIGID_LINK, "lnk"),
            Map.entry(StructurePackage.Literals.MULTI_POINT_TIE, "tie"),
            Map.entry(StructurePackage.Literals.LOAD_PATTERN, "pat"));

    private final Set<String> taken = new HashSet<>();
    private final Map<String, Integer> highest = new HashMap<>();

    /**
     * @param model the model that the ids are for
     */
    public Ids(StructuralModel model) {
        for (TreeIterator<EObject> all = model.eAllContents(); all.hasNext();) {
            if (all.next() instanceof Identified object && object.getId() != null) {
                take(prefix(object.eClass()), object.getId());
            }
        }
    }

    private void take(String prefix, String id) {
        taken.add(id);
        if (id.startsWith(prefix) && id.length() > prefix.length() && id.length() <= prefix.length() + 9) {
            String digits = id.substring(prefix.length());
            if (digits.chars().allMatch(c -> c >= '0' && c <= '9')) {
                highest.merge(prefix, Integer.parseInt(digits), Math::max);
            }
        }
    }

    /**
     * @param object an object that is or will be part of the model; one that has an id keeps it
     * @return its id
     */
    public String assign(Identified object) {
        if (object.getId() == null || object.getId().isEmpty()) {
            object.setId(next(object.eClass()));
        }
        return object.getId();
    }

    /**
     * @param kind class of the object
     * @return an id that is free; it counts as taken from now on
     */
    public String next(EClass kind) {
        String prefix = prefix(kind);
        String id;
        do {
            id = prefix + highest.merge(prefix, 1, Integer::sum);
        } while (!taken.add(id));
        return id;
    }

    /**
     * @param model every object of it that has no id gets one
     */
    public static void assignMissing(StructuralModel model) {
        Ids ids = null;
        for (TreeIterator<EObject> all = model.eAllContents(); all.hasNext();) {
            if (all.next() instanceof Identified object && (object.getId() == null || object.getId().isEmpty())) {
                ids = ids == null ? new Ids(model) : ids;
                ids.assign(object);
            }
        }
    }

    /**
     * @param kind a concrete class of identified objects
     * @return what the ids of that kind begin with
     */
    public static String prefix(EClass kind) {
        return PREFIXES.getOrDefault(kind, "x");
    }

    /**
     * @param id an id, or null
     * @return whether a file can hold it: letters, digits, '_', '-' and '.', beginning with a letter, a digit or '_'
     */
    public static boolean isWellFormed(String id) {
        return id != null && WELL_FORMED.matcher(id).matches();
    }
}
