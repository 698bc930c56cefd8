package org.modewright.ui.editor.fields;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.osgi.util.NLS;

/** A number, shown in full precision and without digits that mean nothing. */
final class NumberField extends FeatureField {

    NumberField(FieldContext context, EObject sample, EStructuralFeature feature) {
        super(context, sample, feature);
    }

    @Override
    public String text(EObject object) {
        return format((Double) value(object));
    }

    @Override
    public Comparable<?> sortKey(EObject object) {
        return (Double) value(object);
    }

    @Override
    public boolean isNumber() {
        return true;
    }

    @Override
    Object parse(String text) {
        return number(text);
    }

    static String format(double value) {
        if (value == Math.rint(value) && Math.abs(value) < 1e9) {
            return Long.toString((long) value);
        }
        return Double.toString(value).replace("E", "e");
    }

    static double number(String text) {
        double value;
        try {
            value = Double.parseDouble(text.strip());
        } catch (NumberFormatException notANumber) {
            throw new IllegalArgumentException(NLS.bind(FieldMessages.notANumber, text), notANumber);
        }
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException(FieldMessages.notFinite);
        }
        return value;
    }
}
