package org.modewright.ui.internal.wizards;

import java.io.IOException;
import java.lang.reflect.InvocationTargetException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.runtime.SubMonitor;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.jface.wizard.Wizard;
import org.eclipse.ui.IExportWizard;
import org.eclipse.ui.IWorkbench;
import org.modewright.exchange.TablePackage;
import org.modewright.model.Snapshots;
import org.modewright.model.structure.StructuralModel;
import org.modewright.ui.internal.Messages;

/** Writes a model as a table package and says what the package cannot hold. */
public final class ExportPackageWizard extends Wizard implements IExportWizard {

    private final StructuralModel model;
    private final ExportPackagePage page;

    /**
     * @param model what is exported
     * @param file the model's file, from which a name is proposed
     */
    public ExportPackageWizard(StructuralModel model, IFile file) {
        this.model = Snapshots.copy(model);
        page = new ExportPackagePage(file);
        setWindowTitle(Messages.Export_title);
        setNeedsProgressMonitor(true);
    }

    @Override
    public void init(IWorkbench workbench, IStructuredSelection selection) {
        // What is exported is given to the constructor.
    }

    @Override
    public void addPages() {
        addPage(page);
    }

    @Override
    public boolean performFinish() {
        Path target = page.target();
        List<String> remarks = new ArrayList<>();
        try {
            getContainer().run(true, false, monitor -> {
                SubMonitor.convert(monitor, Messages.Export_writing, 1);
                try {
                    remarks.addAll(TablePackage.write(model, target));
                } catch (IOException failure) {
                    throw new InvocationTargetException(failure);
                }
            });
        } catch (InvocationTargetException failure) {
            MessageDialog.openError(getShell(), Messages.Export_failed, failure.getCause().getMessage());
            return false;
        } catch (InterruptedException cancelled) {
            return false;
        }
        if (!remarks.isEmpty()) {
            MessageDialog.openInformation(getShell(), Messages.Export_remarks, String.join("\n", remarks));
        }
        return true;
    }
}
