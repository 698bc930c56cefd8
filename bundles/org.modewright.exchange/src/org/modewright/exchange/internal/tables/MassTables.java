package org.modewright.exchange.internal.tables;

import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;

import org.modewright.exchange.internal.tables.Row.Range;
import org.modewright.model.structure.GravityLoad;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.NodeLoad;
import org.modewright.model.structure.StructureFactory;

/** Rows of nodal masses, gravity loads and the mass rule. */
final class MassTables {

    /** The pattern that stands for the own mass of the elements. */
    static final String SELF = "self";

    private static final StructureFactory FACTORY = StructureFactory.eINSTANCE;

    private final Import target;
    private final Set<String> ruled = new HashSet<>();
    private final Map<Node, Integer> masses = new HashMap<>();

    MassTables(Import target) {
        this.target = target;
    }

    void mass(Row row) {
        NodalMass mass = FACTORY.createNodalMass();
        Node node = target.nodes.required(row, "node");
        mass.setNode(node);
        mass.setUx(row.number("ux", Range.NOT_NEGATIVE));
        mass.setUy(row.number("uy", Range.NOT_NEGATIVE));
        mass.setUz(row.number("uz", Range.NOT_NEGATIVE));
        mass.setRx(row.number("rx", Range.NOT_NEGATIVE));
        mass.setRy(row.number("ry", Range.NOT_NEGATIVE));
        mass.setRz(row.number("rz", Range.NOT_NEGATIVE));
        if (node != null) {
            int count = masses.merge(node, 1, Integer::sum);
            mass.setName(massName(node.getName(), count));
        }
        target.from(row, mass);
        target.model.getMasses().add(mass);
    }

    /** A mass is named after its node; a further one at the same node gets its number. */
    static String massName(String node, int count) {
        return count == 1 ? node : node + " (" + count + ")";
    }

    void rule(Row row) {
        String name = row.requiredId("pattern");
        double factor = row.required("factor", Range.NOT_NEGATIVE);
        if (name == null) {
            return;
        }
        if (!ruled.add(name)) {
            row.problem("pattern", "the pattern has a factor already");
        } else if (name.equals(SELF)) {
            target.model.setSelfMassFactor(factor);
        } else {
            target.pattern(name).setMassFactor(factor);
            target.from(row, target.pattern(name));
        }
    }

    void load(Row row) {
        String name = row.requiredId("pattern");
        double value = row.required("value", Range.ANY);
        if (SELF.equals(name)) {
            row.problem("pattern", "self stands for the own mass of the elements; give these loads another pattern");
        }
        GravityLoad load = load(row, row.requiredId("kind"));
        if (load == null || name == null) {
            return;
        }
        load.setValue(value);
        target.from(row, load);
        target.pattern(name).getLoads().add(load);
    }

    private GravityLoad load(Row row, String kind) {
        if (kind == null) {
            return null;
        }
        switch (kind) {
            case "node" -> {
                NodeLoad load = FACTORY.createNodeLoad();
                Node node = target.nodes.required(row, "target");
                load.setNode(node);
                return load;
            }
            case "member" -> {
                MemberLoad load = FACTORY.createMemberLoad();
                Member member = target.members.required(row, "target");
                load.setMember(member);
                return load;
            }
            case "panel" -> row.problem("kind", "panels are not yet supported; give the load on members or nodes");
            default -> row.problem("kind", "this kind of load is not known; give node or member");
        }
        return null;
    }
}
