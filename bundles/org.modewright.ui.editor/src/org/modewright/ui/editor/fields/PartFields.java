package org.modewright.ui.editor.fields;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.List;
import java.util.stream.Collectors;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.common.command.CompoundCommand;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.osgi.util.NLS;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.SpringCoupling;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.TieTerm;
import org.modewright.model.structure.Vector;

/** Fields of what an object holds as its own parts, and of lists of nodes, written on one line. */
final class PartFields {

    private PartFields() {
    }

    /** A field whose value is made of parts: every object gets parts of its own. */
    abstract static class Parts extends FeatureField {

        Parts(FieldContext context, EObject sample, EStructuralFeature feature) {
            super(context, sample, feature);
        }

        abstract String hint();

        @Override
        public String help() {
            return super.help() + "\n" + hint();
        }

        @Override
        public Command set(Collection<? extends EObject> objects, String text) {
            CompoundCommand command = new CompoundCommand(NLS.bind(FieldMessages.setLabel, FeatureTexts.label(feature())));
            for (EObject object : objects) {
                Object value = parse(text.strip());
                command.append(SetCommand.create(context().domain(), object, feature(), value == null ? SetCommand.UNSET_VALUE : value));
            }
            return command;
        }

        final List<String> pieces(String text, String separator) {
            return Arrays.stream(text.split(separator)).map(String::strip).filter(piece -> !piece.isEmpty()).toList();
        }
    }

    /** Three components. */
    static final class Triple extends Parts {

        Triple(FieldContext context, EObject sample, EStructuralFeature feature) {
            super(context, sample, feature);
        }

        @Override
        String hint() {
            return FieldMessages.vectorHint;
        }

        @Override
        public String text(EObject object) {
            Vector vector = (Vector) value(object);
            return vector == null ? ""
                    : NumberField.format(vector.getX()) + " " + NumberField.format(vector.getY()) + " " + NumberField.format(vector.getZ());
        }

        @Override
        Object parse(String text) {
            List<String> numbers = pieces(text, "[\\s,;]+");
            if (numbers.isEmpty()) {
                return null;
            }
            if (numbers.size() != 3) {
                throw new IllegalArgumentException(NLS.bind(FieldMessages.notAVector, text));
            }
            Vector vector = StructureFactory.eINSTANCE.createVector();
            vector.setX(NumberField.number(numbers.get(0)));
            vector.setY(NumberField.number(numbers.get(1)));
            vector.setZ(NumberField.number(numbers.get(2)));
            return vector;
        }
    }

    /** Nodes by name. */
    static final class Nodes extends Parts {

        Nodes(FieldContext context, EObject sample, EStructuralFeature feature) {
            super(context, sample, feature);
        }

        @Override
        String hint() {
            return FieldMessages.nodesHint;
        }

        @Override
        public String text(EObject object) {
            return ((List<?>) value(object)).stream().map(node -> ((Identified) node).getName()).collect(Collectors.joining(", "));
        }

        @Override
        Object parse(String text) {
            List<Identified> nodes = new ArrayList<>();
            for (String name : pieces(text, ",")) {
                nodes.add(context().lookup().named(StructurePackage.Literals.NODE, name));
            }
            return nodes.stream().distinct().toList();
        }
    }

    /** Terms of a tie: factor, component, node. */
    static final class Terms extends Parts {

        Terms(FieldContext context, EObject sample, EStructuralFeature feature) {
            super(context, sample, feature);
        }

        @Override
        String hint() {
            return FieldMessages.termsHint;
        }

        @Override
        public String text(EObject object) {
            return ((List<?>) value(object)).stream().map(term -> text((TieTerm) term)).collect(Collectors.joining("; "));
        }

        private static String text(TieTerm term) {
            String node = term.getNode() == null ? "?" : term.getNode().getName();
            return NumberField.format(term.getFactor()) + " " + term.getComponent().getLiteral() + " " + node;
        }

        @Override
        Object parse(String text) {
            return pieces(text, ";").stream().map(this::term).toList();
        }

        private TieTerm term(String piece) {
            String[] words = piece.split("\\s+", 3);
            if (words.length != 3) {
                throw new IllegalArgumentException(NLS.bind(FieldMessages.notATerm, piece));
            }
            TieTerm term = StructureFactory.eINSTANCE.createTieTerm();
            term.setFactor(NumberField.number(words[0]));
            term.setComponent(SimpleFields.component(words[1]));
            term.setNode((Node) context().lookup().named(StructurePackage.Literals.NODE, words[2]));
            return term;
        }
    }

    /** Couplings of a spring: component, component, stiffness. */
    static final class Couplings extends Parts {

        Couplings(FieldContext context, EObject sample, EStructuralFeature feature) {
            super(context, sample, feature);
        }

        @Override
        String hint() {
            return FieldMessages.couplingsHint;
        }

        @Override
        public String text(EObject object) {
            return ((List<?>) value(object)).stream().map(coupling -> text((SpringCoupling) coupling)).collect(Collectors.joining("; "));
        }

        private static String text(SpringCoupling coupling) {
            String components = coupling.getFirst().getLiteral() + " " + coupling.getSecond().getLiteral();
            return components + " " + NumberField.format(coupling.getStiffness());
        }

        @Override
        Object parse(String text) {
            return pieces(text, ";").stream().map(Couplings::coupling).toList();
        }

        private static SpringCoupling coupling(String piece) {
            String[] words = piece.split("\\s+");
            if (words.length != 3) {
                throw new IllegalArgumentException(NLS.bind(FieldMessages.notACoupling, piece));
            }
            SpringCoupling coupling = StructureFactory.eINSTANCE.createSpringCoupling();
            coupling.setFirst(SimpleFields.component(words[0]));
            coupling.setSecond(SimpleFields.component(words[1]));
            coupling.setStiffness(NumberField.number(words[2]));
            return coupling;
        }
    }
}
