package org.modewright.fem;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;

import org.modewright.model.Quantity;
import org.modewright.model.Units;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.GravityLoad;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.MultiPointTie;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.NodeLoad;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.SpringCoupling;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.TieTerm;
import org.modewright.model.structure.Vector;

/** Reads a well-formed model into the records of a snapshot, converting to SI units. */
final class SnapshotReader {

    private final Units units;
    private final double gravity;
    private final Map<Node, Integer> index = new IdentityHashMap<>();
    private final List<NodePoint> nodes = new ArrayList<>();
    private final List<LevelMark> levels = new ArrayList<>();
    private final List<FrameElement> members = new ArrayList<>();
    private final List<SpringElement> springs = new ArrayList<>();
    private final List<SpringElement> elasticSupports = new ArrayList<>();
    private final List<SupportCondition> supports = new ArrayList<>();
    private final List<PointMass> pointMasses = new ArrayList<>();
    private final List<LoadMass> loadMasses = new ArrayList<>();
    private final List<FloorTie> floors = new ArrayList<>();
    private final List<LinkTie> links = new ArrayList<>();
    private final List<LinearTie> ties = new ArrayList<>();

    SnapshotReader(StructuralModel model) {
        this.units = Units.of(model);
        this.gravity = Units.gravitySi(model);
        model.getNodes().forEach(this::readNode);
        model.getLevels().forEach(this::readLevel);
        levels.sort(Comparator.comparingDouble(LevelMark::elevation));
        MemberReader memberReader = new MemberReader(model, units, nodes, index);
        model.getMembers().forEach(member -> members.add(memberReader.read(member)));
        model.getSprings().forEach(this::readSpring);
        model.getSupports().forEach(this::readSupport);
        model.getMasses().forEach(this::readMass);
        model.getLoadPatterns().forEach(this::readPattern);
        model.getRigidFloors().forEach(this::readFloor);
        model.getRigidLinks().forEach(this::readLink);
        model.getTies().forEach(this::readTie);
    }

    double gravity() {
        return gravity;
    }

    List<NodePoint> nodes() {
        return nodes;
    }

    List<LevelMark> levels() {
        return levels;
    }

    List<FrameElement> members() {
        return members;
    }

    List<SpringElement> springs() {
        return springs;
    }

    List<SpringElement> elasticSupports() {
        return elasticSupports;
    }

    List<SupportCondition> supports() {
        return supports;
    }

    List<PointMass> pointMasses() {
        return pointMasses;
    }

    List<LoadMass> loadMasses() {
        return loadMasses;
    }

    List<FloorTie> floors() {
        return floors;
    }

    List<LinkTie> links() {
        return links;
    }

    List<LinearTie> ties() {
        return ties;
    }

    private double si(Quantity quantity, double value) {
        return units.toSi(quantity) * value;
    }

    private void readNode(Node node) {
        index.put(node, nodes.size());
        nodes.add(new NodePoint(node.getId(), node.getName(), si(Quantity.LENGTH, node.getX()), si(Quantity.LENGTH, node.getY()),
                si(Quantity.LENGTH, node.getZ())));
    }

    private void readLevel(Level level) {
        levels.add(new LevelMark(level.getId(), level.getName(), si(Quantity.LENGTH, level.getElevation())));
    }

    private void readSpring(Spring spring) {
        double[] stiffness = new double[36];
        double[] diagonal = {spring.getUx(), spring.getUy(), spring.getUz(), spring.getRx(), spring.getRy(), spring.getRz()};
        for (int component = 0; component < 6; component++) {
            stiffness[7 * component] = diagonal[component] * stiffnessUnit(component, component);
        }
        for (SpringCoupling coupling : spring.getCouplings()) {
            addCoupling(stiffness, coupling);
        }
        int to = spring.getTo() == null ? SpringElement.GROUND : index.get(spring.getTo());
        springs.add(new SpringElement(spring.getId(), spring.getName(), index.get(spring.getNode()), to, nameOf(spring.getGroup()),
                stiffness));
    }

    private void addCoupling(double[] stiffness, SpringCoupling coupling) {
        int first = coupling.getFirst().getValue();
        int second = coupling.getSecond().getValue();
        double value = coupling.getStiffness() * stiffnessUnit(first, second);
        stiffness[6 * first + second] += value;
        if (first != second) {
            stiffness[6 * second + first] += value;
        }
    }

    /** Force per length between translations, force between a translation and a rotation, force times length between rotations. */
    private double stiffnessUnit(int first, int second) {
        double unit = units.force();
        unit *= first < 3 ? 1.0 / units.length() : 1.0;
        unit *= second < 3 ? 1.0 : units.length();
        return unit;
    }

    private void readSupport(Support support) {
        boolean[] held = {support.isUx(), support.isUy(), support.isUz(), support.isRx(), support.isRy(), support.isRz()};
        int node = index.get(support.getNode());
        supports.add(new SupportCondition(support.getId(), nameOf(support, support.getNode()), node, held));
        double[] elastic = {support.getElasticUx(), support.getElasticUy(), support.getElasticUz(), support.getElasticRx(),
                support.getElasticRy(), support.getElasticRz()};
        double[] stiffness = new double[36];
        boolean isElastic = false;
        for (int component = 0; component < 6; component++) {
            if (!held[component] && elastic[component] != 0.0) {
                stiffness[7 * component] = elastic[component] * stiffnessUnit(component, component);
                isElastic = true;
            }
        }
        if (isElastic) {
            elasticSupports.add(new SpringElement(support.getId(), nameOf(support, support.getNode()), node, SpringElement.GROUND, null,
                    stiffness));
        }
    }

    private void readMass(NodalMass mass) {
        double[] translational = {si(Quantity.MASS, mass.getUx()), si(Quantity.MASS, mass.getUy()), si(Quantity.MASS, mass.getUz())};
        double[] rotary = {si(Quantity.ROTARY_INERTIA, mass.getRx()), si(Quantity.ROTARY_INERTIA, mass.getRy()),
                si(Quantity.ROTARY_INERTIA, mass.getRz())};
        pointMasses.add(new PointMass(mass.getId(), nameOf(mass, mass.getNode()), index.get(mass.getNode()), translational, rotary,
                vector(mass.getOffset())));
    }

    private double[] vector(Vector vector) {
        return vector(vector, units);
    }

    static double[] vector(Vector vector, Units units) {
        if (vector == null) {
            return new double[3];
        }
        double length = units.toSi(Quantity.LENGTH);
        return new double[] {vector.getX() * length, vector.getY() * length, vector.getZ() * length};
    }

    private void readPattern(LoadPattern pattern) {
        if (pattern.getMassFactor() == 0.0) {
            return;
        }
        double[] nodal = new double[nodes.size()];
        boolean[] loaded = new boolean[nodes.size()];
        double total = 0.0;
        for (GravityLoad load : pattern.getLoads()) {
            total += pattern.getMassFactor() * spread(load, pattern.getMassFactor(), nodal, loaded);
        }
        int[] at = IntStream.range(0, nodal.length).filter(node -> loaded[node]).toArray();
        double[] mass = Arrays.stream(at).mapToDouble(node -> nodal[node]).toArray();
        loadMasses.add(new LoadMass(pattern.getName(), at, mass, total));
    }

    /** Spreads a load to nodal masses; returns its mass before the factor, kg. */
    private double spread(GravityLoad load, double factor, double[] nodal, boolean[] loaded) {
        if (load instanceof NodeLoad nodeLoad) {
            double mass = si(Quantity.FORCE, load.getValue()) / gravity;
            addNodal(index.get(nodeLoad.getNode()), factor * mass, nodal, loaded);
            return mass;
        }
        if (load instanceof MemberLoad memberLoad) {
            Member member = memberLoad.getMember();
            int start = index.get(member.getStart());
            int end = index.get(member.getEnd());
            double length = distance(nodes.get(start), nodes.get(end));
            double mass = si(Quantity.FORCE_PER_LENGTH, load.getValue()) * length / gravity;
            addNodal(start, 0.5 * factor * mass, nodal, loaded);
            addNodal(end, 0.5 * factor * mass, nodal, loaded);
            return mass;
        }
        throw new IllegalArgumentException("A gravity load of the kind " + load.eClass().getName() + " cannot be made mass.");
    }

    private static void addNodal(int node, double mass, double[] nodal, boolean[] loaded) {
        nodal[node] += mass;
        loaded[node] = true;
    }

    private static double distance(NodePoint a, NodePoint b) {
        return Math.sqrt((a.x() - b.x()) * (a.x() - b.x()) + (a.y() - b.y()) * (a.y() - b.y()) + (a.z() - b.z()) * (a.z() - b.z()));
    }

    private void readFloor(RigidFloor floor) {
        int[] at = floor.getNodes().stream().mapToInt(index::get).toArray();
        floors.add(new FloorTie(floor.getId(), floor.getName(), at));
    }

    private void readLink(RigidLink link) {
        boolean[] tied = components(link.getComponents());
        if (link.getComponents().isEmpty()) {
            Arrays.fill(tied, true);
        }
        links.add(new LinkTie(link.getId(), link.getName(), index.get(link.getFrom()), index.get(link.getTo()), tied));
    }

    static boolean[] components(List<Component> components) {
        boolean[] chosen = new boolean[6];
        for (Component component : components) {
            chosen[component.getValue()] = true;
        }
        return chosen;
    }

    private void readTie(MultiPointTie tie) {
        int count = tie.getTerms().size();
        int[] at = new int[count];
        int[] components = new int[count];
        double[] factors = new double[count];
        for (int i = 0; i < count; i++) {
            TieTerm term = tie.getTerms().get(i);
            at[i] = index.get(term.getNode());
            components[i] = term.getComponent().getValue();
            // the factors belong to translations in the model's own length
            factors[i] = components[i] < 3 ? term.getFactor() / units.length() : term.getFactor();
        }
        ties.add(new LinearTie(tie.getId(), tie.getName(), at, components, factors));
    }

    /** Supports and nodal masses without a name of their own are called by their node. */
    private static String nameOf(Identified object, Node node) {
        return object.getName() == null || object.getName().isBlank() ? node.getName() : object.getName();
    }

    static String nameOf(Identified object) {
        return object == null ? null : object.getName();
    }
}
