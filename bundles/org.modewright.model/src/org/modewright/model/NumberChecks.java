package org.modewright.model;

import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;

import org.eclipse.emf.common.util.TreeIterator;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.EcorePackage;
import org.modewright.model.structure.AuditSettings;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;

/** Numbers that are not finite, or outside the range in which they mean something. */
final class NumberChecks {

    private enum Range {
        POSITIVE, NOT_NEGATIVE
    }

    private final StructuralModel model;
    private final DefectList defects;
    private final Map<EStructuralFeature, Range> ranges = ranges();
    private final Set<FrameSection> onlyInBars = new HashSet<>();

    NumberChecks(StructuralModel model, DefectList defects) {
        this.model = model;
        this.defects = defects;
    }

    void run() {
        findSectionsOfBars();
        check(model);
        for (TreeIterator<EObject> all = model.eAllContents(); all.hasNext();) {
            check(all.next());
        }
    }

    private void findSectionsOfBars() {
        for (Member member : model.getMembers()) {
            if (member.isAxialOnly()) {
                onlyInBars.add(member.getSection());
            }
        }
        for (Member member : model.getMembers()) {
            if (!member.isAxialOnly()) {
                onlyInBars.remove(member.getSection());
            }
        }
    }

    private void check(EObject object) {
        for (EAttribute attribute : object.eClass().getEAllAttributes()) {
            if (attribute.getEAttributeType() == EcorePackage.Literals.EDOUBLE
                    || attribute.getEAttributeType() == EcorePackage.Literals.EINT) {
                checkNumber(object, attribute, ((Number) object.eGet(attribute)).doubleValue());
            }
        }
        if (object instanceof Material material) {
            checkPoisson(material);
        } else if (object instanceof AuditSettings audit) {
            checkAudit(audit);
        }
    }

    private void checkNumber(EObject object, EAttribute attribute, double value) {
        Range range = rangeOf(object, attribute);
        if (!Double.isFinite(value)) {
            defects.error("number-not-finite", object, attribute, subject(object, attribute, value) + ".", "Enter a finite number.");
        } else if (range == Range.POSITIVE && value <= 0) {
            defects.error("number-not-positive", object, attribute, subject(object, attribute, value) + "; it must be positive.",
                    positiveRemedy(attribute));
        } else if (range == Range.NOT_NEGATIVE && value < 0) {
            defects.error("number-negative", object, attribute, subject(object, attribute, value) + "; it must not be negative.",
                    "Enter zero or a positive number.");
        }
    }

    private static String subject(EObject object, EAttribute attribute, double value) {
        String quantity = Names.describe(attribute);
        return (Character.isUpperCase(quantity.charAt(0)) ? "" : "The ") + quantity + " of " + Names.describe(object) + " is " + value;
    }

    private static String positiveRemedy(EAttribute attribute) {
        return attribute == StructurePackage.Literals.MATERIAL__DENSITY
                ? "Enter a positive density; to leave out the own mass of all elements set the self-mass factor of the model to 0."
                : "Enter a positive number.";
    }

    private Range rangeOf(EObject object, EAttribute attribute) {
        boolean bending = attribute == StructurePackage.Literals.FRAME_SECTION__IY
                || attribute == StructurePackage.Literals.FRAME_SECTION__IZ
                || attribute == StructurePackage.Literals.FRAME_SECTION__TORSION;
        return bending && onlyInBars.contains(object) ? Range.NOT_NEGATIVE : ranges.get(attribute);
    }

    /** Isotropic elasticity needs -1 &lt; v &lt; 0.5 for a positive energy; v = 0.5 only leaves the bulk modulus without bound. */
    private void checkPoisson(Material material) {
        double ratio = material.getPoisson();
        if (Double.isFinite(ratio) && (ratio <= -1 || ratio >= 0.5)) {
            defects.error("poisson-range", material, StructurePackage.Literals.MATERIAL__POISSON,
                    "Poisson's ratio of " + Names.describe(material) + " is " + ratio + "; it must lie between -1 and 0.5.",
                    "Enter a ratio between -1 and 0.5; most materials lie between 0 and 0.35.");
        }
    }

    private void checkAudit(AuditSettings audit) {
        if (audit.getLocalNodes() < 0 || audit.getLocalNodes() > 1) {
            defects.error("share-range", audit, StructurePackage.Literals.AUDIT_SETTINGS__LOCAL_NODES,
                    "The share of nodes below which a mode is local is " + audit.getLocalNodes() + "; it must lie between 0 and 1.",
                    "Enter a share between 0 and 1.");
        }
        if (!audit.isX() && !audit.isY() && !audit.isZ()) {
            defects.warning("no-direction", audit, null, "The audit judges no direction.",
                    "Choose at least one direction in the audit settings.");
        }
    }

    private static Map<EStructuralFeature, Range> ranges() {
        StructurePackage p = StructurePackage.eINSTANCE;
        Map<EStructuralFeature, Range> map = new HashMap<>();
        put(map, Range.POSITIVE, p.getMaterial_Young(), p.getMaterial_Density(), p.getFrameSection_Area(), p.getFrameSection_Iy(),
                p.getFrameSection_Iz(), p.getFrameSection_Torsion(), p.getMember_ShearYFactor(), p.getMember_ShearZFactor());
        put(map, Range.NOT_NEGATIVE, p.getMaterial_Shear(), p.getFrameSection_ShearAreaY(), p.getFrameSection_ShearAreaZ(),
                p.getMember_StartRigid(), p.getMember_EndRigid(), p.getMember_AxialFactor(), p.getMember_TorsionFactor(),
                p.getMember_BendingYFactor(), p.getMember_BendingZFactor(),
                p.getSpring_Ux(), p.getSpring_Uy(), p.getSpring_Uz(), p.getSpring_Rx(), p.getSpring_Ry(), p.getSpring_Rz(),
                p.getSupport_ElasticUx(), p.getSupport_ElasticUy(), p.getSupport_ElasticUz(), p.getSupport_ElasticRx(),
                p.getSupport_ElasticRy(), p.getSupport_ElasticRz(),
                p.getNodalMass_Ux(), p.getNodalMass_Uy(), p.getNodalMass_Uz(), p.getNodalMass_Rx(), p.getNodalMass_Ry(),
                p.getNodalMass_Rz(),
                p.getStructuralModel_Gravity(), p.getStructuralModel_SelfMassFactor(), p.getLoadPattern_MassFactor(),
                p.getAnalysisSettings_Modes(), p.getAnalysisSettings_Below(), p.getAuditSettings_Coincidence());
        return map;
    }

    private static void put(Map<EStructuralFeature, Range> map, Range range, EAttribute... attributes) {
        for (EAttribute attribute : attributes) {
            map.put(attribute, range);
        }
    }
}
