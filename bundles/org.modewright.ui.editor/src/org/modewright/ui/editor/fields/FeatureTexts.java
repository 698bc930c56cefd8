package org.modewright.ui.editor.fields;

import org.eclipse.emf.ecore.EStructuralFeature;
import org.modewright.model.structure.provider.StructureEditPlugin;

/** Labels and explanations of the model's features. */
public final class FeatureTexts {

    private FeatureTexts() {
    }

    /** Label of a feature, without a unit. */
    public static String label(EStructuralFeature feature) {
        return StructureEditPlugin.INSTANCE.getString(key(feature, "feature"));
    }

    /** What a feature means. */
    public static String help(EStructuralFeature feature) {
        return StructureEditPlugin.INSTANCE.getString(key(feature, "description"));
    }

    private static String key(EStructuralFeature feature, String end) {
        return "_UI_" + feature.getEContainingClass().getName() + "_" + feature.getName() + "_" + end;
    }
}
