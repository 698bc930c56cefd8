package org.modewright.model.edit.commands;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.common.command.CompoundCommand;
import org.eclipse.emf.common.command.UnexecutableCommand;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.edit.command.AddCommand;
import org.eclipse.emf.edit.command.RemoveCommand;
import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.modewright.model.structure.StructuralModel;

/** Gathers single changes into one command. */
final class Edit {

    private final EditingDomain domain;
    private final StructuralModel model;
    private final String label;
    private final List<Command> steps = new ArrayList<>();
    private Collection<?> result = List.of();

    Edit(EditingDomain domain, StructuralModel model, String label) {
        this.domain = domain;
        this.model = model;
        this.label = label;
    }

    void set(EObject object, EStructuralFeature feature, Object value) {
        Object old = object.eGet(feature);
        if (feature.isMany() || (value == null ? object.eIsSet(feature) : !value.equals(old))) {
            steps.add(new SetCommand(domain, object, feature, value == null ? SetCommand.UNSET_VALUE : value));
        }
    }

    void add(EObject owner, EStructuralFeature feature, Collection<?> values) {
        steps.add(new AddCommand(domain, owner, feature, values));
    }

    void addAt(EObject owner, EStructuralFeature feature, Object value, int index) {
        steps.add(new AddCommand(domain, owner, feature, value, index));
    }

    void remove(EObject owner, EStructuralFeature feature, Collection<?> values) {
        steps.add(new RemoveCommand(domain, owner, feature, values));
    }

    /** Adds new objects of the root, each to the list of its kind. */
    void add(Collection<? extends EObject> objects) {
        Map<EReference, List<EObject>> byKind = new LinkedHashMap<>();
        for (EObject object : objects) {
            byKind.computeIfAbsent(listOf(object), k -> new ArrayList<>()).add(object);
        }
        byKind.forEach((list, members) -> add(model, list, members));
        result = List.copyOf(objects);
    }

    EReference listOf(EObject object) {
        return model.eClass().getEAllContainments().stream()
                .filter(r -> r.isMany() && r.getEReferenceType().isInstance(object)).findFirst()
                .orElseThrow(() -> new IllegalArgumentException(object.eClass().getName() + " is not a part of a model by itself"));
    }

    /** Removes objects wherever they are held. */
    void removeFromOwners(Collection<? extends EObject> objects) {
        Map<EObject, Map<EReference, List<EObject>>> byOwner = new LinkedHashMap<>();
        for (EObject object : objects) {
            byOwner.computeIfAbsent(object.eContainer(), k -> new LinkedHashMap<>())
                    .computeIfAbsent(object.eContainmentFeature(), k -> new ArrayList<>()).add(object);
        }
        byOwner.forEach((owner, lists) -> lists.forEach((list, members) -> {
            if (list.isMany()) {
                remove(owner, list, members);
            } else {
                set(owner, list, null);
            }
        }));
    }

    /** One command for all steps; one that cannot be executed, and so leaves no trace on the stack, where there is nothing to change. */
    Command toCommand() {
        if (steps.isEmpty()) {
            return UnexecutableCommand.INSTANCE;
        }
        return new OneAct(label, steps, List.copyOf(result));
    }

    /** All steps at once; executable where the first step is, as later steps may build on it. */
    private static final class OneAct extends CompoundCommand {

        private final Collection<?> created;

        OneAct(String label, List<Command> steps, Collection<?> created) {
            super(label, label, new ArrayList<>(steps));
            this.created = created;
        }

        @Override
        protected boolean prepare() {
            return commandList.get(0).canExecute();
        }

        @Override
        public void execute() {
            for (Command step : commandList) {
                if (!step.canExecute()) {
                    undoFrom(commandList.indexOf(step));
                    throw new IllegalStateException(step.getLabel() + " cannot be executed");
                }
                step.execute();
            }
        }

        private void undoFrom(int failed) {
            for (int i = failed - 1; i >= 0; i--) {
                commandList.get(i).undo();
            }
        }

        @Override
        public Collection<?> getResult() {
            return created;
        }

        @Override
        public Collection<?> getAffectedObjects() {
            return created.isEmpty() ? super.getAffectedObjects() : created;
        }
    }
}
