package org.modewright.ui.internal.start;

import org.eclipse.jface.resource.ImageDescriptor;
import org.eclipse.ui.IEditorInput;
import org.eclipse.ui.IPersistableElement;
import org.modewright.ui.internal.Messages;
import org.modewright.ui.widgets.Images;

/** The start page has no content of its own: all its inputs are equal. */
public final class StartPageInput implements IEditorInput {

    @Override
    public boolean exists() {
        return true;
    }

    @Override
    public ImageDescriptor getImageDescriptor() {
        return Images.descriptor("home");
    }

    @Override
    public String getName() {
        return Messages.StartPage_title;
    }

    @Override
    public IPersistableElement getPersistable() {
        return null;
    }

    @Override
    public String getToolTipText() {
        return Messages.StartPage_title;
    }

    @Override
    public <T> T getAdapter(Class<T> adapter) {
        return null;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof StartPageInput;
    }

    @Override
    public int hashCode() {
        return StartPageInput.class.hashCode();
    }
}
