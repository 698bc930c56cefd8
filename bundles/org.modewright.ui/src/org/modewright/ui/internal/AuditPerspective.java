package org.modewright.ui.internal;

import org.eclipse.ui.IFolderLayout;
import org.eclipse.ui.IPageLayout;
import org.eclipse.ui.IPerspectiveFactory;
import org.modewright.ui.UiIds;

/**
 * The perspective of a modal audit: projects and outline to the left, the structure in the middle, the shape of a mode to the right; along
 * the bottom the modes, the mass they capture and what dominates the selected one.
 */
public final class AuditPerspective implements IPerspectiveFactory {

    @Override
    public void createInitialLayout(IPageLayout layout) {
        String editor = layout.getEditorArea();
        IFolderLayout bottom = layout.createFolder("bottom", IPageLayout.BOTTOM, 0.57f, editor);
        bottom.addView(UiIds.MODES_VIEW);
        bottom.addView(IPageLayout.ID_PROBLEM_VIEW);
        bottom.addPlaceholder(IPageLayout.ID_PROGRESS_VIEW);
        layout.createFolder("bottomMiddle", IPageLayout.RIGHT, 0.46f, "bottom").addView(UiIds.CAPTURE_VIEW);
        layout.createFolder("bottomRight", IPageLayout.RIGHT, 0.5f, "bottomMiddle").addView(UiIds.DOMINANCE_VIEW);
        layout.createFolder("left", IPageLayout.LEFT, 0.19f, editor).addView(UiIds.EXPLORER);
        layout.createFolder("leftBottom", IPageLayout.BOTTOM, 0.5f, "left").addView(IPageLayout.ID_OUTLINE);
        IFolderLayout right = layout.createFolder("right", IPageLayout.RIGHT, 0.53f, editor);
        right.addView(UiIds.SHAPE_VIEW);
        addShortcuts(layout);
    }

    private static void addShortcuts(IPageLayout layout) {
        for (String view : new String[] {UiIds.EXPLORER, IPageLayout.ID_OUTLINE, UiIds.MODES_VIEW, UiIds.CAPTURE_VIEW, UiIds.SHAPE_VIEW,
            UiIds.DOMINANCE_VIEW, IPageLayout.ID_PROBLEM_VIEW, IPageLayout.ID_PROP_SHEET, IPageLayout.ID_PROGRESS_VIEW}) {
            layout.addShowViewShortcut(view);
        }
        layout.addPerspectiveShortcut(UiIds.PERSPECTIVE);
    }
}
