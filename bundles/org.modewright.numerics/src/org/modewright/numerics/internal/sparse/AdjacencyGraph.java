package org.modewright.numerics.internal.sparse;

import java.util.Arrays;

import org.modewright.numerics.SymmetricMatrix;

/**
 * Undirected graph with weighted vertices, without loops or double edges.
 *
 * @param start length vertices + 1: the neighbours of v are neighbour[start[v]] to neighbour[start[v + 1] - 1]
 * @param neighbour both directions of every edge
 * @param weight number of equations that each vertex stands for
 */
record AdjacencyGraph(int[] start, int[] neighbour, int[] weight) {

    int vertices() {
        return weight.length;
    }

    int degree(int vertex) {
        return start[vertex + 1] - start[vertex];
    }

    /** The graph of the union of the patterns, one vertex of weight 1 per equation. */
    static AdjacencyGraph of(SymmetricMatrix... matrices) {
        int n = matrices[0].order();
        int[] start = new int[n + 1];
        for (SymmetricMatrix matrix : matrices) {
            countEdges(matrix, start);
        }
        for (int v = 0; v < n; v++) {
            start[v + 1] += start[v];
        }
        int[] neighbour = new int[start[n]];
        int[] next = Arrays.copyOf(start, n);
        for (SymmetricMatrix matrix : matrices) {
            listEdges(matrix, neighbour, next);
        }
        int[] weight = new int[n];
        Arrays.fill(weight, 1);
        return withoutDoubles(start, neighbour, weight);
    }

    private static void countEdges(SymmetricMatrix matrix, int[] start) {
        for (int column = 0; column < matrix.order(); column++) {
            for (int p = matrix.columnStart()[column]; p < matrix.columnStart()[column + 1]; p++) {
                int i = matrix.row()[p];
                if (i != column) {
                    start[i + 1]++;
                    start[column + 1]++;
                }
            }
        }
    }

    private static void listEdges(SymmetricMatrix matrix, int[] neighbour, int[] next) {
        for (int column = 0; column < matrix.order(); column++) {
            for (int p = matrix.columnStart()[column]; p < matrix.columnStart()[column + 1]; p++) {
                int i = matrix.row()[p];
                if (i != column) {
                    neighbour[next[i]++] = column;
                    neighbour[next[column]++] = i;
                }
            }
        }
    }

    /** Removes repeated neighbours. */
    static AdjacencyGraph withoutDoubles(int[] start, int[] neighbour, int[] weight) {
        int n = weight.length;
        int[] seenBy = new int[n];
        Arrays.fill(seenBy, -1);
        int[] newStart = new int[n + 1];
        int count = 0;
        for (int v = 0; v < n; v++) {
            int end = start[v + 1];
            for (int p = start[v]; p < end; p++) {
                int w = neighbour[p];
                if (seenBy[w] != v) {
                    seenBy[w] = v;
                    neighbour[count++] = w;
                }
            }
            newStart[v + 1] = count;
        }
        return new AdjacencyGraph(newStart, Arrays.copyOf(neighbour, count), weight);
    }
}
