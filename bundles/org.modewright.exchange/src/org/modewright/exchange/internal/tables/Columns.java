package org.modewright.exchange.internal.tables;

import java.util.Locale;

import org.eclipse.emf.ecore.EStructuralFeature;
import org.modewright.model.structure.StructurePackage;

/** Columns of the tables that hold the features of the structural model. */
final class Columns {

    private Columns() {
    }

    /** The column of a feature: its name in lower case with underscores, but for names and the components of a link. */
    static String of(EStructuralFeature feature) {
        if (feature == StructurePackage.Literals.IDENTIFIED__NAME) {
            return "id";
        }
        if (feature == StructurePackage.Literals.RIGID_LINK__COMPONENTS) {
            return "dofs";
        }
        if (feature == StructurePackage.Literals.RIGID_FLOOR__NODES) {
            return "node";
        }
        return feature.getName().replaceAll("([A-Z])", "_$1").toLowerCase(Locale.ROOT);
    }
}
