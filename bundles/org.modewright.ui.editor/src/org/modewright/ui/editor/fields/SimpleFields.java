package org.modewright.ui.editor.fields;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import org.eclipse.emf.common.util.Enumerator;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EEnumLiteral;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.osgi.util.NLS;
import org.modewright.model.structure.Component;

/** Fields of words, whole numbers, flags, choices and lists of components. */
final class SimpleFields {

    private SimpleFields() {
    }

    /** A line of text. */
    static final class Words extends FeatureField {

        Words(FieldContext context, EObject sample, EStructuralFeature feature) {
            super(context, sample, feature);
        }

        @Override
        public String text(EObject object) {
            return value(object) == null ? "" : value(object).toString();
        }

        @Override
        Object parse(String text) {
            return text.isEmpty() ? null : text;
        }
    }

    /** A whole number from 0. */
    static final class Whole extends FeatureField {

        Whole(FieldContext context, EObject sample, EStructuralFeature feature) {
            super(context, sample, feature);
        }

        @Override
        public String text(EObject object) {
            return value(object).toString();
        }

        @Override
        public boolean isNumber() {
            return true;
        }

        @Override
        Object parse(String text) {
            try {
                return Integer.valueOf(Integer.parseUnsignedInt(text));
            } catch (NumberFormatException notWhole) {
                throw new IllegalArgumentException(NLS.bind(FieldMessages.notWhole, text), notWhole);
            }
        }
    }

    /** Yes or no. */
    static final class Flag extends FeatureField {

        Flag(FieldContext context, EObject sample, EStructuralFeature feature) {
            super(context, sample, feature);
        }

        @Override
        public Style style() {
            return Style.FLAG;
        }

        @Override
        public String text(EObject object) {
            return value(object).toString();
        }

        @Override
        Object parse(String text) {
            return Boolean.valueOf(text);
        }
    }

    /** One of a few words. */
    static final class Choice extends FeatureField {

        private final EEnum words;

        Choice(FieldContext context, EObject sample, EStructuralFeature feature) {
            super(context, sample, feature);
            words = (EEnum) feature.getEType();
        }

        @Override
        public Style style() {
            return Style.CHOICE;
        }

        @Override
        public List<String> choices() {
            return words.getELiterals().stream().map(EEnumLiteral::getLiteral).toList();
        }

        @Override
        public String text(EObject object) {
            return ((Enumerator) value(object)).getLiteral();
        }

        @Override
        Object parse(String text) {
            EEnumLiteral literal = words.getEEnumLiteralByLiteral(text);
            if (literal == null) {
                throw new IllegalArgumentException(NLS.bind(FieldMessages.notAChoice, text, String.join(", ", choices())));
            }
            return literal.getInstance();
        }
    }

    /** Components of motion, separated by spaces. */
    static final class Components extends FeatureField {

        Components(FieldContext context, EObject sample, EStructuralFeature feature) {
            super(context, sample, feature);
        }

        @Override
        public String help() {
            return super.help() + "\n" + FieldMessages.componentsHint;
        }

        @Override
        public String text(EObject object) {
            return String.join(" ", ((List<?>) value(object)).stream().map(Object::toString).toList());
        }

        @Override
        Object parse(String text) {
            return Arrays.stream(text.split("[\\s,]+")).filter(word -> !word.isEmpty()).map(SimpleFields::component).distinct().sorted()
                    .toList();
        }
    }

    static Component component(String word) {
        Component component = Component.get(word.toLowerCase(Locale.ROOT));
        if (component == null) {
            throw new IllegalArgumentException(NLS.bind(FieldMessages.notAComponent, word));
        }
        return component;
    }
}
