package org.modewright.fem;

import java.util.Arrays;

import org.modewright.model.ModelFile;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MultiPointTie;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.UnitSystem;
import org.modewright.model.structure.Vector;
import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.EigenRequest;
import org.modewright.numerics.EigenSolvers;
import org.modewright.numerics.Progress;
import org.modewright.testmodels.Parts;

/** Builds small structures for tests, in N, m and kg unless told otherwise, and solves them by the dense method. */
public final class TestStructure {

    public static final String ALL = "ux uy uz rx ry rz";
    /** Everything but motion in the x-y plane. */
    public static final String OUT_OF_XY = "uz rx ry";

    private final StructuralModel model = ModelFile.create("test");
    private final Parts parts = new Parts(model);
    private int ids;

    public TestStructure() {
        this("N-m-kg");
    }

    public TestStructure(String units) {
        model.setUnits(UnitSystem.get(units));
    }

    public StructuralModel model() {
        return model;
    }

    private String nextName() {
        ids++;
        return "o" + ids;
    }

    /** Ids equal names, so that a test can call parts of a snapshot by either. */
    private static <T extends Identified> T identified(T object) {
        object.setId(object.getName());
        return object;
    }

    public Node node(double x, double y, double z) {
        return identified(parts.node(nextName(), x, y, z));
    }

    public Material material(double young, double poisson, double density) {
        return identified(parts.material(nextName(), young, poisson, density));
    }

    public FrameSection section(double area, double iy, double iz, double torsion, double shearY, double shearZ) {
        FrameSection section = identified(parts.section(nextName(), area, iy, iz, torsion));
        section.setShearAreaY(shearY);
        section.setShearAreaZ(shearZ);
        return section;
    }

    public Member member(Node start, Node end, FrameSection section, Material material) {
        return identified(parts.member(nextName(), start, end, section, material));
    }

    /** A straight line of equal members; the nodes from the first to the last. */
    public Node[] line(double[] from, double[] to, int members, FrameSection section, Material material) {
        return line(node(from[0], from[1], from[2]), node(to[0], to[1], to[2]), members, section, material);
    }

    public Node[] line(Node first, Node last, int members, FrameSection section, Material material) {
        Node[] nodes = new Node[members + 1];
        nodes[0] = first;
        nodes[members] = last;
        for (int i = 1; i < members; i++) {
            double share = (double) i / members;
            nodes[i] = node(first.getX() + share * (last.getX() - first.getX()), first.getY() + share * (last.getY() - first.getY()),
                    first.getZ() + share * (last.getZ() - first.getZ()));
        }
        for (int i = 0; i < members; i++) {
            member(nodes[i], nodes[i + 1], section, material);
        }
        return nodes;
    }

    /** Holds components of a node, on top of those held before. */
    public Support hold(Node node, String components) {
        Support support = model.getSupports().stream().filter(s -> s.getNode() == node).findFirst().orElse(null);
        if (support == null) {
            return identified(parts.support(nextName(), node, components));
        }
        Parts.hold(support, components);
        return support;
    }

    public void holdAll(String components) {
        for (Node node : model.getNodes()) {
            hold(node, components);
        }
    }

    public static void release(Member member, String start, String end) {
        for (Component component : Component.values()) {
            if (start.contains(component.getLiteral())) {
                member.getStartFree().add(component);
            }
            if (end.contains(component.getLiteral())) {
                member.getEndFree().add(component);
            }
        }
    }

    public NodalMass mass(Node node, double translational) {
        return mass(node, translational, translational, translational, 0.0, 0.0, 0.0);
    }

    public NodalMass mass(Node node, double x, double y, double z, double rx, double ry, double rz) {
        return identified(parts.mass(nextName(), node, x, y, z, rx, ry, rz));
    }

    public static Vector vector(double x, double y, double z) {
        return Parts.vector(x, y, z);
    }

    /** A spring; to ground where {@code to} is null. */
    public Spring spring(Node node, Node to, double... stiffness) {
        return identified(parts.spring(nextName(), node, to, stiffness));
    }

    public static void couple(Spring spring, Component first, Component second, double stiffness) {
        Parts.couple(spring, first, second, stiffness);
    }

    public RigidFloor floor(Node... nodes) {
        return identified(parts.floor(nextName(), Arrays.asList(nodes)));
    }

    public RigidLink link(Node from, Node to, Component... components) {
        return identified(parts.link(nextName(), from, to, components));
    }

    public MultiPointTie tie() {
        return identified(parts.tie(nextName()));
    }

    public static void term(MultiPointTie tie, Node node, Component component, double factor) {
        Parts.term(tie, node, component, factor);
    }

    public Level level(String name, double elevation) {
        Level level = parts.level(name, elevation);
        level.setId(nextName());
        return level;
    }

    public LoadPattern pattern(String name, double factor) {
        LoadPattern pattern = parts.pattern(name, factor);
        pattern.setId(nextName());
        return pattern;
    }

    public static void load(LoadPattern pattern, Node node, double force) {
        Parts.load(pattern, node, force);
    }

    public static void load(LoadPattern pattern, Member member, double forcePerLength) {
        Parts.load(pattern, member, forcePerLength);
    }

    public Snapshot snapshot() {
        return Snapshot.of(model);
    }

    public Assembly assemble() {
        return Assembly.of(snapshot(), Progress.NONE);
    }

    public EigenPairs pairs() {
        return pairs(assemble());
    }

    public static EigenPairs pairs(Assembly assembly) {
        return EigenSolvers.dense().open(new EigenProblem(assembly.stiffness(), assembly.mass()), Progress.NONE)
                .solve(new EigenRequest(Integer.MAX_VALUE, Double.POSITIVE_INFINITY), Progress.NONE);
    }

    /** Circular frequencies in rad/s, ascending; negative where the eigenvalue is. */
    public double[] circular() {
        return Arrays.stream(pairs().values()).map(value -> Math.copySign(Math.sqrt(Math.abs(value)), value)).toArray();
    }

    /** Frequencies in Hz, ascending. */
    public double[] hertz() {
        return Arrays.stream(circular()).map(omega -> omega / (2.0 * Math.PI)).toArray();
    }

    /** Effective mass of each mode in a direction as a share of the movable mass (of the rotary inertia for a rotation). */
    public static double[] effectiveShares(Assembly assembly, EigenPairs pairs, int direction) {
        MassLedger ledger = assembly.ledger();
        double[] load = assembly.massTimesRigid(direction, ledger.centre());
        double whole = direction < 3 ? ledger.movable()[direction] : ledger.rotary()[direction - 3];
        double[] shares = new double[pairs.count()];
        for (int mode = 0; mode < shares.length; mode++) {
            double participation = 0.0;
            for (int i = 0; i < load.length; i++) {
                participation += load[i] * pairs.vectors()[mode][i];
            }
            shares[mode] = participation * participation / whole;
        }
        return shares;
    }
}
