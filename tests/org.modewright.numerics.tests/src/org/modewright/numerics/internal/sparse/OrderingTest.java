package org.modewright.numerics.internal.sparse;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Random;
import java.util.stream.IntStream;

import org.junit.jupiter.api.Test;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;

class OrderingTest {

    private static SymmetricMatrix random(int n, double density, Random random) {
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(n);
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < i; j++) {
                if (random.nextDouble() < density) {
                    builder.add(i, j, 1.0);
                }
            }
        }
        return builder.build();
    }

    private static SymmetricMatrix grid(int nx, int ny, int perNode) {
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(nx * ny * perNode);
        for (int a = 0; a < nx * ny; a++) {
            for (int b = 0; b <= a; b++) {
                if (Math.abs(a % nx - b % nx) <= 1 && Math.abs(a / nx - b / nx) <= 1) {
                    for (int i = 0; i < perNode; i++) {
                        for (int j = 0; j < perNode; j++) {
                            if (a != b || j <= i) {
                                builder.add(perNode * a + i, perNode * b + j, 1.0);
                            }
                        }
                    }
                }
            }
        }
        return builder.build();
    }

    private static void assertPermutation(int[] sequence, int n) {
        int[] sorted = sequence.clone();
        Arrays.sort(sorted);
        assertArrayEquals(IntStream.range(0, n).toArray(), sorted);
    }

    @Test
    void everyOrderingIsAPermutation() {
        Random random = new Random(2);
        for (int trial = 0; trial < 300; trial++) {
            int n = 1 + random.nextInt(120);
            SymmetricMatrix pattern = random(n, Math.pow(10.0, -3.0 * random.nextDouble()), random);
            AdjacencyGraph graph = AdjacencyGraph.of(pattern);
            assertPermutation(MinimumDegreeOrdering.order(graph, Progress.NONE), n);
            assertPermutation(SymbolicFactorisation.of(Progress.NONE, pattern).degreeOfFreedom(), n);
        }
    }

    /** Entries of the factor for an order, by elimination on the explicit graph. */
    private static long fill(SymmetricMatrix pattern, int[] sequence) {
        int n = pattern.order();
        boolean[][] adjacent = new boolean[n][n];
        for (int column = 0; column < n; column++) {
            for (int p = pattern.columnStart()[column]; p < pattern.columnStart()[column + 1]; p++) {
                adjacent[column][pattern.row()[p]] = true;
                adjacent[pattern.row()[p]][column] = true;
            }
        }
        long entries = 0;
        boolean[] eliminated = new boolean[n];
        for (int pivot : sequence) {
            eliminated[pivot] = true;
            int[] reach = IntStream.range(0, n).filter(v -> !eliminated[v] && adjacent[pivot][v]).toArray();
            entries += 1 + reach.length;
            for (int a : reach) {
                for (int b : reach) {
                    adjacent[a][b] = true;
                }
            }
        }
        return entries;
    }

    @Test
    void minimumDegreeKeepsTheFillOfAGridLow() {
        SymmetricMatrix pattern = grid(25, 25, 1);
        int[] natural = IntStream.range(0, 625).toArray();
        int[] sequence = MinimumDegreeOrdering.order(AdjacencyGraph.of(pattern), Progress.NONE);
        // Natural order fills the band, n^1.5 = 15625 and more; minimum degree comes near n log n = 5800 on a grid this size.
        assertTrue(fill(pattern, natural) > 15625);
        assertTrue(fill(pattern, sequence) < 11000, "fill " + fill(pattern, sequence));
    }

    @Test
    void treesHaveNoFill() {
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(500);
        Random random = new Random(4);
        for (int i = 1; i < 500; i++) {
            builder.add(i, random.nextInt(i), 1.0);
        }
        SymmetricMatrix tree = builder.build();
        assertEquals(999, fill(tree, MinimumDegreeOrdering.order(AdjacencyGraph.of(tree), Progress.NONE)));
    }

    @Test
    void symbolicCountIsThatOfTheEliminationAndTheStoredZeros() {
        Random random = new Random(12);
        for (int trial = 0; trial < 100; trial++) {
            SymmetricMatrix pattern = random(5 + random.nextInt(60), 0.08, random);
            SymbolicFactorisation symbolic = SymbolicFactorisation.of(Progress.NONE, pattern);
            long exact = fill(pattern, symbolic.degreeOfFreedom());
            assertTrue(symbolic.factorEntries() >= exact);
            for (int s = 0; s < symbolic.supernodes(); s++) {
                for (int row : symbolic.rows(s)) {
                    assertTrue(row >= symbolic.start(s) + symbolic.width(s));
                }
            }
        }
    }

    @Test
    void columnWeightsAreTheCountsOfTheFactor() {
        Random random = new Random(13);
        for (int trial = 0; trial < 100; trial++) {
            SymmetricMatrix pattern = random(5 + random.nextInt(60), 0.08, random);
            AdjacencyGraph graph = AdjacencyGraph.of(pattern);
            int[] sequence = MinimumDegreeOrdering.order(graph, Progress.NONE);
            int[] weights = EliminationTree.columnWeights(graph, sequence, EliminationTree.parents(graph, sequence));
            assertEquals(fill(pattern, sequence), Arrays.stream(weights).sum());
        }
    }

    @Test
    void degreesOfFreedomOfANodeAreMerged() {
        AdjacencyGraph graph = AdjacencyGraph.of(grid(7, 5, 6));
        GraphCompression compression = GraphCompression.of(graph);
        assertEquals(35, compression.graph().vertices());
        for (int weight : compression.graph().weight()) {
            assertEquals(6, weight);
        }
        assertPermutation(compression.member(), 210);
    }

    @Test
    void factorTimesFactorGivesTheMatrixBack() {
        Random random = new Random(21);
        for (int trial = 0; trial < 60; trial++) {
            int n = 1 + random.nextInt(150);
            SymmetricMatrix pattern = random(n, 0.05, random);
            SymmetricMatrix.Builder builder = SymmetricMatrix.builder(n);
            for (int column = 0; column < n; column++) {
                builder.add(column, column, trial % 2 == 0 ? 30.0 : random.nextGaussian());
                for (int p = pattern.columnStart()[column]; p < pattern.columnStart()[column + 1]; p++) {
                    builder.add(pattern.row()[p], column, random.nextGaussian());
                }
            }
            SymmetricMatrix matrix = builder.build();
            SparseFactorisation factorisation = (SparseFactorisation) SparseFactoriser.forPattern(matrix, null, Progress.NONE)
                    .factorise(matrix, null, 0.0, Progress.NONE);
            double[] x = random.doubles(n, -1.0, 1.0).toArray();
            // Multipliers are at most 10 by the pivot threshold; growth over a few fronts leaves 1e4 eps of a product of size 100.
            assertArrayEquals(matrix.multiply(x), factorisation.multiplyFactors(x), 1e4 * Math.ulp(100.0), "trial " + trial);
        }
    }
}
