package org.modewright.model;

import java.util.HashMap;
import java.util.HashSet;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

import org.modewright.model.structure.MultiPointTie;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.TieTerm;

/** Supports, rigid floors, rigid links and ties. Redundant constraints are no defect. */
final class ConstraintChecks {

    /** Nodes of a floor lie in one plane within this share of its size. */
    private static final double COPLANAR = 1e-6;

    private final StructuralModel model;
    private final DefectList defects;

    ConstraintChecks(StructuralModel model, DefectList defects) {
        this.model = model;
        this.defects = defects;
    }

    void run() {
        checkSupports();
        model.getRigidFloors().forEach(this::checkFloor);
        checkLinks();
        model.getTies().forEach(this::checkTie);
    }

    private void checkSupports() {
        Map<Node, Support> first = new HashMap<>();
        for (Support support : model.getSupports()) {
            Support other = support.getNode() == null ? null : first.putIfAbsent(support.getNode(), support);
            if (other != null) {
                defects.error("support-repeated", support, StructurePackage.Literals.SUPPORT__NODE,
                        ReferenceChecks.sentenceStart(support.getNode()) + " is supported twice, by " + Names.describe(other) + " and "
                                + Names.describe(support) + ".",
                        "Put both into one support.");
            }
            if (isElasticWhereHeld(support)) {
                defects.warning("support-elastic-on-held", support, null,
                        ReferenceChecks.sentenceStart(support)
                                + " has an elastic stiffness for a component that it holds; the stiffness is ignored.",
                        "Clear the stiffness or release the component.");
            }
        }
    }

    private static boolean isElasticWhereHeld(Support s) {
        return s.isUx() && s.getElasticUx() != 0 || s.isUy() && s.getElasticUy() != 0 || s.isUz() && s.getElasticUz() != 0
                || s.isRx() && s.getElasticRx() != 0 || s.isRy() && s.getElasticRy() != 0 || s.isRz() && s.getElasticRz() != 0;
    }

    private void checkFloor(RigidFloor floor) {
        List<Node> nodes = floor.getNodes();
        Set<Node> different = new HashSet<>(nodes);
        if (different.size() < nodes.size()) {
            defects.warning("floor-node-repeated", floor, StructurePackage.Literals.RIGID_FLOOR__NODES,
                    ReferenceChecks.sentenceStart(floor) + " lists a node twice.", "Remove the repetition.");
        }
        if (different.size() < 2) {
            defects.error("floor-too-few-nodes", floor, StructurePackage.Literals.RIGID_FLOOR__NODES,
                    ReferenceChecks.sentenceStart(floor) + " has fewer than two nodes.", "Add nodes or delete the floor.");
            return;
        }
        checkPlane(floor, nodes.stream().map(Geometry::position).toList());
    }

    private void checkPlane(RigidFloor floor, List<double[]> points) {
        double size = Geometry.size(points);
        double tolerance = COPLANAR * size;
        if (!Double.isFinite(size) || size == 0) {
            return;
        }
        double[] origin = points.get(0);
        double[] along = Geometry.minus(Geometry.farthest(points, p -> Geometry.distance(p, origin)), origin);
        double length = Geometry.norm(along);
        double[] third = Geometry.farthest(points, p -> Geometry.norm(Geometry.cross(along, Geometry.minus(p, origin))));
        double[] normal = Geometry.cross(along, Geometry.minus(third, origin));
        if (Geometry.norm(normal) <= tolerance * length) {
            checkLine(floor, along, tolerance);
            return;
        }
        double worst = points.stream().mapToDouble(p -> Math.abs(Geometry.dot(Geometry.minus(p, origin), normal))).max().orElse(0)
                / Geometry.norm(normal);
        if (worst > tolerance) {
            defects.error("floor-not-coplanar", floor, StructurePackage.Literals.RIGID_FLOOR__NODES,
                    "The nodes of " + Names.describe(floor) + " do not lie in one plane: one is " + worst + " off.",
                    "Move the nodes into one plane, or make a floor for each plane.");
        }
    }

    /** Nodes on one line span no plane; the floor is then taken horizontal, which is surely meant only for a horizontal line. */
    private void checkLine(RigidFloor floor, double[] along, double tolerance) {
        if (Math.abs(along[2]) > tolerance) {
            defects.warning("floor-line-not-horizontal", floor, StructurePackage.Literals.RIGID_FLOOR__NODES,
                    "The nodes of " + Names.describe(floor)
                            + " lie on one line that is not horizontal; the floor is taken horizontal all the same.",
                    "Add a node off the line, or use rigid links.");
        }
    }

    private void checkLinks() {
        for (RigidLink link : model.getRigidLinks()) {
            if (link.getFrom() != null && link.getFrom() == link.getTo()) {
                defects.error("link-to-itself", link, StructurePackage.Literals.RIGID_LINK__TO,
                        ReferenceChecks.sentenceStart(link) + " links a node to itself.", "Choose another node or delete the link.");
            }
            if (link.getComponents().size() != Set.copyOf(link.getComponents()).size()) {
                defects.warning("link-component-repeated", link, StructurePackage.Literals.RIGID_LINK__COMPONENTS,
                        ReferenceChecks.sentenceStart(link) + " names a component twice.", "Remove the repetition.");
            }
        }
        new LinkCycles().run();
    }

    /** Links that close a circle say something twice; joins sets of linked nodes and reports the link whose ends are joined already. */
    private final class LinkCycles {

        private final Map<Node, Node> parents = new IdentityHashMap<>();

        void run() {
            for (RigidLink link : model.getRigidLinks()) {
                if (link.getFrom() == null || link.getTo() == null || link.getFrom() == link.getTo()) {
                    continue;
                }
                Node from = root(link.getFrom());
                Node to = root(link.getTo());
                if (from == to) {
                    defects.info("link-cyclic", link, null,
                            ReferenceChecks.sentenceStart(link) + " joins nodes that other rigid links join already.",
                            "Delete it if it was not meant; it does no harm.");
                }
                parents.put(from, to);
            }
        }

        private Node root(Node node) {
            Node root = node;
            while (parents.getOrDefault(root, root) != root) {
                root = parents.get(root);
            }
            for (Node n = node; n != root;) {
                Node next = parents.get(n);
                parents.put(n, root);
                n = next;
            }
            return root;
        }
    }

    private void checkTie(MultiPointTie tie) {
        if (tie.getTerms().stream().allMatch(t -> t.getFactor() == 0)) {
            defects.error("tie-empty", tie, StructurePackage.Literals.MULTI_POINT_TIE__TERMS,
                    ReferenceChecks.sentenceStart(tie) + " has no term with a factor other than 0.", "Add terms or delete the tie.");
        }
        Set<List<Object>> seen = new HashSet<>();
        for (TieTerm term : tie.getTerms()) {
            if (term.getNode() != null && !seen.add(List.of(term.getNode(), term.getComponent()))) {
                defects.warning("tie-term-repeated", tie, StructurePackage.Literals.MULTI_POINT_TIE__TERMS,
                        ReferenceChecks.sentenceStart(tie) + " names " + term.getComponent().getLiteral() + " of "
                                + Names.describe(term.getNode()) + " twice; the factors add up.",
                        "Put both into one term.");
            }
        }
    }
}
