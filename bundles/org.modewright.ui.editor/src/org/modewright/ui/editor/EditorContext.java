package org.modewright.ui.editor;

import java.util.Collection;
import java.util.List;
import java.util.Set;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Shell;
import org.modewright.audit.Finding;
import org.modewright.model.edit.commands.StructureCommands;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.StructuralModel;
import org.modewright.ui.AuditSession;
import org.modewright.ui.editor.fields.FieldContext;

/** What the pages, the outline and the commands get from the editor. */
public interface EditorContext {

    StructuralModel model();

    AuditSession session();

    FieldContext fields();

    StructureCommands commands();

    /** The objects selected in the session that this model has, in the model's order. */
    List<Identified> selected();

    /** The object with an id; null if the model has none. */
    Identified object(String id);

    /** Selects objects everywhere. */
    void select(Set<String> ids, Object source);

    /** Executes one command as one step of undo; null and what changes nothing is left alone. */
    void execute(Command command);

    /** Deletes objects, after a question if others go with them. */
    void delete(Collection<? extends EObject> objects);

    /** Selects what a finding is about and shows it. */
    void goTo(Finding finding);

    /** What the live checks have found about an object, the gravest first; empty if nothing. */
    List<Finding> findings(String id);

    /** Ids of all objects that have a place in space. */
    Set<String> drawnIds();

    /** Gives a control the Structure menu, Delete and Rename as its context menu. */
    void offerMenu(Control control);

    Shell shell();
}
