package org.modewright.ui;

import org.eclipse.core.resources.IFile;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.eclipse.ui.IEditorPart;
import org.modewright.model.structure.StructuralModel;

/** An editor of a structural model, as the audit session sees it. */
public interface StructureEditorPart extends IEditorPart {

    /** The edited file; never null once the editor is open. */
    IFile getModelFile();

    /** The model as it stands in the editor, saved or not; null if the file could not be read. */
    StructuralModel getLiveModel();

    /** The domain whose command stack carries every edit; null if the file could not be read. */
    EditingDomain getEditingDomain();

    /**
     * Selects an element, scrolls to it and shows its properties.
     *
     * @param elementId model id
     * @return whether the model has such an element
     */
    boolean reveal(String elementId);

    /** Adds a listener that is called on the user interface's thread after every edit, undo, redo and reload of the model. */
    void addModelListener(Runnable listener);

    void removeModelListener(Runnable listener);
}
