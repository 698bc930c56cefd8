package org.modewright.fem.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeMap;

import org.modewright.fem.FloorTie;
import org.modewright.fem.LinearTie;
import org.modewright.fem.PointMass;
import org.modewright.fem.Snapshot;
import org.modewright.fem.SpringElement;
import org.modewright.fem.StructuralElement;
import org.modewright.fem.SupportCondition;

/**
 * Finds the parts of a structure, nodes joined by elements or constraints, that no support and no spring holds to the ground. Nodes
 * with neither element nor constraint nor mass are no part of the structure.
 */
public final class LooseParts {

    private final NodeSets sets;
    private final boolean[] used;
    private final boolean[] grounded;

    private LooseParts(int nodes) {
        sets = new NodeSets(nodes);
        used = new boolean[nodes];
        grounded = new boolean[nodes];
    }

    /** The loose parts, each with its nodes ascending. */
    public static List<List<Integer>> of(Snapshot snapshot) {
        LooseParts parts = new LooseParts(snapshot.nodes().size());
        parts.joinElements(snapshot);
        parts.joinConstraints(snapshot);
        snapshot.pointMasses().stream().mapToInt(PointMass::node).forEach(node -> parts.used[node] = true);
        snapshot.loadMasses().forEach(load -> parts.join(load.nodes(), false));
        return parts.loose();
    }

    private void joinElements(Snapshot snapshot) {
        for (StructuralElement element : snapshot.elements()) {
            join(element.nodes(), true);
            if (element instanceof SpringElement spring && spring.isToGround()) {
                grounded[spring.node()] = true;
            }
        }
    }

    private void joinConstraints(Snapshot snapshot) {
        for (SupportCondition support : snapshot.supports()) {
            for (boolean held : support.held()) {
                grounded[support.node()] |= held;
            }
        }
        for (FloorTie floor : snapshot.floors()) {
            join(floor.nodes(), true);
        }
        snapshot.links().forEach(link -> join(new int[] {link.from(), link.to()}, true));
        for (LinearTie tie : snapshot.ties()) {
            join(tie.nodes(), true);
        }
    }

    private void join(int[] nodes, boolean together) {
        for (int node : nodes) {
            used[node] = true;
            if (together) {
                sets.join(nodes[0], node);
            }
        }
    }

    private List<List<Integer>> loose() {
        boolean[] held = new boolean[used.length];
        for (int node = 0; node < used.length; node++) {
            held[sets.find(node)] |= grounded[node];
        }
        TreeMap<Integer, List<Integer>> parts = new TreeMap<>();
        for (int node = 0; node < used.length; node++) {
            if (used[node] && !held[sets.find(node)]) {
                parts.computeIfAbsent(sets.find(node), set -> new ArrayList<>()).add(node);
            }
        }
        return List.copyOf(parts.values());
    }
}
