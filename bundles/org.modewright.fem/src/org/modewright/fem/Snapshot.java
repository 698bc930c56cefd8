package org.modewright.fem;

import java.util.ArrayList;
import java.util.List;

import org.modewright.model.Defect;
import org.modewright.model.Severity;
import org.modewright.model.WellFormedness;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.UnitSystem;

/**
 * Immutable copy of a structural model in SI units, made once on the thread that owns the model. Conversion from the model's units
 * happens here and nowhere else. Nodes are known by their index.
 */
public final class Snapshot {

    private final String name;
    private final UnitSystem units;
    private final double gravity;
    private final List<NodePoint> nodes;
    private final List<LevelMark> levels;
    private final List<FrameElement> members;
    private final List<SpringElement> springs;
    private final List<SpringElement> elasticSupports;
    private final List<SupportCondition> supports;
    private final List<PointMass> pointMasses;
    private final List<LoadMass> loadMasses;
    private final List<FloorTie> floors;
    private final List<LinkTie> links;
    private final List<LinearTie> ties;

    private Snapshot(StructuralModel model, SnapshotReader reader) {
        name = model.getName();
        units = model.getUnits();
        gravity = reader.gravity();
        nodes = List.copyOf(reader.nodes());
        levels = List.copyOf(reader.levels());
        members = List.copyOf(reader.members());
        springs = List.copyOf(reader.springs());
        elasticSupports = List.copyOf(reader.elasticSupports());
        supports = List.copyOf(reader.supports());
        pointMasses = List.copyOf(reader.pointMasses());
        loadMasses = List.copyOf(reader.loadMasses());
        floors = List.copyOf(reader.floors());
        links = List.copyOf(reader.links());
        ties = List.copyOf(reader.ties());
    }

    /**
     * Copies a model.
     *
     * @throws ModelDefectsException if the model has defects of severity error
     */
    public static Snapshot of(StructuralModel model) {
        List<Defect> errors = WellFormedness.check(model).stream().filter(defect -> defect.severity() == Severity.ERROR).toList();
        if (!errors.isEmpty()) {
            throw new ModelDefectsException(errors);
        }
        return new Snapshot(model, new SnapshotReader(model));
    }

    /** Short name of the model; null if it has none. */
    public String name() {
        return name;
    }

    /** Unit system of the model; everything here is in SI units all the same. */
    public UnitSystem units() {
        return units;
    }

    /** Acceleration of gravity, m/s<sup>2</sup>. */
    public double gravity() {
        return gravity;
    }

    /** The nodes; their place in this list is their index everywhere. */
    public List<NodePoint> nodes() {
        return nodes;
    }

    /** The levels by ascending elevation. */
    public List<LevelMark> levels() {
        return levels;
    }

    /** Frame members and bars. */
    public List<FrameElement> members() {
        return members;
    }

    /** Springs, without the elastic supports. */
    public List<SpringElement> springs() {
        return springs;
    }

    /** Elastic supports, as springs to ground with the id and name of the support. */
    public List<SpringElement> elasticSupports() {
        return elasticSupports;
    }

    /** Supports with the components they hold; a support that is elastic alone holds none. */
    public List<SupportCondition> supports() {
        return supports;
    }

    /** Masses given at nodes. */
    public List<PointMass> pointMasses() {
        return pointMasses;
    }

    /** Nodal masses made from gravity loads, one entry for each pattern that counts. */
    public List<LoadMass> loadMasses() {
        return loadMasses;
    }

    /** Floors rigid in their plane. */
    public List<FloorTie> floors() {
        return floors;
    }

    /** Rigid links. */
    public List<LinkTie> links() {
        return links;
    }

    /** Multi-point ties. */
    public List<LinearTie> ties() {
        return ties;
    }

    /** All elements in the order of the energy carriers: members, springs, elastic supports. */
    public List<StructuralElement> elements() {
        List<StructuralElement> elements = new ArrayList<>(members.size() + springs.size() + elasticSupports.size());
        elements.addAll(members);
        elements.addAll(springs);
        elements.addAll(elasticSupports);
        return elements;
    }
}
