package org.modewright.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.util.Set;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EClassifier;
import org.eclipse.emf.ecore.EcorePackage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.NodeLoad;
import org.modewright.model.structure.SpringCoupling;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.UnitSystem;

/**
 * Factors of the unit systems. Definitions: international yard and pound agreement of 1959 (foot 0.3048 m, pound 0.45359237 kg) and
 * standard gravity 9.80665 m/s2 (3rd CGPM, 1901), all exact; from them slug = lbf s2/ft = 14.593903 kg (rounded as in tables).
 */
class UnitsTest {

    /** The definition of the pound-force, 0.45359237 kg times 9.80665 m/s2, has at most round-off against the constant. */
    @Test
    void poundForceIsPoundTimesStandardGravity() {
        assertEquals(0.45359237 * 9.80665, Units.of(UnitSystem.POUND_INCH).force(), 1e-15 * 5);
    }

    @ParameterizedTest
    @CsvSource({
        "NEWTON_METRE, 1, 1, 1",
        "KILONEWTON_METRE, 1, 1000, 1000",
        "NEWTON_MILLIMETRE, 0.001, 1, 1000",
        "KIP_FOOT, 0.3048, 4448.2216152605, 14593.902937206",
        "KIP_INCH, 0.0254, 4448.2216152605, 175126.835246476",
        "POUND_INCH, 0.0254, 4.4482216152605, 175.126835246476"})
    void basicFactors(UnitSystem system, double length, double force, double mass) {
        Units units = Units.of(system);
        assertEquals(length, units.length());
        assertEquals(force, units.force());
        assertEquals(mass, units.mass(), 1e-11 * mass);
    }

    @ParameterizedTest
    @EnumSource(UnitSystem.class)
    void massIsForceTimesSecondSquaredPerLength(UnitSystem system) {
        Units units = Units.of(system);
        assertEquals(units.force() / units.length(), units.mass(), 1e-15 * units.mass());
    }

    /** 29000 ksi = 199947.98 N/mm2 (1 ksi = 6.894757293168361 N/mm2); 490 lb/ft3 in lbf s2/in4 is steel of 7849.0 kg/m3. */
    @Test
    void derivedFactors() {
        assertEquals(6.894757293168361e6, Units.of(UnitSystem.KIP_INCH).toSi(Quantity.STRESS), 1e-8);
        assertEquals(1e6, Units.of(UnitSystem.NEWTON_MILLIMETRE).toSi(Quantity.STRESS), 1e-9);
        assertEquals(1e12, Units.of(UnitSystem.NEWTON_MILLIMETRE).toSi(Quantity.DENSITY), 1e-3);
        assertEquals(1e-12, Units.of(UnitSystem.NEWTON_MILLIMETRE).toSi(Quantity.SECOND_MOMENT), 1e-27);
        double poundPerCubicFoot = 490 / (32.17404855643044 * 12) / 1728;
        assertEquals(490 * 0.45359237 / Math.pow(0.3048, 3),
                poundPerCubicFoot * Units.of(UnitSystem.POUND_INCH).toSi(Quantity.DENSITY), 1e-8);
        assertEquals(Math.PI, 180 * Units.of(UnitSystem.KIP_FOOT).toSi(Quantity.ANGLE), 1e-15);
        assertEquals(1.0, Units.of(UnitSystem.KIP_FOOT).toSi(Quantity.NONE));
    }

    /** Stiffness over mass is a frequency squared in SI whatever the system. */
    @ParameterizedTest
    @EnumSource(UnitSystem.class)
    void secondsAreTheSameInEverySystem(UnitSystem system) {
        Units units = Units.of(system);
        assertEquals(1, units.toSi(Quantity.STIFFNESS) / units.toSi(Quantity.MASS), 1e-15 * 2);
        assertEquals(1, units.toSi(Quantity.ROTATIONAL_STIFFNESS) / units.toSi(Quantity.ROTARY_INERTIA), 1e-15 * 4);
    }

    @Test
    void symbols() {
        assertEquals("kN/m²", Units.of(UnitSystem.KILONEWTON_METRE).symbol(Quantity.STRESS));
        assertEquals("t/m³", Units.of(UnitSystem.KILONEWTON_METRE).symbol(Quantity.DENSITY));
        assertEquals("mm⁴", Units.of(UnitSystem.NEWTON_MILLIMETRE).symbol(Quantity.SECOND_MOMENT));
        assertEquals("kip·s²/ft", Units.of(UnitSystem.KIP_FOOT).symbol(Quantity.MASS));
        assertEquals("lbf·s²/in⁴", Units.of(UnitSystem.POUND_INCH).symbol(Quantity.DENSITY));
        assertEquals("kip·in·s²", Units.of(UnitSystem.KIP_INCH).symbol(Quantity.ROTARY_INERTIA));
        assertEquals("N·m/rad", Units.of(UnitSystem.NEWTON_METRE).symbol(Quantity.ROTATIONAL_STIFFNESS));
        assertEquals("", Units.of(UnitSystem.NEWTON_METRE).symbol(Quantity.NONE));
    }

    @Test
    void gravityIsStandardUnlessStated() {
        StructuralModel model = ModelFile.create("g");
        model.setUnits(UnitSystem.KIP_FOOT);
        assertEquals(9.80665, Units.gravitySi(model));
        assertEquals(32.17404855643044, Units.gravity(model), 1e-13);
        model.setGravity(32.2);
        assertEquals(32.2 * 0.3048, Units.gravitySi(model), 1e-15 * 10);
        assertEquals(32.2, Units.gravity(model));
    }

    /** Numbers without a unit are exactly the factors, ratios, shares and counts. */
    @Test
    void everyNumberHasItsQuantity() {
        Set<String> plain = Set.of("poisson", "selfMassFactor", "axialFactor", "shearYFactor", "shearZFactor", "torsionFactor",
                "bendingYFactor", "bendingZFactor", "factor", "massFactor", "localNodes");
        for (EClassifier classifier : StructurePackage.eINSTANCE.getEClassifiers()) {
            if (classifier instanceof EClass kind) {
                for (EAttribute attribute : kind.getEAttributes()) {
                    if (attribute.getEAttributeType() == EcorePackage.Literals.EDOUBLE) {
                        assertEquals(plain.contains(attribute.getName()), Quantity.of(attribute) == Quantity.NONE,
                                kind.getName() + "." + attribute.getName());
                    }
                }
            }
        }
    }

    @Test
    void quantitiesThatDependOnTheObject() {
        EAttribute value = StructurePackage.Literals.GRAVITY_LOAD__VALUE;
        NodeLoad atNode = StructureFactory.eINSTANCE.createNodeLoad();
        MemberLoad onMember = StructureFactory.eINSTANCE.createMemberLoad();
        assertEquals(Quantity.FORCE, Quantity.of(atNode, value));
        assertEquals(Quantity.FORCE_PER_LENGTH, Quantity.of(onMember, value));
        assertNotEquals(Quantity.of(atNode, value), Quantity.of(onMember, value));
        SpringCoupling coupling = StructureFactory.eINSTANCE.createSpringCoupling();
        coupling.setFirst(Component.UX);
        coupling.setSecond(Component.UY);
        EAttribute stiffness = StructurePackage.Literals.SPRING_COUPLING__STIFFNESS;
        assertEquals(Quantity.STIFFNESS, Quantity.of(coupling, stiffness));
        coupling.setSecond(Component.RY);
        assertEquals(Quantity.COUPLING_STIFFNESS, Quantity.of(coupling, stiffness));
        coupling.setFirst(Component.RZ);
        assertEquals(Quantity.ROTATIONAL_STIFFNESS, Quantity.of(coupling, stiffness));
    }
}
