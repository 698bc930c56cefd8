package org.modewright.ui.internal.wizards;

import java.io.IOException;
import java.lang.reflect.InvocationTargetException;
import java.nio.file.Path;
import java.util.List;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.SubMonitor;
import org.eclipse.jface.operation.IRunnableWithProgress;
import org.modewright.exchange.Imported;
import org.modewright.exchange.PackageException;
import org.modewright.exchange.Problem;
import org.modewright.exchange.TablePackage;
import org.modewright.ui.internal.Messages;

/** Reads a table package in the background of a wizard: either what is in it, or what is wrong with it. */
final class PackageReading implements IRunnableWithProgress {

    private final Path source;
    private Imported imported;
    private List<Problem> problems = List.of();
    private int total;

    PackageReading(Path source) {
        this.source = source;
    }

    @Override
    public void run(IProgressMonitor monitor) throws InvocationTargetException {
        SubMonitor.convert(monitor, Messages.Import_reading, IProgressMonitor.UNKNOWN);
        try {
            imported = TablePackage.read(source);
        } catch (PackageException faulty) {
            problems = faulty.problems();
            total = faulty.total();
        } catch (IOException failure) {
            problems = List.of(new Problem(source.getFileName().toString(), 0, "", "", failure.getMessage()));
            total = 1;
        }
    }

    /** What was read; null if something is wrong with it. */
    Imported imported() {
        return imported;
    }

    /** What is wrong, as far as it is listed. */
    List<Problem> problems() {
        return problems;
    }

    /** How much is wrong in all. */
    int total() {
        return total;
    }
}
