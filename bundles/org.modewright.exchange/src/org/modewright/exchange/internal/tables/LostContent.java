package org.modewright.exchange.internal.tables;

import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.function.Predicate;
import java.util.stream.Collectors;

import org.eclipse.emf.ecore.util.EcoreUtil;
import org.modewright.model.ModelFile;
import org.modewright.model.structure.Group;
import org.modewright.model.structure.Grouped;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberMass;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.Vector;

/** Finds what a model holds and a table package cannot, and says so by name. */
final class LostContent {

    private static final int MOST_NAMES = 10;

    private final StructuralModel model;
    private final List<String> warnings;

    LostContent(StructuralModel model, List<String> warnings) {
        this.model = model;
        this.warnings = warnings;
    }

    void warn() {
        warn("Offsets of members are not part of a table package and were left out", model.getMembers(),
                member -> isSet(member.getStartOffset()) || isSet(member.getEndOffset()));
        warn("Effective-stiffness factors are not part of a table package and were left out", model.getMembers(), LostContent::hasFactor);
        warn("A mass matrix for single members is not part of a table package; the one of the model was written", model.getMembers(),
                member -> member.getMass() != MemberMass.INHERIT);
        warn("Couplings of springs are not part of a table package and were left out", model.getSprings(),
                spring -> !spring.getCouplings().isEmpty());
        warn("Elastic supports were written as springs to ground", model.getSupports(), LostContent::isElastic);
        warn("Offsets of masses are not part of a table package; the masses were put at their nodes", model.getMasses(),
                mass -> isSet(mass.getOffset()));
        warn("Multi-point ties are not part of a table package and were left out", model.getTies(), tie -> true);
        warn("Names of supports are not part of a table package; on reading they get the names of their nodes", model.getSupports(),
                support -> !Objects.equals(support.getName(), support.getNode().getName()));
        massNames();
        groups();
        settings();
    }

    private void massNames() {
        Map<Node, Integer> counts = new HashMap<>();
        Set<NodalMass> renamed = new HashSet<>();
        for (NodalMass mass : model.getMasses()) {
            int count = counts.merge(mass.getNode(), 1, Integer::sum);
            if (!MassTables.massName(mass.getNode().getName(), count).equals(mass.getName())) {
                renamed.add(mass);
            }
        }
        warn("Names of masses are not part of a table package; on reading they get the names of their nodes", model.getMasses(),
                renamed::contains);
    }

    private void groups() {
        Set<Group> used = new HashSet<>();
        List<Grouped> elements = new ArrayList<>(model.getMembers());
        elements.addAll(model.getSprings());
        elements.forEach(element -> used.add(element.getGroup()));
        warn("Groups without elements are not part of a table package and were left out", model.getGroups(),
                group -> !used.contains(group));
        warn("Descriptions of groups are not part of a table package and were left out", model.getGroups(),
                group -> group.getDescription() != null && !group.getDescription().isEmpty());
    }

    private void settings() {
        StructuralModel plain = ModelFile.create("");
        boolean analysis = model.getAnalysis() != null && !EcoreUtil.equals(model.getAnalysis(), plain.getAnalysis());
        boolean audit = model.getAudit() != null && !EcoreUtil.equals(model.getAudit(), plain.getAudit());
        if (analysis || audit) {
            warnings.add("The settings of the " + (analysis && audit ? "analysis and the audit" : analysis ? "analysis" : "audit")
                    + " are not part of a table package and were left out.");
        }
    }

    private <T extends Identified> void warn(String text, Collection<T> objects, Predicate<T> lost) {
        List<String> names = objects.stream().filter(lost).map(Identified::getName).toList();
        if (names.isEmpty()) {
            return;
        }
        String list = names.stream().limit(MOST_NAMES).collect(Collectors.joining(", "));
        warnings.add(text + ": " + list + (names.size() > MOST_NAMES ? " and " + (names.size() - MOST_NAMES) + " more" : "") + ".");
    }

    private static boolean isSet(Vector offset) {
        return offset != null && (offset.getX() != 0 || offset.getY() != 0 || offset.getZ() != 0);
    }

    private static boolean hasFactor(Member member) {
        return member.getAxialFactor() != 1 || member.getShearYFactor() != 1 || member.getShearZFactor() != 1
                || member.getTorsionFactor() != 1 || member.getBendingYFactor() != 1 || member.getBendingZFactor() != 1;
    }

    /** A component that is held has no elastic stiffness: the support is stiffer than any spring. */
    static boolean isElastic(Support support) {
        return elastic(support).stream().anyMatch(stiffness -> stiffness != 0);
    }

    static List<Double> elastic(Support support) {
        return List.of(support.isUx() ? 0 : support.getElasticUx(), support.isUy() ? 0 : support.getElasticUy(),
                support.isUz() ? 0 : support.getElasticUz(), support.isRx() ? 0 : support.getElasticRx(),
                support.isRy() ? 0 : support.getElasticRy(), support.isRz() ? 0 : support.getElasticRz());
    }
}
