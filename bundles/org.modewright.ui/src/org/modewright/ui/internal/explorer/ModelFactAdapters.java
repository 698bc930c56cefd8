package org.modewright.ui.internal.explorer;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.IAdapterFactory;

/** A line below a model stands for the model's file. */
public final class ModelFactAdapters implements IAdapterFactory {

    @Override
    public <T> T getAdapter(Object object, Class<T> type) {
        return object instanceof ModelFact fact && type.isAssignableFrom(IFile.class) ? type.cast(fact.file()) : null;
    }

    @Override
    public Class<?>[] getAdapterList() {
        return new Class<?>[] {IFile.class, IResource.class};
    }
}
