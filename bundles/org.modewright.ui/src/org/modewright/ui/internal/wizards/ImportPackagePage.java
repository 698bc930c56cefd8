package org.modewright.ui.internal.wizards;

import java.lang.reflect.InvocationTargetException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Arrays;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.Adapters;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.jface.wizard.WizardPage;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.DirectoryDialog;
import org.eclipse.swt.widgets.FileDialog;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import org.modewright.model.structure.StructuralModel;
import org.modewright.ui.UiIds;
import org.modewright.ui.internal.Messages;
import org.modewright.ui.widgets.Images;
import org.modewright.ui.widgets.Numbers;
import org.modewright.workspace.ModelProjects;

/** Where the package is, what is in it, and where it goes. */
final class ImportPackagePage extends WizardPage {

    private static final int PAUSE = 400;

    private final Runnable reading = this::read;
    private String proposedProject = "";
    private Text source;
    private PackagePreview preview;
    private Combo project;
    private Text file;
    private PackageReading read;
    private boolean fileEdited;
    private boolean naming;

    ImportPackagePage() {
        super("importPackage", Messages.Import_title, Images.descriptor("wizard"));
        setDescription(Messages.Import_description);
    }

    void propose(IStructuredSelection selection) {
        IResource resource = Adapters.adapt(selection.getFirstElement(), IResource.class);
        proposedProject = resource == null || resource.getProject() == null ? "" : resource.getProject().getName();
    }

    @Override
    public void createControl(Composite parent) {
        Composite area = new Composite(parent, SWT.NONE);
        GridLayoutFactory.swtDefaults().numColumns(4).margins(12, 12).spacing(8, 8).applyTo(area);
        createSource(area);
        preview = new PackagePreview(area);
        GridDataFactory.fillDefaults().span(4, 1).grab(true, true).hint(560, 220).applyTo(preview);
        createTarget(area);
        setControl(area);
        validate();
        setErrorMessage(null);
        source.setFocus();
    }

    String projectName() {
        return project.getText().strip();
    }

    String modelName() {
        return file.getText().strip();
    }

    /** The model that was read; only when the page is complete. */
    StructuralModel model() {
        return read.imported().model();
    }

    @Override
    public void dispose() {
        if (source != null && !source.isDisposed()) {
            source.getDisplay().timerExec(-1, reading);
        }
        super.dispose();
    }

    private void createSource(Composite area) {
        new Label(area, SWT.NONE).setText(Messages.Import_source);
        source = new Text(area, SWT.BORDER);
        source.setData(UiIds.WIDGET_ID, "import.source");
        source.setMessage(Messages.Import_sourceHint);
        GridDataFactory.fillDefaults().grab(true, false).applyTo(source);
        source.addModifyListener(event -> sourceChanged());
        button(area, Messages.Import_folder, this::browseFolder);
        button(area, Messages.Import_zip, this::browseZip);
    }

    private void createTarget(Composite area) {
        new Label(area, SWT.NONE).setText(Messages.Import_project);
        project = new Combo(area, SWT.DROP_DOWN);
        project.setItems(Arrays.stream(ResourcesPlugin.getWorkspace().getRoot().getProjects()).filter(IProject::isOpen)
                .map(IProject::getName).toArray(String[]::new));
        project.setText(proposedProject);
        project.setData(UiIds.WIDGET_ID, "import.project");
        GridDataFactory.fillDefaults().grab(true, false).span(3, 1).applyTo(project);
        project.addModifyListener(event -> validate());
        new Label(area, SWT.NONE).setText(Messages.Import_file);
        file = new Text(area, SWT.BORDER);
        file.setData(UiIds.WIDGET_ID, "import.file");
        GridDataFactory.fillDefaults().grab(true, false).span(3, 1).applyTo(file);
        file.addModifyListener(event -> {
            fileEdited |= !naming;
            validate();
        });
    }

    private static void button(Composite area, String text, Runnable action) {
        Button button = new Button(area, SWT.PUSH);
        button.setText(text);
        button.addListener(SWT.Selection, event -> action.run());
    }

    private void browseFolder() {
        DirectoryDialog dialog = new DirectoryDialog(getShell(), SWT.OPEN);
        dialog.setText(Messages.Import_title);
        choose(dialog.open());
    }

    private void browseZip() {
        FileDialog dialog = new FileDialog(getShell(), SWT.OPEN);
        dialog.setText(Messages.Import_title);
        dialog.setFilterExtensions(new String[] {"*.zip", "*"});
        choose(dialog.open());
    }

    private void choose(String path) {
        if (path != null) {
            source.setText(path);
        }
    }

    private void sourceChanged() {
        read = null;
        preview.clear();
        validate();
        source.getDisplay().timerExec(PAUSE, reading);
    }

    private void read() {
        Path path = source.isDisposed() ? null : path();
        if (path == null || !Files.exists(path)) {
            return;
        }
        PackageReading next = new PackageReading(path);
        try {
            getContainer().run(true, false, next);
        } catch (InvocationTargetException failure) {
            setErrorMessage(failure.getCause().getMessage());
            return;
        } catch (InterruptedException cancelled) {
            return;
        }
        read = next;
        if (next.imported() == null) {
            preview.showProblems(next.problems());
        } else {
            preview.showContent(next.imported());
            propose(next.imported().model(), path);
        }
        validate();
    }

    private void propose(StructuralModel model, Path path) {
        String stem = model.getName() == null || model.getName().isBlank() ? path.getFileName().toString() : model.getName();
        String name = ModelProjects.fileName(stem);
        naming = true;
        if (!fileEdited) {
            file.setText(name);
        }
        if (project.getText().isBlank()) {
            project.setText(name);
        }
        naming = false;
    }

    private Path path() {
        String text = source.getText().strip();
        try {
            return text.isEmpty() ? null : Path.of(text);
        } catch (InvalidPathException wrong) {
            return null;
        }
    }

    private void validate() {
        String problem = problem();
        setErrorMessage(source.getText().isBlank() ? null : problem);
        setPageComplete(problem == null);
    }

    private String problem() {
        Path path = path();
        if (path == null || !Files.exists(path)) {
            return Messages.Import_noSource;
        }
        if (read == null) {
            return Messages.Import_reading;
        }
        if (read.imported() == null) {
            return NLS.bind(Messages.Import_faulty, Numbers.counted(read.total(), Messages.Import_oneError, Messages.Import_errors));
        }
        if (modelName().isEmpty()) {
            return Messages.Import_noFile;
        }
        return ProjectNames.problem(ResourcesPlugin.getWorkspace(), projectName(), true);
    }
}
