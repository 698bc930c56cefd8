package org.modewright.model;

import java.util.HashMap;
import java.util.Map;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.SpringCoupling;
import org.modewright.model.structure.StructurePackage;

/**
 * What kind of quantity a number of the model is, as powers of length, force and mass.
 */
public enum Quantity {

    /** A count, a factor or a ratio. */
    NONE(0, 0, 0),
    /** Length. */
    LENGTH(1, 0, 0),
    /** Length squared. */
    AREA(2, 0, 0),
    /** Second moment of area and torsion constant: length to the fourth. */
    SECOND_MOMENT(4, 0, 0),
    /** Force. */
    FORCE(0, 1, 0),
    /** Force per length: line load. */
    FORCE_PER_LENGTH(-1, 1, 0),
    /** Force times length. */
    MOMENT(1, 1, 0),
    /** Force per length squared: stress and modulus of elasticity. */
    STRESS(-2, 1, 0),
    /** Mass. */
    MASS(0, 0, 1),
    /** Mass times length squared. */
    ROTARY_INERTIA(2, 0, 1),
    /** Mass per length cubed. */
    DENSITY(-3, 0, 1),
    /** Force per length. */
    STIFFNESS(-1, 1, 0),
    /** Moment per radian. */
    ROTATIONAL_STIFFNESS(1, 1, 0),
    /** Force per radian: couples a translation with a rotation. */
    COUPLING_STIFFNESS(0, 1, 0),
    /** Length per second squared. */
    ACCELERATION(1, 0, 0),
    /** Angle in degrees. */
    ANGLE(0, 0, 0),
    /** Frequency in hertz. */
    FREQUENCY(0, 0, 0),
    /** Time in seconds. */
    TIME(0, 0, 0);

    private static final Map<EStructuralFeature, Quantity> BY_FEATURE = byFeature();

    private final int lengthPower;
    private final int forcePower;
    private final int massPower;

    Quantity(int lengthPower, int forcePower, int massPower) {
        this.lengthPower = lengthPower;
        this.forcePower = forcePower;
        this.massPower = massPower;
    }

    int lengthPower() {
        return lengthPower;
    }

    int forcePower() {
        return forcePower;
    }

    int massPower() {
        return massPower;
    }

    /**
     * @param attribute an attribute of the structural model
     * @return what its number is; {@link #FORCE} for the value of a gravity load, which depends on the load
     * @see #of(EObject, EAttribute)
     */
    public static Quantity of(EAttribute attribute) {
        return BY_FEATURE.getOrDefault(attribute, NONE);
    }

    /**
     * @param object    an object of the structural model
     * @param attribute one of its attributes
     * @return what its number is
     */
    public static Quantity of(EObject object, EAttribute attribute) {
        if (object instanceof MemberLoad && attribute == StructurePackage.Literals.GRAVITY_LOAD__VALUE) {
            return FORCE_PER_LENGTH;
        }
        if (object instanceof SpringCoupling coupling && attribute == StructurePackage.Literals.SPRING_COUPLING__STIFFNESS) {
            return coupling(isRotation(coupling.getFirst()), isRotation(coupling.getSecond()));
        }
        return of(attribute);
    }

    private static Quantity coupling(boolean firstRotates, boolean secondRotates) {
        if (firstRotates != secondRotates) {
            return COUPLING_STIFFNESS;
        }
        return firstRotates ? ROTATIONAL_STIFFNESS : STIFFNESS;
    }

    private static boolean isRotation(Component component) {
        return component.getValue() >= Component.RX_VALUE;
    }

    private static Map<EStructuralFeature, Quantity> byFeature() {
        StructurePackage p = StructurePackage.eINSTANCE;
        Map<EStructuralFeature, Quantity> map = new HashMap<>();
        put(map, LENGTH, p.getNode_X(), p.getNode_Y(), p.getNode_Z(), p.getVector_X(), p.getVector_Y(), p.getVector_Z(),
                p.getLevel_Elevation(), p.getMember_StartRigid(), p.getMember_EndRigid(), p.getAuditSettings_Coincidence());
        put(map, AREA, p.getFrameSection_Area(), p.getFrameSection_ShearAreaY(), p.getFrameSection_ShearAreaZ());
        put(map, SECOND_MOMENT, p.getFrameSection_Iy(), p.getFrameSection_Iz(), p.getFrameSection_Torsion());
        put(map, STRESS, p.getMaterial_Young(), p.getMaterial_Shear());
        put(map, DENSITY, p.getMaterial_Density());
        put(map, FORCE, p.getMember_AxialForce(), p.getGravityLoad_Value());
        put(map, ANGLE, p.getMember_Roll());
        put(map, ACCELERATION, p.getStructuralModel_Gravity());
        put(map, FREQUENCY, p.getAnalysisSettings_Below());
        put(map, STIFFNESS, p.getSpring_Ux(), p.getSpring_Uy(), p.getSpring_Uz(), p.getSupport_ElasticUx(), p.getSupport_ElasticUy(),
                p.getSupport_ElasticUz(), p.getSpringCoupling_Stiffness());
        put(map, ROTATIONAL_STIFFNESS, p.getSpring_Rx(), p.getSpring_Ry(), p.getSpring_Rz(), p.getSupport_ElasticRx(),
                p.getSupport_ElasticRy(), p.getSupport_ElasticRz());
        put(map, MASS, p.getNodalMass_Ux(), p.getNodalMass_Uy(), p.getNodalMass_Uz());
        put(map, ROTARY_INERTIA, p.getNodalMass_Rx(), p.getNodalMass_Ry(), p.getNodalMass_Rz());
        return map;
    }

    private static void put(Map<EStructuralFeature, Quantity> map, Quantity quantity, EAttribute... attributes) {
        for (EAttribute attribute : attributes) {
            map.put(attribute, quantity);
        }
    }
}
