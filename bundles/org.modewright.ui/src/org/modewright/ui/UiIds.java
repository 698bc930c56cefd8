package org.modewright.ui;

/** Ids that the workbench's parts share. */
public final class UiIds {

    public static final String PERSPECTIVE = "org.modewright.ui.perspective";

    public static final String EXPLORER = "org.modewright.ui.explorer";
    public static final String MODES_VIEW = "org.modewright.ui.modes.view";
    public static final String CAPTURE_VIEW = "org.modewright.ui.capture.view";
    public static final String SHAPE_VIEW = "org.modewright.ui.shape.view";
    public static final String DOMINANCE_VIEW = "org.modewright.ui.dominance.view";

    public static final String STRUCTURE_EDITOR = "org.modewright.ui.editor.structure";
    public static final String START_PAGE = "org.modewright.ui.startPage";

    public static final String RUN_COMMAND = "org.modewright.ui.command.run";
    public static final String CANCEL_COMMAND = "org.modewright.ui.command.cancel";
    public static final String IMPORT_COMMAND = "org.modewright.ui.command.import";
    public static final String EXPORT_COMMAND = "org.modewright.ui.command.export";
    public static final String NEW_PROJECT_COMMAND = "org.modewright.ui.command.newProject";
    public static final String OPEN_SAMPLE_COMMAND = "org.modewright.ui.command.openSample";
    public static final String START_PAGE_COMMAND = "org.modewright.ui.command.startPage";

    /** Key of {@link org.eclipse.swt.widgets.Widget#setData(String, Object)} under which widgets carry their name for tests. */
    public static final String WIDGET_ID = "org.modewright.id";

    private UiIds() {
    }
}
