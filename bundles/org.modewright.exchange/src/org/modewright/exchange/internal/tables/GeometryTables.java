package org.modewright.exchange.internal.tables;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

import org.modewright.exchange.internal.tables.Row.Range;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.Support;

/** Rows of nodes, levels, supports, rigid floors and rigid links. */
final class GeometryTables {

    private static final StructureFactory FACTORY = StructureFactory.eINSTANCE;

    private final Import target;
    private final Map<Node, Support> supports = new HashMap<>();
    private final Map<String, RigidFloor> floors = new LinkedHashMap<>();
    private final Map<RigidFloor, List<Row>> floorRows = new HashMap<>();

    GeometryTables(Import target) {
        this.target = target;
    }

    void node(Row row) {
        Node node = FACTORY.createNode();
        node.setName(row.requiredId("id"));
        node.setX(row.required("x", Range.ANY));
        node.setY(row.required("y", Range.ANY));
        node.setZ(row.required("z", Range.ANY));
        target.nodes.declare(row, "id", node.getName(), node);
        target.from(row, node);
        target.model.getNodes().add(node);
    }

    void level(Row row) {
        Level level = FACTORY.createLevel();
        level.setName(row.requiredId("id"));
        level.setElevation(row.required("elevation", Range.ANY));
        target.levels.declare(row, "id", level.getName(), level);
        target.from(row, level);
        target.model.getLevels().add(level);
    }

    void support(Row row) {
        Support support = FACTORY.createSupport();
        Node node = target.nodes.required(row, "node");
        support.setNode(node);
        support.setUx(row.flag("ux"));
        support.setUy(row.flag("uy"));
        support.setUz(row.flag("uz"));
        support.setRx(row.flag("rx"));
        support.setRy(row.flag("ry"));
        support.setRz(row.flag("rz"));
        if (node != null) {
            support.setName(node.getName());
            if (supports.putIfAbsent(node, support) != null) {
                row.problem("node", "the node has a support already; give all its held components in one row");
            }
        }
        target.from(row, support);
        target.model.getSupports().add(support);
    }

    void floorNode(Row row) {
        String name = row.requiredId("floor");
        Node node = target.nodes.required(row, "node");
        if (name == null) {
            return;
        }
        RigidFloor floor = floors.computeIfAbsent(name, key -> newFloor(key, row));
        floorRows.get(floor).add(row);
        if (node != null && floor.getNodes().contains(node)) {
            target.warnings.add(row.file() + ", row " + row.number() + ": the floor " + name + " has the node " + node.getName()
                    + " already; the row was ignored");
            floorRows.get(floor).remove(row);
        } else if (node != null) {
            floor.getNodes().add(node);
        }
    }

    private RigidFloor newFloor(String name, Row row) {
        RigidFloor floor = FACTORY.createRigidFloor();
        floor.setName(name);
        floorRows.put(floor, new ArrayList<>());
        target.from(row, floor);
        target.model.getRigidFloors().add(floor);
        return floor;
    }

    /** Faults of floors, which show only when all their rows are read. */
    void checkFloors() {
        for (RigidFloor floor : floors.values()) {
            List<Row> rows = floorRows.get(floor);
            if (rows.size() < 2) {
                rows.get(0).problem("floor", "a rigid floor needs two or more nodes");
            } else if (floor.getNodes().size() == rows.size()) {
                int odd = Coplanarity.firstOutside(floor.getNodes());
                if (odd >= 0) {
                    rows.get(odd).problem("node", "the nodes of the floor " + floor.getName()
                            + " are not coplanar; this one stands out of their plane");
                }
            }
        }
    }

    void link(Row row) {
        RigidLink link = FACTORY.createRigidLink();
        link.setName(row.requiredId("id"));
        link.setFrom(target.nodes.required(row, "from"));
        link.setTo(target.nodes.required(row, "to"));
        if (link.getFrom() != null && link.getFrom() == link.getTo()) {
            row.problem("to", "the link joins the node to itself");
        }
        link.getComponents().addAll(Words.components(row, "dofs"));
        target.links.declare(row, "id", link.getName(), link);
        target.from(row, link);
        target.model.getRigidLinks().add(link);
    }
}
