package org.modewright.fem.internal;

import java.util.ArrayList;
import java.util.Arrays;
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
 * that moves in it can be left out and nothing is lost. Suspect unknowns that no entry joins are looked at apart.
 */
final class MotionDropping {

    /** Components of a null vector below this share of its largest one, rotations as if at arm 1 m, are round-off. */
    private static final double MOVES = 1e-6;

    /** Up to this size a group is eliminated as a whole, element by element, which is the sharper test. */
    private static final int SMALL = 150;

    private final MatrixPair all;
    private final Transformation transformation;
    private final CarrierRows rows;
    private final int[][] carriersOfUnknowns;
    private final boolean[] drop;
    private final List<DroppedMotion> dropped = new ArrayList<>();
    private FullColumns stiffness;
    private FullColumns mass;

    private MotionDropping(MatrixPair all, CarrierStore store, Transformation transformation) {
        this.all = all;
        this.transformation = transformation;
        this.rows = new CarrierRows(store, transformation);
        this.drop = new boolean[transformation.unknowns()];
        this.carriersOfUnknowns = new int[transformation.unknowns()][];
    }

    static MotionDropping of(MatrixPair all, CarrierStore store, Transformation transformation, Progress progress) {
        MotionDropping dropping = new MotionDropping(all, store, transformation);
        progress.report("looking for motions without stiffness and mass", Double.NaN);
        int[] suspects = SuspectUnknowns.of(store, transformation, progress);
        dropping.findCarriers(suspects, store);
        for (int[] group : dropping.groups(suspects)) {
            progress.checkCancelled();
            dropping.search(group, progress);
        }
        dropping.dropped.sort(Comparator.comparingInt(DroppedMotion::node).thenComparingInt(DroppedMotion::component));
        return dropping;
    }

    /** The unknowns that remain, ascending. */
    int[] kept() {
        return IntStream.range(0, drop.length).filter(unknown -> !drop[unknown]).toArray();
    }

    /** Stiffness and mass over the kept unknowns. */
    MatrixPair matrices() {
        return dropped.isEmpty() ? all : all.restrictedTo(kept());
    }

    /** The motions, by node and component. */
    List<DroppedMotion> dropped() {
        return dropped;
    }

    /** Suspect unknowns by groups that entries of stiffness or mass join. */
    private List<int[]> groups(int[] suspects) {
        int[] number = new int[drop.length];
        Arrays.fill(number, -1);
        for (int i = 0; i < suspects.length; i++) {
            number[suspects[i]] = i;
        }
        stiffness = new FullColumns(all.stiffness(), number, suspects.length);
        mass = new FullColumns(all.mass(), number, suspects.length);
        NodeSets sets = new NodeSets(suspects.length);
        join(all.stiffness(), number, sets);
        join(all.mass(), number, sets);
        int[] size = new int[suspects.length];
        for (int i = 0; i < suspects.length; i++) {
            size[sets.find(i)]++;
        }
        int[][] members = new int[suspects.length][];
        int[] filled = new int[suspects.length];
        List<int[]> groups = new ArrayList<>();
        for (int i = 0; i < suspects.length; i++) {
            int set = sets.find(i);
            if (members[set] == null) {
                members[set] = new int[size[set]];
                groups.add(members[set]);
            }
            members[set][filled[set]++] = suspects[i];
        }
        return groups;
    }

    private static void join(SymmetricMatrix matrix, int[] number, NodeSets sets) {
        for (int column = 0; column < matrix.order(); column++) {
            for (int p = matrix.columnStart()[column]; number[column] >= 0 && p < matrix.columnStart()[column + 1]; p++) {
                if (matrix.value()[p] != 0.0 && number[matrix.row()[p]] >= 0) {
                    sets.join(number[column], number[matrix.row()[p]]);
                }
            }
        }
    }

    private void findCarriers(int[] suspects, CarrierStore store) {
        for (int unknown : suspects) {
            carriersOfUnknowns[unknown] = new int[0];
        }
        for (int carrier = 0; carrier < store.carriers().size() && suspects.length > 0; carrier++) {
            for (int unknown : rows.unknowns(carrier)) {
                int[] known = carriersOfUnknowns[unknown];
                if (known != null) {
                    carriersOfUnknowns[unknown] = Arrays.copyOf(known, known.length + 1);
                    carriersOfUnknowns[unknown][known.length] = carrier;
                }
            }
        }
    }

    private void search(int[] group, Progress progress) {
        if (group.length <= SMALL) {
            searchByElements(group);
            return;
        }
        MatrixPair own = all.restrictedTo(group);
        PencilReduction reduction = PencilReduction.of(new EigenProblem(own.stiffness(), own.mass()), progress);
        int[] unknowns = reduction.droppedDegreesOfFreedom();
        for (int i = 0; i < unknowns.length; i++) {
            dropIfFree(group, group[unknowns[i]], reduction.nullVectors()[i]);
        }
    }

    private void searchByElements(int[] group) {
        int[] carriers = Arrays.stream(group).flatMap(unknown -> Arrays.stream(carriersOfUnknowns[unknown])).sorted().distinct()
                .toArray();
        SmallNullSpace space = rows.nullSpace(carriers, group);
        for (int j = 0; j < group.length; j++) {
            if (space.isFree(j)) {
                drop(group, group[j], space.solution(j));
            }
        }
    }

    /** A compressed member can take away the energy of a motion but not its forces; such a motion stays. */
    private void dropIfFree(int[] group, int unknown, double[] vector) {
        if (stiffness.hasProduct(group, vector) || mass.hasProduct(group, vector)) {
            return;
        }
        drop(group, unknown, vector);
    }

    private void drop(int[] group, int unknown, double[] vector) {
        drop[unknown] = true;
        int place = transformation.componentOf(unknown);
        dropped.add(new DroppedMotion(place / Components.COUNT, place % Components.COUNT, nodes(group, vector)));
    }

    private int[] nodes(int[] group, double[] vector) {
        double largest = 0.0;
        for (double value : vector) {
            largest = Math.max(largest, Math.abs(value));
        }
        TreeSet<Integer> nodes = new TreeSet<>();
        for (int i = 0; i < group.length; i++) {
            if (Math.abs(vector[i]) > MOVES * largest) {
                nodes.add(transformation.componentOf(group[i]) / Components.COUNT);
            }
        }
        return nodes.stream().mapToInt(Integer::intValue).toArray();
    }
}
