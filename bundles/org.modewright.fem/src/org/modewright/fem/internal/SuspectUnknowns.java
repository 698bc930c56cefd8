package org.modewright.fem.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;

import org.modewright.numerics.Progress;

/**
 * Finds the few unknowns that a motion with neither stiffness nor mass may move. Such a motion costs no energy in any element, so each
 * element by itself, and all elements that meet at a node together, forbid it to move most unknowns; what they forbid is taken as zero
 * when their neighbours are looked at, until nothing changes. Where members have consistent mass nothing is left at once. An unknown is
 * cleared only if it certainly does not move; what remains is a small problem for a factorisation.
 */
final class SuspectUnknowns {

    private static final int SWEEPS = 20;

    private final CarrierStore store;
    private final Transformation transformation;
    private final boolean[] suspect;
    private final List<ElementTransformation> rows = new ArrayList<>();

    private SuspectUnknowns(CarrierStore store, Transformation transformation) {
        this.store = store;
        this.transformation = transformation;
        this.suspect = new boolean[transformation.unknowns()];
        Arrays.fill(suspect, true);
    }

    /** The unknowns that remain suspect, ascending. */
    static int[] of(CarrierStore store, Transformation transformation, Progress progress) {
        SuspectUnknowns search = new SuspectUnknowns(store, transformation);
        search.gatherRows(progress);
        search.clearByElements(progress);
        search.clearByNodes(progress);
        return IntStream.range(0, search.suspect.length).filter(unknown -> search.suspect[unknown]).toArray();
    }

    private void gatherRows(Progress progress) {
        for (int carrier = 0; carrier < store.carriers().size(); carrier++) {
            checkNow(carrier, progress);
            boolean[] all = new boolean[store.places(carrier).length];
            Arrays.fill(all, true);
            rows.add(ElementTransformation.of(transformation, store.places(carrier), all));
        }
    }

    private static void checkNow(int count, Progress progress) {
        if (count % 1024 == 0) {
            progress.checkCancelled();
        }
    }

    private void clearByElements(Progress progress) {
        boolean changed = true;
        for (int sweep = 0; sweep < SWEEPS && changed; sweep++) {
            changed = false;
            for (int carrier = 0; carrier < rows.size(); carrier++) {
                checkNow(carrier, progress);
                changed |= clear(new int[] {carrier});
            }
        }
    }

    private void clearByNodes(Progress progress) {
        int[][] atNode = carriersAtNodes();
        boolean changed = true;
        for (int sweep = 0; sweep < SWEEPS && changed; sweep++) {
            changed = false;
            for (int node = 0; node < atNode.length; node++) {
                checkNow(node, progress);
                if (isSuspect(node)) {
                    changed |= clear(atNode[node]);
                }
            }
        }
    }

    private boolean isSuspect(int node) {
        for (int i = 6 * node; i < 6 * node + 6; i++) {
            for (int p = transformation.rowStart(i); p < transformation.rowStart(i + 1); p++) {
                if (suspect[transformation.unknownAt(p)]) {
                    return true;
                }
            }
        }
        return false;
    }

    private int[][] carriersAtNodes() {
        int[] count = new int[transformation.components() / 6];
        store.carriers().forEach(carrier -> Arrays.stream(carrier.nodes()).forEach(node -> count[node]++));
        int[][] atNode = new int[count.length][];
        for (int node = 0; node < count.length; node++) {
            atNode[node] = new int[count[node]];
        }
        for (int carrier = 0; carrier < rows.size(); carrier++) {
            for (int node : store.carriers().get(carrier).nodes()) {
                atNode[node][--count[node]] = carrier;
            }
        }
        return atNode;
    }

    /** Clears what some carriers together forbid to move; returns whether that is anything new. */
    private boolean clear(int[] carriers) {
        int[] columns = Arrays.stream(carriers).flatMap(carrier -> Arrays.stream(rows.get(carrier).unknowns()))
                .filter(unknown -> suspect[unknown]).sorted().distinct().toArray();
        if (columns.length == 0) {
            return false;
        }
        int height = 0;
        for (int carrier : carriers) {
            height += 2 * store.places(carrier).length;
        }
        double[] system = new double[height * columns.length];
        int row = 0;
        for (int carrier : carriers) {
            row = stack(carrier, store.stiffness(carrier), columns, system, row);
            row = stack(carrier, store.mass(carrier), columns, system, row);
        }
        SmallNullSpace space = new SmallNullSpace(system, height, columns.length);
        boolean changed = false;
        for (int j = 0; j < columns.length; j++) {
            if (!space.canMove(j)) {
                suspect[columns[j]] = false;
                changed = true;
            }
        }
        return changed;
    }

    /** Adds the rows of A T over the chosen columns, scaled to a largest entry of 1; returns the next free row. */
    private int stack(int carrier, double[] packed, int[] columns, double[] system, int row) {
        ElementTransformation own = rows.get(carrier);
        if (packed.length == 0 || own.unknowns().length == 0) {
            return row;
        }
        double[] product = own.times(packed);
        int count = own.unknowns().length;
        double largest = 0.0;
        for (double value : product) {
            largest = Math.max(largest, Math.abs(value));
        }
        int height = store.places(carrier).length;
        for (int j = 0; j < count && largest > 0.0; j++) {
            int column = Arrays.binarySearch(columns, own.unknowns()[j]);
            for (int i = 0; i < height && column >= 0; i++) {
                system[(row + i) * columns.length + column] = product[i * count + j] / largest;
            }
        }
        return row + height;
    }
}
