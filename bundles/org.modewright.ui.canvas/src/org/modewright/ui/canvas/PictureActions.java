package org.modewright.ui.canvas;

import java.io.IOException;
import java.nio.file.Path;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.SWTException;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.ImageTransfer;
import org.eclipse.swt.dnd.Transfer;
import org.eclipse.swt.widgets.FileDialog;
import org.eclipse.swt.widgets.Shell;

/** Saves and copies what a canvas shows. */
final class PictureActions {

    private final Shell shell;
    private final StructureCanvas canvas;
    private final EnergyLegend legend;

    PictureActions(Shell shell, StructureCanvas canvas, EnergyLegend legend) {
        this.shell = shell;
        this.canvas = canvas;
        this.legend = legend;
    }

    /** Asks for a file and writes the picture. */
    void save(String proposedName) {
        FileDialog dialog = new FileDialog(shell, SWT.SAVE);
        dialog.setFilterExtensions(new String[] {"*.png"});
        dialog.setFilterNames(new String[] {Messages.Shape_saveFilter});
        dialog.setFileName(proposedName);
        dialog.setOverwrite(true);
        String chosen = dialog.open();
        if (chosen != null) {
            save(Path.of(chosen));
        }
    }

    /** Writes the picture as PNG; what goes wrong is told in a dialogue. */
    void save(Path file) {
        try {
            StillPicture.write(StillPicture.of(canvas, legend), file);
        } catch (IOException | SWTException failure) {
            MessageDialog.openError(shell, Messages.Shape_save, NLS.bind(Messages.Shape_saveFailed, file, failure.getMessage()));
        }
    }

    void copy() {
        Clipboard clipboard = new Clipboard(canvas.getDisplay());
        try {
            clipboard.setContents(new Object[] {StillPicture.of(canvas, legend)}, new Transfer[] {ImageTransfer.getInstance()});
        } finally {
            clipboard.dispose();
        }
    }
}
