package org.modewright.ui.editor.fields;

import java.util.MissingResourceException;
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

    /** What a feature means; its label where no more is to be said. */
    public static String help(EStructuralFeature feature) {
        try {
            return StructureEditPlugin.INSTANCE.getString(key(feature, "description"));
        } catch (MissingResourceException labelSaysAll) {
            return label(feature);
        }
    }

    private static String key(EStructuralFeature feature, String end) {
        return "_UI_" + feature.getEContainingClass().getName() + "_" + feature.getName() + "_" + end;
    }
}
