package org.modewright.fem.internal;

import java.util.Arrays;
import java.util.stream.IntStream;

import org.modewright.numerics.Progress;

/**
 * Finds the few unknowns that a motion with neither stiffness nor mass may move. Such a motion costs no energy in any element, so each
 * element by itself, and all elements that meet at a node together, forbid it to move most unknowns; what they forbid is taken as zero
 * when their neighbours are looked at, until nothing changes. Where members have consistent mass nothing is left at once. An unknown is
 * cleared only if it certainly does not move; what remains is a small problem.
 */
final class SuspectUnknowns {

    private static final int SWEEPS = 20;

    private final CarrierStore store;
    private final Transformation transformation;
    private final CarrierRows rows;
    private final boolean[] suspect;

    private SuspectUnknowns(CarrierStore store, Transformation transformation) {
        this.store = store;
        this.transformation = transformation;
        this.rows = new CarrierRows(store, transformation);
        this.suspect = new boolean[transformation.unknowns()];
        Arrays.fill(suspect, true);
    }

    /** The unknowns that remain suspect, ascending. */
    static int[] of(CarrierStore store, Transformation transformation, Progress progress) {
        SuspectUnknowns search = new SuspectUnknowns(store, transformation);
        search.clearByElements(progress);
        search.clearByNodes(progress);
        return IntStream.range(0, search.suspect.length).filter(unknown -> search.suspect[unknown]).toArray();
    }

    private static void checkNow(int count, Progress progress) {
        if (count % 128 == 0) {
            progress.checkCancelled();
        }
    }

    private void clearByElements(Progress progress) {
        boolean changed = true;
        for (int sweep = 0; sweep < SWEEPS && changed; sweep++) {
            changed = false;
            for (int carrier = 0; carrier < store.carriers().size(); carrier++) {
                checkNow(carrier, progress);
                if (isSuspect(store.places(carrier))) {
                    changed |= clear(new int[] {carrier});
                }
            }
        }
    }

    private void clearByNodes(Progress progress) {
        int[][] atNode = store.carriersAtNodes();
        boolean changed = true;
        for (int sweep = 0; sweep < SWEEPS && changed; sweep++) {
            changed = false;
            for (int node = 0; node < atNode.length; node++) {
                checkNow(node, progress);
                if (isSuspect(IntStream.range(6 * node, 6 * node + 6).toArray())) {
                    changed |= clear(atNode[node]);
                }
            }
        }
    }

    private boolean isSuspect(int[] places) {
        for (int i : places) {
            for (int p = transformation.rowStart(i); p < transformation.rowStart(i + 1); p++) {
                if (suspect[transformation.unknownAt(p)]) {
                    return true;
                }
            }
        }
        return false;
    }

    /** Clears what some carriers together forbid to move; returns whether that is anything new. */
    private boolean clear(int[] carriers) {
        int[] columns = Arrays.stream(carriers).flatMap(carrier -> Arrays.stream(rows.unknowns(carrier)))
                .filter(unknown -> suspect[unknown]).sorted().distinct().toArray();
        if (columns.length == 0) {
            return false;
        }
        SmallNullSpace space = rows.nullSpace(carriers, columns);
        boolean changed = false;
        for (int j = 0; j < columns.length; j++) {
            if (!space.canMove(j)) {
                suspect[columns[j]] = false;
                changed = true;
            }
        }
        return changed;
    }
}
