package org.modewright.ui.editor.fields;

import java.util.Collection;
import java.util.List;
import java.util.Objects;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;

/** A field that stands for one feature. */
abstract class FeatureField implements Field {

    private final FieldContext context;
    private final EStructuralFeature feature;
    private final String label;

    FeatureField(FieldContext context, EObject sample, EStructuralFeature feature) {
        this.context = context;
        this.feature = feature;
        label = context.label(sample, feature);
    }

    final FieldContext context() {
        return context;
    }

    final EStructuralFeature feature() {
        return feature;
    }

    final Object value(EObject object) {
        return object.eGet(feature);
    }

    /** The text as a value of the feature. */
    abstract Object parse(String text);

    @Override
    public final String label() {
        return label;
    }

    @Override
    public String help() {
        return FeatureTexts.help(feature);
    }

    @Override
    public Style style() {
        return Style.TEXT;
    }

    @Override
    public List<String> choices() {
        return List.of();
    }

    @Override
    public boolean agree(Collection<? extends EObject> objects) {
        if (feature.isMany() || feature instanceof EReference reference && reference.isContainment()) {
            return Field.super.agree(objects);
        }
        Object first = value(objects.iterator().next());
        return objects.stream().allMatch(object -> Objects.equals(value(object), first));
    }

    @Override
    public void check(Collection<? extends EObject> objects, String text) {
        parse(text.strip());
    }

    @Override
    public Command set(Collection<? extends EObject> objects, String text) {
        return context.commands().set(objects, feature, parse(text.strip()));
    }
}
