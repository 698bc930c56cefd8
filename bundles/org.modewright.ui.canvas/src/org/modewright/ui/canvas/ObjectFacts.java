package org.modewright.ui.canvas;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.eclipse.osgi.util.NLS;
import org.modewright.fem.Carrier;
import org.modewright.modal.ModalResult;
import org.modewright.model.Quantity;
import org.modewright.model.Units;
import org.modewright.model.edit.Labels;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.StructuralModel;
import org.modewright.ui.widgets.Numbers;

/** What the tooltip of an object in space says: its name, then a line for each fact that helps to tell it from others. */
final class ObjectFacts {

    private static final String SEPARATOR = "  \u00b7  ";

    private ObjectFacts() {
    }

    /** Facts of the model alone. */
    static String of(Identified object) {
        List<String> lines = new ArrayList<>();
        lines.add(Labels.of(object));
        if (object instanceof Member member) {
            describe(member, lines);
        }
        return String.join("\n", lines);
    }

    /** Facts of the model and what the object holds of a mode's energies. */
    static String of(Identified object, ModalResult result, int mode) {
        int carrier = carrier(object, result);
        if (carrier < 0 || mode < 0) {
            return of(object);
        }
        return of(object) + "\n" + NLS.bind(Messages.Facts_energy, new Object[] {result.modes().get(mode).number(),
            Numbers.percent(result.strainShare(mode, carrier)), Numbers.percent(result.kineticShare(mode, carrier))});
    }

    private static int carrier(Identified object, ModalResult result) {
        List<Carrier> carriers = result.carriers();
        for (int i = 0; i < carriers.size(); i++) {
            if (carriers.get(i).id().equals(object.getId())) {
                return i;
            }
        }
        return -1;
    }

    private static void describe(Member member, List<String> lines) {
        List<String> made = new ArrayList<>();
        add(made, Messages.Facts_section, Labels.name(member.getSection()));
        add(made, Messages.Facts_material, Labels.name(member.getMaterial()));
        lines.add(String.join(SEPARATOR, made));
        List<String> measured = new ArrayList<>();
        add(measured, Messages.Facts_length, length(member));
        add(measured, Messages.Facts_group, Labels.name(member.getGroup()));
        lines.add(String.join(SEPARATOR, measured));
        List<String> held = new ArrayList<>();
        add(held, Messages.Facts_startFree, components(member.getStartFree()));
        add(held, Messages.Facts_endFree, components(member.getEndFree()));
        lines.add(String.join(SEPARATOR, held));
        lines.removeIf(String::isEmpty);
    }

    private static void add(List<String> facts, String pattern, String value) {
        if (value != null && !value.isEmpty()) {
            facts.add(NLS.bind(pattern, value));
        }
    }

    private static String components(Iterable<Component> free) {
        List<String> words = new ArrayList<>();
        free.forEach(component -> words.add(component.getLiteral()));
        return String.join(" ", words);
    }

    private static String length(Member member) {
        if (member.getStart() == null || member.getEnd() == null
                || !(EcoreUtil.getRootContainer(member) instanceof StructuralModel model)) {
            return null;
        }
        double dx = member.getEnd().getX() - member.getStart().getX();
        double dy = member.getEnd().getY() - member.getStart().getY();
        double dz = member.getEnd().getZ() - member.getStart().getZ();
        return Numbers.significant(Math.sqrt(dx * dx + dy * dy + dz * dz), 4) + " " + Units.of(model).symbol(Quantity.LENGTH);
    }
}
