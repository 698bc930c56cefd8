package org.modewright.ui.editor.pages;

import org.eclipse.jface.resource.ImageDescriptor;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.resource.LocalResourceManager;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.ToolBar;
import org.eclipse.swt.widgets.ToolItem;
import org.modewright.ui.UiIds;
import org.osgi.framework.FrameworkUtil;

/** A small tool bar over a table: an icon for each act, its name in the tooltip. */
final class Tools {

    private final ToolBar bar;
    private final LocalResourceManager images;

    Tools(Composite parent) {
        bar = new ToolBar(parent, SWT.FLAT | SWT.RIGHT);
        images = new LocalResourceManager(JFaceResources.getResources(), bar);
    }

    ToolBar bar() {
        return bar;
    }

    /** An icon of this bundle. */
    static ImageDescriptor image(String name) {
        return ImageDescriptor.createFromURL(FrameworkUtil.getBundle(Tools.class).getEntry("icons/" + name + ".png"));
    }

    /** An act with an icon. */
    ToolItem add(ImageDescriptor image, String name, String id, Runnable body) {
        ToolItem item = item(id, body);
        item.setImage(images.get(image));
        item.setToolTipText(name);
        return item;
    }

    /** An act with an icon and a word. */
    ToolItem add(ImageDescriptor image, String word, String name, String id, Runnable body) {
        ToolItem item = add(image, name, id, body);
        item.setText(word);
        return item;
    }

    private ToolItem item(String id, Runnable body) {
        ToolItem item = new ToolItem(bar, SWT.PUSH);
        item.setData(UiIds.WIDGET_ID, id);
        item.addListener(SWT.Selection, event -> body.run());
        return item;
    }
}
