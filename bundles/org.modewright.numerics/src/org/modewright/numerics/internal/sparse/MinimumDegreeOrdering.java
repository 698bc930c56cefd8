package org.modewright.numerics.internal.sparse;

import java.util.Arrays;

import org.modewright.numerics.Progress;

/**
 * Approximate minimum degree ordering on the quotient graph, with supervariables, mass elimination and aggressive element absorption
 * (P. R. Amestoy, T. A. Davis, I. S. Duff, An approximate minimum degree ordering algorithm, SIAM J. Matrix Anal. Appl. 17 (1996) 886-905).
 * Vertices may carry weights.
 */
final class MinimumDegreeOrdering {

    private static final int[] NONE = {};
    private static final int CANCEL_INTERVAL = 256;

    private final int n;
    private final int totalWeight;
    /** Neighbouring variables that no element covers yet; null once the vertex is no variable any more. */
    private final int[][] variables;
    /** Elements that a variable belongs to. */
    private final int[][] elements;
    /** Variables of an element; null if the vertex is no live element. */
    private final int[][] members;
    private final int[] elementWeight;
    /** Weight of a live variable, else 0. */
    private final int[] weight;
    private final int[] degree;
    private final int[] mark;
    private int stamp;
    /** Weight of an element outside the pivot's element, offset by the stamp. */
    private final long[] outside;
    private long outsideStamp;
    private final DegreeLists lists;
    private final int[] firstMerged;
    private final int[] nextMerged;
    private int eliminatedWeight;

    private MinimumDegreeOrdering(AdjacencyGraph graph) {
        n = graph.vertices();
        variables = new int[n][];
        elements = new int[n][];
        members = new int[n][];
        elementWeight = new int[n];
        weight = graph.weight().clone();
        degree = new int[n];
        mark = new int[n];
        outside = new long[n];
        firstMerged = new int[n];
        nextMerged = new int[n];
        Arrays.fill(firstMerged, -1);
        Arrays.fill(nextMerged, -1);
        int total = 0;
        for (int w : weight) {
            total += w;
        }
        totalWeight = total;
        lists = new DegreeLists(n, totalWeight);
        for (int v = 0; v < n; v++) {
            variables[v] = Arrays.copyOfRange(graph.neighbour(), graph.start()[v], graph.start()[v + 1]);
            elements[v] = NONE;
            degree[v] = weightOf(variables[v]);
        }
        for (int v = n - 1; v >= 0; v--) {
            lists.insert(v, degree[v]);
        }
    }

    /**
     * Orders a graph.
     *
     * @return the vertices in the order of elimination
     */
    static int[] order(AdjacencyGraph graph, Progress progress) {
        return new MinimumDegreeOrdering(graph).run(progress);
    }

    private int[] run(Progress progress) {
        int[] sequence = new int[n];
        int filled = 0;
        int steps = 0;
        while (filled < n) {
            if (steps++ % CANCEL_INTERVAL == 0) {
                progress.checkCancelled();
                progress.report("Ordering the equations", (double) filled / n);
            }
            int pivot = lists.removeLeast();
            int[] found = eliminate(pivot);
            filled = append(pivot, sequence, filled);
            for (int v : found) {
                filled = append(v, sequence, filled);
            }
        }
        return sequence;
    }

    /** Appends a vertex and everything that was merged into it. */
    private int append(int vertex, int[] sequence, int filled) {
        int next = filled;
        sequence[next++] = vertex;
        for (int scan = filled; scan < next; scan++) {
            for (int merged = firstMerged[sequence[scan]]; merged >= 0; merged = nextMerged[merged]) {
                sequence[next++] = merged;
            }
        }
        return next;
    }

    /** Makes the pivot an element; returns the variables that can be eliminated along with it. */
    private int[] eliminate(int pivot) {
        int[] reach = reach(pivot);
        int pivotWeight = weight[pivot];
        weight[pivot] = 0;
        eliminatedWeight += pivotWeight;
        variables[pivot] = null;
        elements[pivot] = null;
        int reachWeight = weightOf(reach);
        for (int i : reach) {
            lists.remove(i, degree[i]);
        }
        measureElements(reach);
        int[] along = new int[reach.length];
        int alongCount = 0;
        for (int i : reach) {
            int external = prune(i, pivot);
            if (elements[i].length == 1 && variables[i].length == 0) {
                along[alongCount++] = i;
            } else {
                int inReach = reachWeight - weight[i];
                degree[i] = Math.min(Math.min(totalWeight - eliminatedWeight - weight[i], degree[i] + inReach), external + inReach);
            }
        }
        int eliminatedBefore = eliminatedWeight;
        for (int k = 0; k < alongCount; k++) {
            int i = along[k];
            eliminatedWeight += weight[i];
            weight[i] = 0;
            variables[i] = null;
            elements[i] = null;
        }
        mergeIndistinguishable(reach);
        finish(pivot, reach, eliminatedWeight - eliminatedBefore);
        return Arrays.copyOf(along, alongCount);
    }

    /** The variables adjacent to the pivot, directly or through its elements, which it absorbs. */
    private int[] reach(int pivot) {
        int capacity = variables[pivot].length;
        for (int e : elements[pivot]) {
            capacity += members[e] == null ? 0 : members[e].length;
        }
        int[] reach = new int[capacity];
        int count = 0;
        stamp++;
        mark[pivot] = stamp;
        count = collect(variables[pivot], reach, count);
        for (int e : elements[pivot]) {
            if (members[e] != null) {
                count = collect(members[e], reach, count);
                members[e] = null;
            }
        }
        return Arrays.copyOf(reach, count);
    }

    private int collect(int[] source, int[] target, int count) {
        int filled = count;
        for (int i : source) {
            if (weight[i] > 0 && mark[i] != stamp) {
                mark[i] = stamp;
                target[filled++] = i;
            }
        }
        return filled;
    }

    /** For every element that touches the reach: the weight of its variables outside the reach. */
    private void measureElements(int[] reach) {
        outsideStamp += 2L * totalWeight + 2;
        for (int i : reach) {
            for (int e : elements[i]) {
                if (members[e] != null) {
                    if (outside[e] < outsideStamp) {
                        outside[e] = outsideStamp + elementWeight[e];
                    }
                    outside[e] -= weight[i];
                }
            }
        }
    }

    /** Brings the lists of variable i up to date; returns its approximate degree outside the reach (which is marked). */
    private int prune(int i, int pivot) {
        int external = 0;
        int[] oldElements = elements[i];
        int[] newElements = new int[oldElements.length + 1];
        int count = 0;
        for (int e : oldElements) {
            if (members[e] == null) {
                continue;
            }
            int rest = (int) (outside[e] - outsideStamp);
            if (rest > 0) {
                newElements[count++] = e;
                external += rest;
            } else {
                members[e] = null;
            }
        }
        newElements[count++] = pivot;
        elements[i] = Arrays.copyOf(newElements, count);
        int[] kept = variables[i];
        int keptCount = 0;
        for (int j : kept) {
            if (weight[j] > 0 && mark[j] != stamp) {
                kept[keptCount++] = j;
                external += weight[j];
            }
        }
        variables[i] = Arrays.copyOf(kept, keptCount);
        return external;
    }

    private void mergeIndistinguishable(int[] reach) {
        int[] candidates = new int[reach.length];
        long[] key = new long[reach.length];
        int count = 0;
        for (int i : reach) {
            if (weight[i] > 0) {
                candidates[count] = i;
                key[count] = (checksum(i) << 32) | count;
                count++;
            }
        }
        Arrays.sort(key, 0, count);
        for (int a = 0; a < count; a++) {
            int i = candidates[(int) key[a]];
            if (weight[i] > 0) {
                mergeInto(i, candidates, key, a + 1, count);
            }
        }
    }

    private void mergeInto(int i, int[] candidates, long[] key, int from, int count) {
        boolean marked = false;
        for (int b = from; b < count && key[b] >>> 32 == key[from - 1] >>> 32; b++) {
            int j = candidates[(int) key[b]];
            if (weight[j] == 0 || variables[i].length != variables[j].length || elements[i].length != elements[j].length) {
                continue;
            }
            if (!marked) {
                stamp++;
                markAll(variables[i]);
                markAll(elements[i]);
                marked = true;
            }
            if (allMarked(variables[j]) && allMarked(elements[j])) {
                degree[i] -= weight[j];
                weight[i] += weight[j];
                weight[j] = 0;
                variables[j] = null;
                elements[j] = null;
                nextMerged[j] = firstMerged[i];
                firstMerged[i] = j;
            }
        }
    }

    private long checksum(int i) {
        long sum = 0;
        for (int j : variables[i]) {
            sum += j;
        }
        for (int e : elements[i]) {
            sum += e;
        }
        return sum & 0x7fffffffL;
    }

    private void markAll(int[] vertices) {
        for (int v : vertices) {
            mark[v] = stamp;
        }
    }

    private boolean allMarked(int[] vertices) {
        for (int v : vertices) {
            if (mark[v] != stamp) {
                return false;
            }
        }
        return true;
    }

    /** Stores the pivot's element and puts its variables back into the degree lists. */
    private void finish(int pivot, int[] reach, int eliminatedAlong) {
        int[] live = new int[reach.length];
        int count = 0;
        for (int i : reach) {
            if (weight[i] > 0) {
                live[count++] = i;
                degree[i] = Math.max(0, Math.min(degree[i] - eliminatedAlong, totalWeight - eliminatedWeight - weight[i]));
                lists.insert(i, degree[i]);
            }
        }
        members[pivot] = count == 0 ? null : Arrays.copyOf(live, count);
        elementWeight[pivot] = weightOf(live, count);
    }

    private int weightOf(int[] vertices) {
        return weightOf(vertices, vertices.length);
    }

    private int weightOf(int[] vertices, int count) {
        int sum = 0;
        for (int k = 0; k < count; k++) {
            sum += weight[vertices[k]];
        }
        return sum;
    }

    /** Variables in a doubly linked list for every degree. */
    private static final class DegreeLists {

        private final int[] head;
        private final int[] next;
        private final int[] previous;
        private int least;

        DegreeLists(int vertices, int largestDegree) {
            head = new int[largestDegree + 1];
            Arrays.fill(head, -1);
            next = new int[vertices];
            previous = new int[vertices];
        }

        void insert(int vertex, int degree) {
            int first = head[degree];
            next[vertex] = first;
            previous[vertex] = -1;
            if (first >= 0) {
                previous[first] = vertex;
            }
            head[degree] = vertex;
            least = Math.min(least, degree);
        }

        void remove(int vertex, int degree) {
            if (previous[vertex] >= 0) {
                next[previous[vertex]] = next[vertex];
            } else {
                head[degree] = next[vertex];
            }
            if (next[vertex] >= 0) {
                previous[next[vertex]] = previous[vertex];
            }
        }

        int removeLeast() {
            while (head[least] < 0) {
                least++;
            }
            int vertex = head[least];
            remove(vertex, least);
            return vertex;
        }
    }
}
