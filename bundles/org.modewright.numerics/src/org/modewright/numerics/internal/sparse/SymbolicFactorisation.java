package org.modewright.numerics.internal.sparse;

import java.util.Arrays;

import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;

/**
 * What the pattern alone decides: the order of elimination, the supernodes and their rows. Equations are numbered by their position in
 * the order of elimination.
 */
final class SymbolicFactorisation {

    private final int order;
    /** Degree of freedom at each position. */
    private final int[] degreeOfFreedom;
    private final int[] position;
    /** First position of each supernode; length supernodes + 1. */
    private final int[] supernodeStart;
    private final int[] parent;
    private final int[][] children;
    /** First supernode of the subtree of each supernode. */
    private final int[] firstDescendant;
    /** Positions below the supernode's own columns that its factor reaches, ascending. */
    private final int[][] rows;

    private SymbolicFactorisation(AdjacencyGraph graph, GraphCompression compression, SupernodeTree tree) {
        this.parent = tree.parent();
        this.order = graph.vertices();
        this.children = children(parent);
        this.firstDescendant = firstDescendants(parent);
        this.degreeOfFreedom = new int[order];
        this.supernodeStart = new int[tree.count() + 1];
        int[] groupPosition = new int[compression.graph().vertices()];
        int filled = 0;
        for (int s = 0; s < tree.count(); s++) {
            for (int p = tree.columnStart()[s]; p < tree.columnStart()[s + 1]; p++) {
                int group = tree.vertex()[p];
                groupPosition[group] = filled;
                for (int q = compression.groupStart()[group]; q < compression.groupStart()[group + 1]; q++) {
                    degreeOfFreedom[filled++] = compression.member()[q];
                }
            }
            supernodeStart[s + 1] = filled;
        }
        this.position = EliminationTree.inverse(degreeOfFreedom);
        this.rows = rows(compression, tree, groupPosition);
    }

    /** Analyses the union of the patterns. */
    static SymbolicFactorisation of(Progress progress, SymmetricMatrix... matrices) {
        progress.report("Ordering the equations", 0.0);
        AdjacencyGraph graph = AdjacencyGraph.of(matrices);
        progress.checkCancelled();
        GraphCompression compression = GraphCompression.of(graph);
        progress.checkCancelled();
        AdjacencyGraph compressed = compression.graph();
        int[] sequence = MinimumDegreeOrdering.order(compressed, progress);
        int[] postorder = EliminationTree.postorder(EliminationTree.parents(compressed, sequence));
        int[] postordered = new int[sequence.length];
        for (int k = 0; k < sequence.length; k++) {
            postordered[k] = sequence[postorder[k]];
        }
        int[] parent = EliminationTree.parents(compressed, postordered);
        progress.checkCancelled();
        int[] columnWeight = EliminationTree.columnWeights(compressed, postordered, parent);
        SupernodeTree tree = SupernodeTree.of(compressed, postordered, parent, columnWeight);
        progress.checkCancelled();
        return new SymbolicFactorisation(graph, compression, tree);
    }

    private static int[][] children(int[] parent) {
        int[] count = new int[parent.length];
        for (int p : parent) {
            if (p >= 0) {
                count[p]++;
            }
        }
        int[][] children = new int[parent.length][];
        for (int s = 0; s < parent.length; s++) {
            children[s] = new int[count[s]];
        }
        for (int s = parent.length - 1; s >= 0; s--) {
            if (parent[s] >= 0) {
                children[parent[s]][--count[parent[s]]] = s;
            }
        }
        return children;
    }

    private static int[] firstDescendants(int[] parent) {
        int[] first = new int[parent.length];
        for (int s = 0; s < parent.length; s++) {
            first[s] = s;
        }
        for (int s = 0; s < parent.length; s++) {
            if (parent[s] >= 0) {
                first[parent[s]] = Math.min(first[parent[s]], first[s]);
            }
        }
        return first;
    }

    private int[][] rows(GraphCompression compression, SupernodeTree tree, int[] groupPosition) {
        AdjacencyGraph compressed = compression.graph();
        int supernodes = tree.count();
        int[][] groupRows = new int[supernodes][];
        int[][] result = new int[supernodes][];
        int[] mark = new int[compressed.vertices()];
        Arrays.fill(mark, -1);
        int[] scratch = new int[compressed.vertices()];
        for (int s = 0; s < supernodes; s++) {
            int count = 0;
            int end = supernodeStart[s + 1];
            for (int p = tree.columnStart()[s]; p < tree.columnStart()[s + 1]; p++) {
                int group = tree.vertex()[p];
                for (int q = compressed.start()[group]; q < compressed.start()[group + 1]; q++) {
                    count = collect(compressed.neighbour()[q], s, end, groupPosition, mark, scratch, count);
                }
            }
            for (int child : children[s]) {
                for (int group : groupRows[child]) {
                    count = collect(group, s, end, groupPosition, mark, scratch, count);
                }
            }
            groupRows[s] = Arrays.copyOf(scratch, count);
            result[s] = expand(groupRows[s], compressed, groupPosition);
        }
        return result;
    }

    private static int collect(int group, int supernode, int end, int[] groupPosition, int[] mark, int[] target, int count) {
        if (groupPosition[group] < end || mark[group] == supernode) {
            return count;
        }
        mark[group] = supernode;
        target[count] = group;
        return count + 1;
    }

    private static int[] expand(int[] groups, AdjacencyGraph compressed, int[] groupPosition) {
        int count = 0;
        for (int group : groups) {
            count += compressed.weight()[group];
        }
        int[] expanded = new int[count];
        int filled = 0;
        for (int group : groups) {
            for (int k = 0; k < compressed.weight()[group]; k++) {
                expanded[filled++] = groupPosition[group] + k;
            }
        }
        Arrays.sort(expanded);
        return expanded;
    }

    int order() {
        return order;
    }

    int[] degreeOfFreedom() {
        return degreeOfFreedom;
    }

    int[] position() {
        return position;
    }

    int supernodes() {
        return parent.length;
    }

    int start(int supernode) {
        return supernodeStart[supernode];
    }

    int width(int supernode) {
        return supernodeStart[supernode + 1] - supernodeStart[supernode];
    }

    int parent(int supernode) {
        return parent[supernode];
    }

    int[] children(int supernode) {
        return children[supernode];
    }

    int firstDescendant(int supernode) {
        return firstDescendant[supernode];
    }

    int[] rows(int supernode) {
        return rows[supernode];
    }

    /** Nonzeros of the factor without delayed pivots, the diagonal included. */
    long factorEntries() {
        long entries = 0;
        for (int s = 0; s < supernodes(); s++) {
            long width = width(s);
            entries += width * (width + 1) / 2 + width * rows[s].length;
        }
        return entries;
    }

    /** Multiplications and additions of the factorisation without delayed pivots. */
    double operations() {
        double operations = 0.0;
        for (int s = 0; s < supernodes(); s++) {
            for (int k = 0; k < width(s); k++) {
                double below = width(s) - k - 1 + rows[s].length;
                operations += below * (below + 1);
            }
        }
        return operations;
    }
}
