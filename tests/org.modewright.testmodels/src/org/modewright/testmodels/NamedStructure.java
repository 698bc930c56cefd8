package org.modewright.testmodels;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.modewright.model.Ids;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.Group;
import org.modewright.model.structure.MassFormulation;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MultiPointTie;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.UnitSystem;
import org.modewright.model.structure.Vector;

/**
 * A small structure in N, m and kg whose parts are called by their names; most methods give the structure back, so that calls can be chained.
 *
 * @param <S> the class that a test bundle makes of it
 */
public abstract class NamedStructure<S extends NamedStructure<S>> {

    private final StructuralModel model = StructureFactory.eINSTANCE.createStructuralModel();
    private final Parts parts = new Parts(model);
    private final Map<String, Node> nodes = new HashMap<>();

    protected NamedStructure(String name) {
        model.setName(name);
        model.setUnits(UnitSystem.NEWTON_METRE);
    }

    protected abstract S self();

    /** The model, every part with an id. */
    public StructuralModel model() {
        Ids.assignMissing(model);
        return model;
    }

    /** Storeys that can move along X alone: masses (kg) on springs (N/m), one above the other, the first spring on the ground. */
    public S storeys(double[] masses, double[] stiffnesses) {
        node("base", 0, 0, 0).support("base", "ux uy uz rx ry rz");
        String below = "base";
        for (int i = 0; i < masses.length; i++) {
            String floor = "floor " + (i + 1);
            node(floor, 0, 0, 3.0 * (i + 1)).support(floor, "uy uz rx ry rz").mass(floor, masses[i]);
            spring("storey " + (i + 1), below, floor, stiffnesses[i]);
            below = floor;
        }
        return self();
    }

    public S node(String name, double x, double y, double z) {
        nodes.put(name, parts.node(name, x, y, z));
        return self();
    }

    public Node node(String name) {
        Node node = nodes.get(name);
        if (node == null) {
            throw new IllegalArgumentException("There is no node " + name + ".");
        }
        return node;
    }

    public S support(String node, String held) {
        parts.support("support " + node, node(node), held);
        return self();
    }

    public S mass(String node, double... components) {
        parts.mass("mass " + (model.getMasses().size() + 1), node(node), components);
        return self();
    }

    /** Moves the last mass away from its node. */
    public S massOffset(double x, double y, double z) {
        last(model.getMasses()).setOffset(vector(x, y, z));
        return self();
    }

    /** A spring, to ground where {@code to} is null. */
    public S spring(String name, String node, String to, double... stiffness) {
        parts.spring(name, node(node), to == null ? null : node(to), stiffness);
        return self();
    }

    public S material(String name, double young, double poisson, double density) {
        parts.material(name, young, poisson, density);
        return self();
    }

    public S section(String name, double area, double iy, double iz, double torsion) {
        parts.section(name, area, iy, iz, torsion);
        return self();
    }

    /** A member of the last section and material. */
    public Member member(String name, String start, String end) {
        return parts.member(name, node(start), node(end), last(model.getFrameSections()), last(model.getMaterials()));
    }

    public S with(String name, String start, String end) {
        member(name, start, end);
        return self();
    }

    public S floor(String name, String... floorNodes) {
        parts.floor(name, Arrays.stream(floorNodes).map(this::node).toList());
        return self();
    }

    public S link(String name, String from, String to) {
        parts.link(name, node(from), node(to));
        return self();
    }

    /** The sum of factor times component is zero; terms as node, component, factor in turn. */
    public S tie(String name, Object... terms) {
        MultiPointTie tie = parts.tie(name);
        for (int i = 0; i < terms.length; i += 3) {
            Parts.term(tie, node((String) terms[i]), (Component) terms[i + 1], (Double) terms[i + 2]);
        }
        return self();
    }

    public S level(String name, double elevation) {
        parts.level(name, elevation);
        return self();
    }

    public Group group(String name) {
        return parts.group(name);
    }

    public S lumped() {
        model.setMassFormulation(MassFormulation.LUMPED);
        return self();
    }

    /** An array of equal values, as of the masses of a uniform building. */
    public static double[] filled(int count, double value) {
        double[] values = new double[count];
        Arrays.fill(values, value);
        return values;
    }

    public static void free(Member member, boolean atStart, Component... components) {
        Parts.free(member, atStart, components);
    }

    public static Vector vector(double x, double y, double z) {
        return Parts.vector(x, y, z);
    }

    private static <T> T last(List<T> list) {
        return list.get(list.size() - 1);
    }
}
