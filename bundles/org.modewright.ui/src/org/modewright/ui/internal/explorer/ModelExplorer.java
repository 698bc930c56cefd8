package org.modewright.ui.internal.explorer;

import org.eclipse.core.resources.IResourceChangeEvent;
import org.eclipse.core.resources.IResourceChangeListener;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StackLayout;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.ui.navigator.CommonNavigator;
import org.eclipse.ui.navigator.CommonViewer;
import org.modewright.ui.UiIds;
import org.modewright.ui.internal.Actions;
import org.modewright.ui.internal.Messages;
import org.modewright.ui.widgets.EmptyState;

/** The projects with their models; without a project it says how to begin. */
public final class ModelExplorer extends CommonNavigator {

    private final IResourceChangeListener listener = this::resourcesChanged;
    private final StackLayout stack = new StackLayout();
    private Composite area;
    private Composite tree;
    private EmptyState empty;

    @Override
    public void createPartControl(Composite parent) {
        area = new Composite(parent, SWT.NONE);
        area.setLayout(stack);
        tree = new Composite(area, SWT.NONE);
        tree.setLayout(new FillLayout());
        empty = new EmptyState(area);
        empty.show(Messages.Explorer_empty, Messages.SessionPage_openSample, Actions::openSample);
        super.createPartControl(tree);
        getCommonViewer().getTree().setData(UiIds.WIDGET_ID, "explorer");
        ResourcesPlugin.getWorkspace().addResourceChangeListener(listener, IResourceChangeEvent.POST_CHANGE);
        show();
    }

    @Override
    public void setFocus() {
        if (stack.topControl == empty) {
            empty.setFocus();
        } else {
            super.setFocus();
        }
    }

    @Override
    public void dispose() {
        ResourcesPlugin.getWorkspace().removeResourceChangeListener(listener);
        super.dispose();
    }

    @Override
    protected CommonViewer createCommonViewerObject(Composite parent) {
        CommonViewer viewer = super.createCommonViewerObject(parent);
        viewer.setAutoExpandLevel(2);
        return viewer;
    }

    private void resourcesChanged(IResourceChangeEvent event) {
        if (!area.isDisposed()) {
            area.getDisplay().asyncExec(this::show);
        }
    }

    private void show() {
        if (area.isDisposed()) {
            return;
        }
        Control top = ResourcesPlugin.getWorkspace().getRoot().getProjects().length == 0 ? empty : tree;
        if (stack.topControl != top) {
            stack.topControl = top;
            area.layout(true, true);
        }
    }
}
