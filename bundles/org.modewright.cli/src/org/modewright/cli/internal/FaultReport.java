package org.modewright.cli.internal;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.InvalidPathException;
import java.nio.file.NoSuchFileException;
import java.util.List;
import java.util.Map;

import org.modewright.audit.RulePackException;
import org.modewright.cli.CommandContext;
import org.modewright.cli.ExitStatus;
import org.modewright.exchange.PackageException;
import org.modewright.fem.ModelDefectsException;
import org.modewright.numerics.CancelledException;
import org.modewright.numerics.SingularPencilException;

import picocli.CommandLine;
import picocli.CommandLine.IExecutionExceptionHandler;
import picocli.CommandLine.IParameterExceptionHandler;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import picocli.CommandLine.UnmatchedArgumentException;

/** Says in plain sentences what went wrong and chooses the exit status. */
public final class FaultReport implements IParameterExceptionHandler, IExecutionExceptionHandler {

    private final PrintWriter err;

    public FaultReport(CommandContext context) {
        err = context.err();
    }

    @Override
    public int handleParseException(ParameterException fault, String[] arguments) {
        CommandLine command = fault.getCommandLine();
        boolean root = command.getParent() == null;
        if (root && fault instanceof UnmatchedArgumentException unmatched && !unmatched.getUnmatched().get(0).startsWith("-")) {
            err.println("There is no command \"" + unmatched.getUnmatched().get(0) + "\"; there are: " + commands(command) + ".");
        } else {
            err.println(sentence(fault.getMessage()));
        }
        err.println("Help: " + command.getCommandSpec().qualifiedName() + " --help");
        return ExitStatus.BAD_INPUT;
    }

    private static String commands(CommandLine root) {
        List<String> names = root.getSubcommands().entrySet().stream().map(Map.Entry::getKey).filter(name -> !name.equals("help")).toList();
        return String.join(", ", names);
    }

    private static String sentence(String message) {
        return message.endsWith(".") ? message : message + ".";
    }

    @Override
    public int handleExecutionException(Exception fault, CommandLine command, ParseResult result) {
        if (fault instanceof CancelledException) {
            err.println("Cancelled; nothing was written.");
            return ExitStatus.NOT_COMPLETED;
        }
        if (fault instanceof SingularPencilException singular) {
            err.println("The run could not be completed: stiffness and mass matrix both vanish in the same motion (rows "
                    + rows(singular.degreesOfFreedom()) + "); remove the motion from both matrices.");
            return ExitStatus.NOT_COMPLETED;
        }
        if (fault instanceof PackageException broken) {
            err.println("The table package cannot be read; " + broken.total() + (broken.total() == 1 ? " fault:" : " faults:"));
            err.println(broken.getMessage());
            return ExitStatus.BAD_INPUT;
        }
        if (fault instanceof ModelDefectsException defects) {
            err.println("The model cannot be computed:");
            defects.defects().forEach(defect -> err.println("  " + defect.text() + " " + defect.remedy()));
            return ExitStatus.BAD_INPUT;
        }
        if (fault instanceof IOException || fault instanceof IllegalArgumentException || fault instanceof RulePackException) {
            err.println(sentence(words(fault)));
            return ExitStatus.BAD_INPUT;
        }
        return unexpected(fault);
    }

    /** Says that the program itself is at fault, with what its makers need to know. */
    public int unexpected(Throwable fault) {
        err.println("The run could not be completed because of a fault of the program; please report it with these lines:");
        fault.printStackTrace(err);
        return ExitStatus.NOT_COMPLETED;
    }

    /** Says that the memory was too small. */
    public int outOfMemory() {
        err.println("The run could not be completed: the memory of " + (Runtime.getRuntime().maxMemory() >> 20)
                + " MiB is too small for this model; ask for fewer modes, or give the Java machine more with -Xmx.");
        return ExitStatus.NOT_COMPLETED;
    }

    private static String rows(int[] degreesOfFreedom) {
        StringBuilder rows = new StringBuilder();
        for (int i = 0; i < Math.min(10, degreesOfFreedom.length); i++) {
            rows.append(i == 0 ? "" : ", ").append(degreesOfFreedom[i] + 1);
        }
        return rows.append(degreesOfFreedom.length > 10 ? ", ..." : "").toString();
    }

    private static String words(Exception fault) {
        if (fault instanceof InvalidPathException path) {
            return path.getInput() + ": this is no path of a file";
        }
        if (fault instanceof FileSystemException file) {
            String reason = file instanceof NoSuchFileException ? "there is no such file or folder"
                    : file instanceof AccessDeniedException ? "access is denied" : file.getClass().getSimpleName();
            return file.getFile() + ": " + (file.getReason() == null ? reason : file.getReason());
        }
        return fault.getMessage() == null ? fault.getClass().getSimpleName() : fault.getMessage();
    }
}
