package org.modewright.model;

import java.util.HashMap;
import java.util.List;
import java.util.Map;

import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.Support;

/** Names that are blank or repeat in their kind, and levels at the same height. */
final class NameChecks {

    private final StructuralModel model;
    private final DefectList defects;

    NameChecks(StructuralModel model, DefectList defects) {
        this.model = model;
        this.defects = defects;
    }

    void run() {
        for (List<? extends Identified> kind : List.of(model.getMaterials(), model.getFrameSections(), model.getGroups(), model.getLevels(),
                model.getNodes(), model.getMembers(), model.getSprings(), model.getSupports(), model.getMasses(), model.getRigidFloors(),
                model.getRigidLinks(), model.getTies(), model.getLoadPatterns())) {
            checkKind(kind);
        }
        checkLevels();
    }

    private void checkKind(List<? extends Identified> objects) {
        Map<String, Identified> first = new HashMap<>();
        for (Identified object : objects) {
            String name = object.getName();
            if (name == null || name.isBlank()) {
                blank(object);
            } else if (first.putIfAbsent(name, object) != null) {
                defects.error("name-repeated", object, StructurePackage.Literals.IDENTIFIED__NAME,
                        ReferenceChecks.sentenceStart(object) + " has the same name as another of its kind.", "Rename one of the two.");
            }
        }
    }

    /** Supports and nodal masses are called by their node where they have no name of their own. */
    private void blank(Identified object) {
        String text = ReferenceChecks.sentenceStart(object) + " has no name.";
        String remedy = "Give it a name that no other object of its kind has.";
        if (object instanceof Support || object instanceof NodalMass) {
            defects.warning("name-blank", object, StructurePackage.Literals.IDENTIFIED__NAME, text, remedy);
        } else {
            defects.error("name-blank", object, StructurePackage.Literals.IDENTIFIED__NAME, text, remedy);
        }
    }

    private void checkLevels() {
        Map<Double, Level> first = new HashMap<>();
        for (Level level : model.getLevels()) {
            Level other = first.putIfAbsent(level.getElevation() + 0.0, level);
            if (other != null) {
                defects.warning("level-repeated", level, StructurePackage.Literals.LEVEL__ELEVATION,
                        ReferenceChecks.sentenceStart(level) + " lies at the same height as " + Names.describe(other) + ".",
                        "Correct its elevation or delete it.");
            }
        }
    }
}
