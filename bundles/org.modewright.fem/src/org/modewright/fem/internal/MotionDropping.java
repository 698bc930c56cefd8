package org.modewright.fem.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.TreeSet;
import java.util.stream.IntStream;

import org.modewright.fem.Components;
import org.modewright.fem.DroppedMotion;
import org.modewright.numerics.Progress;

/**
 * Drops the motions that have neither stiffness nor mass. Such a motion makes the forces of every element zero, which is a set of
 * sparse homogeneous constraints on the suspect unknowns; each unknown that these leave free stands for one motion. Adding such a
 * motion to another changes no energy, so that its unknown can be left out of the matrices and nothing is lost.
 *
 * <p>The forces of each element are judged by its own stiffness: an element that is a billion times softer than its neighbours still
 * holds its nodes. A motion whose energy merely cancels between a compressed member and its neighbours has forces and stays.
 */
final class MotionDropping {

    private final Transformation transformation;
    private final int[] suspects;
    private final boolean[] drop;
    private final List<DroppedMotion> dropped = new ArrayList<>();

    private MotionDropping(Transformation transformation, int[] suspects) {
        this.transformation = transformation;
        this.suspects = suspects;
        this.drop = new boolean[transformation.unknowns()];
    }

    static MotionDropping of(CarrierStore store, Transformation transformation, Progress progress) {
        progress.report("Looking for motions without stiffness and mass", Double.NaN);
        MotionDropping dropping = new MotionDropping(transformation, SuspectUnknowns.of(store, transformation, progress));
        if (dropping.suspects.length > 0) {
            dropping.search(new CarrierRows(store, transformation), store.carriers().size(), progress);
        }
        return dropping;
    }

    /** The unknowns that remain, ascending. */
    int[] kept() {
        return IntStream.range(0, drop.length).filter(unknown -> !drop[unknown]).toArray();
    }

    /** The motions, by node and component. */
    List<DroppedMotion> dropped() {
        return dropped;
    }

    private void search(CarrierRows rows, int carriers, Progress progress) {
        ConstraintElimination elimination = new ConstraintElimination(suspects.length);
        List<LinearForm> forms = new ArrayList<>();
        for (int carrier = 0; carrier < carriers; carrier++) {
            checkNow(carrier, progress);
            addForms(rows, carrier, forms);
        }
        forms.forEach(elimination::announce);
        for (int i = 0; i < forms.size(); i++) {
            checkNow(i, progress);
            elimination.impose(forms.get(i));
        }
        for (int i = 0; i < suspects.length; i++) {
            if (elimination.expression(i) == null) {
                drop(i, elimination);
            }
        }
        dropped.sort(Comparator.comparingInt(DroppedMotion::node).thenComparingInt(DroppedMotion::component));
    }

    private static void checkNow(int count, Progress progress) {
        if (count % 128 == 0) {
            progress.checkCancelled();
        }
    }

    /** The independent constraints that the forces of a carrier put on the suspects, numbered by their place among these. */
    private void addForms(CarrierRows rows, int carrier, List<LinearForm> forms) {
        int[] columns = IntStream.of(rows.unknowns(carrier)).map(unknown -> Arrays.binarySearch(suspects, unknown))
                .filter(place -> place >= 0).toArray();
        if (columns.length > 0) {
            SmallNullSpace space = rows.nullSpace(new int[] {carrier}, IntStream.of(columns).map(place -> suspects[place]).toArray());
            for (int i = 0; i < space.rank(); i++) {
                forms.add(LinearForm.of(columns, space.constraint(i)));
            }
        }
    }

    private void drop(int suspect, ConstraintElimination elimination) {
        drop[suspects[suspect]] = true;
        int place = transformation.componentOf(suspects[suspect]);
        TreeSet<Integer> nodes = new TreeSet<>();
        nodes.add(place / Components.COUNT);
        for (int user : elimination.users(suspect)) {
            nodes.add(transformation.componentOf(suspects[user]) / Components.COUNT);
        }
        dropped.add(new DroppedMotion(place / Components.COUNT, place % Components.COUNT,
                nodes.stream().mapToInt(Integer::intValue).toArray()));
    }
}
