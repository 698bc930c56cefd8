package org.modewright.fem.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.TreeSet;
import java.util.stream.IntStream;

import org.modewright.fem.Components;
import org.modewright.fem.DroppedMotion;
import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.PencilReduction;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;

/**
 * Drops the motions that have neither stiffness nor mass. Adding such a motion to another changes no energy, so that one unknown
 * that moves in it can be left out and nothing is lost.
 *
 * @param kept the unknowns that remain, ascending
 * @param matrices stiffness and mass over them
 * @param dropped the motions, by node and component
 */
record MotionDropping(int[] kept, MatrixPair matrices, List<DroppedMotion> dropped) {

    /** Components of a null vector below this share of its largest one, the rotations as if at arm 1 m, are round-off. */
    private static final double MOVES = 1e-6;

    static MotionDropping of(MatrixPair all, Transformation transformation, Progress progress) {
        boolean[] touched = new boolean[transformation.unknowns()];
        touch(all.stiffness(), touched);
        touch(all.mass(), touched);
        List<DroppedMotion> dropped = new ArrayList<>();
        addUntouched(touched, transformation, dropped);
        progress.checkCancelled();
        int[] candidates = IntStream.range(0, touched.length).filter(unknown -> touched[unknown]).toArray();
        MatrixPair matrices = all.restrictedTo(candidates);
        if (candidates.length == 0) {
            return new MotionDropping(candidates, matrices, dropped);
        }
        progress.report("looking for motions without stiffness and mass", Double.NaN);
        PencilReduction reduction = PencilReduction.of(new EigenProblem(matrices.stiffness(), matrices.mass()), progress);
        for (int i = 0; i < reduction.nullVectors().length; i++) {
            double[] vector = new double[transformation.unknowns()];
            for (int j = 0; j < candidates.length; j++) {
                vector[candidates[j]] = reduction.nullVectors()[i][j];
            }
            dropped.add(motion(candidates[reduction.droppedDegreesOfFreedom()[i]], vector, transformation));
        }
        dropped.sort(Comparator.comparingInt(DroppedMotion::node).thenComparingInt(DroppedMotion::component));
        int[] kept = IntStream.of(reduction.keptDegreesOfFreedom()).map(i -> candidates[i]).toArray();
        return new MotionDropping(kept, new MatrixPair(reduction.reduced().stiffness(), reduction.reduced().mass()), dropped);
    }

    /** Unknowns that no element and no mass does anything for. */
    private static void addUntouched(boolean[] touched, Transformation transformation, List<DroppedMotion> dropped) {
        List<TreeSet<Integer>> nodes = new ArrayList<>();
        for (int unknown = 0; unknown < touched.length; unknown++) {
            nodes.add(touched[unknown] ? null : new TreeSet<>());
        }
        for (int place = 0; place < transformation.components(); place++) {
            for (int p = transformation.rowStart(place); p < transformation.rowStart(place + 1); p++) {
                if (!touched[transformation.unknownAt(p)]) {
                    nodes.get(transformation.unknownAt(p)).add(place / Components.COUNT);
                }
            }
        }
        for (int unknown = 0; unknown < touched.length; unknown++) {
            if (!touched[unknown]) {
                int place = transformation.componentOf(unknown);
                dropped.add(new DroppedMotion(place / Components.COUNT, place % Components.COUNT,
                        nodes.get(unknown).stream().mapToInt(Integer::intValue).toArray()));
            }
        }
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

    private static DroppedMotion motion(int unknown, double[] vector, Transformation transformation) {
        double[] u = transformation.expand(vector);
        double largest = 0.0;
        for (double value : u) {
            largest = Math.max(largest, Math.abs(value));
        }
        double least = MOVES * largest;
        int[] nodes = IntStream.range(0, u.length).filter(i -> Math.abs(u[i]) > least).map(i -> i / Components.COUNT).distinct()
                .toArray();
        int place = transformation.componentOf(unknown);
        return new DroppedMotion(place / Components.COUNT, place % Components.COUNT, nodes);
    }
}
