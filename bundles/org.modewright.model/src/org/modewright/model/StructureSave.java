package org.modewright.model;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.xmi.XMLHelper;
import org.eclipse.emf.ecore.xmi.impl.XMISaveImpl;
import org.modewright.model.structure.StructurePackage;

/**
 * Writes format version and unit system even where they are the defaults: both must survive a change of defaults.
 */
final class StructureSave extends XMISaveImpl {

    StructureSave(XMLHelper helper) {
        super(helper);
    }

    @Override
    protected boolean shouldSaveFeature(EObject object, EStructuralFeature feature) {
        return feature == StructurePackage.Literals.STRUCTURAL_MODEL__FORMAT_VERSION
                || feature == StructurePackage.Literals.STRUCTURAL_MODEL__UNITS
                || super.shouldSaveFeature(object, feature);
    }
}
