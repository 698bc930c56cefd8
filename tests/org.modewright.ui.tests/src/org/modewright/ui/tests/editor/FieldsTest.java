package org.modewright.ui.tests.editor;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.eclipse.emf.common.command.BasicCommandStack;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.edit.domain.AdapterFactoryEditingDomain;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.modewright.model.edit.StructureEditAdapterFactory;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberMass;
import org.modewright.model.structure.MultiPointTie;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.StructurePackage.Literals;
import org.modewright.model.structure.UnitSystem;
import org.modewright.ui.editor.fields.Field;
import org.modewright.ui.editor.fields.FieldContext;
import org.modewright.ui.editor.fields.Fields;

/** Values as text and back: what is shown, what is taken, what is refused and why. */
class FieldsTest {

    private final StructuralModel model = Frames.small();
    private final FieldContext context = new FieldContext(
            new AdapterFactoryEditingDomain(new StructureEditAdapterFactory(), new BasicCommandStack()), model);
    private final Node node = model.getNodes().get(0);
    private final Member member = model.getMembers().get(0);
    private final FrameSection section = model.getFrameSections().get(0);

    private Field field(EObject object, EStructuralFeature feature) {
        return Fields.one(context, object, feature);
    }

    private void set(EObject object, EStructuralFeature feature, String text) {
        Command command = field(object, feature).set(List.of(object), text);
        context.domain().getCommandStack().execute(command);
    }

    private String refusal(EObject object, EStructuralFeature feature, String text) {
        Field field = field(object, feature);
        String checked = assertThrows(IllegalArgumentException.class, () -> field.check(List.of(object), text)).getMessage();
        assertEquals(checked, assertThrows(IllegalArgumentException.class, () -> field.set(List.of(object), text)).getMessage());
        return checked;
    }

    @Test
    void labelsSayTheUnit() {
        assertEquals("x m", field(node, Literals.NODE__X).label());
        assertEquals("Area m²", field(section, Literals.FRAME_SECTION__AREA).label());
        model.setUnits(UnitSystem.NEWTON_MILLIMETRE);
        assertEquals("Area mm²", field(section, Literals.FRAME_SECTION__AREA).label());
    }

    @ParameterizedTest
    @CsvSource({"12.5, 12.5", "2.1e8, 2.1e8", "' -3 ', -3", "0, 0", "\u22124, -4", "+7, 7", ".5, 0.5"})
    void numbersAreTakenAsEngineersWriteThem(String text, double value) {
        set(node, Literals.NODE__X, text);
        assertEquals(value, node.getX());
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "two", "1,5", "1 5", "NaN", "Infinity", "3d", "3f", "0x1p3", "1e", "1e999"})
    void whatIsNoFiniteNumberIsRefused(String text) {
        String reason = refusal(node, Literals.NODE__X, text);
        assertTrue(reason.contains("is not a number. Write it like 12.5") || reason.equals("The number must be finite."), reason);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1.0 / 3, 2.1e8, 1e-7, -123456.789, 1e9, 6.02214076e23, Double.MIN_VALUE})
    void aFieldShowsEveryDigit(double value) {
        node.setX(value);
        String text = field(node, Literals.NODE__X).text(node);
        node.setX(0);
        set(node, Literals.NODE__X, text);
        assertEquals(value, node.getX());
    }

    @ParameterizedTest
    @CsvSource({"0.30000000000000004, 0.3", "12.0, 12", "1234.56789, 1234.568", "-0.0, 0", "2.1E8, 210000000", "1.0E-7, 1e-7",
        "5.665E-7, 5.665e-7", "1.0E12, 1e12"})
    void aTableShowsTheDigitsThatMeanSomething(double value, String shown) {
        node.setX(value);
        assertEquals(shown, field(node, Literals.NODE__X).shown(node));
    }

    @Test
    void namesAreUniqueInTheirKind() {
        set(node, Literals.IDENTIFIED__NAME, " corner ");
        assertEquals("corner", node.getName());
        assertNotNull(refusal(node, Literals.IDENTIFIED__NAME, "N1"));
        assertNotNull(refusal(node, Literals.IDENTIFIED__NAME, "  "));
        set(node, Literals.IDENTIFIED__NAME, "beam");
        assertEquals("beam", node.getName(), "a section may have that name as well");
    }

    @Test
    void referencesAreNames() {
        set(member, Literals.MEMBER__SECTION, "beam");
        assertSame(model.getFrameSections().get(1), member.getSection());
        assertEquals(List.of("column", "beam"), field(member, Literals.MEMBER__SECTION).choices());
        set(member, Literals.MEMBER__END, "N7");
        assertSame(model.getNodes().get(7), member.getEnd());
        assertEquals("There is no node named \"N99\".", refusal(member, Literals.MEMBER__END, "N99"));
        assertEquals("A node is needed here.", refusal(member, Literals.MEMBER__END, ""));
        assertEquals("(none)", field(member, Literals.GROUPED__GROUP).text(member));
        set(member, Literals.GROUPED__GROUP, "(none)");
        assertNull(member.getGroup());
    }

    @Test
    void choicesAndFlags() {
        Field mass = field(member, Literals.MEMBER__MASS);
        assertEquals(Field.Style.CHOICE, mass.style());
        set(member, Literals.MEMBER__MASS, mass.choices().get(mass.choices().size() - 1));
        assertEquals(MemberMass.values()[MemberMass.values().length - 1], member.getMass());
        assertTrue(refusal(member, Literals.MEMBER__MASS, "some").startsWith("\"some\" is not one of: "));
        set(member, Literals.MEMBER__AXIAL_ONLY, "true");
        assertTrue(member.isAxialOnly());
    }

    @Test
    void componentsStandInTheirOrderOnce() {
        set(member, Literals.MEMBER__START_FREE, "rz, ry rz");
        assertEquals(List.of(Component.RY, Component.RZ), member.getStartFree());
        assertTrue(refusal(member, Literals.MEMBER__START_FREE, "ry rw").startsWith("\"rw\" is not a component."));
        set(member, Literals.MEMBER__START_FREE, "");
        assertTrue(member.getStartFree().isEmpty());
    }

    @Test
    void offsetsAreThreeNumbersOrNone() {
        set(member, Literals.MEMBER__START_OFFSET, "0 0.5 -1");
        assertEquals(-1, member.getStartOffset().getZ());
        assertEquals("0 0.5 -1", field(member, Literals.MEMBER__START_OFFSET).text(member));
        assertEquals("\"1 2\" is not three numbers x y z.", refusal(member, Literals.MEMBER__START_OFFSET, "1 2"));
        set(member, Literals.MEMBER__START_OFFSET, "");
        assertNull(member.getStartOffset());
    }

    @Test
    void everyObjectGetsPartsOfItsOwn() {
        List<Member> two = model.getMembers().subList(0, 2);
        context.domain().getCommandStack().execute(field(member, Literals.MEMBER__END_OFFSET).set(two, "1 2 3"));
        assertEquals(3, two.get(0).getEndOffset().getZ());
        assertFalse(two.get(0).getEndOffset() == two.get(1).getEndOffset());
        context.domain().getCommandStack().undo();
        assertNull(two.get(0).getEndOffset());
        assertNull(two.get(1).getEndOffset(), "one step of undo for both");
    }

    @Test
    void termsOfATie() {
        MultiPointTie tie = StructureFactory.eINSTANCE.createMultiPointTie();
        model.getTies().add(tie);
        set(tie, Literals.MULTI_POINT_TIE__TERMS, "1 ux N4; -0.5 ux N5");
        assertEquals("1 ux N4; -0.5 ux N5", field(tie, Literals.MULTI_POINT_TIE__TERMS).text(tie));
        assertSame(model.getNodes().get(5), tie.getTerms().get(1).getNode());
        assertEquals("\"1 ux\" is not a factor, a component and a node, such as 1 ux N1.",
                refusal(tie, Literals.MULTI_POINT_TIE__TERMS, "1 ux"));
    }

    @Test
    void couplingsOfASpring() {
        Spring spring = StructureFactory.eINSTANCE.createSpring();
        spring.setNode(node);
        model.getSprings().add(spring);
        set(spring, Literals.SPRING__COUPLINGS, "ux ry 1200");
        assertEquals(1200, spring.getCouplings().get(0).getStiffness());
        assertEquals("\"ux 1200\" is not two components and a stiffness, such as ux ry 1200.",
                refusal(spring, Literals.SPRING__COUPLINGS, "ux 1200"));
    }

    @Test
    void theModelsChecksSpeakAgainstAValueBeforeItIsSet() {
        Field area = field(section, Literals.FRAME_SECTION__AREA);
        assertNull(area.warning(section, "0.02"));
        assertTrue(area.warning(section, "-0.02").contains("must be positive"), area.warning(section, "-0.02"));
        assertNull(area.warning(section, "two"), "a text that is refused needs no warning");
        assertEquals(0.02, section.getArea(), "nothing was set");
        Field gravity = field(model, Literals.STRUCTURAL_MODEL__GRAVITY);
        assertTrue(gravity.warning(model, "-1").contains("must not be negative"), gravity.warning(model, "-1"));
        assertEquals(8, model.getNodes().size(), "the model keeps its objects");
    }

    @Test
    void aSectionOfBarsNeedsNoBendingStiffness() {
        Field bending = field(section, Literals.FRAME_SECTION__IY);
        assertNotNull(bending.warning(section, "0"));
        model.getMembers().stream().filter(any -> any.getSection() == section).forEach(any -> any.setAxialOnly(true));
        assertNull(bending.warning(section, "0"));
    }

    @Test
    void valuesAgreeOrDiffer() {
        assertFalse(field(member, Literals.MEMBER__START).agree(model.getMembers()));
        assertTrue(field(member, Literals.MEMBER__MATERIAL).agree(model.getMembers()));
        assertTrue(field(member, Literals.MEMBER__START_FREE).agree(model.getMembers()));
    }
}
