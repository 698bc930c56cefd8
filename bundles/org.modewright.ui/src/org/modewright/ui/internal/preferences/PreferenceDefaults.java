package org.modewright.ui.internal.preferences;

import org.eclipse.core.runtime.preferences.AbstractPreferenceInitializer;
import org.eclipse.core.runtime.preferences.DefaultScope;
import org.eclipse.core.runtime.preferences.IEclipsePreferences;
import org.modewright.ui.AnimationPreferences;
import org.modewright.workspace.WorkspacePreferences;

/** What is set before the user sets anything. */
public final class PreferenceDefaults extends AbstractPreferenceInitializer {

    @Override
    public void initializeDefaultPreferences() {
        IEclipsePreferences defaults = DefaultScope.INSTANCE.getNode(AnimationPreferences.NODE);
        defaults.putInt(AnimationPreferences.AMPLITUDE, 6);
        defaults.putInt(AnimationPreferences.SPEED, 5);
        defaults.putBoolean(AnimationPreferences.PLAY, true);
        DefaultScope.INSTANCE.getNode(WorkspacePreferences.NODE).putBoolean(WorkspacePreferences.RUN_ON_SAVE, true);
    }
}
