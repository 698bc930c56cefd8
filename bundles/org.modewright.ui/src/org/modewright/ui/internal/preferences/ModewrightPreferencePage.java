package org.modewright.ui.internal.preferences;

import java.nio.file.Files;
import java.nio.file.Path;
import org.eclipse.core.runtime.preferences.InstanceScope;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.preference.PreferencePage;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.DirectoryDialog;
import org.eclipse.swt.widgets.Group;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Spinner;
import org.eclipse.swt.widgets.Text;
import org.eclipse.ui.IWorkbench;
import org.eclipse.ui.IWorkbenchPreferencePage;
import org.eclipse.ui.preferences.ScopedPreferenceStore;
import org.modewright.ui.AnimationPreferences;
import org.modewright.ui.UiIds;
import org.modewright.ui.internal.Messages;
import org.modewright.workspace.WorkspacePreferences;

/** Runs, animation and appearance. */
public final class ModewrightPreferencePage extends PreferencePage implements IWorkbenchPreferencePage {

    private final ScopedPreferenceStore runs = new ScopedPreferenceStore(InstanceScope.INSTANCE, WorkspacePreferences.NODE);
    private final ScopedPreferenceStore animation = new ScopedPreferenceStore(InstanceScope.INSTANCE, AnimationPreferences.NODE);
    private Themes themes;
    private Text folder;
    private Spinner threads;
    private Button runOnSave;
    private Spinner amplitude;
    private Spinner speed;
    private Button play;
    private Combo theme;

    @Override
    public void init(IWorkbench workbench) {
        themes = new Themes(workbench);
    }

    @Override
    protected Control createContents(Composite parent) {
        Composite area = new Composite(parent, SWT.NONE);
        GridLayoutFactory.fillDefaults().spacing(8, 12).applyTo(area);
        createRuns(group(area, Messages.Preferences_runs, 3));
        createAnimation(group(area, Messages.Preferences_animation, 3));
        if (themes.areAvailable()) {
            createAppearance(group(area, Messages.Preferences_appearance, 2));
        }
        show();
        return area;
    }

    @Override
    public boolean performOk() {
        runs.setValue(WorkspacePreferences.RULE_PACK_FOLDER, folder.getText().strip());
        runs.setValue(WorkspacePreferences.THREADS, threads.getSelection());
        runs.setValue(WorkspacePreferences.RUN_ON_SAVE, runOnSave.getSelection());
        animation.setValue(AnimationPreferences.AMPLITUDE, amplitude.getSelection());
        animation.setValue(AnimationPreferences.SPEED, speed.getSelection());
        animation.setValue(AnimationPreferences.PLAY, play.getSelection());
        if (theme != null) {
            themes.choose(theme.getSelectionIndex());
        }
        return super.performOk();
    }

    @Override
    protected void performDefaults() {
        folder.setText("");
        threads.setSelection(0);
        runOnSave.setSelection(true);
        amplitude.setSelection(animation.getDefaultInt(AnimationPreferences.AMPLITUDE));
        speed.setSelection(animation.getDefaultInt(AnimationPreferences.SPEED));
        play.setSelection(animation.getDefaultBoolean(AnimationPreferences.PLAY));
        super.performDefaults();
    }

    private static Group group(Composite area, String title, int columns) {
        Group group = new Group(area, SWT.NONE);
        group.setText(title);
        GridLayoutFactory.swtDefaults().numColumns(columns).margins(8, 8).spacing(8, 8).applyTo(group);
        GridDataFactory.fillDefaults().grab(true, false).applyTo(group);
        return group;
    }

    private void createRuns(Composite area) {
        label(area, Messages.Preferences_folder);
        folder = new Text(area, SWT.BORDER);
        folder.setData(UiIds.WIDGET_ID, "preferences.folder");
        GridDataFactory.fillDefaults().grab(true, false).hint(220, SWT.DEFAULT).applyTo(folder);
        folder.addModifyListener(event -> validate());
        Button browse = new Button(area, SWT.PUSH);
        browse.setText(Messages.Preferences_browse);
        browse.addListener(SWT.Selection, event -> browse());
        label(area, Messages.Preferences_threads);
        Composite number = new Composite(area, SWT.NONE);
        GridLayoutFactory.fillDefaults().numColumns(2).spacing(8, 0).applyTo(number);
        GridDataFactory.fillDefaults().span(2, 1).applyTo(number);
        threads = spinner(number, 0, 256);
        label(number, Messages.Preferences_threadsNote);
        runOnSave = new Button(area, SWT.CHECK);
        runOnSave.setText(Messages.Preferences_runOnSave);
        GridDataFactory.swtDefaults().span(3, 1).applyTo(runOnSave);
    }

    private void createAnimation(Composite area) {
        label(area, Messages.Preferences_amplitude);
        amplitude = spinner(area, 1, 50);
        label(area, Messages.Preferences_amplitudeUnit);
        label(area, Messages.Preferences_speed);
        speed = spinner(area, 1, 50);
        speed.setDigits(1);
        label(area, Messages.Preferences_speedUnit);
        play = new Button(area, SWT.CHECK);
        play.setText(Messages.Preferences_play);
        GridDataFactory.swtDefaults().span(3, 1).applyTo(play);
    }

    private void createAppearance(Composite area) {
        label(area, Messages.Preferences_theme);
        theme = new Combo(area, SWT.READ_ONLY);
        theme.setData(UiIds.WIDGET_ID, "preferences.theme");
        theme.setItems(themes.labels());
        theme.select(themes.current());
    }

    private void show() {
        folder.setText(runs.getString(WorkspacePreferences.RULE_PACK_FOLDER));
        threads.setSelection(runs.getInt(WorkspacePreferences.THREADS));
        runOnSave.setSelection(WorkspacePreferences.runsOnSave());
        amplitude.setSelection(animation.getInt(AnimationPreferences.AMPLITUDE));
        speed.setSelection(animation.getInt(AnimationPreferences.SPEED));
        play.setSelection(animation.getBoolean(AnimationPreferences.PLAY));
    }

    private static void label(Composite area, String text) {
        new Label(area, SWT.NONE).setText(text);
    }

    private static Spinner spinner(Composite area, int least, int most) {
        Spinner spinner = new Spinner(area, SWT.BORDER);
        spinner.setMinimum(least);
        spinner.setMaximum(most);
        return spinner;
    }

    private void browse() {
        DirectoryDialog dialog = new DirectoryDialog(getShell(), SWT.OPEN);
        dialog.setText(Messages.Preferences_folder);
        String path = dialog.open();
        if (path != null) {
            folder.setText(path);
        }
    }

    private void validate() {
        String path = folder.getText().strip();
        boolean good = path.isEmpty() || Files.isDirectory(Path.of(path));
        setErrorMessage(good ? null : Messages.Preferences_noFolder);
        setValid(good);
    }
}
