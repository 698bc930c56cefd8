package org.modewright.modal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.modewright.fem.FrameElement;
import org.modewright.fem.NodePoint;

/** Nodes and directions as sentences name them. */
final class NodeWords {

    private NodeWords() {
    }

    /** "Node A", "Nodes A, B and C", "12 nodes (A, B, C, D, E and 7 more)". */
    static String list(int[] indices, List<NodePoint> nodes) {
        List<String> names = names(indices, nodes);
        if (names.size() > Figures.NAMED) {
            return names.size() + " nodes (" + Figures.list(names) + ")";
        }
        return (names.size() == 1 ? "Node " : "Nodes ") + Figures.list(names);
    }

    static String members(List<FrameElement> members) {
        return (members.size() == 1 ? "member " : "members ") + Figures.list(members.stream().map(FrameElement::name).toList());
    }

    static List<String> ids(int[] indices, List<NodePoint> nodes) {
        return Arrays.stream(indices).mapToObj(i -> nodes.get(i).id()).toList();
    }

    static List<String> names(int[] indices, List<NodePoint> nodes) {
        return Arrays.stream(indices).mapToObj(i -> nodes.get(i).name()).toList();
    }

    static List<String> directions(boolean[] able) {
        List<String> labels = new ArrayList<>();
        for (Direction direction : Direction.values()) {
            if (able[direction.ordinal()]) {
                labels.add(direction.label());
            }
        }
        return labels;
    }
}
