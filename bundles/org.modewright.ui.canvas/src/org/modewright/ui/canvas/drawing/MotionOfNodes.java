package org.modewright.ui.canvas.drawing;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.modewright.fem.NodePoint;
import org.modewright.modal.ModalResult;

/** The motion of the nodes in one mode, found by the nodes' ids, so that a model that has changed since the run is still drawn. */
public final class MotionOfNodes {

    private static final int COMPONENTS = 6;

    private final Map<String, Integer> index = new HashMap<>();
    private final double[] shape;

    /**
     * @param result the run
     * @param mode index of the mode, from 0
     */
    public MotionOfNodes(ModalResult result, int mode) {
        List<NodePoint> nodes = result.nodes();
        for (int i = 0; i < nodes.size(); i++) {
            index.put(nodes.get(i).id(), i);
        }
        shape = result.sharedShape(mode);
    }

    /**
     * Displacement of a point that moves with a node as a rigid body, u + &theta; &times; r, and the node's rotation.
     *
     * @param node id of the node; a node that the run did not know stays at rest
     * @param arm from the node to the point, global
     * @param target where the six components are put
     * @param at index of the first
     */
    public void at(String node, double[] arm, double[] target, int at) {
        Integer number = index.get(node);
        if (number == null) {
            Arrays.fill(target, at, at + COMPONENTS, 0);
            return;
        }
        int from = COMPONENTS * number;
        double rx = shape[from + 3];
        double ry = shape[from + 4];
        double rz = shape[from + 5];
        target[at] = shape[from] + ry * arm[2] - rz * arm[1];
        target[at + 1] = shape[from + 1] + rz * arm[0] - rx * arm[2];
        target[at + 2] = shape[from + 2] + rx * arm[1] - ry * arm[0];
        target[at + 3] = rx;
        target[at + 4] = ry;
        target[at + 5] = rz;
    }
}
