package org.modewright.modal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.modewright.fem.FloorTie;
import org.modewright.fem.LinearTie;
import org.modewright.fem.LinkTie;
import org.modewright.fem.NodeSets;
import org.modewright.fem.Snapshot;
import org.modewright.fem.SpringElement;
import org.modewright.fem.StructuralElement;
import org.modewright.fem.SupportCondition;

/**
 * Which nodes hang together through elements and constraints, and which of these parts meet a support. Knows no stiffness: a part that
 * meets a support may still be a mechanism.
 */
public final class Connectivity {

    private final NodeSets sets;
    private final boolean[] used;
    private final boolean[] grounded;
    private final List<int[]> parts;
    private final int[] partOf;

    private Connectivity(Snapshot snapshot) {
        int count = snapshot.nodes().size();
        sets = new NodeSets(count);
        used = new boolean[count];
        grounded = new boolean[count];
        join(snapshot);
        ground(snapshot);
        partOf = new int[count];
        parts = collect();
    }

    /** The connectivity of a model. */
    public static Connectivity of(Snapshot snapshot) {
        return new Connectivity(snapshot);
    }

    private void join(Snapshot snapshot) {
        for (StructuralElement element : snapshot.elements()) {
            unite(element.nodes());
        }
        for (FloorTie floor : snapshot.floors()) {
            unite(floor.nodes());
        }
        for (LinkTie link : snapshot.links()) {
            unite(link.from(), link.to());
        }
        for (LinearTie tie : snapshot.ties()) {
            unite(tie.nodes());
        }
    }

    private void ground(Snapshot snapshot) {
        for (SupportCondition support : snapshot.supports()) {
            for (boolean held : support.held()) {
                grounded[support.node()] |= held;
            }
        }
        for (StructuralElement element : snapshot.elements()) {
            if (element instanceof SpringElement spring && spring.isToGround()) {
                grounded[spring.node()] = true;
            }
        }
        for (LinearTie tie : snapshot.ties()) {
            if (IntStream.of(tie.nodes()).distinct().count() == 1) {
                grounded[tie.nodes()[0]] = true;
            }
        }
    }

    private void unite(int... nodes) {
        for (int node : nodes) {
            used[node] = true;
            sets.join(nodes[0], node);
        }
    }

    private List<int[]> collect() {
        Map<Integer, List<Integer>> byLeader = new LinkedHashMap<>();
        for (int node = 0; node < used.length; node++) {
            byLeader.computeIfAbsent(sets.find(node), key -> new ArrayList<>()).add(node);
        }
        List<int[]> collected = new ArrayList<>();
        for (List<Integer> members : byLeader.values()) {
            int[] part = members.stream().mapToInt(Integer::intValue).toArray();
            boolean held = false;
            for (int node : part) {
                partOf[node] = collected.size();
                held |= grounded[node];
            }
            for (int node : part) {
                grounded[node] = held;
            }
            collected.add(part);
        }
        return collected;
    }

    /** The connected parts, each the ascending indices of its nodes; a node that nothing joins is a part of its own. */
    public List<int[]> parts() {
        return parts;
    }

    /** Index of the part that a node belongs to. */
    public int partOf(int node) {
        return partOf[node];
    }

    /** Whether a part meets a support, rigid or elastic, or a spring to ground. */
    public boolean meetsSupport(int part) {
        return grounded[parts.get(part)[0]];
    }

    /** Whether an element or a constraint uses a node. */
    public boolean isUsed(int node) {
        return used[node];
    }
}
