package org.modewright.ui.internal.explorer;

import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.resource.LocalResourceManager;
import org.eclipse.jface.viewers.LabelProvider;
import org.eclipse.swt.graphics.Image;
import org.eclipse.ui.navigator.IDescriptionProvider;
import org.modewright.ui.widgets.Images;

/** Text and icon of the lines below a model file. */
public final class ModelFactLabels extends LabelProvider implements IDescriptionProvider {

    private final LocalResourceManager images = new LocalResourceManager(JFaceResources.getResources());

    @Override
    public String getText(Object element) {
        return element instanceof ModelFact fact ? fact.text() : null;
    }

    @Override
    public Image getImage(Object element) {
        return element instanceof ModelFact fact ? images.get(Images.descriptor(fact.icon())) : null;
    }

    @Override
    public String getDescription(Object element) {
        return getText(element);
    }

    @Override
    public void dispose() {
        images.dispose();
        super.dispose();
    }
}
