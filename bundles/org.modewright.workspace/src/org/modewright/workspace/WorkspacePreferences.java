package org.modewright.workspace;

import java.nio.file.Path;
import java.util.Optional;
import org.eclipse.core.runtime.Platform;
import org.eclipse.core.runtime.preferences.IPreferencesService;

/** What the user has set for runs. */
public final class WorkspacePreferences {

    /** Name of the preference node. */
    public static final String NODE = "org.modewright.workspace";

    /** Key: folder of the office's own rule packs; blank: none. */
    public static final String RULE_PACK_FOLDER = "rulePackFolder";

    /** Key: number of threads of a run; 0: as many as the computer has processors. */
    public static final String THREADS = "threads";

    /** Key: whether a model that has been run before is run again when it is saved. */
    public static final String RUN_ON_SAVE = "runOnSave";

    private WorkspacePreferences() {
    }

    /** The folder of the office's own rule packs. */
    public static Optional<Path> rulePackFolder() {
        String folder = service().getString(NODE, RULE_PACK_FOLDER, "", null).strip();
        return folder.isEmpty() ? Optional.empty() : Optional.of(Path.of(folder));
    }

    /** Threads of a run, at least 1. */
    public static int threads() {
        int set = service().getInt(NODE, THREADS, 0, null);
        return set > 0 ? set : Runtime.getRuntime().availableProcessors();
    }

    /** Whether a model that has been run before is run again when it is saved. */
    public static boolean runsOnSave() {
        return service().getBoolean(NODE, RUN_ON_SAVE, true, null);
    }

    private static IPreferencesService service() {
        return Platform.getPreferencesService();
    }
}
