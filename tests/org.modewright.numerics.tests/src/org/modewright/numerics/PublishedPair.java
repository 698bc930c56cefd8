package org.modewright.numerics;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.Objects;

/** The published pair BCSSTK01, BCSSTM01 with its finite eigenvalues; the resource states its source. */
record PublishedPair(EigenProblem problem, double[] eigenvalues) {

    static PublishedPair read() throws IOException {
        SymmetricMatrix.Builder k = SymmetricMatrix.builder(48);
        SymmetricMatrix.Builder m = SymmetricMatrix.builder(48);
        double[] eigenvalues = new double[24];
        int found = 0;
        try (BufferedReader reader = new BufferedReader(new InputStreamReader(
                Objects.requireNonNull(PublishedPair.class.getResourceAsStream("bcsst01.txt")), StandardCharsets.UTF_8))) {
            for (String line = reader.readLine(); line != null; line = reader.readLine()) {
                String[] word = line.split(" ");
                switch (word[0]) {
                    case "k" -> k.add(Integer.parseInt(word[1]), Integer.parseInt(word[2]), Double.parseDouble(word[3]));
                    case "m" -> m.add(Integer.parseInt(word[1]), Integer.parseInt(word[1]), Double.parseDouble(word[2]));
                    case "lambda" -> eigenvalues[found++] = Double.parseDouble(word[1]);
                    default -> {
                        // comments and the order
                    }
                }
            }
        }
        return new PublishedPair(new EigenProblem(k.build(), m.build()), eigenvalues);
    }
}
