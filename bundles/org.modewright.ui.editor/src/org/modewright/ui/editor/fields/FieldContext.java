package org.modewright.ui.editor.fields;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.modewright.model.Quantity;
import org.modewright.model.Units;
import org.modewright.model.edit.commands.StructureCommands;
import org.modewright.model.structure.StructuralModel;

/** What fields work on. */
public final class FieldContext {

    private final EditingDomain domain;
    private final StructuralModel model;
    private final Lookup lookup;

    /**
     * @param domain the editor's domain
     * @param model the edited model
     */
    public FieldContext(EditingDomain domain, StructuralModel model) {
        this(domain, model, new Lookup(model, false));
    }

    private FieldContext(EditingDomain domain, StructuralModel model, Lookup lookup) {
        this.domain = domain;
        this.model = model;
        this.lookup = lookup;
    }

    /** The same for many values at once: names are gathered only once, so nothing may be edited meanwhile. */
    public FieldContext forMany() {
        return new FieldContext(domain, model, new Lookup(model, true));
    }

    public EditingDomain domain() {
        return domain;
    }

    public StructuralModel model() {
        return model;
    }

    Lookup lookup() {
        return lookup;
    }

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
