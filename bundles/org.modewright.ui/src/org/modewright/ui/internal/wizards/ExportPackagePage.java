package org.modewright.ui.internal.wizards;

import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import org.eclipse.core.resources.IFile;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.wizard.WizardPage;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.DirectoryDialog;
import org.eclipse.swt.widgets.FileDialog;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import org.modewright.ui.UiIds;
import org.modewright.ui.internal.Messages;
import org.modewright.ui.widgets.Images;

/** Where the table package goes. */
final class ExportPackagePage extends WizardPage {

    private final IFile file;
    private Text target;

    ExportPackagePage(IFile file) {
        super("exportPackage", Messages.Export_title, Images.descriptor("wizard"));
        this.file = file;
        setDescription(Messages.Export_description);
    }

    @Override
    public void createControl(Composite parent) {
        Composite area = new Composite(parent, SWT.NONE);
        GridLayoutFactory.swtDefaults().numColumns(4).margins(12, 12).spacing(8, 8).applyTo(area);
        new Label(area, SWT.NONE).setText(Messages.Export_target);
        target = new Text(area, SWT.BORDER);
        target.setData(UiIds.WIDGET_ID, "export.target");
        target.setMessage(Messages.Export_targetHint);
        GridDataFactory.fillDefaults().grab(true, false).applyTo(target);
        target.addModifyListener(event -> validate());
        button(area, Messages.Import_folder, this::browseFolder);
        button(area, Messages.Import_zip, this::browseZip);
        setControl(area);
        validate();
        setErrorMessage(null);
        target.setFocus();
    }

    /** The folder or zip file to write. */
    Path target() {
        return Path.of(target.getText().strip());
    }

    private static void button(Composite area, String text, Runnable action) {
        Button button = new Button(area, SWT.PUSH);
        button.setText(text);
        button.addListener(SWT.Selection, event -> action.run());
    }

    private void browseFolder() {
        DirectoryDialog dialog = new DirectoryDialog(getShell(), SWT.SAVE);
        dialog.setText(Messages.Export_title);
        choose(dialog.open());
    }

    private void browseZip() {
        FileDialog dialog = new FileDialog(getShell(), SWT.SAVE);
        dialog.setText(Messages.Export_title);
        dialog.setFilterExtensions(new String[] {"*.zip"});
        dialog.setFileName(file.getFullPath().removeFileExtension().lastSegment() + ".zip");
        dialog.setOverwrite(true);
        choose(dialog.open());
    }

    private void choose(String path) {
        if (path != null) {
            target.setText(path);
        }
    }

    private void validate() {
        String problem = problem();
        setErrorMessage(target.getText().isBlank() ? null : problem);
        setPageComplete(problem == null);
    }

    private String problem() {
        if (target.getText().isBlank()) {
            return Messages.Export_noTarget;
        }
        try {
            Path folder = target().toAbsolutePath().getParent();
            return folder == null || Files.isDirectory(folder) ? null : NLS.bind(Messages.Export_noFolder, folder);
        } catch (InvalidPathException wrong) {
            return Messages.Export_noTarget;
        }
    }
}
