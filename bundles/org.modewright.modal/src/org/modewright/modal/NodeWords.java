package org.modewright.modal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;
import org.modewright.fem.FrameElement;
import org.modewright.fem.NodePoint;

/** Nodes and directions as sentences name them. */
final class NodeWords {

    private static final int NAMED = 5;

    private NodeWords() {
    }

    /** "Node A", "Nodes A, B and C", "12 nodes (A, B, C, D, E and 7 more)". */
    static String list(int[] indices, List<NodePoint> nodes) {
        List<String> names = names(indices, nodes);
        if (names.size() > NAMED) {
            return names.size() + " nodes (" + String.join(", ", names.subList(0, NAMED)) + " and " + (names.size() - NAMED) + " more)";
        }
        return (names.size() == 1 ? "Node " : "Nodes ") + enumerate(names);
    }

    static String members(List<FrameElement> members) {
        return (members.size() == 1 ? "member " : "members ") + enumerate(members.stream().map(FrameElement::name).toList());
    }

    /** "A", "A and B", "A, B and C". */
    static String enumerate(List<String> words) {
        if (words.size() < 2) {
            return String.join("", words);
        }
        int last = words.size() - 1;
        return words.subList(0, last).stream().collect(Collectors.joining(", ")) + " and " + words.get(last);
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
