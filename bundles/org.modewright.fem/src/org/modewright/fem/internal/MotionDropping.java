package org.modewright.fem.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

import org.modewright.fem.Components;
import org.modewright.fem.DroppedMotion;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;

/**
 * Drops the motions that have neither stiffness nor mass. Adding such a motion to another changes no energy, so that one unknown
 * that moves in it can be left out and nothing is lost.
 *
 * @param kept the unknowns that remain, ascending
 * @param matrices stiffness and mass over them
 * @param dropped the motions
 */
record MotionDropping(int[] kept, MatrixPair matrices, List<DroppedMotion> dropped) {

    static MotionDropping of(MatrixPair all, Transformation transformation, Progress progress) {
        boolean[] touched = new boolean[transformation.unknowns()];
        touch(all.stiffness(), touched);
        touch(all.mass(), touched);
        List<DroppedMotion> dropped = new ArrayList<>();
        for (int unknown = 0; unknown < touched.length; unknown++) {
            if (!touched[unknown]) {
                int place = transformation.componentOf(unknown);
                int node = place / Components.COUNT;
                dropped.add(new DroppedMotion(node, place % Components.COUNT, new int[] {node}));
            }
        }
        progress.checkCancelled();
        int[] kept = IntStream.range(0, touched.length).filter(unknown -> touched[unknown]).toArray();
        return new MotionDropping(kept, all.restrictedTo(kept), dropped);
    }

    private static void touch(SymmetricMatrix matrix, boolean[] touched) {
        for (int column = 0; column < matrix.order(); column++) {
            for (int p = matrix.columnStart()[column]; p < matrix.columnStart()[column + 1]; p++) {
                if (matrix.value()[p] != 0.0) {
                    touched[column] = true;
                    touched[matrix.row()[p]] = true;
                }
            }
        }
    }
}
