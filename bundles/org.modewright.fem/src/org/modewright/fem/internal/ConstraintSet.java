package org.modewright.fem.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

import org.modewright.fem.FloorTie;
import org.modewright.fem.LinearTie;
import org.modewright.fem.LinkTie;
import org.modewright.fem.NodePoint;
import org.modewright.fem.Snapshot;
import org.modewright.fem.SupportCondition;
import org.modewright.numerics.Progress;

/**
 * The supports, floors, links and ties of a structure as homogeneous linear constraints on the six components of its nodes.
 * Component c of node i is unknown 6 i + c.
 */
final class ConstraintSet {

    private static final double[][] AXES = {{1.0, 0.0, 0.0}, {0.0, 1.0, 0.0}, {0.0, 0.0, 1.0}};

    private final List<NodePoint> nodes;
    private final boolean[] held;
    private final List<int[]> unknowns = new ArrayList<>();
    private final List<double[]> factors = new ArrayList<>();

    ConstraintSet(Snapshot snapshot) {
        nodes = snapshot.nodes();
        held = new boolean[6 * nodes.size()];
        snapshot.supports().forEach(this::hold);
        FloorPlane planes = new FloorPlane();
        snapshot.floors().forEach(floor -> addFloor(floor, planes.normal(nodes, floor.nodes())));
        snapshot.links().forEach(this::addLink);
        snapshot.ties().forEach(this::addTie);
    }

    private void hold(SupportCondition support) {
        for (int component = 0; component < 6; component++) {
            held[6 * support.node() + component] |= support.held()[component];
        }
    }

    private void addFloor(FloorTie floor, double[] normal) {
        int reference = floor.nodes()[0];
        double[][] axes = FloorPlane.inPlane(normal);
        double[] origin = nodes.get(reference).position();
        for (int node : floor.nodes()) {
            if (node == reference) {
                continue;
            }
            double[] arm = FloorPlane.cross(normal, FloorPlane.minus(nodes.get(node).position(), origin));
            for (double[] axis : axes) {
                double turn = FloorPlane.dot(axis, arm);
                add(node, axis, new double[3], reference, axis,
                        new double[] {normal[0] * turn, normal[1] * turn, normal[2] * turn});
            }
            add(node, new double[3], normal, reference, new double[3], normal);
        }
    }

    private void addLink(LinkTie link) {
        double[] arm = FloorPlane.minus(nodes.get(link.to()).position(), nodes.get(link.from()).position());
        for (int component = 0; component < 3; component++) {
            double[] axis = AXES[component];
            if (link.tied()[component]) {
                add(link.to(), axis, new double[3], link.from(), axis, FloorPlane.cross(arm, axis));
            }
            if (link.tied()[component + 3]) {
                add(link.to(), new double[3], axis, link.from(), new double[3], axis);
            }
        }
    }

    /** The motion of the follower along some directions equals that of the leader along others. */
    private void add(int follower, double[] translation, double[] rotation, int leader, double[] leaderTranslation,
            double[] leaderRotation) {
        int[] terms = new int[12];
        double[] values = new double[12];
        for (int i = 0; i < 3; i++) {
            terms[i] = 6 * follower + i;
            values[i] = translation[i];
            terms[3 + i] = 6 * follower + 3 + i;
            values[3 + i] = rotation[i];
            terms[6 + i] = 6 * leader + i;
            values[6 + i] = -leaderTranslation[i];
            terms[9 + i] = 6 * leader + 3 + i;
            values[9 + i] = -leaderRotation[i];
        }
        unknowns.add(terms);
        factors.add(values);
    }

    private void addTie(LinearTie tie) {
        int[] terms = new int[tie.nodes().length];
        Arrays.setAll(terms, i -> 6 * tie.nodes()[i] + tie.components()[i]);
        unknowns.add(terms);
        factors.add(tie.factors().clone());
    }

    /** The free motions that these constraints leave. */
    Transformation transformation(Progress progress) {
        double[] scale = new ConstraintScale(nodes, unknowns, factors).ofUnknowns();
        ConstraintElimination elimination = new ConstraintElimination(held.length);
        List<LinearForm> forms = new ArrayList<>(unknowns.size());
        for (int row = 0; row < unknowns.size(); row++) {
            LinearForm form = scaled(unknowns.get(row), factors.get(row), scale);
            forms.add(form);
            elimination.announce(form);
        }
        for (int row = 0; row < forms.size(); row++) {
            if (row % 1024 == 0) {
                progress.checkCancelled();
            }
            elimination.impose(forms.get(row));
        }
        return Transformation.of(held, elimination, scale);
    }

    /** The constraint in scaled unknowns, without those that supports hold. */
    private LinearForm scaled(int[] terms, double[] values, double[] scale) {
        double[] scaled = new double[terms.length];
        for (int i = 0; i < terms.length; i++) {
            scaled[i] = held[terms[i]] ? 0.0 : values[i] / scale[terms[i]];
        }
        return LinearForm.of(terms, scaled);
    }
}
