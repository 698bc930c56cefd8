package org.modewright.numerics.internal.sparse;

import java.util.Arrays;

/**
 * Elimination tree of a symmetric matrix, its postorder and the column counts of the factor
 * (J. W. H. Liu, The role of elimination trees in sparse factorization, SIAM J. Matrix Anal. Appl. 11 (1990) 134-172).
 */
final class EliminationTree {

    private EliminationTree() {
    }

    /**
     * Parent of every vertex.
     *
     * @param graph the pattern
     * @param sequence vertices in the order of elimination
     * @return by position in the sequence: position of the parent, -1 for a root
     */
    static int[] parents(AdjacencyGraph graph, int[] sequence) {
        int n = sequence.length;
        int[] position = inverse(sequence);
        int[] parent = new int[n];
        int[] ancestor = new int[n];
        for (int j = 0; j < n; j++) {
            parent[j] = -1;
            ancestor[j] = -1;
            int vertex = sequence[j];
            for (int p = graph.start()[vertex]; p < graph.start()[vertex + 1]; p++) {
                int i = position[graph.neighbour()[p]];
                while (i != -1 && i < j) {
                    int next = ancestor[i];
                    ancestor[i] = j;
                    if (next == -1) {
                        parent[i] = j;
                    }
                    i = next;
                }
            }
        }
        return parent;
    }

    /** Nodes of a forest, children before parents and every subtree contiguous. */
    static int[] postorder(int[] parent) {
        int n = parent.length;
        int[] firstChild = new int[n];
        int[] sibling = new int[n];
        Arrays.fill(firstChild, -1);
        for (int v = n - 1; v >= 0; v--) {
            if (parent[v] >= 0) {
                sibling[v] = firstChild[parent[v]];
                firstChild[parent[v]] = v;
            }
        }
        int[] order = new int[n];
        int[] stack = new int[n];
        int filled = 0;
        for (int root = 0; root < n; root++) {
            if (parent[root] >= 0) {
                continue;
            }
            int depth = 0;
            stack[0] = root;
            while (depth >= 0) {
                int v = stack[depth];
                int child = firstChild[v];
                if (child >= 0) {
                    firstChild[v] = sibling[child];
                    stack[++depth] = child;
                } else {
                    order[filled++] = v;
                    depth--;
                }
            }
        }
        return order;
    }

    /**
     * Weight of each column of the factor, its own vertex included, counted along the row subtrees.
     *
     * @param graph the pattern
     * @param sequence vertices in the order of elimination
     * @param parent elimination tree
     */
    static int[] columnWeights(AdjacencyGraph graph, int[] sequence, int[] parent) {
        int n = sequence.length;
        int[] position = inverse(sequence);
        int[] count = new int[n];
        int[] mark = new int[n];
        Arrays.fill(mark, -1);
        for (int i = 0; i < n; i++) {
            int vertex = sequence[i];
            int rowWeight = graph.weight()[vertex];
            mark[i] = i;
            count[i] += rowWeight;
            for (int p = graph.start()[vertex]; p < graph.start()[vertex + 1]; p++) {
                int j = position[graph.neighbour()[p]];
                while (j < i && mark[j] != i) {
                    mark[j] = i;
                    count[j] += rowWeight;
                    j = parent[j];
                }
            }
        }
        return count;
    }

    /** Where each value of a permutation stands. */
    static int[] inverse(int[] permutation) {
        int[] inverse = new int[permutation.length];
        for (int k = 0; k < permutation.length; k++) {
            inverse[permutation[k]] = k;
        }
        return inverse;
    }
}
