package org.modewright.cli.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;

import org.modewright.cli.CommandContext;
import org.modewright.cli.ExitStatus;
import org.modewright.exchange.MatrixFiles;
import org.modewright.exchange.MatrixMarket;
import org.modewright.exchange.ModelSource;
import org.modewright.exchange.TablePackage;
import org.modewright.fem.Assembly;
import org.modewright.fem.Snapshot;
import org.modewright.model.ModelFile;

import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Model file, table package, matrices: from one to the other. */
@Command(name = "convert", sortOptions = false, header = {"Converts between model file, table package and matrices.", ""},
        customSynopsis = "modewright convert IN OUT [OPTIONS]",
        footer = {"", "IN is a model file (.modewright), a table package (its folder, .zip or datapackage.json), or sample:NAME.",
            "OUT decides what is written:", "  NAME.modewright       a model file", "  NAME.zip, FOLDER/      a table package",
            "  NAME.mtx              NAME.K.mtx, NAME.M.mtx and NAME.dofs.csv: stiffness, mass and the free degrees of freedom, SI",
            "Exit status: 0 done; 2 bad input or options; 3 the run could not be completed."})
public final class ConvertCommand implements Callable<Integer> {

    private final CommandContext context;

    @Spec
    private CommandSpec spec;

    @Parameters(paramLabel = "IN", index = "0", description = "What is read.")
    private String in;

    @Parameters(paramLabel = "OUT", index = "1", description = "What is written; files of this name are replaced.")
    private String target;

    @Option(names = "--quiet", description = "No progress on standard error.")
    private boolean quiet;

    @Option(names = {"-h", "--help"}, usageHelp = true, description = "Shows this help.")
    private boolean help;

    private Path out;

    public ConvertCommand(CommandContext context) {
        this.context = context;
    }

    @Override
    public Integer call() throws Exception {
        out = Path.of(target);
        checkOut();
        Input input = Input.read(in);
        input.warn(context);
        List<Path> written = write(input);
        written.forEach(file -> context.out().println("Wrote " + file));
        return ExitStatus.PASSED;
    }

    private void checkOut() throws IOException {
        if (Files.isDirectory(out) || isNewFolder()) {
            return;
        }
        boolean known = ModelSource.isModelFile(out) || MatrixMarket.isNamedBy(out) || TablePackage.isNamedBy(out);
        if (!known) {
            throw new ParameterException(spec.commandLine(), out + ": OUT must end with .modewright, .zip or .mtx, or be a folder.");
        }
        OutputOptions.checkFile(out);
    }

    private boolean isNewFolder() {
        boolean named = target.endsWith("/") || out.getFileName() != null && out.getFileName().toString().indexOf('.') < 0;
        return named && !Files.exists(out);
    }

    private List<Path> write(Input input) throws IOException {
        if (ModelSource.isModelFile(out)) {
            ModelFile.save(input.model(), out);
            return List.of(out);
        }
        if (MatrixMarket.isNamedBy(out)) {
            try (ConsoleProgress progress = new ConsoleProgress(context, quiet)) {
                return MatrixFiles.write(Assembly.of(Snapshot.of(input.model()), progress), out);
            }
        }
        TablePackage.write(input.model(), out).forEach(warning -> context.err().println("Warning: " + warning));
        return List.of(out);
    }
}
