package org.modewright.rcp;

import org.eclipse.core.runtime.Platform;
import org.eclipse.jface.resource.ImageDescriptor;
import org.eclipse.ui.application.IWorkbenchConfigurer;
import org.eclipse.ui.ide.IDE;
import org.modewright.ui.widgets.Images;
import org.osgi.framework.Bundle;

/** Images by which the platform's views of resources and problems know projects and severities; the application declares them. */
final class ResourceImages {

    private static final String FOLDER = "icons/full/";

    private final IWorkbenchConfigurer configurer;
    private final Bundle resources = Platform.getBundle("org.eclipse.ui.ide");

    ResourceImages(IWorkbenchConfigurer configurer) {
        this.configurer = configurer;
    }

    void declare() {
        own(IDE.SharedImages.IMG_OBJ_PROJECT, "project");
        platform(IDE.SharedImages.IMG_OBJ_PROJECT_CLOSED, "obj16/cprj_obj.png");
        platform(IDE.SharedImages.IMG_OPEN_MARKER, "elcl16/gotoobj_tsk.png");
        platform("IMG_ETOOL_PROBLEM_CATEGORY", "etool16/problem_category.png");
        platform("IMG_ETOOL_PROBLEMS_VIEW", "eview16/problems_view.png");
        platform("IMG_ETOOL_PROBLEMS_VIEW_ERROR", "eview16/problems_view_error.png");
        platform("IMG_ETOOL_PROBLEMS_VIEW_WARNING", "eview16/problems_view_warning.png");
        platform("IMG_ETOOL_PROBLEMS_VIEW_INFO", "eview16/problems_view_info.png");
        own("IMG_OBJS_ERROR_PATH", "error");
        own("IMG_OBJS_WARNING_PATH", "warning");
        own("IMG_OBJS_INFO_PATH", "information");
        platform("IMG_DLCL_QUICK_FIX_DISABLED", "dlcl16/smartmode_co.png");
        platform("IMG_ELCL_QUICK_FIX_ENABLED", "elcl16/smartmode_co.png");
    }

    private void platform(String id, String path) {
        if (resources != null && resources.getEntry(FOLDER + path) != null) {
            configurer.declareImage(id, ImageDescriptor.createFromURL(resources.getEntry(FOLDER + path)), true);
        }
    }

    private void own(String id, String name) {
        configurer.declareImage(id, Images.descriptor(name), true);
    }
}
