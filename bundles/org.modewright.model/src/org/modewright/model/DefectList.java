package org.modewright.model;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;

/** Collects defects in the order in which they are found. */
final class DefectList {

    private final List<Defect> defects = new ArrayList<>();

    void error(String id, EObject object, EStructuralFeature feature, String text, String remedy) {
        defects.add(new Defect(id, Severity.ERROR, object, feature, text, remedy));
    }

    void warning(String id, EObject object, EStructuralFeature feature, String text, String remedy) {
        defects.add(new Defect(id, Severity.WARNING, object, feature, text, remedy));
    }

    void info(String id, EObject object, EStructuralFeature feature, String text, String remedy) {
        defects.add(new Defect(id, Severity.INFO, object, feature, text, remedy));
    }

    List<Defect> toList() {
        return List.copyOf(defects);
    }
}
