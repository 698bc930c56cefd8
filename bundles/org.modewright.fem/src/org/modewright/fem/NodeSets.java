package org.modewright.fem;

/**
 * Disjoint sets of nodes.
 *
 * <p>Source: R. E. Tarjan, Journal of the ACM 22 (1975) 215-225.
 */
public final class NodeSets {

    private final int[] parent;

    /** Every node by itself. */
    public NodeSets(int nodes) {
        parent = new int[nodes];
        for (int i = 0; i < nodes; i++) {
            parent[i] = i;
        }
    }

    /** The node that stands for the set of a node. */
    public int find(int node) {
        int root = node;
        while (parent[root] != root) {
            parent[root] = parent[parent[root]];
            root = parent[root];
        }
        return root;
    }

    /** Joins the sets of two nodes; the lower representative stays. */
    public void join(int a, int b) {
        int first = find(a);
        int second = find(b);
        parent[Math.max(first, second)] = Math.min(first, second);
    }
}
