package org.modewright.model;

import java.util.List;

import org.modewright.model.structure.StructuralModel;

/**
 * What a model must be like to be computed: complete references, finite and sensible numbers, unique names, and a geometry on which
 * elements and constraints are defined. Whether the structure is stable is for the computation to say.
 */
public final class WellFormedness {

    private static final List<String> CHECKS = List.of(
            "model-empty", "reference-missing", "reference-outside", "id-repeated",
            "name-blank", "name-repeated",
            "number-not-finite", "number-not-positive", "number-negative", "poisson-range", "share-range", "no-direction",
            "member-ends-coincide", "member-zero-length", "member-rigid-too-long", "release-repeated", "release-leaves-motion",
            "spring-to-itself", "spring-repeated-coupling-component", "spring-not-semidefinite",
            "support-repeated", "support-elastic-on-held",
            "floor-too-few-nodes", "floor-node-repeated", "floor-not-coplanar", "floor-line-not-horizontal",
            "link-to-itself", "link-component-repeated", "link-cyclic",
            "tie-empty", "tie-term-repeated", "level-repeated", "mass-negative");

    private WellFormedness() {
    }

    /**
     * @return the stable names of all checks
     */
    public static List<String> checks() {
        return CHECKS;
    }

    /**
     * @param model a model
     * @return its defects; empty for a sound model
     */
    public static List<Defect> check(StructuralModel model) {
        DefectList defects = new DefectList();
        if (model.getNodes().isEmpty()) {
            defects.error("model-empty", model, null, "The model has no nodes.", "Add nodes and members, or import a table package.");
        }
        new ReferenceChecks(model, defects).run();
        new NameChecks(model, defects).run();
        new NumberChecks(model, defects).run();
        new MemberChecks(model, defects).run();
        new SpringChecks(model, defects).run();
        new ConstraintChecks(model, defects).run();
        new MassChecks(model, defects).run();
        return defects.toList();
    }

    /**
     * @param defects defects of a model
     * @return whether none of them is an error
     */
    public static boolean isComputable(List<Defect> defects) {
        return defects.stream().noneMatch(d -> d.severity() == Severity.ERROR);
    }
}
