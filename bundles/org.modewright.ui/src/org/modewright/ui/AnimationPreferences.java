package org.modewright.ui;

import org.eclipse.core.runtime.Platform;

/** How mode shapes are animated unless a view is told otherwise. */
public final class AnimationPreferences {

    /** Name of the preference node. */
    public static final String NODE = "org.modewright.ui";

    /** Key: largest displacement as percent of the size of the structure. */
    public static final String AMPLITUDE = "animation.amplitudePercent";

    /** Key: tenths of a cycle a second. */
    public static final String SPEED = "animation.speedTenths";

    /** Key: whether a shape plays as soon as a mode is selected. */
    public static final String PLAY = "animation.play";

    private static final int STANDARD_AMPLITUDE = 6;
    private static final int STANDARD_SPEED = 5;

    private AnimationPreferences() {
    }

    /** Largest displacement as a share of the size of the structure, 0.01 to 0.5. */
    public static double amplitude() {
        int percent = Platform.getPreferencesService().getInt(NODE, AMPLITUDE, STANDARD_AMPLITUDE, null);
        return Math.max(1, Math.min(50, percent)) / 100.0;
    }

    /** Cycles a second, 0.1 to 5. */
    public static double speed() {
        int tenths = Platform.getPreferencesService().getInt(NODE, SPEED, STANDARD_SPEED, null);
        return Math.max(1, Math.min(50, tenths)) / 10.0;
    }

    /** Whether a shape plays as soon as a mode is selected. */
    public static boolean plays() {
        return Platform.getPreferencesService().getBoolean(NODE, PLAY, true, null);
    }
}
