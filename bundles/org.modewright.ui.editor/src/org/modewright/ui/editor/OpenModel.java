package org.modewright.ui.editor;

import java.nio.file.Path;
import org.eclipse.emf.common.command.BasicCommandStack;
import org.eclipse.emf.edit.domain.AdapterFactoryEditingDomain;
import org.modewright.model.ModelFile;
import org.modewright.model.ModelFileException;
import org.modewright.model.edit.StructureEditAdapterFactory;
import org.modewright.model.structure.StructuralModel;

/** A model read from its file, with what editing it needs; or the reason why it could not be read. */
final class OpenModel {

    private final StructureEditAdapterFactory adapterFactory = new StructureEditAdapterFactory();
    private final BasicCommandStack stack = new BasicCommandStack();
    private final AdapterFactoryEditingDomain domain = new AdapterFactoryEditingDomain(adapterFactory, stack);
    private final StructuralModel model;
    private final ModelFileException failure;
    private ModelIndex index;

    private OpenModel(StructuralModel model, ModelFileException failure) {
        this.model = model;
        this.failure = failure;
    }

    /**
     * Reads a file.
     *
     * @param whenEdited called after every edit, undo and redo
     */
    static OpenModel read(Path file, Runnable whenEdited) {
        try {
            OpenModel open = new OpenModel(ModelFile.load(file), null);
            open.domain.getResourceSet().getResources().add(open.model.eResource());
            open.stack.addCommandStackListener(event -> {
                open.index = null;
                whenEdited.run();
            });
            return open;
        } catch (ModelFileException fault) {
            return new OpenModel(null, fault);
        }
    }

    /** The model; null if the file could not be read. */
    StructuralModel model() {
        return model;
    }

    /** Why the file could not be read; null if it was. */
    ModelFileException failure() {
        return failure;
    }

    AdapterFactoryEditingDomain domain() {
        return domain;
    }

    StructureEditAdapterFactory adapterFactory() {
        return adapterFactory;
    }

    /** The objects by id, as they stand after the last edit. */
    ModelIndex index() {
        if (index == null) {
            index = new ModelIndex(model);
        }
        return index;
    }

    boolean isDirty() {
        return stack.isSaveNeeded();
    }

    void saved() {
        stack.saveIsDone();
    }

    void dispose() {
        adapterFactory.dispose();
    }
}
