package org.modewright.ui.editor.fields;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.EcorePackage;
import org.modewright.model.structure.StructurePackage;

/** The fields of a kind of object, in the order of forms and columns: name first, group last. */
public final class Fields {

    private Fields() {
    }

    /**
     * The fields of a kind.
     *
     * @param kind the class of the objects
     * @param sample one object, whose units the labels state; null: the usual ones
     */
    public static List<Field> of(FieldContext context, EClass kind, EObject sample) {
        List<Field> fields = new ArrayList<>();
        EStructuralFeature group = null;
        for (EStructuralFeature feature : kind.getEAllStructuralFeatures()) {
            if (feature == StructurePackage.Literals.GROUPED__GROUP) {
                group = feature;
            } else {
                add(fields, one(context, sample, feature));
            }
        }
        if (group != null) {
            add(fields, one(context, sample, group));
        }
        return fields;
    }

    private static void add(List<Field> fields, Field field) {
        if (field != null) {
            fields.add(field);
        }
    }

    /** The field of one feature; null for a feature that is edited elsewhere. */
    public static Field one(FieldContext context, EObject sample, EStructuralFeature feature) {
        return feature instanceof EReference reference ? of(context, sample, reference) : of(context, sample, (EAttribute) feature);
    }

    private static Field of(FieldContext context, EObject sample, EAttribute attribute) {
        if (attribute == StructurePackage.Literals.IDENTIFIED__ID) {
            return null;
        }
        if (attribute == StructurePackage.Literals.IDENTIFIED__NAME) {
            return new NameField(context, sample, attribute);
        }
        if (attribute.isMany()) {
            return new SimpleFields.Components(context, sample, attribute);
        }
        if (attribute.getEType() instanceof EEnum) {
            return new SimpleFields.Choice(context, sample, attribute);
        }
        if (attribute.getEType() == EcorePackage.Literals.EDOUBLE) {
            return new NumberField(context, sample, attribute);
        }
        if (attribute.getEType() == EcorePackage.Literals.EINT) {
            return new SimpleFields.Whole(context, sample, attribute);
        }
        return attribute.getEType() == EcorePackage.Literals.EBOOLEAN ? new SimpleFields.Flag(context, sample, attribute)
                : new SimpleFields.Words(context, sample, attribute);
    }

    private static Field of(FieldContext context, EObject sample, EReference reference) {
        EClass type = reference.getEReferenceType();
        if (type == StructurePackage.Literals.VECTOR) {
            return new PartFields.Triple(context, sample, reference);
        }
        if (type == StructurePackage.Literals.TIE_TERM) {
            return new PartFields.Terms(context, sample, reference);
        }
        if (type == StructurePackage.Literals.SPRING_COUPLING) {
            return new PartFields.Couplings(context, sample, reference);
        }
        if (reference.isContainment()) {
            return null;
        }
        return reference.isMany() ? new PartFields.Nodes(context, sample, reference) : new ReferenceField(context, sample, reference);
    }
}
