package org.modewright.numerics.internal.sparse;

import java.util.Arrays;

/**
 * Supernodes of the factor, small ones merged with their parents where that stores few zeros (C. Ashcraft, R. Grimes, The influence of
 * relaxed supernode partitions on the multifrontal method, ACM Trans. Math. Softw. 15 (1989) 291-309).
 *
 * @param columnStart where the columns of each supernode start in vertex; supernodes stand in postorder
 * @param vertex graph vertices in the final order of elimination
 * @param parent parent of each supernode, -1 for a root
 */
record SupernodeTree(int[] columnStart, int[] vertex, int[] parent) {

    /** A supernode of at most so many equations joins its parent whatever the zeros, as long as the parent is as small. */
    private static final int SMALL = 16;
    /** Share of stored zeros that a merged supernode may have, by its width in equations. */
    private static final int[] WIDTHS = {32, 96, 256};
    private static final double[] ZERO_SHARES = {0.4, 0.15, 0.05};
    private static final double WIDEST_ZERO_SHARE = 0.02;

    int count() {
        return parent.length;
    }

    /**
     * Finds the supernodes.
     *
     * @param graph the pattern
     * @param sequence vertices in a postorder of the elimination tree
     * @param parent elimination tree of that sequence
     * @param columnWeight column weights of that sequence
     */
    static SupernodeTree of(AdjacencyGraph graph, int[] sequence, int[] parent, int[] columnWeight) {
        Merging merging = new Merging(graph, sequence, parent, columnWeight);
        merging.mergeAll();
        return merging.result();
    }

    /** Every column starts as a supernode of its own and is represented by its last column. */
    private static final class Merging {

        private final int n;
        private final int[] sequence;
        private final int[] parent;
        private final int[] mergedInto;
        private final long[] width;
        private final long[] height;
        private final long[] zeros;

        Merging(AdjacencyGraph graph, int[] sequence, int[] parent, int[] columnWeight) {
            this.n = sequence.length;
            this.sequence = sequence;
            this.parent = parent;
            mergedInto = new int[n];
            width = new long[n];
            height = new long[n];
            zeros = new long[n];
            for (int j = 0; j < n; j++) {
                mergedInto[j] = j;
                width[j] = graph.weight()[sequence[j]];
                height[j] = columnWeight[j];
            }
        }

        void mergeAll() {
            for (int j = 0; j < n; j++) {
                if (parent[j] >= 0) {
                    considerMerging(j, parent[j]);
                }
            }
        }

        /** The parent stands for itself only, or for itself and earlier children: it comes later in postorder. */
        private void considerMerging(int child, int into) {
            long mergedWidth = width[child] + width[into];
            long mergedHeight = width[child] + height[into];
            long merged = trapezoid(mergedWidth, mergedHeight);
            long separate = trapezoid(width[child], height[child]) + trapezoid(width[into], height[into]);
            long mergedZeros = zeros[child] + zeros[into] + merged - separate;
            boolean small = width[child] <= SMALL && width[into] <= SMALL && mergedZeros <= merged / 2;
            if (small || mergedZeros <= merged * allowedShare(mergedWidth)) {
                mergedInto[child] = into;
                width[into] = mergedWidth;
                height[into] = mergedHeight;
                zeros[into] = mergedZeros;
            }
        }

        private static double allowedShare(long mergedWidth) {
            for (int k = 0; k < WIDTHS.length; k++) {
                if (mergedWidth <= WIDTHS[k]) {
                    return ZERO_SHARES[k];
                }
            }
            return WIDEST_ZERO_SHARE;
        }

        private static long trapezoid(long width, long height) {
            return width * height - width * (width - 1) / 2;
        }

        SupernodeTree result() {
            int[] representative = new int[n];
            for (int j = n - 1; j >= 0; j--) {
                representative[j] = mergedInto[j] == j ? j : representative[mergedInto[j]];
            }
            int[] superParent = new int[n];
            Arrays.fill(superParent, -1);
            for (int j = 0; j < n; j++) {
                if (representative[j] == j && parent[j] >= 0) {
                    superParent[j] = representative[parent[j]];
                }
            }
            return number(representative, superParent);
        }

        private SupernodeTree number(int[] representative, int[] superParent) {
            int[] postorder = EliminationTree.postorder(superParent);
            int[] rank = new int[n];
            int supernodes = 0;
            for (int j : postorder) {
                if (representative[j] == j) {
                    rank[j] = supernodes++;
                }
            }
            int[] start = new int[supernodes + 1];
            for (int j = 0; j < n; j++) {
                start[rank[representative[j]] + 1]++;
            }
            for (int s = 0; s < supernodes; s++) {
                start[s + 1] += start[s];
            }
            int[] vertex = new int[n];
            int[] next = Arrays.copyOf(start, supernodes);
            int[] resultParent = new int[supernodes];
            for (int j = 0; j < n; j++) {
                int s = rank[representative[j]];
                vertex[next[s]++] = sequence[j];
                if (representative[j] == j) {
                    resultParent[s] = superParent[j] < 0 ? -1 : rank[superParent[j]];
                }
            }
            return new SupernodeTree(start, vertex, resultParent);
        }
    }
}
