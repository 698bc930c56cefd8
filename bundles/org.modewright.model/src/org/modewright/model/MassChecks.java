package org.modewright.model;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

import org.modewright.model.structure.GravityLoad;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.NodeLoad;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;

/**
 * Load patterns that take more mass away from a node than it has: its share of the members' own mass, the masses given there and the loads
 * of all patterns together. No motion of such a node has a positive kinetic energy.
 */
final class MassChecks {

    /** Below this share of all that goes into a node's sum, up and down, the sum counts as zero: it is round-off. */
    private static final double ROUND_OFF = 1e-12;
    private static final MathContext THREE_FIGURES = new MathContext(3);

    private final StructuralModel model;
    private final DefectList defects;
    private final Map<Node, Weight> weights = new IdentityHashMap<>();

    MassChecks(StructuralModel model, DefectList defects) {
        this.model = model;
        this.defects = defects;
    }

    void run() {
        model.getLoadPatterns().forEach(this::addPattern);
        weights.values().removeIf(weight -> weight.ofLoads() >= 0);
        if (weights.isEmpty()) {
            return;
        }
        model.getMembers().forEach(this::addOwnMass);
        model.getMasses().forEach(this::addNodalMass);
        Map<LoadPattern, Lack> lacks = new LinkedHashMap<>();
        for (Node node : model.getNodes()) {
            Weight weight = weights.get(node);
            if (weight != null && weight.isNegative()) {
                lacks.computeIfAbsent(weight.lightest(), pattern -> new Lack()).add(node, weight);
            }
        }
        lacks.forEach(this::report);
    }

    private void addOwnMass(Member member) {
        if (member.getStart() == null || member.getEnd() == null || member.getSection() == null || member.getMaterial() == null) {
            return;
        }
        double length = Geometry.distance(Geometry.end(member.getStart(), member.getStartOffset()),
                Geometry.end(member.getEnd(), member.getEndOffset()));
        double half = 0.5 * model.getSelfMassFactor() * member.getMaterial().getDensity() * member.getSection().getArea() * length;
        for (Node node : List.of(member.getStart(), member.getEnd())) {
            addMass(node, half, half, half);
        }
    }

    private void addNodalMass(NodalMass mass) {
        addMass(mass.getNode(), mass.getUx(), mass.getUy(), mass.getUz());
    }

    private void addMass(Node node, double x, double y, double z) {
        Weight weight = weights.get(node);
        if (weight != null) {
            double gravity = Units.gravity(model);
            weight.addMass(gravity * x, gravity * y, gravity * z);
        }
    }

    private void addPattern(LoadPattern pattern) {
        for (GravityLoad load : pattern.getLoads()) {
            double value = pattern.getMassFactor() * load.getValue();
            if (load instanceof NodeLoad onNode) {
                add(onNode.getNode(), load, value);
            } else if (load instanceof MemberLoad onMember) {
                addMemberLoad(onMember, value);
            }
        }
    }

    private void addMemberLoad(MemberLoad load, double perLength) {
        Member member = load.getMember();
        if (member != null && member.getStart() != null && member.getEnd() != null) {
            double half = 0.5 * perLength * Geometry.distance(Geometry.position(member.getStart()), Geometry.position(member.getEnd()));
            add(member.getStart(), load, half);
            add(member.getEnd(), load, half);
        }
    }

    private void add(Node node, GravityLoad load, double force) {
        if (node != null && force != 0) {
            weights.computeIfAbsent(node, key -> new Weight()).add(load, force);
        }
    }

    private void report(LoadPattern pattern, Lack lack) {
        String others = lack.nodes == 1 ? "" : "; so it is with " + (lack.nodes - 1) + " more";
        double mass = lack.worst.sum() / Units.gravity(model);
        defects.error("mass-negative", lack.worst.lowestLoad(pattern), StructurePackage.Literals.GRAVITY_LOAD__VALUE,
                ReferenceChecks.sentenceStart(pattern) + " gives " + Names.describe(lack.node) + " a negative mass, "
                        + new BigDecimal(mass).round(THREE_FIGURES).toPlainString() + " " + Units.of(model).symbol(Quantity.MASS) + others
                        + ".",
                "Gravity loads count downwards positive: turn the sign of its loads, or set its mass factor to 0.");
    }

    /** What bears on one node, in the model's unit of force. */
    private static final class Weight {

        private final Map<GravityLoad, Double> byLoad = new LinkedHashMap<>();
        private final double[] ofMasses = new double[3];

        void add(GravityLoad load, double force) {
            byLoad.merge(load, force, Double::sum);
        }

        void addMass(double x, double y, double z) {
            ofMasses[0] += x;
            ofMasses[1] += y;
            ofMasses[2] += z;
        }

        double ofLoads() {
            return byLoad.values().stream().mapToDouble(Double::doubleValue).sum();
        }

        /** The sum in the direction that has the least mass. */
        double sum() {
            return ofLoads() + leastOfMasses();
        }

        boolean isNegative() {
            double amount = byLoad.values().stream().mapToDouble(Math::abs).sum() + leastOfMasses();
            return sum() < -ROUND_OFF * amount;
        }

        private double leastOfMasses() {
            return Math.min(ofMasses[0], Math.min(ofMasses[1], ofMasses[2]));
        }

        /** The pattern that takes most away. */
        LoadPattern lightest() {
            Map<LoadPattern, Double> byPattern = new LinkedHashMap<>();
            byLoad.forEach((load, force) -> byPattern.merge((LoadPattern) load.eContainer(), force, Double::sum));
            return lowest(byPattern);
        }

        GravityLoad lowestLoad(LoadPattern pattern) {
            Map<GravityLoad, Double> loads = new LinkedHashMap<>(byLoad);
            loads.keySet().removeIf(load -> load.eContainer() != pattern);
            return lowest(loads);
        }

        private static <T> T lowest(Map<T, Double> forces) {
            return forces.entrySet().stream().min(Map.Entry.comparingByValue()).orElseThrow().getKey();
        }
    }

    /** The nodes that a pattern makes negative, and the worst of them. */
    private static final class Lack {

        private Node node;
        private Weight worst;
        private int nodes;

        void add(Node candidate, Weight weight) {
            nodes++;
            if (node == null || weight.sum() < worst.sum()) {
                node = candidate;
                worst = weight;
            }
        }
    }
}
