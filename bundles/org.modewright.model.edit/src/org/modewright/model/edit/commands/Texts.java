package org.modewright.model.edit.commands;

import java.util.Collection;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.modewright.model.structure.provider.StructureEditPlugin;

/** Labels of commands, from the bundle's plugin.properties. */
final class Texts {

    private Texts() {
    }

    static String get(String key, Object... arguments) {
        return StructureEditPlugin.INSTANCE.getString("_UI_Edit_" + key, arguments);
    }

    /** "Member", "12 Members" or "12 objects" where they are of several kinds. */
    static String count(Collection<? extends EObject> objects) {
        EClass kind = objects.isEmpty() ? null : objects.iterator().next().eClass();
        boolean oneKind = objects.stream().allMatch(o -> o.eClass() == kind);
        if (objects.size() == 1) {
            return type(kind);
        }
        return oneKind && kind != null ? get("count", objects.size(), type(kind)) : get("objects", objects.size());
    }

    private static String type(EClass kind) {
        return StructureEditPlugin.INSTANCE.getString("_UI_" + kind.getName() + "_type");
    }

    static String feature(EStructuralFeature feature) {
        return StructureEditPlugin.INSTANCE
                .getString("_UI_" + feature.getEContainingClass().getName() + "_" + feature.getName() + "_feature");
    }
}
