package org.modewright.exchange;

import java.io.BufferedWriter;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;

import org.modewright.exchange.internal.AtomicOutput;
import org.modewright.exchange.internal.MatrixReader;
import org.modewright.numerics.SymmetricMatrix;

/**
 * Symmetric matrices as MatrixMarket files, coordinate format (R. F. Boisvert, R. Pozo, K. A. Remington, The Matrix Market Exchange
 * Formats: Initial Design, NISTIR 5935, 1996). Rows and columns count from 1; the file holds the lower triangle.
 */
public final class MatrixMarket {

    /** Extension of the files. */
    public static final String EXTENSION = ".mtx";

    private MatrixMarket() {
    }

    /** Whether a path names a matrix file by its extension. */
    public static boolean isNamedBy(Path file) {
        return file.getFileName() != null && file.getFileName().toString().toLowerCase(Locale.ROOT).endsWith(EXTENSION);
    }

    /**
     * Reads a matrix: coordinate, real or integer, symmetric; or general, where every entry must have its equal across the diagonal.
     *
     * @throws MatrixMarketException if the file is anything else, with the line
     * @throws IOException if it cannot be read
     */
    public static SymmetricMatrix read(Path file) throws IOException {
        return new MatrixReader(file).read();
    }

    /**
     * Writes the lower triangle in full double precision, column by column; the file is replaced as a whole.
     *
     * @param remarks lines of comment below the header, such as the units
     */
    public static void write(SymmetricMatrix matrix, Path file, String... remarks) throws IOException {
        AtomicOutput.write(file, path -> {
            try (BufferedWriter out = Files.newBufferedWriter(path, StandardCharsets.UTF_8)) {
                write(matrix, out, List.of(remarks));
            }
        });
    }

    private static void write(SymmetricMatrix matrix, BufferedWriter out, List<String> remarks) throws IOException {
        out.write("%%MatrixMarket matrix coordinate real symmetric\n");
        for (String remark : remarks) {
            out.write("% " + remark.replaceAll("\\R", " ") + "\n");
        }
        out.write(matrix.order() + " " + matrix.order() + " " + matrix.entries() + "\n");
        int[] start = matrix.columnStart();
        for (int column = 0; column < matrix.order(); column++) {
            for (int p = start[column]; p < start[column + 1]; p++) {
                out.write((matrix.row()[p] + 1) + " " + (column + 1) + " " + matrix.value()[p] + "\n");
            }
        }
    }
}
