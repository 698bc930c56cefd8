package org.modewright.modal;

import java.util.List;
import java.util.Objects;

/**
 * A motion that nothing resists, or that the axial forces drive out.
 *
 * @param kind what it is
 * @param nodeIds the nodes that move, by id
 * @param nodeNames the same nodes by name
 * @param directions the directions they move in, as sentences name them: "X", "rotation about Z"
 * @param elementIds members that the sentence names (of an indefinite stiffness: the compressed ones that move), by id
 * @param text what is wrong, with numbers
 * @param remedy what to do
 */
public record Instability(Kind kind, List<String> nodeIds, List<String> nodeNames, List<String> directions, List<String> elementIds,
        String text, String remedy) {

    /** Kinds of instability. */
    public enum Kind {
        /** A connected part that can move as a rigid body. */
        FREE_PART,
        /** A motion without resistance within the structure. */
        MECHANISM,
        /** A shape in which the compression outweighs the stiffness. */
        INDEFINITE
    }

    public Instability {
        Objects.requireNonNull(kind, "kind");
        nodeIds = List.copyOf(nodeIds);
        nodeNames = List.copyOf(nodeNames);
        directions = List.copyOf(directions);
        elementIds = List.copyOf(elementIds);
    }

    /** An instability that names no member. */
    public Instability(Kind kind, List<String> nodeIds, List<String> nodeNames, List<String> directions, String text, String remedy) {
        this(kind, nodeIds, nodeNames, directions, List.of(), text, remedy);
    }
}
