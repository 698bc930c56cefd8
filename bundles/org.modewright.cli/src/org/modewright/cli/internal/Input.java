package org.modewright.cli.internal;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;

import org.modewright.cli.CommandContext;
import org.modewright.exchange.FileHash;
import org.modewright.exchange.Imported;
import org.modewright.exchange.MatrixMarket;
import org.modewright.exchange.ModelFacts;
import org.modewright.exchange.ModelSource;
import org.modewright.model.ModelFile;
import org.modewright.model.Snapshots;
import org.modewright.model.structure.StructuralModel;
import org.modewright.samples.Sample;
import org.modewright.samples.Samples;

/**
 * A model that was read, with where it comes from.
 *
 * @param model the model
 * @param warnings what its file holds that was not understood
 * @param file the file as the user gave it
 * @param sha256 its fingerprint
 * @param seconds how long reading took
 */
record Input(StructuralModel model, List<String> warnings, String file, String sha256, double seconds) {

    private static final String SAMPLE = "sample:";
    private static final double NANO = 1e-9;

    /**
     * Reads a model.
     *
     * @throws IOException if it cannot be read; the message says where and why
     */
    static Input read(String argument) throws IOException {
        long start = System.nanoTime();
        if (argument.startsWith(SAMPLE)) {
            return sample(argument, start);
        }
        Path path = Path.of(argument);
        if (MatrixMarket.isNamedBy(path)) {
            throw new IllegalArgumentException(argument + ": a matrix has no members and no directions; "
                    + "only solve takes matrices, as a pair K.mtx M.mtx");
        }
        Imported imported = ModelSource.open(path);
        return new Input(imported.model(), imported.warnings(), argument, FileHash.sha256(path), since(start));
    }

    private static Input sample(String argument, long start) throws IOException {
        Sample sample = Samples.named(argument.substring(SAMPLE.length())).orElseThrow(() -> new IllegalArgumentException(
                "There is no sample \"" + argument.substring(SAMPLE.length()) + "\"; there are: "
                        + Samples.all().stream().map(Sample::name).collect(Collectors.joining(", "))));
        try (InputStream stream = sample.open()) {
            byte[] bytes = stream.readAllBytes();
            StructuralModel model = ModelFile.load(new ByteArrayInputStream(bytes), sample.fileName());
            return new Input(model, List.of(), argument, Snapshots.sha256(bytes), since(start));
        }
    }

    private static double since(long start) {
        return (System.nanoTime() - start) * NANO;
    }

    /** Names the warnings on standard error. */
    void warn(CommandContext context) {
        warnings.forEach(warning -> context.err().println("Warning: " + warning));
    }

    ModelFacts facts(String program) {
        return new ModelFacts(program, model.getName() == null ? "" : model.getName(), file, sha256);
    }
}
