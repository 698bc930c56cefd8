package org.modewright.ui.widgets;

import java.net.URL;
import org.eclipse.jface.resource.ImageDescriptor;
import org.osgi.framework.Bundle;
import org.osgi.framework.FrameworkUtil;

/**
 * The product's own icons, as descriptors: whoever makes an image from one disposes of it, best through a
 * {@link org.eclipse.jface.resource.LocalResourceManager}. Twice as large versions for dense screens are found by themselves.
 */
public final class Images {

    public static final String PRODUCT = "product";
    public static final String MODEL_FILE = "modelFile";
    public static final String RESULT_FILE = "resultFile";
    public static final String PROJECT = "project";
    public static final String RUN = "run";
    public static final String STOP = "stop";
    public static final String MODES = "modes";
    public static final String CAPTURE = "capture";
    public static final String SHAPE = "shape";
    public static final String DOMINANCE = "dominance";
    public static final String PLAY = "play";
    public static final String PAUSE = "pause";
    public static final String STEP_FORWARD = "stepForward";
    public static final String STEP_BACK = "stepBack";
    public static final String NEXT = "next";
    public static final String PREVIOUS = "previous";
    public static final String SECTIONS = "sections";
    public static final String NODES = "nodes";
    public static final String FIT = "fit";
    public static final String VIEW_PLAN = "viewPlan";
    public static final String VIEW_FRONT = "viewFront";
    public static final String VIEW_SIDE = "viewSide";
    public static final String VIEW_SPACE = "viewSpace";
    public static final String GHOST = "ghost";
    public static final String LABELS = "labels";
    public static final String COLOUR = "colour";
    public static final String CAMERA = "camera";
    public static final String FILTER = "filter";
    public static final String COLUMNS = "columns";
    public static final String COPY = "copy";
    public static final String PASSED = "passed";
    public static final String FAILED = "failed";
    public static final String NOT_JUDGED = "notJudged";
    public static final String INFORMATION = "information";
    public static final String WARNING = "warning";
    public static final String ERROR = "error";
    public static final String LOCAL_MODE = "localMode";
    public static final String CLOSE_MODES = "closeModes";
    public static final String NEW_PROJECT = "newProject";
    public static final String IMPORT = "import";
    public static final String EXPORT = "export";
    public static final String SAMPLE = "sample";
    public static final String ADD = "add";
    public static final String DELETE = "delete";
    public static final String EDIT = "edit";
    public static final String LINK = "link";

    private Images() {
    }

    /**
     * The descriptor of an icon.
     *
     * @param name one of the names above, or of another file in the folder icons of the bundle org.modewright.ui
     */
    public static ImageDescriptor descriptor(String name) {
        Bundle bundle = FrameworkUtil.getBundle(Images.class);
        URL address = bundle == null ? Images.class.getResource("/icons/" + name + ".png") : bundle.getEntry("icons/" + name + ".png");
        return address == null ? ImageDescriptor.getMissingImageDescriptor() : ImageDescriptor.createFromURL(address);
    }
}
