package org.modewright.ui.editor.pages;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.Support;

/** The lists of a model that have a table, and how a new row of each begins. */
final class Tables {

    private Tables() {
    }

    /** The containment lists of the model, in the model's order; load patterns have a page of their own. */
    static List<EReference> lists() {
        List<EReference> lists = new ArrayList<>();
        for (EReference list : StructurePackage.Literals.STRUCTURAL_MODEL.getEAllContainments()) {
            if (list.isMany() && list != StructurePackage.Literals.STRUCTURAL_MODEL__LOAD_PATTERNS) {
                lists.add(list);
            }
        }
        return lists;
    }

    /** The list of the model that an object stands in; null if it stands elsewhere. */
    static EReference listOf(EObject object) {
        return object.eContainer() instanceof StructuralModel ? (EReference) object.eContainingFeature() : null;
    }

    @SuppressWarnings("unchecked")
    static List<Identified> objects(StructuralModel model, EReference list) {
        return (List<Identified>) model.eGet(list);
    }

    /** A new object of a list's kind; what it must refer to is the first there is, so that it can be edited from there. */
    static Identified create(StructuralModel model, EReference list) {
        Identified created = (Identified) StructureFactory.eINSTANCE.create(list.getEReferenceType());
        if (created instanceof Member member) {
            begin(model, member);
        } else if (created instanceof Spring spring) {
            spring.setNode(first(model.getNodes()));
        } else if (created instanceof Support support) {
            support.setNode(first(model.getNodes()));
        } else if (created instanceof NodalMass mass) {
            mass.setNode(first(model.getNodes()));
        } else if (created instanceof RigidLink link) {
            link.setFrom(first(model.getNodes()));
            link.setTo(second(model.getNodes()));
        }
        return created;
    }

    private static void begin(StructuralModel model, Member member) {
        member.setStart(first(model.getNodes()));
        member.setEnd(second(model.getNodes()));
        member.setSection(first(model.getFrameSections()));
        member.setMaterial(first(model.getMaterials()));
    }

    private static <T> T first(List<T> list) {
        return list.isEmpty() ? null : list.get(0);
    }

    private static <T> T second(List<T> list) {
        return list.size() < 2 ? null : list.get(1);
    }
}
