package org.modewright.ui.editor.fields;

import java.util.Collection;
import java.util.List;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.modewright.model.Quantity;
import org.modewright.model.Units;
import org.modewright.model.structure.NodeLoad;
import org.modewright.model.structure.StructurePackage.Literals;

/** The columns of a table that holds loads at nodes and loads on members alike. */
public final class LoadFields {

    private LoadFields() {
    }

    /** What the load stands on, which one, and how much. */
    public static List<Field> all(FieldContext context) {
        return List.of(new Kind(), new Target(context), new Value(context), new Unit(context));
    }

    private static boolean atNode(EObject load) {
        return load instanceof NodeLoad;
    }

    /** What can be read only. */
    private abstract static class Fixed implements Field {

        @Override
        public final Style style() {
            return Style.TEXT;
        }

        @Override
        public final List<String> choices() {
            return List.of();
        }

        @Override
        public final boolean isEditable() {
            return false;
        }

        @Override
        public final void check(Collection<? extends EObject> objects, String text) {
            throw new IllegalArgumentException(FieldMessages.loadKindHelp);
        }

        @Override
        public final Command set(Collection<? extends EObject> objects, String text) {
            throw new IllegalArgumentException(FieldMessages.loadKindHelp);
        }
    }

    /** At a node or on a member. */
    private static final class Kind extends Fixed {

        @Override
        public String label() {
            return FieldMessages.loadKind;
        }

        @Override
        public String help() {
            return FieldMessages.loadKindHelp;
        }

        @Override
        public String text(EObject load) {
            return atNode(load) ? FieldMessages.loadAtNode : FieldMessages.loadOnMember;
        }
    }

    /** Hands on to the field of the load's own class. */
    private abstract static class EitherKind implements Field {

        private final Field ofNode;
        private final Field ofMember;

        EitherKind(Field ofNode, Field ofMember) {
            this.ofNode = ofNode;
            this.ofMember = ofMember;
        }

        final Field own(EObject load) {
            return atNode(load) ? ofNode : ofMember;
        }

        final Field first(Collection<? extends EObject> loads) {
            return own(loads.iterator().next());
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
        public String text(EObject load) {
            return own(load).text(load);
        }

        @Override
        public String shown(EObject load) {
            return own(load).shown(load);
        }

        @Override
        public Comparable<?> sortKey(EObject load) {
            return own(load).sortKey(load);
        }

        @Override
        public void check(Collection<? extends EObject> loads, String text) {
            first(loads).check(loads, text);
        }

        @Override
        public Command set(Collection<? extends EObject> loads, String text) {
            return first(loads).set(loads, text);
        }
    }

    /** The node or the member. */
    private static final class Target extends EitherKind {

        Target(FieldContext context) {
            super(target(context, Literals.NODE_LOAD__NODE), target(context, Literals.MEMBER_LOAD__MEMBER));
        }

        private static Field target(FieldContext context, EReference reference) {
            return Fields.one(context, null, reference);
        }

        @Override
        public String label() {
            return FieldMessages.loadTarget;
        }

        @Override
        public String help() {
            return FieldMessages.loadTargetHelp;
        }
    }

    /** The number of the load. */
    private static final class Value extends EitherKind {

        Value(FieldContext context) {
            super(value(context), value(context));
        }

        private static Field value(FieldContext context) {
            return Fields.one(context, null, Literals.GRAVITY_LOAD__VALUE);
        }

        @Override
        public String label() {
            return FieldMessages.loadValue;
        }

        @Override
        public String help() {
            return FieldMessages.loadValueHelp;
        }

        @Override
        public boolean isNumber() {
            return true;
        }
    }

    /** The unit of the number, which differs from row to row. */
    private static final class Unit extends Fixed {

        private final FieldContext context;

        Unit(FieldContext context) {
            this.context = context;
        }

        @Override
        public String label() {
            return FieldMessages.loadUnit;
        }

        @Override
        public String help() {
            return FieldMessages.loadValueHelp;
        }

        @Override
        public String text(EObject load) {
            return Units.of(context.model()).symbol(Quantity.of(load, Literals.GRAVITY_LOAD__VALUE));
        }
    }
}
