package org.modewright.ui.internal.preferences;

import java.util.List;
import org.eclipse.e4.ui.css.swt.theme.ITheme;
import org.eclipse.e4.ui.css.swt.theme.IThemeEngine;
import org.eclipse.ui.IWorkbench;
import org.modewright.ui.internal.Messages;

/** The light and the dark theme of the platform; only those that are installed are offered. */
public final class Themes {

    private static final String DARK = "org.eclipse.e4.ui.css.theme.e4_dark";
    private static final String LIGHT = "org.eclipse.e4.ui.css.theme.e4_default";

    private final IThemeEngine engine;
    private final List<ITheme> offered;

    public Themes(IWorkbench workbench) {
        engine = workbench.getService(IThemeEngine.class);
        offered = engine == null ? List.of() : engine.getThemes().stream().filter(theme -> isLight(theme) || isDark(theme)).toList();
    }

    /** Whether there is a choice. */
    public boolean areAvailable() {
        return offered.size() > 1;
    }

    String[] labels() {
        return offered.stream().map(theme -> isDark(theme) ? Messages.Themes_dark : Messages.Themes_light).toArray(String[]::new);
    }

    int current() {
        ITheme active = engine.getActiveTheme();
        return active == null ? 0 : Math.max(0, offered.stream().map(ITheme::getId).toList().indexOf(active.getId()));
    }

    void choose(int index) {
        if (index >= 0 && index != current()) {
            engine.setTheme(offered.get(index), true);
        }
    }

    private static boolean isDark(ITheme theme) {
        return theme.getId().equals(DARK);
    }

    private static boolean isLight(ITheme theme) {
        return theme.getId().equals(LIGHT);
    }
}
