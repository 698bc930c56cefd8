package org.modewright.audit.detect;

import java.util.Arrays;
import java.util.List;
import org.modewright.audit.ObjectRef;
import org.modewright.fem.Carrier;
import org.modewright.fem.NodePoint;
import org.modewright.modal.Direction;
import org.modewright.modal.Mode;

/** References to what findings concern. */
final class Refs {

    private Refs() {
    }

    static ObjectRef node(NodePoint node) {
        return new ObjectRef("node", node.id(), node.name());
    }

    static List<ObjectRef> nodes(int[] indices, List<NodePoint> nodes) {
        return Arrays.stream(indices).mapToObj(i -> node(nodes.get(i))).toList();
    }

    static List<String> names(int[] indices, List<NodePoint> nodes) {
        return Arrays.stream(indices).mapToObj(i -> nodes.get(i).name()).toList();
    }

    static ObjectRef carrier(Carrier carrier) {
        return new ObjectRef(carrier.kind().word(), carrier.id(), carrier.name());
    }

    static ObjectRef mode(Mode mode) {
        return new ObjectRef("mode", Integer.toString(mode.number()), "mode " + mode.number());
    }

    static ObjectRef direction(Direction direction) {
        return new ObjectRef("direction", direction.word(), direction.label());
    }
}
