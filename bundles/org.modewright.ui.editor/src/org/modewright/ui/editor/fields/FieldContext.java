package org.modewright.ui.editor.fields;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.modewright.model.Quantity;
import org.modewright.model.Units;
import org.modewright.model.edit.commands.StructureCommands;
import org.modewright.model.structure.StructuralModel;

/**
 * What fields work on.
 *
 * @param domain the editor's domain
 * @param model the edited model
 */
public record FieldContext(EditingDomain domain, StructuralModel model) {

    /** Commands on the model. */
    public StructureCommands commands() {
        return new StructureCommands(domain, model);
    }

    /** Label of a feature with its unit. */
    String label(EObject sample, EStructuralFeature feature) {
        String label = FeatureTexts.label(feature);
        String unit = feature instanceof EAttribute attribute ? unit(sample, attribute) : "";
        return unit.isEmpty() ? label : label + " " + unit;
    }

    private String unit(EObject sample, EAttribute attribute) {
        Quantity quantity = sample == null ? Quantity.of(attribute) : Quantity.of(sample, attribute);
        return Units.of(model).symbol(quantity);
    }
}
