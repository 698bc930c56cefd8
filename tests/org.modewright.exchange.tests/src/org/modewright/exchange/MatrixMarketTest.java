package org.modewright.exchange;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Random;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.modewright.numerics.SymmetricMatrix;

/** Matrices in and out, and every fault with its line. */
class MatrixMarketTest {

    private static final String HEADER = "%%MatrixMarket matrix coordinate real symmetric\n";

    @TempDir
    Path temporary;

    @Test
    void everyDigitComesBack() throws IOException {
        Random random = new Random(7);
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(40);
        for (int i = 0; i < 40; i++) {
            for (int j = 0; j <= i; j += 1 + random.nextInt(9)) {
                builder.add(i, j, random.nextGaussian() * Math.pow(10, random.nextInt(30) - 15));
            }
        }
        SymmetricMatrix matrix = builder.build();
        Path file = temporary.resolve("a.mtx");
        MatrixMarket.write(matrix, file, "a remark\nin two lines");
        SymmetricMatrix again = MatrixMarket.read(file);
        assertArrayEquals(matrix.columnStart(), again.columnStart());
        assertArrayEquals(matrix.row(), again.row());
        assertArrayEquals(matrix.value(), again.value());
        assertTrue(Files.readString(file).startsWith(HEADER + "% a remark in two lines\n40 40 " + matrix.entries() + "\n1 1 "));
    }

    @Test
    void commentsBlankLinesIntegersAndFortranExponentsAreRead() throws IOException {
        SymmetricMatrix matrix = read("%%matrixmarket MATRIX coordinate Integer symmetric\n% x\n\n2 2 2\n  1 1   4\n%\n2 1 -1D1\n\n");
        assertEquals(4, matrix.get(0, 0));
        assertEquals(-10, matrix.get(0, 1));
        assertEquals(0, matrix.get(1, 1));
    }

    @Test
    void aGeneralMatrixIsReadWhereItIsSymmetric() throws IOException {
        String header = HEADER.replace("symmetric", "general");
        SymmetricMatrix matrix = read(header + "2 2 4\n1 1 3\n1 2 -1\n2 1 -1\n2 2 5\n");
        assertEquals(-1, matrix.get(1, 0));
        assertEquals(3, matrix.entries());
        MatrixMarketException wrong = fault(header + "2 2 4\n1 1 3\n1 2 -1\n2 1 -2\n2 2 5\n");
        assertTrue(wrong.getMessage().contains("not symmetric"), wrong.getMessage());
        assertEquals(4, fault(header + "2 2 2\n1 1 3\n1 2 -1\n").line());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            2 2 2/1 1 1/2 1 x        | 4 | "x" is not a number
            2 2 2/1 1 1/2 1 nan      | 4 | not a number
            2 2 2/1 1 1/2 1 NaN      | 4 | not finite
            2 2 2/1 1 1/2 1 1e999    | 4 | not finite
            2 2 2/1 1 1/3 1 1        | 4 | outside 1 to 2
            2 2 2/1 1 1/2 0 1        | 4 | outside 1 to 2
            2 2 2/1 1 1/1 2 1        | 4 | above the diagonal
            2 2 2/1 1 1/1 1 1        | 4 | there twice
            2 2 2/1 1 1/2 1          | 4 | needs its row, its column and its value
            2 2 1/1 1 1/2 1 1        | 4 | more entries
            2 2 3/1 1 1/2 1 1        | 0 | cut short
            2 3 2/1 1 1/2 1 1        | 2 | square
            0 0 0                    | 2 | square and not empty
            2 2                      | 2 | numbers of rows, columns and entries
            2 2 -1                   | 2 | negative
            2 2 5                    | 2 | cannot have 5 entries
            """)
    void faultsAreNamedWithTheirLine(String body, int line, String text) {
        MatrixMarketException exception = fault(HEADER + body.replace("/", "\n") + "\n");
        assertEquals(line, exception.line(), exception.getMessage());
        assertTrue(exception.getMessage().contains(text), exception.getMessage());
    }

    @Test
    void otherKindsOfMatricesAreRefused() {
        for (String kind : new String[] {"array real symmetric", "coordinate complex symmetric", "coordinate pattern symmetric",
            "coordinate real skew-symmetric", "coordinate complex hermitian", ""}) {
            assertEquals(1, fault("%%MatrixMarket matrix " + kind + "\n1 1 1\n1 1 1\n").line());
        }
        assertEquals(1, fault("id,x\n").line());
        assertEquals(1, fault("").line());
    }

    private SymmetricMatrix read(String text) throws IOException {
        return MatrixMarket.read(Files.writeString(temporary.resolve("m.mtx"), text));
    }

    private MatrixMarketException fault(String text) {
        return assertThrows(MatrixMarketException.class, () -> read(text));
    }
}
