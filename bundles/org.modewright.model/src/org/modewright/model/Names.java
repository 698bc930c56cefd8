package org.modewright.model;

import java.util.HashMap;
import java.util.HashSet;
import java.util.Locale;
import java.util.Map;
import java.util.Set;

import org.eclipse.emf.common.util.TreeIterator;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;

/**
 * Names of objects, each unique in its kind: which are taken and which comes next.
 * One object serves one model for one act of creation; it does not follow later changes of the model.
 */
public final class Names {

    private static final Map<EClass, String> STEMS = Map.ofEntries(
            Map.entry(StructurePackage.Literals.NODE, "N"),
            Map.entry(StructurePackage.Literals.MEMBER, "M"),
            Map.entry(StructurePackage.Literals.MATERIAL, "Material "),
            Map.entry(StructurePackage.Literals.FRAME_SECTION, "Section "),
            Map.entry(StructurePackage.Literals.GROUP, "Group "),
            Map.entry(StructurePackage.Literals.LEVEL, "Level "),
            Map.entry(StructurePackage.Literals.SPRING, "Spring "),
            Map.entry(StructurePackage.Literals.SUPPORT, "Support "),
            Map.entry(StructurePackage.Literals.NODAL_MASS, "Mass "),
            Map.entry(StructurePackage.Literals.RIGID_FLOOR, "Floor "),
            Map.entry(StructurePackage.Literals.RIGID_LINK, "Link "),
            Map.entry(StructurePackage.Literals.MULTI_POINT_TIE, "Tie "),
            Map.entry(StructurePackage.Literals.LOAD_PATTERN, "Load "));

    /** Features whose names in the file are no words for a sentence. */
    private static final Map<EStructuralFeature, String> FEATURES = Map.ofEntries(
            Map.entry(StructurePackage.Literals.MATERIAL__YOUNG, "modulus of elasticity"),
            Map.entry(StructurePackage.Literals.MATERIAL__POISSON, "Poisson's ratio"),
            Map.entry(StructurePackage.Literals.MATERIAL__SHEAR, "shear modulus"),
            Map.entry(StructurePackage.Literals.FRAME_SECTION__IY, "second moment Iy"),
            Map.entry(StructurePackage.Literals.FRAME_SECTION__IZ, "second moment Iz"),
            Map.entry(StructurePackage.Literals.FRAME_SECTION__TORSION, "torsion constant"),
            Map.entry(StructurePackage.Literals.MEMBER__START_FREE, "releases at the start"),
            Map.entry(StructurePackage.Literals.MEMBER__END_FREE, "releases at the end"),
            Map.entry(StructurePackage.Literals.MEMBER__START_RIGID, "rigid zone at the start"),
            Map.entry(StructurePackage.Literals.MEMBER__END_RIGID, "rigid zone at the end"),
            Map.entry(StructurePackage.Literals.MEMBER__AXIAL_FACTOR, "factor of EA"),
            Map.entry(StructurePackage.Literals.MEMBER__SHEAR_YFACTOR, "factor of shear area y"),
            Map.entry(StructurePackage.Literals.MEMBER__SHEAR_ZFACTOR, "factor of shear area z"),
            Map.entry(StructurePackage.Literals.MEMBER__TORSION_FACTOR, "factor of GJ"),
            Map.entry(StructurePackage.Literals.MEMBER__BENDING_YFACTOR, "factor of E Iy"),
            Map.entry(StructurePackage.Literals.MEMBER__BENDING_ZFACTOR, "factor of E Iz"),
            Map.entry(StructurePackage.Literals.ANALYSIS_SETTINGS__MODES, "number of modes"),
            Map.entry(StructurePackage.Literals.ANALYSIS_SETTINGS__BELOW, "frequency limit"),
            Map.entry(StructurePackage.Literals.AUDIT_SETTINGS__COINCIDENCE, "distance of coincident nodes"));

    private final Map<EClass, Set<String>> taken = new HashMap<>();
    private final Map<String, Integer> lastTried = new HashMap<>();

    /**
     * @param model the model that the names are for
     */
    public Names(StructuralModel model) {
        for (TreeIterator<EObject> all = model.eAllContents(); all.hasNext();) {
            if (all.next() instanceof Identified object && object.getName() != null) {
                take(object.eClass(), object.getName());
            }
        }
    }

    /**
     * @param kind class of the object
     * @param name a name
     * @return whether no object of that kind has the name
     */
    public boolean isFree(EClass kind, String name) {
        return !taken.getOrDefault(kind, Set.of()).contains(name);
    }

    /**
     * @param kind class of the object
     * @param name a name that counts as taken from now on
     */
    public void take(EClass kind, String name) {
        taken.computeIfAbsent(kind, k -> new HashSet<>()).add(name);
    }

    /**
     * @param kind class of the object
     * @return the next free name of that kind, such as N12; it counts as taken from now on
     */
    public String next(EClass kind) {
        return nextAfter(kind, STEMS.getOrDefault(kind, kind.getName() + " "), 1);
    }

    /**
     * @param kind class of the object
     * @param base name of the object that the new one comes from
     * @return the next free name made of it, such as B12.2; it counts as taken from now on
     */
    public String derived(EClass kind, String base) {
        return base == null || base.isBlank() ? next(kind) : nextAfter(kind, base + ".", 2);
    }

    private String nextAfter(EClass kind, String stem, int first) {
        String key = kind.getName() + "\n" + stem;
        int number = lastTried.getOrDefault(key, first - 1);
        String name;
        do {
            number++;
            name = stem + number;
        } while (!isFree(kind, name));
        lastTried.put(key, number);
        take(kind, name);
        return name;
    }

    /**
     * @param object an object of a model
     * @return how sentences call it: "member B12", "a tie term of tie T1"
     */
    public static String describe(EObject object) {
        String kind = kind(object.eClass());
        if (object instanceof StructuralModel model) {
            return model.getName() == null ? "the model" : "the model " + model.getName();
        }
        if (object instanceof Identified identified) {
            String name = identified.getName() == null || identified.getName().isBlank() ? identified.getId() : identified.getName();
            return name == null ? "a " + kind + " without name" : kind + " " + name;
        }
        EObject owner = object.eContainer();
        return owner == null ? "a " + kind : "the " + kind + " of " + describe(owner);
    }

    /**
     * @param feature a feature of an object of a model
     * @return how sentences call it: "modulus of elasticity", "shear area y"
     */
    static String describe(EStructuralFeature feature) {
        return FEATURES.getOrDefault(feature, words(feature.getName()));
    }

    /**
     * @param kind class of an object of a model
     * @return how sentences call it: "member", "frame section", "tie", "gravity pattern"
     */
    public static String kind(EClass kind) {
        if (kind == StructurePackage.Literals.LOAD_PATTERN) {
            return "gravity pattern";
        }
        return kind == StructurePackage.Literals.MULTI_POINT_TIE ? "tie" : words(kind.getName());
    }

    private static String words(String camelCase) {
        return camelCase.replaceAll("(?<=.)(?=[A-Z])", " ").toLowerCase(Locale.ROOT);
    }
}
