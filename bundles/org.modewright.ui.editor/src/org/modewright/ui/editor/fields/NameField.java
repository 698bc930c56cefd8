package org.modewright.ui.editor.fields;

import java.util.Collection;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.modewright.model.structure.Identified;

/** The name, unique in its kind. */
final class NameField extends FeatureField {

    NameField(FieldContext context, EObject sample, EStructuralFeature feature) {
        super(context, sample, feature);
    }

    @Override
    public String text(EObject object) {
        return value(object) == null ? "" : (String) value(object);
    }

    @Override
    Object parse(String text) {
        return text;
    }

    @Override
    public void check(Collection<? extends EObject> objects, String text) {
        context().commands().rename((Identified) objects.iterator().next(), text);
    }

    @Override
    public Command set(Collection<? extends EObject> objects, String text) {
        return context().commands().rename((Identified) objects.iterator().next(), text);
    }
}
