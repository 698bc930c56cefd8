package org.modewright.numerics.internal.sparse;

import java.util.Arrays;

/**
 * Merges vertices that have the same neighbours and are neighbours themselves, such as the degrees of freedom of a node
 * (C. Ashcraft, Compressed graphs and the minimum degree algorithm, SIAM J. Sci. Comput. 16 (1995) 1404-1411).
 *
 * @param graph of the merged vertices
 * @param groupStart where the members of each merged vertex start in member
 * @param member original vertices, group by group
 */
record GraphCompression(AdjacencyGraph graph, int[] groupStart, int[] member) {

    static GraphCompression of(AdjacencyGraph graph) {
        int[] group = groups(graph);
        int groups = 0;
        for (int g : group) {
            groups = Math.max(groups, g + 1);
        }
        int[] groupStart = new int[groups + 1];
        for (int g : group) {
            groupStart[g + 1]++;
        }
        int[] weight = Arrays.copyOfRange(groupStart, 1, groups + 1);
        for (int g = 0; g < groups; g++) {
            groupStart[g + 1] += groupStart[g];
        }
        int[] member = new int[group.length];
        int[] next = Arrays.copyOf(groupStart, groups);
        for (int v = 0; v < group.length; v++) {
            member[next[group[v]]++] = v;
        }
        return new GraphCompression(quotient(graph, group, groupStart, member, weight), groupStart, member);
    }

    private static int[] groups(AdjacencyGraph graph) {
        int n = graph.vertices();
        long[] checksum = new long[n];
        for (int v = 0; v < n; v++) {
            checksum[v] = scramble(v);
            for (int p = graph.start()[v]; p < graph.start()[v + 1]; p++) {
                checksum[v] += scramble(graph.neighbour()[p]);
            }
        }
        int[] group = new int[n];
        Arrays.fill(group, -1);
        int[] mark = new int[n];
        Arrays.fill(mark, -1);
        int groups = 0;
        for (int v = 0; v < n; v++) {
            if (group[v] < 0) {
                group[v] = groups;
                join(graph, v, checksum, group, mark);
                groups++;
            }
        }
        return group;
    }

    /** Puts the neighbours of v that look the same as v into its group. */
    private static void join(AdjacencyGraph graph, int v, long[] checksum, int[] group, int[] mark) {
        boolean marked = false;
        for (int p = graph.start()[v]; p < graph.start()[v + 1]; p++) {
            int w = graph.neighbour()[p];
            if (group[w] >= 0 || checksum[w] != checksum[v] || graph.degree(w) != graph.degree(v)) {
                continue;
            }
            if (!marked) {
                markClosedNeighbourhood(graph, v, mark);
                marked = true;
            }
            if (neighboursMarked(graph, w, v, mark)) {
                group[w] = group[v];
            }
        }
    }

    private static void markClosedNeighbourhood(AdjacencyGraph graph, int v, int[] mark) {
        mark[v] = v;
        for (int p = graph.start()[v]; p < graph.start()[v + 1]; p++) {
            mark[graph.neighbour()[p]] = v;
        }
    }

    private static boolean neighboursMarked(AdjacencyGraph graph, int w, int v, int[] mark) {
        for (int p = graph.start()[w]; p < graph.start()[w + 1]; p++) {
            if (mark[graph.neighbour()[p]] != v) {
                return false;
            }
        }
        return true;
    }

    private static AdjacencyGraph quotient(AdjacencyGraph graph, int[] group, int[] groupStart, int[] member, int[] weight) {
        int groups = weight.length;
        int[] start = new int[groups + 1];
        int capacity = 0;
        for (int g = 0; g < groups; g++) {
            capacity += graph.degree(member[groupStart[g]]);
        }
        int[] neighbour = new int[capacity];
        int count = 0;
        for (int g = 0; g < groups; g++) {
            int representative = member[groupStart[g]];
            for (int p = graph.start()[representative]; p < graph.start()[representative + 1]; p++) {
                int other = group[graph.neighbour()[p]];
                if (other != g) {
                    neighbour[count++] = other;
                }
            }
            start[g + 1] = count;
        }
        return AdjacencyGraph.withoutDoubles(start, neighbour, weight);
    }

    private static long scramble(long value) {
        long mixed = (value + 1) * 0x9E3779B97F4A7C15L;
        mixed ^= mixed >>> 29;
        return mixed * 0xBF58476D1CE4E5B9L;
    }
}
