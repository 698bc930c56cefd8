package org.modewright.model.edit.commands;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertSame;

import java.util.LinkedHashMap;
import java.util.Map;

import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EcorePackage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.modewright.model.Quantity;
import org.modewright.model.Units;
import org.modewright.model.edit.Workshop;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.UnitSystem;

/** Another unit system changes the numbers and not the structure. */
class UnitConversionTest {

    /** Two conversions are four roundings of half a unit in the last place, some 5e-16. */
    private static final double ROUND_OFF = 1e-12;

    private final Workshop shop = new Workshop();
    private final StructuralModel model = shop.model;

    private void convert(UnitSystem system) {
        shop.domain.getCommandStack().execute(new StructureCommands(shop.domain, model).convertUnits(system));
        assertSame(system, model.getUnits());
    }

    private Map<String, Double> numbers() {
        Map<String, Double> numbers = new LinkedHashMap<>();
        collect(model, numbers);
        model.eAllContents().forEachRemaining(object -> collect(object, numbers));
        return numbers;
    }

    private static void collect(EObject object, Map<String, Double> numbers) {
        for (EAttribute attribute : object.eClass().getEAllAttributes()) {
            if (attribute.getEType() == EcorePackage.Literals.EDOUBLE) {
                numbers.put(numbers.size() + " " + object.eClass().getName() + "." + attribute.getName(), (Double) object.eGet(attribute));
            }
        }
    }

    @ParameterizedTest
    @EnumSource(UnitSystem.class)
    void thereAndBackIsTheSame(UnitSystem system) {
        UnitSystem own = model.getUnits();
        Map<String, Double> before = numbers();
        if (system != own) {
            convert(system);
            convert(own);
        }
        numbers().forEach((name, value) -> assertEquals(before.get(name), value, Math.abs(before.get(name)) * ROUND_OFF, name));
    }

    @ParameterizedTest
    @EnumSource(UnitSystem.class)
    void everyQuantityIsTheSameInSiUnits(UnitSystem system) {
        Map<String, Double> before = inSi();
        if (system != model.getUnits()) {
            convert(system);
        }
        inSi().forEach((name, value) -> assertEquals(before.get(name), value, Math.abs(before.get(name)) * ROUND_OFF, name));
    }

    private Map<String, Double> inSi() {
        Units units = Units.of(model);
        Map<String, Double> numbers = new LinkedHashMap<>();
        model.eAllContents().forEachRemaining(object -> {
            for (EAttribute attribute : object.eClass().getEAllAttributes()) {
                if (attribute.getEType() == EcorePackage.Literals.EDOUBLE) {
                    double value = (Double) object.eGet(attribute) * units.toSi(Quantity.of(object, attribute));
                    numbers.put(numbers.size() + " " + attribute.getName(), value);
                }
            }
        });
        return numbers;
    }

    @Test
    void oneStepOfUndoGivesBackTheVeryNumbers() {
        String before = shop.text();
        convert(UnitSystem.KIP_INCH);
        assertNotEquals(before, shop.text());
        shop.domain.getCommandStack().undo();
        assertEquals(before, shop.text());
        assertFalse(shop.domain.getCommandStack().canUndo());
    }

    @Test
    void theSameSystemIsNoStep() {
        Command command = new StructureCommands(shop.domain, model).convertUnits(model.getUnits());
        assertFalse(command.canExecute());
    }
}
