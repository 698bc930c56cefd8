package org.modewright.ui.internal;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.ILog;
import org.eclipse.core.runtime.IPath;
import org.eclipse.core.runtime.preferences.IEclipsePreferences;
import org.eclipse.core.runtime.preferences.InstanceScope;
import org.modewright.ui.AnimationPreferences;
import org.osgi.service.prefs.BackingStoreException;

/** The models that were opened last, newest first. */
public final class RecentModels {

    private static final String KEY = "recentModels";
    private static final int MOST = 8;

    private final IEclipsePreferences preferences = InstanceScope.INSTANCE.getNode(AnimationPreferences.NODE);

    /** Puts a model at the head of the list. */
    public void opened(IFile model) {
        List<String> paths = new ArrayList<>(paths());
        String path = model.getFullPath().toPortableString();
        paths.remove(path);
        paths.add(0, path);
        preferences.put(KEY, String.join("\n", paths.subList(0, Math.min(MOST, paths.size()))));
        try {
            preferences.flush();
        } catch (BackingStoreException failure) {
            ILog.of(RecentModels.class).warn("The list of recent models could not be kept.", failure);
        }
    }

    /** The models that are still there. */
    public List<IFile> list() {
        return paths().stream().map(IPath::fromPortableString).filter(path -> path.segmentCount() > 1)
                .map(ResourcesPlugin.getWorkspace().getRoot()::getFile).filter(IFile::isAccessible).toList();
    }

    private List<String> paths() {
        String joined = preferences.get(KEY, "");
        return joined.isEmpty() ? List.of() : List.of(joined.split("\n"));
    }
}
