package org.modewright.ui.editor.fields;

import java.util.List;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.modewright.model.Defect;
import org.modewright.model.WellFormedness;
import org.modewright.model.structure.AnalysisSettings;
import org.modewright.model.structure.AuditSettings;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.GravityLoad;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;

/** Puts a value to the checks of the model before it is set: on a copy of the one object, so that it costs nothing in a large model. */
final class ValueChecks {

    private ValueChecks() {
    }

    /** What the checks say against a value: a sentence and its remedy; null if nothing. */
    static String of(StructuralModel model, EObject object, EStructuralFeature feature, Object value) {
        EObject copy = copy(object);
        copy.eSet(feature, value);
        StructuralModel trial = copy instanceof StructuralModel itself ? itself : holding(copy);
        if (object instanceof FrameSection section && servesOnlyBars(model, section)) {
            trial.getMembers().add(bar((FrameSection) copy));
        }
        List<Defect> defects = WellFormedness.check(trial);
        return defects.stream().filter(defect -> defect.object() == copy && defect.feature() == feature).findFirst()
                .map(defect -> defect.text() + " " + defect.remedy()).orElse(null);
    }

    /** The object without what it refers to; the model without what it holds. */
    private static EObject copy(EObject object) {
        if (!(object instanceof StructuralModel)) {
            return EcoreUtil.copy(object);
        }
        StructuralModel copy = StructureFactory.eINSTANCE.createStructuralModel();
        for (EAttribute attribute : object.eClass().getEAllAttributes()) {
            copy.eSet(attribute, object.eGet(attribute));
        }
        return copy;
    }

    @SuppressWarnings("unchecked")
    private static StructuralModel holding(EObject part) {
        StructuralModel trial = StructureFactory.eINSTANCE.createStructuralModel();
        if (part instanceof AnalysisSettings analysis) {
            trial.setAnalysis(analysis);
        } else if (part instanceof AuditSettings audit) {
            trial.setAudit(audit);
        } else if (part instanceof GravityLoad load) {
            LoadPattern pattern = StructureFactory.eINSTANCE.createLoadPattern();
            pattern.getLoads().add(load);
            trial.getLoadPatterns().add(pattern);
        } else if (part instanceof Identified) {
            trial.eClass().getEAllContainments().stream()
                    .filter(list -> list.isMany() && list.getEReferenceType().isInstance(part)).findFirst()
                    .ifPresent(list -> ((List<EObject>) trial.eGet(list)).add(part));
        }
        return trial;
    }

    /** A section that only bars have needs no bending stiffness. */
    private static boolean servesOnlyBars(StructuralModel model, FrameSection section) {
        List<Member> users = model.getMembers().stream().filter(member -> member.getSection() == section).toList();
        return !users.isEmpty() && users.stream().allMatch(Member::isAxialOnly);
    }

    private static Member bar(FrameSection section) {
        Member bar = StructureFactory.eINSTANCE.createMember();
        bar.setSection(section);
        bar.setAxialOnly(true);
        return bar;
    }
}
