package org.modewright.ui.editor.fields;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.osgi.util.NLS;
import org.modewright.model.Names;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.StructurePackage;

/** A reference by name: chosen from a list where there are few of the kind, typed where there are many. */
final class ReferenceField extends FeatureField {

    private final EClass kind;

    ReferenceField(FieldContext context, EObject sample, EReference reference) {
        super(context, sample, reference);
        kind = reference.getEReferenceType();
    }

    private boolean hasFew() {
        return kind != StructurePackage.Literals.NODE && kind != StructurePackage.Literals.MEMBER;
    }

    @Override
    public Style style() {
        return hasFew() ? Style.CHOICE : Style.TEXT;
    }

    @Override
    public List<String> choices() {
        List<String> names = new ArrayList<>();
        if (hasFew() && !feature().isRequired()) {
            names.add(FieldMessages.none);
        }
        Lookup.all(context().model(), kind).forEach(object -> names.add(object.getName()));
        return names;
    }

    @Override
    public String text(EObject object) {
        Identified referred = (Identified) value(object);
        return referred == null ? hasFew() ? FieldMessages.none : "" : referred.getName();
    }

    @Override
    Object parse(String text) {
        if (text.isEmpty() || hasFew() && text.equals(FieldMessages.none)) {
            if (feature().isRequired()) {
                throw new IllegalArgumentException(NLS.bind(FieldMessages.missing, Names.kind(kind)));
            }
            return null;
        }
        return context().lookup().named(kind, text);
    }
}
