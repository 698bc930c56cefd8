package org.modewright.ui.internal.wizards;

import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.wizard.WizardPage;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import org.modewright.model.ModelFile;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.UnitSystem;
import org.modewright.samples.Sample;
import org.modewright.samples.Samples;
import org.modewright.ui.UiIds;
import org.modewright.ui.internal.Messages;
import org.modewright.ui.widgets.Images;
import org.modewright.ui.widgets.ThemeColours;

/** Name, units and the first model of a new project. */
final class NewProjectPage extends WizardPage {

    private static final int INDENT = 20;
    private static final int WRAP = 420;

    private final List<Sample> samples = Samples.all();
    private Text name;
    private Combo units;
    private Button empty;
    private Button fromSample;
    private Combo sample;
    private Label description;

    NewProjectPage() {
        super("newProject", Messages.NewProject_title, Images.descriptor("wizard"));
        setDescription(Messages.NewProject_description);
    }

    @Override
    public void createControl(Composite parent) {
        Composite area = new Composite(parent, SWT.NONE);
        GridLayoutFactory.swtDefaults().numColumns(2).margins(12, 12).spacing(8, 8).applyTo(area);
        new Label(area, SWT.NONE).setText(Messages.NewProject_name);
        name = new Text(area, SWT.BORDER);
        name.setData(UiIds.WIDGET_ID, "newProject.name");
        GridDataFactory.fillDefaults().grab(true, false).applyTo(name);
        createStart(area);
        setControl(area);
        name.addModifyListener(event -> validate());
        enable();
        validate();
        setErrorMessage(null);
        name.setFocus();
    }

    String projectName() {
        return name.getText().strip();
    }

    String modelName() {
        if (empty.getSelection()) {
            return projectName();
        }
        String file = chosen().fileName();
        return file.substring(0, file.length() - ModelFile.EXTENSION.length() - 1);
    }

    /** The first model. */
    StructuralModel model() throws IOException {
        if (empty.getSelection()) {
            StructuralModel model = ModelFile.create(projectName());
            model.setUnits(UnitSystem.get(units.getText()));
            return model;
        }
        try (InputStream bytes = chosen().open()) {
            return ModelFile.load(bytes, chosen().fileName());
        }
    }

    private void createStart(Composite area) {
        Label heading = new Label(area, SWT.NONE);
        heading.setText(Messages.NewProject_start);
        GridDataFactory.swtDefaults().span(2, 1).indent(0, 8).applyTo(heading);
        empty = radio(area, Messages.NewProject_empty, "newProject.empty");
        empty.setSelection(true);
        Label unitsLabel = new Label(area, SWT.NONE);
        unitsLabel.setText(Messages.NewProject_units);
        GridDataFactory.swtDefaults().indent(INDENT, 0).applyTo(unitsLabel);
        units = new Combo(area, SWT.READ_ONLY);
        units.setItems(UnitSystem.VALUES.stream().map(UnitSystem::getLiteral).toArray(String[]::new));
        units.setText(UnitSystem.KILONEWTON_METRE.getLiteral());
        units.setData(UiIds.WIDGET_ID, "newProject.units");
        fromSample = radio(area, Messages.NewProject_sample, "newProject.fromSample");
        sample = new Combo(area, SWT.READ_ONLY);
        sample.setItems(samples.stream().map(Sample::title).toArray(String[]::new));
        sample.select(0);
        sample.setData(UiIds.WIDGET_ID, "newProject.sample");
        GridDataFactory.fillDefaults().span(2, 1).indent(INDENT, 0).applyTo(sample);
        description = new Label(area, SWT.WRAP);
        description.setForeground(ThemeColours.secondaryText(area));
        GridDataFactory.fillDefaults().span(2, 1).indent(INDENT, 0).hint(WRAP, SWT.DEFAULT).grab(true, false).applyTo(description);
        sample.addListener(SWT.Selection, event -> describe());
        describe();
    }

    private Button radio(Composite area, String text, String id) {
        Button button = new Button(area, SWT.RADIO);
        button.setText(text);
        button.setData(UiIds.WIDGET_ID, id);
        GridDataFactory.swtDefaults().span(2, 1).applyTo(button);
        button.addListener(SWT.Selection, event -> enable());
        return button;
    }

    private void enable() {
        units.setEnabled(empty.getSelection());
        sample.setEnabled(fromSample.getSelection());
        description.setEnabled(fromSample.getSelection());
    }

    private void describe() {
        description.setText(samples.isEmpty() ? "" : notes(chosen()));
        description.getParent().layout(true, true);
    }

    private static String notes(Sample sample) {
        try (InputStream bytes = sample.open()) {
            String notes = ModelFile.load(bytes, sample.fileName()).getNotes();
            return notes == null ? "" : notes;
        } catch (IOException failure) {
            return failure.getMessage();
        }
    }

    private Sample chosen() {
        return samples.get(Math.max(0, sample.getSelectionIndex()));
    }

    private void validate() {
        String problem = ProjectNames.problem(ResourcesPlugin.getWorkspace(), projectName(), false);
        setErrorMessage(projectName().isEmpty() ? null : problem);
        setPageComplete(problem == null);
    }
}
